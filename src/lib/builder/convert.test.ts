import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { anyOf } from '../../../tests/support/from-schema.ts';
import { Control, hasOptions } from '../widget/control.ts';
import {
	Block,
	isTextBlock,
	TEXT_KINDS,
	WidgetDocument,
	type Claim,
	type Inline,
	type Step
} from '../widget/document.ts';
import { LANGUAGES } from '../widget/language.ts';
import { readableDocument, toDocument, toManuscript } from './convert.ts';

const id = (prefix: string) => fc.nat(999).map((n) => `${prefix}-${n}`);
const words = fc.string({ minLength: 1, maxLength: 30, unit: 'grapheme' });
const finite = fc.double({ noNaN: true, noDefaultInfinity: true });

/** Rules across a control's fields: ends in order, a start that is one of them, options of one sort. */
const control = anyOf(Control).map((made): Control => {
	if (hasOptions(made)) {
		const options = made.options.map(({ label }, value) => ({ label, value }));
		return Control.parse({ ...made, options, initial: made.initial % options.length });
	}
	const [min = 0, initial = 0, max = 0] = [made.min, made.initial, made.max].sort((a, b) => a - b);
	return min < max ? { ...made, min, initial, max } : { ...made, min: 1, initial: 1, max: 2 };
});

/** Every block that is drawn from fields, by the schema; names that the language has taken aren’t keys. */
const drawn = anyOf(Block).filter((block) => !isTextBlock(block) && Block.safeParse(block).success);

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
		hedge: fc.constantFrom('none' as const, 'about' as const, 'fitting' as const)
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
				kind: fc.constantFrom(...TEXT_KINDS),
				content: inlines([])
			}),
			drawn
		);
		return fc.record({
			version: fc.constant(2 as const),
			language: fc.constantFrom(...LANGUAGES),
			constants: fc.constant('2026.1'),
			title: fc.string({ maxLength: 40 }),
			point: fc.string({ maxLength: 40 }),
			formulas: fc.constant([]),
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
			version: 2,
			language: 'en',
			constants: '2026.1',
			title: '',
			point: '',
			formulas: [],
			steps: [],
			controls: [],
			blocks: [],
			claims: []
		});
		expect(toDocument(manuscript).blocks).toMatchObject([{ kind: 'paragraph', content: [] }]);
	});

	describe('words found in a browser', () => {
		const found = {
			version: 2,
			language: 'en',
			constants: '2026.1',
			title: 'x'.repeat(130),
			point: '',
			formulas: [],
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
			version: 2,
			language: 'en',
			constants: '2026.1',
			title: '',
			point: '',
			formulas: [],
			steps: [],
			controls: [],
			blocks: [{ id: 'block-1', kind: 'paragraph', content: [] }],
			claims: [{ id: 'claim-1', form: 'exempt', reason: 'A year.' }]
		};
		expect(toDocument(toManuscript(document)).claims).toEqual([]);
	});
});
