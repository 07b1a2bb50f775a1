import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { catalogue } from '../physics/calculators/index.ts';
import { firstLight } from '../server/demo/first-light.ts';
import { sameDrop } from '../server/demo/same-drop.ts';
import { isTextBlock, type Inline, type TextBlock, type WidgetDocument } from './document.ts';
import { choicesOf, decideAsk, type Ask } from './merge-ask.ts';
import { mergeDocuments } from './merge.ts';
import { parseDocument } from './parse.ts';

const changed = (document: WidgetDocument, change: (copy: WidgetDocument) => void) => {
	const copy = structuredClone(document);
	change(copy);
	return copy;
};
const text = (document: WidgetDocument, id: string): TextBlock => {
	const block = document.blocks.find((candidate) => candidate.id === id);
	if (!block || !isTextBlock(block)) throw new Error(`no text block ${id}`);
	return block;
};
const write = (id: string, words: string) => (document: WidgetDocument) => {
	text(document, id).content.push({ kind: 'text', text: words });
};
const paragraph = (id: string, words: string): TextBlock => ({
	id,
	kind: 'paragraph',
	content: [{ kind: 'text', text: words }]
});
const ids = ({ blocks }: WidgetDocument) => blocks.map(({ id }) => id);
const merge = (base: WidgetDocument, mine: WidgetDocument, theirs: WidgetDocument) => {
	const merged = mergeDocuments(base, mine, theirs, catalogue);
	expect(parseDocument(merged.document, catalogue)).toMatchObject({ ok: true });
	return merged;
};
const only = (asks: Ask[]): Ask => {
	expect(asks).toHaveLength(1);
	return asks[0]!;
};

describe('different places', () => {
	test('words in two blocks, a title and a new block all stand', () => {
		const mine = changed(firstLight, (document) => {
			write('opening', ' Mine.')(document);
			document.title = 'My title';
		});
		const theirs = changed(firstLight, (document) => {
			write('limits', ' Theirs.')(document);
			document.blocks.push(paragraph('new', 'A new end.'));
		});
		const { document, asks } = merge(firstLight, mine, theirs);
		expect(asks).toEqual([]);
		expect(document.title).toBe('My title');
		expect(text(document, 'opening').content.at(-1)).toEqual({ kind: 'text', text: ' Mine.' });
		expect(text(document, 'limits').content.at(-1)).toEqual({ kind: 'text', text: ' Theirs.' });
		expect(ids(document).at(-1)).toBe('new');
	});

	test('a claim tied by one and a slider changed by the other both hold', () => {
		const mine = changed(firstLight, (document) => {
			text(document, 'limits').content.push({ kind: 'claim', claim: 'start', text: '180' });
			document.claims.push({ id: 'start', form: 'stated', reading: { control: 'wave-age' } });
		});
		const theirs = changed(firstLight, (document) => {
			document.controls[0] = { ...document.controls[0]!, label: 'When it left' };
		});
		const { document, asks } = merge(firstLight, mine, theirs);
		expect(asks).toEqual([]);
		expect(document.claims.map(({ id }) => id)).toContain('start');
		expect(document.controls[0]?.label).toBe('When it left');
	});

	test('a block that one moves and the other writes in is moved and written in', () => {
		const mine = changed(firstLight, ({ blocks }) => blocks.unshift(...blocks.splice(4, 1)));
		const theirs = changed(firstLight, write('limits', ' Theirs.'));
		const { document, asks } = merge(firstLight, mine, theirs);
		expect(asks).toEqual([]);
		expect(ids(document)).toEqual(['limits', 'opening', 'result', 'slider', 'dial']);
		expect(text(document, 'limits').content.at(-1)).toMatchObject({ text: ' Theirs.' });
	});

	test('blocks put in at the same place stand one after the other, and moves of both are kept', () => {
		const mine = changed(firstLight, ({ blocks }) => {
			blocks.splice(1, 0, paragraph('m-1', 'm'), paragraph('m-2', 'm'));
		});
		const theirs = changed(firstLight, ({ blocks }) => {
			blocks.splice(1, 0, paragraph('t-1', 't'), paragraph('t-2', 't'));
			blocks.push(...blocks.splice(3, 1));
		});
		const { document } = merge(firstLight, mine, theirs);
		expect(ids(document)).toEqual([
			...['opening', 't-1', 't-2', 'm-1', 'm-2'],
			...['slider', 'dial', 'limits', 'result']
		]);
	});

	test('a claim whose words both carried elsewhere stands twice, each with a name of its own', () => {
		const carry = (to: string) => (document: WidgetDocument) => {
			const from = text(document, 'opening');
			const claim = from.content.find((inline) => 'claim' in inline && inline.claim === 'stretch');
			from.content = from.content.filter((inline) => inline !== claim);
			document.blocks.push({ id: to, kind: 'paragraph', content: [claim as Inline] });
		};
		const { document, asks } = merge(
			firstLight,
			changed(firstLight, carry('mine')),
			changed(firstLight, carry('theirs'))
		);
		expect(asks).toEqual([]);
		expect(document.claims.map(({ id }) => id)).toEqual([
			...['rest-frequency', 'stretch', 'frequency', 'crest', 'stretch-2']
		]);
	});
});

describe('the same place', () => {
	const mine = changed(firstLight, write('opening', ' Mine.'));
	const theirs = changed(firstLight, write('opening', ' Theirs.'));

	test('a block that both changed keeps mine in the copy, and an ask holds both', () => {
		const { document, asks } = merge(firstLight, mine, theirs);
		expect(document).toEqual(mine);
		expect(only(asks)).toMatchObject({
			place: 'blocks/opening',
			reason: 'both-changed',
			stands: 'mine',
			mine: { value: text(mine, 'opening') },
			theirs: { value: text(theirs, 'opening') }
		});
	});

	test('keep mine, keep theirs, keep both', () => {
		const { document, asks } = merge(firstLight, mine, theirs);
		const ask = only(asks);
		expect(choicesOf(ask)).toEqual(['mine', 'theirs', 'both']);
		expect(decideAsk(document, ask, 'mine', catalogue)).toEqual({ ok: true, document });
		expect(decideAsk(document, ask, 'theirs', catalogue)).toEqual({ ok: true, document: theirs });
		const both = decideAsk(document, ask, 'both', catalogue);
		if (!both.ok) throw new Error(both.message);
		expect(ids(both.document).slice(0, 2)).toEqual(['opening', 'opening-2']);
		expect(text(both.document, 'opening-2').content.at(-1)).toMatchObject({ text: ' Theirs.' });
		expect(both.document.claims.map(({ id }) => id)).toEqual([
			...['rest-frequency', 'stretch', 'frequency', 'crest', 'rest-frequency-2', 'stretch-2']
		]);
	});

	test('what was written since stays when mine is kept, and goes when theirs is', () => {
		const { document, asks } = merge(firstLight, mine, theirs);
		const later = changed(document, write('opening', ' And more.'));
		expect(decideAsk(later, only(asks), 'mine', catalogue)).toEqual({ ok: true, document: later });
		expect(decideAsk(later, only(asks), 'theirs', catalogue)).toEqual({
			ok: true,
			document: theirs
		});
	});

	test('two titles are one choice', () => {
		const titled = (title: string) => changed(firstLight, (document) => (document.title = title));
		const { document, asks } = merge(firstLight, titled('Mine'), titled('Theirs'));
		const ask = only(asks);
		expect(document.title).toBe('Mine');
		expect(choicesOf(ask)).toEqual(['mine', 'theirs']);
		expect(decideAsk(document, ask, 'theirs', catalogue)).toMatchObject({
			document: { title: 'Theirs' }
		});
	});

	test.each([
		['mine', 'theirs'],
		['theirs', 'mine']
	] as const)(
		'a block taken out on one side and changed on the other stays: %s took it out',
		(out, worked) => {
			const without = changed(firstLight, (document) => {
				document.blocks = document.blocks.filter(({ id }) => id !== 'limits');
			});
			const written = changed(firstLight, write('limits', ' More.'));
			const { document, asks } =
				out === 'mine' ? merge(firstLight, without, written) : merge(firstLight, written, without);
			const ask = only(asks);
			expect(text(document, 'limits').content.at(-1)).toMatchObject({ text: ' More.' });
			expect(ask).toMatchObject({ reason: 'taken-out', stands: worked, [out]: null });
			expect(decideAsk(document, ask, out, catalogue)).toEqual({ ok: true, document: without });
		}
	);

	test('a tie that both changed is one ask about the claim', () => {
		const tie = (output: string) =>
			changed(firstLight, (document) => {
				document.claims[1] = { id: 'stretch', form: 'stated', reading: { step: 'age', output } };
			});
		const { document, asks } = merge(firstLight, tie('z'), tie('scaleFactor'));
		expect(document.claims[1]).toMatchObject({ reading: { output: 'z' } });
		expect(only(asks)).toMatchObject({ place: 'claims/stretch', reason: 'both-changed' });
	});
});

describe('wiring that doesn’t fit together', () => {
	const feed = (to: string, from: string) => (document: WidgetDocument) => {
		const step = document.steps.find(({ id }) => id === to)!;
		step.settings.v0_ms = { from: 'reading', step: from, output: 'impactSpeed' };
	};

	test('two ties that would close a ring: mine holds, theirs is asked about', () => {
		const mine = changed(sameDrop, feed('flat', 'lofted'));
		const theirs = changed(sameDrop, (document) => {
			feed('lofted', 'flat')(document);
			write('opening', ' Theirs.')(document);
		});
		const { document, asks } = merge(sameDrop, mine, theirs);
		const ask = only(asks);
		expect(ask).toMatchObject({ place: 'steps/lofted', reason: 'no-fit', stands: 'mine' });
		expect(text(document, 'opening').content.at(-1)).toMatchObject({ text: ' Theirs.' });
		expect(decideAsk(document, ask, 'theirs', catalogue)).toMatchObject({
			ok: false,
			message: expect.stringContaining('ring')
		});
	});

	test('a calculator taken off the bench while the other ties a number to it comes back', () => {
		const mine = changed(sameDrop, (document) => {
			document.steps = document.steps.filter(({ id }) => id !== 'lofted');
			document.claims = document.claims.filter(({ id }) => id !== 'lofted-speed');
			text(document, 'result').content = text(document, 'result').content.filter(
				(inline) => !('claim' in inline) || inline.claim !== 'lofted-speed'
			);
		});
		const theirs = changed(sameDrop, (document) => {
			text(document, 'limits').content.push({ kind: 'claim', claim: 'high', text: '12 m/s' });
			const reading = { step: 'lofted', output: 'impactSpeed' };
			document.claims.push({ id: 'high', form: 'stated', reading });
		});
		const { document, asks } = merge(sameDrop, mine, theirs);
		expect(document.steps.map(({ id }) => id)).toEqual(['weight', 'climb', 'flat', 'lofted']);
		expect(only(asks)).toMatchObject({
			place: 'steps/lofted',
			reason: 'still-in-use',
			mine: null,
			stands: 'theirs'
		});
	});

	describe('of the piece’s own formulas', () => {
		const stored: unknown = JSON.parse(
			readFileSync(
				new URL('../../../tests/documents/v2-thrown-stone.json', import.meta.url),
				'utf8'
			)
		);
		const parsed = parseDocument(stored, catalogue);
		if (!parsed.ok) throw new Error(JSON.stringify(parsed.issues));
		const thrown = parsed.document;

		test('a formula changed by one and its setting by the other both hold', () => {
			const mine = changed(thrown, ({ formulas }) => (formulas[0]!.title = 'Height of the stone'));
			const theirs = changed(thrown, ({ steps }) => {
				steps[0]!.settings.speed = { from: 'fixed', value: 14 };
			});
			const { document, asks } = merge(thrown, mine, theirs);
			expect(asks).toEqual([]);
			expect(document.formulas[0]?.title).toBe('Height of the stone');
			expect(document.steps[0]?.settings.speed).toEqual({ from: 'fixed', value: 14 });
		});

		test('one taken away while the other hangs another step on it comes back', () => {
			const mine = changed(thrown, (document) => {
				document.formulas = [];
				document.steps = [];
				document.claims = [];
				document.blocks = document.blocks.filter(({ kind }) => kind === 'control');
			});
			const theirs = changed(thrown, (document) => {
				document.steps.push({ ...document.steps[0]!, id: 'again' });
			});
			const { document, asks } = merge(thrown, mine, theirs);
			expect(document.formulas.map(({ id }) => id)).toEqual(['thrown']);
			expect(document.steps.map(({ id }) => id)).toEqual(['again']);
			expect(asks.map(({ place, reason }) => [place, reason])).toContainEqual([
				'formulas/thrown',
				'still-in-use'
			]);
		});
	});

	test('more sliders than a piece may have: those over are asked about', () => {
		const add = (who: string) =>
			changed(firstLight, (document) => {
				for (let number = 0; number < 8; number += 1) {
					const id = `${who}-${number}`;
					document.controls.push({ ...document.controls[0]!, id });
					document.blocks.push({ id: `at-${id}`, kind: 'control', control: id });
				}
			});
		const { document, asks } = merge(firstLight, add('mine'), add('theirs'));
		expect(document.controls).toHaveLength(12);
		expect(asks.map(({ place }) => place)).toEqual(
			[3, 4, 5, 6, 7]
				.flatMap((n) => [`controls/theirs-${n}`])
				.concat([3, 4, 5, 6, 7].map((n) => `blocks/at-theirs-${n}`))
		);
	});
});

test('a hundred blocks are merged within 50 ms', () => {
	const base = changed(firstLight, ({ blocks }) => {
		for (let number = 0; number < 95; number += 1)
			blocks.push(paragraph(`p-${number}`, `Words of paragraph ${number}. `.repeat(12)));
	});
	const mine = changed(base, (document) => {
		for (let number = 0; number < 95; number += 2) write(`p-${number}`, ' Mine.')(document);
	});
	const theirs = changed(base, (document) => {
		for (let number = 1; number < 95; number += 2) write(`p-${number}`, ' Theirs.')(document);
	});
	const times = Array.from({ length: 20 }, () => {
		const start = performance.now();
		merge(base, mine, theirs);
		return performance.now() - start;
	}).sort((a, b) => a - b);
	expect(times[10]).toBeLessThan(50);
});
