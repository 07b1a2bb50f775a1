/** What is wrong with a formula, where, and how to mend it. */
export interface FormulaProblem {
	/** The stretch of the source it is about, in UTF-16 units. */
	at: { from: number; to: number };
	code: string;
	says: string;
	mend: string;
}

export interface Span {
	from: number;
	to: number;
}

/** Thrown and caught inside this folder only: a formula is refused at the first thing that is wrong with it. */
export class FormulaRefused extends Error {
	readonly problem: FormulaProblem;
	constructor(at: Span, code: string, says: string, mend: string) {
		super(says);
		this.problem = { at: { from: at.from, to: at.to }, code, says, mend };
	}
}

/** A word from a source, short enough for a sentence. */
export function quoted(text: string): string {
	return `“${text.length > 40 ? `${text.slice(0, 39)}…` : text}”`;
}
