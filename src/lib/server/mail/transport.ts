/** The one place that speaks SMTP. */
import { createTransport } from 'nodemailer';
import { z } from 'zod';
import type { Letter } from './templates/letter.ts';

export interface Envelope {
	/** Fixed by the outbox row, so that a second delivery after a crash is recognised as the same letter. */
	messageId: string;
	to: { name: string; address: string };
}

export interface MailTransport {
	send(envelope: Envelope, letter: Letter): Promise<void>;
	close(): void;
}

const Mailbox = z.email();

/** `smtpUrl` as in smtp://host:port; `from` is one plain address. */
export function openMailTransport(settings: {
	smtpUrl: string;
	from: string;
	houseName: string;
}): MailTransport {
	const server = new URL(settings.smtpUrl);
	const secure = server.protocol === 'smtps:';
	const smtp = createTransport({
		host: server.hostname,
		port: Number(server.port) || (secure ? 465 : 587),
		secure,
		...(server.username && {
			auth: { user: decodeURIComponent(server.username), pass: decodeURIComponent(server.password) }
		}),
		connectionTimeout: 5_000,
		greetingTimeout: 5_000,
		socketTimeout: 10_000,
		disableFileAccess: true,
		disableUrlAccess: true
	});
	return {
		async send({ messageId, to }, letter) {
			await smtp.sendMail({
				from: { name: settings.houseName, address: settings.from },
				// Objects, and one checked address: a string could hold line ends or a list.
				to: { name: to.name, address: Mailbox.parse(to.address) },
				messageId,
				subject: letter.subject,
				text: letter.text,
				html: letter.html
			});
		},
		close: () => smtp.close()
	};
}
