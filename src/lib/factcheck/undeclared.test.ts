import { describe, expect, test } from 'vitest';
import { firstLight } from '../server/demo/first-light.ts';
import { sameDrop } from '../server/demo/same-drop.ts';
import type { WidgetDocument } from '../widget/document.ts';
import { undeclared, undeclaredFindings } from './undeclared.ts';

const document: WidgetDocument = {
	...firstLight,
	title: 'Two notes, 68 megahertz apart',
	blocks: [
		{
			id: 'text',
			kind: 'paragraph',
			content: [
				{ kind: 'text', text: 'It is 7 metres long; ' },
				{ kind: 'claim', claim: 'it', text: 'about 14 metres' },
				{ kind: 'text', text: ' when doubled, in ' },
				{ kind: 'setting', control: 'wave-age' },
				{ kind: 'text', text: ' steps and several ways, a few kilometres off.' }
			]
		}
	]
};

describe('numbers nobody answers for', () => {
	test('are found where they stand; number words alone are let be', () => {
		const found = undeclared(document);
		expect(found.map(({ surface }) => surface)).toEqual([
			'68 megahertz',
			'7 metres',
			'a few kilometres'
		]);
		const text =
			'It is 7 metres long; about 14 metres when doubled, in \ufffc steps and several ways, a few kilometres off.';
		for (const { start, end, surface } of found.filter(({ blockId }) => blockId === 'text')) {
			expect(text.slice(start, end)).toBe(surface);
		}
	});

	test('are findings with a mend; one in the title says so', () => {
		expect(undeclaredFindings(document).map(({ code, at }) => [code, at])).toEqual([
			['number-in-caption', {}],
			['number-unweighed', { block: 'text' }],
			['number-unweighed', { block: 'text' }]
		]);
	});

	test('are found in every caption of a chart and a slider', () => {
		const captioned = structuredClone(firstLight);
		captioned.controls[0]!.label = 'Signal at 999 MHz';
		for (const block of captioned.blocks) {
			if (block.kind !== 'chart' || block.form !== 'line') continue;
			block.description = 'From 5 MHz up.';
			block.bands = [{ from: 1, to: 2, label: 'TV at 300 GHz' }];
		}
		expect(undeclared(captioned).map(({ surface }) => surface)).toEqual([
			'999 MHz',
			'5 MHz',
			'300 GHz'
		]);
	});

	test.each([firstLight, sameDrop])('$title has none', (piece) => {
		expect(undeclaredFindings(piece)).toEqual([]);
	});
});
