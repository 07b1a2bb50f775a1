import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { createTransport } from 'nodemailer';
import { afterEach, beforeEach, expect, test } from 'vitest';
import { startMail } from './mail.ts';
import type { MailFake } from './mail.ts';

let folder: string;
let mail: MailFake;

beforeEach(async () => {
	folder = await mkdtemp(join(tmpdir(), 'steelyard-mail-'));
	mail = await startMail({ smtpPort: 0, trayPort: 0, folder });
});

afterEach(async () => {
	await mail.close();
	await rm(folder, { recursive: true });
});

const send = (letter: { to: string; subject: string; text: string; html?: string }) =>
	createTransport(mail.smtpUrl).sendMail({ from: 'desk@varrowmere.example', ...letter });

test('keeps a letter as the real sender sent it', async () => {
	await send({
		to: 'tamsin@varrowmere.example',
		subject: 'Ein Maß für 21 cm – λ',
		text: 'Open http://localhost:4620/sign-in/link?token=a=b&c\nThe desk',
		html: '<p>Open it</p>'
	});
	const letter = await mail.letterTo('tamsin@varrowmere.example');
	expect(letter).toMatchObject({
		to: ['tamsin@varrowmere.example'],
		from: 'desk@varrowmere.example',
		subject: 'Ein Maß für 21 cm – λ'
	});
	expect(letter.text).toContain('http://localhost:4620/sign-in/link?token=a=b&c');
	expect(letter.html).toContain('<p>Open it</p>');
});

test('waits for a letter, and says when none comes', async () => {
	const waiting = mail.letterTo('juno@varrowmere.example', 3000);
	await send({ to: 'juno@varrowmere.example', subject: 'Later', text: 'Here' });
	expect((await waiting).subject).toBe('Later');
	await expect(mail.letterTo('nobody@varrowmere.example', 50)).rejects.toThrow(
		'No letter to nobody@varrowmere.example'
	);
});

test('shows letters newest first, with nothing in them able to run', async () => {
	await send({ to: 'a@varrowmere.example', subject: 'First', text: 'one' });
	await send({
		to: 'b@varrowmere.example',
		subject: '<script>alert(1)</script>',
		text: '<img src=x onerror=alert(1)> see http://localhost:4620/desk?a=1&b="x"'
	});
	const list = await (await fetch(mail.tray.url)).text();
	expect(list.indexOf('b@varrowmere.example')).toBeLessThan(list.indexOf('a@varrowmere.example'));
	expect(list).not.toContain('<script');

	const id = mail.letters()[0]?.id;
	const answer = await fetch(`${mail.tray.url}/${id}`);
	const shown = await answer.text();
	expect(shown).not.toContain('<img');
	expect(shown).toContain('href="http://localhost:4620/desk?a=1&#38;b="');
	expect(answer.headers.get('content-security-policy')).toContain("default-src 'none'");
	expect((await fetch(`${mail.tray.url}/none-such`)).status).toBe(404);
});

test('keeps its letters over a restart', async () => {
	await send({ to: 'a@varrowmere.example', subject: 'Kept', text: 'one' });
	await mail.close();
	mail = await startMail({ smtpPort: 0, trayPort: 0, folder });
	expect(mail.letters().map(({ subject }) => subject)).toEqual(['Kept']);
});
