/** The setting a verdict comes from: where the sliders start, or where the number fares worst. */
import { weighingOf } from '$lib/factcheck/claim-weighing.ts';
import { tryThroughout, type Trial } from '$lib/factcheck/trials.ts';
import type { Verdict } from '$lib/factcheck/verdict.ts';
import { weigh } from '$lib/factcheck/weigh.ts';
import type { CalculatorSet } from '$lib/physics/calculator.ts';
import type { Claim, ControlValues, WidgetDocument } from '$lib/widget/document.ts';
import { evaluate } from '$lib/widget/evaluate.ts';
import type { ClaimView } from '$lib/workflow/piece.ts';

export interface WeighedSetting {
	values: ControlValues;
	/** “500 million years”; null where the sliders start. */
	words: string | null;
}

export const AT_START: WeighedSetting = { values: {}, words: null };

/** The first setting at which weighing gives this very verdict; where none does, the one readers meet first. */
export function weighedSetting(
	document: WidgetDocument,
	claim: Claim,
	{ words, verdict }: Pick<ClaimView, 'words' | 'verdict'>,
	calculators: CalculatorSet
): WeighedSetting {
	if (claim.form === 'exempt') return AT_START;
	const weighAt = (values: ControlValues): Verdict | null => {
		const evaluation = evaluate(document, values, calculators);
		const weighing = weighingOf(document, evaluation, claim, words, calculators);
		return weighing && weigh(weighing.stated, weighing.reading, document.language);
	};
	const gives = (found: Pick<Verdict, 'verdict' | 'departurePercent'> | null) =>
		found?.verdict === verdict.verdict && found.departurePercent === verdict.departurePercent;
	if (gives(weighAt({}))) return AT_START;

	const tried: ControlValues[] = [];
	const trials: Trial[] = tryThroughout(document, claim.reading, (values) => {
		tried.push(values);
		return weighAt(values) ?? { ...verdict, verdict: 'unweighed', departurePercent: null };
	});
	const index = trials.findIndex(({ decision }) => gives(decision));
	const values = tried[index];
	return values ? { values, words: trials[index]?.setting ?? null } : AT_START;
}
