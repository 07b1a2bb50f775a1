/**
 * Times, distances and volumes of an expanding universe, by Gauss–Legendre quadrature in variables that keep the
 * integrands smooth. Distances are in Hubble distances, times in Hubble times.
 */
import { GL64 } from '../../numerics/quadrature.ts';
import {
	RUNNING_NODES,
	runningCoefficients,
	runningMean
} from '../../numerics/running-integral.ts';
import { NEGLIGIBLE_WA, type Universe } from './universe.ts';

/**
 * Look-back time and comoving distance over a stretch of x (x = 0: from now): ∫dx/E and ∫e^x dx/E. The width is an
 * argument of its own, since near ends lose its digits.
 */
function pathFrom(
	universe: Universe,
	x: number,
	width: number
): { time: number; distance: number } {
	let time = 0;
	let distance = 0;
	for (const { at, weight } of GL64) {
		const u = Math.exp(x + width * at);
		const share = weight / Math.sqrt(universe.E2(u));
		time += share;
		distance += share * u;
	}
	return { time: time * width, distance: distance * width };
}

/** Light’s time so long before u takes too little of s to be seen by the nodes: it is then integrated apart. */
const LONG_BEFORE = 1e4;

/** Age and particle horizon at u. Not finite unless `earlyPower` is above 0 and 2. */
function pastOf(universe: Universe, u: number): { age: number; horizon: number } {
	const { equality } = universe;
	if (equality < LONG_BEFORE * u) return beginningUntil(universe, u);
	const since = pathFrom(universe, Math.log(u), Math.log(equality / u));
	const until = beginningUntil(universe, equality);
	return { age: until.age + since.time, horizon: until.horizon + since.distance };
}

/**
 * Age and particle horizon at u, by a = a₀s⁴ with s in (0, 1): ∫dx/E and ∫e^x dx/E from x to infinity. The fourth power
 * gives the time when light outweighed matter enough of the interval; the square, which would do for matter alone, loses
 * the horizon’s tenth digit.
 */
function beginningUntil(universe: Universe, u: number): { age: number; horizon: number } {
	// Where dark energy alone fills the past, a higher power of s keeps the integrand level near s = 0.
	const power = universe.earlyPower >= 1 ? 4 : 4 / universe.earlyPower;
	let age = 0;
	let horizon = 0;
	for (const { at: s, weight } of GL64) {
		const then = power === 4 ? u / (s * s * (s * s)) : u / s ** power;
		// dx = −power × ds/s
		const share = (power * weight) / (s * Math.sqrt(universe.E2(then)));
		age += share;
		horizon += share * then;
	}
	return { age, horizon };
}

/** Everything that is added up along the way of light to x = ln(1+z), in Hubble times and distances. */
export interface Reach {
	/** Look-back time and comoving distance, from now. */
	time: number;
	distance: number;
	/** Age and particle horizon. */
	age: number;
	horizon: number;
	/** What light sent then can still cover; meant only where `hasEventHorizon`. */
	future: number;
}

/** Length in x of a stretch: short enough for the running integral to reach the last bits within it. */
const SPACING = 0.125;

/** A stretch of the way of light: how time and distance go on from its start, and what was added up before it. */
export interface Stretch {
	time: readonly number[];
	distance: readonly number[];
	/** Time on the way over all of it. */
	wholeTime: number;
	/** All integrals at its start, once they were asked for. */
	start: Reach | null;
}

/**
 * All integrals at x. In the past they go on from the start of a stretch, whose own were taken over the whole way and are
 * kept with the universe: a curve costs little more than its points, and no point depends on which were asked before.
 */
export function reachOf(universe: Universe, x: number): Reach {
	const step = Math.floor(x / SPACING);
	if (!(step >= 0)) return wholeReach(universe, x);
	const stretch = stretchOf(universe, step);
	const start = (stretch.start ??= wholeReach(universe, step * SPACING));
	const width = x - step * SPACING;
	const time = within(stretch.time, width);
	const distance = within(stretch.distance, width);
	return {
		time: start.time + time,
		distance: start.distance + distance,
		age: start.age - time,
		horizon: start.horizon - distance,
		future: start.future + distance
	};
}

/**
 * Time on the way over a stretch of x, below 0 where the width is. It is added up over what lies between and never the
 * small difference of two large times.
 */
export function timeOver(universe: Universe, x: number, width: number): number {
	const [from, to] = width < 0 ? [x + width, x] : [x, x + width];
	if (!(from >= 0) || to - from < SPACING) return pathFrom(universe, x, width).time;
	const first = Math.floor(from / SPACING);
	const last = Math.floor(to / SPACING);
	let time = -within(stretchOf(universe, first).time, from - first * SPACING);
	for (let step = first; step < last; step += 1) time += stretchOf(universe, step).wholeTime;
	time += within(stretchOf(universe, last).time, to - last * SPACING);
	return width < 0 ? -time : time;
}

function within(coefficients: readonly number[], width: number): number {
	return runningMean(coefficients, width / SPACING) * width;
}

function stretchOf(universe: Universe, step: number): Stretch {
	const { stretches } = universe;
	let stretch = stretches.get(step);
	if (!stretch) stretches.set(step, (stretch = makeStretch(universe, step * SPACING)));
	return stretch;
}

function makeStretch(universe: Universe, x: number): Stretch {
	const times: number[] = [];
	const distances: number[] = [];
	for (const at of RUNNING_NODES) {
		const u = Math.exp(x + SPACING * at);
		const rate = 1 / Math.sqrt(universe.E2(u));
		times.push(rate);
		distances.push(rate * u);
	}
	const time = runningCoefficients(times);
	return {
		time,
		distance: runningCoefficients(distances),
		wholeTime: within(time, SPACING),
		start: null
	};
}

function wholeReach(universe: Universe, x: number): Reach {
	const u = Math.exp(x);
	const future = universe.hasEventHorizon ? futureOf(universe, u) : Infinity;
	const path = pathFrom(universe, 0, x);
	if (x >= 0) return { ...path, ...pastOf(universe, u), future };
	const now = pastOf(universe, 1);
	return { ...path, age: now.age - path.time, horizon: now.horizon - path.distance, future };
}

/** Comoving distance that light sent at u can still cover. Only where `hasEventHorizon`. */
function futureOf(universe: Universe, u: number): number {
	const end = universe.turnaround;
	const { w0, wa } = universe.parameters;
	if (end > 0) {
		// E ~ √(u − end) near the turnaround: u = end + (u − end)s² takes the root away.
		return (u - end) * sumOver((s) => (2 * s) / Math.sqrt(universe.E2(end + (u - end) * s * s)));
	}
	if (wa > NEGLIGIBLE_WA) {
		// E grows like exp(1.5 wₐ/u): below this the rest of the future adds nothing a double can hold.
		const low = Math.log(Math.min((1.5 * wa) / 50, u / 20));
		const half = (Math.log(u) - low) / 2;
		return pathFrom(universe, low, half).distance + pathFrom(universe, low + half, half).distance;
	}
	// E ~ u^(3(1+w₀)/2) far in the future: for w₀ above −1 a power of s keeps the integrand level near 0.
	const power = w0 > -1 ? 1 / (1 - 1.5 * (1 + w0)) : 1;
	return (
		u *
		sumOver(
			(s) => (power * s ** (power - 1)) / Math.sqrt(universe.E2(u * (power === 1 ? s : s ** power)))
		)
	);
}

function sumOver(integrand: (s: number) => number): number {
	let sum = 0;
	for (const { at, weight } of GL64) sum += weight * integrand(at);
	return sum;
}

/** Transverse comoving distance from the comoving one, both in Hubble distances; beyond the antipode its absolute value. */
export function transverseOf(universe: Universe, distance: number): number {
	const { Ok0 } = universe;
	if (Ok0 === 0 || distance === 0) return distance;
	const q = Math.sqrt(Math.abs(Ok0));
	return Ok0 > 0 ? Math.sinh(q * distance) / q : Math.abs(Math.sin(q * distance)) / q;
}

/** Comoving volume of a sphere of comoving radius `distance`, in cubed Hubble distances. */
export function volumeOf(universe: Universe, distance: number): number {
	const { Ok0 } = universe;
	const flat = ((4 * Math.PI) / 3) * distance ** 3;
	if (Ok0 === 0) return flat;
	const w = Ok0 * distance * distance;
	if (Math.abs(w) < 1) {
		// (sinh 2y − 2y)·3/(4y³) in powers of w = y²: the closed form loses digits in a nearly flat universe.
		let term = 1;
		let sum = 1;
		for (let n = 1; n < 24; n += 1) {
			term *= (4 * w) / ((2 * n + 2) * (2 * n + 3));
			sum += term;
		}
		return flat * sum;
	}
	const q = Math.sqrt(Math.abs(Ok0));
	const y = q * distance;
	const prefactor = (2 * Math.PI) / q ** 3;
	return Ok0 > 0 ? prefactor * (Math.sinh(2 * y) / 2 - y) : prefactor * (y - Math.sin(2 * y) / 2);
}
