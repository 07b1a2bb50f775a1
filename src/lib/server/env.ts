/** Every setting that comes from outside, read once at start. Nothing else in the app looks at the environment. */
import { z } from 'zod';

const url = (says: string) => z.url({ protocol: /^https?$/, error: says });

const Port = z.coerce
	.number({ error: 'PORT must be a number, such as 4620.' })
	.int('PORT must be a whole number.')
	.min(1, 'PORT must be between 1 and 65535.')
	.max(65535, 'PORT must be between 1 and 65535.');

const LOCAL = new Set(['localhost', '127.0.0.1', '[::1]']);

const Env = z
	.object({
		ORIGIN: url('Set ORIGIN to the address people type, such as http://localhost:4620.').transform(
			(value) => new URL(value).origin
		),
		HOST: z.string().default('127.0.0.1'),
		PORT: Port.default(4620),
		STEELYARD_DATA_DIR: z.string().min(1).default('./data'),
		/** Generated SQL migrations; shipped beside the build. */
		STEELYARD_MIGRATIONS: z.string().min(1).default('./drizzle'),
		/** The build of the reader's frame. */
		STEELYARD_PRESS: z.string().min(1).default('./build/press'),
		AUTH_SECRET: z
			.string({
				error: 'Set AUTH_SECRET to at least 32 random characters: openssl rand -base64 33.'
			})
			.min(
				32,
				'AUTH_SECRET is too short. Set at least 32 random characters: openssl rand -base64 33.'
			),
		STORE_ENDPOINT: url(
			'Set STORE_ENDPOINT to the S3-protocol store, such as http://127.0.0.1:4629.'
		),
		STORE_BUCKET: z.string().min(3, 'STORE_BUCKET is the name of the bucket.').default('steelyard'),
		STORE_REGION: z.string().min(1).default('local'),
		STORE_ACCESS_KEY: z.string({ error: 'Set STORE_ACCESS_KEY to the store’s access key.' }).min(1),
		STORE_SECRET_KEY: z.string({ error: 'Set STORE_SECRET_KEY to the store’s secret key.' }).min(1),
		SMTP_URL: z.url({
			protocol: /^smtps?$/,
			error: 'Set SMTP_URL to the mail server, such as smtp://127.0.0.1:4625.'
		}),
		MAIL_FROM: z.email({ error: 'Set MAIL_FROM to the address mail is sent from.' }),
		STEELYARD_SEED: z
			.enum(['none', 'people', 'demo'], { error: 'STEELYARD_SEED is one of none, people, demo.' })
			.default('none'),
		HOUSE_NAME: z.string().min(1).max(120).default('Steelyard')
	})
	.refine((env) => env.STEELYARD_SEED === 'none' || LOCAL.has(new URL(env.ORIGIN).hostname), {
		error:
			'STEELYARD_SEED puts people with a known passphrase into the house: set it to none unless ORIGIN is on localhost.',
		path: ['STEELYARD_SEED']
	});
export type Env = z.infer<typeof Env>;

/** A start that can't go on because of its settings; the message lists every one of them. */
export class SettingsError extends Error {
	constructor(sentences: string[]) {
		super(['Steelyard can’t start with these settings:', ...sentences].join('\n  · '));
		this.name = 'SettingsError';
	}
}

/** Checks the settings; empty strings count as not given. Throws SettingsError with one sentence per problem. */
export function readEnv(source: Record<string, string | undefined> = process.env): Env {
	const given = Object.fromEntries(Object.entries(source).filter(([, value]) => value !== ''));
	const read = Env.safeParse(given);
	if (read.success) return read.data;
	throw new SettingsError(
		read.error.issues.map((issue) => {
			const name = issue.path.join('.');
			return issue.message.includes(name) ? issue.message : `${name}: ${issue.message}`;
		})
	);
}

/**
 * Lets the adapter take bodies as large as the largest upload; it reads this when its handler is loaded, and knows one
 * limit for all. `http/body-limit.ts` holds every other route to less.
 */
export function takeUploads(largestBytes: number): void {
	process.env.BODY_SIZE_LIMIT = String(largestBytes);
}
