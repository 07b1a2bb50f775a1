/** The values a control may take: from its lowest setting in whole steps, in decimal, without binary dust. */

export interface Grid {
	min: number;
	max: number;
	/** Greater than zero. */
	step: number;
}

/** The nearest value of the grid that lies in [min, max]. `value` must be finite. */
export function snapToGrid(value: number, grid: Grid): number {
	const { min, max, step } = grid;
	const steps = Math.round((Math.min(max, Math.max(min, value)) - min) / step);
	return onGrid(Math.min(steps, stepsToEnd(grid)), grid);
}

/** The highest value a reader can reach: `max` itself when whole steps lead to it. */
export function largestOnGrid(grid: Grid): number {
	return onGrid(stepsToEnd(grid), grid);
}

/** What is amiss with a slider whose ends or start no whole step leads to; '' when a reader can reach them all. */
export function gridProblem(grid: Grid, initial: number): string {
	const last = largestOnGrid(grid);
	if (last !== grid.max) {
		return `Steps of ${grid.step} from ${grid.min} lead to ${last}, not to ${grid.max}.`;
	}
	const near = snapToGrid(initial, grid);
	return near === initial
		? ''
		: `No whole step from ${grid.min} leads to ${initial}; the nearest is ${near}.`;
}

/** Decimal places that write every value of the grid in full. */
function gridDecimals({ min, step }: Grid): number {
	return Math.max(decimals(min), decimals(step));
}

function onGrid(steps: number, grid: Grid): number {
	return Number((grid.min + steps * grid.step).toFixed(gridDecimals(grid)));
}

function stepsToEnd({ min, max, step }: Grid): number {
	// (1 − 0.1) / 0.1 is a hair under 9 in binary; the hair is not a missing step.
	return Math.floor((max - min) / step + 1e-9);
}

function decimals(value: number): number {
	const [, fraction = '', exponent = '0'] =
		/^-?\d+(?:\.(\d+))?(?:e([+-]\d+))?$/.exec(String(value)) ?? [];
	return Math.min(100, Math.max(0, fraction.length - Number(exponent)));
}
