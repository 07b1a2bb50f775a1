/** Rates at which collisions flip the spin of hydrogen, and the coupling they give. */
import { naturalSpline } from '../../numerics/spline.ts';
import type { Gas } from '../thermal/gas.ts';
import { EMISSION_RATE, LINE_TEMPERATURE } from './hydrogen-line.ts';

export type CollisionPair = 'HH' | 'eH' | 'pH';

/** K, and cm³/s. */
interface Rates {
	temperatures: readonly number[];
	rates: readonly number[];
	source: string;
}

const SHARED_GRID = [
	1, 2, 5, 10, 20, 50, 100, 200, 500, 1000, 2000, 3000, 5000, 7000, 10_000, 15_000, 20_000
];

export const COLLISION_RATES: Record<CollisionPair, Rates> = {
	HH: {
		temperatures: [
			1, 2, 4, 6, 8, 10, 15, 20, 25, 30, 40, 50, 60, 70, 80, 90, 100, 200, 300, 500, 700, 1000,
			2000, 3000, 5000, 7000, 10_000
		],
		rates: [
			1.38e-13, 1.43e-13, 2.71e-13, 6.6e-13, 1.47e-12, 2.88e-12, 9.1e-12, 1.78e-11, 2.73e-11,
			3.67e-11, 5.38e-11, 6.86e-11, 8.14e-11, 9.25e-11, 1.02e-10, 1.11e-10, 1.19e-10, 1.75e-10,
			2.09e-10, 2.56e-10, 2.91e-10, 3.31e-10, 4.27e-10, 4.97e-10, 6.03e-10, 6.87e-10, 7.87e-10
		],
		source:
			'Zygelman 2005, ApJ 622, 1356; above 300 K as tabulated in Furlanetto, Oh & Briggs 2006; matched against a public transcription'
	},
	eH: {
		temperatures: SHARED_GRID,
		rates: [
			2.39e-10, 3.37e-10, 5.3e-10, 7.46e-10, 1.05e-9, 1.63e-9, 2.26e-9, 3.11e-9, 4.59e-9, 5.92e-9,
			7.15e-9, 7.71e-9, 8.17e-9, 8.32e-9, 8.37e-9, 8.29e-9, 8.11e-9
		],
		source: 'Furlanetto & Furlanetto 2007, MNRAS 374, 547; matched against a public transcription'
	},
	pH: {
		temperatures: SHARED_GRID,
		rates: [
			4e-10, 4.517e-10, 4.301e-10, 3.699e-10, 3.172e-10, 3.047e-10, 3.379e-10, 4.043e-10, 5.471e-10,
			7.051e-10, 9.167e-10, 1.07e-9, 1.301e-9, 1.48e-9, 1.695e-9, 1.975e-9, 2.201e-9
		],
		source: 'Furlanetto & Furlanetto 2007, MNRAS 379, 130 (from memory)'
	}
};

const log = (values: readonly number[]) => values.map(Math.log);
const curves = Object.fromEntries(
	Object.entries(COLLISION_RATES).map(([pair, { temperatures, rates }]) => [
		pair,
		naturalSpline(log(temperatures), log(rates))
	])
) as Record<CollisionPair, (lnT: number) => number>;

/** κ in cm³/s at T in K: a natural cubic spline in the logarithms; the end values beyond the tables. */
export function collisionRate(pair: CollisionPair, T: number): number {
	return Math.exp(curves[pair](Math.log(T)));
}

/** Whether a temperature lies beyond the table of any of these pairs. */
export function beyondTables(
	T: number,
	pairs: readonly CollisionPair[] = ['HH', 'eH', 'pH']
): boolean {
	return pairs.some((pair) => {
		const { temperatures } = COLLISION_RATES[pair];
		return T < (temperatures[0] ?? 0) || T > (temperatures.at(-1) ?? 0);
	});
}

/** x_c of gas at T (K) with x_e free electrons for each hydrogen nucleus, at u = 1 + z. */
export function collisionalCoupling(gas: Gas, u: number, T: number, x_e: number): number {
	const perCubicCm = gas.hydrogenDensity(u) * 1e-6;
	const flips =
		perCubicCm *
		((1 - x_e) * collisionRate('HH', T) + x_e * (collisionRate('eH', T) + collisionRate('pH', T)));
	return (LINE_TEMPERATURE * flips) / (EMISSION_RATE * gas.background(u));
}
