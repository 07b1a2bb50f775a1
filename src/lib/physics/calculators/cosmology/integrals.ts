/**
 * Times, distances and volumes of an expanding universe, by 64-node Gauss–Legendre quadrature in variables that keep
 * the integrands smooth. Distances are in Hubble distances, times in Hubble times.
 */
import { GL64 } from '../../numerics/quadrature.ts';
import { NEGLIGIBLE_WA, type Universe } from './universe.ts';

/** Look-back time and comoving distance from x₁ to x₂ (x₁ = 0: from now): ∫dx/E and ∫e^x dx/E. */
export function pathBetween(
	universe: Universe,
	x1: number,
	x2: number
): { time: number; distance: number } {
	const width = x2 - x1;
	let time = 0;
	let distance = 0;
	for (const { at, weight } of GL64) {
		const u = Math.exp(x1 + width * at);
		const share = weight / Math.sqrt(universe.E2(u));
		time += share;
		distance += share * u;
	}
	return { time: time * width, distance: distance * width };
}

/**
 * Age and particle horizon at u, by a = a₀s² with s in (0, 1): ∫dx/E and ∫e^x dx/E from x to infinity. Not finite
 * unless `earlyPower` is above 0 and 2.
 */
export function pastOf(universe: Universe, u: number): { age: number; horizon: number } {
	// Where dark energy alone fills the past, a higher power of s keeps the integrand level near s = 0.
	const power = universe.earlyPower >= 1 ? 2 : 2 / universe.earlyPower;
	let age = 0;
	let horizon = 0;
	for (const { at: s, weight } of GL64) {
		const then = power === 2 ? u / (s * s) : u / s ** power;
		// dx = −power × ds/s
		const share = (power * weight) / (s * Math.sqrt(universe.E2(then)));
		age += share;
		horizon += share * then;
	}
	return { age, horizon };
}

/** Comoving distance that light sent at u can still cover. Only where `hasEventHorizon`. */
export function futureOf(universe: Universe, u: number): number {
	const end = universe.turnaround;
	const { w0, wa } = universe.parameters;
	if (end > 0) {
		// E ~ √(u − end) near the turnaround: u = end + (u − end)s² takes the root away.
		return (u - end) * sumOver((s) => (2 * s) / Math.sqrt(universe.E2(end + (u - end) * s * s)));
	}
	if (wa > NEGLIGIBLE_WA) {
		// E grows like exp(1.5 wₐ/u): below this the rest of the future adds nothing a double can hold.
		const low = Math.log(Math.min((1.5 * wa) / 50, u / 20));
		const middle = (low + Math.log(u)) / 2;
		return (
			pathBetween(universe, low, middle).distance +
			pathBetween(universe, middle, Math.log(u)).distance
		);
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
	return GL64.reduce((sum, { at, weight }) => sum + weight * integrand(at), 0);
}

/** Transverse comoving distance from the comoving one, both in Hubble distances; beyond the antipode its absolute value. */
export function transverseOf(universe: Universe, distance: number): number {
	const { Ok0 } = universe;
	const q = Math.sqrt(Math.abs(Ok0));
	if (Ok0 === 0 || distance === 0) return distance;
	return Ok0 > 0 ? Math.sinh(q * distance) / q : Math.abs(Math.sin(q * distance)) / q;
}

/** Comoving volume of a sphere of comoving radius `distance`, in cubed Hubble distances. */
export function volumeOf(universe: Universe, distance: number): number {
	const { Ok0 } = universe;
	const flat = ((4 * Math.PI) / 3) * distance ** 3;
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
