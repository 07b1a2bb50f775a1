/** One number as read from a text. */
export type NumberForm =
	| 'numeral'
	| 'word'
	/** “a” or “an”, which counts as one only before a unit. */
	| 'article'
	| 'fraction'
	| 'multiple'
	| 'power'
	| 'uncertainty'
	| 'order-word'
	| 'small-word';

export interface NumberRead {
	form: NumberForm;
	start: number;
	end: number;
	/** Decimal text; '' for words that name no one number. */
	numeral: string;
	scale: number;
	fraction?: readonly [over: number, under: number];
	/** A numeral of bare digits, as a year is written. */
	bareDigits?: boolean;
	/** A unit that the word brings with it: “dreimal”. */
	unit?: string;
}

/** Enough digits for a fraction told as a decimal, and no dust. */
export function decimalText(value: number): string {
	return value.toFixed(12).replace(/\.?0+$/, '');
}

export function addParts(digits: string, fraction: readonly [number, number] | undefined): string {
	return fraction ? decimalText(Number(digits) + fraction[0] / fraction[1]) : digits;
}
