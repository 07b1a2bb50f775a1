import {
	defineCalculator,
	type Computed,
	type Refusal,
	type Uncertainty
} from '../../calculator.ts';
import { constants } from '../../constants/index.ts';
import { convert } from '../../units/units.ts';
import { checksOf } from '../published-checks.ts';
import { IAU_LENGTHS } from '../sources.ts';
import { dueTo } from '../uncertainties.ts';

const { L_0, L_sun } = constants.astronomical;

/**
 * Distance in pc and ly and distance modulus 5 log₁₀(d/10 pc) from a parallax in mas; or the ratio of brightness
 * 10^(−0.4 Δm) of two magnitudes that differ; or the bolometric magnitude −2.5 log₁₀(L/L₀) of a luminosity in W.
 */
export const magnitude = defineCalculator({
	id: 'stars.magnitude',
	revision: '1.0.0',
	title: 'Distance and brightness of stars',
	purpose: 'What does a parallax, a difference of magnitudes or a luminosity say about a star?',
	asks: [
		'How far is a star with this parallax?',
		'How much brighter is a star of magnitude 1 than one of 6?',
		'What is the absolute magnitude of the Sun?'
	],
	notFor: [
		'Stars behind dust, which dims them.',
		'Galaxies so far that space has grown since: use the luminosity distance.'
	],
	inputs: {
		parallax_mas: {
			kind: 'number',
			label: 'Parallax',
			symbol: 'p',
			quantity: 'parallax',
			unit: 'mas',
			min: 0,
			minExclusive: true,
			max: 1e5,
			initial: 768.0665,
			optional: true,
			log: true
		},
		parallaxError_mas: {
			kind: 'number',
			label: 'Standard uncertainty of the parallax',
			symbol: 'u_p',
			quantity: 'parallax',
			unit: 'mas',
			min: 0,
			max: 1e5,
			initial: 0.05,
			optional: true,
			absent: 'taken as exact'
		},
		dm: {
			kind: 'number',
			label: 'Difference of two magnitudes',
			symbol: 'Δm',
			quantity: 'magnitude',
			unit: 'mag',
			min: -100,
			max: 100,
			initial: 5,
			optional: true
		},
		L_W: {
			kind: 'number',
			label: 'Luminosity, all colours together',
			symbol: 'L',
			quantity: 'luminosity',
			unit: 'W',
			min: 0,
			minExclusive: true,
			max: 1e50,
			initial: L_sun.value,
			optional: true,
			log: true
		}
	},
	oneOf: [['parallax_mas', 'dm', 'L_W']],
	outputs: {
		distance: { label: 'Distance', symbol: 'd', quantity: 'distance', unit: 'pc' },
		distanceLy: {
			label: 'Distance in light years',
			symbol: 'd',
			quantity: 'distance',
			unit: 'ly'
		},
		distmod: {
			label: 'Distance modulus',
			symbol: 'μ',
			quantity: 'distance-modulus',
			unit: 'mag'
		},
		fluxRatio: {
			label: 'Brightness of the one of higher magnitude, as a share of the other’s',
			symbol: 'F₂/F₁',
			quantity: 'ratio',
			unit: ''
		},
		Mbol: {
			label: 'Absolute magnitude, all colours together',
			symbol: 'M_bol',
			quantity: 'magnitude',
			unit: 'mag'
		}
	},
	equations: [
		{
			tex: 'd = \\frac{1000\\,\\mathrm{pc}}{p/\\mathrm{mas}}, \\qquad \\mu = 5\\log_{10}\\frac{d}{10\\,\\mathrm{pc}}',
			says: 'The nearer a star, the more it shifts as the Earth goes round the Sun.'
		},
		{
			tex: '\\frac{F_2}{F_1} = 10^{-0.4\\,\\Delta m}',
			says: 'Five magnitudes are a factor of a hundred, and higher magnitudes are fainter.'
		},
		{
			tex: 'M_\\mathrm{bol} = -2.5\\log_{10}\\frac{L}{3.0128\\times10^{28}\\,\\mathrm W}',
			says: 'The magnitude a star would have from 10 parsecs, counting all of its light.'
		}
	],
	assumptions: ['No dust on the way.', 'The parallax has been freed of its zero-point offset.'],
	warnings: [
		{
			code: 'weak-parallax',
			message:
				'The parallax is less than five times its uncertainty: one over it is no good distance.',
			when: 'parallax below 5 standard uncertainties',
			validity: 'outside'
		}
	],
	sources: [
		{ title: 'Pogson 1856, Magnitudes of thirty-six of the minor planets, MNRAS 17, 12' },
		IAU_LENGTHS,
		{ title: 'IAU 2015 Resolution B2', locator: 'L₀ = 3.0128 × 10²⁸ W' },
		{
			title: 'Bailer-Jones 2015, Estimating distances from parallaxes, PASP 127, 994',
			doi: '10.1086/683116'
		}
	],
	checks: checksOf('stars.magnitude'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ parallax_mas: p, parallaxError_mas: u, dm, L_W: L }): Computed {
		if (p !== undefined) return fromParallax(p, u ?? 0);
		if (dm !== undefined) return alone('fluxRatio', 10 ** (-0.4 * dm));
		return alone('Mbol', -2.5 * Math.log10(L / L_0.value));
	}
});

const NEEDS: Record<string, Refusal> = {
	distance: { code: 'needs-parallax', message: 'A distance needs a parallax. Give one instead.' },
	distanceLy: { code: 'needs-parallax', message: 'A distance needs a parallax. Give one instead.' },
	distmod: {
		code: 'needs-parallax',
		message: 'The distance modulus needs a parallax. Give one instead.'
	},
	fluxRatio: {
		code: 'needs-magnitudes',
		message: 'A ratio of brightness needs a difference of magnitudes. Give one instead.'
	},
	Mbol: {
		code: 'needs-luminosity',
		message: 'An absolute magnitude needs a luminosity. Give one instead.'
	}
};

function without(given: readonly string[]): Record<string, Refusal> {
	return Object.fromEntries(Object.entries(NEEDS).filter(([key]) => !given.includes(key)));
}

const WITHOUT_PARALLAX = { fluxRatio: without(['fluxRatio']), Mbol: without(['Mbol']) };
const WITH_PARALLAX = without(['distance', 'distanceLy', 'distmod']);

function alone(key: keyof typeof WITHOUT_PARALLAX, value: number): Computed {
	return {
		ok: true,
		values: { [key]: value },
		uncertainties: { [key]: 'exact' },
		withheld: WITHOUT_PARALLAX[key]
	};
}

function fromParallax(p: number, u: number): Computed {
	const values = {
		distance: 1000 / p,
		distanceLy: convert(1000 / p, 'pc', 'ly'),
		distmod: 5 * Math.log10(100 / p)
	};
	const isWeak = p < 5 * u;
	const known = (value: number): Uncertainty =>
		u === 0 ? 'exact' : isWeak ? 'not-available' : dueTo(u / p, value);
	return {
		ok: true,
		values,
		uncertainties: {
			distance: known(values.distance),
			distanceLy: known(values.distanceLy),
			distmod: known(5 / Math.LN10)
		},
		withheld: WITH_PARALLAX,
		warnings: isWeak ? ['weak-parallax'] : []
	};
}
