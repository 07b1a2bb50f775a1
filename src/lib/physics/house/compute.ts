/** How a house calculator computes, and how well its outputs are known through the constants they hold. */
import type { CheckedInputs, Computed, Uncertainty } from '../calculator.ts';
import type { BookEntry } from '../formula/book.ts';
import { namesIn, type FormulaTree } from '../formula/tree.ts';
import type { HouseDefinition } from './definition.ts';
import { engine, type Engine, type Outcome } from './engine.ts';

type Book = ReadonlyMap<string, BookEntry>;

/**
 * An output is exact where no measured constant enters it, carries the uncertainty of the one that does, and says “not
 * available” where several do: how those belong together isn't known here.
 */
export function houseCompute(
	definition: HouseDefinition,
	book: Book
): (inputs: CheckedInputs) => Computed {
	const values = new Map([...book].map(([name, { value }]) => [name, value]));
	const run = engine(definition, values);
	const held = measuredIn(definition, book);
	const single = new Set(held.flatMap((names) => (names.length === 1 ? names : [])));
	const shifted = new Map(
		[...single].map((name) => [name, shift(definition, values, book.get(name))])
	);
	const keys = definition.outputs.map(({ name }) => name);

	return (inputs) => {
		const outcome = run(inputs);
		if (!outcome.ok) return outcome;
		const moved = new Map(
			[...shifted].map(([name, { lower, higher }]) => [
				name,
				[lower(inputs), higher(inputs)] as const
			])
		);
		return {
			ok: true,
			values: Object.fromEntries(keys.map((key, at) => [key, outcome.outputs[at] as number])),
			uncertainties: Object.fromEntries(
				keys.map((key, at): [string, Uncertainty] => {
					const [name, ...others] = held[at] ?? [];
					if (name === undefined) return [key, 'exact'];
					const ends = others.length === 0 ? moved.get(name) : undefined;
					return [key, ends ? halfApart(ends, at) : 'not-available'];
				})
			),
			warnings: outcome.warnings
		};
	};
}

/** For each output the measured constants in its formula, or in what that needs. */
function measuredIn({ derived, outputs }: HouseDefinition, book: Book): string[][] {
	const through = new Map<string, ReadonlySet<string>>();
	const heldBy = (tree: FormulaTree): Set<string> =>
		new Set(
			namesIn(tree).flatMap((name) => {
				const entry = book.get(name);
				if (entry) return entry.uncertainty === 'exact' ? [] : [name];
				return [...(through.get(name) ?? [])];
			})
		);
	// Each stands after what it needs.
	for (const { name, tree } of derived) through.set(name, heldBy(tree));
	return outputs.map(({ tree }) => [...heldBy(tree)]);
}

/** The same calculator with one constant a standard uncertainty lower, and higher. */
function shift(
	definition: HouseDefinition,
	values: ReadonlyMap<string, number>,
	entry: BookEntry | undefined
): { lower: Engine; higher: Engine } {
	if (!entry || entry.uncertainty === 'exact')
		throw new Error('Only a measured constant is moved.');
	const { name, value, uncertainty } = entry;
	return {
		lower: engine(definition, new Map(values).set(name, value - uncertainty)),
		higher: engine(definition, new Map(values).set(name, value + uncertainty))
	};
}

function halfApart([lower, higher]: readonly [Outcome, Outcome], at: number): Uncertainty {
	if (!lower.ok || !higher.ok) return 'not-available';
	const half = Math.abs((higher.outputs[at] as number) - (lower.outputs[at] as number)) / 2;
	return Number.isFinite(half) ? half : 'not-available';
}
