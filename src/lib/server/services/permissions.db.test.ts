/** Every service against the table of permissions: a role may exactly what the table says, at the service and not only on the page. */
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { openTestDatabase, type TestDatabase } from '../../../../tests/support/database.ts';
import { Desk, SLUG } from '../../../../tests/support/desk.ts';
import { noShelf, Office } from '../../../../tests/support/office.ts';
import { emptyCard } from '../../vetting/fresh.ts';
import { HOUSE_THEME } from '../../themes/theme.ts';
import { emptyRecord } from '../../pictures/record.ts';
import { EMPTY_SLIP } from '../../workflow/slip.ts';
import { can, ROLES, type Action, type Role } from '../../workflow/permissions.ts';
import type { Context } from '../context.ts';
import { exportCopy } from './copy-export.ts';
import { signClaim, takeBackSignature } from './claims.ts';
import {
	proposeHouseCalculator,
	readHouseCalculator,
	reviseHouseCalculator
} from './house-calculators.ts';
import { tryFormula } from './formula-steps.ts';
import { takeBackFormula, vetFormula } from './formula-vettings.ts';
import { tryHouseCalculator } from './house-test.ts';
import { replacePicture } from './pictures-replace.ts';
import {
	addPicture,
	deletePicture,
	getPicture,
	listPictures,
	readPictureFile,
	savePictureRecord
} from './pictures.ts';
import { listSpiked, recoverPiece, spikePiece } from './draft-spike.ts';
import { createPiece } from './draft-start.ts';
import { listDrafts, nameDraft, openDraft, restoreDraft } from './history.ts';
import { getPiece, lastSigned, listPieces, saveDraft } from './pieces.ts';
import { passConditions, passProof, pullProof } from './proofs.ts';
import { answerQuery, closeQuery, raiseQuery } from './queries.ts';
import { releaseProof } from './releases.ts';
import { saveSlip } from './slips.ts';
import { deleteTheme, listThemes, saveTheme } from './themes.ts';
import { retestCalculator, vetCalculator, withdrawCalculator } from './vetting-acts.ts';
import { listFlags } from './vetting-flags.ts';
import { listCalculators, readVettings } from './vettings.ts';
import { importWordFile } from './word-import.ts';

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

/** Too pale to be kept. */
const PALE = { ...HOUSE_THEME, id: '', name: 'Pale', accent: '#ffee99' } as const;
const REVISION = { base: '1.0.0', change: 'patch' as const, note: 'Nothing.' };
const NO_SLIP = {
	was: EMPTY_SLIP,
	fields: { reader: '', partner: '', embargo: '', words: '', due: '', zone: 'UTC' }
};
async function* noBytes(): AsyncGenerator<Uint8Array> {}
const NO_FORMULA = { proofId: 'x', digest: '0'.repeat(64), note: '' };
const NO_REVISION = { calculator: 'house.nowhere', revision: '1.0.0', note: 'Nothing.' };

/**
 * Each service, the action it asks for, and how it's called. Input is made to fail right after the permission: what
 * comes back is then anything but a denial for those who may.
 */
const SERVICES: [name: string, action: Action, call: (ctx: Context) => Promise<unknown>][] = [
	['listPieces', 'read-desk', (ctx) => listPieces(ctx)],
	['getPiece', 'read-proof', (ctx) => getPiece(ctx, 'nowhere')],
	['exportCopy', 'read-proof', (ctx) => exportCopy(ctx, 'nowhere')],
	['importWordFile', 'edit-draft', (ctx) => importWordFile(ctx, noBytes())],
	['listThemes', 'read-themes', (ctx) => listThemes(ctx)],
	['saveTheme', 'edit-themes', (ctx) => saveTheme(ctx, PALE)],
	['deleteTheme', 'edit-themes', (ctx) => deleteTheme(ctx, 'nowhere')],
	['createPiece', 'create-piece', (ctx) => createPiece(ctx, { title: 'Taken', slug: SLUG })],
	['saveDraft', 'edit-draft', (ctx) => saveDraft(ctx, SLUG, { baseVersion: 1, document: null })],
	['lastSigned', 'read-desk', (ctx) => lastSigned(ctx)],
	['saveSlip', 'edit-draft', (ctx) => saveSlip(ctx, 'nowhere', NO_SLIP)],
	['listSpiked', 'read-desk', (ctx) => listSpiked(ctx)],
	['spikePiece', 'spike-piece', (ctx) => spikePiece(ctx, 'nowhere')],
	['recoverPiece', 'recover-piece', (ctx) => recoverPiece(ctx, 'nowhere')],
	['listDrafts', 'read-proof', (ctx) => listDrafts(ctx, 'nowhere')],
	['openDraft', 'read-proof', (ctx) => openDraft(ctx, 'nowhere', 1)],
	['nameDraft', 'edit-draft', (ctx) => nameDraft(ctx, 'nowhere', { version: 1, name: '' })],
	[
		'restoreDraft',
		'edit-draft',
		(ctx) => restoreDraft(ctx, 'nowhere', { version: 1, baseVersion: 1 })
	],
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
	['tryFormula', 'edit-draft', (ctx) => Promise.resolve().then(() => tryFormula(ctx, null))],
	['vetFormula', 'vet-formula', (ctx) => vetFormula(ctx, 'nowhere', NO_FORMULA)],
	['takeBackFormula', 'read-proof', (ctx) => takeBackFormula(ctx, 'nowhere', NO_FORMULA)],
	['withdrawCalculator', 'withdraw-calculator', (ctx) => withdrawCalculator(ctx, NO_REVISION)],
	['retestCalculator', 'propose-calculator', (ctx) => retestCalculator(ctx, NO_REVISION)],
	['listFlags', 'read-proof', (ctx) => listFlags(ctx)],
	['listCalculators', 'read-calculators', (ctx) => listCalculators(ctx)],
	['readVettings', 'read-calculators', (ctx) => readVettings(ctx, 'cosmo.at_z')],
	['listPictures', 'read-pictures', (ctx) => listPictures(ctx)],
	['getPicture', 'read-pictures', (ctx) => getPicture(ctx, 'nowhere')],
	['readPictureFile', 'read-pictures', (ctx) => readPictureFile(ctx, 'nowhere')],
	[
		'addPicture',
		'add-picture',
		(ctx) => addPicture(ctx, { body: noBytes(), fileName: 'a.png', declaredType: '' })
	],
	[
		'savePictureRecord',
		'record-picture',
		(ctx) => savePictureRecord(ctx, 'nowhere', { baseVersion: 1, record: emptyRecord() })
	],
	['replacePicture', 'replace-picture', (ctx) => replacePicture(ctx, 'nowhere', 'nowhere')],
	['deletePicture', 'delete-picture', (ctx) => deletePicture(ctx, 'nowhere')]
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
