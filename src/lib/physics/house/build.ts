/**
 * A settled house calculator as one of the calculators: same shape, same one way to run it. No parser is needed; a
 * reader's frame builds it from the definition that its piece pinned.
 */
import {
	defineCalculator,
	type Calculator,
	type NumberInput,
	type OutputSpec,
	type WarningSpec
} from '../calculator.ts';
import { constants, type ConstantsEdition } from '../constants/index.ts';
import { formulaBook, type BookEntry } from '../formula/book.ts';
import { formulaTex, nameTex } from '../formula/print.ts';
import { houseCompute } from './compute.ts';
import type { HouseDefinition, HouseInput, HouseOutput } from './definition.ts';

/** Builds a calculator that computes with the constants of an edition. */
export function buildHouseCalculator(
	definition: HouseDefinition,
	edition: ConstantsEdition = constants
): Calculator {
	const book = formulaBook(edition);
	return defineCalculator({
		id: definition.id,
		revision: definition.revision,
		title: definition.title,
		purpose: definition.purpose,
		asks: definition.asks,
		notFor: definition.notFor,
		inputs: Object.fromEntries(definition.inputs.map((input) => [input.name, inputSpec(input)])),
		outputs: Object.fromEntries(
			definition.outputs.map((output) => [output.name, outputSpec(output)])
		),
		equations: equationsOf(definition, book),
		assumptions: definition.assumptions,
		warnings: warningsOf(definition),
		...(definition.caution ? { caution: definition.caution } : {}),
		sources: definition.sources,
		checks: definition.checks.map((check) => ({
			...check,
			outputScale: 1,
			unit: definition.outputs.find(({ name }) => name === check.output)?.unit ?? ''
		})),
		history: definition.history,
		followsEdition: true,
		compute: computeIn(definition, edition)
	});
}

/** Each edition's constants are put into the formulas once. */
function computeIn(definition: HouseDefinition, own: ConstantsEdition): Calculator['compute'] {
	const made = new Map<string, ReturnType<typeof houseCompute>>();
	return (inputs, edition = own) => {
		let compute = made.get(edition.name);
		if (!compute)
			made.set(edition.name, (compute = houseCompute(definition, formulaBook(edition))));
		return compute(inputs);
	};
}

function inputSpec({ name, good, ...rest }: HouseInput): NumberInput {
	return {
		kind: 'number',
		symbol: name,
		...rest,
		...(good ? { good: { min: good.min, max: good.max, warning: pastZone(name) } } : {})
	};
}

function outputSpec({ name, label, quantity, unit }: HouseOutput): OutputSpec {
	return { label, symbol: name, quantity, unit };
}

/** The code of the warning past an input's good zone. */
function pastZone(name: string): string {
	return `past-${name}`;
}

function warningsOf({ inputs, conditions }: HouseDefinition): WarningSpec[] {
	const zones = inputs.flatMap(({ name, label, unit, good }): WarningSpec[] =>
		good
			? [
					{
						code: pastZone(name),
						message: good.message,
						when: `${label} outside ${good.min} to ${good.max}${unit ? ` ${unit}` : ''}`,
						validity: 'approximate'
					}
				]
			: []
	);
	const declared = conditions.flatMap(({ code, message, formula, effect }): WarningSpec[] =>
		effect === 'refuse' ? [] : [{ code, message, when: formula, validity: effect }]
	);
	return [...zones, ...declared];
}

function equationsOf(
	{ derived, outputs }: HouseDefinition,
	book: ReadonlyMap<string, BookEntry>
): { tex: string; says: string }[] {
	const texOf = (name: string) => book.get(name)?.tex ?? nameTex(name);
	return [...derived, ...outputs].map(({ name, label, tree }) => ({
		tex: `${texOf(name)} = ${formulaTex(tree, texOf)}`,
		says: label
	}));
}
