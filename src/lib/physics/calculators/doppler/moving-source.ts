/** What the Doppler calculators share: light from a source that moves through space, by special relativity. */
import type { NumberInput, Source, WarningSpec } from '../../calculator.ts';
import { constants } from '../../constants/index.ts';
import { EINSTEIN_1905 } from '../sources.ts';

const { c } = constants.physical;

/** km/s */
export const LIGHT_SPEED_KMS = c.value / 1000;

export const DOPPLER_SOURCES: Source[] = [
	EINSTEIN_1905,
	{
		title: 'Hogg 1999, Distance measures in cosmology',
		locator: 'eq. 2',
		url: 'https://arxiv.org/abs/astro-ph/9905116'
	}
];

export const NOT_EXPANSION: WarningSpec = {
	code: 'not-expansion',
	message:
		'For a galaxy this far out the redshift is that of growing space, not of a speed. Take its recession speed from the expanding universe.',
	when: 'redshift above 0.01',
	validity: 'ok'
};

/** Speed as a share of that of light, in (−1, 1). */
export const speedShareInput: NumberInput = {
	kind: 'number',
	label: 'Speed away from us, as a share of that of light',
	symbol: 'β',
	quantity: 'speed-share',
	unit: '',
	min: -1,
	minExclusive: true,
	max: 1,
	maxExclusive: true,
	initial: 0.5
};

/** Redshift of a source that moves straight away (β > 0) or towards us: √((1+β)/(1−β)) − 1, stable for small β. */
export function radialRedshift(beta: number): number {
	return Math.expm1(Math.atanh(beta));
}
