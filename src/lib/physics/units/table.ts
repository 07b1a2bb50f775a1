/**
 * The unit table as data. A unit is `factor` × 10^`decade` of its coherent SI unit; keeping powers of ten apart keeps
 * conversions between prefixes free of rounding. Factors are exact unless `source` says where the digits come from.
 *
 * Angle and magnitude count as dimensions here although SI calls them pure numbers: a degree never becomes a per cent.
 */

export type BaseDimension =
	'm' | 'kg' | 's' | 'K' | 'A' | 'mol' | 'cd' | 'angle' | 'magnitude' | 'unstated';
export type Dimension = Readonly<Partial<Record<BaseDimension, number>>>;

export interface UnitRow {
	symbol: string;
	dimension: Dimension;
	factor: number;
	decade: number;
	/** Scales that don't start at zero: SI value = (value + offset) × factor. Only °C and °F have one. */
	offset?: number;
	/** What is printed after a numeral. */
	one: string;
	many: string;
	/** Further names met in copy. Spellings in -er and “per” for “a” are added by rule. */
	also?: string[];
	/** Other ways to write the symbol. */
	symbols?: string[];
	/** What a screen reader says, where it isn't the plural. */
	spoken?: string;
	/** Where the factor is defined, for units outside SI. */
	source?: string;
}

const LENGTH: Dimension = { m: 1 };
const TIME: Dimension = { s: 1 };
const FREQUENCY: Dimension = { s: -1 };
const MASS: Dimension = { kg: 1 };
const ENERGY: Dimension = { kg: 1, m: 2, s: -2 };
const POWER: Dimension = { kg: 1, m: 2, s: -3 };
const TEMPERATURE: Dimension = { K: 1 };
const ANGLE: Dimension = { angle: 1 };
const SPEED: Dimension = { m: 1, s: -1 };
const VOLUME: Dimension = { m: 3 };
const NUMBER: Dimension = {};

const SI_BROCHURE = 'BIPM, The International System of Units (SI Brochure), 9th edition, 2019';
const IAU_2012_B2 = 'IAU 2012 Resolution B2: au = 149 597 870 700 m';
const IAU_2015_B2 = 'IAU 2015 Resolution B2: pc = 648 000/π au';
const IAU_2015_B3 = 'IAU 2015 Resolution B3: nominal solar and planetary values';
const NOMINAL_MASS =
	'IAU 2015 Resolution B3 for GM; G of CODATA 2018, relative uncertainty 2.2 × 10⁻⁵';
const JULIAN = 'IAU Style Manual 1989: Julian year of 365.25 d; light year = c × Julian year';
const SP_811 = 'NIST Special Publication 811 (2008), appendix B.8';
const TNT =
	'NIST Special Publication 811 (2008), appendix B.8: ton of TNT = 10⁹ cal (thermochemical), a convention';

const AU = 149_597_870_700;
const PARSEC = (AU * 648_000) / Math.PI;
const JULIAN_YEAR = 31_557_600;
const LIGHT_SPEED = 299_792_458;
/** Even, so that it is a double exactly. */
const LIGHT_YEAR = LIGHT_SPEED * JULIAN_YEAR;
const ELEMENTARY_CHARGE_DIGITS = 1.602176634;
const GRAVITATION_DIGITS = 6.6743;
const DEGREE = Math.PI / 180;

export const UNIT_TABLE: readonly UnitRow[] = [
	// Pure numbers
	{ symbol: '', dimension: NUMBER, factor: 1, decade: 0, one: '', many: '', spoken: '' },
	{
		symbol: 'times',
		dimension: NUMBER,
		factor: 1,
		decade: 0,
		one: 'times',
		many: 'times',
		also: ['fold', 'time'],
		symbols: ['×']
	},
	{
		symbol: '%',
		dimension: NUMBER,
		factor: 1,
		decade: -2,
		one: 'per cent',
		many: 'per cent',
		also: ['percent']
	},
	{
		symbol: 'ppm',
		dimension: NUMBER,
		factor: 1,
		decade: -6,
		one: 'part per million',
		many: 'parts per million',
		also: ['parts in a million']
	},

	// Length
	{ symbol: 'm', dimension: LENGTH, factor: 1, decade: 0, one: 'metre', many: 'metres' },
	{
		symbol: 'mm',
		dimension: LENGTH,
		factor: 1,
		decade: -3,
		one: 'millimetre',
		many: 'millimetres'
	},
	{
		symbol: 'cm',
		dimension: LENGTH,
		factor: 1,
		decade: -2,
		one: 'centimetre',
		many: 'centimetres'
	},
	{ symbol: 'km', dimension: LENGTH, factor: 1, decade: 3, one: 'kilometre', many: 'kilometres' },
	{
		symbol: 'µm',
		dimension: LENGTH,
		factor: 1,
		decade: -6,
		one: 'micrometre',
		many: 'micrometres',
		also: ['micron', 'microns'],
		symbols: ['μm', 'um']
	},
	{ symbol: 'nm', dimension: LENGTH, factor: 1, decade: -9, one: 'nanometre', many: 'nanometres' },
	{
		symbol: 'au',
		dimension: LENGTH,
		factor: AU,
		decade: 0,
		one: 'astronomical unit',
		many: 'astronomical units',
		symbols: ['AU'],
		source: IAU_2012_B2
	},
	{
		symbol: 'ly',
		dimension: LENGTH,
		factor: LIGHT_YEAR,
		decade: 0,
		one: 'light year',
		many: 'light years',
		also: ['light-year', 'light-years', 'lightyear', 'lightyears'],
		source: JULIAN
	},
	{
		symbol: 'kly',
		dimension: LENGTH,
		factor: LIGHT_YEAR,
		decade: 3,
		one: 'thousand light years',
		many: 'thousand light years',
		source: JULIAN
	},
	{
		symbol: 'Mly',
		dimension: LENGTH,
		factor: LIGHT_YEAR,
		decade: 6,
		one: 'million light years',
		many: 'million light years',
		source: JULIAN
	},
	{
		symbol: 'Gly',
		dimension: LENGTH,
		factor: LIGHT_YEAR,
		decade: 9,
		one: 'billion light years',
		many: 'billion light years',
		source: JULIAN
	},
	{
		symbol: 'pc',
		dimension: LENGTH,
		factor: PARSEC,
		decade: 0,
		one: 'parsec',
		many: 'parsecs',
		source: IAU_2015_B2
	},
	{
		symbol: 'kpc',
		dimension: LENGTH,
		factor: PARSEC,
		decade: 3,
		one: 'kiloparsec',
		many: 'kiloparsecs',
		source: IAU_2015_B2
	},
	{
		symbol: 'Mpc',
		dimension: LENGTH,
		factor: PARSEC,
		decade: 6,
		one: 'megaparsec',
		many: 'megaparsecs',
		source: IAU_2015_B2
	},
	{
		symbol: 'Gpc',
		dimension: LENGTH,
		factor: PARSEC,
		decade: 9,
		one: 'gigaparsec',
		many: 'gigaparsecs',
		source: IAU_2015_B2
	},

	// Time
	{
		symbol: 's',
		dimension: TIME,
		factor: 1,
		decade: 0,
		one: 'second',
		many: 'seconds',
		symbols: ['sec']
	},
	{
		symbol: 'ms',
		dimension: TIME,
		factor: 1,
		decade: -3,
		one: 'millisecond',
		many: 'milliseconds'
	},
	{
		symbol: 'µs',
		dimension: TIME,
		factor: 1,
		decade: -6,
		one: 'microsecond',
		many: 'microseconds',
		symbols: ['μs', 'us']
	},
	{ symbol: 'ns', dimension: TIME, factor: 1, decade: -9, one: 'nanosecond', many: 'nanoseconds' },
	{
		symbol: 'min',
		dimension: TIME,
		factor: 60,
		decade: 0,
		one: 'minute',
		many: 'minutes',
		source: SI_BROCHURE
	},
	{
		symbol: 'h',
		dimension: TIME,
		factor: 3600,
		decade: 0,
		one: 'hour',
		many: 'hours',
		symbols: ['hr'],
		source: SI_BROCHURE
	},
	{
		symbol: 'd',
		dimension: TIME,
		factor: 86_400,
		decade: 0,
		one: 'day',
		many: 'days',
		source: SI_BROCHURE
	},
	{
		symbol: 'yr',
		dimension: TIME,
		factor: JULIAN_YEAR,
		decade: 0,
		one: 'year',
		many: 'years',
		source: JULIAN
	},
	{
		symbol: 'kyr',
		dimension: TIME,
		factor: JULIAN_YEAR,
		decade: 3,
		one: 'thousand years',
		many: 'thousand years',
		also: ['kiloyear', 'kiloyears'],
		source: JULIAN
	},
	{
		symbol: 'Myr',
		dimension: TIME,
		factor: JULIAN_YEAR,
		decade: 6,
		one: 'million years',
		many: 'million years',
		also: ['megayear', 'megayears'],
		symbols: ['Ma'],
		source: JULIAN
	},
	{
		symbol: 'Gyr',
		dimension: TIME,
		factor: JULIAN_YEAR,
		decade: 9,
		one: 'billion years',
		many: 'billion years',
		also: ['gigayear', 'gigayears'],
		symbols: ['Ga'],
		source: JULIAN
	},

	// Frequency
	{ symbol: 'Hz', dimension: FREQUENCY, factor: 1, decade: 0, one: 'hertz', many: 'hertz' },
	{
		symbol: 'kHz',
		dimension: FREQUENCY,
		factor: 1,
		decade: 3,
		one: 'kilohertz',
		many: 'kilohertz'
	},
	{
		symbol: 'MHz',
		dimension: FREQUENCY,
		factor: 1,
		decade: 6,
		one: 'megahertz',
		many: 'megahertz'
	},
	{
		symbol: 'GHz',
		dimension: FREQUENCY,
		factor: 1,
		decade: 9,
		one: 'gigahertz',
		many: 'gigahertz'
	},
	{
		symbol: 'THz',
		dimension: FREQUENCY,
		factor: 1,
		decade: 12,
		one: 'terahertz',
		many: 'terahertz'
	},

	// Mass
	{
		symbol: 'kg',
		dimension: MASS,
		factor: 1,
		decade: 0,
		one: 'kilogram',
		many: 'kilograms',
		also: ['kilogramme', 'kilogrammes', 'kilo', 'kilos']
	},
	{
		symbol: 'g',
		dimension: MASS,
		factor: 1,
		decade: -3,
		one: 'gram',
		many: 'grams',
		also: ['gramme', 'grammes']
	},
	{
		symbol: 't',
		dimension: MASS,
		factor: 1,
		decade: 3,
		one: 'tonne',
		many: 'tonnes',
		also: ['metric ton', 'metric tons'],
		source: SI_BROCHURE
	},
	{
		symbol: 'u',
		dimension: MASS,
		factor: 1.6605390666,
		decade: -27,
		one: 'atomic mass unit',
		many: 'atomic mass units',
		also: ['dalton', 'daltons'],
		symbols: ['Da'],
		source: 'CODATA 2018: 1.660 539 066 60(50) × 10⁻²⁷ kg'
	},

	// Energy
	{ symbol: 'J', dimension: ENERGY, factor: 1, decade: 0, one: 'joule', many: 'joules' },
	{ symbol: 'kJ', dimension: ENERGY, factor: 1, decade: 3, one: 'kilojoule', many: 'kilojoules' },
	{ symbol: 'MJ', dimension: ENERGY, factor: 1, decade: 6, one: 'megajoule', many: 'megajoules' },
	{ symbol: 'GJ', dimension: ENERGY, factor: 1, decade: 9, one: 'gigajoule', many: 'gigajoules' },
	{
		symbol: 'eV',
		dimension: ENERGY,
		factor: ELEMENTARY_CHARGE_DIGITS,
		decade: -19,
		one: 'electronvolt',
		many: 'electronvolts',
		also: ['electron volt', 'electron volts', 'electron-volt', 'electron-volts'],
		source: SI_BROCHURE
	},
	{
		symbol: 'keV',
		dimension: ENERGY,
		factor: ELEMENTARY_CHARGE_DIGITS,
		decade: -16,
		one: 'kiloelectronvolt',
		many: 'kiloelectronvolts',
		source: SI_BROCHURE
	},
	{
		symbol: 'MeV',
		dimension: ENERGY,
		factor: ELEMENTARY_CHARGE_DIGITS,
		decade: -13,
		one: 'megaelectronvolt',
		many: 'megaelectronvolts',
		source: SI_BROCHURE
	},
	{
		symbol: 'GeV',
		dimension: ENERGY,
		factor: ELEMENTARY_CHARGE_DIGITS,
		decade: -10,
		one: 'gigaelectronvolt',
		many: 'gigaelectronvolts',
		source: SI_BROCHURE
	},
	{
		symbol: 'Wh',
		dimension: ENERGY,
		factor: 3600,
		decade: 0,
		one: 'watt hour',
		many: 'watt hours',
		also: ['watt-hour', 'watt-hours']
	},
	{
		symbol: 'kWh',
		dimension: ENERGY,
		factor: 3600,
		decade: 3,
		one: 'kilowatt hour',
		many: 'kilowatt hours',
		also: ['kilowatt-hour', 'kilowatt-hours']
	},
	{
		symbol: 'cal',
		dimension: ENERGY,
		factor: 4.184,
		decade: 0,
		one: 'calorie',
		many: 'calories',
		also: ['gram calorie', 'gram calories'],
		source: `${SP_811} (thermochemical)`
	},
	{
		symbol: 'kcal',
		dimension: ENERGY,
		factor: 4.184,
		decade: 3,
		one: 'kilocalorie',
		many: 'kilocalories',
		also: ['food calorie', 'food calories', 'large calorie', 'large calories'],
		source: `${SP_811} (thermochemical)`
	},
	{
		symbol: 'kcalIT',
		dimension: ENERGY,
		factor: 4.1868,
		decade: 3,
		one: 'kilocalorie (International Table)',
		many: 'kilocalories (International Table)',
		source: SP_811
	},
	{
		symbol: 'gTNT',
		dimension: ENERGY,
		factor: 4.184,
		decade: 3,
		one: 'gram of TNT',
		many: 'grams of TNT',
		also: ['gramme of TNT', 'grammes of TNT'],
		source: TNT
	},
	{
		symbol: 'tTNT',
		dimension: ENERGY,
		factor: 4.184,
		decade: 9,
		one: 'tonne of TNT',
		many: 'tonnes of TNT',
		also: ['ton of TNT', 'tons of TNT'],
		source: TNT
	},
	{
		symbol: 'ktTNT',
		dimension: ENERGY,
		factor: 4.184,
		decade: 12,
		one: 'kilotonne of TNT',
		many: 'kilotonnes of TNT',
		also: ['kiloton of TNT', 'kilotons of TNT', 'kiloton', 'kilotons', 'kilotonne', 'kilotonnes'],
		source: TNT
	},
	{
		symbol: 'MtTNT',
		dimension: ENERGY,
		factor: 4.184,
		decade: 15,
		one: 'megatonne of TNT',
		many: 'megatonnes of TNT',
		also: ['megaton of TNT', 'megatons of TNT', 'megaton', 'megatons', 'megatonne', 'megatonnes'],
		source: TNT
	},
	// The short forms stand for energy here, never for a mass or a ship's speed.
	{
		symbol: 'kt',
		dimension: ENERGY,
		factor: 4.184,
		decade: 12,
		one: 'kilotonne of TNT',
		many: 'kilotonnes of TNT',
		source: TNT
	},
	{
		symbol: 'Mt',
		dimension: ENERGY,
		factor: 4.184,
		decade: 15,
		one: 'megatonne of TNT',
		many: 'megatonnes of TNT',
		source: TNT
	},
	{
		symbol: 'erg',
		dimension: ENERGY,
		factor: 1,
		decade: -7,
		one: 'erg',
		many: 'ergs',
		source: SP_811
	},
	{
		symbol: 'Btu_IT',
		dimension: ENERGY,
		factor: 1055.05585262,
		decade: 0,
		one: 'British thermal unit',
		many: 'British thermal units',
		symbols: ['Btu', 'BTU'],
		source: `${SP_811} (International Table)`
	},
	{
		symbol: 'ftlbf',
		dimension: ENERGY,
		factor: 0.3048 * 4.4482216152605, // foot × pound-force
		decade: 0,
		one: 'foot-pound',
		many: 'foot-pounds',
		also: ['foot pound', 'foot pounds', 'foot-pound force', 'foot-pounds force'],
		source: SP_811
	},
	{
		symbol: 'hartree',
		dimension: ENERGY,
		factor: 2 * 10_973_731.56816 * 6.62607015 * LIGHT_SPEED,
		decade: -34,
		one: 'hartree',
		many: 'hartrees',
		source: 'CODATA 2018: 2 R∞ h c, relative uncertainty 1.9 × 10⁻¹²'
	},
	{
		symbol: 'foe',
		dimension: ENERGY,
		factor: 1,
		decade: 44,
		one: 'foe',
		many: 'foe',
		spoken: 'foe, ten to the forty-four joules',
		source: 'by name: ten to the fifty-one ergs'
	},
	{
		symbol: 'kgmc2',
		dimension: ENERGY,
		factor: LIGHT_SPEED * LIGHT_SPEED,
		decade: 0,
		one: 'kilogram turned wholly into energy',
		many: 'kilograms turned wholly into energy',
		source: 'E = mc² with the exact c of the SI'
	},

	// Power
	{ symbol: 'W', dimension: POWER, factor: 1, decade: 0, one: 'watt', many: 'watts' },
	{ symbol: 'kW', dimension: POWER, factor: 1, decade: 3, one: 'kilowatt', many: 'kilowatts' },
	{ symbol: 'MW', dimension: POWER, factor: 1, decade: 6, one: 'megawatt', many: 'megawatts' },

	// Temperature
	{
		symbol: 'K',
		dimension: TEMPERATURE,
		factor: 1,
		decade: 0,
		one: 'kelvin',
		many: 'kelvin',
		also: ['kelvins', 'degree kelvin', 'degrees kelvin']
	},
	{
		symbol: 'mK',
		dimension: TEMPERATURE,
		factor: 1,
		decade: -3,
		one: 'millikelvin',
		many: 'millikelvin',
		also: ['millikelvins']
	},
	{
		symbol: '°C',
		dimension: TEMPERATURE,
		factor: 1,
		decade: 0,
		offset: 273.15,
		one: 'degree Celsius',
		many: 'degrees Celsius',
		also: ['degree centigrade', 'degrees centigrade'],
		symbols: ['ºC', '℃', 'degC'],
		source: SI_BROCHURE
	},
	{
		symbol: '°F',
		dimension: TEMPERATURE,
		factor: 5 / 9,
		decade: 0,
		offset: 459.67,
		one: 'degree Fahrenheit',
		many: 'degrees Fahrenheit',
		symbols: ['ºF', '℉', 'degF'],
		source: SP_811
	},

	// Angle
	{ symbol: 'rad', dimension: ANGLE, factor: 1, decade: 0, one: 'radian', many: 'radians' },
	{
		symbol: 'deg',
		dimension: ANGLE,
		factor: DEGREE,
		decade: 0,
		one: 'degree',
		many: 'degrees',
		symbols: ['°'],
		source: SI_BROCHURE
	},
	{
		symbol: 'arcmin',
		dimension: ANGLE,
		factor: DEGREE / 60,
		decade: 0,
		one: 'arcminute',
		many: 'arcminutes',
		also: ['minute of arc', 'minutes of arc', 'arc minute', 'arc minutes'],
		symbols: ['′'],
		source: SI_BROCHURE
	},
	{
		symbol: 'arcsec',
		dimension: ANGLE,
		factor: DEGREE / 3600,
		decade: 0,
		one: 'arcsecond',
		many: 'arcseconds',
		also: ['second of arc', 'seconds of arc', 'arc second', 'arc seconds'],
		symbols: ['″'],
		source: SI_BROCHURE
	},

	// Motion
	{
		symbol: 'm/s',
		dimension: SPEED,
		factor: 1,
		decade: 0,
		one: 'metre a second',
		many: 'metres a second',
		symbols: ['m s-1', 'm s⁻¹']
	},
	{
		symbol: 'km/s',
		dimension: SPEED,
		factor: 1,
		decade: 3,
		one: 'kilometre a second',
		many: 'kilometres a second',
		symbols: ['km s-1', 'km s⁻¹']
	},
	{
		symbol: 'km/h',
		dimension: SPEED,
		factor: 1 / 3.6,
		decade: 0,
		one: 'kilometre an hour',
		many: 'kilometres an hour',
		symbols: ['kph', 'kmh', 'km/hr']
	},
	{
		symbol: 'm/s2',
		dimension: { m: 1, s: -2 },
		factor: 1,
		decade: 0,
		one: 'metre a second squared',
		many: 'metres a second squared',
		also: ['metre per second per second', 'metres per second per second'],
		symbols: ['m/s²', 'm s-2', 'm s⁻²']
	},
	{
		symbol: 'km/s/Mpc',
		dimension: { s: -1 },
		factor: 1 / PARSEC,
		decade: -3,
		one: 'kilometre a second a megaparsec',
		many: 'kilometres a second a megaparsec',
		also: ['kilometres per second per megaparsec', 'kilometers per second per megaparsec'],
		symbols: ['km s-1 Mpc-1', 'km s⁻¹ Mpc⁻¹'],
		source: IAU_2015_B2
	},
	{
		symbol: 'N',
		dimension: { kg: 1, m: 1, s: -2 },
		factor: 1,
		decade: 0,
		one: 'newton',
		many: 'newtons'
	},
	{
		symbol: 'Pa',
		dimension: { kg: 1, m: -1, s: -2 },
		factor: 1,
		decade: 0,
		one: 'pascal',
		many: 'pascals'
	},

	// Density and volume
	{
		symbol: 'kg/m3',
		dimension: { kg: 1, m: -3 },
		factor: 1,
		decade: 0,
		one: 'kilogram a cubic metre',
		many: 'kilograms a cubic metre',
		symbols: ['kg/m³', 'kg m-3', 'kg m⁻³']
	},
	{
		symbol: 'm3',
		dimension: VOLUME,
		factor: 1,
		decade: 0,
		one: 'cubic metre',
		many: 'cubic metres',
		symbols: ['m³']
	},
	{
		symbol: 'Mpc3',
		dimension: VOLUME,
		factor: PARSEC ** 3,
		decade: 18,
		one: 'cubic megaparsec',
		many: 'cubic megaparsecs',
		symbols: ['Mpc³'],
		source: IAU_2015_B2
	},
	{
		symbol: 'Gpc3',
		dimension: VOLUME,
		factor: PARSEC ** 3,
		decade: 27,
		one: 'cubic gigaparsec',
		many: 'cubic gigaparsecs',
		symbols: ['Gpc³'],
		source: IAU_2015_B2
	},
	{
		symbol: 'm2',
		dimension: { m: 2 },
		factor: 1,
		decade: 0,
		one: 'square metre',
		many: 'square metres',
		symbols: ['m²'],
		source: SI_BROCHURE
	},
	{
		symbol: 'cm3/s',
		dimension: { m: 3, s: -1 },
		factor: 1,
		decade: -6,
		one: 'cubic centimetre a second',
		many: 'cubic centimetres a second',
		symbols: ['cm³/s', 'cm3 s-1', 'cm³ s⁻¹'],
		source: SI_BROCHURE
	},
	{
		symbol: '1/(cm2 s Hz sr)',
		dimension: { m: -2, angle: -2 },
		factor: 1,
		decade: 4,
		one: 'photon a square centimetre, second, hertz and steradian',
		many: 'photons a square centimetre, second, hertz and steradian',
		symbols: ['cm-2 s-1 Hz-1 sr-1', 'cm⁻² s⁻¹ Hz⁻¹ sr⁻¹'],
		source: SI_BROCHURE
	},

	// Light, and what it carries
	{
		symbol: 'W/m2',
		dimension: { kg: 1, s: -3 },
		factor: 1,
		decade: 0,
		one: 'watt a square metre',
		many: 'watts a square metre',
		also: ['watt per square metre', 'watts per square metre'],
		symbols: ['W/m²', 'W m-2', 'W m⁻²'],
		source: SI_BROCHURE
	},
	{
		symbol: 'W m-3 sr-1',
		dimension: { kg: 1, m: -1, s: -3, angle: -2 },
		factor: 1,
		decade: 0,
		one: 'watt a square metre, steradian and metre of wavelength',
		many: 'watts a square metre, steradian and metre of wavelength',
		symbols: ['W m⁻³ sr⁻¹'],
		source: SI_BROCHURE
	},
	{
		symbol: 'W m-2 Hz-1 sr-1',
		dimension: { kg: 1, s: -2, angle: -2 },
		factor: 1,
		decade: 0,
		one: 'watt a square metre, steradian and hertz',
		many: 'watts a square metre, steradian and hertz',
		symbols: ['W m⁻² Hz⁻¹ sr⁻¹'],
		source: SI_BROCHURE
	},
	{
		symbol: 'm-3',
		dimension: { m: -3 },
		factor: 1,
		decade: 0,
		one: 'in a cubic metre',
		many: 'in a cubic metre',
		symbols: ['m⁻³', '1/m3', '1/m³'],
		source: SI_BROCHURE
	},
	{
		symbol: 'J/m3',
		dimension: { kg: 1, m: -1, s: -2 },
		factor: 1,
		decade: 0,
		one: 'joule a cubic metre',
		many: 'joules a cubic metre',
		symbols: ['J/m³', 'J m-3', 'J m⁻³'],
		source: SI_BROCHURE
	},
	{
		symbol: 'sr',
		dimension: { angle: 2 },
		factor: 1,
		decade: 0,
		one: 'steradian',
		many: 'steradians',
		source: SI_BROCHURE
	},
	{
		symbol: 'mas',
		dimension: ANGLE,
		factor: DEGREE / 3600,
		decade: -3,
		one: 'milliarcsecond',
		many: 'milliarcseconds',
		source: SI_BROCHURE
	},

	// Matter in motion
	{
		symbol: 'kg m/s',
		dimension: { kg: 1, m: 1, s: -1 },
		factor: 1,
		decade: 0,
		one: 'kilogram metre a second',
		many: 'kilogram metres a second',
		symbols: ['kg m s-1', 'kg m s⁻¹'],
		source: SI_BROCHURE
	},
	{
		symbol: 'N/m',
		dimension: { kg: 1, s: -2 },
		factor: 1,
		decade: 0,
		one: 'newton a metre',
		many: 'newtons a metre',
		also: ['newton per metre', 'newtons per metre'],
		source: SI_BROCHURE
	},
	{
		symbol: 'Bq',
		dimension: FREQUENCY,
		factor: 1,
		decade: 0,
		one: 'becquerel',
		many: 'becquerels',
		source: SI_BROCHURE
	},

	// Sun and planets as measures
	{
		symbol: 'Msun',
		dimension: MASS,
		factor: 1.3271244e20 / GRAVITATION_DIGITS,
		decade: 11,
		one: 'solar mass',
		many: 'solar masses',
		symbols: ['M☉'],
		source: NOMINAL_MASS
	},
	{
		symbol: 'Mearth',
		dimension: MASS,
		factor: 3.986004e14 / GRAVITATION_DIGITS,
		decade: 11,
		one: 'Earth mass',
		many: 'Earth masses',
		also: ['mass of the Earth', 'masses of the Earth'],
		source: NOMINAL_MASS
	},
	{
		symbol: 'Mjup',
		dimension: MASS,
		factor: 1.2668653e17 / GRAVITATION_DIGITS,
		decade: 11,
		one: 'Jupiter mass',
		many: 'Jupiter masses',
		source: NOMINAL_MASS
	},
	{
		symbol: 'Rsun',
		dimension: LENGTH,
		factor: 6.957,
		decade: 8,
		one: 'solar radius',
		many: 'solar radii',
		source: IAU_2015_B3
	},
	{
		symbol: 'Rearth',
		dimension: LENGTH,
		factor: 6.3781,
		decade: 6,
		one: 'Earth radius',
		many: 'Earth radii',
		source: `${IAU_2015_B3} (equatorial)`
	},
	{
		symbol: 'Rjup',
		dimension: LENGTH,
		factor: 7.1492,
		decade: 7,
		one: 'Jupiter radius',
		many: 'Jupiter radii',
		source: `${IAU_2015_B3} (equatorial)`
	},
	{
		symbol: 'Lsun',
		dimension: POWER,
		factor: 3.828,
		decade: 26,
		one: 'solar luminosity',
		many: 'solar luminosities',
		source: IAU_2015_B3
	},

	// A decay told without a unit of time: its times are in whatever unit the half-life was given in.
	{
		symbol: 'same',
		dimension: { unstated: 1 },
		factor: 1,
		decade: 0,
		one: 'in the unit of the half-life',
		many: 'in the unit of the half-life',
		source: 'no unit: a mark that times came without one'
	},

	// The sky
	{
		symbol: 'mag',
		dimension: { magnitude: 1 },
		factor: 1,
		decade: 0,
		one: 'magnitude',
		many: 'magnitudes'
	},
	{
		symbol: 'kpc/arcsec',
		dimension: { m: 1, angle: -1 },
		factor: PARSEC / (DEGREE / 3600),
		decade: 3,
		one: 'kiloparsec an arcsecond',
		many: 'kiloparsecs an arcsecond',
		source: IAU_2015_B2
	},
	{
		symbol: 'arcsec/kpc',
		dimension: { m: -1, angle: 1 },
		factor: DEGREE / 3600 / PARSEC,
		decade: -3,
		one: 'arcsecond a kiloparsec',
		many: 'arcseconds a kiloparsec',
		source: IAU_2015_B2
	}
];
