import { defineCalculator, type Computed } from '../../calculator.ts';
import { convert } from '../../units/units.ts';
import { SUN_CAUTION } from '../cautions.ts';
import { checksOf } from '../published-checks.ts';

/** First zero of the Bessel function J₁, over π. */
const RAYLEIGH = 1.2196698912665045;

/** Smallest angle a round opening of diameter D (m) tells apart at a wavelength (nm): 1.22 λ/D, in arcsec (Rayleigh). */
export const diffraction = defineCalculator({
	id: 'angle.diffraction',
	revision: '1.0.0',
	title: 'How sharp a telescope can be',
	purpose: 'How close may two stars be for a mirror or dish of this size to tell them apart?',
	asks: [
		'How sharp is a telescope of this size?',
		'How large a dish does it take to see this detail?',
		'Can a telescope see things left on the Moon?'
	],
	notFor: ['Arrays of dishes: use the longest distance between two of them.', 'Poor lenses.'],
	inputs: {
		wavelength_nm: {
			kind: 'number',
			label: 'Wavelength',
			symbol: 'λ',
			quantity: 'wavelength',
			unit: 'nm',
			min: 1e-6,
			max: 1e12,
			initial: 550,
			log: true
		},
		D_m: {
			kind: 'number',
			label: 'Diameter of the opening',
			symbol: 'D',
			quantity: 'diameter',
			unit: 'm',
			min: 1e-4,
			max: 1e9,
			initial: 0.1,
			log: true
		}
	},
	outputs: {
		theta: { label: 'Smallest angle told apart', symbol: 'θ', quantity: 'angle', unit: 'arcsec' }
	},
	equations: [
		{
			tex: '\\theta = 1.2197\\,\\frac{\\lambda}{D}',
			says: 'Waves spread at every opening: the smaller it is, the more.'
		}
	],
	assumptions: [
		'A round opening without a hole in its middle, and perfect optics.',
		'Two points of like brightness, told apart by Rayleigh’s rule.'
	],
	warnings: [
		{
			code: 'air-blurs',
			message:
				'From the ground the air blurs visible light to about an arcsecond; only above the air, or with adaptive optics, is it this sharp.',
			when: 'opening above 0.2 m and wavelength of 300 to 1000 nm',
			validity: 'approximate'
		},
		{
			code: 'small-opening',
			message: 'The opening is hardly larger than the wave, so this rule no longer holds.',
			when: 'opening below 10 wavelengths',
			validity: 'outside'
		}
	],
	caution: SUN_CAUTION,
	sources: [
		{
			title: 'Rayleigh 1879, Investigations in optics, Phil. Mag. 8, 261',
			doi: '10.1080/14786447908639684',
			fromMemory: true
		}
	],
	checks: checksOf('angle.diffraction'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ wavelength_nm, D_m }): Computed {
		const isVisible = wavelength_nm >= 300 && wavelength_nm <= 1000;
		const values = {
			theta: convert((RAYLEIGH * (wavelength_nm * 1e-9)) / D_m, 'rad', 'arcsec')
		};
		return {
			ok: true,
			values,
			uncertainties: 'exact',
			warnings: [
				...(isVisible && D_m > 0.2 ? ['air-blurs'] : []),
				...(D_m < 10 * wavelength_nm * 1e-9 ? ['small-opening'] : [])
			]
		};
	}
});
