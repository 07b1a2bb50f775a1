/** What `cosmo.at_z` gives, in the order a writer meets it. Keys and units are public. */
import type { OutputSpec } from '../../calculator.ts';

const share = (label: string, symbol: string): OutputSpec => ({
	label,
	symbol,
	quantity: 'density-share',
	unit: ''
});

export const atZOutputs = {
	age: { label: 'Age after the Big Bang', symbol: 't', quantity: 'age', unit: 'Gyr' },
	lookback: {
		label: 'Time since the light left',
		symbol: 't_L',
		quantity: 'lookback-time',
		unit: 'Gyr'
	},
	light_travel_distance: {
		label: 'Distance the light travelled',
		quantity: 'light-travel-distance',
		unit: 'Gly'
	},
	comoving_distance: {
		label: 'Distance now (comoving)',
		symbol: 'D_C',
		quantity: 'comoving-distance',
		unit: 'Mpc'
	},
	comoving_distance_Gly: {
		label: 'Distance now (comoving), in light years',
		symbol: 'D_C',
		quantity: 'comoving-distance',
		unit: 'Gly'
	},
	transverse: {
		label: 'Transverse comoving distance',
		symbol: 'D_M',
		quantity: 'transverse-distance',
		unit: 'Mpc'
	},
	luminosity: {
		label: 'Luminosity distance',
		symbol: 'D_L',
		quantity: 'luminosity-distance',
		unit: 'Mpc'
	},
	angular: {
		label: 'Distance when the light left (angular-diameter)',
		symbol: 'D_A',
		quantity: 'angular-diameter-distance',
		unit: 'Mpc'
	},
	distmod: { label: 'Distance modulus', symbol: 'μ', quantity: 'distance-modulus', unit: 'mag' },
	kpc_per_arcsec: {
		label: 'Length seen under one arcsecond',
		quantity: 'length-per-angle',
		unit: 'kpc/arcsec'
	},
	arcsec_per_kpc: {
		label: 'Angle that one kiloparsec covers',
		quantity: 'angle-per-length',
		unit: 'arcsec/kpc'
	},
	comoving_volume: {
		label: 'Volume now within this distance',
		symbol: 'V_C',
		quantity: 'volume',
		unit: 'Gpc3'
	},
	E: { label: 'Expansion rate compared with now', symbol: 'E', quantity: 'ratio', unit: '' },
	H: { label: 'Expansion rate', symbol: 'H', quantity: 'expansion-rate', unit: 'km/s/Mpc' },
	critical_density: {
		label: 'Critical density',
		symbol: 'ρ_c',
		quantity: 'density',
		unit: 'kg/m3'
	},
	Tcmb: {
		label: 'Temperature of the cosmic background',
		symbol: 'T',
		quantity: 'temperature',
		unit: 'K'
	},
	scale_factor: {
		label: 'Size of space compared with now',
		symbol: 'a',
		quantity: 'scale-factor',
		unit: ''
	},
	Om: share('Share of matter then', 'Ωₘ'),
	Ode: share('Share of dark energy then', 'Ω_DE'),
	Ogamma: share('Share of photons then', 'Ω_γ'),
	Onu: share('Share of neutrinos then', 'Ω_ν'),
	Ok: share('Curvature then', 'Ωₖ'),
	particle_horizon: {
		label: 'Farthest light could have come from (comoving)',
		quantity: 'horizon-distance',
		unit: 'Mpc'
	},
	event_horizon: {
		label: 'Farthest that light sent then will reach (comoving)',
		quantity: 'horizon-distance',
		unit: 'Mpc'
	},
	hubble_radius: { label: 'Hubble radius', quantity: 'hubble-distance', unit: 'Mpc' },
	recession_now: { label: 'Recession speed now', quantity: 'recession-speed', unit: 'km/s' },
	recession_then: {
		label: 'Recession speed when the light left',
		quantity: 'recession-speed',
		unit: 'km/s'
	},
	deceleration_q: { label: 'Deceleration', symbol: 'q', quantity: 'deceleration', unit: '' },
	hubble_time: { label: 'Hubble time now', symbol: 't_H', quantity: 'hubble-time', unit: 'Gyr' },
	hubble_distance: {
		label: 'Hubble distance now',
		symbol: 'D_H',
		quantity: 'hubble-distance',
		unit: 'Mpc'
	},
	Ode0: share('Share of dark energy now', 'Ω_DE'),
	Onu0: share('Share of neutrinos now', 'Ω_ν'),
	Ogamma0: share('Share of photons now', 'Ω_γ'),
	Ok0: share('Curvature now', 'Ωₖ')
} satisfies Record<string, OutputSpec>;
