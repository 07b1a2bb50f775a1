/** Our side of the cells that astropy answers too: the calculators themselves, as a reader’s slider and a chart call them. */
import type { RawInputs } from '../../lib/physics/calculator.ts';
import { reachOf, transverseOf } from '../../lib/physics/calculators/cosmology/integrals.ts';
import { resolveCosmology } from '../../lib/physics/calculators/cosmology/parameters.ts';
import { universeOf } from '../../lib/physics/calculators/cosmology/universe.ts';
import { catalogue } from '../../lib/physics/calculators/index.ts';
import { runCalculator } from '../../lib/physics/calculators/run.ts';
import { sweepCalculator } from '../../lib/physics/calculators/sweep-calculator.ts';

export const POINTS = 1000;

export interface Cell {
	/** The anchor’s name of it. */
	name: string;
	/** What is measured, for the table. */
	says: string;
	/** The answer at a share of the way from 0 to 1, the same as the anchor’s. */
	at(share: number): number;
	/** The answers at all points; null where astropy takes no array of them. */
	curve: (() => ArrayLike<number>) | null;
	/** Relative difference at which both still count as the same work. */
	within: number;
}

/** All points of a curve, as shares of the way. */
const shares = Array.from({ length: POINTS }, (_, index) => index / POINTS);

interface Swept {
	fixed: RawInputs;
	/** The input that moves, and where to. */
	moves: string;
	to(share: number): number;
	says?: string;
	within?: number;
	/** astropy makes one of these at a time. */
	alone?: boolean;
}

function calculator(
	name: string,
	output: string,
	{ fixed, moves, to, says = 'all its outputs', within = 1e-9, alone = false }: Swept
): Cell {
	const [id = ''] = name.split(',');
	const called = catalogue.get(id)!;
	const places = Float64Array.from(shares, to);
	const [head = '', part] = moves.split('.');
	// Laid out once, like astropy’s own: what is timed is the calculator.
	const inputs: RawInputs = { ...fixed };
	return {
		name,
		says,
		within,
		at(share) {
			inputs[head] =
				part === undefined ? to(share) : { ...(fixed[head] as object), [part]: to(share) };
			const result = runCalculator(called, inputs);
			if (!result.ok) throw new Error(`${name}: ${result.refusal.message}`);
			return result.outputs[output]!.value as number;
		},
		curve: alone ? null : () => sweepCalculator(called, fixed, moves, places).columns[output]!
	};
}

const PLANCK18 = { set: 'Planck18' };
const redshift = (share: number) => 0.01 + 10 * share;

function planck18() {
	const resolved = resolveCosmology(PLANCK18);
	if (!resolved.ok) throw new Error(resolved.refusal.message);
	return universeOf(resolved.value);
}

const universe = planck18();

function luminosityDistance(share: number): number {
	const z = redshift(share);
	const way = transverseOf(universe, reachOf(universe, Math.log1p(z)).distance);
	return way * (1 + z) * universe.hubbleDistanceMpc;
}

export const cells: Cell[] = [
	calculator('cosmo.at_z', 'luminosity', {
		fixed: { cosmology: PLANCK18 },
		moves: 'z',
		to: redshift
	}),
	{
		name: 'distance',
		says: 'luminosity distance alone, without the calculator around it',
		within: 1e-9,
		at: luminosityDistance,
		curve: () => Float64Array.from(shares, luminosityDistance)
	},
	calculator('cosmo.at_z, new universe', 'luminosity', {
		fixed: { cosmology: { Om0: 0.3, Tcmb0: 2.7255 }, z: 1 },
		moves: 'cosmology.H0',
		to: (share) => 60 + 20 * share,
		says: 'a slider on H₀; astropy gives the luminosity distance alone',
		alone: true
	}),
	calculator('cosmo.inverse', 'z', {
		fixed: { cosmology: PLANCK18, kind: 'z_from_age' },
		moves: 'value',
		to: (share) => 0.5 + 12 * share,
		says: 'redshift from age',
		within: 1e-6
	}),
	calculator('cosmo.age_diff', 'duration', {
		fixed: { cosmology: PLANCK18, z2: 20 },
		moves: 'z1',
		to: redshift,
		within: 1e-8
	}),
	calculator('blackbody.planck', 'B_lambda', {
		fixed: { T_K: 5772 },
		moves: 'wavelength_nm',
		to: (share) => 200 + 2000 * share
	}),
	calculator('blackbody.total', 'peakWavelength', {
		fixed: {},
		moves: 'T_K',
		to: (share) => 3000 + 9000 * share,
		says: 'all its outputs; astropy the two peaks and the flux'
	}),
	calculator('photon.convert', 'energy', {
		fixed: {},
		moves: 'wavelength_nm',
		to: (share) => 100 + 900 * share
	}),
	calculator('line.observe', 'observedWavelength', {
		fixed: { restWavelength_nm: 121.567 },
		moves: 'z',
		to: (share) => 12 * share
	}),
	calculator('doppler.beta_from_z', 'velocity', {
		fixed: {},
		moves: 'z',
		to: (share) => 0.01 + share
	}),
	calculator('orbit.kepler', 'period', {
		fixed: { mass_kg: 1.98841e30, e: 0.2 },
		moves: 'a_m',
		to: (share) => 1e11 + 1e12 * share
	}),
	calculator('gravity.body', 'escapeSpeed', {
		fixed: { radius_m: 6.371e6 },
		moves: 'mass_kg',
		to: (share) => 1e24 + 1e25 * share
	}),
	calculator('stars.magnitude', 'distance', {
		fixed: {},
		moves: 'parallax_mas',
		to: (share) => 1 + 50 * share
	}),
	calculator('light.travel', 'time', {
		fixed: { unit: 'pc' },
		moves: 'value',
		to: (share) => 1 + 100 * share
	}),
	calculator('energy.convert', 'value', {
		fixed: { from: 'eV', to: 'J' },
		moves: 'value',
		to: (share) => 1 + 100 * share
	}),
	calculator('angle.size', 'angle', {
		fixed: { d_m: 100 },
		moves: 'D_m',
		to: (share) => 1 + share
	})
];
