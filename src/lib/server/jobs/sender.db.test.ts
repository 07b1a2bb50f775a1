import { eq } from 'drizzle-orm';
import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, beforeEach, describe, expect, test } from 'vitest';
import { openTestDatabase, type TestDatabase } from '../../../../tests/support/database.ts';
import { startMail, type MailFake } from '../../../../tests/support/fakes/mail.ts';
import { outbox } from '../db/schema/index.ts';
import { queueMail, type Mail } from '../mail/outbox.ts';
import { openMailTransport, type MailTransport } from '../mail/transport.ts';
import { drainOutbox, messageId, startSender, type SenderParts } from './sender.ts';

const HOUSE = {
	name: 'Varrowmere Institute, Public Desk',
	origin: 'https://desk.varrowmere.example',
	secret: 's'.repeat(40)
};
const TAMSIN = { name: 'Tamsin Orrelby', email: 'tamsin@varrowmere.example' };
const QUERY: Mail = {
	event: 'query-raised',
	input: {
		slug: 'first-light-on-the-dial',
		title: 'First light on the dial',
		by: 'Dr Mateus Quevarro',
		claim: '2b'
	}
};

let database: TestDatabase;
let folder: string;
let tray: MailFake;
let transport: MailTransport;
let reported: string[];
let now: Date;

beforeAll(async () => {
	database = await openTestDatabase();
	folder = await mkdtemp(join(tmpdir(), 'steelyard-mail-'));
	tray = await startMail({ smtpPort: 0, trayPort: 0, folder });
	transport = openMailTransport({
		smtpUrl: tray.smtpUrl,
		from: 'desk@varrowmere.example',
		houseName: HOUSE.name
	});
});
afterAll(async () => {
	transport.close();
	await tray.close();
	await database.close();
	await rm(folder, { recursive: true, force: true });
});
beforeEach(async () => {
	await database.fresh();
	reported = [];
	now = new Date('2026-12-08T10:00:00Z');
});

const parts = (over: Partial<SenderParts> = {}): SenderParts => ({
	db: database.db,
	house: HOUSE,
	transport,
	clock: () => now,
	report: (message) => reported.push(message),
	...over
});
const drain = (over?: Partial<SenderParts>) => drainOutbox(parts(over));
const queue = (mail: Mail = QUERY, to = TAMSIN) => queueMail(database.db, now, to, mail);
const rows = () => database.db.select().from(outbox);
const later = (seconds: number) => (now = new Date(now.getTime() + seconds * 1000));

const refusing: MailTransport = {
	send: () => Promise.reject(new Error('451 try again later')),
	close: () => undefined
};

test('a letter goes out once, as text and HTML, to one mailbox, under its row’s Message-ID', async () => {
	await queue();
	const before = tray.letters().length;
	await drain();
	await drain();
	expect(tray.letters()).toHaveLength(before + 1);
	const [letter] = tray.letters();
	const [row] = await rows();
	expect(letter).toMatchObject({
		to: ['tamsin@varrowmere.example'],
		subject: 'Query on 2b: First light on the dial',
		messageId: messageId(row!.id, HOUSE.origin)
	});
	expect(letter!.text).toContain(
		'https://desk.varrowmere.example/pieces/first-light-on-the-dial/check'
	);
	expect(letter!.html).toContain('Dr Mateus Quevarro');
	expect(row!.sentAt).toEqual(now);
});

test('nothing from a name or a title becomes markup or a header', async () => {
	await queue({
		event: 'query-answered',
		input: {
			slug: 'x',
			title: 'A <b>bold</b>\r\nBcc: spy@elsewhere.example',
			by: '"><svg onload=x>',
			claim: '1a'
		}
	});
	await drain();
	const [letter] = tray.letters();
	expect(letter!.to).toEqual(['tamsin@varrowmere.example']);
	expect(letter!.subject).toBe('Answer on 1a: A <b>bold</b> Bcc: spy@elsewhere.example');
	expect(letter!.html).not.toMatch(/<b>|<svg/);
	expect(letter!.html).toContain('&lt;svg onload=x&gt;');
});

test.each([
	'a@varrowmere.example\r\nBcc: x@elsewhere.example',
	'a@varrowmere.example, x@elsewhere.example',
	'A <x@elsewhere.example>'
])('an address that isn’t one plain mailbox is never sent to: %j', async (email) => {
	const before = tray.letters().length;
	await queue(QUERY, { name: 'A', email });
	await drain();
	expect(tray.letters()).toHaveLength(before);
	expect((await rows())[0]!.sentAt).toBeNull();
});

test('the link in the mail holds the token, which is nowhere in the row', async () => {
	await queue({ event: 'sign-in-link', input: { linkId: 'a-link' } });
	await drain();
	const token = /token=([\w-]{43})/.exec(tray.letters()[0]!.text)?.[1];
	expect(token).toBeDefined();
	expect(JSON.stringify(await rows())).not.toContain(token);
});

test('a letter that is of no use any more isn’t sent', async () => {
	const goodUntil = new Date(now.getTime() + 600_000);
	const before = tray.letters().length;
	await queueMail(
		database.db,
		now,
		TAMSIN,
		{ event: 'sign-in-link', input: { linkId: 'a-link' } },
		goodUntil
	);
	await drain({ transport: refusing });
	later(600);
	await drain();
	expect(tray.letters()).toHaveLength(before);
	expect((await rows())[0]).toMatchObject({ sentAt: null, parkedAt: now });
});

describe('when the mail server refuses', () => {
	test('the row waits, longer each time, and goes out when the server is back', async () => {
		await queue();
		await drain({ transport: refusing });
		expect((await rows())[0]).toMatchObject({
			attempts: 1,
			sentAt: null,
			lastError: '451 try again later'
		});
		await drain(); // not due yet
		expect((await rows())[0]!.sentAt).toBeNull();
		later(5);
		await drain();
		expect((await rows())[0]!.sentAt).toEqual(now);
		expect(reported).toHaveLength(1);
		expect(reported[0]).not.toContain('tamsin');
	});

	test('after eight tries it is parked and not tried again', async () => {
		await queue();
		for (let tries = 0; tries < 8; tries += 1) {
			await drain({ transport: refusing });
			later(3600);
		}
		const [row] = await rows();
		expect(row).toMatchObject({ attempts: 8, sentAt: null });
		expect(row!.parkedAt).not.toBeNull();
		await drain();
		expect((await rows())[0]!.sentAt).toBeNull();
	});
});

test('a row whose sender was killed is sent when its lease runs out, and not before', async () => {
	await queue();
	const [row] = await rows();
	await database.db
		.update(outbox)
		.set({ leaseUntil: new Date(now.getTime() + 60_000), attempts: 1 })
		.where(eq(outbox.id, row!.id));
	await drain();
	expect((await rows())[0]!.sentAt).toBeNull();
	later(60);
	await drain();
	expect((await rows())[0]!.sentAt).toEqual(now);
});

test('told to stop, it finishes the letter in hand and leaves the others for the next start', async () => {
	for (const first of ['kofi', 'ama', 'mateus'])
		await queue(QUERY, { name: first, email: `${first}@varrowmere.example` });
	let stopping: Promise<void> | undefined;
	const sender = startSender(
		parts({
			transport: {
				async send(...letter) {
					stopping = sender.stop();
					await transport.send(...letter);
				},
				close: () => undefined
			}
		})
	);
	sender.wake();
	await expect.poll(() => stopping !== undefined).toBe(true);
	await stopping;
	const left = (await rows()).filter(({ sentAt }) => sentAt === null);
	expect(left).toMatchObject([
		{ attempts: 0, leaseUntil: null },
		{ attempts: 0, leaseUntil: null }
	]);
	await drain();
	expect((await rows()).every(({ sentAt }) => sentAt !== null)).toBe(true);
});

test('a running sender wakes for new mail and stops when told', async () => {
	const sender = startSender(parts());
	await queue(QUERY, { name: 'Juno Castellmere', email: 'juno@varrowmere.example' });
	sender.wake();
	await tray.letterTo('juno@varrowmere.example');
	await sender.stop();
	await queue(QUERY, { name: 'Late', email: 'late@varrowmere.example' });
	sender.wake();
	expect((await rows()).filter(({ sentAt }) => sentAt === null)).toHaveLength(1);
});
