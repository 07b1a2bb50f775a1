/** Dimensions as vectors of exponents: their arithmetic, and what they are called. */
import type { Dimension } from '../units/units.ts';

/** `anything`: a written nought, which goes with every dimension. */
export type FormulaDimension = Dimension | 'anything';

type Entry = [keyof Dimension, number];

/** Exponents closer than this are the same one: thirds add up to whole numbers only nearly. */
const SAME_EXPONENT = 1e-9;

export function nonZero(dimension: Dimension): Entry[] {
	return (Object.entries(dimension) as Entry[]).filter(
		([, power]) => Math.abs(power) > SAME_EXPONENT
	);
}

function hard(dimension: Dimension): Entry[] {
	return nonZero(dimension).filter(([base]) => base !== 'angle' && base !== 'magnitude');
}

export function isPure(dimension: Dimension): boolean {
	return hard(dimension).length === 0;
}

export function isOneAngle(dimension: Dimension): boolean {
	const entries = nonZero(dimension);
	return entries.length === 1 && entries[0]?.[0] === 'angle' && entries[0][1] === 1;
}

export function alike(a: Dimension, b: Dimension): boolean {
	return hard(combine(a, b, -1) as Dimension).length === 0;
}

export function combine(a: FormulaDimension, b: FormulaDimension, sign: 1 | -1): FormulaDimension {
	if (a === 'anything' && b === 'anything') return a;
	const sum: Partial<Record<keyof Dimension, number>> = a === 'anything' ? {} : { ...a };
	for (const [base, exponent] of Object.entries(b === 'anything' ? {} : b) as Entry[]) {
		sum[base] = (sum[base] ?? 0) + sign * exponent;
	}
	return Object.fromEntries(nonZero(sum));
}

export function power(dimension: Dimension, exponent: number): Dimension {
	return Object.fromEntries(nonZero(dimension).map(([base, of]) => [base, of * exponent]));
}

export function rootOf(dimension: FormulaDimension, degree: number): FormulaDimension {
	return dimension === 'anything' ? dimension : power(dimension, 1 / degree);
}

/** What the commonest dimensions are called. */
const KINDS: readonly [Dimension, string][] = [
	[{ m: 1 }, 'a length'],
	[{ s: 1 }, 'a time'],
	[{ kg: 1 }, 'a mass'],
	[{ K: 1 }, 'a temperature'],
	[{ A: 1 }, 'an electric current'],
	[{ mol: 1 }, 'an amount of substance'],
	[{ cd: 1 }, 'a luminous intensity'],
	[{ m: 2 }, 'an area'],
	[{ m: 3 }, 'a volume'],
	[{ s: -1 }, 'a frequency'],
	[{ m: 1, s: -1 }, 'a speed'],
	[{ m: 1, s: -2 }, 'an acceleration'],
	[{ kg: 1, m: 1, s: -1 }, 'a momentum'],
	[{ kg: 1, m: 1, s: -2 }, 'a force'],
	[{ kg: 1, m: -1, s: -2 }, 'a pressure'],
	[{ kg: 1, m: 2, s: -2 }, 'an energy'],
	[{ kg: 1, m: 2, s: -3 }, 'a power'],
	[{ kg: 1, m: -3 }, 'a density'],
	[{ kg: 1, s: -3 }, 'a power through an area'],
	[{ A: 1, s: 1 }, 'an electric charge']
];

const RAISED: Readonly<Record<string, string>> = {
	'-': '⁻', '.': '·', '0': '⁰', '1': '¹', '2': '²', '3': '³', '4': '⁴', '5': '⁵', '6': '⁶', '7': '⁷', '8': '⁸', '9': '⁹'
}; // prettier-ignore

/** “is a length”, “is a pure number”, “has the dimension kg m² K⁻¹”. */
export function dimensionWords(dimension: FormulaDimension): string {
	if (dimension === 'anything') return 'is nought';
	if (isPure(dimension)) {
		const [soft] = nonZero(dimension);
		if (isOneAngle(dimension)) return 'is an angle';
		return soft?.[0] === 'magnitude' ? 'is a magnitude' : 'is a pure number';
	}
	const known = KINDS.find(([kind]) => alike(kind, dimension));
	if (known) return `is ${known[1]}`;
	const written = hard(dimension).map(([base, exponent]) => {
		const rounded = Number(exponent.toFixed(3));
		return rounded === 1
			? base
			: base + [...String(rounded)].map((sign) => RAISED[sign] ?? sign).join('');
	});
	return `has the dimension ${written.join(' ')}`;
}

/** True when a formula of this dimension can be stated in a unit of that one. */
export function canBeStated(found: FormulaDimension, unit: Dimension): boolean {
	if (found === 'anything') return true;
	if (isPure(unit) && nonZero(unit).length === 0 && isOneAngle(found)) return false;
	return alike(found, unit);
}
