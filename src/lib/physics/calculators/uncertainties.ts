/** How well outputs are known when the inputs are exact: wholly, or as well as a measured constant lets them. */
import type { Uncertainty } from '../calculator.ts';

/** Every value is exact: the formula holds no measured constant. */
export function exactly(values: Readonly<Record<string, unknown>>): Record<string, Uncertainty> {
	return Object.fromEntries(Object.keys(values).map((key) => [key, 'exact' as const]));
}

/** Standard uncertainty of a value that goes with the `power` of a constant of this relative uncertainty. */
export function dueTo(relative: number, value: number, power = 1): number {
	return Math.abs(value * power) * relative;
}
