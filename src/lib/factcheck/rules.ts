/**
 * The house's rules for stating numbers, N1 to N10 and, for fraction words, N23: one per hedge family. Each looks at
 * a prepared weighing and says how the claim hangs and why. Widths come from `bands`.
 */
import type { HedgeFamily } from '../widget/stated.ts';
import { bands, type OneSidedBand } from './bands.ts';
import { compare, signOf } from './decimal.ts';
import type { VerdictName } from './verdict.ts';
import {
	bothNegative,
	clearance,
	compareDistance,
	isNear,
	isNought,
	isRounding,
	isWithin,
	reachesPast,
	type Weighing
} from './weighing.ts';

export interface Outcome {
	verdict: VerdictName;
	reason: string;
}

export interface Rule {
	id: string;
	/** Words that say on which side the reading lies. */
	oneSided: boolean;
	weigh(weighing: Weighing): Outcome;
}

const level = (reason: string): Outcome => ({ verdict: 'level', reason });
const leans = (reason: string): Outcome => ({ verdict: 'leans', reason });
const tips = (reason: string): Outcome => ({ verdict: 'tips', reason });

function weighBare(w: Weighing): Outcome {
	const { level: near, leans: far } = bands.bare;
	if (signOf(w.v) === 0) return weighNought(w);
	const [rounds, digit] = w.lastPlace ? ['Right rounding, but ', ' or a digit'] : ['', ''];
	if (isRounding(w) === false) return tips('This is not the rounding of the reading.');
	if (isWithin(w, near)) {
		return level(
			w.lastPlace
				? 'The reading rounds to this number.'
				: `Within ${near} per cent of this fraction.`
		);
	}
	if (isWithin(w, far)) {
		return leans(capital(`${rounds}${near} to ${far} per cent away: add “about”${digit}.`));
	}
	return tips(
		capital(`${rounds}more than ${far} per cent away${digit && ': give another digit'}.`)
	);
}

function weighNought(w: Weighing): Outcome {
	return isNought(w)
		? level('The reading can’t be told from nought at this length.')
		: tips('The reading is not nought at this length.');
}

function weighExactly({ v, x, reading }: Weighing): Outcome {
	const word = '“Exactly”';
	if (reading.uncertainty !== 'exact') return tips(`${word} needs an exact reading.`);
	return compare(v, x) === 0
		? level('The reading is exact, and is this number.')
		: tips(`${word} needs the very number the reading gives.`);
}

function weighAround(w: Weighing): Outcome {
	const { leans: far, fives } = bands.around;
	if (signOf(w.v) === 0) return weighNought(w);
	if (!isWithin(w, far)) return tips(`More than ${far} per cent away.`);
	if (w.figures > bands.figures) {
		return leans('Four or more figures under a hedge: give fewer, or drop the hedge.');
	}
	if (isRounding(w) !== false) {
		return level(
			`${w.lastPlace ? 'The reading rounds to this number, within' : 'Within'} ${far} per cent.`
		);
	}
	const endsOnFive = w.lastPlace && w.stated.numeral.endsWith('5');
	if (endsOnFive && isWithin(w, fives.percent) && isNear(w, fives.places)) {
		return level('A round five, and the reading is close to it.');
	}
	return leans(`Within ${far} per cent, but a nearer number of the same length exists.`);
}

/** “nearly”, “just under”: short of the number, and not by much. */
function weighShort(w: Weighing, band: OneSidedBand, roundingStretches: boolean): Outcome {
	if (signOf(w.past) >= 0) return tips(`The reading is not ${side(w, 'below')} this number.`);
	return weighNear(w, band, roundingStretches, 'below');
}

/** “just over”: past the number, and not by much. */
function weighPast(w: Weighing, band: OneSidedBand): Outcome {
	if (signOf(w.past) <= 0) return tips(`The reading is not ${side(w, 'above')} this number.`);
	return weighNear(w, band, false, 'above');
}

function weighNear(
	w: Weighing,
	band: OneSidedBand,
	roundingStretches: boolean,
	where: 'above' | 'below'
): Outcome {
	const nought = signOf(w.v) === 0;
	if (nought && !isNought(w)) return tips(`Too far ${where}: the reading doesn’t round to nought.`);
	if (!nought && !isWithin(w, band.leans)) {
		return tips(`Too far ${where}: more than ${band.leans} per cent.`);
	}
	const unsure = unsureOfSide(w);
	if (unsure) return unsure;
	if (nought || isWithin(w, band.level)) {
		return level(`The reading is ${side(w, where)} this number, and near it.`);
	}
	if (roundingStretches && isRounding(w)) {
		return level(`The reading is ${side(w, where)} this number, and rounds to it.`);
	}
	return leans(`A long way for “${w.stated.hedgeWord}”: more than ${band.level} per cent.`);
}

/** “more than”, “at least”, “less than”, “at most”: a bound, true or not, strong or weak. */
function weighBound(w: Weighing, way: 1 | -1, mayTouch: boolean, reach: number): Outcome {
	const beyond = signOf(w.past) * way;
	if (beyond < 0 || (beyond === 0 && !mayTouch)) return tips('The bound is not met.');
	if (!isWithin(w, reach)) {
		return leans(
			`True but weak: more than ${reach} per cent ${way > 0 ? 'past' : 'short of'} the bound.`
		);
	}
	const unsure = unsureOfBound(w, mayTouch);
	if (unsure) return unsure;
	return level(
		`The reading is ${side(w, way > 0 ? 'above' : 'below')} this bound, and not far from it.`
	);
}

function weighWellOver(w: Weighing): Outcome {
	const { level: reach, wellOver } = bands.moreThan;
	const outcome = weighBound(w, 1, false, reach);
	return outcome.verdict === 'level' && compareDistance(w, wellOver) < 0
		? leans(`“${w.stated.hedgeWord}” asks for ${wellOver} per cent or more.`)
		: outcome;
}

function weighWithin(w: Weighing): Outcome {
	if (reachesPast(w)) return tips('Part of the reading’s range lies beyond this bound.');
	return weighBound(w, -1, false, bands.lessThan.level);
}

function weighUpTo(w: Weighing): Outcome {
	const { past, near } = bands.upTo;
	if (signOf(w.past) > 0 && !isWithin(w, past))
		return tips('The range goes higher than this number.');
	if (!w.reading.maximum) return leans('“Up to” needs a range with a highest reading behind it.');
	return isWithin(w, near)
		? level('The highest reading comes near this number and doesn’t pass it.')
		: leans('Nothing in the range comes near it.');
}

function unsureOfSide(w: Weighing): Outcome | null {
	switch (clearance(w)) {
		case 'clear':
			return null;
		case 'within-uncertainty':
			return leans(
				`Direction not established at ${bands.clearance} standard uncertainties: use “about”.`
			);
		case 'unknown':
			return leans('Direction not established: the reading carries no uncertainty. Use “about”.');
	}
}

function unsureOfBound(w: Weighing, mayTouch: boolean): Outcome | null {
	switch (clearance(w, mayTouch)) {
		case 'clear':
			return null;
		case 'within-uncertainty':
			return leans(`Bound not established at ${bands.clearance} standard uncertainties.`);
		case 'unknown':
			return leans('Bound not established: the reading carries no uncertainty.');
	}
}

/** For two negative numbers the words go by size, and say so. */
function side({ v, x }: Weighing, where: 'above' | 'below'): string {
	if (!bothNegative(v, x)) return where;
	return where === 'above' ? 'larger in size than' : 'smaller in size than';
}

function capital(sentence: string): string {
	return sentence.charAt(0).toUpperCase() + sentence.slice(1);
}

/** N1 to N10 by hedge family. Fraction words go by N23, which has the same bands and no last place to round at. */
export const rules: Record<HedgeFamily, Rule> = {
	bare: { id: 'N1', oneSided: false, weigh: weighBare },
	exactly: { id: 'N2', oneSided: false, weigh: weighExactly },
	around: { id: 'N3', oneSided: false, weigh: weighAround },
	below: { id: 'N4', oneSided: true, weigh: (w) => weighShort(w, bands.below, true) },
	'just-below': { id: 'N5', oneSided: true, weigh: (w) => weighShort(w, bands.justBelow, true) },
	'just-above': { id: 'N6', oneSided: true, weigh: (w) => weighPast(w, bands.justAbove) },
	'more-than': {
		id: 'N7',
		oneSided: true,
		weigh: (w) => weighBound(w, 1, false, bands.moreThan.level)
	},
	'well-over': { id: 'N7', oneSided: true, weigh: weighWellOver },
	'less-than': {
		id: 'N8',
		oneSided: true,
		weigh: (w) => weighBound(w, -1, false, bands.lessThan.level)
	},
	within: { id: 'N8', oneSided: true, weigh: weighWithin },
	'at-least': {
		id: 'N9',
		oneSided: true,
		weigh: (w) => weighBound(w, 1, true, bands.moreThan.level)
	},
	'at-most': {
		id: 'N9',
		oneSided: true,
		weigh: (w) => weighBound(w, -1, true, bands.lessThan.level)
	},
	'up-to': { id: 'N10', oneSided: true, weigh: weighUpTo }
};
