import { describe, expect, test } from 'vitest';
import { catalogue } from '../physics/calculators/index.ts';
import { firstLight } from '../server/demo/first-light.ts';
import { sameDrop } from '../server/demo/same-drop.ts';
import { compareDocuments } from './compare.ts';
import type { WidgetDocument } from './document.ts';

const compared = (before: WidgetDocument, change: (copy: WidgetDocument) => void) => {
	const after = structuredClone(before);
	change(after);
	return compareDocuments(before, after, catalogue);
};
const find = <T extends { id: string }>(list: T[], id: string): T => {
	const found = list.find((one) => one.id === id);
	if (!found) throw new Error(`nothing is called ${id}`);
	return found;
};

test('a document and itself are the same', () => {
	const comparison = compared(firstLight, () => undefined);
	expect(comparison).toMatchObject({ isSame: true, wiring: [], settings: [] });
	expect(comparison.blocks.every(({ what, isMoved }) => what === 'same' && !isMoved)).toBe(true);
});

describe('words', () => {
	test('are compared one by one, in the block they stand in', () => {
		const { blocks, isSame } = compared(firstLight, ({ blocks }) => {
			const block = find(blocks, 'limits');
			if ('content' in block)
				block.content = [{ kind: 'text', text: 'how bright the oldest stars were.' }];
		});
		expect(isSame).toBe(false);
		const { what, words } = find(blocks, 'limits');
		expect(what).toBe('changed');
		expect(words?.slice(0, 4)).toEqual([
			{ kind: 'same', text: 'how bright the ' },
			{ kind: 'gone', text: 'first' },
			{ kind: 'new', text: 'oldest' },
			{ kind: 'same', text: ' stars were.' }
		]);
		const join = (...kinds: string[]) =>
			words
				?.filter(({ kind }) => kinds.includes(kind))
				.map(({ text }) => text)
				.join('');
		expect(join('same', 'new')).toBe('how bright the oldest stars were.');
		expect(join('same', 'gone')).toContain('That needs the strength of the wave');
	});

	test('title and point too', () => {
		const { title, point } = compared(firstLight, (document) => {
			document.title = 'First light on your dial';
			document.point = '';
		});
		expect(title).toContainEqual({ kind: 'new', text: 'your' });
		expect(point).toEqual([{ kind: 'gone', text: firstLight.point }]);
	});

	test('added, taken out and moved blocks say so; what was taken out stands where it stood', () => {
		const { blocks } = compared(firstLight, (document) => {
			document.blocks = document.blocks.filter(({ id }) => id !== 'result');
			document.blocks.unshift(...document.blocks.splice(3, 1), {
				id: 'new',
				kind: 'paragraph',
				content: [{ kind: 'text', text: 'New.' }]
			});
		});
		expect(blocks.map(({ id, what, isMoved }) => [id, what, isMoved])).toEqual([
			['limits', 'same', true],
			['new', 'added', false],
			['opening', 'same', false],
			['result', 'taken-out', false],
			['slider', 'same', false],
			['dial', 'same', false]
		]);
	});

	test('emphasis is a change of its own', () => {
		const { blocks } = compared(sameDrop, ({ blocks }) => {
			const block = find(blocks, 'caution');
			if ('content' in block && block.content[0]?.kind === 'text') delete block.content[0].marks;
		});
		expect(find(blocks, 'caution').settings).toEqual([
			{ name: 'strong', before: 'Don’t build one from this.', after: null }
		]);
	});
});

describe('wiring, controls and axes', () => {
	test('a peg that was turned shows by its label, and in the words it moves', () => {
		const { wiring, blocks } = compared(sameDrop, ({ steps }) => {
			find(steps, 'weight').settings.counterweight_kg = { from: 'fixed', value: 7000 };
		});
		expect(wiring).toEqual([
			expect.objectContaining({
				name: expect.stringMatching(/^Calculator “.+”$/),
				what: 'changed',
				settings: [{ name: expect.any(String), before: '6000 kg', after: '7000 kg' }]
			})
		]);
		expect(find(blocks, 'result').what).toBe('changed');
		expect(find(blocks, 'opening').what).toBe('same');
	});

	test('a tie says what it hung on and what it hangs on', () => {
		const { wiring } = compared(firstLight, ({ claims }) => {
			claims[1] = { id: 'stretch', form: 'stated', reading: { control: 'wave-age' } };
		});
		expect(wiring).toEqual([
			expect.objectContaining({
				name: 'Number “about 21 times”',
				settings: [
					{
						name: 'reading',
						before: expect.stringContaining(': '),
						after: 'the slider “The wave left at this age”'
					}
				]
			})
		]);
	});

	test('a setting that now follows a reading', () => {
		const { wiring } = compared(sameDrop, ({ steps }) => {
			find(steps, 'climb').settings.height_m = { from: 'control', control: 'drop' };
		});
		expect(wiring[0]?.settings).toEqual([
			{
				name: expect.any(String),
				before: '12 m',
				after: 'follows the slider “How far the weight falls”'
			}
		]);
	});

	test('a control’s ends and where it starts, in its unit', () => {
		const { wiring } = compared(sameDrop, (document) => {
			document.controls[0] = { ...document.controls[0]!, max: 12, initial: 5.5 } as never;
		});
		expect(wiring).toEqual([
			{
				list: 'controls',
				id: 'drop',
				name: 'Slider “How far the weight falls”',
				what: 'changed',
				settings: [
					{ name: 'highest', before: '10 m', after: '12 m' },
					{ name: 'first setting', before: '8 m', after: '5.5 m' }
				]
			}
		]);
	});

	test('where an axis starts, its bands and what a line shows', () => {
		const { blocks } = compared(firstLight, ({ blocks }) => {
			const chart = find(blocks, 'dial');
			if (chart.kind !== 'chart' || chart.form !== 'line') throw new Error('no line');
			chart.y.from = 'zero';
			chart.bands = [];
			chart.series[0]!.reading = { step: 'line', output: 'observedWavelength' };
			chart.y.unit = 'm';
		});
		expect(find(blocks, 'dial')).toMatchObject({ what: 'changed', words: null });
		expect(find(blocks, 'dial').settings).toEqual([
			{ name: 'upright axis unit', before: 'MHz', after: 'm' },
			{ name: 'upright axis from', before: 'the lowest point', after: '0' },
			{ name: '“line” reading', before: expect.any(String), after: expect.any(String) },
			{ name: 'bands', before: 'FM radio: from 87.5, to 108', after: null }
		]);
	});

	test('a calculator that was added or taken away tells what it was set to', () => {
		const { wiring } = compared(sameDrop, (document) => {
			document.steps = document.steps.filter(({ id }) => id !== 'climb');
			document.claims = document.claims.filter(({ id }) => id !== 'climb' && id !== 'wall');
		});
		expect(wiring.map(({ id, what }) => `${id} ${what}`)).toEqual([
			'climb taken-out',
			'climb taken-out',
			'wall taken-out'
		]);
		expect(wiring[0]?.settings).toContainEqual({
			name: expect.any(String),
			before: '12 m',
			after: null
		});
	});

	test('another constants edition or language', () => {
		const { settings } = compared(firstLight, (document) => (document.constants = '2027.1'));
		expect(settings).toEqual([{ name: 'constants edition', before: '2026.1', after: '2027.1' }]);
	});
});

test('a kind of block that nothing here knows is compared all the same', () => {
	const block = { id: 'x', kind: 'hologram', depth: 3, lens: { focus: 'near' }, parts: [1, 2] };
	const before = { ...firstLight, blocks: [block] } as unknown as WidgetDocument;
	const { blocks } = compared(before, (document) => {
		Object.assign(document.blocks[0]!, { depth: 4, lens: { focus: 'far' }, parts: [1, 3] });
	});
	expect(blocks[0]?.settings).toEqual([
		{ name: 'depth', before: '3', after: '4' },
		{ name: 'lens focus', before: 'near', after: 'far' },
		{ name: 'parts', before: '1; 2', after: '1; 3' }
	]);
});
