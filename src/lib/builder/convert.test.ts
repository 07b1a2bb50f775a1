import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import {
	WidgetDocument,
	type Block,
	type Claim,
	type Control,
	type Inline,
	type Step
} from '../widget/document.ts';
import { readableDocument, toDocument, toManuscript } from './convert.ts';

const id = (prefix: string) => fc.nat(999).map((n) => `${prefix}-${n}`);
const words = fc.string({ minLength: 1, maxLength: 30, unit: 'grapheme' });
const finite = fc.double({ noNaN: true, noDefaultInfinity: true });

const control: fc.Arbitrary<Control> = fc
	.record({
		id: id('control'),
		label: words,
		unit: fc.constantFrom('', 'MHz', 'Myr'),
		min: fc.integer({ min: -100, max: 0 }),
		span: fc.integer({ min: 1, max: 100 }),
		step: fc.integer({ min: 1, max: 5 }),
		at: fc.double({ min: 0, max: 1, noNaN: true })
	})
	.map(({ span, at, ...rest }) => ({
		...rest,
		kind: 'slider',
		max: rest.min + span,
		initial: rest.min + Math.floor(span * at)
	}));

const step: fc.Arbitrary<Step> = fc.record({
	id: id('step'),
	calculator: fc.constantFrom('cosmo.inverse', 'line.observe'),
	revision: fc.constant('1.0.0'),
	settings: fc.dictionary(
		fc.constantFrom('value', 'kind', 'z', 'cosmology'),
		fc.oneof(
			finite.map((value) => ({ from: 'fixed' as const, value })),
			fc.record({ from: fc.constant('control' as const), control: id('control') }),
			fc.record({
				from: fc.constant('reading' as const),
				step: id('step'),
				output: fc.constant('z')
			}),
			fc.record({
				from: fc.constant('line' as const),
				line: fc.constant('HI-21cm'),
				value: finite
			})
		),
		{ noNullPrototype: true }
	)
});

const reading = fc.oneof(
	fc.record({ step: id('step'), output: fc.constant('z') }),
	fc.record({ step: id('step'), setting: fc.constant('value') }),
	fc.record({ control: id('control') })
);

const claim: fc.Arbitrary<Claim> = fc.oneof(
	fc.record({ id: id('claim'), form: fc.constant('stated' as const), reading }),
	fc.record({
		id: id('claim'),
		form: fc.constant('live' as const),
		reading,
		unit: fc.constantFrom('', 'MHz'),
		figures: fc.integer({ min: 1, max: 6 }),
		hedge: fc.constantFrom('none' as const, 'about' as const)
	}),
	fc.record({ id: id('claim'), form: fc.constant('exempt' as const), reason: words })
);

/** Each claim once in the copy; neighbours that would join into one run of text are kept apart by a setting. */
function inlines(claims: readonly Claim[]): fc.Arbitrary<Inline[]> {
	const text: fc.Arbitrary<Inline> = fc.record(
		{
			kind: fc.constant('text' as const),
			text: words,
			marks: fc.constantFrom<('em' | 'strong')[]>(['em'], ['strong'], ['em', 'strong'])
		},
		{ requiredKeys: ['kind', 'text'] }
	);
	return fc
		.array(fc.tuple(text, id('control')), { maxLength: 4 })
		.chain((runs) =>
			fc
				.tuple(
					fc.constant(runs),
					fc.array(words, { minLength: claims.length, maxLength: claims.length })
				)
				.map(([texts, claimWords]) => [
					...texts.flatMap(([run, controlId]): Inline[] => [
						run,
						{ kind: 'setting', control: controlId }
					]),
					...claims.map((entry, index): Inline =>
						entry.form === 'live'
							? { kind: 'live', claim: entry.id }
							: { kind: 'claim', claim: entry.id, text: claimWords[index] ?? '?' }
					)
				])
		);
}

const distinct = { selector: (entry: { id: string }) => entry.id, maxLength: 5 };

const widgetDocument: fc.Arbitrary<WidgetDocument> = fc
	.record({
		claims: fc.uniqueArray(claim, distinct),
		controls: fc.uniqueArray(control, distinct),
		steps: fc.uniqueArray(step, distinct)
	})
	.chain(({ claims, controls, steps }) => {
		const block: fc.Arbitrary<Block> = fc.oneof(
			fc.record({
				id: id('block'),
				kind: fc.constantFrom('paragraph', 'heading', 'result', 'limits', 'caution'),
				content: inlines([])
			}),
			fc.record({ id: id('block'), kind: fc.constant('control' as const), control: id('control') }),
			fc.record({
				id: id('block'),
				kind: fc.constant('chart' as const),
				title: words,
				x: fc.record({ control: id('control'), label: words }),
				y: fc.record({ reading, unit: fc.constantFrom('', 'MHz'), label: words }),
				bands: fc.array(fc.record({ from: finite, to: finite, label: words }), { maxLength: 2 }),
				source: words,
				description: words
			})
		);
		return fc.record({
			version: fc.constant(1 as const),
			language: fc.constant('en' as const),
			constants: fc.constant('2026.1'),
			title: fc.string({ maxLength: 40 }),
			point: fc.string({ maxLength: 40 }),
			steps: fc.constant(steps),
			controls: fc.constant(controls),
			claims: fc.constant(claims),
			blocks: fc
				.tuple(
					fc.array(block, { maxLength: 5 }),
					fc.record({
						id: id('block'),
						kind: fc.constantFrom('paragraph', 'result'),
						content: inlines(claims)
					})
				)
				.map(([others, withClaims]): Block[] => [...others, withClaims])
		});
	});

describe('widget document and manuscript', () => {
	test('any document comes back as it went in', () => {
		fc.assert(
			fc.property(widgetDocument, (document) => {
				expect(WidgetDocument.safeParse(document).error).toBeUndefined();
				const manuscript = toManuscript(document);
				manuscript.check();
				expect(toDocument(manuscript)).toEqual(document);
			}),
			{ numRuns: 200 }
		);
	});

	test('a sheet without blocks gets an empty paragraph to type in', () => {
		const manuscript = toManuscript({
			version: 1,
			language: 'en',
			constants: '2026.1',
			title: '',
			point: '',
			steps: [],
			controls: [],
			blocks: [],
			claims: []
		});
		expect(toDocument(manuscript).blocks).toMatchObject([{ kind: 'paragraph', content: [] }]);
	});

	describe('words found in a browser', () => {
		const found = {
			version: 1,
			language: 'en',
			constants: '2026.1',
			title: 'x'.repeat(130),
			point: '',
			steps: [{ id: 'step-1', calculator: 'gone.since', revision: '1', settings: {} }],
			controls: [],
			blocks: [{ id: 'block-1', kind: 'paragraph', content: [{ kind: 'text', text: 'Words.' }] }],
			claims: []
		};

		test('can stand in the sheet though the server would refuse them', () => {
			expect(WidgetDocument.safeParse(found).success).toBe(false);
			expect(readableDocument(found)).toBe(found);
		});

		test.each([
			['nothing', null],
			['no title', { ...found, title: null }],
			['no list of blocks', { ...found, blocks: undefined }],
			['a block of no kind', { ...found, blocks: [{ id: 'block-1', kind: 'ballad' }] }],
			['a calculator without settings', { ...found, steps: [{ id: 'a', calculator: 'b' }] }]
		])('%s is no sheet', (_, stored) => {
			expect(readableDocument(stored)).toBeNull();
		});
	});

	test('a claim whose words are gone is left out of the document', () => {
		const document: WidgetDocument = {
			version: 1,
			language: 'en',
			constants: '2026.1',
			title: '',
			point: '',
			steps: [],
			controls: [],
			blocks: [{ id: 'block-1', kind: 'paragraph', content: [] }],
			claims: [{ id: 'claim-1', form: 'exempt', reason: 'A year.' }]
		};
		expect(toDocument(toManuscript(document)).claims).toEqual([]);
	});
});
