import { defineCalculator, type Computed } from '../../calculator.ts';
import { DISPUTED_TROUGH, SIGN_CONVENTION, SINGH_2022, troughWarnings } from './signal.ts';
import { amplitude, megahertz, profile } from './trough-inputs.ts';
import { checksOf } from '../published-checks.ts';

/** A bell-shaped trough: −A exp(−(ν−ν₀)²/2σ²) in K, frequencies in MHz. */
export const gaussian = defineCalculator({
	id: 'g21.gaussian',
	revision: '1.0.0',
	title: 'Trough shaped as a bell',
	purpose: 'What does a bell-shaped trough read at a frequency?',
	asks: ['How deep is the trough away from its middle?'],
	notFor: ['Physics: this is a shape to fit, nothing more.'],
	inputs: {
		A: amplitude(0.1),
		nu: megahertz('Frequency', 'ν', 75),
		nu0: megahertz('Middle of the trough', 'ν_0', 70),
		sigma: megahertz('Standard width', 'σ', 8, 'bandwidth')
	},
	outputs: { T: profile },
	equations: [
		{
			tex: 'T = -A\\,e^{-(\\nu-\\nu_0)^2/2\\sigma^2}',
			says: 'Deepest in the middle, fading evenly to both sides.'
		}
	],
	assumptions: [SIGN_CONVENTION],
	warnings: [DISPUTED_TROUGH],
	sources: [
		{ title: 'The normal curve; its use as a fit is a convention of the field', fromMemory: true },
		SINGH_2022
	],
	checks: checksOf('g21.gaussian'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ A, nu, nu0, sigma }): Computed {
		const values = { T: -A * Math.exp(-0.5 * ((nu - nu0) / sigma) ** 2) };
		return {
			ok: true,
			values,
			uncertainties: 'exact',
			warnings: troughWarnings(-1000 * A, nu0)
		};
	}
});
