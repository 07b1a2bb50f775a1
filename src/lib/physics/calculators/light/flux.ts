import { defineCalculator, type Computed } from '../../calculator.ts';
import { constants } from '../../constants/index.ts';
import { SUN_CAUTION } from '../cautions.ts';
import { checksOf } from '../published-checks.ts';
import { IAU_NOMINAL, openStax } from '../sources.ts';
import { EXPANSION_COUNTS_M, tooFar } from './far.ts';

const { L_sun, au } = constants.astronomical;

/** Power through each square metre, W/m², at a distance in m from a lamp of luminosity in W: L/4πd². */
export const flux = defineCalculator({
	id: 'light.flux',
	revision: '1.0.0',
	title: 'Brightness at a distance',
	purpose: 'A star gives off this much light: how much of it passes through a square metre here?',
	asks: [
		'How much sunlight reaches the Earth?',
		'How much fainter is the Sun from Jupiter?',
		'How much power does a star send us?'
	],
	notFor: ['Beams, which don’t spread all round.', 'Light that air or dust holds back.'],
	inputs: {
		L_W: {
			kind: 'number',
			label: 'Luminosity',
			symbol: 'L',
			quantity: 'luminosity',
			unit: 'W',
			min: 0,
			max: 1e50,
			initial: L_sun.value,
			log: true
		},
		d_m: {
			kind: 'number',
			label: 'Distance',
			symbol: 'd',
			quantity: 'distance',
			unit: 'm',
			min: 0,
			minExclusive: true,
			max: 1e27,
			good: { min: 0, max: EXPANSION_COUNTS_M, warning: 'space-grows' },
			initial: au.value,
			log: true
		}
	},
	outputs: {
		flux: {
			label: 'Power through each square metre',
			symbol: 'F',
			quantity: 'irradiance',
			unit: 'W/m2'
		}
	},
	equations: [
		{
			tex: 'F = \\frac{L}{4\\pi d^2}',
			says: 'Twice as far, the same light is spread over four times the area.'
		}
	],
	assumptions: ['It shines the same all round.', 'Nothing on the way holds light back.'],
	warnings: [
		tooFar(
			'Over such a distance space grows while the light is on its way. Use the luminosity distance.'
		)
	],
	caution: SUN_CAUTION,
	sources: [openStax(3, 'intensity and the inverse-square law'), IAU_NOMINAL],
	checks: checksOf('light.flux'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ L_W: L, d_m: d }): Computed {
		const values = { flux: L / (4 * Math.PI) / d / d };
		return { ok: true, values, uncertainties: 'exact' };
	}
});
