/**
 * Exact decimals for weighing. Rounding and bands are tested on the digits people wrote and read, so that a tie is a
 * tie: 2.5 in binary floats happens to be exact, 0.015 does not.
 */

/** digits × 10^exponent. */
export interface Decimal {
	readonly digits: bigint;
	readonly exponent: number;
}

export const ZERO: Decimal = { digits: 0n, exponent: 0 };

/** A double tells fifteen decimal digits for certain; the rest is the dust of binary arithmetic. */
const CERTAIN_DIGITS = 15;

/** A finite double by its fifteen certain digits. */
export function decimalOf(value: number): Decimal {
	return decimalOfText(value.toPrecision(CERTAIN_DIGITS));
}

/** Decimal text, “-13.80” or “1.5e-18”; throws RangeError on anything else. */
export function decimalOfText(text: string): Decimal {
	const match = /^(-?)(\d+)(?:\.(\d+))?(?:e([+-]?\d+))?$/.exec(text);
	if (!match) throw new RangeError(`“${text}” is not a decimal number`);
	const [, sign = '', whole = '', fraction = '', exponent = '0'] = match;
	return { digits: BigInt(sign + whole + fraction), exponent: Number(exponent) - fraction.length };
}

/** One unit of the place 10^power. */
export function powerOfTen(power: number): Decimal {
	return { digits: 1n, exponent: power };
}

export function subtract(a: Decimal, b: Decimal): Decimal {
	return add(a, { digits: -b.digits, exponent: b.exponent });
}

export function add(a: Decimal, b: Decimal): Decimal {
	const exponent = Math.min(a.exponent, b.exponent);
	return { digits: atExponent(a, exponent) + atExponent(b, exponent), exponent };
}

export function multiply(a: Decimal, b: Decimal): Decimal {
	return { digits: a.digits * b.digits, exponent: a.exponent + b.exponent };
}

/** a / b cut at thirty digits past the larger of the two; b must not be zero. */
export function divide(a: Decimal, b: Decimal): Decimal {
	const spare = 30 + Math.max(0, String(b.digits).length - String(a.digits).length);
	return {
		digits: (a.digits * 10n ** BigInt(spare)) / b.digits,
		exponent: a.exponent - b.exponent - spare
	};
}

export function size({ digits, exponent }: Decimal): Decimal {
	return { digits: digits < 0n ? -digits : digits, exponent };
}

/** −1, 0 or 1. */
export function compare(a: Decimal, b: Decimal): number {
	const { digits } = subtract(a, b);
	return digits > 0n ? 1 : digits < 0n ? -1 : 0;
}

export function signOf({ digits }: Decimal): number {
	return digits > 0n ? 1 : digits < 0n ? -1 : 0;
}

/** The power of ten of the first significant digit: 0.0204 → −2. Undefined for zero. */
export function firstPlace(value: Decimal): number {
	return String(size(value).digits).length - 1 + value.exponent;
}

/** |value| brought to a multiple of 10^place, downwards, upwards or to the nearest (a half goes up). */
export function roundSize(value: Decimal, place: number, way: 'down' | 'up' | 'nearest'): Decimal {
	const { digits, exponent } = size(value);
	if (exponent >= place)
		return { digits: digits * 10n ** BigInt(exponent - place), exponent: place };
	const step = 10n ** BigInt(place - exponent);
	const bump = way === 'down' ? 0n : way === 'up' ? step - 1n : step / 2n;
	return { digits: (digits + bump) / step, exponent: place };
}

export function toNumber({ digits, exponent }: Decimal): number {
	return Number(`${digits}e${exponent}`);
}

/** Plain text without trailing zeros after the point. */
export function toText(value: Decimal): string {
	const { digits, exponent } = value;
	if (exponent >= 0) return String(digits * 10n ** BigInt(exponent));
	const sign = digits < 0n ? '-' : '';
	const padded = String(size(value).digits).padStart(1 - exponent, '0');
	const fraction = padded.slice(exponent).replace(/0+$/, '');
	return sign + padded.slice(0, exponent) + (fraction && `.${fraction}`);
}

function atExponent(value: Decimal, exponent: number): bigint {
	return value.digits * 10n ** BigInt(value.exponent - exponent);
}
