/**
 * What a number is a measure of. Two numbers with one unit may still be different things: a radius is no diameter, an
 * age is no look-back time. `unit` is the coherent unit that fixes the dimension; `mistakenFor` lists the kinds that
 * copy most often swaps with this one.
 */
export interface QuantityRow {
	label: string;
	unit: string;
	mistakenFor?: readonly string[];
}

export const QUANTITY_KINDS = {
	number: { label: 'pure number', unit: '' },
	ratio: { label: 'ratio', unit: '' },
	fraction: { label: 'fraction', unit: '' },
	efficiency: { label: 'efficiency', unit: '' },
	text: { label: 'name', unit: '' },

	redshift: { label: 'redshift', unit: '', mistakenFor: ['stretch', 'ratio'] },
	stretch: { label: 'stretch of waves', unit: 'times', mistakenFor: ['redshift'] },
	'scale-factor': { label: 'size of space compared with now', unit: '' },
	'density-share': { label: 'share of the critical density', unit: '' },
	'density-ratio': { label: 'density compared with another', unit: '' },
	deceleration: { label: 'deceleration parameter', unit: '' },

	length: { label: 'length', unit: 'm' },
	height: { label: 'height', unit: 'm' },
	drop: { label: 'drop of the centre of mass', unit: 'm', mistakenFor: ['height'] },
	range: { label: 'distance along the ground', unit: 'm', mistakenFor: ['height'] },
	radius: { label: 'radius', unit: 'm', mistakenFor: ['diameter'] },
	diameter: { label: 'diameter', unit: 'm', mistakenFor: ['radius'] },
	wavelength: { label: 'wavelength', unit: 'm' },
	distance: { label: 'distance', unit: 'm' },
	'comoving-distance': {
		label: 'distance now (comoving)',
		unit: 'm',
		mistakenFor: [
			'light-travel-distance',
			'luminosity-distance',
			'angular-diameter-distance',
			'horizon-distance'
		]
	},
	'transverse-distance': {
		label: 'transverse comoving distance',
		unit: 'm',
		mistakenFor: ['comoving-distance']
	},
	'luminosity-distance': {
		label: 'luminosity distance',
		unit: 'm',
		mistakenFor: ['comoving-distance', 'light-travel-distance']
	},
	'angular-diameter-distance': {
		label: 'angular-diameter distance',
		unit: 'm',
		mistakenFor: ['comoving-distance', 'light-travel-distance']
	},
	'light-travel-distance': {
		label: 'distance light has travelled',
		unit: 'm',
		mistakenFor: ['comoving-distance', 'luminosity-distance']
	},
	'horizon-distance': {
		label: 'distance to a horizon',
		unit: 'm',
		mistakenFor: ['comoving-distance', 'diameter']
	},
	'hubble-distance': { label: 'Hubble distance', unit: 'm', mistakenFor: ['horizon-distance'] },

	time: { label: 'time', unit: 's' },
	duration: { label: 'duration', unit: 's' },
	age: { label: 'age after the Big Bang', unit: 's', mistakenFor: ['lookback-time'] },
	'lookback-time': { label: 'time before now', unit: 's', mistakenFor: ['age'] },
	'hubble-time': { label: 'Hubble time', unit: 's', mistakenFor: ['age'] },

	frequency: { label: 'frequency', unit: 'Hz' },
	'expansion-rate': { label: 'expansion rate', unit: 'km/s/Mpc', mistakenFor: ['speed'] },
	energy: { label: 'energy', unit: 'J', mistakenFor: ['power'] },
	'photon-energy': { label: 'energy of one photon', unit: 'eV' },
	power: { label: 'power', unit: 'W', mistakenFor: ['energy'] },
	mass: { label: 'mass', unit: 'kg', mistakenFor: ['force'] },
	force: { label: 'force', unit: 'N', mistakenFor: ['mass'] },
	pressure: { label: 'pressure', unit: 'Pa' },
	speed: { label: 'speed', unit: 'm/s' },
	'recession-speed': { label: 'recession speed', unit: 'm/s', mistakenFor: ['speed'] },
	acceleration: { label: 'acceleration', unit: 'm/s2' },
	temperature: { label: 'temperature', unit: 'K' },
	'temperature-difference': {
		label: 'temperature difference',
		unit: 'K',
		mistakenFor: ['temperature']
	},
	'gas-temperature': {
		label: 'temperature of the gas',
		unit: 'K',
		mistakenFor: ['spin-temperature', 'background-temperature', 'temperature-difference']
	},
	'spin-temperature': {
		label: 'spin temperature of hydrogen',
		unit: 'K',
		mistakenFor: ['gas-temperature']
	},
	'background-temperature': {
		label: 'temperature of the background',
		unit: 'K',
		mistakenFor: ['gas-temperature']
	},
	coupling: { label: 'strength of coupling', unit: '' },
	'optical-depth': { label: 'optical depth', unit: '' },
	'ionised-fraction': { label: 'share of the hydrogen that is ionised', unit: '' },
	'rate-coefficient': { label: 'rate coefficient', unit: 'cm3/s' },
	'photon-intensity': { label: 'stream of photons', unit: '1/(cm2 s Hz sr)' },
	bandwidth: { label: 'width of a band of frequencies', unit: 'Hz', mistakenFor: ['frequency'] },
	angle: { label: 'angle', unit: 'rad' },
	area: { label: 'area', unit: 'm2' },
	density: { label: 'density', unit: 'kg/m3' },
	volume: { label: 'volume', unit: 'm3' },
	magnitude: { label: 'magnitude', unit: 'mag' },
	'distance-modulus': { label: 'distance modulus', unit: 'mag', mistakenFor: ['magnitude'] },
	'length-per-angle': { label: 'length seen under an angle', unit: 'kpc/arcsec' },
	'angle-per-length': { label: 'angle that a length covers', unit: 'arcsec/kpc' },
	'neutrino-mass': { label: 'mass of a neutrino', unit: 'eV' },

	'speed-share': {
		label: 'speed as a share of that of light',
		unit: '',
		mistakenFor: ['redshift']
	},
	'lorentz-factor': { label: 'Lorentz factor', unit: '' },
	rapidity: { label: 'rapidity', unit: '' },
	momentum: { label: 'momentum', unit: 'kg m/s' },
	refractivity: { label: 'refractive index less one', unit: '' },
	'radiance-by-wavelength': { label: 'radiance for each length of wave', unit: 'W m-3 sr-1' },
	'radiance-by-frequency': { label: 'radiance for each hertz', unit: 'W m-2 Hz-1 sr-1' },
	irradiance: { label: 'power through each square metre', unit: 'W/m2', mistakenFor: ['power'] },
	luminosity: { label: 'power given off as light', unit: 'W', mistakenFor: ['irradiance'] },
	'number-density': { label: 'number in each cubic metre', unit: 'm-3', mistakenFor: ['density'] },
	'energy-density': { label: 'energy in each cubic metre', unit: 'J/m3' },
	'solid-angle': { label: 'patch of sky', unit: 'sr', mistakenFor: ['angle'] },
	parallax: { label: 'parallax', unit: 'rad' },
	activity: { label: 'decays in each second', unit: 'Bq' },
	'spring-constant': { label: 'stiffness of a spring', unit: 'N/m' },
	strain: { label: 'strain of a gravitational wave', unit: '' }
} as const satisfies Record<string, QuantityRow>;

export type QuantityKind = keyof typeof QUANTITY_KINDS;
