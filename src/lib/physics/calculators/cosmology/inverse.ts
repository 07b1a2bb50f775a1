import { defineCalculator, refuse, type Computed } from '../../calculator.ts';
import { brentRoot } from '../../numerics/roots.ts';
import { printNumber } from '../wording.ts';
import {
	ageless,
	COSMOLOGY_ASSUMPTIONS,
	COSMOLOGY_SOURCES,
	COSMOLOGY_WARNINGS,
	cosmologyInput,
	cosmologyWarnings,
	universeWithPast
} from './limits.ts';
import { reachOf, transverseOf } from './integrals.ts';
import { X_MAX, X_MIN, type Universe } from './universe.ts';
import { checksOf } from '../published-checks.ts';

type Kind = 'z_from_age' | 'z_from_lookback' | 'z_from_comoving' | 'z_from_luminosity';

/** A quantity as a function of x = ln(1+z) in Hubble units, with its derivative. */
interface Curve {
	unit: string;
	scale: number;
	from: number;
	to: number;
	at(x: number): number;
	slope(x: number): number;
	/** What to say below the lowest and above the highest value. */
	below: (limit: string) => string;
	above: (limit: string) => string;
}

/**
 * The redshift at which an age, a look-back time or a distance is reached. Refuses what no redshift gives: a time
 * beyond the age, a distance beyond the particle horizon, anything negative.
 */
export const inverse = defineCalculator({
	id: 'cosmo.inverse',
	revision: '1.0.0',
	title: 'Age or distance to redshift',
	purpose:
		'An age, a time or a distance is known: at what redshift does an expanding universe reach it?',
	asks: [
		'What redshift belongs to this age after the Big Bang?',
		'How much has space grown since then?',
		'What redshift does a source at this distance have?'
	],
	notFor: [
		'Angular-diameter distance, which two redshifts share.',
		'Sources nearer than about 100 megaparsecs.'
	],
	inputs: {
		cosmology: cosmologyInput,
		kind: {
			kind: 'choice',
			label: 'What is known',
			initial: 'z_from_age',
			options: [
				{ value: 'z_from_age', label: 'Age after the Big Bang' },
				{ value: 'z_from_lookback', label: 'Time before now' },
				{ value: 'z_from_comoving', label: 'Distance now (comoving)' },
				{ value: 'z_from_luminosity', label: 'Luminosity distance' }
			]
		},
		value: {
			kind: 'number',
			label: 'Its value',
			quantity: 'number',
			quantityBy: {
				by: 'kind',
				kinds: {
					z_from_age: 'age',
					z_from_lookback: 'lookback-time',
					z_from_comoving: 'comoving-distance',
					z_from_luminosity: 'luminosity-distance'
				}
			},
			unit: {
				by: 'kind',
				units: {
					z_from_age: 'Gyr',
					z_from_lookback: 'Gyr',
					z_from_comoving: 'Mpc',
					z_from_luminosity: 'Mpc'
				}
			},
			min: 0,
			max: 1e12,
			initial: 0.18
		}
	},
	outputs: {
		z: { label: 'Redshift', symbol: 'z', quantity: 'redshift', unit: '' },
		stretch: {
			label: 'Stretch of waves since then',
			symbol: '1+z',
			quantity: 'stretch',
			unit: 'times'
		}
	},
	restsOnCosmology: ['z', 'stretch'],
	equations: [
		{
			tex: 't(z) = \\frac{1}{H_0}\\int_{z}^{\\infty} \\frac{\\mathrm{d}z^\\prime}{(1+z^\\prime)\\,E(z^\\prime)} = t',
			says: 'The redshift is sought at which the universe has the age that was given.'
		},
		{
			tex: '\\frac{\\lambda_\\mathrm{now}}{\\lambda_\\mathrm{then}} = 1+z',
			says: 'Every wave has grown since then by as much as space has.'
		}
	],
	assumptions: COSMOLOGY_ASSUMPTIONS,
	warnings: COSMOLOGY_WARNINGS,
	sources: [
		...COSMOLOGY_SOURCES,
		{
			title: 'Brent 1973, Algorithms for minimization without derivatives',
			locator: 'ch. 4, the root search',
			fromMemory: true
		}
	],
	checks: checksOf('cosmo.inverse'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ cosmology, kind, value }): Computed {
		const opened = universeWithPast(cosmology);
		if (!opened.ok) return opened;
		const { universe } = opened;
		if (kind === 'z_from_age') {
			const none = ageless(universe);
			if (none) return none;
		}
		const curve = curveOf(universe, kind);
		const target = value / curve.scale;
		const solved = solve(curve, target);
		if (!solved.ok) return solved;
		const z = Math.expm1(solved.x);
		return {
			ok: true,
			values: { z, stretch: Math.exp(solved.x) },
			warnings: cosmologyWarnings(universe, z)
		};
	}
});

function curveOf(universe: Universe, kind: Kind): Curve {
	const { hubbleTimeGyr, hubbleDistanceMpc } = universe;
	const rate = (x: number) => 1 / Math.sqrt(universe.E2(Math.exp(x)));
	const distance = (x: number) => reachOf(universe, x).distance;
	const future = universe.turnaround > 0 ? Math.log(universe.turnaround) + 1e-9 : X_MIN;
	switch (kind) {
		case 'z_from_age':
			return {
				unit: 'Gyr',
				scale: hubbleTimeGyr,
				from: future,
				to: X_MAX,
				at: (x) => reachOf(universe, x).age,
				slope: (x) => -rate(x),
				below: () =>
					'So early is before this model begins. Give an age of at least a second or so.',
				above: (limit) =>
					`An age must be at most ${limit}: beyond that the model is not carried. Give a smaller one.`
			};
		case 'z_from_lookback':
			return {
				unit: 'Gyr',
				scale: hubbleTimeGyr,
				from: 0,
				to: X_MAX,
				at: (x) => reachOf(universe, x).time,
				slope: rate,
				below: () => 'A time before now can’t be negative.',
				above: (limit) => `That is longer ago than the Big Bang. Give a time below ${limit}.`
			};
		case 'z_from_comoving':
			return {
				unit: 'Mpc',
				scale: hubbleDistanceMpc,
				from: 0,
				to: X_MAX,
				at: distance,
				slope: (x) => Math.exp(x) * rate(x),
				below: () => 'A distance can’t be negative.',
				above: (limit) =>
					`No light has had time to come from so far. Give a distance below ${limit}.`
			};
		case 'z_from_luminosity':
			return {
				unit: 'Mpc',
				scale: hubbleDistanceMpc,
				from: 0,
				to: firstQuarter(universe),
				at: (x) => Math.exp(x) * transverseOf(universe, distance(x)),
				slope(x) {
					const way = distance(x);
					const across = transverseOf(universe, way);
					const bend = Math.sqrt(Math.max(0, 1 + universe.Ok0 * across * across));
					return Math.exp(x) * (across + bend * Math.exp(x) * rate(x));
				},
				below: () => 'A distance can’t be negative.',
				above: (limit) =>
					`No source in this universe has so large a luminosity distance. Give one below ${limit}.`
			};
	}
}

/** In a closed universe distances across grow only up to its equator; the search ends there. */
function firstQuarter(universe: Universe): number {
	const { Ok0 } = universe;
	if (Ok0 >= 0) return X_MAX;
	const equator = Math.PI / 2 / Math.sqrt(-Ok0);
	return brentRoot((x) => reachOf(universe, x).distance - equator, 0, X_MAX, 1e-12) ?? X_MAX;
}

function solve(curve: Curve, target: number): { ok: true; x: number } | ReturnType<typeof refuse> {
	const first = curve.at(curve.from);
	const last = curve.at(curve.to);
	const [low, high] = first < last ? [first, last] : [last, first];
	if (target < low)
		return refuse(
			'out-of-reach',
			curve.below(`${printNumber(low * curve.scale)} ${curve.unit}`),
			'value'
		);
	if (target >= high && high !== low) {
		return refuse(
			'out-of-reach',
			curve.above(`${printNumber(high * curve.scale)} ${curve.unit}`),
			'value'
		);
	}
	const root = brentRoot((x) => curve.at(x) - target, curve.from, curve.to, 1e-10);
	if (root === undefined)
		return refuse(
			'out-of-reach',
			curve.above(`${printNumber(high * curve.scale)} ${curve.unit}`),
			'value'
		);
	if (root === 0) return { ok: true, x: 0 };
	// One Newton step takes the root from 1e-10 to the last bits.
	return { ok: true, x: root - (curve.at(root) - target) / curve.slope(root) };
}
