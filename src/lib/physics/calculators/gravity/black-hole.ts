import { defineCalculator, type Computed } from '../../calculator.ts';
import { constants } from '../../constants/index.ts';
import { checksOf } from '../published-checks.ts';
import { codata2018 } from '../sources.ts';
import { dueToG, G, horizonOf } from './newton.ts';

const { h, c, k } = constants.physical;
const { GM_sun, julianYear } = constants.astronomical;
const HBAR = h.value / (2 * Math.PI);

/** The background sky today, in K: a hole colder than this takes in more than it gives. */
const SKY_K = 2.7255;

/**
 * A hole of this mass (kg, above the Planck mass) that neither turns nor is charged: horizon 2GM/c² and smallest stable
 * orbit 6GM/c² in m, temperature ħc³/(8πGMk) in K, lifetime 5120πG²M³/(ħc⁴) in years.
 */
export const blackHole = defineCalculator({
	id: 'gravity.black_hole',
	revision: '1.0.0',
	title: 'Black hole',
	purpose: 'How large is a black hole of this mass, how cold, and how long would it last?',
	asks: [
		'How large is the horizon of a black hole?',
		'How close can a thing orbit it?',
		'How cold is a black hole?',
		'How long does a black hole live?'
	],
	notFor: ['Holes that turn, as real ones do.', 'What falls in and shines on its way.'],
	inputs: {
		mass_kg: {
			kind: 'number',
			label: 'Mass',
			symbol: 'M',
			quantity: 'mass',
			unit: 'kg',
			min: 2.2e-8,
			max: 1e54,
			initial: GM_sun.value / G,
			log: true
		}
	},
	outputs: {
		radius: { label: 'Radius of the horizon', symbol: 'r_s', quantity: 'radius', unit: 'm' },
		isco: {
			label: 'Radius of the smallest stable orbit',
			symbol: 'r_isco',
			quantity: 'radius',
			unit: 'm'
		},
		hawkingT: { label: 'Temperature', symbol: 'T_H', quantity: 'temperature', unit: 'K' },
		lifetime: {
			label: 'Time until it is gone, if nothing falls in',
			symbol: 't',
			quantity: 'duration',
			unit: 'yr'
		}
	},
	equations: [
		{
			tex: 'r_s = \\frac{2GM}{c^2}, \\qquad r_\\mathrm{isco} = \\frac{6GM}{c^2}',
			says: 'Nothing comes back from inside the horizon; closer than three of its radii no orbit lasts.'
		},
		{
			tex: 'T_H = \\frac{\\hbar c^3}{8\\pi G M k}',
			says: 'The lighter the hole, the hotter it is.'
		},
		{
			tex: 't = \\frac{5120\\,\\pi\\,G^2M^3}{\\hbar c^4}',
			says: 'It gives off its mass as light, very slowly at first.'
		}
	],
	assumptions: [
		'The hole neither turns nor is charged.',
		'For its lifetime it shines as a black body in one kind of particle; counting all kinds changes that by factors of a few.',
		'Nothing falls in.'
	],
	warnings: [
		{
			code: 'colder-than-sky',
			message:
				'It is colder than the sky around it, so for now it takes in more than it gives off.',
			when: 'temperature below 2.7255 K, that of the background today',
			validity: 'ok'
		},
		{
			code: 'more-particles',
			message: 'So hot a hole gives off many kinds of particle and is gone sooner than this.',
			when: 'temperature above 10¹⁰ K',
			validity: 'approximate'
		}
	],
	sources: [
		{
			title: 'Hawking 1975, Particle creation by black holes, Commun. Math. Phys. 43, 199',
			doi: '10.1007/BF02345020'
		},
		{
			title: 'Page 1976, Particle emission rates from a black hole, Phys. Rev. D 13, 198',
			doi: '10.1103/PhysRevD.13.198'
		},
		codata2018('G, h, c and k')
	],
	checks: checksOf('gravity.black_hole'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ mass_kg: M }): Computed {
		const radius = horizonOf(M);
		const isco = 3 * radius;
		const hawkingT = (HBAR * c.value ** 3) / (8 * Math.PI * G * M * k.value);
		const lifetime = (5120 * Math.PI * G ** 2 * M ** 3) / (HBAR * c.value ** 4) / julianYear.value;
		return {
			ok: true,
			values: { radius, isco, hawkingT, lifetime },
			uncertainties: {
				radius: dueToG(radius, 1),
				isco: dueToG(isco, 1),
				hawkingT: dueToG(hawkingT, -1)
			},
			warnings: [
				...(hawkingT < SKY_K ? ['colder-than-sky'] : []),
				...(hawkingT > 1e10 ? ['more-particles'] : [])
			]
		};
	}
});
