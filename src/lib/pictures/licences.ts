/** The terms a picture may come under. Identifiers are those of the SPDX licence list; two are the house's own words. */

export const LICENCE_IDS = [
	'own-work',
	'written-permission',
	'CC0-1.0',
	'CC-PDM-1.0',
	'CC-BY-4.0',
	'CC-BY-3.0',
	'CC-BY-2.0',
	'CC-BY-SA-4.0',
	'CC-BY-SA-3.0',
	'CC-BY-SA-2.0',
	'CC-BY-ND-4.0',
	'CC-BY-NC-4.0',
	'CC-BY-NC-SA-4.0',
	'CC-BY-NC-ND-4.0'
] as const;
export type LicenceId = (typeof LICENCE_IDS)[number];

export interface Licence {
	/** What readers see. */
	name: string;
	/** Where its text stands; null where there is none. */
	address: string | null;
	/** What the picture desk should know before choosing it. */
	caution?: string;
}

const deed = (path: string) => `https://creativecommons.org/${path}/`;
const PARTNERS_EARN =
	'Partners that earn with their pages may not show it. Ask for permission in writing instead, unless every partner is non-commercial.';
const NO_CHANGES =
	'It may be made smaller, and not cropped, recoloured or drawn over. Show it as it came.';

export const LICENCES: Record<LicenceId, Licence> = {
	'own-work': { name: 'Own work', address: null },
	'written-permission': { name: 'Used with permission', address: null },
	'CC0-1.0': { name: 'CC0 1.0', address: deed('publicdomain/zero/1.0') },
	'CC-PDM-1.0': { name: 'Public domain', address: deed('publicdomain/mark/1.0') },
	'CC-BY-4.0': { name: 'CC BY 4.0', address: deed('licenses/by/4.0') },
	'CC-BY-3.0': { name: 'CC BY 3.0', address: deed('licenses/by/3.0') },
	'CC-BY-2.0': { name: 'CC BY 2.0', address: deed('licenses/by/2.0') },
	'CC-BY-SA-4.0': { name: 'CC BY-SA 4.0', address: deed('licenses/by-sa/4.0') },
	'CC-BY-SA-3.0': { name: 'CC BY-SA 3.0', address: deed('licenses/by-sa/3.0') },
	'CC-BY-SA-2.0': { name: 'CC BY-SA 2.0', address: deed('licenses/by-sa/2.0') },
	'CC-BY-ND-4.0': {
		name: 'CC BY-ND 4.0',
		address: deed('licenses/by-nd/4.0'),
		caution: NO_CHANGES
	},
	'CC-BY-NC-4.0': {
		name: 'CC BY-NC 4.0',
		address: deed('licenses/by-nc/4.0'),
		caution: PARTNERS_EARN
	},
	'CC-BY-NC-SA-4.0': {
		name: 'CC BY-NC-SA 4.0',
		address: deed('licenses/by-nc-sa/4.0'),
		caution: PARTNERS_EARN
	},
	'CC-BY-NC-ND-4.0': {
		name: 'CC BY-NC-ND 4.0',
		address: deed('licenses/by-nc-nd/4.0'),
		caution: `${PARTNERS_EARN} ${NO_CHANGES}`
	}
};
