import { describe, expect, test } from 'vitest';
import { units } from '../../physics/units/units.ts';
import { LANGUAGES } from '../language.ts';
import { printNumeral, printStated, stateReading, type Stated } from '../stated.ts';
import './all.ts';
import { loadPrintWords } from './load.ts';
import { printWordsOf } from './print-words.ts';

const NB = '\u00a0';
const bare = (numeral: string, unit: string, scale = 1): Stated => ({
	hedge: 'bare',
	hedgeWord: '',
	numeral,
	scale,
	unit
});

describe.each(LANGUAGES)('%s', (language) => {
	test('has words for every unit that can be printed', () => {
		const words = printWordsOf(language);
		for (const { symbol } of units) {
			const [one, many] = words.units(symbol) ?? ['?', '?'];
			if (symbol === '') continue;
			expect(one, symbol).not.toMatch(/^[?\s]*$/);
			expect(many, symbol).not.toMatch(/^[?\s]*$/);
		}
		expect(words.units('no such unit')).toBeUndefined();
	});
	test('keeps numeral and unit together', () => {
		for (const { symbol } of units) {
			const printed = printStated(bare('20', symbol), language);
			expect(printed, symbol).toMatch(symbol ? /^20(?:\u00a0|%|-mal|[°′″])/ : /^20$/);
		}
	});
	test('loading it again changes nothing', async () => {
		const before = printWordsOf(language);
		await loadPrintWords(language);
		expect(printWordsOf(language)).toBe(before);
	});
});

/** CLDR 48 (ICU 78.2) for decimal marks, plural categories and scale words; SI Brochure 5.4 and RAE for spaces. */
describe('by the language', () => {
	test.each([
		['en', '-1420.5', '−1420.5'],
		['de', '-1420.5', '−1420,5'],
		['es', '17190.25', '17\u202f190,25'],
		['de', '299792458', '299\u202f792\u202f458']
	] as const)('numerals: %s %s', (language, numeral, printed) => {
		expect(printNumeral(numeral, language)).toBe(printed);
	});

	test.each([
		['en', bare('1', 'm'), `1${NB}metre`],
		['en', bare('1.0', 'm'), `1.0${NB}metres`],
		['en', bare('13.8', 'yr', 1e9), `13.8${NB}billion years`],
		['en', bare('1', 'yr', 1e6), `1${NB}million years`],
		['en', { ...bare('5', '%'), unitWord: '%' }, '5%'],
		['en', bare('5', '%'), `5${NB}per cent`],
		['de', bare('1', 's'), `1${NB}Sekunde`],
		['de', bare('1.5', 's'), `1,5${NB}Sekunden`],
		['de', bare('13.8', 'yr', 1e9), `13,8${NB}Milliarden Jahre`],
		['de', bare('1', 'yr', 1e9), `1${NB}Milliarde Jahre`],
		['de', bare('1.5', 'm', 1e12), `1,5${NB}Billionen Meter`],
		['de', bare('13.8', 'Gyr'), `13,8${NB}Milliarden Jahre`],
		['de', bare('5', '%'), `5${NB}%`],
		['de', bare('3', 'times'), '3-mal'],
		['de', bare('3', 'times', 1e6), `3${NB}Millionen mal`],
		['de', bare('1.5', 'm', 1e-18), `1,5${NB}·${NB}10⁻¹⁸ Meter`],
		['de', { ...bare('4', 'deg'), unitWord: '°' }, '4°'],
		['es', bare('1', 'h'), `1${NB}hora`],
		['es', bare('13.8', 'yr', 1e9), `13,8${NB}mil millones de años`],
		['es', bare('13.8', 'Gyr'), `13,8${NB}mil millones de años`],
		['es', bare('1', 'Myr'), `1${NB}millón de años`],
		['es', bare('2', 'yr', 1e6), `2${NB}millones de años`],
		['es', bare('1.5', 'm', 1e12), `1,5${NB}billones de metros`],
		['es', bare('20', 'yr', 1e3), `20${NB}mil años`],
		['es', bare('1000000', 'm'), `1\u202f000\u202f000${NB}de metros`],
		['es', bare('5', '%'), `5${NB}%`],
		['es', bare('3', 'times'), `3${NB}veces`],
		['es', bare('1.5', 'm', 1e-18), `1,5${NB}×${NB}10⁻¹⁸ metros`]
	] as const)('%s %#: %o', (language, stated, printed) => {
		expect(printStated(stated, language)).toBe(printed);
	});
});

test('large and tiny readings get a scale word or a power, and keep the figures asked for', () => {
	const state = (value: number, figures: number, language: 'en' | 'de' | 'es') =>
		printStated(
			stateReading(value, 'm', { unit: 'm', figures, hedge: 'none' }, 'number', language),
			language
		);
	expect(state(1.496e11, 3, 'en')).toBe(`150${NB}billion metres`);
	expect(state(1.04e9, 2, 'de')).toBe(`1,0${NB}Milliarden Meter`);
	expect(state(999_999.6, 3, 'es')).toBe(`1,00${NB}millón de metros`);
	expect(state(1.5e-18, 2, 'en')).toBe(`1.5${NB}×${NB}10⁻¹⁸ metres`);
	expect(state(9.461e15, 2, 'en')).toBe(`9.5${NB}×${NB}10¹⁵ metres`);
	expect(state(123_456, 2, 'en')).toBe('120\u202f000\u00a0metres');
});
