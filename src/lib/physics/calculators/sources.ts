/** Works that several calculators stand on. */
import type { Source } from '../calculator.ts';

const codata = { title: 'CODATA 2018: Tiesinga et al. 2021, Rev. Mod. Phys. 93, 025010' };

/** CODATA 2018, for the constants named. */
export function codata2018(constants: string): Source {
	return { ...codata, locator: constants, doi: '10.1103/RevModPhys.93.025010' };
}

export const IAU_NOMINAL: Source = {
	title:
		'IAU 2015 Resolution B3: nominal solar and planetary values (Prša et al. 2016, AJ 152, 41)',
	doi: '10.3847/0004-6256/152/2/41'
};

export const IAU_LENGTHS: Source = {
	title: 'IAU 2012 Resolution B2 (astronomical unit) and IAU 2015 Resolution B2 (parsec)'
};

export const EINSTEIN_1905: Source = {
	title: 'Einstein 1905, Zur Elektrodynamik bewegter Körper, Annalen der Physik 322, 891',
	doi: '10.1002/andp.19053221004'
};

export const STANDARD_GRAVITY_SOURCE: Source = {
	title: 'Standard acceleration of gravity, 3rd CGPM 1901; CODATA 2018',
	locator: '9.806 65 m/s²'
};

/** OpenStax, University Physics, recalled and not read again. */
export function openStax(volume: 1 | 2 | 3, locator: string): Source {
	return {
		title: `OpenStax 2016, University Physics, volume ${volume}`,
		locator,
		fromMemory: true
	};
}
