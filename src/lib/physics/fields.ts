/** The fields of the shelf: which calculators stand together. */
import type { Calculator } from './calculator.ts';

export const FIELDS = [
	'Lines and waves of light',
	'Redshift and speed',
	'The expanding Universe',
	'Early hydrogen',
	'Glow and heat of bodies',
	'Stars, planets and what is seen of them',
	'Gravity and orbits',
	'Close to the speed of light',
	'Fall, flight and launch',
	'Motion and energy on the bench',
	'Gases and decays',
	'Uncertainty and rounding',
	'Of this house'
] as const;
export type Field = (typeof FIELDS)[number];

/** By the first part of an id. */
const BY_FAMILY: Record<string, Field> = {
	line: 'Lines and waves of light',
	photon: 'Lines and waves of light',
	air: 'Lines and waves of light',
	light: 'Lines and waves of light',
	doppler: 'Redshift and speed',
	cosmo: 'The expanding Universe',
	g21: 'Early hydrogen',
	thermal: 'Early hydrogen',
	blackbody: 'Glow and heat of bodies',
	angle: 'Stars, planets and what is seen of them',
	stars: 'Stars, planets and what is seen of them',
	exoplanet: 'Stars, planets and what is seen of them',
	gravity: 'Gravity and orbits',
	orbit: 'Gravity and orbits',
	tide: 'Gravity and orbits',
	gw: 'Gravity and orbits',
	sr: 'Close to the speed of light',
	projectile: 'Fall, flight and launch',
	fall: 'Fall, flight and launch',
	launcher: 'Fall, flight and launch',
	rocket: 'Fall, flight and launch',
	impact: 'Fall, flight and launch',
	energy: 'Motion and energy on the bench',
	mech: 'Motion and energy on the bench',
	gas: 'Gases and decays',
	decay: 'Gases and decays',
	unc: 'Uncertainty and rounding',
	round: 'Uncertainty and rounding'
};

/** The field a calculator stands in; whatever isn't of the catalogue's families is the house's own. */
export function fieldOf({ id }: Pick<Calculator, 'id'>): Field {
	const [family = ''] = id.split('.');
	return (Object.hasOwn(BY_FAMILY, family) ? BY_FAMILY[family] : undefined) ?? 'Of this house';
}

/** Calculators under their fields, in the order of the fields and then by title; fields without any are left out. */
export function byField<T extends Pick<Calculator, 'id' | 'title'>>(
	calculators: Iterable<T>
): { field: Field; calculators: T[] }[] {
	const shelves = new Map<Field, T[]>();
	for (const calculator of calculators) {
		const field = fieldOf(calculator);
		shelves.set(field, [...(shelves.get(field) ?? []), calculator]);
	}
	return FIELDS.flatMap((field) => {
		const own = shelves.get(field);
		if (!own) return [];
		return [{ field, calculators: own.sort((a, b) => a.title.localeCompare(b.title, 'en')) }];
	});
}
