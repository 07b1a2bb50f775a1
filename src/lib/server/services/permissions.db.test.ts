/** Every service against the table of permissions: a role may exactly what the table says, at the service and not only on the page. */
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { openTestDatabase, type TestDatabase } from '../../../../tests/support/database.ts';
import { Desk, SLUG } from '../../../../tests/support/desk.ts';
import { noShelf, Office } from '../../../../tests/support/office.ts';
import { emptyCard } from '../../vetting/fresh.ts';
import { can, ROLES, type Action, type Role } from '../../workflow/permissions.ts';
import type { Context } from '../context.ts';
import { signClaim, takeBackSignature } from './claims.ts';
import {
	proposeHouseCalculator,
	readHouseCalculator,
	reviseHouseCalculator
} from './house-calculators.ts';
import { tryHouseCalculator } from './house-test.ts';
import { createPiece, getPiece, listPieces, saveDraft } from './pieces.ts';
import { passConditions, passProof, pullProof } from './proofs.ts';
import { answerQuery, closeQuery, raiseQuery } from './queries.ts';
import { releaseProof } from './releases.ts';
import { retestCalculator, vetCalculator, withdrawCalculator } from './vetting-acts.ts';
import { listFlags } from './vetting-flags.ts';
import { listCalculators, readVettings } from './vettings.ts';

let database: TestDatabase;
let office: Office;
const people = new Map<Role | 'none', string>();

beforeAll(async () => {
	database = await openTestDatabase();
	office = new Office(database.db, noShelf);
	const desk = await Desk.open(office);
	await desk.create();
	for (const role of ROLES) people.set(role, await office.add(`Someone-${role} Else`, [role]));
	people.set('none', await office.add('Nobody Atall', []));
});
afterAll(() => database.close());

const REVISION = { base: '1.0.0', change: 'patch' as const, note: 'Nothing.' };
const NO_REVISION = { calculator: 'house.nowhere', revision: '1.0.0', note: 'Nothing.' };

/**
 * Each service, the action it asks for, and how it's called. Input is made to fail right after the permission: what
 * comes back is then anything but a denial for those who may.
 */
const SERVICES: [name: string, action: Action, call: (ctx: Context) => Promise<unknown>][] = [
	['listPieces', 'read-desk', (ctx) => listPieces(ctx)],
	['getPiece', 'read-proof', (ctx) => getPiece(ctx, 'nowhere')],
	['createPiece', 'create-piece', (ctx) => createPiece(ctx, { title: 'Taken', slug: SLUG })],
	['saveDraft', 'edit-draft', (ctx) => saveDraft(ctx, SLUG, { baseVersion: 1, document: null })],
	['pullProof', 'pull-proof', (ctx) => pullProof(ctx, 'nowhere')],
	['passConditions', 'read-proof', (ctx) => passConditions(ctx, 'nowhere')],
	['signClaim', 'sign-claim', (ctx) => signClaim(ctx, 'nowhere', { proofId: 'x', claim: 'x' })],
	[
		'takeBackSignature',
		'read-proof',
		(ctx) => takeBackSignature(ctx, 'nowhere', { signatureId: 'x' })
	],
	[
		'raiseQuery',
		'query-claim',
		(ctx) => raiseQuery(ctx, 'nowhere', { proofId: 'x', claim: 'x', question: 'Why?' })
	],
	[
		'answerQuery',
		'answer-query',
		(ctx) => answerQuery(ctx, 'nowhere', { queryId: 'x', answer: 'So.' })
	],
	['closeQuery', 'query-claim', (ctx) => closeQuery(ctx, 'nowhere', { queryId: 'x' })],
	['passProof', 'pass-proof', (ctx) => passProof(ctx, 'nowhere', { proofId: 'x' })],
	['releaseProof', 'release-proof', (ctx) => releaseProof(ctx, 'nowhere', { proofId: 'x' })],
	[
		'proposeHouseCalculator',
		'propose-calculator',
		(ctx) => proposeHouseCalculator(ctx, { ...emptyCard(), slug: 'nothing' })
	],
	[
		'reviseHouseCalculator',
		'propose-calculator',
		(ctx) => reviseHouseCalculator(ctx, 'house.nowhere', { ...emptyCard(), ...REVISION })
	],
	['readHouseCalculator', 'propose-calculator', (ctx) => readHouseCalculator(ctx, 'house.nowhere')],
	['tryHouseCalculator', 'propose-calculator', async (ctx) => tryHouseCalculator(ctx, {})],
	['vetCalculator', 'vet-calculator', (ctx) => vetCalculator(ctx, NO_REVISION)],
	['withdrawCalculator', 'withdraw-calculator', (ctx) => withdrawCalculator(ctx, NO_REVISION)],
	['retestCalculator', 'propose-calculator', (ctx) => retestCalculator(ctx, NO_REVISION)],
	['listFlags', 'read-proof', (ctx) => listFlags(ctx)],
	['listCalculators', 'read-calculators', (ctx) => listCalculators(ctx)],
	['readVettings', 'read-calculators', (ctx) => readVettings(ctx, 'cosmo.at_z')]
];

const DENIALS = ['not-permitted', 'same-person-twice', 'not-signed-in'];
const outcome = (call: Promise<unknown>) =>
	call.then(
		() => 'done',
		(error: { code?: string }) => error.code ?? String(error)
	);

describe.each(SERVICES)('%s asks for %s', (_name, action, call) => {
	test.each([...ROLES])('%s', async (role) => {
		const ctx = await office.as(people.get(role)!);
		const may = can(ctx.actor!, action);
		const got = await outcome(call(ctx));
		if (may) expect(DENIALS).not.toContain(got);
		else expect(got).toBe('not-permitted');
	});

	test('someone without a role may not', async () => {
		expect(await outcome(call(await office.as(people.get('none')!)))).toBe('not-permitted');
	});

	test('a stranger is asked to sign in', async () => {
		expect(await outcome(call(office.stranger()))).toBe('not-signed-in');
	});
});
