import {
	defineCalculator,
	refuse,
	type Computed,
	type NumberInput,
	type Refusal
} from '../../calculator.ts';
import { constants } from '../../constants/index.ts';
import { convert } from '../../units/units.ts';
import { checksOf } from '../published-checks.ts';
import { IAU_NOMINAL } from '../sources.ts';

const { R_earth, R_sun, T_sun, au } = constants.astronomical;

function length(
	label: string,
	symbol: string,
	quantity: 'radius' | 'distance',
	max: number,
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
		max,
		initial,
		log: true
	};
}

/**
 * A planet on a circular orbit passes before its star: depth (R_p/R_s)², chance R_s/a that we see it pass, equilibrium
 * temperature T√(R_s/2a)(1−A)^¼ in K, and how long it takes, P/π asin(R_s/a √((1+k)²−b²)/sin i), in h. Lengths in m.
 * Refuses planets that touch or cover their star, and paths that miss it.
 */
export const transit = defineCalculator({
	id: 'exoplanet.transit',
	revision: '1.0.0',
	title: 'A planet before its star',
	purpose:
		'A planet passes before its star: how much light does it hide, how likely do we see it, how warm is it?',
	asks: [
		'How much does a star dim when a planet passes?',
		'How likely is it that we see a planet pass its star?',
		'How warm is a planet?',
		'How long does a transit take?'
	],
	notFor: [
		'The temperature of a surface, which air warms: that of the Earth is 33 degrees higher.',
		'Whether anything could live there.',
		'Stretched orbits.'
	],
	inputs: {
		Rp_m: length('Radius of the planet', 'R_p', 'radius', 1e12, R_earth.value),
		Rs_m: length('Radius of the star', 'R_s', 'radius', 1e14, R_sun.value),
		a_m: length('Distance of the planet from the star', 'a', 'distance', 1e18, au.value),
		Ts_K: {
			kind: 'number',
			label: 'Temperature of the star',
			symbol: 'T_s',
			quantity: 'temperature',
			unit: 'K',
			min: 1,
			max: 1e6,
			initial: T_sun.value,
			optional: true,
			absent: 'no temperature of the star, so none of the planet'
		},
		albedo: {
			kind: 'number',
			label: 'Share of light the planet throws back',
			symbol: 'A',
			quantity: 'fraction',
			unit: '',
			min: 0,
			max: 1,
			initial: 0.3,
			optional: true,
			absent: 'not known, so no temperature of the planet'
		},
		P_s: {
			kind: 'number',
			label: 'Time of one orbit',
			symbol: 'P',
			quantity: 'duration',
			unit: 's',
			min: 0,
			minExclusive: true,
			max: 1e15,
			initial: 31_558_149.5,
			optional: true,
			absent: 'no time of an orbit, so none of the transit',
			log: true
		},
		b: {
			kind: 'number',
			label: 'How far from the star’s middle it passes, in radii of the star',
			symbol: 'b',
			quantity: 'number',
			unit: '',
			min: 0,
			max: 2,
			initial: 0,
			optional: true
		}
	},
	outputs: {
		depth: {
			label: 'Share of the light it hides',
			symbol: 'δ',
			quantity: 'fraction',
			unit: ''
		},
		probability: {
			label: 'Chance that the orbit lies so that we see it pass',
			symbol: 'p',
			quantity: 'fraction',
			unit: ''
		},
		Teq: {
			label: 'Equilibrium temperature',
			symbol: 'T_eq',
			quantity: 'temperature',
			unit: 'K'
		},
		duration: { label: 'Time from first to last touch', quantity: 'duration', unit: 'h' }
	},
	equations: [
		{
			tex: '\\delta = \\left(\\frac{R_p}{R_s}\\right)^2, \\qquad p = \\frac{R_s}{a}',
			says: 'The dip tells the planet’s size; a close planet is likelier to pass before its star.'
		},
		{
			tex: 'T_\\mathrm{eq} = T_s\\sqrt{\\frac{R_s}{2a}}\\,(1-A)^{1/4}',
			says: 'What the planet takes in it must give off again.'
		},
		{
			tex: '\\frac P\\pi\\,\\arcsin\\left(\\frac{R_s}{a}\\,\\frac{\\sqrt{(1+R_p/R_s)^2-b^2}}{\\sin i}\\right)',
			says: 'The transit takes the share of the orbit that lies before the star.'
		}
	],
	assumptions: [
		'A circular orbit.',
		'The star’s disc is equally bright all over.',
		'The planet gives off heat all round and has no air: this isn’t the temperature of its surface.'
	],
	warnings: [
		{
			code: 'grazing',
			message: 'The planet only grazes the star, so it hides less light than this.',
			when: 'path within one planet radius of the star’s edge',
			validity: 'outside'
		}
	],
	sources: [
		{
			title: 'Winn 2010, Transits and occultations',
			locator: 'eqs 7, 9, 14',
			url: 'https://arxiv.org/abs/1001.2010'
		},
		IAU_NOMINAL
	],
	checks: checksOf('exoplanet.transit'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ Rp_m, Rs_m, a_m, Ts_K, albedo, P_s, b }): Computed {
		const k = Rp_m / Rs_m;
		if (k >= 1) {
			return refuse(
				'covers-the-star',
				'The planet is as large as its star and would hide all of it. Give a smaller planet.',
				'Rp_m'
			);
		}
		if (a_m <= Rs_m + Rp_m) {
			return refuse(
				'touches-the-star',
				'So close, the planet would touch its star. Give a distance above the two radii together.',
				'a_m'
			);
		}
		if (b >= 1 + k) {
			return refuse(
				'misses-the-star',
				'On this path the planet misses the star. Let it pass closer to the star’s middle.',
				'b'
			);
		}
		const values: Record<string, number> = { depth: k * k, probability: Rs_m / a_m };
		const withheld: Record<string, Refusal> = {};
		if (Ts_K === undefined || albedo === undefined) {
			withheld.Teq = {
				code: 'needs-light',
				message: 'Give the star’s temperature and the share of light thrown back to get this.'
			};
		} else values.Teq = Ts_K * Math.sqrt(Rs_m / (2 * a_m)) * (1 - albedo) ** 0.25;
		if (P_s === undefined) {
			withheld.duration = {
				code: 'needs-period',
				message: 'Give the time of one orbit to get that of the transit.'
			};
		} else {
			const cosine = (b * Rs_m) / a_m;
			const chord = Math.sqrt((1 + k - b) * (1 + k + b));
			const share = ((Rs_m / a_m) * chord) / Math.sqrt((1 - cosine) * (1 + cosine));
			values.duration = convert((P_s / Math.PI) * Math.asin(Math.min(1, share)), 's', 'h');
		}
		return {
			ok: true,
			values,
			uncertainties: 'exact',
			withheld,
			warnings: b > 1 - k ? ['grazing'] : []
		};
	}
});
