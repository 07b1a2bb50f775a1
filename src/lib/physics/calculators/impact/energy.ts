import { defineCalculator, type Computed } from '../../calculator.ts';
import { convert } from '../../units/units.ts';
import { openStax } from '../sources.ts';
import { checksOf } from '../published-checks.ts';

/** Escape speed of the Earth, m/s: the least at which a body arrives that fell from afar. */
const SLOWEST_FROM_AFAR = 11_200;
/** The Sun's own escape speed at the Earth and the Earth's motion, head on: the most for a body of the Solar System. */
const FASTEST_BOUND = 72_800;

/**
 * A ball of diameter d (m) and density ρ (kg/m³) at a speed v (m/s): mass (π/6)ρd³ in kg, energy ½mv² in J and in
 * kilotonnes of TNT (4.184 × 10¹² J by convention). Before the air takes its share.
 */
export const impactEnergy = defineCalculator({
	id: 'impact.energy',
	revision: '1.0.0',
	title: 'Energy of a falling rock',
	purpose:
		'A rock from space comes in at this size and speed: how heavy is it, and how much energy does it bring?',
	asks: [
		'How much energy does an asteroid bring?',
		'How many kilotonnes of TNT is a meteor?',
		'How heavy is a rock of this size?'
	],
	notFor: [
		'What reaches the ground: air slows and breaks most bodies.',
		'Craters, damage and who is in danger.'
	],
	inputs: {
		diameter_m: {
			kind: 'number',
			label: 'Diameter',
			symbol: 'd',
			quantity: 'diameter',
			unit: 'm',
			min: 0,
			minExclusive: true,
			max: 1e7,
			initial: 19,
			log: true
		},
		density_kgm3: {
			kind: 'number',
			label: 'Density',
			symbol: 'ρ',
			quantity: 'density',
			unit: 'kg/m3',
			min: 1,
			max: 25_000,
			initial: 3300
		},
		speed_ms: {
			kind: 'number',
			label: 'Speed above the air',
			symbol: 'v',
			quantity: 'speed',
			unit: 'm/s',
			min: 0,
			max: 1e6,
			initial: 19_000
		}
	},
	outputs: {
		energy: { label: 'Energy of its motion', symbol: 'E', quantity: 'energy', unit: 'J' },
		energyTNT: {
			label: 'Energy in kilotonnes of TNT',
			symbol: 'E',
			quantity: 'energy',
			unit: 'ktTNT'
		},
		mass: { label: 'Mass', symbol: 'm', quantity: 'mass', unit: 'kg' }
	},
	equations: [
		{
			tex: 'm = \\frac\\pi6\\,\\rho\\,d^3',
			says: 'Twice as wide is eight times as heavy.'
		},
		{
			tex: 'E = \\tfrac12 m v^2',
			says: 'Twice as fast brings four times the energy.'
		}
	],
	assumptions: [
		'A solid ball.',
		'The energy above the air, before the air takes its share.',
		'A kilotonne of TNT is 4.184 × 10¹² joules by convention.'
	],
	warnings: [
		{
			code: 'too-slow',
			message:
				'A body that falls to the Earth from afar comes in at 11.2 kilometres a second or more.',
			when: 'speed below 11.2 km/s',
			validity: 'approximate'
		},
		{
			code: 'not-from-here',
			message: 'So fast a body would come from outside the Solar System.',
			when: 'speed above 72.8 km/s',
			validity: 'approximate'
		}
	],
	sources: [
		openStax(1, '§7.2, kinetic energy'),
		{
			title: 'NIST Special Publication 811 (2008)',
			locator: 'appendix B.8, ton of TNT',
			doi: '10.6028/NIST.SP.811e2008'
		}
	],
	checks: checksOf('impact.energy'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ diameter_m: d, density_kgm3: density, speed_ms: v }): Computed {
		const mass = (Math.PI / 6) * density * d ** 3;
		const energy = 0.5 * mass * v * v;
		const values = { energy, energyTNT: convert(energy, 'J', 'ktTNT'), mass };
		return {
			ok: true,
			values,
			uncertainties: 'exact',
			warnings: [
				...(v < SLOWEST_FROM_AFAR ? ['too-slow'] : []),
				...(v > FASTEST_BOUND ? ['not-from-here'] : [])
			]
		};
	}
});
