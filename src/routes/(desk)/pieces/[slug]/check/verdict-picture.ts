/** The beam and the sentence of a claim's verdict, at the first settings. */
import { beamPicture, type BeamPicture } from '$lib/factcheck/beam.ts';
import { weighingOf } from '$lib/factcheck/claim-weighing.ts';
import { readsOnBeam, verdictSentence } from '$lib/factcheck/words.ts';
import type { CalculatorSet } from '$lib/physics/calculator.ts';
import type { Claim, WidgetDocument } from '$lib/widget/document.ts';
import { evaluate } from '$lib/widget/evaluate.ts';
import type { ClaimView } from '$lib/workflow/piece.ts';

export interface VerdictPicture {
	beam: BeamPicture | null;
	/** Beside the rider: “13.786 ± 0.020 billion years, −1.5 %”. */
	reads: string;
	says: string;
}

/** Null where there is nothing to weigh: the verdict's own reason is said instead. */
export function verdictPicture(
	document: WidgetDocument,
	claim: Claim,
	view: Pick<ClaimView, 'words' | 'verdict'>,
	calculators: CalculatorSet
): VerdictPicture | null {
	const weighing = weighingOf(
		document,
		evaluate(document, {}, calculators),
		claim,
		view.words,
		calculators
	);
	if (!weighing) return null;
	const { stated, reading } = weighing;
	return {
		beam: beamPicture(stated, reading),
		reads: readsOnBeam(stated, reading),
		says: verdictSentence(stated, reading, view.verdict, 'office', view.words)
	};
}
