/** Words that windows which are gone have left in this browser: back into the sheet, and on to the server. */
import type { CalculatorSet } from '../physics/calculator.ts';
import { same } from '../widget/merge-parts.ts';
import { parseDocument } from '../widget/parse.ts';
import type { Autosave } from './autosave.svelte.ts';
import { readableDocument } from './convert.ts';
import type { Sheet, Together } from './keep-together.svelte.ts';
import type { PatientJournal } from './patient-journal.svelte.ts';

export interface LeftParts {
	keeper: Pick<Autosave, 'goOnFrom' | 'flushJournal'>;
	together: Pick<Together, 'takeIn'>;
	journal: PatientJournal;
	sheet: Pick<Sheet, 'rewrite'>;
	calculators: CalculatorSet;
	/** What the server has. */
	kept: unknown;
	/** Whose desk it is. */
	person: { personId: string; name: string };
}

/** Brings back what was left; true when there was anything. Nothing leaves the journal before it is in it anew. */
export async function bringBackLeft(parts: LeftParts): Promise<boolean> {
	const { keeper, together, journal, sheet, calculators, kept, person } = parts;
	let isBack = false;
	for (const left of await journal.read()) {
		const parsed = parseDocument(left.document, calculators);
		// Words come back even where they don't hang together: the server says what to mend.
		const document = parsed.ok ? parsed.document : readableDocument(left.document);
		if (!document) await journal.setAside(left);
		else if (!same(document, kept)) {
			if (!isBack) {
				keeper.goOnFrom(left);
				sheet.rewrite(document);
				isBack = true;
			} else {
				// Another window's: merged in as someone else's would be.
				const { baseVersion: version, base, at: savedAt } = left;
				const taken = together.takeIn(base ?? null, {
					version,
					savedAt,
					savedBy: person,
					document
				});
				if (taken !== 'taken') await journal.setAside(left);
			}
			await keeper.flushJournal();
		}
		if (journal.works) await journal.letGo(left);
	}
	return isBack;
}
