/**
 * An expanding universe: curved or flat, dark energy with w₀ and wₐ, photons, and neutrinos with mass.
 * Everything is a function of u = 1 + z or x = ln u. Distances are in Hubble distances, times in Hubble times.
 *
 * Hogg 1999 (astro-ph/9905116) for distances; Carroll, Press & Turner 1992 (ARA&A 30, 499) for volume; Davis &
 * Lineweaver 2004 (PASA 21, 97) for horizons; Komatsu et al. 2011 (ApJS 192, 18) eq. 26 for neutrinos; Chevallier &
 * Polarski 2001 and Linder 2003 for dark energy.
 */
import { constants } from '../../constants/index.ts';
import { goldenMinimum } from '../../numerics/roots.ts';
import type { Stretch } from './integrals.ts';
import type { CosmologyParameters } from './parameters.ts';

const { c, G, k, e, sigma } = constants.physical;
const { pc, julianYear } = constants.astronomical;

export const KM_PER_MPC = (pc.value * 1e6) / 1000;
const SECONDS_PER_GYR = julianYear.value * 1e9;

/** Komatsu et al. 2011 eq. 26: energy of one massless species over that of the photons, 7/8 (4/11)^(4/3). */
const NEUTRINO_SHARE = 0.22710731766;
const NEUTRINO_SCALE = 0.3173;
const NEUTRINO_POWER = 1.83;
const NEUTRINO_ROOT = 0.54644808743;
/** (4/11)^(1/3) */
const NEUTRINO_TEMPERATURE = 0.7137658555036082;

/** Search limits in x = ln(1+z): z from −0.993 to 7 × 10¹⁰. */
export const X_MIN = -5;
export const X_MAX = 25;

/** A wₐ so small that it acts only after a thousand million-fold growth of space; the far future takes it as 0. */
export const NEGLIGIBLE_WA = 1e-9;

export interface Universe {
	parameters: CosmologyParameters;
	/** Gyr */
	hubbleTimeGyr: number;
	/** Mpc */
	hubbleDistanceMpc: number;
	/** kg/m³ now */
	criticalDensity0: number;
	Ogamma0: number;
	Onu0: number;
	Ode0: number;
	Ok0: number;
	/** No past with a Big Bang: E² falls to zero somewhere before now. */
	bounces: boolean;
	/** u at which the expansion will stop; 0 when it never does. */
	turnaround: number;
	/** u at which light (with neutrinos without mass to speak of) weighed as much as matter; 0 where one is missing. */
	equality: number;
	/** Power of u that E² grows with in the far past. */
	earlyPower: number;
	/** Whether light sent now can reach only so far in all the future. */
	hasEventHorizon: boolean;
	/** Energy of all neutrinos over that of the photons. */
	neutrinoRatio(u: number): number;
	darkEnergyGrowth(u: number): number;
	/** (H/H₀)² */
	E2(u: number): number;
	/** ½ dlnE²/dln u */
	slope(u: number): number;
	/** What was added up of the way of light so far, by its steps; `integrals.ts` fills it. */
	readonly stretches: Map<number, Stretch>;
}

/** u at which no neutrino’s mass counts. */
const LONG_AGO = 1e12;

/** The last few, in a ring: one that is overwritten leaves nothing behind that the collector of garbage must look through. */
const kept: Universe[] = [];
const KEPT = 16;
let oldest = 0;
/** The one asked for last: a chart asks for one a hundred times. */
let last: Universe | null = null;

/** The universe with these parameters; the last few are kept. */
export function universeOf(parameters: CosmologyParameters): Universe {
	if (last !== null && sameParameters(last.parameters, parameters)) return last;
	let universe = kept.find((one) => sameParameters(one.parameters, parameters));
	if (!universe) {
		universe = makeUniverse(parameters);
		kept[oldest] = universe;
		oldest = (oldest + 1) % KEPT;
	}
	last = universe;
	return universe;
}

function sameParameters(a: CosmologyParameters, b: CosmologyParameters): boolean {
	return (
		a === b ||
		(a.H0 === b.H0 &&
			a.Om0 === b.Om0 &&
			a.Ode0 === b.Ode0 &&
			a.Tcmb0 === b.Tcmb0 &&
			a.Neff === b.Neff &&
			a.w0 === b.w0 &&
			a.wa === b.wa &&
			a.Ob0 === b.Ob0 &&
			a.set === b.set &&
			a.m_nu.length === b.m_nu.length &&
			a.m_nu.every((mass, index) => mass === b.m_nu[index]))
	);
}

function makeUniverse(parameters: CosmologyParameters): Universe {
	const { H0, Om0, Tcmb0, Neff, w0, wa } = parameters;
	const hubblePerSecond = H0 / KM_PER_MPC;
	const criticalDensity0 = (3 * hubblePerSecond ** 2) / (8 * Math.PI * G.value);
	const Ogamma0 = ((4 * sigma.value) / c.value ** 3) * (Tcmb0 ** 4 / criticalDensity0);
	const heavy = massive(parameters);
	const neutrinoRatio = neutrinos(parameters);
	const Onu0 = Ogamma0 * neutrinoRatio(1);
	const isFlat = parameters.Ode0 === null;
	const Ode0 = parameters.Ode0 ?? 1 - Om0 - Ogamma0 - Onu0;
	const Ok0 = isFlat ? 0 : 1 - Om0 - Ode0 - Ogamma0 - Onu0;
	const growth = 3 * (1 + w0 + wa);
	const isConstant = w0 === -1 && wa === 0;

	const darkEnergyGrowth = isConstant
		? () => 1
		: (u: number) => u ** growth * Math.exp(-3 * wa * (1 - 1 / u));
	const E2 = (u: number) => {
		const dark = Ode0 === 0 ? 0 : Ode0 * darkEnergyGrowth(u);
		const light = Ogamma0 === 0 ? 0 : Ogamma0 * (1 + neutrinoRatio(u)) * u * u;
		return u * u * (Om0 * u + Ok0 + light) + dark;
	};

	const earlyPower = Math.max(
		Ogamma0 > 0 ? 4 : -Infinity,
		Om0 > 0 ? 3 : -Infinity,
		Ok0 !== 0 ? 2 : -Infinity,
		Ode0 !== 0 ? growth : -Infinity
	);
	const turnaround = turnaroundOf(E2, Ok0, Ode0);
	return {
		parameters,
		hubbleTimeGyr: 1 / hubblePerSecond / SECONDS_PER_GYR,
		hubbleDistanceMpc: c.value / 1000 / H0,
		criticalDensity0,
		Ogamma0,
		Onu0,
		Ode0,
		Ok0,
		bounces: bounces(E2, Ok0, Ode0),
		turnaround,
		equality: Ogamma0 > 0 ? Om0 / (Ogamma0 * (1 + neutrinoRatio(LONG_AGO))) : 0,
		earlyPower,
		hasEventHorizon:
			turnaround > 0 || (Ode0 > 0 && (wa > NEGLIGIBLE_WA || (wa >= 0 && w0 < -1 / 3))),
		neutrinoRatio,
		darkEnergyGrowth,
		E2,
		stretches: new Map(),
		slope(u) {
			const dark = Ode0 === 0 ? 0 : Ode0 * darkEnergyGrowth(u) * (growth - (3 * wa) / u);
			const light =
				Ogamma0 === 0
					? 0
					: Ogamma0 * u ** 4 * (4 * (1 + neutrinoRatio(u)) + neutrinoSlope(parameters, heavy, u));
			return (3 * Om0 * u ** 3 + 2 * Ok0 * u ** 2 + light + dark) / (2 * E2(u));
		}
	};

	function neutrinos({ m_nu }: CosmologyParameters): (u: number) => number {
		if (m_nu.length === 0) return () => 0;
		if (heavy.length === 0) return () => NEUTRINO_SHARE * Neff;
		const each = (NEUTRINO_SHARE * Neff) / m_nu.length;
		const massless = m_nu.filter((mass) => mass === 0).length;
		return (u) => {
			let sum = massless;
			const x = Math.log(u);
			for (const { lnY, species } of heavy) {
				// (1 + (y/u)^p)^r by exponentials: twice as quick as powers, and every integral comes through here.
				const term = Math.exp(NEUTRINO_POWER * (lnY - x));
				sum += species * Math.exp(NEUTRINO_ROOT * Math.log(1 + term));
			}
			return each * sum;
		};
	}
}

interface HeavyNeutrino {
	/** 0.3173 m/(k T_ν) now. */
	y: number;
	lnY: number;
	/** How many species have this mass. */
	species: number;
}

/** Each mass above 0. */
function massive({ m_nu, Tcmb0 }: CosmologyParameters): HeavyNeutrino[] {
	const thermalEv = (k.value / e.value) * NEUTRINO_TEMPERATURE * Tcmb0;
	return [...new Set(m_nu)]
		.filter((mass) => mass > 0)
		.map((mass) => {
			const y = (NEUTRINO_SCALE * mass) / thermalEv;
			return { y, lnY: Math.log(y), species: m_nu.filter((other) => other === mass).length };
		});
}

/** d(neutrino ratio)/dln u */
function neutrinoSlope(
	{ m_nu, Neff }: CosmologyParameters,
	heavy: readonly HeavyNeutrino[],
	u: number
): number {
	let sum = 0;
	for (const { y, species } of heavy) {
		const term = (y / u) ** NEUTRINO_POWER;
		sum -= species * NEUTRINO_POWER * NEUTRINO_ROOT * term * (1 + term) ** (NEUTRINO_ROOT - 1);
	}
	return m_nu.length === 0 ? 0 : ((NEUTRINO_SHARE * Neff) / m_nu.length) * sum;
}

const GRID = 400;

/** Lowest E² over x in [from, to]: a grid of 400 points, then golden section about the lowest. */
function lowestE2(
	E2: (u: number) => number,
	from: number,
	to: number
): { x: number; value: number } {
	const f = (x: number) => E2(Math.exp(x));
	const step = (to - from) / GRID;
	let best = { x: from, value: f(from) };
	for (let i = 1; i <= GRID; i += 1) {
		const x = from + i * step;
		const value = f(x);
		if (value < best.value) best = { x, value };
	}
	const fine = goldenMinimum(f, Math.max(from, best.x - step), Math.min(to, best.x + step), 1e-12);
	return fine.value < best.value ? fine : best;
}

function bounces(E2: (u: number) => number, Ok0: number, Ode0: number): boolean {
	if (Ok0 >= 0 && Ode0 >= 0) return false; // every term is positive
	return lowestE2(E2, 0, X_MAX).value <= 0;
}

/** The largest u below 1 at which E² is zero, or 0. */
function turnaroundOf(E2: (u: number) => number, Ok0: number, Ode0: number): number {
	if (Ok0 >= 0 && Ode0 >= 0) return 0;
	// Walk from now into the future; the first sign change is the end of the expansion.
	const far = -40;
	let before = 0;
	for (let i = 1; i <= 4 * GRID; i += 1) {
		const x = (far * i) / (4 * GRID);
		if (E2(Math.exp(x)) <= 0) return bisect((at) => E2(Math.exp(at)), x, before);
		before = x;
	}
	return 0;
}

/** e^x where `f` turns from ≤ 0 (low) to > 0 (high). */
function bisect(f: (x: number) => number, low: number, high: number): number {
	for (let i = 0; i < 100; i += 1) {
		const middle = (low + high) / 2;
		if (f(middle) <= 0) low = middle;
		else high = middle;
	}
	return Math.exp(high);
}
