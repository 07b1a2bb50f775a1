/**
 * A formula that a writer adds to one widget: a small calculator of one output that lives in the document. It is held to
 * the rules of a house calculator: the server parses it when it is kept, its dimensions fit, its check values agree, and
 * a scientist who didn't write it vets it before the piece goes to press. Only its tree is ever worked.
 */
import { z } from 'zod';
import { isFormulaTree, type FormulaTree } from '../physics/formula/tree.ts';
import { QUANTITY_KINDS, type QuantityKind } from '../physics/units/quantities.ts';
import { finite, Id, UnitSymbol } from './references.ts';

const Name = z
	.string()
	.regex(/^[A-Za-z][A-Za-z0-9_]{0,31}$/, 'A name is a letter, then letters, digits or _.');
const quantity = z.enum(Object.keys(QUANTITY_KINDS) as [QuantityKind, ...QuantityKind[]]);

export const FormulaStep = z.strictObject({
	id: Id,
	title: z.string().max(120),
	/** What it works out, in one sentence. */
	purpose: z.string().max(240),
	inputs: z
		.array(
			z.strictObject({
				name: Name,
				label: z.string().max(80),
				quantity,
				unit: UnitSymbol,
				min: finite,
				max: finite,
				initial: finite
			})
		)
		.min(1)
		.max(8),
	output: z.strictObject({ label: z.string().max(80), quantity, unit: UnitSymbol }),
	/** As written; works in coherent SI units. */
	formula: z.string().min(1).max(2048),
	/** The same, parsed. */
	tree: z.custom<FormulaTree>(isFormulaTree, 'This formula has to be read by the house first.'),
	checks: z
		.array(
			z.strictObject({
				id: Id,
				inputs: z.record(Name, finite),
				/** In the output's unit. */
				published: finite,
				tolerance: finite.nonnegative(),
				source: z.string().min(1).max(240)
			})
		)
		.max(12)
});
export type FormulaStep = z.infer<typeof FormulaStep>;
