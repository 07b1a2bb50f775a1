/** Chance that can be repeated: the same seed gives the same inputs on every machine. */

export interface Chance {
	/** Evenly in [low, high). */
	between(low: number, high: number): number;
	/** Evenly in its logarithm; both ends above 0. */
	magnitude(low: number, high: number): number;
	one<T>(of: readonly T[]): T;
}

/** The mulberry32 generator (Tommy Ettinger 2017, public domain): 32 bits of state, good enough to pick test inputs. */
export function seeded(seed: number): Chance {
	let state = seed >>> 0;
	const next = () => {
		state = (state + 0x6d2b79f5) >>> 0;
		let mixed = state;
		mixed = Math.imul(mixed ^ (mixed >>> 15), mixed | 1);
		mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
		return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
	};
	const between = (low: number, high: number) => low + (high - low) * next();
	return {
		between,
		magnitude: (low, high) => Math.exp(between(Math.log(low), Math.log(high))),
		one: (of) => of[Math.floor(next() * of.length)]!
	};
}
