import type { NumberInput, Source } from '../../calculator.ts';

/** The Guide to the Expression of Uncertainty in Measurement, by clause. */
export function gum(locator: string): Source {
	return {
		title: 'JCGM 100:2008, Guide to the expression of uncertainty in measurement (GUM)',
		locator,
		url: 'https://www.bipm.org/en/committees/jc/jcgm/publications'
	};
}

/** A number whose unit is the asker's own business. */
export function plain(
	label: string,
	symbol: string,
	[min, max, initial]: [number, number, number]
): NumberInput {
	return { kind: 'number', label, symbol, quantity: 'number', unit: '', min, max, initial };
}

export const OWN_UNIT = 'Numbers keep whatever unit they were given in; give all in one unit.';
