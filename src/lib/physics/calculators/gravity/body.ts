import { defineCalculator, type Computed, type Refusal } from '../../calculator.ts';
import { constants } from '../../constants/index.ts';
import { checksOf } from '../published-checks.ts';
import { codata2018, IAU_NOMINAL } from '../sources.ts';
import { dueToG, FIVE_DIGITS, G, horizonOf } from './newton.ts';

const { GM_earth, R_earth } = constants.astronomical;

/** Below this many horizon radii Newton is off by more than about half a per cent. */
const STRONG_GRAVITY = 100;

/**
 * A round body of mass in kg and radius in m: escape speed √(2GM/R) and circular speed √(GM/R) in km/s, gravity at its
 * surface in m/s², mean density in kg/m³, and redshift of light that leaves it, (1 − 2GM/Rc²)^(−1/2) − 1. Inside its own
 * horizon it is a black hole: only the density is given then.
 */
export const body = defineCalculator({
	id: 'gravity.body',
	revision: '1.0.0',
	title: 'Gravity of a round body',
	purpose:
		'A planet or star has this mass and radius: how fast must a thing be to leave, and how heavy is it there?',
	asks: [
		'What is the escape speed of the Earth?',
		'How strong is gravity on Mars?',
		'How dense is this planet?',
		'How much is light reddened when it leaves a star?'
	],
	notFor: [
		'The speed a rocket needs: a powered flight may go slowly all the way.',
		'Bodies that spin fast or are far from round.'
	],
	inputs: {
		mass_kg: {
			kind: 'number',
			label: 'Mass',
			symbol: 'M',
			quantity: 'mass',
			unit: 'kg',
			min: 0,
			minExclusive: true,
			max: 1e54,
			initial: GM_earth.value / G,
			log: true
		},
		radius_m: {
			kind: 'number',
			label: 'Radius',
			symbol: 'R',
			quantity: 'radius',
			unit: 'm',
			min: 0,
			minExclusive: true,
			max: 1e27,
			initial: R_earth.value,
			log: true
		}
	},
	outputs: {
		escapeSpeed: { label: 'Escape speed', symbol: 'v_esc', quantity: 'speed', unit: 'km/s' },
		surfaceGravity: {
			label: 'Gravity at the surface',
			symbol: 'g',
			quantity: 'acceleration',
			unit: 'm/s2'
		},
		meanDensity: { label: 'Mean density', symbol: 'ρ', quantity: 'density', unit: 'kg/m3' },
		circularSpeed: {
			label: 'Speed of a circular orbit at the surface',
			symbol: 'v_circ',
			quantity: 'speed',
			unit: 'km/s'
		},
		gravRedshift: {
			label: 'Redshift of light from the surface',
			symbol: 'z',
			quantity: 'redshift',
			unit: ''
		}
	},
	equations: [
		{
			tex: 'v_\\mathrm{esc} = \\sqrt{\\frac{2GM}{R}}, \\qquad v_\\mathrm{circ} = \\sqrt{\\frac{GM}{R}}',
			says: 'Thrown at the escape speed, a body slows for ever but never turns back.'
		},
		{
			tex: 'g = \\frac{GM}{R^2}, \\qquad \\rho = \\frac{3M}{4\\pi R^3}',
			says: 'Gravity at the surface, and the density if the mass were spread evenly.'
		},
		{
			tex: '1+z = \\left(1-\\frac{2GM}{Rc^2}\\right)^{-1/2}',
			says: 'Light loses energy on its way out.'
		}
	],
	assumptions: [
		'The body is round and doesn’t turn.',
		'No air, and nothing else nearby.',
		'The radius is the one given: mean and equatorial radii give different speeds. Say which.'
	],
	warnings: [
		FIVE_DIGITS,
		{
			code: 'strong-gravity',
			message:
				'So dense a body needs the general theory of relativity; Newton’s speeds are off by more than half a per cent.',
			when: 'radius below 100 horizon radii',
			validity: 'approximate'
		},
		{
			code: 'black-hole',
			message: 'A body this small for its mass is a black hole: no light leaves it.',
			when: 'radius at or inside the horizon, 2GM/c²',
			validity: 'outside'
		}
	],
	sources: [
		{ title: 'Newton 1687, Philosophiæ naturalis principia mathematica', fromMemory: true },
		{
			title:
				'Schwarzschild 1916, Über das Gravitationsfeld eines Massenpunktes, Sitzungsber. Preuss. Akad. Wiss. 189',
			fromMemory: true
		},
		codata2018('G, uncertainty 2.2 × 10⁻⁵'),
		IAU_NOMINAL
	],
	checks: checksOf('gravity.body'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ mass_kg: M, radius_m: R }): Computed {
		const meanDensity = M / ((4 / 3) * Math.PI * R ** 3);
		const horizon = horizonOf(M);
		if (R <= horizon) {
			return {
				ok: true,
				values: { meanDensity },
				uncertainties: { meanDensity: 'exact' },
				withheld: {
					escapeSpeed: BLACK_HOLE,
					surfaceGravity: BLACK_HOLE,
					circularSpeed: BLACK_HOLE,
					gravRedshift: BLACK_HOLE
				},
				warnings: [FIVE_DIGITS.code, 'black-hole']
			};
		}
		const compactness = horizon / R;
		const circularSpeed = Math.sqrt((G * M) / R) / 1000;
		const escapeSpeed = Math.SQRT2 * circularSpeed;
		const surfaceGravity = (G * M) / R / R;
		const gravRedshift = Math.expm1(-0.5 * Math.log1p(-compactness));
		return {
			ok: true,
			values: { escapeSpeed, surfaceGravity, meanDensity, circularSpeed, gravRedshift },
			uncertainties: {
				escapeSpeed: dueToG(escapeSpeed, 0.5),
				surfaceGravity: dueToG(surfaceGravity, 1),
				meanDensity: 'exact',
				circularSpeed: dueToG(circularSpeed, 0.5),
				// dz/dG = (1+z)³ r_s/(2RG)
				gravRedshift: dueToG((compactness / 2) * (1 + gravRedshift) ** 3, 1)
			},
			warnings: [FIVE_DIGITS.code, ...(R < STRONG_GRAVITY * horizon ? ['strong-gravity'] : [])]
		};
	}
});

const BLACK_HOLE: Refusal = {
	code: 'black-hole',
	message: 'This is a black hole, and nothing leaves it. Give a larger radius or less mass.',
	input: 'radius_m'
};
