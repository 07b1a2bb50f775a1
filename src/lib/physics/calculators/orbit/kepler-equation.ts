import { defineCalculator, type Computed } from '../../calculator.ts';
import { checksOf } from '../published-checks.ts';

const TURN = 2 * Math.PI;

/**
 * Where a body is on its ellipse: eccentric anomaly E from M = E − e sin E, and true anomaly, both in rad and counted on
 * past a full turn as M is. e in [0, 1), M in rad.
 */
export const keplerEquation = defineCalculator({
	id: 'orbit.kepler_equation',
	revision: '1.0.0',
	title: 'Place on an orbit',
	purpose: 'So much of the time of an orbit has gone by: where on its ellipse is the body?',
	asks: ['Where is a planet after a quarter of its year?', 'How does a comet hurry past the Sun?'],
	notFor: ['Orbits that don’t close.', 'How long the orbit takes: use the orbit around a mass.'],
	inputs: {
		M_rad: {
			kind: 'number',
			label: 'Share of the time gone by, as an angle (mean anomaly)',
			symbol: 'M',
			quantity: 'angle',
			unit: 'rad',
			min: -1e6,
			max: 1e6,
			initial: 1
		},
		e: {
			kind: 'number',
			label: 'Eccentricity',
			symbol: 'e',
			quantity: 'number',
			unit: '',
			min: 0,
			max: 1,
			maxExclusive: true,
			initial: 0.0167,
			optional: true
		}
	},
	outputs: {
		E: { label: 'Eccentric anomaly', symbol: 'E', quantity: 'angle', unit: 'rad' },
		trueAnomaly: {
			label: 'Angle from the nearest point (true anomaly)',
			symbol: 'ν',
			quantity: 'angle',
			unit: 'rad'
		}
	},
	equations: [
		{
			tex: 'M = E - e\\sin E',
			says: 'Time runs evenly in M; the equation has no closed answer and is solved step by step.'
		},
		{
			tex: '\\tan\\frac\\nu2 = \\sqrt{\\frac{1+e}{1-e}}\\,\\tan\\frac E2',
			says: 'From there to the angle as seen from the heavy body.'
		}
	],
	assumptions: ['Two bodies, and nothing else pulls.', 'M is 0 at the nearest point.'],
	warnings: [],
	sources: [
		{ title: 'Kepler 1609, Astronomia nova', fromMemory: true },
		{ title: 'Murray & Dermott 1999, Solar System Dynamics', locator: '§2.4', fromMemory: true }
	],
	checks: checksOf('orbit.kepler_equation'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ M_rad: M, e }): Computed {
		const turns = Math.round(M / TURN);
		const rest = M - turns * TURN;
		const E = Math.sign(rest) * eccentricAnomaly(Math.abs(rest), e);
		const values = { E: turns * TURN + E, trueAnomaly: turns * TURN + E + lead(E, e) };
		return { ok: true, values, uncertainties: 'exact' };
	}
});

/** E for M in [0, π]: Newton's steps, halving the bracket whenever one would leave it. */
function eccentricAnomaly(M: number, e: number): number {
	let low = M;
	let high = Math.min(Math.PI, M + e);
	let E = e < 0.8 ? M + e * Math.sin(M) : Math.PI;
	for (let step = 0; step < 50; step += 1) {
		if (!(E >= low && E <= high)) E = low + (high - low) / 2;
		// E − e sin E, formed so that it keeps its digits where both terms are nearly the same.
		const excess = (1 - e) * E + e * arcLessSine(E) - M;
		if (excess === 0) return E;
		if (excess > 0) high = E;
		else low = E;
		const half = Math.sin(E / 2);
		const move = excess / (1 - e + 2 * e * half * half);
		E -= move;
		if (Math.abs(move) <= 1e-16 * E) break;
	}
	return E;
}

/** E − sin E. */
function arcLessSine(E: number): number {
	if (E > 0.5) return E - Math.sin(E);
	let term = E ** 3 / 6;
	let sum = term;
	for (let n = 4; n < 16; n += 2) {
		term *= (-E * E) / (n * (n + 1));
		sum += term;
	}
	return sum;
}

/** How far the true anomaly runs ahead of E: 2 atan(β sin E/(1 − β cos E)) with β = e/(1 + √(1−e²)). */
function lead(E: number, e: number): number {
	const root = Math.sqrt((1 - e) * (1 + e));
	const beta = e / (1 + root);
	const half = Math.sin(E / 2);
	const oneLessBeta = (1 - e + root) / (1 + root);
	return 2 * Math.atan2(beta * Math.sin(E), oneLessBeta + 2 * beta * half * half);
}
