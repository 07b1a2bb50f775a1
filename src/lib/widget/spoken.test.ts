import { describe, expect, test } from 'vitest';
import type { Language } from './language.ts';
import './languages/all.ts';
import { spokenForm } from './spoken.ts';

/** House vectors: printed, then as it is said in English, German and Spanish; `.` is the decimal mark of English alone. */
const VECTORS: readonly [printed: string, en: string, de: string, es: string][] = [
	[
		'−19 °C',
		'minus nineteen degrees Celsius',
		'minus neunzehn Grad Celsius',
		'menos diecinueve grados Celsius'
	],
	[
		'1.5 × 10⁻¹⁸ m',
		'1.5 times ten to the minus eighteen metres',
		'1,5 mal zehn hoch minus achtzehn Meter',
		'1,5 por diez elevado a menos dieciocho metros'
	],
	['2–3 km', 'two to three kilometres', 'zwei bis drei Kilometer', 'dos a tres kilómetros'],
	[
		'13.787(20)',
		'13.787, give or take 0.020',
		'13,787, plus oder minus 0,020',
		'13,787, más o menos 0,020'
	],
	['84 ppm', '84 parts per million', '84 Teile pro Million', '84 partes por millón'],
	['H₀', 'H nought', 'H null', 'H cero'],
	['10³⁴', 'ten to the thirty-four', 'zehn hoch vierunddreißig', 'diez elevado a treinta y cuatro'],
	[
		'10⁻³ s',
		'ten to the minus three seconds',
		'zehn hoch minus drei Sekunden',
		'diez elevado a menos tres segundos'
	],
	[
		'13.787 ± 0.020',
		'13.787, give or take 0.020',
		'13,787, plus oder minus 0,020',
		'13,787, más o menos 0,020'
	],
	[
		'13.787(20) Gyr',
		'13.787 billion years, give or take 0.020',
		'13,787 Milliarden Jahre, plus oder minus 0,020',
		'13,787 mil millones de años, más o menos 0,020'
	],
	['5 %', 'five per cent', 'fünf Prozent', 'cinco por ciento'],
	['0.5 %', '0.5 per cent', '0,5 Prozent', '0,5 por ciento'],
	['100 %', '100 per cent', '100 Prozent', '100 por ciento'],
	['1 km', '1 kilometre', '1 Kilometer', '1 kilómetro'],
	['1 s', '1 second', '1 Sekunde', '1 segundo'],
	['1.0 s', '1.0 seconds', '1,0 Sekunden', '1,0 segundos'],
	['7 m/s', 'seven metres a second', 'sieben Meter pro Sekunde', 'siete metros por segundo'],
	[
		'300 km/s',
		'300 kilometres a second',
		'300 Kilometer pro Sekunde',
		'300 kilómetros por segundo'
	],
	[
		'9.81 m/s²',
		'9.81 metres a second squared',
		'9,81 Meter pro Quadratsekunde',
		'9,81 metros por segundo al cuadrado'
	],
	[
		'67.4 km/s/Mpc',
		'67.4 kilometres a second a megaparsec',
		'67,4 Kilometer pro Sekunde und Megaparsec',
		'67,4 kilómetros por segundo y megapársec'
	],
	[
		'687 kg/m³',
		'687 kilograms a cubic metre',
		'687 Kilogramm pro Kubikmeter',
		'687 kilogramos por metro cúbico'
	],
	['4°', 'four degrees', 'vier Grad', 'cuatro grados'],
	['12″', 'twelve arcseconds', 'zwölf Bogensekunden', 'doce segundos de arco'],
	['1420 MHz', '1420 megahertz', '1420 Megahertz', '1420 megahercios'],
	['299\u202f792 km', '299792 kilometres', '299792 Kilometer', '299792 kilómetros'],
	[
		'20 Mly',
		'twenty million light years',
		'zwanzig Millionen Lichtjahre',
		'veinte millones de años luz'
	],
	['13.8 Gyr', '13.8 billion years', '13,8 Milliarden Jahre', '13,8 mil millones de años'],
	['5 K', 'five kelvin', 'fünf Kelvin', 'cinco kelvin'],
	['2 h', 'two hours', 'zwei Stunden', 'dos horas'],
	['60–70 %', '60 to 70 per cent', '60 bis 70 Prozent', '60 a 70 por ciento'],
	[
		'−5–−2 °C',
		'minus five to minus two degrees Celsius',
		'minus fünf bis minus zwei Grad Celsius',
		'menos cinco a menos dos grados Celsius'
	],
	['≈ 3 kg', 'about three kilograms', 'etwa drei Kilogramm', 'alrededor de tres kilogramos'],
	[
		'< 8 GeV',
		'less than eight gigaelectronvolts',
		'weniger als acht Gigaelektronenvolt',
		'menos de ocho gigaelectronvoltios'
	],
	['≥ 12 m', 'at least twelve metres', 'mindestens zwölf Meter', 'al menos doce metros'],
	['≤ 12 m', 'at most twelve metres', 'höchstens zwölf Meter', 'como máximo doce metros'],
	['> 12 m', 'more than twelve metres', 'mehr als zwölf Meter', 'más de doce metros'],
	[
		'6 · 10²³',
		'six times ten to the twenty-three',
		'sechs mal zehn hoch dreiundzwanzig',
		'seis por diez elevado a veintitrés'
	],
	[
		'3 au',
		'three astronomical units',
		'drei Astronomische Einheiten',
		'tres unidades astronómicas'
	],
	['2 M☉', 'two solar masses', 'zwei Sonnenmassen', 'dos masas solares'],
	['15 Bq', 'fifteen becquerels', 'fünfzehn Becquerel', 'quince becquereles'],
	['40 J', '40 joules', '40 Joule', '40 julios'],
	['3\u00a0eV', 'three electronvolts', 'drei Elektronenvolt', 'tres electronvoltios'],
	['0 °C', '0 degrees Celsius', '0 Grad Celsius', '0 grados Celsius']
];

const comma = (printed: string) => printed.replace(/(?<=\d)\.(?=\d)/g, ',');

describe.each([
	['en', 1],
	['de', 2],
	['es', 3]
] as const)('%s', (language: Language, column) => {
	const vectors = VECTORS.map((vector) => ({
		printed: language === 'en' ? vector[0] : comma(vector[0]),
		said: vector[column]
	}));
	test('has forty vectors', () => {
		expect(vectors.length).toBeGreaterThanOrEqual(40);
	});
	test.each(vectors)('$printed is said “$said”', ({ printed, said }) => {
		expect(spokenForm(printed, language)).toBe(said);
	});
});

test('what is no sign or symbol stays as it is', () => {
	for (const text of [
		'A letter from 1965.',
		'uranium-235 and W4',
		'Planck 2018',
		'a 4-km-long arm'
	])
		expect(spokenForm(text, 'en')).toBe(text);
	expect(spokenForm('It fell by 3 % to −19 °C, so H₀ stays.', 'en')).toBe(
		'It fell by three per cent to minus nineteen degrees Celsius, so H nought stays.'
	);
});
