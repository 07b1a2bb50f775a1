/** Where plain geometry ends: about redshift 0.1, past which the growth of space counts. */
import type { WarningSpec } from '../../calculator.ts';
import { convert } from '../../units/units.ts';

/** About the distance of redshift 0.1 in every published parameter set. */
export const EXPANSION_COUNTS_M = convert(430, 'Mpc', 'm');

export function tooFar(message: string): WarningSpec {
	return {
		code: 'space-grows',
		message,
		when: 'distance above 430 Mpc, about redshift 0.1',
		validity: 'outside'
	};
}
