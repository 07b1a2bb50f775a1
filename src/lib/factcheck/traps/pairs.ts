/** Traps 22, 23 and 42: two numbers of one wave that can’t both be right. */
import { constants } from '../../physics/constants/index.ts';
import { commensurable, convert } from '../../physics/units/units.ts';
import { printStated, statedValue, type Stated } from '../../widget/stated.ts';
import { bands } from '../bands.ts';
import { toNumber } from '../decimal.ts';
import { prepare } from '../weighing.ts';
import { readsInWords } from '../words.ts';
import type { Trap, TrapMatch } from './trap.ts';

const { c, h } = constants.physical;

/** Products that nature fixes, in coherent SI units. */
const LAWS = [
	{
		first: 'm',
		second: 'Hz',
		product: c.value,
		says: 'Wavelength times frequency is the speed of light'
	},
	{
		first: 'm',
		second: 'J',
		product: h.value * c.value,
		says: 'Wavelength times the energy of a photon is Planck’s constant times the speed of light'
	}
] as const;

/**
 * A wavelength and a frequency, or a wavelength and a photon’s energy, that the writer gives for the same light, in
 * either order. Null when they agree within what their digits and hedges leave open, or when they are no such pair.
 */
export function pairDisagrees(one: Stated, other: Stated): Trap | null {
	for (const law of LAWS) {
		for (const [a, b] of [
			[one, other],
			[other, one]
		] as const) {
			if (!commensurable(a.unit, law.first) || !commensurable(b.unit, law.second)) continue;
			return weighPair(a, b, law);
		}
	}
	return null;
}

function weighPair(a: Stated, b: Stated, law: (typeof LAWS)[number]): Trap | null {
	const [first, second] = [inSi(a, law.first), inSi(b, law.second)];
	if (!(first > 0) || !(second > 0)) return null;
	// What the digits leave open on either side adds up, as the product of both does.
	const open = openShare(a) + openShare(b);
	if (Math.abs((first * second) / law.product - 1) <= open) return null;
	const matches: TrapMatch[] = [
		partner(b, law.product / first, law.second, `with ${printStated(a)}`),
		partner(a, law.product / second, law.first, `with ${printStated(b)}`)
	];
	const [forSecond, forFirst] = matches;
	return {
		code: 'pair-disagrees',
		says: `${law.says}: with ${printStated(a)} goes ${words(b, forSecond!)}, and with ${printStated(b)} goes ${words(a, forFirst!)}. One of the two is off.`,
		matches
	};
}

function inSi(stated: Stated, unit: string): number {
	return convert(statedValue(stated), stated.unit, unit);
}

/** Half a unit of the last place over the number; a hedge opens as much as the house lets “about” reach. */
function openShare(stated: Stated): number {
	const { lastPlace, v } = prepare(stated, { value: 0, unit: stated.unit, uncertainty: 'exact' });
	const digits = lastPlace ? toNumber(lastPlace) / 2 / Math.abs(toNumber(v)) : 0;
	const isHedged = stated.hedge !== 'bare' && stated.hedge !== 'exactly';
	return isHedged ? Math.max(digits, bands.around.leans / 100) : digits;
}

function partner(stated: Stated, value: number, unit: string, label: string): TrapMatch {
	return { key: stated.unit, label, value: convert(value, unit, stated.unit), unit: stated.unit };
}

function words(stated: Stated, { value, unit }: TrapMatch): string {
	return readsInWords(stated, { value, unit, uncertainty: 'not-available' });
}
