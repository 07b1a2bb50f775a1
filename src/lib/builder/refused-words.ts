/** What the server can't keep, said by the name of the place on the sheet, with the mend. */
import type { CalculatorSet } from '../physics/calculator.ts';
import { isTextBlock, type WidgetDocument } from '../widget/document.ts';
import type { RefusedIssue } from './autosave.svelte.ts';
import { BLOCK_WORDS } from './schema.ts';

/** How many reasons are said at once; the rest follow when these are mended. */
const AT_ONCE = 3;
const OPENING = 32;

export function refusedWords(
	issues: readonly RefusedIssue[],
	draft: WidgetDocument,
	calculators: CalculatorSet
): string[] {
	const said = issues.map(({ path, message }) => {
		const place = placeOf(path, draft, calculators);
		return place ? `${place} ${mendOf(message)}` : message;
	});
	return [...new Set(said)].slice(0, AT_ONCE);
}

function mendOf(message: string): string {
	const characters = /expected string to have <=(\d+) characters/.exec(message)?.[1];
	if (characters) return `is longer than ${characters} characters: shorten it.`;
	const items = /expected array to have <=(\d+) items/.exec(message)?.[1];
	if (items) return `can be ${items} at most: take some away.`;
	return `can’t be kept as it stands: ${message.replace(/([^.])$/, '$1.')}`;
}

const WHOLE_KINDS: Record<string, string> = {
	steps: 'Calculators on the bench',
	controls: 'Sliders',
	blocks: 'Paragraphs and other blocks',
	claims: 'Tied numbers'
};

function placeOf(path: string, draft: WidgetDocument, calculators: CalculatorSet): string | null {
	const [kind = '', at, field] = path.split('.');
	if (kind === 'title') return 'The title';
	if (kind === 'point') return 'The point under the title';
	if (at === undefined) return WHOLE_KINDS[kind] ?? null;
	const index = Number(at);
	switch (kind) {
		case 'steps': {
			const step = draft.steps[index];
			return step
				? `${calculators.get(step.calculator)?.title ?? 'A calculator'} on the bench`
				: null;
		}
		case 'controls': {
			const control = draft.controls[index];
			return control ? `The ${field ?? ''} of the slider ${opening(control.label)}` : null;
		}
		case 'blocks':
			return blockPlace(draft.blocks[index], field);
		case 'claims':
			return 'A tied number';
		default:
			return null;
	}
}

function blockPlace(
	block: WidgetDocument['blocks'][number] | undefined,
	field: string | undefined
): string | null {
	if (!block) return null;
	if (block.kind === 'chart') return `The ${field ?? ''} of the chart ${opening(block.title)}`;
	if (!isTextBlock(block)) return `The ${BLOCK_WORDS[block.kind]} in the copy`;
	const words = block.content.map((inline) => ('text' in inline ? inline.text : '')).join('');
	return `The ${BLOCK_WORDS[block.kind]} ${opening(words)}`;
}

function opening(words: string): string {
	return words.length > OPENING ? `“${words.slice(0, OPENING).trimEnd()} …”` : `“${words}”`;
}
