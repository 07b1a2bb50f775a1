import { describe, expect, test } from 'vitest';
import { convert, units } from '../physics/units/units.ts';
import { LANGUAGES } from '../widget/language.ts';
import { printWordsOf } from '../widget/languages/print-words.ts';
import { printStated } from '../widget/stated.ts';
import './lexicon/all.ts';
import { detectQuantities } from './detect.ts';

/** A name of a rare unit that no language's copy means by it, and one that is too near to its plural's meaning. */
const NOT_FOUND = ['foe'];
const NOT_ALONE = ['ppm'];
const OWN_SCALE = /^[kMG](?:yr|ly)$/;

describe.each(LANGUAGES)('%s: what is printed is found', (language) => {
	const { hedges } = printWordsOf(language);
	test.each(units.map(({ symbol }) => symbol).filter((symbol) => !NOT_FOUND.includes(symbol)))(
		'in “%s”',
		(unit) => {
			for (const numeral of ['20', '1', '2.5', '-4', '17190']) {
				if (numeral === '1' && NOT_ALONE.includes(unit)) continue;
				for (const scale of OWN_SCALE.test(unit) ? [1] : [1, 1e6, 1e9, 1e12, 1e-18]) {
					for (const hedge of ['around', 'below', 'just-above', 'more-than'] as const) {
						const hedgeWord = hedges[hedge];
						const printed = printStated({ hedge, hedgeWord, numeral, scale, unit }, language);
						const [found, other] = detectQuantities(`Xyz ${printed}, abc.`, language);
						expect(found?.surface).toBe(printed);
						expect(other).toBeUndefined();
						expect(found?.stated?.hedge, printed).toBe(hedge);
						const value = convert(found?.value ?? NaN, found?.unit ?? '', unit);
						expect(value / (Number(numeral) * scale), printed).toBeCloseTo(1, 9);
					}
				}
			}
		}
	);
});
