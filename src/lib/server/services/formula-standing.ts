/** Who stands behind the formulas of a proof. Derived from the signatures each time; nothing stores it. */
import { and, eq, inArray } from 'drizzle-orm';
import type { WidgetDocument } from '../../widget/document.ts';
import { formulaDigest } from '../../widget/formula-definition.ts';
import type { FormulaStep } from '../../widget/formula-step.ts';
import type { Db } from '../db/client.ts';
import { vettings } from '../db/schema/index.ts';

/** What the vettings of formulas carry as their calculator; their revision is the formula's digest. */
export const FORMULA = 'formula';

export interface FormulaSigning {
	digest: string;
	personId: string;
	signedAt: Date;
	note: string;
}

export interface StandingFormula {
	formula: FormulaStep;
	digest: string;
	/** `counts`: not of someone who has become one of the proof's writers. */
	signings: (FormulaSigning & { counts: boolean })[];
	vetted: boolean;
}

/** Every signature on a formula of these documents that wasn't taken back, oldest first. */
export async function readFormulaSignings(
	db: Db,
	documents: readonly Pick<WidgetDocument, 'formulas'>[]
): Promise<FormulaSigning[]> {
	const digests = new Set(documents.flatMap(({ formulas }) => (formulas ?? []).map(formulaDigest)));
	if (digests.size === 0) return [];
	const rows = await db
		.select()
		.from(vettings)
		.where(and(eq(vettings.calculator, FORMULA), inArray(vettings.revision, [...digests])))
		.orderBy(vettings.seq);
	const last = new Map(rows.map((row) => [`${row.revision} ${row.personId}`, row]));
	return [...last.values()]
		.filter(({ state }) => state === 'vetted')
		.map(({ revision, personId, at, note }) => ({
			digest: revision,
			personId,
			signedAt: at,
			note
		}));
}

export function standingFormulas(
	{ formulas }: Pick<WidgetDocument, 'formulas'>,
	signings: readonly FormulaSigning[],
	writers: readonly string[]
): StandingFormula[] {
	return formulas.map((formula) => {
		const digest = formulaDigest(formula);
		const own = signings
			.filter((signing) => signing.digest === digest)
			.map((signing) => ({ ...signing, counts: !writers.includes(signing.personId) }));
		return { formula, digest, signings: own, vetted: own.some(({ counts }) => counts) };
	});
}
