/** Traps 3, 7, 22, 29 and 55: a thousand too many, a radius for a diameter, a ratio upside down. */
import { unitOf } from '../../physics/units/units.ts';
import type { Stated } from '../../widget/stated.ts';
import type { WeighedReading } from '../weighing.ts';
import { fits, standsAsWritten, type Trap } from './trap.ts';

/** Powers of ten that one slip of a word or a prefix makes. */
const SLIPS = [3, -3, 6, -6, 9, -9, 12, -12] as const;

const TIMES: Record<(typeof SLIPS)[number], string> = {
	3: 'A thousand times too large: million for thousand, billion for million?',
	[-3]: 'A thousand times too small: million for billion, thousand for million?',
	6: 'A million times too large: billion for thousand, or mega for one?',
	[-6]: 'A million times too small: thousand for billion, or one for mega?',
	9: 'A thousand million times too large: a prefix of the wrong case, or a billion too many?',
	[-9]: 'A thousand million times too small: a prefix of the wrong case (mHz for MHz), or a billion missing?',
	12: 'A million million times too large: a trillion too many?',
	[-12]: 'A million million times too small: a trillion missing?'
};

/**
 * The number fits once a power of ten from a thousand to a million million is taken out. In languages of the long scale
 * “billion” is such a slip by itself.
 */
export function scaleSlip(stated: Stated, reading: WeighedReading): Trap | null {
	if (standsAsWritten(stated, reading)) return null;
	const found = SLIPS.find((power) => fits(stated, timesTen(reading.value, power), reading.unit));
	if (found === undefined) return null;
	return {
		code: 'scale-slip',
		says: TIMES[found],
		matches: [match(`1e${found}`, 'by a power of ten', reading, reading.value)]
	};
}

/** Twice or half the reading: radius and diameter, there and back, one side and both. */
export function factorTwo(stated: Stated, reading: WeighedReading): Trap | null {
	if (standsAsWritten(stated, reading)) return null;
	const doubled = fits(stated, 2 * reading.value, reading.unit);
	if (!doubled && !fits(stated, reading.value / 2, reading.unit)) return null;
	return {
		code: 'factor-two',
		says: doubled
			? 'Twice the reading: a diameter where the calculator gives a radius, or there and back?'
			: 'Half the reading: a radius where the calculator gives a diameter, or one way of two?',
		matches: [match(doubled ? '2' : '1/2', doubled ? 'twice' : 'half', reading, reading.value)]
	};
}

/** Ratios alone: “a third of” for “three times”. */
export function reciprocal(stated: Stated, reading: WeighedReading): Trap | null {
	const dimension = unitOf(reading.unit)?.dimension;
	if (!dimension || Object.keys(dimension).length > 0 || reading.value === 0) return null;
	if (standsAsWritten(stated, reading)) return null;
	if (!fits(stated, 1 / reading.value, reading.unit)) return null;
	return {
		code: 'reciprocal',
		says: 'The ratio fits upside down: has this and that changed places?',
		matches: [match('1/x', 'one over the reading', reading, 1 / reading.value)]
	};
}

/** value × 10^power; divides for negative powers, since 10⁻³ is no double and 10³ is. */
function timesTen(value: number, power: number): number {
	return power >= 0 ? value * 10 ** power : value / 10 ** -power;
}

function match(key: string, label: string, { unit }: WeighedReading, value: number) {
	return { key, label, value, unit };
}
