import { defineCalculator, type Computed, type NumberInput } from '../../calculator.ts';
import { gravityInput } from '../energy/gravity.ts';
import { checksOf } from '../published-checks.ts';
import { openStax, STANDARD_GRAVITY_SOURCE } from '../sources.ts';

function density(label: string, symbol: string, initial: number): NumberInput {
	return {
		kind: 'number',
		label,
		symbol,
		quantity: 'density',
		unit: 'kg/m3',
		min: 0,
		minExclusive: true,
		max: 1e6,
		initial
	};
}

/**
 * A body in a fluid: share of it below the surface, ρ_body/ρ_fluid, and the net force on it when wholly under, upwards
 * above 0, (ρ_fluid − ρ_body)Vg in N. A share above 1 means that it sinks.
 */
export const buoyancy = defineCalculator({
	id: 'mech.buoyancy',
	revision: '1.0.0',
	title: 'Floating and sinking',
	purpose: 'A body lies in water or air: how much of it is under, and how hard is it pushed up?',
	asks: [
		'How much of an iceberg is under water?',
		'How much can a balloon lift?',
		'Does it float?'
	],
	notFor: ['Hulls, whose shape holds air.', 'Whether a craft is safe.'],
	inputs: {
		rhoBody: density('Density of the body', 'ρ_b', 917),
		rhoFluid: density('Density of the fluid', 'ρ_f', 1025),
		V: {
			kind: 'number',
			label: 'Volume of the body',
			symbol: 'V',
			quantity: 'volume',
			unit: 'm3',
			min: 0,
			minExclusive: true,
			max: 1e15,
			initial: 1,
			log: true
		},
		g: gravityInput
	},
	outputs: {
		submergedFraction: {
			label: 'Share of the body below the surface',
			quantity: 'fraction',
			unit: ''
		},
		netForce: {
			label: 'Push upwards when wholly under',
			symbol: 'F',
			quantity: 'force',
			unit: 'N'
		}
	},
	equations: [
		{
			tex: '\\frac{V_\\mathrm{under}}{V} = \\frac{\\rho_b}{\\rho_f}',
			says: 'A floating body pushes aside its own weight of fluid.'
		},
		{
			tex: 'F = (\\rho_f-\\rho_b)\\,V g',
			says: 'Wholly under, it is pushed by the difference; below 0 it sinks.'
		}
	],
	assumptions: ['The fluid is at rest and as dense throughout.', 'The body is one solid piece.'],
	warnings: [
		{
			code: 'sinks',
			message: 'The body is denser than the fluid and sinks: no share of it stays above.',
			when: 'body denser than the fluid',
			validity: 'outside'
		}
	],
	sources: [
		{
			title: 'Archimedes, On floating bodies, book I',
			locator: 'propositions 5 to 7',
			fromMemory: true
		},
		openStax(1, '§14.4, Archimedes’ principle and buoyancy'),
		STANDARD_GRAVITY_SOURCE
	],
	checks: checksOf('mech.buoyancy'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ rhoBody, rhoFluid, V, g }): Computed {
		const values = {
			submergedFraction: rhoBody / rhoFluid,
			netForce: (rhoFluid - rhoBody) * V * g
		};
		return {
			ok: true,
			values,
			uncertainties: 'exact',
			warnings: rhoBody > rhoFluid ? ['sinks'] : []
		};
	}
});
