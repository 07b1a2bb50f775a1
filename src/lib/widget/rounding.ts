/** Rounding in decimal, on the digits a double is written with. */

/** Decimal digits of a finite double without exponent: “0.00012”, “1420405751.768”. */
export function plainDecimal(value: number): string {
	const text = String(value);
	const [, sign = '', whole = '', fraction = '', exponent] =
		/^(-?)(\d+)(?:\.(\d+))?(?:e([+-]\d+))?$/.exec(text) ?? [];
	if (exponent === undefined) return text;
	return sign + shiftPoint(fraction ? `${whole}.${fraction}` : whole, Number(exponent));
}

/** Moves the point of a decimal text to the right, for negative places to the left. All its digits stay. */
export function shiftPoint(numeral: string, places: number): string {
	const [, sign = '', whole = '', fraction = ''] = /^(-?)(\d+)(?:\.(\d+))?$/.exec(numeral) ?? [];
	const digits = whole + fraction;
	const point = whole.length + places;
	if (point <= 0) return `${sign}0.${'0'.repeat(-point)}${digits}`;
	if (point >= digits.length) return sign + withoutLead(digits + '0'.repeat(point - digits.length));
	return `${sign}${withoutLead(digits.slice(0, point))}.${digits.slice(point)}`;
}

function withoutLead(whole: string): string {
	return whole.replace(/^0+(?=\d)/, '');
}

/** Rounds to `figures` significant figures, half to even, in decimal; trailing zeros after the point are kept. */
export function roundToFigures(value: number, figures: number): string {
	if (value === 0) return '0';
	const decimal = plainDecimal(Math.abs(value));
	const [whole = '', fraction = ''] = decimal.split('.');
	const digits = (whole + fraction).replace(/^0+/, '');
	const magnitude = whole === '0' ? -(fraction.match(/^0*/)?.[0].length ?? 0) : whole.length;
	return (value < 0 ? '-' : '') + roundDigits(digits, magnitude, figures);
}

/** `digits` × 10^(magnitude − digits.length), rounded to `figures` digits. */
function roundDigits(digits: string, magnitude: number, figures: number): string {
	let kept = BigInt(digits.slice(0, figures).padEnd(figures, '0'));
	const rest = digits.slice(figures).replace(/0+$/, '');
	const half = rest === '5';
	if ((half && kept % 2n === 1n) || (!half && rest > '5')) kept += 1n;
	let text = kept.toString();
	let place = magnitude - figures; // power of ten of the last kept digit
	if (text.length > figures) {
		text = text.slice(0, figures);
		place += 1;
	}
	if (place >= 0) return text + '0'.repeat(place);
	const padded = text.padStart(-place + 1, '0');
	return `${padded.slice(0, place)}.${padded.slice(place)}`;
}
