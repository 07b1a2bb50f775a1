/**
 * Decimal numbers by their digits, for rounding as it is done on paper: 2.675 is 2.675 and not the binary number next to
 * it.
 */
export interface Decimal {
	isNegative: boolean;
	/** Without leading zeros; '' for zero. */
	digits: string;
	/** Power of ten of the last digit. */
	exponent: number;
}

/** ISO 80000-1:2009, annex B: rule A (half to even) and rule B (half away from zero). */
export type Tie = 'half-even' | 'half-away';

/** Reads “−12.50e3”, zeros at the end kept. The text must be a decimal. */
export function decimalOf(text: string): Decimal {
	const [mantissa = '', power = '0'] = text.toLowerCase().split('e');
	const [whole = '', fraction = ''] = mantissa.replace(/^[+-]/, '').split('.');
	return {
		isNegative: mantissa.startsWith('-'),
		digits: `${whole}${fraction}`.replace(/^0+/, ''),
		exponent: Number(power) - fraction.length
	};
}

export function isZero({ digits }: Decimal): boolean {
	return /^0*$/.test(digits);
}

/** Power of ten of the first digit; that of the last for zero. */
export function leadingPower({ digits, exponent }: Decimal): number {
	return exponent + Math.max(0, digits.length - 1);
}

/** Rounds to a place (−2: hundredths). Places that aren't there yet are filled with zeros. */
export function roundToPlace(value: Decimal, place: number, tie: Tie): Decimal {
	const { digits, exponent, isNegative } = value;
	if (place <= exponent) {
		const padded = digits === '' ? '' : digits + '0'.repeat(exponent - place);
		return { isNegative, digits: padded, exponent: place };
	}
	const dropped = place - exponent;
	const kept = digits.slice(0, Math.max(0, digits.length - dropped));
	const rest = digits.padStart(dropped, '0').slice(-dropped);
	const half = `5${'0'.repeat(dropped - 1)}`;
	const isOdd = '13579'.includes(kept.at(-1) ?? '0');
	const goesUp = rest > half || (rest === half && (tie === 'half-away' || isOdd));
	const rounded = goesUp ? String(BigInt(kept || '0') + 1n) : kept;
	return { isNegative, digits: rounded.replace(/^0+/, ''), exponent: place };
}

/** Rounds to so many digits. A nine that carries (9.96 → 10.0) gives its last place up again. */
export function roundToDigits(value: Decimal, count: number, tie: Tie): Decimal {
	if (isZero(value)) return { ...value, digits: '' };
	const rounded = roundToPlace(value, leadingPower(value) - count + 1, tie);
	return rounded.digits.length > count
		? { ...rounded, digits: rounded.digits.slice(0, -1), exponent: rounded.exponent + 1 }
		: rounded;
}

/** Plain text; with a power of ten where plain zeros would pile up. Zero has no sign. */
export function decimalText(value: Decimal): string {
	const { digits, exponent } = value;
	const sign = value.isNegative && !isZero(value) ? '-' : '';
	const lead = leadingPower(value);
	if (!isZero(value) && (lead < -7 || lead > 20)) {
		const fraction = digits.slice(1);
		return `${sign}${digits[0] ?? '0'}${fraction ? `.${fraction}` : ''}e${lead}`;
	}
	if (exponent >= 0) return `${sign}${digits === '' ? '0' : digits + '0'.repeat(exponent)}`;
	const padded = digits.padStart(1 - exponent, '0');
	return `${sign}${padded.slice(0, exponent)}.${padded.slice(exponent)}`;
}
