/** Spanish for print: decimal comma, the long scale, a space before the per cent sign (RAE, Ortografía 2010, and BIPM). */
import type { OneMany, PrintWords } from './print-words.ts';

const same = (word: string): OneMany => [word, word];
const regular = (word: string): OneMany => [word, `${word}s`];

const UNITS: Readonly<Record<string, OneMany>> = {
	'': same(''),
	times: ['vez', 'veces'],
	'%': same('%'),
	ppm: ['parte por millón', 'partes por millón'],

	m: regular('metro'),
	mm: regular('milímetro'),
	cm: regular('centímetro'),
	km: regular('kilómetro'),
	µm: regular('micrómetro'),
	nm: regular('nanómetro'),
	au: ['unidad astronómica', 'unidades astronómicas'],
	ly: ['año luz', 'años luz'],
	kly: same('mil años luz'),
	Mly: ['millón de años luz', 'millones de años luz'],
	Gly: same('mil millones de años luz'),
	pc: ['pársec', 'pársecs'],
	kpc: ['kilopársec', 'kilopársecs'],
	Mpc: ['megapársec', 'megapársecs'],
	Gpc: ['gigapársec', 'gigapársecs'],

	s: regular('segundo'),
	ms: regular('milisegundo'),
	µs: regular('microsegundo'),
	ns: regular('nanosegundo'),
	min: regular('minuto'),
	h: regular('hora'),
	d: regular('día'),
	yr: regular('año'),
	kyr: same('mil años'),
	Myr: ['millón de años', 'millones de años'],
	Gyr: same('mil millones de años'),

	Hz: regular('hercio'),
	kHz: regular('kilohercio'),
	MHz: regular('megahercio'),
	GHz: regular('gigahercio'),
	THz: regular('terahercio'),

	kg: regular('kilogramo'),
	g: regular('gramo'),
	t: regular('tonelada'),
	u: ['unidad de masa atómica', 'unidades de masa atómica'],

	J: regular('julio'),
	kJ: regular('kilojulio'),
	MJ: regular('megajulio'),
	GJ: regular('gigajulio'),
	eV: regular('electronvoltio'),
	keV: regular('kiloelectronvoltio'),
	MeV: regular('megaelectronvoltio'),
	GeV: regular('gigaelectronvoltio'),
	Wh: ['vatio hora', 'vatios hora'],
	kWh: ['kilovatio hora', 'kilovatios hora'],
	cal: regular('caloría'),
	kcal: regular('kilocaloría'),
	kcalIT: ['kilocaloría (tabla internacional)', 'kilocalorías (tabla internacional)'],
	gTNT: ['gramo de TNT', 'gramos de TNT'],
	tTNT: ['tonelada de TNT', 'toneladas de TNT'],
	ktTNT: ['kilotón de TNT', 'kilotones de TNT'],
	MtTNT: ['megatón de TNT', 'megatones de TNT'],
	kt: ['kilotón de TNT', 'kilotones de TNT'],
	Mt: ['megatón de TNT', 'megatones de TNT'],
	erg: regular('ergio'),
	Btu_IT: ['unidad térmica británica', 'unidades térmicas británicas'],
	ftlbf: ['pie-libra', 'pies-libra'],
	hartree: ['hartree', 'hartrees'],
	foe: same('foe'),
	kgmc2: ['kilogramo convertido del todo en energía', 'kilogramos convertidos del todo en energía'],

	W: regular('vatio'),
	kW: regular('kilovatio'),
	MW: regular('megavatio'),

	K: ['kelvin', 'kelvin'],
	mK: ['milikelvin', 'milikelvin'],
	'°C': ['grado Celsius', 'grados Celsius'],
	'°F': ['grado Fahrenheit', 'grados Fahrenheit'],

	rad: ['radián', 'radianes'],
	deg: regular('grado'),
	arcmin: ['minuto de arco', 'minutos de arco'],
	arcsec: ['segundo de arco', 'segundos de arco'],

	'm/s': ['metro por segundo', 'metros por segundo'],
	'km/s': ['kilómetro por segundo', 'kilómetros por segundo'],
	'km/h': ['kilómetro por hora', 'kilómetros por hora'],
	'm/s2': ['metro por segundo al cuadrado', 'metros por segundo al cuadrado'],
	'km/s/Mpc': ['kilómetro por segundo y megapársec', 'kilómetros por segundo y megapársec'],
	N: ['newton', 'newtons'],
	Pa: ['pascal', 'pascales'],

	'kg/m3': ['kilogramo por metro cúbico', 'kilogramos por metro cúbico'],
	m3: ['metro cúbico', 'metros cúbicos'],
	Mpc3: ['megapársec cúbico', 'megapársecs cúbicos'],
	Gpc3: ['gigapársec cúbico', 'gigapársecs cúbicos'],
	m2: ['metro cuadrado', 'metros cuadrados'],
	'cm3/s': ['centímetro cúbico por segundo', 'centímetros cúbicos por segundo'],
	'1/(cm2 s Hz sr)': [
		'fotón por centímetro cuadrado, segundo, hercio y estereorradián',
		'fotones por centímetro cuadrado, segundo, hercio y estereorradián'
	],

	'W/m2': ['vatio por metro cuadrado', 'vatios por metro cuadrado'],
	'W m-3 sr-1': [
		'vatio por metro cuadrado, estereorradián y metro de longitud de onda',
		'vatios por metro cuadrado, estereorradián y metro de longitud de onda'
	],
	'W m-2 Hz-1 sr-1': [
		'vatio por metro cuadrado, estereorradián y hercio',
		'vatios por metro cuadrado, estereorradián y hercio'
	],
	'm-3': same('por metro cúbico'),
	'J/m3': ['julio por metro cúbico', 'julios por metro cúbico'],
	sr: ['estereorradián', 'estereorradianes'],
	mas: ['milisegundo de arco', 'milisegundos de arco'],

	'kg m/s': ['kilogramo metro por segundo', 'kilogramos metro por segundo'],
	'N/m': ['newton por metro', 'newtons por metro'],
	Bq: ['becquerel', 'becquereles'],

	Msun: ['masa solar', 'masas solares'],
	Mearth: ['masa terrestre', 'masas terrestres'],
	Mjup: ['masa de Júpiter', 'masas de Júpiter'],
	Rsun: ['radio solar', 'radios solares'],
	Rearth: ['radio terrestre', 'radios terrestres'],
	Rjup: ['radio de Júpiter', 'radios de Júpiter'],
	Lsun: ['luminosidad solar', 'luminosidades solares'],
	same: same('en la unidad del periodo de semidesintegración'),
	mag: ['magnitud', 'magnitudes'],
	'kpc/arcsec': ['kilopársec por segundo de arco', 'kilopársecs por segundo de arco'],
	'arcsec/kpc': ['segundo de arco por kilopársec', 'segundos de arco por kilopársec']
};

const ONES =
	'cero uno dos tres cuatro cinco seis siete ocho nueve diez once doce trece catorce quince dieciséis diecisiete dieciocho diecinueve veinte veintiuno veintidós veintitrés veinticuatro veinticinco veintiséis veintisiete veintiocho veintinueve'.split(
		' '
	);
const TENS = '   treinta cuarenta cincuenta sesenta setenta ochenta noventa'.split(' ');

export const spanish: PrintWords = {
	language: 'es',
	decimalMark: ',',
	timesSign: '×',
	hedges: {
		around: 'alrededor de',
		below: 'casi',
		'just-above': 'algo más de',
		'more-than': 'más de'
	},
	scales: {
		1e3: same('mil'),
		1e6: ['millón', 'millones'],
		1e9: same('mil millones'),
		1e12: ['billón', 'billones']
	},
	afterScale: 'de',
	units: (symbol) => (Object.hasOwn(UNITS, symbol) ? UNITS[symbol] : undefined),
	closedUp: /^[°′″]$/u,
	spoken: {
		cardinal(value) {
			const [tens, ones] = [TENS[Math.floor(value / 10)] ?? '', ONES[value % 10] ?? ''];
			return ONES[value] ?? (value % 10 === 0 ? tens : `${tens} y ${ones}`);
		},
		minus: 'menos',
		timesTen: 'por diez',
		ten: 'diez',
		power: 'elevado a',
		to: 'a',
		giveOrTake: 'más o menos',
		units: { '%': ['por ciento', 'por ciento'], times: ['vez', 'veces'] },
		signs: {
			'≈': 'alrededor de',
			'~': 'alrededor de',
			'<': 'menos de',
			'>': 'más de',
			'≤': 'como máximo',
			'≥': 'al menos'
		},
		nought: 'cero'
	}
};
