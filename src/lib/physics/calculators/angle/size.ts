import { defineCalculator, type Computed, type NumberInput } from '../../calculator.ts';
import { convert } from '../../units/units.ts';
import type { QuantityKind } from '../../units/quantities.ts';
import { SUN_CAUTION } from '../cautions.ts';
import { EXPANSION_COUNTS_M, tooFar } from '../light/far.ts';
import { openStax } from '../sources.ts';
import { checksOf } from '../published-checks.ts';

function metres(
	label: string,
	symbol: string,
	quantity: QuantityKind,
	initial: number
): NumberInput {
	return {
		kind: 'number',
		label,
		symbol,
		quantity,
		unit: 'm',
		min: 0,
		minExclusive: true,
		max: 1e27,
		initial,
		log: true
	};
}

/**
 * Angle that a disc of diameter D covers from distance d (both in m): 2 atan(D/2d) in arcsec and degrees, and the patch
 * of sky 4π sin²(θ/4) in sr.
 */
export const angularSize = defineCalculator({
	id: 'angle.size',
	revision: '1.0.0',
	title: 'How large a thing looks',
	purpose: 'How large does a thing of this size look from this distance?',
	asks: [
		'How large is the Moon in the sky?',
		'What does a coin look like from a kilometre away?',
		'How much of the sky does it cover?'
	],
	notFor: [
		'Far galaxies: use the angular-diameter distance.',
		'A ball seen from close by, which hides its own rim.'
	],
	inputs: {
		D_m: metres('Diameter', 'D', 'diameter', 3_474_800),
		d_m: {
			...metres('Distance', 'd', 'distance', 384_400_000),
			good: { min: 0, max: EXPANSION_COUNTS_M, warning: 'space-grows' }
		}
	},
	outputs: {
		angle: { label: 'Angle it covers', symbol: 'θ', quantity: 'angle', unit: 'arcsec' },
		angleDeg: { label: 'Angle in degrees', symbol: 'θ', quantity: 'angle', unit: 'deg' },
		solidAngle: { label: 'Patch of sky', symbol: 'Ω', quantity: 'solid-angle', unit: 'sr' }
	},
	equations: [
		{
			tex: '\\theta = 2\\arctan\\frac{D}{2d}',
			says: 'The angle between lines to opposite ends of the disc.'
		},
		{
			tex: '\\Omega = 4\\pi\\sin^2\\frac\\theta4',
			says: 'The patch of sky the disc covers; all of the sky is 4π.'
		}
	],
	assumptions: ['A flat, round disc, seen straight on.', 'Space does not grow on the way.'],
	warnings: [
		tooFar(
			'Over such a distance space grows while light is on its way. Use the angular-diameter distance.'
		)
	],
	caution: SUN_CAUTION,
	sources: [openStax(1, 'angles and arcs')],
	checks: checksOf('angle.size'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ D_m: D, d_m: d }): Computed {
		const theta = 2 * Math.atan2(D / 2, d);
		const values = {
			angle: convert(theta, 'rad', 'arcsec'),
			angleDeg: convert(theta, 'rad', 'deg'),
			solidAngle: 4 * Math.PI * Math.sin(theta / 4) ** 2
		};
		return { ok: true, values, uncertainties: 'exact' };
	}
});
