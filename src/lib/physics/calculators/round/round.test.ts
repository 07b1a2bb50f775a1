import { describe, expect, test } from 'vitest';
import type { RawInputs } from '../../calculator.ts';
import { catalogue } from '../index.ts';
import { runCalculator } from '../run.ts';

const run = (id: string, inputs: RawInputs) => runCalculator(catalogue.get(id)!, inputs);
function text(id: string, inputs: RawInputs): unknown {
	const result = run(id, inputs);
	if (!result.ok) throw new Error(result.refusal.message);
	return result.outputs.text?.value;
}

describe('significant digits', () => {
	test.each([
		['9.996', 3, '10.0'],
		['-0.04', 1, '-0.04'],
		['0', 3, '0'],
		['1234567', 2, '1200000'],
		['1.5e-30', 1, '2e-30'],
		['0.00012345', 2, '0.00012'],
		['2.3', 4, '2.300'],
		[2.675, 3, '2.68'],
		['−7.25', 2, '-7.2']
	])('%o to %d: %s', (given, digits, rounded) => {
		expect(text('round.significant', { text: given, digits })).toBe(rounded);
	});
});

describe('decimals', () => {
	// ISO 80000-1:2009, annex B, examples of rules A and B (from memory).
	test.each([
		['12.25', 1, 'half-even', '12.2'],
		['12.35', 1, 'half-even', '12.4'],
		['12.25', 1, 'half-away', '12.3'],
		['1225', -1, 'half-even', '1220'],
		['1235', -1, 'half-even', '1240'],
		['-12.25', 1, 'half-away', '-12.3'],
		['2.4499', 1, 'half-even', '2.4'],
		['-0.004', 2, 'half-even', '0.00'],
		['50', -2, 'half-even', '0'],
		['51', -2, 'half-even', '100'],
		['7', -2, 'half-even', '0'],
		['2', 2, 'half-even', '2.00']
	])('%s to %d, %s: %s', (given, decimals, mode, rounded) => {
		expect(text('round.decimals', { text: given, decimals, mode })).toBe(rounded);
	});
});

describe('a value with its uncertainty', () => {
	// GUM 7.2.2: m_S = 100.021 47(35) g.
	test.each([
		['100.02147', '0.00035', 2, '100.02147(35)'],
		['67.66', '1.4', 2, '67.7(1.4)'],
		['1234', '46', 1, '1230(50)'],
		['123456', '1234', 2, '123500(1200)'],
		['0.0996', '0.0996', 2, '0.10(10)'],
		['99.97', '0.96', 1, '100(1)'],
		['6.62607015e-34', '8.1e-42', 2, '6.626070150(81)e-34'],
		['0', '0.03', 1, '0.00(3)'],
		['5', '10', 2, '5(10)']
	])('%s, %s to %d: %s', (x, u, digits, written) => {
		expect(text('round.with_uncertainty', { x, u, digits })).toBe(written);
	});

	test('left to the house rule: two digits behind a 1 or 2, one from 3 on', () => {
		expect(text('round.with_uncertainty', { x: '13.78688', u: '0.0203' })).toBe('13.787(20)');
		expect(text('round.with_uncertainty', { x: '67.66', u: '0.42' })).toBe('67.7(4)');
		expect(text('round.with_uncertainty', { x: 67.66, u: 0.42 })).toBe('67.7(4)');
	});
});

describe('refusals', () => {
	test.each([
		['round.significant', { text: 'two', digits: 3 }, 'not-a-decimal', 'text'],
		['round.significant', { text: '', digits: 3 }, 'not-a-decimal', 'text'],
		['round.significant', { text: '1'.repeat(61), digits: 3 }, 'not-a-decimal', 'text'],
		['round.significant', { text: '0x10', digits: 3 }, 'not-a-decimal', 'text'],
		['round.significant', { text: '1.5', digits: 0 }, 'out-of-range', 'digits'],
		['round.significant', { text: '1.5', digits: 2.5 }, 'not-whole', 'digits'],
		['round.significant', { text: '1.5', digits: 2, mode: 'up' }, 'unknown-choice', 'mode'],
		['round.decimals', { text: '1.5', decimals: 41 }, 'out-of-range', 'decimals'],
		['round.with_uncertainty', { x: '1.5', u: '0' }, 'no-uncertainty', 'u'],
		['round.with_uncertainty', { x: '1.5', u: '-0.1' }, 'no-uncertainty', 'u'],
		['round.with_uncertainty', { x: '1.5', u: '0.1', digits: 3 }, 'out-of-range', 'digits']
	] as [string, RawInputs, string, string][])('%s %o: %s', (id, inputs, code, input) => {
		const result = run(id, inputs);
		if (result.ok) throw new Error('no refusal');
		expect(result.refusal.code).toBe(code);
		expect(result.refusal.input).toBe(input);
		expect(result.refusal.message).toMatch(/\.$/);
	});
});
