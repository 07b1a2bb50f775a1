/**
 * How the gas cooled while nothing but the background of light warmed it: hydrogen as an atom of three levels, helium
 * neutral throughout (“TLA1”), from z = 1700 to now.
 *
 * Peebles 1968, ApJ 153, 1; Seager, Sasselov & Scott 1999, ApJ 523, L1; Wong, Moss & Scott 2008, MNRAS 386, 1023, with
 * the two Gaussians and the factor of RECFAST 1.5.2. Recombination coefficient of Péquignot, Petitjean & Boisson 1991.
 */
import { refuse, type Refusal } from '../../calculator.ts';
import { constants, type ConstantsEdition } from '../../constants/index.ts';
import { solveStiffPair, type Pair } from '../../numerics/rosenbrock.ts';
import { naturalSpline } from '../../numerics/spline.ts';
import type { CosmologyParameters } from '../cosmology/parameters.ts';
import { printNumber } from '../wording.ts';
import { gasOf, type Gas } from './gas.ts';

export const FIRST_Z = 1700;

/** Which correction to the recombination rate is used. */
export type Fudge = 'recfast15' | 'seager1999';

export interface GasState {
	/** Free electrons for each hydrogen nucleus. */
	x_e: number;
	/** K */
	Tk: number;
}

export interface ThermalHistory {
	gas: Gas;
	/** The gas at z in [0, 1700]. */
	at(z: number): GasState;
}

type Opened = { ok: true; history: ThermalHistory } | { ok: false; refusal: Refusal };

const { h, c, k, sigma } = constants.physical;

/** 1/m: from the second level to the continuum, and Lyman α (RECFAST 1.5.2, from memory). */
const IONISATION = 1.096787737e7;
const LYMAN_ALPHA = 8.225916453e6;
/** 1/s: two photons from the second level (RECFAST 1.5.2, from memory). */
const TWO_PHOTON = 8.2245809;
const SECOND_LEVEL_K = (h.value * c.value * (IONISATION - LYMAN_ALPHA)) / k.value;
const LYMAN_ALPHA_K = (h.value * c.value * LYMAN_ALPHA) / k.value;
const GROUND_K = (h.value * c.value * IONISATION) / k.value;
const LYMAN_VOLUME = LYMAN_ALPHA ** -3 / (8 * Math.PI);

/** What the electron decides, by the edition. */
interface Electrons {
	/** 1/(m² K): (2π m_e k T/h²)^1.5 = (this × T)^1.5 */
	thermalWaves: number;
	/** 1/(s K⁴): 8 σ_T a_R/(3 m_e c), with a_R = 4σ/c. */
	compton: number;
}

function electronsOf({ physical: { m_e, sigma_T } }: ConstantsEdition): Electrons {
	return {
		thermalWaves: (2 * Math.PI * m_e.value * k.value) / h.value ** 2,
		compton: (8 * sigma_T.value * ((4 * sigma.value) / c.value)) / (3 * m_e.value * c.value)
	};
}

/** Background temperatures now between which hydrogen is all ionised at z = 1700 and helium isn't yet. */
const BACKGROUND_RANGE_K = [2.4, 4] as const;

/** In X = ln(1+z). */
const KNOT_SPACING = 0.02;
const FINE_SPACING = 0.002;
const SETTLING = 0.03;
const TOLERANCE = 1e-7;
const MOST_STEPS = 20_000;

const cache = new Map<string, Opened>();
const CACHE_SIZE = 16;

/**
 * The history of the gas; the last few are kept, since it takes about ten milliseconds and a chart asks a hundred times.
 * Refuses universes without gas, and backgrounds that put recombination out of the stretch followed.
 */
export function thermalHistory(
	parameters: CosmologyParameters,
	Yp: number,
	fudge: Fudge = 'recfast15',
	edition: ConstantsEdition = constants
): Opened {
	const key = JSON.stringify([parameters, Yp, fudge, edition.name]);
	const kept = cache.get(key);
	if (kept) return kept;
	const opened = makeHistory(parameters, Yp, fudge, edition);
	if (cache.size >= CACHE_SIZE) cache.delete(cache.keys().next().value!);
	cache.set(key, opened);
	return opened;
}

function makeHistory(
	parameters: CosmologyParameters,
	Yp: number,
	fudge: Fudge,
	edition: ConstantsEdition
): Opened {
	const opened = gasOf(parameters, Yp, edition);
	if (!opened.ok) return opened;
	const { gas } = opened;
	const [coldest, hottest] = BACKGROUND_RANGE_K;
	if (parameters.Tcmb0 < coldest || parameters.Tcmb0 > hottest) {
		return refuse(
			'no-recombination',
			`Followed from redshift ${FIRST_Z}, the gas recombines only with a background of ${coldest} to ${hottest} K now; ${printNumber(parameters.Tcmb0)} K was given. Set Tcmb0 within that.`,
			'cosmology'
		);
	}
	const first = Math.log1p(FIRST_Z);
	const knots = knotsFrom(first);
	const electrons = electronsOf(edition);
	const slope = slopeOf(gas, fudge, electrons);
	const start: Pair = [saha(gas, 1 + FIRST_Z, electrons), gas.background(1 + FIRST_Z)];
	const states = solveStiffPair(slope, { x: first, y: start }, knots, TOLERANCE, MOST_STEPS);
	if (!states?.flat().every((value) => value > 0 && Number.isFinite(value))) {
		return refuse(
			'no-history',
			'With these parameters the gas changes too abruptly to be followed. Move them towards a published set.',
			'cosmology'
		);
	}
	// Logarithms, rising in X. Slopes at the knots would be no help early on: there they are the small difference of two
	// huge terms, which multiplies the error of the states 10⁵-fold; a spline through the states alone doesn't see it.
	const rising = knots.toReversed();
	const ionised = naturalSpline(rising, states.map(([x]) => Math.log(x)).reverse());
	const warmth = naturalSpline(
		rising,
		states.map(([, T], i) => Math.log(T / gas.background(Math.exp(knots[i] ?? 0)))).reverse()
	);
	return {
		ok: true,
		history: {
			gas,
			at(z) {
				const X = Math.log1p(z);
				return { x_e: Math.exp(ionised(X)), Tk: gas.background(1 + z) * Math.exp(warmth(X)) };
			}
		}
	};
}

/** Values of X from the first to 0, closer at first, where the gas settles from balance into its lag behind it. */
function knotsFrom(first: number): number[] {
	const settled = first - SETTLING;
	const fine = Math.round(SETTLING / FINE_SPACING);
	const coarse = Math.ceil(settled / KNOT_SPACING);
	return [
		...Array.from({ length: fine }, (_, i) => first - i * FINE_SPACING),
		...Array.from({ length: coarse + 1 }, (_, i) => settled * (1 - i / coarse))
	];
}

/** Ionised share of hydrogen in balance: x²/(1−x) = S. */
function saha(gas: Gas, u: number, { thermalWaves }: Electrons): number {
	const T = gas.background(u);
	const S = ((thermalWaves * T) ** 1.5 * Math.exp(-GROUND_K / T)) / gas.hydrogenDensity(u);
	return 2 / (1 + Math.sqrt(1 + 4 / S));
}

/** d(x_e, T)/dX with X = ln(1+z). */
function slopeOf(
	gas: Gas,
	fudge: Fudge,
	{ thermalWaves, compton }: Electrons
): (X: number, state: Pair) => Pair {
	const factor = fudge === 'recfast15' ? 1.125 : 1.14;
	const gaussians = fudge === 'recfast15';
	return (X, [x, T]) => {
		const u = Math.exp(X);
		const H = gas.hubbleRate(u);
		const n = gas.hydrogenDensity(u);
		const Tr = gas.background(u);

		const t = T / 1e4;
		const recombination = (factor * 1e-19 * 4.309 * t ** -0.6166) / (1 + 0.6703 * t ** 0.53);
		const ionisation = recombination * (thermalWaves * T) ** 1.5 * Math.exp(-SECOND_LEVEL_K / T);
		let K = LYMAN_VOLUME / H;
		if (gaussians) {
			K *=
				1 -
				0.14 * Math.exp(-(((X - 7.28) / 0.18) ** 2)) +
				0.079 * Math.exp(-(((X - 6.73) / 0.33) ** 2));
		}
		const trapped = K * n * (1 - x);
		const escape = (1 + trapped * TWO_PHOTON) / (1 + trapped * (TWO_PHOTON + ionisation));
		const balance = recombination * x * x * n - ionisation * (1 - x) * Math.exp(-LYMAN_ALPHA_K / T);
		const drag = ((compton * Tr ** 4) / H) * (x / (1 + gas.heliumRatio + x));
		return [(balance * escape) / H, 2 * T + drag * (T - Tr)];
	};
}
