import { afterAll, beforeAll, beforeEach, describe, expect, test } from 'vitest';
import { openTestDatabase, type TestDatabase } from '../../../../tests/support/database.ts';
import { contentOf, Desk, reword, SLUG } from '../../../../tests/support/desk.ts';
import { noShelf, Office } from '../../../../tests/support/office.ts';
import { catalogue } from '../../physics/calculators/index.ts';
import { firstLight } from '../demo/first-light.ts';
import { daybook, outbox, signatures } from '../db/schema/index.ts';
import { signClaim, takeBackSignature } from './claims.ts';
import { examine } from './examination.ts';
import { passConditions, passProof, pullProof } from './proofs.ts';
import { answerQuery, closeQuery, raiseQuery } from './queries.ts';

let database: TestDatabase;
let office: Office;
let desk: Desk;

beforeAll(async () => {
	database = await openTestDatabase();
});
afterAll(() => database.close());
beforeEach(async () => {
	await database.fresh();
	office = new Office(database.db, noShelf);
	desk = await Desk.open(office);
});

const code = (code: string, details = {}) =>
	expect.objectContaining({ code, details: expect.objectContaining(details) });

describe('pulling a proof', () => {
	test('wants a complete piece, and lists what is missing', async () => {
		await desk.create();
		await expect(desk.pull()).rejects.toEqual(
			code('proof-not-ready', {
				findings: expect.arrayContaining([expect.objectContaining({ code: 'no-copy' })])
			})
		);
	});

	test('is refused while a number in the copy is neither tied nor named as no claim', async () => {
		await desk.toProof();
		await desk.edit((document) => reword(document, 'opening', 'faint', '3 watt'));
		await expect(desk.pull()).rejects.toEqual(
			code('proof-not-ready', {
				findings: [expect.objectContaining({ code: 'number-unweighed', at: { block: 'opening' } })]
			})
		);
	});

	test('twice from one draft gives one proof; after a change, the next', async () => {
		const first = await desk.toProof();
		expect(await pullProof(await office.as(desk.writer), SLUG)).toEqual({
			proofId: first,
			number: 1
		});
		await desk.edit((document) => reword(document, 'opening', 'faint', 'feeble'));
		expect(await pullProof(await office.as(desk.writer), SLUG)).toMatchObject({ number: 2 });
	});

	test('freezes: later edits leave the proof as it is', async () => {
		await desk.toProof();
		await desk.edit((document) => (document.title = 'Another title'));
		const { proof, title } = await desk.piece();
		expect(title).toBe('Another title');
		expect(proof?.document.title).toBe(firstLight.title);
	});

	test('the claims of an older proof can’t be signed any more', async () => {
		const older = await desk.toProof();
		await desk.edit((document) => reword(document, 'opening', 'faint', 'feeble'));
		await desk.pull();
		await expect(
			signClaim(await office.as(desk.scientist), SLUG, { proofId: older, claim: 'stretch' })
		).rejects.toEqual(code('proof-superseded', { newest: 2 }));
	});
});

describe('a signature lapses when what it covers changes, and only then', () => {
	const all = (state: string) => ({
		'rest-frequency': state,
		stretch: state,
		frequency: state,
		crest: state
	});
	beforeEach(() => desk.toChecked());
	const afterEdit = async (change: Parameters<Desk['edit']>[0]) => {
		await desk.edit(change);
		await desk.pull();
		return desk.states();
	};

	test('nothing changed: all four hold', async () => {
		expect(await desk.states()).toEqual(all('signed'));
	});

	test('one character of a signed sentence: that claim alone', async () => {
		expect(
			await afterEdit((document) =>
				reword(document, 'opening', 'a faint radio wave', 'a feint radio wave')
			)
		).toEqual({
			...all('signed'),
			'rest-frequency': 'lapsed'
		});
	});

	test('a comma counts', async () => {
		expect(
			await afterEdit((document) =>
				reword(document, 'opening', ' as long as it set out.', ', as long as it set out.')
			)
		).toEqual({
			...all('signed'),
			stretch: 'lapsed'
		});
	});

	test('the words of the claim itself', async () => {
		expect(
			await afterEdit((document) => {
				for (const inline of contentOf(document, 'opening')) {
					if (inline.kind === 'claim' && inline.claim === 'stretch')
						inline.text = 'nearly 21 times';
				}
			})
		).toEqual({ ...all('signed'), stretch: 'lapsed' });
	});

	test('a setting on the bench: every claim that hangs on it, and no other', async () => {
		expect(
			await afterEdit((document) => {
				const age = document.steps.find(({ id }) => id === 'age');
				age!.settings.cosmology = { from: 'fixed', value: { set: 'Planck15' } };
			})
		).toMatchObject({
			stretch: 'lapsed',
			frequency: 'lapsed',
			crest: 'lapsed',
			'rest-frequency': 'signed'
		});
	});

	test('where the slider starts: the claims it reaches', async () => {
		expect(await afterEdit((document) => (document.controls[0]!.initial = 190))).toMatchObject({
			frequency: 'lapsed',
			crest: 'lapsed',
			'rest-frequency': 'signed'
		});
	});

	test('the title, the point or a sentence without a claim: none', async () => {
		expect(
			await afterEdit((document) => {
				document.title = 'First light, on the dial';
				document.point = 'Another point.';
			})
		).toEqual(all('signed'));
	});

	test('put back as it was, the old signature holds again', async () => {
		await afterEdit((document) => reword(document, 'opening', 'faint', 'feeble'));
		expect(await afterEdit((document) => reword(document, 'opening', 'feeble', 'faint'))).toEqual(
			all('signed')
		);
	});

	test('the signer is told apart from the sentence that changed', async () => {
		await afterEdit((document) => reword(document, 'opening', 'faint', 'feeble'));
		const claim = (await desk.piece()).proof!.claims.find(({ id }) => id === 'rest-frequency')!;
		expect(claim.sentence).toContain('feeble');
		expect(claim.signatures).toMatchObject([
			{ inForce: false, proofNumber: 1, by: { name: 'Mateus Quevarro' } }
		]);
		expect(claim.signatures[0]!.sentence).toContain('faint');
	});

	test('taken back by its signer, and by nobody else', async () => {
		const signature = (await desk.piece()).proof!.claims[0]!.signatures[0]!;
		const ama = await office.add('Ama Tindleforth', ['scientist']);
		await expect(
			takeBackSignature(await office.as(ama), SLUG, { signatureId: signature.id })
		).rejects.toEqual(code('not-permitted'));
		await takeBackSignature(await office.as(desk.scientist), SLUG, { signatureId: signature.id });
		expect((await desk.states())[signature.claim]).toBe('unsigned');
	});

	test('signing again what one has signed changes nothing', async () => {
		const { proof } = await desk.piece();
		const first = proof!.claims[0]!;
		const again = await signClaim(await office.as(desk.scientist), SLUG, {
			proofId: proof!.id,
			claim: first.id
		});
		expect(again.signatureId).toBe(first.signatures[0]!.id);
	});
});

describe('signing', () => {
	test('wants a recent sign-in', async () => {
		const proofId = await desk.toProof();
		const ctx = await office.as(desk.scientist);
		office.wait(16);
		const later = { ...ctx, now: office.now };
		await expect(signClaim(later, SLUG, { proofId, claim: 'stretch' })).rejects.toEqual(
			code('confirm-by-link')
		);
	});

	test('a claim that tips can’t be signed', async () => {
		const tipping = structuredClone(firstLight);
		for (const inline of contentOf(tipping, 'opening')) {
			if (inline.kind === 'claim' && inline.claim === 'stretch') inline.text = 'about 42 times';
		}
		const proofId = await desk.toProof(tipping);
		await expect(
			signClaim(await office.as(desk.scientist), SLUG, { proofId, claim: 'stretch' })
		).rejects.toEqual(code('claim-tips'));
	});

	test('a claim without a number to weigh can’t be signed', async () => {
		const wordless = structuredClone(firstLight);
		for (const inline of contentOf(wordless, 'opening')) {
			if (inline.kind === 'claim' && inline.claim === 'stretch') inline.text = 'ever so much';
		}
		const proofId = await desk.toProof(wordless);
		await expect(
			signClaim(await office.as(desk.scientist), SLUG, { proofId, claim: 'stretch' })
		).rejects.toEqual(code('claim-unweighed'));
	});

	test('a claim that isn’t there is not found', async () => {
		const proofId = await desk.toProof();
		await expect(
			signClaim(await office.as(desk.scientist), SLUG, { proofId, claim: 'no-such' })
		).rejects.toEqual(code('not-found'));
	});
});

describe('a query', () => {
	const ask = async (by = desk.scientist) => {
		const { proof } = await desk.piece();
		return raiseQuery(await office.as(by), SLUG, {
			proofId: proof!.id,
			claim: 'stretch',
			question: 'Since when, exactly?'
		});
	};
	const thread = async () =>
		(await desk.piece()).proof!.claims.find(({ id }) => id === 'stretch')!.queries;

	test('is asked, answered and closed; meanwhile the claim can’t be signed', async () => {
		const proofId = await desk.toProof();
		const { queryId } = await ask();
		expect((await desk.states()).stretch).toBe('queried');
		expect(await desk.piece()).toMatchObject({
			working: 'queried',
			heldBy: { personId: desk.writer }
		});
		const sign = async () =>
			signClaim(await office.as(desk.scientist), SLUG, { proofId, claim: 'stretch' });
		await expect(sign()).rejects.toEqual(code('query-open'));

		await answerQuery(await office.as(desk.writer), SLUG, {
			queryId,
			answer: 'Since 180 million years.'
		});
		expect(await desk.piece()).toMatchObject({
			working: 'queried',
			heldBy: { personId: desk.scientist }
		});
		await expect(sign()).rejects.toEqual(code('query-open'));
		await closeQuery(await office.as(desk.scientist), SLUG, { queryId });
		await sign();
		expect((await desk.states()).stretch).toBe('signed');
		expect(await thread()).toMatchObject([
			{
				question: 'Since when, exactly?',
				answer: 'Since 180 million years.',
				askedBy: { personId: desk.scientist },
				answeredBy: { personId: desk.writer }
			}
		]);
		await expect(
			answerQuery(await office.as(desk.writer), SLUG, { queryId, answer: 'More.' })
		).rejects.toEqual(code('query-closed'));
	});

	test('stays open on the next proof, until it is closed', async () => {
		await desk.toProof();
		await ask();
		await desk.edit((document) => reword(document, 'opening', 'faint', 'feeble'));
		await desk.pull();
		expect((await desk.states()).stretch).toBe('queried');
	});

	test('can’t be closed by the writer who was asked', async () => {
		await desk.toProof();
		const { queryId } = await ask();
		await expect(closeQuery(await office.as(desk.writer), SLUG, { queryId })).rejects.toEqual(
			code('not-permitted')
		);
		await closeQuery(await office.as(desk.editor), SLUG, { queryId });
	});

	test('mails the writers, and the answer mails who asked; each mail is queued with the change', async () => {
		await desk.toProof();
		const { queryId } = await ask();
		await answerQuery(await office.as(desk.writer), SLUG, { queryId, answer: 'Since then.' });
		const mails = await office.db.select().from(outbox).orderBy(outbox.createdAt, outbox.event);
		expect(mails.map(({ event, toAddress }) => ({ event, toAddress }))).toEqual(
			expect.arrayContaining([
				{ event: 'query-raised', toAddress: 'tamsin@varrowmere.example' },
				{ event: 'query-answered', toAddress: 'mateus@varrowmere.example' }
			])
		);
		expect(mails).toHaveLength(2);
		expect(office.woken).toBeGreaterThanOrEqual(2);
		expect(JSON.stringify(mails)).not.toContain('Since when, exactly?');
	});

	test('a query that fails queues no mail', async () => {
		const proofId = await desk.toProof();
		await expect(
			raiseQuery(await office.as(desk.scientist), SLUG, {
				proofId,
				claim: 'no-such',
				question: 'Why?'
			})
		).rejects.toEqual(code('not-found'));
		await expect(
			raiseQuery(await office.as(desk.scientist), SLUG, {
				proofId,
				claim: 'stretch',
				question: 'W\u0000hy?'
			})
		).rejects.toEqual(code('input-broken'));
		expect(await office.db.select().from(outbox)).toEqual([]);
	});
});

describe('passing', () => {
	const conditions = async (by = desk.editor) => passConditions(await office.as(by), SLUG);
	const open = async (by?: string) => (await conditions(by)).filter(({ met }) => !met);

	test('a piece without a proof has one condition: that there be one', async () => {
		await desk.create();
		expect(await conditions()).toMatchObject([{ side: 'galley', met: false }]);
	});

	test('wants every claim signed, and says which aren’t and what to do', async () => {
		const proofId = await desk.toProof();
		expect(await open()).toMatchObject([
			{
				side: 'claims',
				says: '4 claims are not signed: 1a, 1b, 2a, 2b.',
				mend: expect.stringContaining('scientist')
			},
			{ side: 'people' }
		]);
		await expect(desk.pass(proofId)).rejects.toEqual(code('conditions-open'));
		await desk.signAll();
		expect(await open()).toEqual([]);
		await desk.pass(proofId);
		expect(await desk.piece()).toMatchObject({
			working: 'passed',
			proof: { passedBy: { personId: desk.editor } }
		});
	});

	test.each([
		['about 42 times', 'These tip: 1b.'],
		['some 26 times', 'These tip: 1b.'],
		['ever so much', 'These aren’t weighed: 1b.']
	])(
		'a claim that tips or isn’t weighed stands in the way, even signed: %s',
		async (words, says) => {
			const changed = structuredClone(firstLight);
			for (const inline of contentOf(changed, 'opening')) {
				if (inline.kind === 'claim' && inline.claim === 'stretch') inline.text = words;
			}
			const proofId = await desk.toProof(changed);
			const { id: pieceId } = await desk.piece();
			const { claims } = examine(changed, catalogue);
			await office.db.insert(signatures).values(
				claims.map(({ claim, cover, coverHash, sentence }) => ({
					pieceId,
					proofId,
					claim: claim.id,
					cover,
					coverHash,
					sentence,
					personId: desk.scientist,
					signedAt: office.now
				}))
			);
			expect(await open()).toMatchObject([{ side: 'claims', says }]);
			await expect(desk.pass(proofId)).rejects.toEqual(code('conditions-open'));
		}
	);

	test('an open query stands in the way, also when its words are tied anew', async () => {
		const asked = await desk.toProof();
		const { queryId } = await raiseQuery(await office.as(desk.scientist), SLUG, {
			proofId: asked,
			claim: 'stretch',
			question: 'Since when?'
		});
		await desk.edit((document) => {
			const again = (id: string) => (id === 'stretch' ? 'stretch-again' : id);
			for (const claim of document.claims) claim.id = again(claim.id);
			for (const inline of contentOf(document, 'opening'))
				if (inline.kind === 'claim') inline.claim = again(inline.claim);
		});
		const proofId = await desk.pull();
		await desk.signAll();
		expect(await open()).toMatchObject([
			{ side: 'claims', says: 'A query is open on a claim that is no longer in the copy.' }
		]);
		await expect(desk.pass(proofId)).rejects.toEqual(code('conditions-open'));
		expect(await desk.piece()).toMatchObject({
			working: 'queried',
			missing: '1 query',
			proof: { looseQueries: [{ id: queryId, question: 'Since when?' }] }
		});
		await closeQuery(await office.as(desk.scientist), SLUG, { queryId });
		expect((await desk.piece()).proof!.looseQueries).toEqual([]);
		await desk.pass(proofId);
	});

	test('an open query stands in the way', async () => {
		const proofId = await desk.toChecked();
		await raiseQuery(await office.as(desk.writer), SLUG, {
			proofId,
			claim: 'crest',
			question: 'Is it?'
		});
		expect(await open()).toMatchObject([{ side: 'claims', says: 'A query is open on 2b.' }]);
		await expect(desk.pass(proofId)).rejects.toEqual(code('conditions-open'));
	});

	test('wants a recent sign-in', async () => {
		const proofId = await desk.toChecked();
		const ctx = await office.as(desk.editor);
		office.wait(16);
		await expect(passProof({ ...ctx, now: office.now }, SLUG, { proofId })).rejects.toEqual(
			code('confirm-by-link')
		);
	});

	test('drops when a signature is taken back or a query raised', async () => {
		const proofId = await desk.toChecked();
		await desk.pass(proofId);
		const signature = (await desk.piece()).proof!.claims[0]!.signatures[0]!;
		await takeBackSignature(await office.as(desk.scientist), SLUG, { signatureId: signature.id });
		expect((await desk.piece()).proof!.passedBy).toBeNull();
		await desk.signAll();
		await desk.pass(proofId);
		await raiseQuery(await office.as(desk.scientist), SLUG, {
			proofId,
			claim: 'crest',
			question: 'Is it?'
		});
		expect(await desk.piece()).toMatchObject({ working: 'queried', proof: { passedBy: null } });
	});

	test('leaves a trail in the daybook, in order', async () => {
		await desk.pass(await desk.toChecked());
		const events = (await office.db.select().from(daybook).orderBy(daybook.seq)).map(
			({ event }) => event
		);
		expect(events.filter((event) => event !== 'person-added')).toEqual([
			'piece-created',
			'proof-pulled',
			'claim-signed',
			'claim-signed',
			'claim-signed',
			'claim-signed',
			'proof-passed'
		]);
	});
});

describe('writer, checker and editor of one proof are three people', () => {
	test('whoever changed the draft can’t sign it, whatever roles they have', async () => {
		const both = await office.add('Hanno Velisar', ['writer', 'scientist']);
		await desk.create();
		await desk.save(firstLight, both);
		const proofId = await desk.pull();
		await expect(
			signClaim(await office.as(both), SLUG, { proofId, claim: 'stretch' })
		).rejects.toEqual(code('same-person-twice'));
	});

	test('an editor who changed the draft can’t pass it', async () => {
		await desk.create();
		await desk.save(firstLight);
		await desk.edit((document) => reword(document, 'opening', 'faint', 'feeble'), desk.editor);
		const proofId = await desk.pull();
		await desk.signAll();
		await expect(desk.pass(proofId)).rejects.toEqual(code('same-person-twice'));
		const anselm = await office.add('Anselm Torviq', ['editor']);
		await desk.pass(proofId, anselm);
	});

	test('a scientist who signed one claim can’t pass it as an editor', async () => {
		const both = await office.add('Hanno Velisar', ['scientist', 'editor']);
		const proofId = await desk.toProof();
		await signClaim(await office.as(both), SLUG, { proofId, claim: 'stretch' });
		await desk.signAll();
		await expect(desk.pass(proofId, both)).rejects.toEqual(code('same-person-twice'));
		await desk.pass(proofId);
	});

	test('a signature stops counting when its signer becomes one of the writers', async () => {
		const both = await office.add('Hanno Velisar', ['writer', 'scientist']);
		await desk.toProof();
		await desk.signAll(both);
		await desk.edit((document) => (document.title = 'First light, on the dial'), both);
		await desk.pull();
		expect(new Set(Object.values(await desk.states()))).toEqual(new Set(['lapsed']));
	});
});
