import { expect, test } from 'vitest';
import { catalogue } from '../physics/calculators/index.ts';
import type { Step } from '../widget/document.ts';
import { evaluate } from '../widget/evaluate.ts';
import { benchReadings } from './bench-readings.ts';
import { readingsForPeg } from './peg-sources.ts';

const age = (value: number): Step => ({
	id: 'age',
	calculator: 'cosmo.inverse',
	revision: '1.0.0',
	settings: {
		cosmology: { from: 'fixed', value: { set: 'Planck18' } },
		kind: { from: 'fixed', value: 'z_from_age' },
		value: { from: 'fixed', value }
	}
});
const line: Step = {
	id: 'line',
	calculator: 'line.observe',
	revision: '1.0.0',
	settings: {
		restFrequency_Hz: { from: 'fixed', value: 1420405751.768 },
		z: { from: 'fixed', value: 20 }
	}
};

function offered(steps: Step[], step: Step, unit: string): string[] {
	const document = { steps, formulas: [], controls: [] };
	const readings = benchReadings(document, evaluate(document, {}, catalogue), catalogue);
	return readingsForPeg(document, step, unit, readings, catalogue).map(({ ref }) =>
		'output' in ref ? `${ref.step} ${ref.output}` : ''
	);
}

test('readings whose unit fits are offered, refused ones too', () => {
	expect(offered([age(0.18), line], line, '')).toContain('age z');
	// Older than the Universe: refused, and still what the setting may be tied to.
	expect(offered([age(200), line], line, '')).toContain('age z');
	expect(offered([age(0.18), line], line, 'Hz')).toEqual([]);
});

test('what feeds on the step itself is never offered', () => {
	const fed: Step = {
		...line,
		settings: { ...line.settings, z: { from: 'reading', step: 'age', output: 'z' } }
	};
	expect(offered([age(0.18), fed], age(0.18), 'Hz')).toEqual([]);
});
