import type { Constant } from './constant.ts';

const B2_2012 = 'IAU 2012 Resolution B2';
const B2_2015 = 'IAU 2015 Resolution B2';
const B3_2015 =
	'IAU 2015 Resolution B3: nominal solar and planetary values (Prša et al. 2016, AJ 152, 41)';
const JULIAN = 'IAU Style Manual 1989: Julian year of 365.25 d';

const au = 149_597_870_700;

/** Conventional values: exact by resolution, whatever the Sun and the planets really measure. */
export const iauNominal = {
	au: { name: 'astronomical unit', value: au, unit: 'm', uncertainty: 'exact', source: B2_2012 },
	pc: {
		name: 'parsec',
		value: (au * 648_000) / Math.PI,
		unit: 'm',
		uncertainty: 'exact',
		source: B2_2015
	},
	julianYear: {
		name: 'Julian year',
		value: 31_557_600,
		unit: 's',
		uncertainty: 'exact',
		source: JULIAN
	},
	ly: {
		name: 'light year',
		value: 299_792_458 * 31_557_600,
		unit: 'm',
		uncertainty: 'exact',
		source: JULIAN
	},
	GM_sun: {
		name: 'nominal solar mass parameter',
		value: 1.3271244e20,
		unit: 'm3/s2',
		uncertainty: 'exact',
		source: B3_2015
	},
	R_sun: {
		name: 'nominal solar radius',
		value: 6.957e8,
		unit: 'm',
		uncertainty: 'exact',
		source: B3_2015
	},
	L_sun: {
		name: 'nominal solar luminosity',
		value: 3.828e26,
		unit: 'W',
		uncertainty: 'exact',
		source: B3_2015
	},
	T_sun: {
		name: 'nominal solar effective temperature',
		value: 5772,
		unit: 'K',
		uncertainty: 'exact',
		source: B3_2015
	},
	GM_earth: {
		name: 'nominal terrestrial mass parameter',
		value: 3.986004e14,
		unit: 'm3/s2',
		uncertainty: 'exact',
		source: B3_2015
	},
	R_earth: {
		name: 'nominal terrestrial equatorial radius',
		value: 6.3781e6,
		unit: 'm',
		uncertainty: 'exact',
		source: B3_2015
	},
	GM_jupiter: {
		name: 'nominal jovian mass parameter',
		value: 1.2668653e17,
		unit: 'm3/s2',
		uncertainty: 'exact',
		source: B3_2015
	},
	R_jupiter: {
		name: 'nominal jovian equatorial radius',
		value: 7.1492e7,
		unit: 'm',
		uncertainty: 'exact',
		source: B3_2015
	},
	L_0: {
		name: 'luminosity of bolometric magnitude zero',
		value: 3.0128e28,
		unit: 'W',
		uncertainty: 'exact',
		source: B2_2015
	}
} as const satisfies Record<string, Constant>;
