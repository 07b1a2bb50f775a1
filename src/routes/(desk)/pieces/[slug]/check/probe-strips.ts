/** How the sentence of a number that moves fares along each slider that reaches it. */
import { weighingOf } from '$lib/factcheck/claim-weighing.ts';
import { settingsOf } from '$lib/factcheck/trials.ts';
import type { VerdictName } from '$lib/factcheck/verdict.ts';
import { weigh } from '$lib/factcheck/weigh.ts';
import type { CalculatorSet } from '$lib/physics/calculator.ts';
import type { Claim, Control, WidgetDocument } from '$lib/widget/document.ts';
import { evaluate } from '$lib/widget/evaluate.ts';
import { claimPlaces, settingWords, wordsAt } from '$lib/widget/places.ts';

export interface Probe {
	setting: string;
	sentence: string;
	verdict: VerdictName;
	/** The setting a reader meets first. */
	first: boolean;
}

export interface Strip {
	/** The slider's label. */
	label: string;
	probes: Probe[];
}

export function stripsOf(
	document: WidgetDocument,
	claim: Claim,
	controls: readonly string[],
	calculators: CalculatorSet
): Strip[] {
	return document.controls
		.filter(({ id }) => controls.includes(id))
		.map((control) => ({
			label: control.label,
			probes: settingsOf(control).map((value) =>
				probeAt(document, claim, control, value, calculators)
			)
		}));
}

function probeAt(
	document: WidgetDocument,
	claim: Claim,
	control: Control,
	value: number,
	calculators: CalculatorSet
): Probe {
	const evaluation = evaluate(document, { [control.id]: value }, calculators);
	const weighing = weighingOf(document, evaluation, claim, '', calculators);
	const place = claimPlaces(document, wordsAt(document, evaluation, calculators)).find(
		(each) => each.claim.id === claim.id
	);
	return {
		setting: settingWords(document, evaluation, control.id),
		sentence: place?.sentence ?? '',
		verdict: weighing
			? weigh(weighing.stated, weighing.reading, document.language).verdict
			: 'unweighed',
		first: value === control.initial
	};
}
