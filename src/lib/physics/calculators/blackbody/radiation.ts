/** What the black-body calculators share: temperature, hc/k, and the words about what no formula here can know. */
import type { NumberInput, Source, WarningSpec } from '../../calculator.ts';
import { constants } from '../../constants/index.ts';
import { codata2018 } from '../sources.ts';

const { h, c, k } = constants.physical;

/** hc/k in nm K: divided by a wavelength and a temperature it is hν/kT. */
export const HC_OVER_K_NM = ((h.value * c.value) / k.value) * 1e9;

export const temperatureInput: NumberInput = {
	kind: 'number',
	label: 'Temperature',
	symbol: 'T',
	quantity: 'temperature',
	unit: 'K',
	min: 1e-3,
	max: 1e12,
	initial: 5772,
	log: true
};

export const PLANCK_SOURCES: Source[] = [
	{
		title:
			'Planck 1900, Zur Theorie des Gesetzes der Energieverteilung im Normalspectrum, Verh. Dtsch. Phys. Ges. 2, 237',
		fromMemory: true
	},
	codata2018('h, c and k, exact by the SI')
];

export const BLACK_BODY_ASSUMPTIONS = [
	'A black body: it takes in all light that meets it, and shines by its temperature alone.',
	'The temperature is the same all over.'
];

export const NOT_BLACK: WarningSpec = {
	code: 'not-black',
	message: 'Real stars and hot things are not black bodies; their light departs from this curve.',
	when: 'always',
	validity: 'ok'
};
