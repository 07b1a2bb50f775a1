/**
 * Chooses the hedge for a number that moves: the wording that weighs level at each setting, by the house's rules for
 * stating numbers (N1, N3, N4, N6). Pure arithmetic, so that a reader's frame can carry it; the fact-check weighs what
 * comes out of it by the rules themselves, and a test holds the two together.
 */
import type { Uncertainty } from '../physics/calculator.ts';
import type { PrintedHedge } from './languages/print-words.ts';
import { roundToFigures } from './rounding.ts';

export interface FittingWording {
	family: 'bare' | Exclude<PrintedHedge, 'more-than'>;
	/** The rounded number as decimal text, without a scale. */
	numeral: string;
	/** Its significant figures. */
	figures: number;
	/** Why this one: a sentence for the office. */
	reason: string;
}

/** Nearer than this, in per cent, a number needs no hedge (house line: hedge past half a per cent). */
const PLAIN = 0.5;
/** Level bands of N1, N4 and N6, and of N3, in per cent; a hair inside, for the dust of binary arithmetic. */
const NEAR = 5 * (1 - 1e-9);
const AROUND = 10 * (1 - 1e-9);
/** Standard uncertainties that a word for one side must clear. */
const CLEARANCE = 2 * (1 + 1e-9);
const MOST_FIGURES = 6;
/** More figures than this under a hedge lean. */
const HEDGED_FIGURES = 3;

/**
 * The wording for a reading, in the unit it is printed in, at the length asked for; longer where none so short is level,
 * shorter where the uncertainty, in the same unit, doesn't carry so many digits. A number that is the very reading never
 * gets a hedge, and a negative one never a word for one side, since readers split on which side that is.
 */
export function fittingWording(
	value: number,
	uncertainty: Uncertainty,
	figures: number
): FittingWording {
	if (value === 0) return bare('0', 1, 'The reading is nought.');
	const most = mostFigures(value, uncertainty);
	const first = Math.min(figures, most);
	for (let length = first; length <= most; length += 1) {
		const found = levelAt(value, uncertainty, length);
		if (found) return found;
	}
	return {
		family: 'around',
		numeral: roundToFigures(value, most),
		figures: most,
		reason: 'The reading is too uncertain for a number that is sure to be level.'
	};
}

function levelAt(value: number, uncertainty: Uncertainty, figures: number): FittingWording | null {
	const numeral = roundToFigures(value, figures);
	const stated = Number(numeral);
	const percent = (100 * (value - stated)) / Math.abs(stated);
	const size = Math.abs(percent);
	if (size === 0) return bare(numeral, figures, 'The number is the very reading.');
	if (size <= PLAIN) return bare(numeral, figures, `Within ${PLAIN} per cent: no hedge is needed.`);
	if (size <= NEAR && isRound(numeral)) {
		return bare(numeral, figures, 'A round number, which readers take as rounded.');
	}
	const told = { numeral, figures };
	const established = value > 0 && isClear(value - stated, uncertainty);
	if (established && size <= NEAR) {
		return percent < 0
			? { ...told, family: 'below', reason: 'The reading is below this number, and near it.' }
			: { ...told, family: 'just-above', reason: 'The reading is above this number, and near it.' };
	}
	return size <= AROUND && figures <= HEDGED_FIGURES
		? { ...told, family: 'around', reason: 'The reading rounds to this number, but not closely.' }
		: null;
}

function bare(numeral: string, figures: number, reason: string): FittingWording {
	return { family: 'bare', numeral, figures, reason };
}

/** A whole number that ends on a nought. */
function isRound(numeral: string): boolean {
	return !numeral.includes('.') && numeral.endsWith('0');
}

function isClear(distance: number, uncertainty: Uncertainty): boolean {
	if (uncertainty === 'exact') return true;
	if (uncertainty === 'not-available') return false;
	return Math.abs(distance) > CLEARANCE * uncertainty;
}

/** Down to the second significant digit of the uncertainty, and no further. */
function mostFigures(value: number, uncertainty: Uncertainty): number {
	if (typeof uncertainty !== 'number' || !(uncertainty > 0) || !Number.isFinite(uncertainty)) {
		return MOST_FIGURES;
	}
	const carried = decade(value) - decade(uncertainty) + 2;
	return Math.min(MOST_FIGURES, Math.max(1, carried));
}

/** The power of ten of the first digit, of the fifteen that a double tells for certain, as the fact-check counts. */
const decade = (value: number) =>
	Number(Number(value.toPrecision(15)).toExponential().split('e')[1]);
