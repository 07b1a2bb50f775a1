/** How well outputs are known when the inputs are exact: as well as a measured constant lets them. */

/** Standard uncertainty of a value that goes with the `power` of a constant of this relative uncertainty. */
export function dueTo(relative: number, value: number, power = 1): number {
	return Math.abs(value * power) * relative;
}
