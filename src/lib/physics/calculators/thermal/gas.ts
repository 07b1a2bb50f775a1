/** The ordinary gas of an expanding universe: how much hydrogen, how fast it thins, and what light it swims in. SI units. */
import { refuse, type NumberInput, type Refusal } from '../../calculator.ts';
import { constants, type ConstantsEdition } from '../../constants/index.ts';
import { universeWithPast } from '../cosmology/limits.ts';
import type { CosmologyParameters } from '../cosmology/parameters.ts';
import { KM_PER_MPC, type Universe } from '../cosmology/universe.ts';

/** Atomic masses of ¹H and ⁴He in u (Wang et al. 2017, AME2016; from memory). */
export const HYDROGEN_MASS_U = 1.00782503223;
export const HELIUM_MASS_U = 4.00260325413;

export interface Gas {
	universe: Universe;
	/** Share of the ordinary matter's mass that is helium. */
	Yp: number;
	/** Helium atoms for each hydrogen atom. */
	heliumRatio: number;
	/** Hydrogen, neutral or not, for each m³ at u = 1 + z. */
	hydrogenDensity(u: number): number;
	/** Expansion rate in 1/s. */
	hubbleRate(u: number): number;
	/** Temperature of the cosmic background in K. */
	background(u: number): number;
}

export const heliumInput: NumberInput = {
	kind: 'number',
	label: 'Helium, by share of mass',
	symbol: 'Y_p',
	quantity: 'fraction',
	unit: '',
	min: 0,
	max: 0.9,
	initial: 0.245,
	optional: true
};

/** The gas of a universe with a Big Bang, ordinary matter and a background of light; refused otherwise. */
export function gasOf(
	parameters: CosmologyParameters,
	Yp: number,
	{ physical: { m_u } }: ConstantsEdition = constants
): { ok: true; gas: Gas } | { ok: false; refusal: Refusal } {
	const opened = universeWithPast(parameters);
	if (!opened.ok) return opened;
	const { universe } = opened;
	if (parameters.Ob0 === 0) {
		return refuse(
			'no-gas',
			'This universe has no ordinary matter, so no gas. Give its share, Ob0, or take a published set such as Planck 2018.',
			'cosmology'
		);
	}
	if (parameters.Tcmb0 === 0) {
		return refuse(
			'no-background',
			'This universe has no background of light to compare with. Give its temperature, Tcmb0, or take a published set such as Planck 2018.',
			'cosmology'
		);
	}
	const hydrogenNow =
		((1 - Yp) * parameters.Ob0 * universe.criticalDensity0) / (HYDROGEN_MASS_U * m_u.value);
	const rateNow = parameters.H0 / KM_PER_MPC;
	return {
		ok: true,
		gas: {
			universe,
			Yp,
			heliumRatio: Yp / ((HELIUM_MASS_U / HYDROGEN_MASS_U) * (1 - Yp)),
			hydrogenDensity: (u) => hydrogenNow * u ** 3,
			hubbleRate: (u) => rateNow * Math.sqrt(universe.E2(u)),
			background: (u) => parameters.Tcmb0 * u
		}
	};
}
