/** A released piece as plain sentences at its first settings, and what its numbers rest on. */
import { weighingOf } from '$lib/factcheck/claim-weighing.ts';
import { readsInWords } from '$lib/factcheck/words.ts';
import type { CalculatorSet } from '$lib/physics/calculator.ts';
import { isTextBlock, type TextBlock, type WidgetDocument } from '$lib/widget/document.ts';
import { evaluate } from '$lib/widget/evaluate.ts';
import { blockText, claimPlaces, settingStated, wordsAt } from '$lib/widget/places.ts';
import { printStated } from '$lib/widget/stated.ts';

export interface CopyPart {
	id: string;
	kind: TextBlock['kind'] | 'setting' | 'chart';
	text: string;
	title?: string;
	source?: string;
}

export function reading(document: WidgetDocument, calculators: CalculatorSet): CopyPart[] {
	const evaluation = evaluate(document, {}, calculators);
	const words = wordsAt(document, evaluation, calculators);
	return document.blocks.flatMap((block): CopyPart[] => {
		if (isTextBlock(block))
			return [{ id: block.id, kind: block.kind, text: blockText(block, words) }];
		if (block.kind === 'chart') {
			const { id, title, description, source } = block;
			return [{ id, kind: 'chart', text: description, title, source }];
		}
		const control = document.controls.find(({ id }) => id === block.control);
		const stated = control && settingStated(document, evaluation, control.id);
		return control && stated
			? [{ id: block.id, kind: 'setting', text: `${control.label}: ${printStated(stated)}.` }]
			: [];
	});
}

/** What the calculator reads for each claim, in the unit the copy uses, by claim id. */
export function readings(
	document: WidgetDocument,
	calculators: CalculatorSet
): Map<string, string> {
	const evaluation = evaluate(document, {}, calculators);
	return new Map(
		claimPlaces(document, wordsAt(document, evaluation, calculators)).flatMap(
			({ claim, words }) => {
				const weighing = weighingOf(document, evaluation, claim, words, calculators);
				return weighing
					? [[claim.id, readsInWords(weighing.stated, weighing.reading)] as const]
					: [];
			}
		)
	);
}

/** The calculators a piece runs on, in the order they hang on its bench. */
export function calculatorsOf(
	document: WidgetDocument,
	calculators: CalculatorSet
): { title: string; revision: string }[] {
	const ids = [...new Set(document.steps.map(({ calculator }) => calculator))];
	return ids.flatMap((id) => {
		const calculator = calculators.get(id);
		return calculator ? [{ title: calculator.title, revision: calculator.revision }] : [];
	});
}
