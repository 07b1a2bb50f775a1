/**
 * What the public page says of a release, worked out when it is made and kept with it: words, readings, verdicts and
 * names as they were then. Calculators go on changing; what was stated stays as it was stated.
 */
import { reservedHeight } from '../../embed-snippet.ts';
import { weighingOf } from '../../factcheck/claim-weighing.ts';
import { judgeClaims } from '../../factcheck/judge.ts';
import type { VerdictName } from '../../factcheck/verdict.ts';
import { readsInWords } from '../../factcheck/words.ts';
import type { CalculatorSet } from '../../physics/calculator.ts';
import type { ClaimRecord, ClaimRecords } from '../../renderer/records.ts';
import { isTextBlock, type TextBlock, type WidgetDocument } from '../../widget/document.ts';
import { benchSet } from '../../widget/bench-set.ts';
import { evaluate, type Evaluation } from '../../widget/evaluate.ts';
import { isFormulaId } from '../../widget/formula-id.ts';
import { blockText, claimPlaces, settingWords, wordsAt, type Words } from '../../widget/places.ts';

/** One part of the piece as plain text, at its first settings. */
export interface CopyPart {
	id: string;
	kind: TextBlock['kind'] | 'setting' | 'chart';
	text: string;
	title?: string;
	source?: string;
}

export interface CheckedNumber {
	/** The claim's id. */
	id: string;
	label: string;
	words: string;
	/** The reading in the copy's unit; '' where there is none. */
	reads: string;
	verdict: VerdictName;
	departurePercent: number | null;
	checkedBy: ClaimRecord['checkedBy'];
}

/** People by name: a reader has no use for our ids. */
export interface Makers {
	writers: string[];
	checkers: string[];
	/** Who passed it. */
	editor: string;
}

/** Plain JSON. */
export interface PublicAccount {
	title: string;
	point: string;
	/** What a page keeps free for the frame: a CSS height. */
	height: string;
	copy: CopyPart[];
	numbers: CheckedNumber[];
	makers: Makers;
	/** The constants edition. */
	constants: string;
	/** In the order they hang on the bench; of a formula, that it is one of the piece's own. */
	calculators: { title: string; revision: string }[];
	sources: string[];
}

export function accountOf(
	document: WidgetDocument,
	house: CalculatorSet,
	records: ClaimRecords,
	makers: Makers
): PublicAccount {
	const calculators = benchSet(document, house);
	const evaluation = evaluate(document, {}, calculators);
	const words = wordsAt(document, evaluation, calculators);
	const used = [...new Set(document.steps.map(({ calculator }) => calculator))];
	return {
		title: document.title,
		point: document.point,
		height: reservedHeight(document),
		copy: copyOf(document, evaluation, words),
		numbers: numbersOf(document, evaluation, words, calculators, records),
		makers,
		constants: document.constants,
		calculators: used.flatMap((id) => {
			const calculator = calculators.get(id);
			if (!calculator) return [];
			const { title, revision } = calculator;
			return [{ title, revision: isFormulaId(id) ? 'a formula of this piece' : revision }];
		}),
		sources: [...new Set(Object.values(records).flatMap(({ restsOn }) => restsOn))]
	};
}

function copyOf(document: WidgetDocument, evaluation: Evaluation, words: Words): CopyPart[] {
	return document.blocks.flatMap((block): CopyPart[] => {
		if (isTextBlock(block))
			return [{ id: block.id, kind: block.kind, text: blockText(block, words) }];
		if (block.kind === 'chart') {
			const { id, title, description, source } = block;
			return [{ id, kind: 'chart', text: description, title, source }];
		}
		if (block.kind !== 'control') return [];
		const control = document.controls.find(({ id }) => id === block.control);
		const set = control && settingWords(document, evaluation, control.id);
		return set ? [{ id: block.id, kind: 'setting', text: `${control.label}: ${set}.` }] : [];
	});
}

/** Every claim that is one; what the writer exempted isn't. */
function numbersOf(
	document: WidgetDocument,
	evaluation: Evaluation,
	words: Words,
	calculators: CalculatorSet,
	records: ClaimRecords
): CheckedNumber[] {
	const verdicts = judgeClaims(document, calculators);
	return claimPlaces(document, words).flatMap((place): CheckedNumber[] => {
		const { claim } = place;
		const verdict = verdicts.get(claim.id);
		if (claim.form === 'exempt' || !verdict) return [];
		const weighing = weighingOf(document, evaluation, claim, place.words, calculators);
		return [
			{
				id: claim.id,
				label: place.label,
				words: place.words,
				reads: weighing ? readsInWords(weighing.stated, weighing.reading, document.language) : '',
				verdict: verdict.verdict,
				departurePercent: verdict.departurePercent,
				checkedBy: records[claim.id]?.checkedBy ?? []
			}
		];
	});
}
