/** The software's calculators and a house's own, side by side. */
import type { Calculator, CalculatorSet } from '../calculator.ts';
import { catalogue } from '../calculators/index.ts';
import { buildHouseCalculator } from './build.ts';
import type { HouseDefinition } from './definition.ts';

export function withHouse(definitions: readonly HouseDefinition[]): CalculatorSet {
	if (definitions.length === 0) return catalogue;
	return new Map([
		...catalogue,
		...definitions.map((definition): [string, Calculator] => [
			definition.id,
			buildHouseCalculator(definition)
		])
	]);
}
