/** The beam and the sentence of a claim's verdict, at the setting it comes from. */
import { beamPicture, type BeamPicture } from '$lib/factcheck/beam.ts';
import { weighingOf } from '$lib/factcheck/claim-weighing.ts';
import { readsOnBeam, verdictSentence } from '$lib/factcheck/words.ts';
import type { CalculatorSet } from '$lib/physics/calculator.ts';
import type { Claim, WidgetDocument } from '$lib/widget/document.ts';
import { evaluate } from '$lib/widget/evaluate.ts';
import { printStated } from '$lib/widget/stated.ts';
import type { ClaimView } from '$lib/workflow/piece.ts';
import type { WeighedSetting } from './weighed-setting.ts';

export interface VerdictPicture {
	beam: BeamPicture | null;
	/** The claim as it is printed there. */
	words: string;
	/** Beside the rider: “13.786 ± 0.020 billion years, −1.5 %”. */
	reads: string;
	says: string;
}

/** Null where there is nothing to weigh: the verdict's own reason is said instead. */
export function verdictPicture(
	document: WidgetDocument,
	claim: Claim,
	view: Pick<ClaimView, 'words' | 'verdict'>,
	setting: WeighedSetting,
	calculators: CalculatorSet
): VerdictPicture | null {
	const weighing = weighingOf(
		document,
		evaluate(document, setting.values, calculators),
		claim,
		view.words,
		calculators
	);
	if (!weighing) return null;
	const { stated, reading } = weighing;
	const words = claim.form === 'live' ? printStated(stated, document.language) : view.words;
	return {
		words,
		beam: beamPicture(stated, reading),
		reads: readsOnBeam(stated, reading, document.language),
		says: verdictSentence(stated, reading, view.verdict, 'office', words, document.language)
	};
}
