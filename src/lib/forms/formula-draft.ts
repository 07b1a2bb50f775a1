/**
 * A formula as it stands in the bench's form, however unfinished: empty number fields are null. The schema keeps sizes and
 * kinds; what is missing or wrong is told by the service that reads it, each by its path in here.
 */
import { z } from 'zod';
import type { Result } from '../physics/calculator.ts';
import type { HouseProblem } from '../physics/house/definition.ts';
import { QUANTITY_KINDS, type QuantityKind } from '../physics/units/quantities.ts';
import type { FormulaStep } from '../widget/document.ts';

const id = z.string().regex(/^[a-z][a-z0-9-]{0,39}$/);
const number = z.number().nullable();
const quantity = z.enum(Object.keys(QUANTITY_KINDS) as [QuantityKind, ...QuantityKind[]], {
	error: 'Choose what it is a measure of.'
});
const text = (longest: number) =>
	z.string().max(longest, `Keep it under ${longest} characters.`).trim();

export const FormulaDraft = z.object({
	id,
	title: text(120),
	purpose: text(240),
	inputs: z
		.array(
			z.object({
				name: text(100),
				label: text(80),
				quantity,
				unit: text(20),
				min: number,
				max: number,
				initial: number
			})
		)
		.max(8, '8 inputs at most.'),
	output: z.object({ label: text(80), quantity, unit: text(20) }),
	/** Of any length: the limit is told with its place and its mend, like every other problem of a formula. */
	formula: z.string(),
	checks: z
		.array(
			z.object({
				id,
				inputs: z.record(z.string().max(100), number),
				published: number,
				tolerance: number,
				source: text(240)
			})
		)
		.max(12, '12 check values at most.')
});
export type FormulaDraft = z.infer<typeof FormulaDraft>;

/** What the house says of a draft at this moment. */
export interface FormulaAnswer {
	/** With its tree, ready for the document; null while something in it must be mended first. */
	formula: FormulaStep | null;
	/** What steps pin; null as `formula`. */
	revision: string | null;
	problems: HouseProblem[];
	/** For each check value what the formula gives, null where it refuses; null for one that is unfinished. */
	checks: ({ got: number | null; unit: string; agrees: boolean; says: string } | null)[];
	/** The run at the first values of all inputs; null as long as it can't be worked. */
	preview: Result | null;
	/** Already set; `html` is null where it is too long to be shown. */
	equation: { html: string | null; says: string } | null;
}
