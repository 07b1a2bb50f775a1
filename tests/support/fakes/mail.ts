/** A mail server that keeps what it's sent, and a page that shows it. Nothing leaves this machine. */
import { randomUUID } from 'node:crypto';
import { once } from 'node:events';
import { mkdir, readdir, readFile, writeFile } from 'node:fs/promises';
import { createServer } from 'node:http';
import type { ServerResponse } from 'node:http';
import type { AddressInfo } from 'node:net';
import { join } from 'node:path';
import { simpleParser } from 'mailparser';
import { SMTPServer } from 'smtp-server';
import { escapeHtml, page } from './html.ts';
import { listenOn } from './listen.ts';
import type { Listening } from './listen.ts';

export interface Letter {
	id: string;
	to: string[];
	from: string;
	subject: string;
	/** ISO 8601, UTC. */
	at: string;
	text: string;
	/** Absent when the sender gave plain text alone. */
	html: string | null;
	messageId: string;
}

export interface MailOptions {
	smtpPort: number;
	trayPort: number;
	host?: string;
	/** The letters are kept here as they came, one file each. */
	folder: string;
}

export interface MailFake {
	/** `smtp://host:port`. */
	smtpUrl: string;
	smtpPort: number;
	tray: Listening;
	/** Newest first. */
	letters(): Letter[];
	/** The newest letter to this address, waiting for it up to the given time. Throws when none comes. */
	letterTo(address: string, withinMs?: number): Promise<Letter>;
	close(): Promise<void>;
}

async function readLetter(id: string, source: Buffer): Promise<Letter> {
	const mail = await simpleParser(source);
	const addresses = [mail.to ?? []].flat().flatMap((group) => group.value);
	return {
		id,
		to: addresses.map((to) => to.address ?? ''),
		from: mail.from?.text ?? '',
		subject: mail.subject ?? '',
		at: (mail.date ?? new Date(0)).toISOString(),
		text: mail.text ?? '',
		html: mail.html || null,
		messageId: mail.messageId ?? ''
	};
}

const STYLE = `
	:root { color-scheme: light; font: 16px/1.5 system-ui, sans-serif; color: #1c211f; background: #fff; }
	body { max-width: 46rem; margin: 2rem auto; padding: 0 1rem; }
	h1 { font-size: 1.5rem; margin: 0 0 0.25rem; }
	p.note { margin: 0 0 1.5rem; color: #4a524e; }
	ol { list-style: none; padding: 0; margin: 0; }
	li { border-top: 1px solid #c9d0c8; padding: 0.75rem 0; }
	li a { font-weight: 600; display: inline-block; min-height: 24px; }
	a { color: #5b2a86; }
	:focus-visible { outline: 2px solid #5b2a86; outline-offset: 2px; }
	dl { display: grid; grid-template-columns: 6rem 1fr; gap: 0.25rem 1rem; margin: 1rem 0; }
	dt { color: #4a524e; } dd { margin: 0; overflow-wrap: anywhere; }
	article { border-top: 1px solid #767f7a; padding-top: 1rem; white-space: pre-wrap; overflow-wrap: anywhere; }
`;

/** Text of a letter as HTML: everything escaped, addresses turned into links. */
function linked(text: string): string {
	return text
		.split(/(https?:\/\/[^\s<>"']+)/)
		.map((part, index) =>
			index % 2 === 1 ? `<a href="${escapeHtml(part)}">${escapeHtml(part)}</a>` : escapeHtml(part)
		)
		.join('');
}

function listPage(letters: Letter[]): string {
	const items = letters.map(
		(letter) =>
			`<li><a href="/${letter.id}">${escapeHtml(letter.subject || '(no subject)')}</a><br>` +
			`to ${escapeHtml(letter.to.join(', '))}, <time datetime="${letter.at}">${letter.at.slice(0, 16).replace('T', ' ')} UTC</time></li>`
	);
	const body = letters.length > 0 ? `<ol>${items.join('')}</ol>` : '<p>No mail yet.</p>';
	return page({
		title: 'Mail tray',
		style: STYLE,
		body: `<main><h1>Mail tray</h1><p class="note">What the app has sent, newest first. Nothing has left this machine. <a href="/">Look again</a></p>${body}</main>`
	});
}

function letterPage(letter: Letter): string {
	return page({
		title: `${letter.subject || '(no subject)'} · Mail tray`,
		style: STYLE,
		body:
			`<main><p><a href="/">All mail</a></p><h1>${escapeHtml(letter.subject || '(no subject)')}</h1>` +
			`<dl><dt>From</dt><dd>${escapeHtml(letter.from)}</dd><dt>To</dt><dd>${escapeHtml(letter.to.join(', '))}</dd>` +
			`<dt>Sent</dt><dd>${letter.at.slice(0, 19).replace('T', ' ')} UTC</dd>` +
			`<dt>Parts</dt><dd>${letter.html === null ? 'plain text' : 'plain text (shown) and HTML'}</dd></dl>` +
			`<article>${linked(letter.text)}</article></main>`
	});
}

function sendPage(response: ServerResponse, status: number, html: string): void {
	response.writeHead(status, {
		'content-type': 'text/html; charset=utf-8',
		'content-security-policy':
			"default-src 'none'; style-src 'unsafe-inline'; form-action 'none'; frame-ancestors 'none'; base-uri 'none'",
		'x-content-type-options': 'nosniff',
		'cache-control': 'no-store',
		// A sign-in link in a letter works once: its address goes to no other page.
		'referrer-policy': 'no-referrer'
	});
	response.end(html);
}

/** Starts the mail server and its tray; letters of earlier runs in the folder are shown too. */
export async function startMail(options: MailOptions): Promise<MailFake> {
	const { folder, host = '127.0.0.1' } = options;
	await mkdir(folder, { recursive: true });
	const kept: Letter[] = [];
	for (const name of (await readdir(folder)).filter((name) => name.endsWith('.eml')).sort()) {
		kept.push(await readLetter(name.slice(0, -'.eml'.length), await readFile(join(folder, name))));
	}
	const letters = () => [...kept].reverse();
	let waiting: (() => void)[] = [];

	const smtp = new SMTPServer({
		disabledCommands: ['STARTTLS', 'AUTH'],
		size: 4 * 1024 * 1024,
		logger: false,
		onData(stream, _session, done) {
			const parts: Buffer[] = [];
			stream.on('data', (part: Buffer) => parts.push(part));
			stream.on('end', () => {
				if (stream.sizeExceeded) return done(new Error('The message is too long.'));
				const source = Buffer.concat(parts);
				const id = `${Date.now().toString().padStart(15, '0')}-${randomUUID().slice(0, 8)}`;
				readLetter(id, source)
					.then(async (letter) => {
						await writeFile(join(folder, `${id}.eml`), source);
						kept.push(letter);
						waiting.forEach((wake) => wake());
						waiting = [];
						done();
					})
					.catch((error: unknown) =>
						done(error instanceof Error ? error : new Error(String(error)))
					);
			});
		}
	});
	// A client that hangs up in the middle is its own affair.
	smtp.on('error', () => undefined);
	const smtpServer = smtp.listen(options.smtpPort, host);
	await once(smtpServer, 'listening');
	const smtpPort = (smtpServer.address() as AddressInfo).port;

	const tray = await listenOn(
		createServer((request, response) => {
			const path = new URL(request.url ?? '/', 'http://tray.invalid').pathname;
			if (path === '/letters.json') {
				response.writeHead(200, {
					'content-type': 'application/json',
					'cache-control': 'no-store'
				});
				return response.end(JSON.stringify(letters()));
			}
			if (path === '/') return sendPage(response, 200, listPage(letters()));
			const letter = kept.find(({ id }) => path === `/${id}`);
			if (letter) return sendPage(response, 200, letterPage(letter));
			sendPage(
				response,
				404,
				page({
					title: 'No such letter · Mail tray',
					style: STYLE,
					body: '<main><h1>No such letter</h1><p><a href="/">All mail</a></p></main>'
				})
			);
		}),
		{ port: options.trayPort, host }
	);

	return {
		smtpUrl: `smtp://${host}:${smtpPort}`,
		smtpPort,
		tray,
		letters,
		async letterTo(address, withinMs = 5000) {
			const deadline = Date.now() + withinMs;
			for (;;) {
				const letter = letters().find(({ to }) => to.includes(address));
				if (letter) return letter;
				const left = deadline - Date.now();
				if (left <= 0) throw new Error(`No letter to ${address} came within ${withinMs} ms.`);
				await new Promise<void>((resolve) => {
					const timer = setTimeout(resolve, left);
					waiting.push(() => {
						clearTimeout(timer);
						resolve();
					});
				});
			}
		},
		async close() {
			await tray.close();
			await new Promise<void>((resolve) => smtp.close(() => resolve()));
		}
	};
}
