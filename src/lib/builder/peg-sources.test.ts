import { describe, expect, test } from 'vitest';
import { catalogue } from '../physics/calculators/index.ts';
import { firstLight } from '../server/demo/first-light.ts';
import { evaluate } from '../widget/evaluate.ts';
import { benchReadings } from './bench-readings.ts';
import { readingsForPeg } from './peg-sources.ts';

describe('readings a setting can be fed from', () => {
	/** The age is far out of its range, so that the redshift is refused and the line has none. */
	const steps = structuredClone(firstLight.steps);
	const [age, line] = steps;
	if (!age || !line) throw new Error('The demo has two calculators.');
	age.settings.value = { from: 'fixed', value: -1 };
	const readings = benchReadings(
		{ steps, controls: [] },
		evaluate({ ...firstLight, steps, controls: [] }, {}, catalogue),
		catalogue
	);
	const offered = (unit: string) =>
		readingsForPeg(steps, line, unit, readings, catalogue).map(({ ref }) => ref);

	test('are offered while they are refused, so that the tie can be mended', () => {
		expect(readings.find(({ tag }) => tag === 'A')?.outcome.ok).toBe(false);
		expect(offered('')).toContainEqual({ step: age.id, output: 'z' });
	});

	test('are never offered in a unit of another kind, or to what they feed on', () => {
		expect(offered('MHz')).toEqual([]);
		const back = readingsForPeg(steps, age, 'MHz', readings, catalogue);
		expect(back).toEqual([]);
	});
});
