/** German for print: decimal comma, the long scale, a space before the per cent sign (DIN 5008, DIN 1333). */
import type { OneMany, PrintWords } from './print-words.ts';

const same = (word: string): OneMany => [word, word];

const UNITS: Readonly<Record<string, OneMany>> = {
	'': same(''),
	times: same('-mal'),
	'%': same('%'),
	ppm: ['Teil pro Million', 'Teile pro Million'],

	m: same('Meter'),
	mm: same('Millimeter'),
	cm: same('Zentimeter'),
	km: same('Kilometer'),
	µm: same('Mikrometer'),
	nm: same('Nanometer'),
	au: ['Astronomische Einheit', 'Astronomische Einheiten'],
	ly: ['Lichtjahr', 'Lichtjahre'],
	kly: same('tausend Lichtjahre'),
	Mly: ['Million Lichtjahre', 'Millionen Lichtjahre'],
	Gly: ['Milliarde Lichtjahre', 'Milliarden Lichtjahre'],
	pc: same('Parsec'),
	kpc: same('Kiloparsec'),
	Mpc: same('Megaparsec'),
	Gpc: same('Gigaparsec'),

	s: ['Sekunde', 'Sekunden'],
	ms: ['Millisekunde', 'Millisekunden'],
	µs: ['Mikrosekunde', 'Mikrosekunden'],
	ns: ['Nanosekunde', 'Nanosekunden'],
	min: ['Minute', 'Minuten'],
	h: ['Stunde', 'Stunden'],
	d: ['Tag', 'Tage'],
	yr: ['Jahr', 'Jahre'],
	kyr: same('tausend Jahre'),
	Myr: ['Million Jahre', 'Millionen Jahre'],
	Gyr: ['Milliarde Jahre', 'Milliarden Jahre'],

	Hz: same('Hertz'),
	kHz: same('Kilohertz'),
	MHz: same('Megahertz'),
	GHz: same('Gigahertz'),
	THz: same('Terahertz'),

	kg: same('Kilogramm'),
	g: same('Gramm'),
	t: ['Tonne', 'Tonnen'],
	u: ['atomare Masseneinheit', 'atomare Masseneinheiten'],

	J: same('Joule'),
	kJ: same('Kilojoule'),
	MJ: same('Megajoule'),
	GJ: same('Gigajoule'),
	eV: same('Elektronenvolt'),
	keV: same('Kiloelektronenvolt'),
	MeV: same('Megaelektronenvolt'),
	GeV: same('Gigaelektronenvolt'),
	Wh: ['Wattstunde', 'Wattstunden'],
	kWh: ['Kilowattstunde', 'Kilowattstunden'],
	cal: ['Kalorie', 'Kalorien'],
	kcal: ['Kilokalorie', 'Kilokalorien'],
	kcalIT: ['Kilokalorie (Internationale Tafel)', 'Kilokalorien (Internationale Tafel)'],
	gTNT: same('Gramm TNT'),
	tTNT: ['Tonne TNT', 'Tonnen TNT'],
	ktTNT: ['Kilotonne TNT', 'Kilotonnen TNT'],
	MtTNT: ['Megatonne TNT', 'Megatonnen TNT'],
	kt: ['Kilotonne TNT', 'Kilotonnen TNT'],
	Mt: ['Megatonne TNT', 'Megatonnen TNT'],
	erg: same('Erg'),
	Btu_IT: ['britische Wärmeeinheit', 'britische Wärmeeinheiten'],
	ftlbf: same('Foot-pound'),
	hartree: same('Hartree'),
	foe: same('Foe'),
	kgmc2: same('Kilogramm, ganz in Energie verwandelt'),

	W: same('Watt'),
	kW: same('Kilowatt'),
	MW: same('Megawatt'),

	K: same('Kelvin'),
	mK: same('Millikelvin'),
	'°C': same('Grad Celsius'),
	'°F': same('Grad Fahrenheit'),

	rad: ['Radiant', 'Radiant'],
	deg: same('Grad'),
	arcmin: ['Bogenminute', 'Bogenminuten'],
	arcsec: ['Bogensekunde', 'Bogensekunden'],

	'm/s': same('Meter pro Sekunde'),
	'km/s': same('Kilometer pro Sekunde'),
	'km/h': same('Kilometer pro Stunde'),
	'm/s2': same('Meter pro Quadratsekunde'),
	'km/s/Mpc': same('Kilometer pro Sekunde und Megaparsec'),
	N: same('Newton'),
	Pa: same('Pascal'),

	'kg/m3': same('Kilogramm pro Kubikmeter'),
	m3: same('Kubikmeter'),
	Mpc3: same('Kubikmegaparsec'),
	Gpc3: same('Kubikgigaparsec'),
	m2: same('Quadratmeter'),
	'cm3/s': same('Kubikzentimeter pro Sekunde'),
	'1/(cm2 s Hz sr)': [
		'Photon pro Quadratzentimeter, Sekunde, Hertz und Steradiant',
		'Photonen pro Quadratzentimeter, Sekunde, Hertz und Steradiant'
	],

	'W/m2': same('Watt pro Quadratmeter'),
	'W m-3 sr-1': same('Watt pro Quadratmeter, Steradiant und Meter Wellenlänge'),
	'W m-2 Hz-1 sr-1': same('Watt pro Quadratmeter, Steradiant und Hertz'),
	'm-3': same('pro Kubikmeter'),
	'J/m3': same('Joule pro Kubikmeter'),
	sr: same('Steradiant'),
	mas: ['Millibogensekunde', 'Millibogensekunden'],

	'kg m/s': same('Kilogrammmeter pro Sekunde'),
	'N/m': same('Newton pro Meter'),
	Bq: same('Becquerel'),

	Msun: ['Sonnenmasse', 'Sonnenmassen'],
	Mearth: ['Erdmasse', 'Erdmassen'],
	Mjup: ['Jupitermasse', 'Jupitermassen'],
	Rsun: ['Sonnenradius', 'Sonnenradien'],
	Rearth: ['Erdradius', 'Erdradien'],
	Rjup: ['Jupiterradius', 'Jupiterradien'],
	Lsun: ['Sonnenleuchtkraft', 'Sonnenleuchtkräfte'],
	same: same('in der Einheit der Halbwertszeit'),
	mag: ['Größenklasse', 'Größenklassen'],
	'kpc/arcsec': same('Kiloparsec pro Bogensekunde'),
	'arcsec/kpc': ['Bogensekunde pro Kiloparsec', 'Bogensekunden pro Kiloparsec']
};

const ONES =
	'null eins zwei drei vier fünf sechs sieben acht neun zehn elf zwölf dreizehn vierzehn fünfzehn sechzehn siebzehn achtzehn neunzehn'.split(
		' '
	);
const TENS = '  zwanzig dreißig vierzig fünfzig sechzig siebzig achtzig neunzig'.split(' ');

export const german: PrintWords = {
	language: 'de',
	decimalMark: ',',
	timesSign: '·',
	hedges: {
		around: 'etwa',
		below: 'fast',
		'just-above': 'etwas mehr als',
		'more-than': 'mehr als'
	},
	scales: {
		1e3: same('tausend'),
		1e6: ['Million', 'Millionen'],
		1e9: ['Milliarde', 'Milliarden'],
		1e12: ['Billion', 'Billionen']
	},
	afterScale: '',
	units: (symbol) => (Object.hasOwn(UNITS, symbol) ? UNITS[symbol] : undefined),
	closedUp: /^(?:-|[°′″]$)/u,
	spoken: {
		cardinal(value) {
			const [tens, ones] = [TENS[Math.floor(value / 10)] ?? '', ONES[value % 10] ?? ''];
			return (
				ONES[value] ?? (value % 10 === 0 ? tens : `${ones.replace(/^eins$/, 'ein')}und${tens}`)
			);
		},
		minus: 'minus',
		timesTen: 'mal zehn',
		ten: 'zehn',
		power: 'hoch',
		to: 'bis',
		giveOrTake: 'plus oder minus',
		units: { '%': ['Prozent', 'Prozent'], times: ['mal', 'mal'] },
		signs: {
			'≈': 'etwa',
			'~': 'etwa',
			'<': 'weniger als',
			'>': 'mehr als',
			'≤': 'höchstens',
			'≥': 'mindestens'
		},
		nought: 'null'
	}
};
