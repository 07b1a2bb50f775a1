import {
	defineCalculator,
	type Computed,
	type Refusal,
	type Uncertainty
} from '../../calculator.ts';
import { constants } from '../../constants/index.ts';
import { atZOutputs } from './at-z-outputs.ts';
import { checksOf } from '../published-checks.ts';
import {
	ageless,
	beyondTurnaround,
	COSMOLOGY_ASSUMPTIONS,
	COSMOLOGY_SOURCES,
	COSMOLOGY_WARNINGS,
	cosmologyInput,
	cosmologyWarnings,
	redshiftInput,
	universeWithPast
} from './limits.ts';
import type { CosmologyParameters } from './parameters.ts';
import { reachOf, transverseOf, volumeOf } from './integrals.ts';
import type { Universe } from './universe.ts';

const { c } = constants.physical;
const { pc, ly } = constants.astronomical;
const GLY_PER_MPC = (pc.value / ly.value) * 1e-3;
/** kpc under one arcsecond at one Mpc. */
const KPC_PER_ARCSEC = (1000 * Math.PI) / 648_000;
const LIGHT_KM_S = c.value / 1000;

/** Chosen with the model, not fitted: flatness, and the neutrinos' masses. */
const CHOSEN_OUTPUTS = ['scale_factor', 'Ok', 'Ok0', 'Onu', 'Onu0'];
const FITTED_OUTPUTS = Object.keys(atZOutputs).filter((key) => !CHOSEN_OUTPUTS.includes(key));

/**
 * Everything an expanding universe says about one redshift: ages, distances, horizons, densities, speeds.
 * z in (−1, 10¹⁰]. Refuses a universe without a Big Bang, and a redshift after the end of the expansion.
 */
export const atZ = defineCalculator({
	id: 'cosmo.at_z',
	revision: '1.0.0',
	title: 'Expanding universe',
	purpose:
		'Light arrives stretched by a known redshift: when did it leave, how far is its source, and how fast did space grow?',
	asks: [
		'How long after the Big Bang did this light leave?',
		'How long has the light been on its way?',
		'How far away is a galaxy at this redshift now?',
		'How old is the Universe?',
		'How big is the observable Universe?',
		'How hot was the cosmic background then?'
	],
	notFor: [
		'Sources nearer than about 100 megaparsecs, whose own motion rivals the expansion.',
		'The first minutes after the Big Bang.'
	],
	inputs: { cosmology: cosmologyInput, z: redshiftInput('Redshift', 1) },
	outputs: atZOutputs,
	restsOnCosmology: FITTED_OUTPUTS,
	equations: [
		{
			tex: '\\begin{aligned} E^2(z) ={}& \\Omega_m(1+z)^3 + \\Omega_\\gamma(1+z)^4\\,[1+r_\\nu(z)] + \\Omega_k(1+z)^2 \\\\ &+ \\Omega_\\mathrm{DE}\\,(1+z)^{3(1+w_0+w_a)}\\,e^{-3w_a z/(1+z)} \\end{aligned}',
			says: 'The expansion rate, compared with today’s, follows from what fills space and how each part thins out.'
		},
		{
			tex: 't(z) = \\frac{1}{H_0}\\int_{z}^{\\infty} \\frac{\\mathrm{d}z^\\prime}{(1+z^\\prime)\\,E(z^\\prime)}',
			says: 'The age is all the time from the Big Bang until the light left.'
		},
		{
			tex: 'D_C = \\frac{c}{H_0}\\int_{0}^{z} \\frac{\\mathrm{d}z^\\prime}{E(z^\\prime)}',
			says: 'The distance now adds up the stretches that light crossed, each as long as it has since become.'
		},
		{
			tex: 'D_L = (1+z)\\,D_M, \\qquad D_A = \\frac{D_M}{1+z}',
			says: 'Brightness and apparent size give two further distances; none of them is the way the light travelled.'
		}
	],
	assumptions: COSMOLOGY_ASSUMPTIONS,
	warnings: COSMOLOGY_WARNINGS,
	sources: COSMOLOGY_SOURCES,
	checks: checksOf('cosmo.at_z'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({ cosmology, z }): Computed {
		const opened = universeWithPast(cosmology);
		if (!opened.ok) return opened;
		const { universe } = opened;
		const stopped = beyondTurnaround(universe, z, 'z');
		if (stopped) return stopped;
		const { values, withheld } = readingsAt(universe, z);
		return {
			ok: true,
			values,
			withheld,
			uncertainties: uncertaintiesAt(universe, cosmology, z),
			warnings: cosmologyWarnings(universe, z)
		};
	}
});

function readingsAt(universe: Universe, z: number) {
	const { H0, Om0, Tcmb0 } = universe.parameters;
	const { hubbleTimeGyr, hubbleDistanceMpc } = universe;
	const u = 1 + z;
	const E2 = universe.E2(u);
	const E = Math.sqrt(E2);
	const reach = reachOf(universe, Math.log1p(z));
	const comoving = reach.distance * hubbleDistanceMpc;
	const transverse = transverseOf(universe, reach.distance) * hubbleDistanceMpc;
	const angular = transverse / u;
	const lookback = reach.time * hubbleTimeGyr;
	const photons = (universe.Ogamma0 * u ** 4) / E2;

	const values: Record<string, number> = {
		age: reach.age * hubbleTimeGyr,
		lookback,
		light_travel_distance: lookback,
		comoving_distance: comoving,
		comoving_distance_Gly: comoving * GLY_PER_MPC,
		transverse,
		luminosity: transverse * u,
		angular,
		distmod: 5 * Math.log10(transverse * u) + 25,
		kpc_per_arcsec: angular * KPC_PER_ARCSEC,
		arcsec_per_kpc: 1 / (angular * KPC_PER_ARCSEC),
		comoving_volume: volumeOf(universe, reach.distance) * (hubbleDistanceMpc / 1000) ** 3,
		E,
		H: H0 * E,
		critical_density: universe.criticalDensity0 * E2,
		Tcmb: Tcmb0 * u,
		scale_factor: 1 / u,
		Om: (Om0 * u ** 3) / E2,
		Ode: universe.Ode0 === 0 ? 0 : (universe.Ode0 * universe.darkEnergyGrowth(u)) / E2,
		Ogamma: photons,
		Onu: photons * universe.neutrinoRatio(u),
		Ok: (universe.Ok0 * u * u) / E2,
		particle_horizon: reach.horizon * hubbleDistanceMpc,
		event_horizon: reach.future * hubbleDistanceMpc,
		hubble_radius: hubbleDistanceMpc / E,
		recession_now: reach.distance * LIGHT_KM_S,
		recession_then: (reach.distance * E * LIGHT_KM_S) / u,
		deceleration_q: universe.slope(u) - 1,
		hubble_time: hubbleTimeGyr,
		hubble_distance: hubbleDistanceMpc,
		Ode0: universe.Ode0,
		Onu0: universe.Onu0,
		Ogamma0: universe.Ogamma0,
		Ok0: universe.Ok0
	};

	const withheld: Record<string, Refusal> = {};
	const withhold = (keys: string[], code: string, message: string) => {
		for (const key of keys) {
			delete values[key];
			withheld[key] = { code, message };
		}
	};
	if (z === 0) {
		withhold(
			['distmod', 'arcsec_per_kpc'],
			'no-distance',
			'At redshift 0 there is no distance to speak of. Choose a redshift above 0.'
		);
	} else if (z < 0) {
		const seen = [
			'luminosity',
			'angular',
			'distmod',
			'kpc_per_arcsec',
			'arcsec_per_kpc',
			'comoving_volume'
		];
		withhold(
			seen,
			'not-seen-yet',
			'Nothing of the future can be seen yet. Choose a redshift above 0.'
		);
	} else if (transverse === 0) {
		withhold(
			['distmod', 'arcsec_per_kpc'],
			'no-distance',
			'The source lies exactly at the far side of this closed universe.'
		);
	}
	if (Tcmb0 === 0) {
		withhold(
			['Tcmb'],
			'no-background',
			'This universe has no radiation. Choose a set with a background temperature.'
		);
	}
	const tooOld = ageless(universe);
	if (tooOld) withhold(['age'], tooOld.refusal.code, tooOld.refusal.message);
	if (universe.earlyPower <= 2) {
		withhold(
			['particle_horizon'],
			'no-horizon',
			'In this universe light could have come from any distance. Give it some matter.'
		);
	}
	if (!universe.hasEventHorizon) {
		withhold(
			['event_horizon'],
			'no-horizon',
			'In this universe light sent out reaches every place in the end.'
		);
	}
	return { values, withheld };
}

/** What the publications state, or what follows from H₀ alone. The rest takes the whole fit: see `restsOnCosmology`. */
function uncertaintiesAt(
	universe: Universe,
	parameters: CosmologyParameters,
	z: number
): Record<string, Uncertainty> {
	const known: Record<string, Uncertainty> = { scale_factor: 'exact' };
	if (z === 0) {
		const zeroNow = [
			'lookback',
			'light_travel_distance',
			'comoving_distance',
			'comoving_distance_Gly',
			'transverse',
			'E'
		];
		for (const key of zeroNow) known[key] = 'exact';
	}
	const published =
		parameters.set === null ? null : constants.cosmologies[parameters.set].published;
	if (!published) return known;
	const relative = published.uncertainties.H0 / parameters.H0;
	known.hubble_time = relative * universe.hubbleTimeGyr;
	known.hubble_distance = relative * universe.hubbleDistanceMpc;
	if (z === 0) {
		known.age = published.ageUncertaintyGyr;
		known.H = published.uncertainties.H0;
		known.hubble_radius = relative * universe.hubbleDistanceMpc;
	}
	return known;
}
