/** The catalogue: every calculator by its public id. A new calculator is its file and one line here. */
import type { Calculator, CalculatorSet } from '../calculator.ts';
import { ageDiff } from './cosmology/age-diff.ts';
import { atZ } from './cosmology/at-z.ts';
import { inverse } from './cosmology/inverse.ts';
import { omegaNu } from './cosmology/omega-nu.ts';
import { convert } from './energy/convert.ts';
import { counterweight } from './energy/counterweight.ts';
import { drop } from './energy/drop.ts';
import { frequencyFromZ } from './g21/frequency-from-z.ts';
import { zFromFrequency } from './g21/z-from-frequency.ts';
import { band } from './line/band.ts';
import { observe } from './line/observe.ts';
import { redshift } from './line/redshift.ts';
import { vacuum } from './projectile/vacuum.ts';

const calculators: Calculator[] = [
	observe,
	redshift,
	band,
	frequencyFromZ,
	zFromFrequency,
	atZ,
	inverse,
	ageDiff,
	omegaNu,
	drop,
	counterweight,
	vacuum,
	convert
];

export const catalogue: CalculatorSet = new Map(
	calculators.map((calculator) => [calculator.id, calculator])
);
