/**
 * Random numbers that are the same every time: xoshiro128** (Blackman & Vigna 2021, ACM Trans. Math. Softw. 47, 36),
 * its state mixed from a text that tells the inputs. The pure folders have no chance of their own.
 */

export interface Generator {
	/** A whole number in [0, 2³²). */
	next32(): number;
	/** Even in [0, 1), 53 bits. */
	even(): number;
	/** Normal with mean 0 and standard deviation 1. */
	normal(): number;
}

export type State = [number, number, number, number];

export function generatorFrom(seed: string): Generator {
	return generatorOf(stateFrom(seed));
}

/** `state` must not be all zeros. */
export function generatorOf(state: Readonly<State>): Generator {
	let [a, b, c, d] = state;
	let spare: number | null = null;

	function next32(): number {
		const result = Math.imul(rotate(Math.imul(b, 5), 7), 9) >>> 0;
		const shifted = b << 9;
		c ^= a;
		d ^= b;
		b ^= c;
		a ^= d;
		c ^= shifted;
		d = rotate(d, 11);
		return result;
	}
	const even = () => ((next32() >>> 5) * 67_108_864 + (next32() >>> 6)) / 9_007_199_254_740_992;

	/** The polar method (Marsaglia & Bray 1964, SIAM Review 6, 260) gives two at a time. */
	function normal(): number {
		if (spare !== null) {
			const kept = spare;
			spare = null;
			return kept;
		}
		for (;;) {
			const x = 2 * even() - 1;
			const y = 2 * even() - 1;
			const square = x * x + y * y;
			if (square >= 1 || square === 0) continue;
			const scale = Math.sqrt((-2 * Math.log(square)) / square);
			spare = y * scale;
			return x * scale;
		}
	}
	return { next32, even, normal };
}

function rotate(word: number, by: number): number {
	return (word << by) | (word >>> (32 - by));
}

/** FNV-1a over the text from four starts, each stirred so that texts that differ in one letter start far apart. */
function stateFrom(seed: string): State {
	const words = [0x811c9dc5, 0x9e3779b9, 0x85ebca6b, 0xc2b2ae35].map((start) => {
		let word = start;
		for (let index = 0; index < seed.length; index += 1) {
			word = Math.imul(word ^ seed.charCodeAt(index), 0x01000193);
		}
		word = Math.imul(word ^ (word >>> 16), 0x85ebca6b);
		word = Math.imul(word ^ (word >>> 13), 0xc2b2ae35);
		return (word ^ (word >>> 16)) >>> 0;
	}) as State;
	return words.some((word) => word !== 0) ? words : [1, 2, 3, 4];
}
