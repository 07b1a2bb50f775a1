import {
	defineCalculator,
	refuse,
	type Computed,
	type NumberInput,
	type Refusal
} from '../../calculator.ts';
import type { QuantityKind } from '../../units/quantities.ts';
import { constants } from '../../constants/index.ts';
import { dueToG, G } from '../gravity/newton.ts';
import { checksOf } from '../published-checks.ts';
import { codata2018 } from '../sources.ts';

const { R_earth } = constants.astronomical;

function positive(
	label: string,
	symbol: string,
	[quantity, unit]: [QuantityKind, string],
	max: number,
	initial: number
): NumberInput {
	return {
		kind: 'number',
		label,
		symbol,
		quantity,
		unit,
		min: 0,
		minExclusive: true,
		max,
		initial,
		log: true
	};
}

const TIDE = 'M_kg';
const ROCHE = 'R_m';

/**
 * Tides two ways. From a mass (kg) at a distance (m): how much harder it pulls on the near side of a body than on its
 * middle, 2GMr/d³ in m/s². From a planet's radius (m) and two densities (kg/m³): how close a moon may come before tides
 * pull it apart, R(2ρ_M/ρ_m)^⅓ if rigid and 2.44R(ρ_M/ρ_m)^⅓ if fluid, in m.
 */
export const roche = defineCalculator({
	id: 'tide.roche',
	revision: '1.0.0',
	title: 'Tides, and how close a moon may come',
	purpose:
		'How hard does a moon stretch a planet, or how close may a moon come before it is pulled apart?',
	asks: [
		'How strong is the tide of the Moon?',
		'Why do rings lie close to their planet?',
		'How close can a moon get before it breaks?'
	],
	notFor: [
		'The height of tides on a shore.',
		'Small moons that their own strength holds together.'
	],
	inputs: {
		M_kg: {
			...positive('Mass that raises the tide', 'M', ['mass', 'kg'], 1e54, 7.346e22),
			optional: true
		},
		r_m: {
			...positive(
				'Radius of the body that is stretched',
				'r',
				['radius', 'm'],
				1e25,
				R_earth.value
			),
			neededWith: TIDE
		},
		d_m: {
			...positive('Distance between the two', 'd', ['distance', 'm'], 1e27, 384_400_000),
			neededWith: TIDE
		},
		R_m: {
			...positive('Radius of the planet', 'R', ['radius', 'm'], 1e25, 60_268_000),
			optional: true
		},
		rhoM: {
			...positive('Mean density of the planet', 'ρ_M', ['density', 'kg/m3'], 1e20, 687),
			neededWith: ROCHE
		},
		rhom: {
			...positive('Mean density of the moon', 'ρ_m', ['density', 'kg/m3'], 1e20, 900),
			neededWith: ROCHE
		}
	},
	oneOf: [[TIDE, ROCHE]],
	outputs: {
		tidalAccel: {
			label: 'Stretch by the tide',
			symbol: 'a_t',
			quantity: 'acceleration',
			unit: 'm/s2'
		},
		rocheRigid: {
			label: 'Closest distance of a rigid moon',
			symbol: 'd_rigid',
			quantity: 'distance',
			unit: 'm'
		},
		rocheFluid: {
			label: 'Closest distance of a fluid moon',
			symbol: 'd_fluid',
			quantity: 'distance',
			unit: 'm'
		}
	},
	equations: [
		{
			tex: 'a_t = \\frac{2GMr}{d^3}',
			says: 'A mass pulls harder on the near side than on the middle; what is left stretches the body.'
		},
		{
			tex: 'd_\\mathrm{rigid} = R\\left(\\frac{2\\rho_M}{\\rho_m}\\right)^{1/3}, \\qquad d_\\mathrm{fluid} = 2.44\\,R\\left(\\frac{\\rho_M}{\\rho_m}\\right)^{1/3}',
			says: 'Closer than this the tide beats the moon’s own gravity.'
		}
	],
	assumptions: [
		'The body is small beside the distance (leading order).',
		'Distances are from middle to middle.',
		'The moon has no strength but its own gravity.'
	],
	warnings: [
		{
			code: 'large-body',
			message:
				'The body is large beside its distance: the near side is stretched more than this, the far side less.',
			when: 'r/d above 0.05',
			validity: 'approximate'
		}
	],
	sources: [
		{ title: 'Murray & Dermott 1999, Solar System Dynamics', locator: 'ch. 4', fromMemory: true },
		codata2018('G, uncertainty 2.2 × 10⁻⁵')
	],
	checks: checksOf('tide.roche'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ M_kg: M, r_m: r, d_m: d, R_m: R, rhoM, rhom }): Computed {
		if (M === undefined) {
			const third = Math.cbrt(rhoM / rhom);
			const values = { rocheRigid: R * Math.cbrt(2) * third, rocheFluid: 2.44 * R * third };
			return {
				ok: true,
				values,
				uncertainties: { rocheRigid: 'exact' },
				withheld: { tidalAccel: NEEDS_MASS }
			};
		}
		if (r >= d) {
			return refuse(
				'inside-the-body',
				'The mass would lie inside the body it stretches. Give a distance above the body’s radius.',
				'd_m'
			);
		}
		const tidalAccel = ((2 * G * M) / d / d) * (r / d);
		return {
			ok: true,
			values: { tidalAccel },
			uncertainties: { tidalAccel: dueToG(tidalAccel, 1) },
			withheld: { rocheRigid: NEEDS_PLANET, rocheFluid: NEEDS_PLANET },
			warnings: r / d > 0.05 ? ['large-body'] : []
		};
	}
});

const NEEDS_MASS: Refusal = {
	code: 'needs-mass',
	message: 'The tide needs a mass. Give M_kg, r_m and d_m instead.'
};

const NEEDS_PLANET: Refusal = {
	code: 'needs-planet',
	message: 'The closest distance needs a planet. Give R_m, rhoM and rhom instead.'
};
