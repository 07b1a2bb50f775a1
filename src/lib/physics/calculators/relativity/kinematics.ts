import { defineCalculator, type Computed, type Refusal } from '../../calculator.ts';
import { constants } from '../../constants/index.ts';
import { checksOf } from '../published-checks.ts';
import { EINSTEIN_1905 } from '../sources.ts';
import { lessOne, lorentzFactor } from './lorentz.ts';

const { c } = constants.physical;

/**
 * A body at a share β of the speed of light, in (−1, 1): Lorentz factor, rapidity atanh β, kinetic energy (γ−1)mc² in J
 * when a mass is given, and the time seen, γτ in s, when its own time is given.
 */
export const kinematics = defineCalculator({
	id: 'sr.kinematics',
	revision: '1.0.0',
	title: 'Close to the speed of light',
	purpose:
		'A body moves at a share of the speed of light: how slow is its clock, how much energy has it?',
	asks: [
		'How much slower does a fast clock run?',
		'What is the Lorentz factor at this speed?',
		'How long do fast muons live?',
		'How much energy does it take to get that fast?'
	],
	notFor: [
		'Clocks in strong gravity.',
		'Galaxies carried by expansion.',
		'What a moving thing looks like.'
	],
	inputs: {
		beta: {
			kind: 'number',
			label: 'Speed as a share of that of light',
			symbol: 'β',
			quantity: 'speed-share',
			unit: '',
			min: -1,
			minExclusive: true,
			max: 1,
			maxExclusive: true,
			initial: 0.8
		},
		mass_kg: {
			kind: 'number',
			label: 'Mass',
			symbol: 'm',
			quantity: 'mass',
			unit: 'kg',
			min: 0,
			minExclusive: true,
			max: 1e40,
			initial: 1,
			optional: true,
			absent: 'no mass, so no energy',
			log: true
		},
		properTime_s: {
			kind: 'number',
			label: 'Time by its own clock',
			symbol: 'τ',
			quantity: 'duration',
			unit: 's',
			min: 0,
			max: 1e20,
			initial: 1,
			optional: true,
			absent: 'no time of its own, so none to compare'
		}
	},
	outputs: {
		gamma: { label: 'Lorentz factor', symbol: 'γ', quantity: 'lorentz-factor', unit: '' },
		gamma_minus_1: {
			label: 'Lorentz factor less one',
			symbol: 'γ−1',
			quantity: 'number',
			unit: ''
		},
		rapidity: { label: 'Rapidity', quantity: 'rapidity', unit: '' },
		kineticEnergy: {
			label: 'Energy of the motion',
			symbol: 'E_k',
			quantity: 'energy',
			unit: 'J'
		},
		dilatedTime: { label: 'Time by our clocks', symbol: 't', quantity: 'duration', unit: 's' }
	},
	equations: [
		{
			tex: '\\gamma = \\frac{1}{\\sqrt{1-\\beta^2}}, \\qquad t = \\gamma\\,\\tau',
			says: 'A moving clock runs slow by the Lorentz factor.'
		},
		{
			tex: 'E_k = (\\gamma-1)\\,m c^2',
			says: 'The energy grows without end as the speed nears that of light.'
		}
	],
	assumptions: ['Flat space: no gravity.', 'The speed stays the same.'],
	warnings: [],
	sources: [EINSTEIN_1905],
	checks: checksOf('sr.kinematics'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ beta, mass_kg, properTime_s }): Computed {
		const gamma = lorentzFactor(beta);
		const gamma_minus_1 = lessOne(beta);
		const values: Record<string, number> = { gamma, gamma_minus_1, rapidity: Math.atanh(beta) };
		const withheld: Record<string, Refusal> = {};
		if (mass_kg === undefined) {
			withheld.kineticEnergy = { code: 'no-mass', message: 'Give a mass to get the energy.' };
		} else values.kineticEnergy = gamma_minus_1 * mass_kg * c.value ** 2;
		if (properTime_s === undefined) {
			withheld.dilatedTime = {
				code: 'no-time',
				message: 'Give a time by its own clock to get that by ours.'
			};
		} else values.dilatedTime = gamma * properTime_s;
		return { ok: true, values, uncertainties: 'exact', withheld };
	}
});
