/** What can be put in at a line, in the order it is offered. */
import type { CalculatorSet } from '../physics/calculator.ts';
import type { WidgetDocument } from '../widget/document.ts';
import { CONTROL_WORDS } from './control-draft.ts';
import { movedBySetting, movedKey } from './control-moves.ts';
import { CHART_FORMS, CHART_HINTS, CHART_NAMES } from './forms/chart-names.ts';
import type { FormKind } from './forms/fresh-fields.ts';
import { BLOCK_WORDS, TEXT_BLOCKS, type TextBlockKind } from './schema.ts';
import { pegsOf, settingLabel } from './wiring.ts';

/** What is put in, and by which way. */
export type Wanted =
	| { way: 'text'; kind: TextBlockKind }
	| { way: 'control'; control: string }
	| { way: 'new control'; step: string; key: string }
	| { way: 'first control' }
	| { way: 'form'; kind: FormKind }
	| { way: 'picture' };

export interface InsertItem {
	key: string;
	word: string;
	hint: string;
	wanted: Wanted;
}

const FIRST: readonly TextBlockKind[] = ['paragraph', 'heading', 'result'];
const REST = TEXT_BLOCKS.filter((kind) => !FIRST.includes(kind));
const HINTS: Record<TextBlockKind, string> = {
	paragraph: 'plain copy',
	heading: 'names what follows',
	result: 'a sentence that moves with the controls',
	aside: 'set apart, for those who want more',
	limits: 'opens with “What this can’t tell you”',
	caution: 'always shown, on brass'
};

const lowerFirst = (text: string) => text.charAt(0).toLowerCase() + text.slice(1);

const textItem = (kind: TextBlockKind): InsertItem => ({
	key: kind,
	word: BLOCK_WORDS[kind],
	hint: HINTS[kind],
	wanted: { way: 'text', kind }
});

const formItem = (kind: FormKind, word: string, hint: string): InsertItem => ({
	key: kind,
	word,
	hint,
	wanted: { way: 'form', kind }
});

/** With `wordsAlone` only what needs no form and no bench. */
export function insertItems(
	document: WidgetDocument,
	calculators: CalculatorSet,
	wordsAlone: boolean
): InsertItem[] {
	return [
		...FIRST.map(textItem),
		...document.controls.map((control): InsertItem => ({
			key: control.id,
			word: `control: ${control.label}`,
			hint: CONTROL_WORDS[control.kind].name,
			wanted: { way: 'control', control: control.id }
		})),
		...(wordsAlone ? [] : [...newControls(document, calculators), ...FORMS]),
		...REST.map(textItem)
	];
}

/** One for every setting on the bench that nothing moves yet. */
function newControls(document: WidgetDocument, calculators: CalculatorSet): InsertItem[] {
	const items = document.steps.flatMap((step) => {
		const calculator = calculators.get(step.calculator);
		if (!calculator) return [];
		return pegsOf(step, calculator).flatMap(({ key, source }): InsertItem[] => {
			const moved = movedBySetting(step, calculator, key);
			const isFree = (step.settings[movedKey(calculator, key)] ?? source)?.from === 'fixed';
			if (!isFree || !moved) return [];
			return [
				{
					key: `${step.id} ${key}`,
					word: `new control: ${lowerFirst(settingLabel(calculator, step, key))}`,
					hint: `a setting of ${calculator.title}`,
					wanted: { way: 'new control', step: step.id, key }
				}
			];
		});
	});
	if (items.length > 0 || document.controls.length > 0) return items;
	return [
		{
			key: 'first control',
			word: 'control',
			hint: 'moves a calculator’s setting; choose the calculator first',
			wanted: { way: 'first control' }
		}
	];
}

const FORMS: readonly InsertItem[] = [
	...CHART_FORMS.map((form) =>
		formItem(form, `chart: ${lowerFirst(CHART_NAMES[form])}`, CHART_HINTS[form])
	),
	formItem('table', BLOCK_WORDS.table, 'at one setting or across several'),
	formItem('equation', BLOCK_WORDS.equation, 'with the values of its letters'),
	{
		key: 'picture',
		word: BLOCK_WORDS.picture,
		hint: 'from the picture desk, or a new one',
		wanted: { way: 'picture' }
	},
	formItem('guess', BLOCK_WORDS.guess, 'a question before the answer'),
	formItem('presets', BLOCK_WORDS.presets, 'named settings at one touch'),
	formItem('sources', BLOCK_WORDS.sources, 'what the piece rests on')
];
