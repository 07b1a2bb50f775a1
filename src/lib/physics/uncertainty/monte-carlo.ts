/**
 * Propagation of distributions, JCGM 101:2008: normal draws of the uncertain quantities, correlated as they are, each
 * worked through the model. The draws follow from the quantities alone, so the same inputs give the same answer.
 */
import { generatorFrom } from './generator.ts';
import type { Model } from './linear.ts';
import { correlationMatrix, triangleOf, type Spread } from './spread.ts';

export type DrawnReading =
	| {
			ok: true;
			/** Standard deviation of the draws. */
			u: number;
			median: number;
			/** Ends of the central 95 per cent (JCGM 101, 7.7.2). */
			low: number;
			high: number;
	  }
	| { ok: false; reason: string };

/** The draws are cut into so many stretches; their spreads must agree (JCGM 101, 7.9: has it settled?). */
const STRETCHES = 10;
const SETTLED = 0.05;

export const REACHES_LIMIT =
	'Within its uncertainty an input reaches past what the calculator takes.';
const UNSETTLED =
	'The spread has such long tails that no number of draws settles on a standard uncertainty.';

/** One entry for each reading of the model. Calls the model `draws` times. */
export function propagateByDraws(
	model: Model,
	spread: Spread,
	own: readonly number[],
	draws: number
): DrawnReading[] {
	const { quantities } = spread;
	const triangle = triangleOf(correlationMatrix(spread)) ?? [];
	const generator = generatorFrom(JSON.stringify([spread, draws]));
	const drawn = own.map(() => new Float64Array(draws));
	const refused = own.map(() => false);

	for (let draw = 0; draw < draws && !refused.every(Boolean); draw += 1) {
		const normals = quantities.map(() => generator.normal());
		const values = quantities.map(({ value, u }, i) => {
			const row = triangle[i] ?? [];
			return value + u * row.reduce((sum, share, k) => sum + share * (normals[k] ?? 0), 0);
		});
		const readings = model(values);
		for (const [output, extra] of own.entries()) {
			const reading = readings[output];
			const noise = extra === 0 ? 0 : extra * generator.normal();
			if (reading === null || reading === undefined) refused[output] = true;
			else (drawn[output] as Float64Array)[draw] = reading + noise;
		}
	}
	return drawn.map((sample, output) =>
		refused[output] ? { ok: false, reason: REACHES_LIMIT } : described(sample)
	);
}

function described(sample: Float64Array): DrawnReading {
	const u = deviationOf(sample);
	const length = Math.floor(sample.length / STRETCHES);
	const spreads = Float64Array.from({ length: STRETCHES }, (_, stretch) =>
		deviationOf(sample.subarray(stretch * length, (stretch + 1) * length))
	);
	// A normal spread's stretches scatter by u/√(2·length), and the mean of ten by a third of that.
	const allowed = Math.max(SETTLED, 2 / Math.sqrt(2 * length)) * u;
	if (deviationOf(spreads) / Math.sqrt(STRETCHES) > allowed || !Number.isFinite(u)) {
		return { ok: false, reason: UNSETTLED };
	}
	const sorted = sample.slice().sort();
	return {
		ok: true,
		u,
		median: quantile(sorted, 0.5),
		low: quantile(sorted, 0.025),
		high: quantile(sorted, 0.975)
	};
}

/** Standard deviation about the mean; two passes, so that a small spread on a large value keeps its digits. */
function deviationOf(sample: Float64Array): number {
	let sum = 0;
	for (const value of sample) sum += value;
	const mean = sum / sample.length;
	let squares = 0;
	for (const value of sample) squares += (value - mean) ** 2;
	return Math.sqrt(squares / (sample.length - 1));
}

function quantile(sorted: Float64Array, share: number): number {
	const place = share * (sorted.length - 1);
	const below = Math.floor(place);
	const low = sorted[below] ?? NaN;
	const high = sorted[Math.min(below + 1, sorted.length - 1)] ?? NaN;
	return low + (high - low) * (place - below);
}
