import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { LANGUAGES, type Language } from '../widget/language.ts';
import { printStated, stateReading } from '../widget/stated.ts';
import './lexicon/all.ts';
import { detectQuantities } from './detect.ts';
import { weigh, type WeighedReading } from './weigh.ts';

/** Printed by the widget, found in its sentence, and weighed again: the way a checker's eye goes. */
function again(reading: WeighedReading, unit: string, figures: number, language: Language) {
	const format = { unit, figures, hedge: 'fitting' } as const;
	const { value, uncertainty } = reading;
	const printed = printStated(
		stateReading(value, reading.unit, format, 'number', language, uncertainty),
		language
	);
	const [found, other] = detectQuantities(`… ${printed}.`, language);
	if (!found?.stated || other) throw new Error(`“${printed}” isn’t found as one number`);
	expect(found.surface).toBe(printed);
	return { printed, stated: found.stated, verdict: weigh(found.stated, reading, language) };
}

const UNITS = ['m', 'km', 'yr', 'kg', 'K', 'MHz', 'm/s', '%', 'times', 'ly', 'J', 'arcsec', 'Msun'];

describe.each(LANGUAGES)('%s', { timeout: 120_000 }, (language) => {
	test('the words printed with a fitting hedge weigh level at every reading', () => {
		fc.assert(
			fc.property(
				fc.integer({ min: -20, max: 19 }),
				fc.double({ min: 1, max: 10, noNaN: true }),
				fc.boolean(),
				fc.constantFrom(...UNITS),
				fc.integer({ min: 1, max: 6 }),
				fc.oneof(
					fc.constantFrom('exact' as const, 'not-available' as const),
					// A share of the reading: from well known to a tenth.
					fc.double({ min: 1e-9, max: 0.1, noNaN: true })
				),
				(decade, mantissa, negative, unit, figures, spread) => {
					const value = (negative ? -1 : 1) * Number(`${mantissa}e${decade}`);
					const uncertainty = typeof spread === 'number' ? spread * Math.abs(value) : spread;
					const { printed, stated, verdict } = again(
						{ value, unit, uncertainty },
						unit,
						figures,
						language
					);
					expect(verdict.verdict, `${value} ± ${uncertainty}: ${printed}. ${verdict.reason}`).toBe(
						'level'
					);
					if (verdict.departurePercent === 0) expect(stated.hedge).toBe('bare');
					if (negative) expect(['bare', 'around']).toContain(stated.hedge);
				}
			),
			{ numRuns: 1500 }
		);
	});

	test('a sweep like a slider’s', () => {
		for (let value = 1; value <= 500; value += 1.37) {
			for (const figures of [1, 2, 3]) {
				const { verdict } = again(
					{ value, unit: 'Myr', uncertainty: 'exact' },
					'Myr',
					figures,
					language
				);
				expect(verdict.verdict).toBe('level');
			}
		}
	});
});

test.each([
	[13.787, 0.02, 2, 'nearly 14 billion years'],
	[13.787, 0.02, 3, '13.8 billion years'],
	[13.787, 'not-available', 2, 'about 14 billion years'],
	[14.02, 0.02, 2, '14 billion years'],
	[12.4, 'exact', 2, 'just over 12 billion years'],
	[12.4, 'exact', 1, 'just over 12 billion years'],
	[6.2, 'exact', 1, 'just over 6 billion years'],
	[126, 'exact', 2, '130 billion years'],
	[7, 'exact', 1, '7 billion years']
] as const)('%d ± %s at %d figures', (value, uncertainty, figures, words) => {
	const { printed } = again({ value, unit: 'Gyr', uncertainty }, 'Gyr', figures, 'en');
	expect(printed.replaceAll('\u00a0', ' ')).toBe(words);
});
