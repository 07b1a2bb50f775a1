/** An edition as a page shows it: every constant with its uncertainty, its source, and how far the value was checked. */
import { codata2018 } from './codata-2018.ts';
import { codata2022 } from './codata-2022.ts';
import type { Constant } from './constant.ts';
import type { CosmologySet } from './cosmologies.ts';
import { EDITION_IN_USE, type ConstantsEdition } from './index.ts';

export interface ConstantRow {
	/** The key calculators know it by: “m_e”. */
	symbol: string;
	name: string;
	value: number;
	unit: string;
	/** Standard uncertainty in `unit`, `exact`, or null where the house holds none. */
	uncertainty: number | 'exact' | null;
	source: string;
	verification: string;
}

export interface ConstantGroup {
	title: string;
	rows: ConstantRow[];
	/** What the rows don't say one by one: how parameters move together, a published age. */
	notes: string[];
}

export interface EditionPage {
	name: string;
	/** ISO 8601 */
	adopted: string;
	note: string;
	inUse: boolean;
	groups: ConstantGroup[];
	/** Published sets that the house holds beside the edition, to see what a change would move. */
	beside: ConstantGroup[];
}

const COMPARED = 'Equal to SciPy 1.10 and Astropy 5.2.1.';
const BY_RESOLUTION = 'Exact by resolution, and copied from it.';
const COMPUTED = 'Computed here from exact constants.';
const RECALLED = 'From memory; not read again from the publication.';

export function editionPage(edition: ConstantsEdition): EditionPage {
	return {
		name: edition.name,
		adopted: edition.adopted,
		note: edition.note,
		inUse: edition.name === EDITION_IN_USE,
		groups: [
			{ title: 'Physics', rows: rowsOf(edition.physical, COMPARED), notes: [] },
			{ title: 'Astronomy', rows: rowsOf(edition.astronomical, BY_RESOLUTION), notes: [] },
			...Object.values(edition.cosmologies).map(setGroup)
		],
		beside: [
			{
				title: 'CODATA 2022',
				rows: rowsOf(codata2022, COMPARED).filter(
					({ symbol, value }) => value !== (codata2018 as Record<string, Constant>)[symbol]?.value
				),
				notes: ['Only what moved since CODATA 2018; calculators don’t use it.']
			}
		]
	};
}

function rowsOf(constants: Readonly<Record<string, Constant>>, checked: string): ConstantRow[] {
	return Object.entries(constants).map(([symbol, { fromMemory, ...constant }]) => ({
		symbol,
		name: constant.name,
		value: constant.value,
		unit: constant.unit,
		uncertainty: constant.uncertainty,
		source: constant.source,
		verification: fromMemory
			? RECALLED
			: constant.source.startsWith('Computed')
				? COMPUTED
				: checked
	}));
}

/** Parameters of a set that are one number. */
const PARAMETERS = [
	{ key: 'H0', name: 'Expansion rate now', unit: 'km/s/Mpc' },
	{ key: 'Om0', name: 'Matter now, without neutrinos', unit: '' },
	{ key: 'Ob0', name: 'Ordinary matter now', unit: '' },
	{ key: 'Tcmb0', name: 'Temperature of the background now', unit: 'K' },
	{ key: 'Neff', name: 'Effective number of neutrino species', unit: '' }
] as const;

function setGroup(set: CosmologySet): ConstantGroup {
	const { published, source } = set;
	const uncertainties: Partial<Record<string, number>> = { ...published?.uncertainties };
	const verification = published ? 'Equal to Astropy 5.2.1.' : 'A convention; nothing to check.';
	const rows = PARAMETERS.map(({ key, name, unit }): ConstantRow => ({
		symbol: key,
		name,
		value: set[key],
		unit,
		uncertainty: published ? (uncertainties[key] ?? null) : 'exact',
		source,
		verification
	}));
	const masses = `Neutrino masses: ${set.m_nu.join(', ')} eV.`;
	if (!published) return { title: set.label, rows, notes: [masses] };
	return {
		title: set.label,
		rows: [
			...rows,
			{
				symbol: 'age',
				name: 'Age of the Universe, as published',
				value: published.ageGyr,
				unit: 'Gyr',
				uncertainty: published.ageUncertaintyGyr,
				source,
				verification: 'Stands as published; the calculators’ own age agrees within its uncertainty.'
			}
		],
		notes: [
			masses,
			published.note,
			published.correlation
				? `Correlation of H₀ with Ωₘ: ${String(published.correlation.H0WithOm0).replace('-', '−')} (${published.correlation.source}).`
				: 'How H₀ and Ωₘ move together isn’t held, so nothing that rests on both carries an uncertainty.'
		]
	};
}
