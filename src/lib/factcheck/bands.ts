/**
 * How far each kind of wording may reach, in per cent of the stated number. These widths are the house's own policy,
 * not physics: they are kept as data so that a desk can set its own.
 */
export interface OneSidedBand {
	/** Level up to here. */
	level: number;
	/** Leans up to here, tips beyond. */
	leans: number;
}

export interface Bands {
	/** N1: a number with no hedge, when its rounding is right. */
	bare: OneSidedBand;
	/** N3: “about”. Numbers that end on a five may miss by more of their last place, but by less in per cent. */
	around: { leans: number; fives: { percent: number; places: number } };
	/** N4: “nearly”. */
	below: OneSidedBand;
	/** N5: “just under”. */
	justBelow: OneSidedBand;
	/** N6: “just over”. */
	justAbove: OneSidedBand;
	/** N7: past these a bound is true but weak; “well over” needs a distance. */
	moreThan: { level: number; wellOver: number };
	/** N8. */
	lessThan: { level: number };
	/** N10: how far a maximum may pass the number, and how near it must come. */
	upTo: { past: number; near: number };
	/** Significant figures that lay copy bears without a question. */
	figures: number;
	/** Standard uncertainties that a one-sided word must clear. */
	clearance: number;
}

export const bands: Bands = {
	bare: { level: 5, leans: 10 },
	around: { leans: 10, fives: { percent: 3, places: 2.5 } },
	below: { level: 5, leans: 10 },
	justBelow: { level: 2.5, leans: 5 },
	justAbove: { level: 5, leans: 10 },
	moreThan: { level: 25, wellOver: 10 },
	lessThan: { level: 20 },
	upTo: { past: 0.5, near: 10 },
	figures: 3,
	clearance: 2
};
