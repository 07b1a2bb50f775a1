import { defineCalculator, type Computed } from '../../calculator.ts';
import { constants } from '../../constants/index.ts';
import { convert } from '../../units/units.ts';
import { dueToG, G } from '../gravity/newton.ts';
import { codata2018, IAU_NOMINAL } from '../sources.ts';
import { gasTemperature } from './ideal.ts';
import { checksOf } from '../published-checks.ts';

const { k } = constants.physical;
const { GM_sun } = constants.astronomical;

/**
 * Smallest cloud that its own gravity pulls together, at T (K), μ mass units a particle and n particles in m⁻³: length
 * c_s√(π/Gρ) in pc with c_s = √(kT/μm_u), mass (4π/3)ρ(λ/2)³ in solar masses, time of free fall √(3π/32Gρ) in Myr.
 */
export const jeans = defineCalculator({
	id: 'gas.jeans',
	revision: '1.0.0',
	title: 'A cloud that falls in on itself',
	purpose:
		'How large and heavy must a cloud of gas be for its gravity to win, and how fast does it fall in?',
	asks: [
		'How heavy must a cloud be to make stars?',
		'How long does a cloud take to fall together?',
		'Why does cold gas make stars?'
	],
	notFor: ['Clouds that turn, are stirred, or hold magnetic fields.', 'How many stars come of it.'],
	inputs: {
		T_K: gasTemperature(10, 1e9),
		mu: {
			kind: 'number',
			label: 'Mean mass of a particle, in atomic mass units',
			symbol: 'μ',
			quantity: 'number',
			unit: '',
			min: 0.1,
			max: 1000,
			initial: 2.33
		},
		n_m3: {
			kind: 'number',
			label: 'Particles in each cubic metre',
			symbol: 'n',
			quantity: 'number-density',
			unit: 'm-3',
			min: 1e-10,
			max: 1e40,
			initial: 1e10,
			log: true
		}
	},
	outputs: {
		length: { label: 'Size of the smallest cloud', symbol: 'λ_J', quantity: 'length', unit: 'pc' },
		mass: { label: 'Mass of the smallest cloud', symbol: 'M_J', quantity: 'mass', unit: 'Msun' },
		freefall: {
			label: 'Time to fall in, without pressure',
			symbol: 't_ff',
			quantity: 'duration',
			unit: 'Myr'
		}
	},
	equations: [
		{
			tex: '\\lambda_J = c_s\\sqrt{\\frac{\\pi}{G\\rho}}, \\qquad c_s = \\sqrt{\\frac{kT}{\\mu m_u}}',
			says: 'Below this size sound crosses the cloud before gravity can pull it in.'
		},
		{
			tex: 'M_J = \\frac{4\\pi}{3}\\,\\rho\\left(\\frac{\\lambda_J}{2}\\right)^3',
			says: 'The mass in a ball as wide as that size.'
		},
		{
			tex: 't_\\mathrm{ff} = \\sqrt{\\frac{3\\pi}{32\\,G\\rho}}',
			says: 'Denser clouds fall in faster, whatever their size.'
		}
	],
	assumptions: [
		'An even, still cloud at one temperature.',
		'By this convention; other texts define the mass otherwise and differ by factors of up to about 5.'
	],
	warnings: [
		{
			code: 'by-convention',
			message:
				'Texts define this mass in ways that differ by up to a factor of about 5. Name the one meant.',
			when: 'always',
			validity: 'ok'
		}
	],
	sources: [
		{
			title: 'Jeans 1902, The stability of a spherical nebula, Phil. Trans. R. Soc. A 199, 1',
			doi: '10.1098/rsta.1902.0012'
		},
		{ title: 'Binney & Tremaine 2008, Galactic Dynamics', locator: '§5.2', fromMemory: true },
		codata2018('k, m_u and G'),
		IAU_NOMINAL
	],
	checks: checksOf('gas.jeans'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	followsEdition: true,
	compute({ T_K: T, mu, n_m3: n }, { physical } = constants): Computed {
		const particle = mu * physical.m_u.value;
		const density = particle * n;
		const sound = Math.sqrt((k.value * T) / particle);
		const metres = sound * Math.sqrt(Math.PI / (G * density));
		const length = convert(metres, 'm', 'pc');
		// Divided by GM_sun, which is exact, so that G enters once.
		const mass = ((4 / 3) * Math.PI * density * (metres / 2) ** 3 * G) / GM_sun.value;
		const freefall = convert(Math.sqrt((3 * Math.PI) / (32 * G * density)), 's', 'Myr');
		return {
			ok: true,
			values: { length, mass, freefall },
			uncertainties: {
				length: dueToG(length, -0.5),
				mass: dueToG(mass, -0.5),
				freefall: dueToG(freefall, -0.5)
			},
			warnings: ['by-convention']
		};
	}
});
