import { describe, expect, test } from 'vitest';
import { catalogue } from '../physics/calculators/index.ts';
import { firstLight } from '../server/demo/first-light.ts';
import { sameDrop } from '../server/demo/same-drop.ts';
import { columnsDrawn, gapsDrawn, itemsDrawn, seriesDrawn } from './chart-data.ts';
import type { WidgetDocument } from './document.ts';
import { evaluate, sampleChart } from './evaluate.ts';

const sourceOf = (document: WidgetDocument, values = {}) => ({
	document,
	evaluation: evaluate(document, values, catalogue),
	calculators: catalogue
});
const stored = { step: 'weight', output: 'storedEnergy' };
const kept = { step: 'climb', output: 'energy' };

// 6000 kg × 8 m and 60 kg × 12 m with g = 9.80665 m/s² (CGPM 1901).
const STORED_KJ = (6000 * 9.80665 * 8) / 1000;
const KEPT_KJ = (60 * 9.80665 * 12) / 1000;

test('readings come in the chart’s unit, and follow the controls', () => {
	const axis = { label: 'energy', unit: 'kJ' };
	const columns = [
		{
			id: 'out',
			label: 'Out',
			parts: [
				{ id: 'a', label: 'Given up', reading: stored },
				{ id: 'b', label: 'Kept', reading: kept }
			]
		}
	];
	const [column] = columnsDrawn({ axis, columns }, sourceOf(sameDrop));
	expect(column!.parts.map(({ value }) => value)).toEqual([
		expect.closeTo(STORED_KJ, 9),
		expect.closeTo(KEPT_KJ, 9)
	]);
	const [moved] = columnsDrawn({ axis, columns }, sourceOf(sameDrop, { drop: 4 }));
	expect(moved!.parts[0]!.value).toBeCloseTo(STORED_KJ / 2, 9);
});

describe('what can’t be drawn says why', () => {
	const items = [
		{ id: 'a', label: 'Given up', reading: stored },
		{ id: 'b', label: 'Gone', reading: { step: 'gone', output: 'x' } },
		{ id: 'c', label: 'Line', line: 'h-alpha', value: 656.28 }
	];

	test('a reading that isn’t there, and one in another unit', () => {
		const drawn = itemsDrawn(
			{ axis: { label: 'q', unit: 'm', scale: 'linear' }, items },
			sourceOf(sameDrop)
		);
		expect(drawn.map(({ value }) => value)).toEqual([null, null, 656.28]);
		expect(drawn[0]!.refusal).toBe('This reading can’t be given in m.');
		expect(drawn[1]!.refusal).toContain('isn’t on the bench');
		expect(drawn[2]!.refusal).toBe('');
	});
});

test('a chart prints as many figures as the copy does', () => {
	const live = firstLight.claims.find((claim) => claim.form === 'live' && claim.unit === 'MHz');
	expect(live?.form).toBe('live');
	if (live?.form !== 'live') return;
	const drawn = seriesDrawn(
		{
			y: { unit: 'MHz', label: '', scale: 'linear', from: 'data' },
			series: [{ id: 'a', label: '', reading: live.reading }]
		},
		sourceOf(firstLight)
	);
	expect(drawn[0]!.figures).toBe(live.figures);
});

test('a gap says where it is and why', () => {
	const controls = firstLight.controls.map((control) =>
		control.kind === 'slider' ? { ...control, min: -200, step: 5 } : control
	);
	const document = { ...firstLight, controls };
	const chart = {
		x: { control: 'wave-age', label: '', scale: 'linear' as const },
		y: { unit: 'MHz', label: '', scale: 'linear' as const, from: 'data' as const },
		series: [{ id: 'a', label: '', reading: { step: 'line', output: 'observedFrequency' } }]
	};
	const lines = sampleChart(document, {}, chart, catalogue);
	const [gap, ...others] = gapsDrawn(document, {}, chart, lines, catalogue);
	expect(others).toEqual([]);
	expect(gap).toMatchObject({ series: 0, from: -200 });
	expect(gap!.to).toBeLessThanOrEqual(0.01);
	expect(gap!.message).not.toBe('');
});
