import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, beforeEach, describe, expect, test } from 'vitest';
import { openTestDatabase, type TestDatabase } from '../../../../tests/support/database.ts';
import { noShelf, Office, SECRET } from '../../../../tests/support/office.ts';
import { explanations } from '../../errors.ts';
import { hashPassphrase } from '../auth/passphrase.ts';
import {
	daybook,
	outbox,
	people,
	sessions,
	signInAttempts,
	signInLinks
} from '../db/schema/index.ts';
import { disablePerson, setRoles } from './people.ts';
import { ABSOLUTE_MS, IDLE_MS, isFresh, readSession, requireFresh, signOut } from './sessions.ts';
import {
	confirmPassphrase,
	linkToken,
	sendSignInLink,
	signInByLink,
	signInByPassphrase
} from './sign-in.ts';

const RIGHT = 'a rider on the arm';
const EMAIL = 'tamsin@varrowmere.example';

let database: TestDatabase;
let hash: string;
let office: Office;
let tamsin: string;

beforeAll(async () => {
	database = await openTestDatabase();
	hash = await hashPassphrase(RIGHT);
});
afterAll(() => database.close());
beforeEach(async () => {
	await database.fresh();
	office = new Office(database.db, noShelf);
	tamsin = await office.add('Tamsin Orrelby', ['writer'], hash);
});

const code = (code: string) => expect.objectContaining({ code });
const signIn = (passphrase: string, email = EMAIL) =>
	signInByPassphrase(office.stranger(), { email, passphrase });

describe('by passphrase', () => {
	test('the right one opens a session that reads as the person, whatever the case of the address', async () => {
		const { session } = await signIn(RIGHT, '  TAMSIN@Varrowmere.example ');
		const read = await readSession(office.db, office.now, session.id);
		expect(read?.actor).toEqual({ personId: tamsin, name: 'Tamsin Orrelby', roles: ['writer'] });
	});

	test('a wrong one, an unknown address and a person without one fail alike', async () => {
		await office.add('Ama Tindleforth', ['scientist'], null);
		await expect(signIn('something else')).rejects.toEqual(code('sign-in-failed'));
		await expect(signIn(RIGHT, 'nobody@varrowmere.example')).rejects.toEqual(
			code('sign-in-failed')
		);
		await expect(signIn(RIGHT, 'ama@varrowmere.example')).rejects.toEqual(code('sign-in-failed'));
	});

	test('someone whose account is closed can’t get in', async () => {
		await disablePerson(office.stranger(), tamsin);
		await expect(signIn(RIGHT)).rejects.toEqual(code('sign-in-failed'));
	});

	test('after ten wrong tries the account is slowed, for a quarter of an hour', async () => {
		for (let tries = 0; tries < 10; tries += 1) {
			await expect(signIn('wrong')).rejects.toEqual(code('sign-in-failed'));
		}
		await expect(signIn(RIGHT)).rejects.toEqual(code('sign-in-slowed'));
		office.wait(16);
		await expect(signIn(RIGHT)).resolves.toBeDefined();
	});

	test('a stranger’s wrong tries don’t keep the person out of the browser they always use', async () => {
		const { device } = await signIn(RIGHT);
		office.client = { address: '198.51.100.9', device: null };
		for (let tries = 0; tries < 12; tries += 1) await signIn('wrong').catch(() => null);
		await expect(signIn(RIGHT)).rejects.toEqual(code('sign-in-slowed'));
		office.client = { address: '192.0.2.7', device };
		await expect(signIn(RIGHT)).resolves.toBeDefined();
	});

	test('that browser has a limit of its own', async () => {
		const { device } = await signIn(RIGHT);
		office.client = { address: '192.0.2.7', device };
		for (let tries = 0; tries < 10; tries += 1) await signIn('wrong').catch(() => null);
		await expect(signIn(RIGHT)).rejects.toEqual(code('sign-in-slowed'));
	});

	test('fifty wrong tries from one address slow it for every account', async () => {
		await office.add('Perpetua Lindqvane', ['editor'], hash);
		const now = office.now;
		await office.db.insert(signInAttempts).values(
			Array.from({ length: 50 }, (_, index) => ({
				kind: 'passphrase' as const,
				accountHash: `account ${index}`,
				addressHash: '',
				succeeded: false,
				at: now
			}))
		);
		const { sha256 } = await import('../auth/hashes.ts');
		await office.db.update(signInAttempts).set({ addressHash: sha256('192.0.2.7') });
		await expect(signIn(RIGHT, 'perpetua@varrowmere.example')).rejects.toEqual(
			code('sign-in-slowed')
		);
		office.client = { address: '192.0.2.8', device: null };
		await expect(signIn(RIGHT, 'perpetua@varrowmere.example')).resolves.toBeDefined();
	});

	test('of a flood some are turned away unread, and those don’t count as wrong', async () => {
		for (let number = 0; number < 40; number += 1)
			await office.add(`Person${number} Of Many`, ['writer'], hash);
		const outcomes = await Promise.allSettled(
			Array.from({ length: 40 }, (_, number) =>
				signIn('wrong', `person${number}@varrowmere.example`)
			)
		);
		const codes = outcomes.map((outcome) => outcome.status === 'rejected' && outcome.reason.code);
		const slowed = codes.filter((each) => each === 'sign-in-slowed').length;
		expect(slowed).toBeGreaterThan(0);
		expect(await office.db.$count(signInAttempts)).toBe(40 - slowed);
	});

	test('neither address nor passphrase is kept in what is counted', async () => {
		await signIn('wrong').catch(() => null);
		const kept = JSON.stringify(await office.db.select().from(signInAttempts));
		expect(kept).not.toContain('tamsin');
		expect(kept).not.toContain('192.0.2.7');
		expect(kept).not.toContain('wrong');
	});
});

describe('a session', () => {
	const read = (id: string) => readSession(office.db, office.now, id);

	test('every sign-in has an id of its own', async () => {
		const first = await signIn(RIGHT);
		const second = await signIn(RIGHT);
		expect(first.session.id).not.toBe(second.session.id);
		expect(first.session.id).toMatch(/^[\w-]{22}$/);
	});

	test('a role given or taken acts at the next request', async () => {
		const { session } = await signIn(RIGHT);
		await setRoles(office.stranger(), tamsin, ['editor']);
		expect((await read(session.id))?.actor.roles).toEqual(['editor']);
		await setRoles(office.stranger(), tamsin, []);
		expect((await read(session.id))?.actor.roles).toEqual([]);
	});

	test('ends with signing out, and all of them with the account, for good', async () => {
		const [first, second] = [await signIn(RIGHT), await signIn(RIGHT)];
		await signOut({ ...(await office.as(tamsin)), session: first.session });
		expect(await read(first.session.id)).toBeNull();
		expect(await read(second.session.id)).not.toBeNull();
		await disablePerson(office.stranger(), tamsin);
		await office.db.update(people).set({ disabledAt: null });
		expect(await read(second.session.id)).toBeNull();
	});

	test('ends when its browser signs in again', async () => {
		const first = await office.as(tamsin);
		const second = await signInByPassphrase(first, { email: EMAIL, passphrase: RIGHT });
		expect(await read(first.session!.id)).toBeNull();
		expect(await read(second.session.id)).not.toBeNull();
	});

	test('ends after eight hours of rest', async () => {
		const { session } = await signIn(RIGHT);
		office.wait(IDLE_MS / 60_000 - 1);
		expect(await read(session.id)).not.toBeNull(); // and was seen now
		office.wait(IDLE_MS / 60_000 - 1);
		expect(await read(session.id)).not.toBeNull();
		office.wait(IDLE_MS / 60_000);
		expect(await read(session.id)).toBeNull();
	});

	test('ends after seven days of work', async () => {
		const { session } = await signIn(RIGHT);
		for (let waited = 0; waited < ABSOLUTE_MS / 60_000 - 360; waited += 360) {
			office.wait(360);
			expect(await read(session.id)).not.toBeNull();
		}
		office.wait(360);
		expect(await read(session.id)).toBeNull();
	});

	test('an unknown id is nobody', async () => {
		expect(await read('')).toBeNull();
		expect(await read('no-such-session')).toBeNull();
	});

	test('a signature wants the passphrase within the last quarter of an hour', async () => {
		const ctx = await office.as(tamsin);
		expect(isFresh(ctx)).toBe(true);
		office.wait(16);
		const later = { ...ctx, now: office.now };
		await expect(requireFresh(later, office.db)).rejects.toEqual(code('confirm-needed'));
		await expect(confirmPassphrase(later, 'wrong')).rejects.toEqual(code('sign-in-failed'));
		await confirmPassphrase(later, RIGHT);
		const renewed = await readSession(office.db, office.now, ctx.session!.id);
		expect(isFresh({ session: renewed!.session, now: office.now })).toBe(true);
	});

	test('without a passphrase it wants a new sign-in by link, and says so', async () => {
		const ctx = await office.as(await office.add('Ama Tindleforth', ['scientist'], null));
		office.wait(16);
		const later = { ...ctx, now: office.now };
		await expect(requireFresh(later, office.db)).rejects.toEqual(code('confirm-by-link'));
		await expect(confirmPassphrase(later, RIGHT)).rejects.toEqual(code('confirm-by-link'));
		expect(explanations['confirm-by-link'].help).toMatch(/sign in again by link/);
	});
});

describe('by link', () => {
	const NONCE = 'the nonce of this browser';
	const send = (nonce = NONCE, email = EMAIL) =>
		sendSignInLink(office.stranger(), { email, nonce });
	const enter = (token: string, nonce = NONCE) => signInByLink(office.stranger(), { token, nonce });
	const newestToken = async () => {
		const links = await office.db
			.select()
			.from(signInLinks)
			.where(eq(signInLinks.personId, tamsin));
		const open = links.find(({ usedAt }) => usedAt === null);
		return linkToken(SECRET, open!.id);
	};

	test('works once', async () => {
		await send();
		const token = await newestToken();
		const { session } = await enter(token);
		expect((await readSession(office.db, office.now, session.id))?.actor.personId).toBe(tamsin);
		await expect(enter(token)).rejects.toEqual(code('link-spent'));
	});

	test('is over after ten minutes', async () => {
		await send();
		office.wait(10);
		await expect(enter(await newestToken())).rejects.toEqual(code('link-spent'));
	});

	test('works in no other browser, and trying there doesn’t spend it', async () => {
		await send();
		const token = await newestToken();
		await expect(enter(token, 'another browser')).rejects.toEqual(code('link-spent'));
		await expect(enter(token, '')).rejects.toEqual(code('link-spent'));
		await expect(enter(token)).resolves.toBeDefined();
	});

	test('an older link is over when a newer one was asked for', async () => {
		await send();
		const older = await newestToken();
		await send();
		await expect(enter(older)).rejects.toEqual(code('link-spent'));
		await expect(enter(await newestToken())).resolves.toBeDefined();
	});

	test('an unknown address gets the same silence and no mail', async () => {
		await expect(send(NONCE, 'nobody@varrowmere.example')).resolves.toBeUndefined();
		expect(await office.db.select().from(outbox)).toEqual([]);
		await send();
		expect(await office.db.select().from(outbox)).toHaveLength(1);
	});

	test('five an hour for one address, known or not', async () => {
		for (const email of [EMAIL, 'nobody@varrowmere.example']) {
			for (let sent = 0; sent < 5; sent += 1) await send(NONCE, email);
			await expect(send(NONCE, email)).rejects.toEqual(code('links-slowed'));
		}
		office.wait(61);
		await expect(send()).resolves.toBeUndefined();
	});

	test('neither token nor nonce is kept anywhere', async () => {
		await send();
		const token = await newestToken();
		const kept = JSON.stringify([
			await office.db.select().from(signInLinks),
			await office.db.select().from(outbox),
			await office.db.select().from(daybook)
		]);
		expect(kept).not.toContain(token);
		expect(kept).not.toContain(NONCE);
	});

	test('a closed account can’t enter with a link sent before', async () => {
		await send();
		const token = await newestToken();
		await disablePerson(office.stranger(), tamsin);
		await expect(enter(token)).rejects.toEqual(code('link-spent'));
		expect(await office.db.select().from(sessions)).toEqual([]);
	});
});

test('the daybook takes no changes', async () => {
	await signIn(RIGHT);
	expect(await office.db.select({ event: daybook.event }).from(daybook)).toEqual([
		{ event: 'person-added' },
		{ event: 'signed-in' }
	]);
	await expect(office.db.update(daybook).set({ event: 'nothing' })).rejects.toThrow();
	await expect(office.db.delete(daybook)).rejects.toThrow();
});
