/** A document frozen whole: what a proof, and later a release, is. The digest is over all a reader can meet. */
import type { CalculatorSet } from '../physics/calculator.ts';
import { benchSet } from './bench-set.ts';
import { digestOf } from './canonical.ts';
import type { WidgetDocument } from './document.ts';
import { evaluate, type Evaluation } from './evaluate.ts';

export { canonicalJson, digestOf } from './canonical.ts';

export interface Frozen {
	document: WidgetDocument;
	/** The revisions the readings were worked with, by id. */
	calculators: { id: string; revision: string }[];
	/** The constants edition. */
	constants: string;
	/** Readings at the first settings. */
	evaluation: Evaluation;
	/** SHA-256 of the canonical JSON of everything above, in hex. */
	digest: string;
}

export function freeze(document: WidgetDocument, house: CalculatorSet): Frozen {
	const calculators = benchSet(document, house);
	const used = [...new Set(document.steps.map(({ calculator }) => calculator))].sort();
	const body = {
		document,
		calculators: used.map((id) => ({ id, revision: calculators.get(id)?.revision ?? '' })),
		constants: document.constants,
		evaluation: evaluate(document, {}, calculators)
	};
	return { ...body, digest: digestOf(body) };
}
