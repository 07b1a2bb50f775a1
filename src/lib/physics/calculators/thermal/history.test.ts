import { describe, expect, test } from 'vitest';
import type { RawInputs } from '../../calculator.ts';
import { catalogue } from '../index.ts';
import { runCalculator } from '../run.ts';
import { resolveCosmology } from '../cosmology/parameters.ts';
import { thermalHistory } from './history.ts';

const planck = { set: 'Planck18' };
const run = (inputs: RawInputs) => runCalculator(catalogue.get('thermal.tla1')!, inputs);
function gasAt(z: number, more: RawInputs = {}): Record<string, number> {
	const result = run({ cosmology: planck, z, ...more });
	if (!result.ok) throw new Error(result.refusal.message);
	return Object.fromEntries(
		Object.entries(result.outputs).map(([key, { value }]) => [key, value as number])
	);
}

describe('gas that nothing warms', () => {
	// Decoupling at about z = 150 (Furlanetto, Oh & Briggs 2006, §2.1; from memory): three quarters of the background.
	test.each([
		[300, 0.94],
		[200, 0.85],
		[150, 0.76],
		[100, 0.61]
	])('lets go of the background slowly: at z = %d it has %d of its warmth', (z, ratio) => {
		expect(gasAt(z).ratio).toBeCloseTo(ratio, 2);
	});

	test('starts in step with the background, wholly ionised', () => {
		const start = gasAt(1700);
		expect(start.ratio).toBeCloseTo(1, 6);
		expect(start.x_e).toBeGreaterThan(0.999);
	});

	test('cools as the square of the stretch once it is free', () => {
		expect(gasAt(8).Tk! / gasAt(17).Tk!).toBeCloseTo(0.25, 2);
	});

	test('only ever cools and recombines', () => {
		const states = Array.from({ length: 600 }, (_, i) => gasAt(1700 * (1 - i / 600) ** 2));
		for (const [i, state] of states.slice(1).entries()) {
			expect(state.Tk).toBeLessThan(states[i]!.Tk!);
			expect(state.x_e).toBeLessThan(states[i]!.x_e!);
		}
	});

	// Published effect of the 2012 update of RECFAST, about one per cent at low redshift (RECFAST 1.5.2 notes; from memory).
	test('the older correction leaves 1.4 per cent fewer electrons', () => {
		const ratio = gasAt(200, { fudge: 'seager1999' }).x_e! / gasAt(200).x_e!;
		expect(ratio).toBeCloseTo(0.986, 3);
	});

	test('more gas recombines further; more helium leaves less hydrogen to meet', () => {
		expect(gasAt(20, { cosmology: { ...planck, Ob0: 0.06 } }).x_e).toBeLessThan(gasAt(20).x_e!);
		expect(gasAt(20, { Yp: 0.4 }).x_e).toBeGreaterThan(gasAt(20).x_e!);
	});
});

describe('limits', () => {
	test.each([
		[{ cosmology: { H0: 70, Om0: 0.3, Tcmb0: 2.7 }, z: 20 }, 'no-gas', /Ob0/],
		[{ cosmology: { set: 'Simple' }, z: 20 }, 'no-background', /Tcmb0/],
		[{ cosmology: { ...planck, Tcmb0: 5 }, z: 20 }, 'no-recombination', /2.4 to 4 K/],
		[{ cosmology: { ...planck, Tcmb0: 1 }, z: 20 }, 'no-recombination', /2.4 to 4 K/],
		[
			{ cosmology: { H0: 70, Om0: 0.1, Ode0: 2, Ob0: 0.05, Tcmb0: 2.7 }, z: 20 },
			'no-big-bang',
			/Big Bang/
		],
		[{ cosmology: planck, z: -0.1 }, 'out-of-range', /at least 0/],
		[{ cosmology: planck, z: 1701 }, 'out-of-range', /at most 1700/],
		[{ cosmology: planck, z: 20, Yp: 1 }, 'out-of-range', /at most 0.9/],
		[{ cosmology: planck, z: 20, fudge: 'none' }, 'unknown-choice', /recfast15/]
	] as [RawInputs, string, RegExp][])('%o: %s', (inputs, code, words) => {
		const result = run(inputs);
		if (result.ok) throw new Error('no refusal');
		expect(result.refusal.code).toBe(code);
		expect(result.refusal.message).toMatch(words);
	});

	test.each([
		[17.2, ['no-stars'], 'approximate'],
		[30, [], 'ok'],
		[1600, [], 'ok'],
		[1650, ['helium-left-out'], 'approximate']
	])('z = %d warns of %o', (z, codes, validity) => {
		const result = run({ cosmology: planck, z });
		expect(result).toMatchObject({ ok: true, validity });
		expect(result.ok && result.warnings.map(({ code }) => code)).toEqual(codes);
	});
});

test('one history serves every redshift of a cosmology, and takes this long', () => {
	const parameters = resolveCosmology(planck);
	if (!parameters.ok) throw new Error(parameters.refusal.message);
	const first = thermalHistory(parameters.value, 0.245);
	expect(thermalHistory({ ...parameters.value }, 0.245)).toBe(first);
	const times = Array.from({ length: 12 }, (_, i) => {
		const start = performance.now();
		thermalHistory({ ...parameters.value, set: null, H0: 67 + i / 100 }, 0.245);
		return performance.now() - start;
	}).sort((a, b) => a - b);
	process.stdout.write(
		`thermal history: ${times[0]!.toFixed(1)} ms at best, ${times[6]!.toFixed(1)} ms in the middle of ${times.length}\n`
	);
});
