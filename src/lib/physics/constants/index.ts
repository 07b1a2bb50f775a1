/**
 * Editions: what the house has adopted, named and dated. A piece pins the edition it was written and checked with;
 * an old edition stays as it was.
 */
import { iauNominal } from './astronomy.ts';
import { codata2018 } from './codata-2018.ts';
import { cosmologySets } from './cosmologies.ts';

export type { Constant } from './constant.ts';
export type { CosmologySet, CosmologySetName } from './cosmologies.ts';

export interface ConstantsEdition {
	name: string;
	/** The day it came into use, ISO 8601. */
	adopted: string;
	note: string;
	physical: typeof codata2018;
	astronomical: typeof iauNominal;
	cosmologies: typeof cosmologySets;
}

export const editions = {
	'2026.1': {
		name: '2026.1',
		adopted: '2026-01-05',
		note: 'CODATA 2018, IAU nominal values, and five parameter sets of the expanding universe.',
		physical: codata2018,
		astronomical: iauNominal,
		cosmologies: cosmologySets
	}
} as const satisfies Record<string, ConstantsEdition>;

export const EDITION_IN_USE = '2026.1';

/** The constants every calculator computes with. */
export const constants: ConstantsEdition = editions[EDITION_IN_USE];

/** The edition of this name; a widget pins one by its name. */
export function edition(name: string): ConstantsEdition | undefined {
	return Object.hasOwn(editions, name) ? editions[name as keyof typeof editions] : undefined;
}
