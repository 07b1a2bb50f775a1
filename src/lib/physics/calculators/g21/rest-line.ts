/** Hydrogen's line at 21 cm, at rest, as the catalogue has it. */
import type { Source, WarningSpec } from '../../calculator.ts';
import { lineById } from '../../lines/catalogue.ts';

const line = lineById('hi-21cm');
if (!line) throw new Error('The line catalogue lacks hydrogen’s line at 21 cm.');

export const REST_MHZ = line.nativeValue;
export const REST_RELATIVE_UNCERTAINTY = line.relativeUncertainty;

export const G21_SOURCES: Source[] = [
	{
		title: line.source,
		locator: '1420.405 751 768 MHz; recalled, then matched in public transcriptions'
	},
	{
		title: 'Hogg 1999, Distance measures in cosmology',
		locator: 'eq. 1',
		url: 'https://arxiv.org/abs/astro-ph/9905116'
	}
];

export const G21_ASSUMPTIONS = [
	'The line at rest is at 1420.405 751 768 MHz.',
	'The redshift is the whole change of frequency.'
];

export const BLUESHIFT: WarningSpec = {
	code: 'above-rest',
	message:
		'Above 1420.4 megahertz the line would come from a source moving towards us, not from expansion.',
	when: 'frequency above that of the line at rest (redshift below 0)',
	validity: 'outside'
};
