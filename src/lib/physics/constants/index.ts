/**
 * Editions: what the house has adopted, named and dated. A piece pins the edition it was written and checked with;
 * an old edition stays as it was. `calculators/in-edition.ts` makes a calculator compute with another one.
 */
import { iauNominal } from './astronomy.ts';
import { codata2018 } from './codata-2018.ts';
import { codata2022 } from './codata-2022.ts';
import type { Adjusted } from './constant.ts';
import { cosmologySets } from './cosmologies.ts';

export type { Constant } from './constant.ts';
export type { CosmologySet, CosmologySetName } from './cosmologies.ts';

export type PhysicalConstants = {
	readonly [K in keyof typeof codata2018]: Readonly<Adjusted<(typeof codata2018)[K]>>;
};

export interface ConstantsEdition {
	name: string;
	/** The day it was adopted, ISO 8601. */
	adopted: string;
	note: string;
	/** The adjustment that the constants of nature are of, as calculators name it among their sources. */
	adjustment: { title: string; doi: string };
	physical: PhysicalConstants;
	astronomical: typeof iauNominal;
	cosmologies: typeof cosmologySets;
	/** How far the values were checked, where a constant says nothing else. */
	verification: { physical: string; astronomical: string; cosmologies: string };
}

const ASTRONOMICAL = 'Exact by resolution, and copied from it.';
const COSMOLOGIES = 'Equal to Astropy 5.2.1, and their uncertainties as each set’s note says.';

export const editions = {
	'2026.1': {
		name: '2026.1',
		adopted: '2026-01-05',
		note: 'CODATA 2018, IAU nominal values, and five parameter sets of the expanding universe.',
		adjustment: {
			title: 'CODATA 2018: Tiesinga et al. 2021, Rev. Mod. Phys. 93, 025010',
			doi: '10.1103/RevModPhys.93.025010'
		},
		physical: codata2018,
		astronomical: iauNominal,
		cosmologies: cosmologySets,
		verification: {
			physical: 'Equal to SciPy 1.10 and Astropy 5.2.1.',
			astronomical: ASTRONOMICAL,
			cosmologies: COSMOLOGIES
		}
	},
	'2026.2': {
		name: '2026.2',
		adopted: '2026-12-01',
		note: 'CODATA 2022 in place of CODATA 2018; all else as in 2026.1. The units u and hartree keep their values of 2018 where other units are turned into them.',
		adjustment: {
			title: 'CODATA 2022: Mohr et al. 2025, Rev. Mod. Phys. 97, 025002',
			doi: '10.1103/RevModPhys.97.025002'
		},
		physical: codata2022,
		astronomical: iauNominal,
		cosmologies: cosmologySets,
		verification: {
			physical: 'Unmoved since CODATA 2018, which equals SciPy 1.10 and Astropy 5.2.1.',
			astronomical: ASTRONOMICAL,
			cosmologies: COSMOLOGIES
		}
	}
} as const satisfies Record<string, ConstantsEdition>;

export const EDITION_IN_USE = '2026.1';

/** The edition in use: what calculators compute with unless another one is asked for. */
export const constants: ConstantsEdition = editions[EDITION_IN_USE];

/** The edition of this name; a widget pins one by its name. */
export function edition(name: string): ConstantsEdition | undefined {
	return Object.hasOwn(editions, name) ? editions[name as keyof typeof editions] : undefined;
}
