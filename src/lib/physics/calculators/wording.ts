const SUPERSCRIPT: Record<string, string> = {
	'-': '⁻', '0': '⁰', '1': '¹', '2': '²', '3': '³', '4': '⁴', '5': '⁵', '6': '⁶', '7': '⁷', '8': '⁸', '9': '⁹'
}; // prettier-ignore

/** A number inside a sentence: six figures at most, a real minus sign, and powers of ten where zeros would pile up. */
export function printNumber(value: number): string {
	const rounded = Number(value.toPrecision(6));
	const size = Math.abs(rounded);
	if (size === 0 || (size >= 1e-4 && size < 1e7)) return String(rounded).replace('-', '−');
	const [digits = '', exponent] = rounded.toExponential().split('e');
	const power = [...String(Number(exponent))].map((sign) => SUPERSCRIPT[sign]).join('');
	const lead = digits === '1' ? '' : digits === '-1' ? '−' : `${digits.replace('-', '−')} × `;
	return `${lead}10${power}`;
}

/** “more than −1 and at most 100000 nm”. */
export function rangeWords(
	limits: { min: number; max: number; minExclusive?: boolean; maxExclusive?: boolean },
	unit = ''
): string {
	const low = `${limits.minExclusive ? 'more than' : 'at least'} ${printNumber(limits.min)}`;
	const high = `${limits.maxExclusive ? 'less than' : 'at most'} ${printNumber(limits.max)}`;
	return `${low} and ${high}${unit ? ` ${unit}` : ''}`;
}
