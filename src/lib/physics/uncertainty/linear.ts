/**
 * The law of propagation, JCGM 100:2008 (GUM) 5.1.2 and, with correlations, 5.2.2. Sensitivities are central
 * differences over one standard uncertainty each way (5.1.3, note 2).
 */
import { correlationMatrix, type Spread } from './spread.ts';

/** Several readings as functions of the uncertain quantities; null where a reading is refused. */
export type Model = (values: readonly number[]) => readonly (number | null)[];

export interface LinearReading {
	/** Combined standard uncertainty; NaN where a reading one standard uncertainty away is refused. */
	u: number;
	/** Change of the reading for one standard uncertainty of each quantity, signed. */
	changes: readonly number[];
	/** Whether the curve bends so much within one standard uncertainty that a straight line misleads. */
	doubtful: boolean;
}

/** The curve counts as bent when the two half-steps differ by more than this share of the whole step. */
const BEND_SHARE = 0.2;
/** A bend far below the reading's whole uncertainty changes nothing, whatever its share of its own step. */
const BEND_MATTERS = 0.02;
const ROUNDING = 16 * Number.EPSILON;
/** Changes that cancel leave dust of this share of the reading, below what any measured constant leaves. */
const DUST = 5e-13;

/** One entry for each reading of the model. `own` is what each reading has on top, independent of the quantities. */
export function propagateLinearly(
	model: Model,
	spread: Spread,
	own: readonly number[]
): LinearReading[] {
	const { quantities } = spread;
	const start = quantities.map(({ value }) => value);
	const middle = model(start);
	const steps = quantities.map(({ value, u }, index) => ({
		up: model(start.with(index, value + u)),
		down: model(start.with(index, value - u))
	}));
	const correlations = correlationMatrix(spread);

	return middle.map((at, output) => {
		const changes = steps.map(({ up, down }) => between(up[output], down[output]) / 2);
		let variance = (own[output] ?? 0) ** 2;
		for (const [i, one] of changes.entries()) {
			for (const [j, other] of changes.entries()) {
				variance += one * other * (correlations[i]?.[j] ?? 0);
			}
		}
		// Wholly correlated changes that cancel may leave a variance a rounding below nought.
		const root = Math.sqrt(Math.max(0, variance));
		const u = root <= DUST * Math.abs(at ?? 0) ? 0 : root;
		const doubtful = steps.some(({ up, down }) => {
			const whole = Math.abs(between(up[output], down[output]));
			const bend = Math.abs(between(up[output], at) + between(down[output], at));
			return (
				bend > BEND_SHARE * whole &&
				bend > 2 * BEND_MATTERS * u &&
				bend > ROUNDING * Math.abs(at ?? 0)
			);
		});
		return { u, changes, doubtful };
	});
}

function between(one: number | null | undefined, other: number | null | undefined): number {
	return (one ?? NaN) - (other ?? NaN);
}
