import { defineCalculator, type Computed } from '../../calculator.ts';
import { constants } from '../../constants/index.ts';
import { RADIATION_CAUTION } from '../cautions.ts';
import { lorentzFactor } from '../relativity/lorentz.ts';
import { EINSTEIN_1905 } from '../sources.ts';
import { checksOf } from '../published-checks.ts';

const { c } = constants.physical;

/** Mean life of the muon in s; ± 0.000 0022 µs. */
const MUON_LIFE_S = 2.1969811e-6;

/**
 * Particles that decay on the way, at a share β of the speed of light in (0, 1): mean path βγcτ in m, mean life as we see
 * it, γτ in s, and the share e^(−L/βγcτ) that gets as far as L (m). Left out, τ is that of the muon.
 */
export const inFlight = defineCalculator({
	id: 'decay.in_flight',
	revision: '1.0.0',
	title: 'Particles that decay on the way',
	purpose: 'Short-lived particles fly at nearly the speed of light: how far do they get?',
	asks: [
		'Why do muons from the top of the air reach the ground?',
		'How far does a particle fly before it decays?',
		'How many are left after this distance?'
	],
	notFor: ['Particles that matter slows or takes in.', 'Curved paths in a ring.'],
	inputs: {
		beta: {
			kind: 'number',
			label: 'Speed as a share of that of light',
			symbol: 'β',
			quantity: 'speed-share',
			unit: '',
			min: 0,
			minExclusive: true,
			max: 1,
			maxExclusive: true,
			initial: 0.9995
		},
		path_m: {
			kind: 'number',
			label: 'Distance',
			symbol: 'L',
			quantity: 'distance',
			unit: 'm',
			min: 0,
			max: 1e30,
			initial: 15_000
		},
		meanLife_s: {
			kind: 'number',
			label: 'Mean life at rest',
			symbol: 'τ',
			quantity: 'duration',
			unit: 's',
			min: 1e-30,
			max: 1e20,
			initial: MUON_LIFE_S,
			optional: true,
			log: true
		}
	},
	outputs: {
		meanPath: { label: 'Mean path before the decay', quantity: 'distance', unit: 'm' },
		meanLifetime: {
			label: 'Mean life as we see it',
			symbol: 'γτ',
			quantity: 'duration',
			unit: 's'
		},
		surviving: { label: 'Share that gets that far', quantity: 'fraction', unit: '' }
	},
	equations: [
		{
			tex: '\\ell = \\beta\\gamma c\\,\\tau, \\qquad t = \\gamma\\,\\tau',
			says: 'Fast particles live longer by our clocks, and so get farther.'
		},
		{
			tex: '\\frac{N}{N_0} = e^{-L/\\ell}',
			says: 'Over each mean path, all but 37 per cent decay.'
		}
	],
	assumptions: [
		'A straight path.',
		'No energy is lost on the way; in air, muons lose some.',
		'Left out, the mean life is that of the muon, 2.196 9811(22) microseconds.'
	],
	warnings: [],
	caution: RADIATION_CAUTION,
	sources: [
		{
			title: 'Particle Data Group, Review of Particle Physics',
			locator: 'muon mean life',
			fromMemory: true
		},
		EINSTEIN_1905
	],
	checks: checksOf('decay.in_flight'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ beta, path_m, meanLife_s }): Computed {
		const gamma = lorentzFactor(beta);
		const meanPath = beta * gamma * c.value * meanLife_s;
		const values = {
			meanPath,
			meanLifetime: gamma * meanLife_s,
			surviving: Math.exp(-path_m / meanPath)
		};
		return { ok: true, values, uncertainties: 'exact' };
	}
});
