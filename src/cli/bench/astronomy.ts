/** Our side of the cells that astropy answers too: the calculators themselves, as a reader’s slider calls them. */
import type { RawInputs } from '../../lib/physics/calculator.ts';
import { reachOf, transverseOf } from '../../lib/physics/calculators/cosmology/integrals.ts';
import { resolveCosmology } from '../../lib/physics/calculators/cosmology/parameters.ts';
import { universeOf } from '../../lib/physics/calculators/cosmology/universe.ts';
import { catalogue } from '../../lib/physics/calculators/index.ts';
import { runCalculator } from '../../lib/physics/calculators/run.ts';

export interface Cell {
	/** The anchor’s name of it. */
	name: string;
	/** What is measured, for the table. */
	says: string;
	/** The answer at a share of the way from 0 to 1, the same as the anchor’s. */
	at(share: number): number;
	/** Relative difference at which both still count as the same work. */
	within: number;
}

function calculator(
	name: string,
	output: string,
	inputs: (share: number) => RawInputs,
	says = 'all its outputs',
	within = 1e-9
): Cell {
	const [id = ''] = name.split(',');
	const called = catalogue.get(id)!;
	return {
		name,
		says,
		within,
		at(share) {
			const result = runCalculator(called, inputs(share));
			if (!result.ok) throw new Error(`${name}: ${result.refusal.message}`);
			return result.outputs[output]!.value as number;
		}
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

const atZ = calculator('cosmo.at_z', 'luminosity', (share) => ({
	cosmology: PLANCK18,
	z: redshift(share)
}));

const distanceAlone: Cell = {
	name: 'distance',
	says: 'luminosity distance alone, without the calculator around it',
	within: 1e-9,
	at(share) {
		const z = redshift(share);
		const way = transverseOf(universe, reachOf(universe, Math.log1p(z)).distance);
		return way * (1 + z) * universe.hubbleDistanceMpc;
	}
};

const glow = calculator('blackbody.planck', 'B_lambda', (share) => ({
	T_K: 5772,
	wavelength_nm: 200 + 2000 * share
}));

const photon = calculator('photon.convert', 'energy', (share) => ({
	wavelength_nm: 100 + 900 * share
}));

export const scalars: Cell[] = [
	atZ,
	distanceAlone,
	calculator(
		'cosmo.at_z, new universe',
		'luminosity',
		(share) => ({ cosmology: { H0: 60 + 20 * share, Om0: 0.3, Tcmb0: 2.7255 }, z: 1 }),
		'a slider on H₀; astropy gives the luminosity distance alone'
	),
	calculator(
		'cosmo.inverse',
		'z',
		(share) => ({ cosmology: PLANCK18, kind: 'z_from_age', value: 0.5 + 12 * share }),
		'redshift from age',
		1e-6
	),
	calculator(
		'cosmo.age_diff',
		'duration',
		(share) => ({ cosmology: PLANCK18, z1: redshift(share), z2: 20 }),
		'all its outputs',
		1e-8
	),
	glow,
	calculator(
		'blackbody.total',
		'peakWavelength',
		(share) => ({ T_K: 3000 + 9000 * share }),
		'all its outputs; astropy the two peaks and the flux'
	),
	photon,
	calculator('line.observe', 'observedWavelength', (share) => ({
		restWavelength_nm: 121.567,
		z: 12 * share
	})),
	calculator('doppler.beta_from_z', 'velocity', (share) => ({ z: 0.01 + share })),
	calculator('orbit.kepler', 'period', (share) => ({
		mass_kg: 1.98841e30,
		a_m: 1e11 + 1e12 * share,
		e: 0.2
	})),
	calculator('gravity.body', 'escapeSpeed', (share) => ({
		mass_kg: 1e24 + 1e25 * share,
		radius_m: 6.371e6
	})),
	calculator('stars.magnitude', 'distance', (share) => ({ parallax_mas: 1 + 50 * share })),
	calculator('light.travel', 'time', (share) => ({ value: 1 + 100 * share, unit: 'pc' })),
	calculator('energy.convert', 'value', (share) => ({
		value: 1 + 100 * share,
		from: 'eV',
		to: 'J'
	})),
	calculator('angle.size', 'angle', (share) => ({ D_m: 1 + share, d_m: 100 }))
];

/** 1000 points; astropy takes them as one array. */
export const curves: Cell[] = [
	atZ,
	distanceAlone,
	{ ...glow, says: 'all its outputs, point by point' },
	{ ...photon, says: 'all its outputs, point by point' }
];
