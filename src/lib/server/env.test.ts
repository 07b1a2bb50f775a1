import { expect, test } from 'vitest';
import { readEnv, SettingsError } from './env.ts';

const GOOD = {
	ORIGIN: 'http://localhost:4700/',
	AUTH_SECRET: 'a'.repeat(32),
	STORE_ENDPOINT: 'http://127.0.0.1:4729',
	STORE_ACCESS_KEY: 'key',
	STORE_SECRET_KEY: 'secret',
	SMTP_URL: 'smtp://127.0.0.1:4725',
	MAIL_FROM: 'desk@varrowmere.example'
};

test('good settings are read, the origin without a path, the rest with defaults', () => {
	expect(readEnv(GOOD)).toMatchObject({
		ORIGIN: 'http://localhost:4700',
		PORT: 4620,
		STEELYARD_DATA_DIR: './data',
		STEELYARD_SEED: 'none',
		STORE_BUCKET: 'steelyard'
	});
});

test('every problem is told at once, each by its name and with what to set', () => {
	const attempt = () =>
		readEnv({ PORT: 'x', SMTP_URL: 'http://wrong', STEELYARD_SEED: 'all', AUTH_SECRET: 'short' });
	expect(attempt).toThrow(SettingsError);
	for (const name of [
		'ORIGIN',
		'PORT',
		'AUTH_SECRET',
		'STORE_ENDPOINT',
		'STORE_ACCESS_KEY',
		'SMTP_URL',
		'MAIL_FROM',
		'STEELYARD_SEED'
	]) {
		expect(attempt).toThrow(new RegExp(`· .*${name}`));
	}
	expect(attempt).toThrow('smtp://127.0.0.1:4625');
});

test.each(Object.keys(GOOD))('%s given as an empty string counts as missing', (name) => {
	expect(() => readEnv({ ...GOOD, [name]: '' })).toThrow(name);
});

test('no secret is repeated in the message', () => {
	expect(() => readEnv({ ...GOOD, AUTH_SECRET: 'hunter2', PORT: '0' })).toThrow(
		expect.objectContaining({ message: expect.not.stringContaining('hunter2') })
	);
});

test('people with a known passphrase are put only into a house on this computer', () => {
	expect(readEnv({ ...GOOD, STEELYARD_SEED: 'demo' }).STEELYARD_SEED).toBe('demo');
	const open = { ...GOOD, ORIGIN: 'https://desk.varrowmere.example', STEELYARD_SEED: 'people' };
	expect(() => readEnv(open)).toThrow('known passphrase');
});
