import { describe, expect, test } from 'vitest';
import type { Language } from '../../widget/language.ts';
import { detectQuantities } from '../detect.ts';
import { hedgeFamily } from '../hedges.ts';
import { weigh, type WeighedReading } from '../weigh.ts';
import './all.ts';
import { compoundNumber, compoundPart } from './de-words.ts';

function first(text: string, language: Language) {
	const [quantity] = detectQuantities(text, language);
	if (!quantity) throw new Error(`nothing found in “${text}”`);
	return quantity;
}

test.each([
	['dreizehn', 13],
	['einundzwanzig', 21],
	['siebenundneunzig', 97],
	['hundert', 100],
	['hundertundeins', 101],
	['dreihundertvierundzwanzig', 324],
	['tausend', 1000],
	['zweitausendfünfhundert', 2500],
	['dreihunderttausend', 300_000],
	['zweieinhalb', 2.5],
	['zweieinhalbtausend', 2500],
	['ein', null],
	['eine', null],
	['einfach', null],
	['dreieck', null],
	['achtung', null],
	['zweifel', null],
	['vierung', null]
])('the German word %s is %s', (word, value) => {
	expect(compoundNumber(word)).toBe(value);
});

test.each([
	['zwanzigstel', 20],
	['vierhundertsteln', 400],
	['zehntausendstels', 10_000],
	['hotel', null],
	['mittel', null]
])('the German part %s is one in %s', (word, under) => {
	expect(compoundPart(word)).toBe(under);
});

describe('German', () => {
	test.each([
		['13,8 Milliarden Jahre', { value: 1.38e10, unit: 'yr', kind: 'number' }],
		['1.420,4 MHz', { value: 1420.4, unit: 'MHz' }],
		['1 420,4 MHz', { value: 1420.4, unit: 'MHz' }],
		['380.000 Jahre', { value: 380_000, unit: 'yr' }],
		['13.8 Milliarden Jahre', { value: 1.38e10 }],
		['13.787(20) Milliarden Jahre', { value: 1.3787e10, kind: 'uncertainty' }],
		['12’345 km', { value: 12_345, unit: 'km' }],
		['14 Mrd. Jahre', { value: 1.4e10, unit: 'yr' }],
		['eine Million Jahre', { value: 1e6, unit: 'yr' }],
		['anderthalb Billionen', { value: 1.5e12 }],
		['300 Kilometer in der Sekunde', { value: 300, unit: 'km/s' }],
		['120 Stundenkilometer', { value: 120, unit: 'km/h' }],
		['halb so schnell', { value: 0.5, kind: 'fraction', surface: 'halb' }],
		['eine halbe Million Jahre', { value: 5e5, kind: 'fraction', unit: 'yr' }],
		['eine Zehntelsekunde', { value: 0.1, unit: 's', kind: 'fraction' }],
		['einer Viertelstunde', { value: 0.25, unit: 'h' }],
		['drei- bis viermal', { ends: [3, 4], unit: 'times', kind: 'range' }],
		['zwischen etwa 3 und 5 km', { ends: [3, 5], unit: 'km' }],
		['um das Dreifache', { value: 3, kind: 'multiple', surface: 'das Dreifache' }],
		['20-mal so hell', { value: 20, unit: 'times', kind: 'multiple' }],
		['um den Faktor 8.', { value: 8, kind: 'multiple' }],
		['10 hoch 24', { value: 1e24, kind: 'power' }],
		['1,5 · 10^-18 m', { value: 1.5e-18, kind: 'power' }],
		['minus neunzehn Grad Celsius', { value: -19, unit: '°C' }],
		['3 Prozentpunkte', { value: 3, unit: '%', kind: 'percent' }],
		['mehrere Tausend Jahre', { value: null, unit: 'yr', kind: 'small-word' }],
		['Hunderte Millionen Sterne', { value: 1e8, kind: 'order-word' }]
	])('%s', (text, expected) => {
		expect(first(text, 'de')).toMatchObject(expected);
	});
	test.each([
		['knapp 14 km', 'just-below'],
		['gut 14 km', 'just-above'],
		['fast 14 km', 'below'],
		['rund 14 km', 'around'],
		['knapp über 14 km', 'just-above'],
		['über 14 km', 'more-than'],
		['weit über 14 km', 'well-over'],
		['unter 14 km', 'less-than'],
		['höchstens 14 km', 'at-most'],
		['mindestens 14 km', 'at-least'],
		['bis zu 14 km', 'up-to'],
		['binnen 14 Tagen', 'within'],
		['genau 14 km', 'exactly']
	])('%s: %s', (text, hedge) => {
		expect(first(text, 'de').stated?.hedge).toBe(hedge);
	});
	test.each([
		'am 24. November 2026',
		'24.11.2026',
		'im 21. Jahrhundert',
		'die 3. Auflage',
		'1929 fand man es',
		'seit 1965',
		'bis 2030',
		'die 1990er-Jahre',
		'um 18.40 Uhr',
		'300 v. Chr.',
		'Planck 2018 zeigt',
		'Abb. 3',
		'Kapitel 4',
		'Teil zwei',
		'einmal',
		'einfach',
		'eines Tages',
		'die zweite Hälfte',
		'Kohlenstoff-14',
		'NGC 1300 leuchtet',
		'Fassung 2.1.0'
	])('%s is no quantity', (text) => {
		expect(detectQuantities(`Es war ${text}`, 'de')).toEqual([]);
	});
});

describe('Spanish', () => {
	test.each([
		['13,8 mil millones de años', { value: 1.38e10, unit: 'yr', kind: 'number' }],
		['13.800 millones de años', { value: 1.38e10, unit: 'yr' }],
		['1 420,4 MHz', { value: 1420.4, unit: 'MHz' }],
		['1,420.4 MHz', { value: 1420.4, unit: 'MHz' }],
		['1.5 km', { value: 1.5, unit: 'km' }],
		['cien mil millones de estrellas', { value: 1e11 }],
		['mil años', { value: 1000, unit: 'yr' }],
		['dos mil quinientos metros', { value: 2500, unit: 'm' }],
		['trescientas cuarenta y dos', { value: 342 }],
		['un millón y medio de años', { value: 1.5e6, unit: 'yr' }],
		['tres horas y media', { value: 3.5, unit: 'h' }],
		['1,5 billones de km', { value: 1.5e12, unit: 'km' }],
		['300 kilómetros por segundo', { value: 300, unit: 'km/s' }],
		['media hora', { value: 0.5, unit: 'h', kind: 'fraction' }],
		['medio millón de años', { value: 5e5, unit: 'yr', kind: 'fraction' }],
		['una décima de segundo', { value: 0.1, unit: 's', kind: 'fraction' }],
		['dos tercios', { value: 2 / 3, kind: 'fraction' }],
		['la décima parte', { value: 0.1, kind: 'fraction', surface: 'la décima parte' }],
		['entre el 5 y el 10 %', { ends: [5, 10], unit: '%', kind: 'range' }],
		['de 3 a 5 km', { ends: [3, 5], unit: 'km' }],
		['más del doble', { value: 2, kind: 'multiple', surface: 'más del doble' }],
		['un factor 8', { value: 8, kind: 'multiple' }],
		['1,5 × 10⁻¹⁸ m', { value: 1.5e-18, kind: 'power' }],
		['menos diecinueve grados Celsius', { value: -19, unit: '°C' }],
		['13,787(20) Gyr', { value: 13.787, kind: 'uncertainty' }],
		['miles de millones de años', { value: 1e9, unit: 'yr', kind: 'order-word' }],
		['varios cientos de metros', { value: null, unit: 'm', kind: 'small-word' }],
		['una veintena de lunas', { value: 20, kind: 'small-word' }],
		['al menos 40 km', { value: 40, hedge: 'al menos' }]
	])('%s', (text, expected) => {
		const found = first(text, 'es');
		const { value, ...rest } = expected as { value?: number | null };
		expect(found).toMatchObject(rest);
		if (typeof value === 'number') expect((found.value ?? NaN) / value).toBeCloseTo(1, 12);
		else if (value === null) expect(found.value).toBeNull();
	});
	test.each([
		['casi 14 km', 'below'],
		['unos 14 km', 'around'],
		['cerca de 14 km', 'around'],
		['más de 14 km', 'more-than'],
		['algo más de 14 km', 'just-above'],
		['poco menos de 14 km', 'just-below'],
		['alrededor del 14 %', 'around'],
		['casi el 14 %', 'below'],
		['como mucho 14 km', 'at-most'],
		['hasta 14 km', 'up-to'],
		['exactamente 14 km', 'exactly']
	])('%s: %s', (text, hedge) => {
		expect(first(text, 'es').stated?.hedge).toBe(hedge);
	});
	test.each([
		'el 24 de noviembre de 2026',
		'en mayo de 2019',
		'en 1965',
		'hasta 2030',
		'los años 90',
		'la década de 2000',
		'el siglo 21',
		'a las 18.40',
		'a las 6 de la tarde',
		'Planck 2018',
		'la figura 3',
		'el capítulo 4',
		'la parte dos',
		'una vez',
		'un segundo vistazo',
		'la segunda mitad',
		'la velocidad media',
		'en medio de todo',
		'la 26.ª conferencia',
		'el carbono-14',
		'(Sala et al., 2021)'
	])('%s is no quantity', (text) => {
		expect(detectQuantities(`Fue ${text}`, 'es')).toEqual([]);
	});
});

describe('weighing in the language of the copy', () => {
	const age: WeighedReading = { value: 13.787, unit: 'Gyr', uncertainty: 0.02 };
	const told = (text: string, language: Language) => {
		const { stated } = first(text, language);
		if (!stated) throw new Error(`nothing to weigh in “${text}”`);
		return weigh(stated, age, language);
	};
	test.each([
		['de', 'fast 14 Milliarden Jahre', 'level'],
		['de', 'knapp 14 Milliarden Jahre', 'level'],
		['de', 'gut 14 Milliarden Jahre', 'tips'],
		['de', 'mehr als 13 Milliarden Jahre', 'level'],
		['de', 'etwa 15 Milliarden Jahre', 'leans'],
		['de', '14 Billionen Jahre', 'tips'],
		['es', 'casi 14 mil millones de años', 'level'],
		['es', 'unos 13 800 millones de años', 'level'],
		['es', 'más de 14 mil millones de años', 'tips'],
		['es', '14 billones de años', 'tips']
	] as const)('%s: %s %s', (language, text, verdict) => {
		expect(told(text, language).verdict).toBe(verdict);
	});
	test('an English billion in a language of the long scale is named', () => {
		expect(told('14 billones de años', 'es').reason).toMatch(
			/A thousand times too large: “billón”/
		);
		expect(told('rund 14 Billionen Jahre', 'de').reason).toMatch(/“Milliarde”/);
	});
	test('suggestions come in the language', () => {
		const plain = (texts: string[]) => texts.map((text) => text.replaceAll('\u00a0', ' '));
		expect(plain(told('13,7 Milliarden Jahre', 'de').suggestions)).toEqual([
			'etwa 14 Milliarden Jahre',
			'fast 14 Milliarden Jahre',
			'mehr als 13 Milliarden Jahre'
		]);
		expect(plain(told('13,7 mil millones de años', 'es').suggestions)[0]).toBe(
			'alrededor de 14 mil millones de años'
		);
	});
	test('“cerca de”, which is read in two ways, is asked about', () => {
		expect(told('cerca de 14 mil millones de años', 'es')).toMatchObject({
			verdict: 'level',
			severity: 'ask'
		});
	});
	test('hedges are known by their own language', () => {
		expect(hedgeFamily('knapp', 'de')).toBe('just-below');
		expect(hedgeFamily('knapp', 'en')).toBeUndefined();
		expect(hedgeFamily('a lo sumo', 'es')).toBe('at-most');
	});
});
