/** Numbers shown in the copy: underlined in the colour of their state, with the letter of the reading they hang on. */
import type { Node } from 'prosemirror-model';
import { Plugin, PluginKey, type EditorState } from 'prosemirror-state';
import { Decoration, DecorationSet } from 'prosemirror-view';
import type { Verdict } from '../factcheck/verdict.ts';
import type { ClaimMark } from '../renderer/marks/claim-marks.ts';
import { inlineMark } from './inline-mark.ts';
import { numberAt, numbersInCopy, type NumberInCopy } from './quantities.ts';
import { BLOCK_WORDS, schema, type BlockKind } from './schema.ts';

/** How the numbers stand, worked out after each pause in typing. */
export interface Weighing {
	verdicts: ReadonlyMap<string, Verdict>;
	/** Letter of the reading by claim id. */
	tags: ReadonlyMap<string, string>;
	/** Claims with an open query on the newest proof. */
	queried: ReadonlySet<string>;
}

export const NOTHING_WEIGHED: Weighing = {
	verdicts: new Map(),
	tags: new Map(),
	queried: new Set()
};

export type NumberState = ClaimMark | 'exempt';

export function stateOf(number: NumberInCopy, weighing: Weighing): NumberState {
	if (number.control !== null) return 'setting';
	if (number.claim === null) return 'unweighed';
	if (number.claim.form === 'exempt') return 'exempt';
	if (weighing.queried.has(number.claim.id)) return 'queried';
	return weighing.verdicts.get(number.claim.id)?.verdict ?? 'unweighed';
}

export const weighingKey = new PluginKey<Weighing>('weighing');

const numbersCache = new WeakMap<Node, NumberInCopy[]>();

/** All numbers of a manuscript; worked once for each state of the text. */
export function numbersOf(doc: Node): NumberInCopy[] {
	const known = numbersCache.get(doc);
	if (known) return known;
	const numbers = numbersInCopy(doc);
	numbersCache.set(doc, numbers);
	return numbers;
}

export function focusedNumber(state: EditorState): NumberInCopy | null {
	return numberAt(numbersOf(state.doc), state.selection.from, state.selection.to);
}

export interface NumberDecoration {
	key: string;
	from: number;
	to: number;
	state: NumberState;
	focused: boolean;
	tag: string;
}

/** What is drawn on each number. */
export function numberDecorations(
	numbers: readonly NumberInCopy[],
	weighing: Weighing,
	focusedKey: string | null
): NumberDecoration[] {
	return numbers.map((number) => ({
		key: number.key,
		from: number.from,
		to: number.to,
		state: stateOf(number, weighing),
		focused: number.key === focusedKey,
		tag: (number.claim && weighing.tags.get(number.claim.id)) ?? ''
	}));
}

/** What a tapped mark acts on. */
export interface MarkTargets {
	raised: string | null;
	readonly isPhone: boolean;
	wordsOf(number: NumberInCopy): string;
}

export function weighingPlugin(targets: MarkTargets): Plugin<Weighing> {
	return new Plugin<Weighing>({
		key: weighingKey,
		state: {
			init: () => NOTHING_WEIGHED,
			apply: (transaction, before) =>
				(transaction.getMeta(weighingKey) as Weighing | undefined) ?? before
		},
		props: {
			decorations(state) {
				const weighing = weighingKey.getState(state) ?? NOTHING_WEIGHED;
				const focused = focusedNumber(state)?.key ?? null;
				const numbers = numbersOf(state.doc);
				const drawn = numberDecorations(numbers, weighing, focused);
				return DecorationSet.create(state.doc, [
					...drawn.flatMap(drawNumber),
					...(targets.isPhone
						? numbers.map((number) => markWidget(number, stateOf(number, weighing), targets))
						: []),
					...blockDecorations(state)
				]);
			}
		}
	});
}

function drawNumber({ from, to, state, focused, tag }: NumberDecoration): Decoration[] {
	const classes = ['number', `number-${state}`, focused ? 'number-focused' : ''];
	const inline = Decoration.inline(from, to, { class: classes.filter(Boolean).join(' ') });
	if (!tag) return [inline];
	return [
		inline,
		Decoration.widget(to, () => tagElement(tag, focused), {
			side: -1,
			key: `${tag}${focused ? '!' : ''}`,
			ignoreSelection: true,
			marks: []
		})
	];
}

function markWidget(number: NumberInCopy, state: NumberState, targets: MarkTargets): Decoration {
	const raise = () => (targets.raised = number.key);
	return Decoration.widget(number.to, () => inlineMark(state, targets.wordsOf(number), raise), {
		side: -1,
		key: `${number.key} ${state}`,
		ignoreSelection: true,
		stopEvent: () => true,
		marks: []
	});
}

function tagElement(tag: string, focused: boolean): HTMLElement {
	const element = document.createElement('span');
	element.className = focused ? 'number-tag number-tag-focused' : 'number-tag';
	element.textContent = tag;
	element.setAttribute('aria-hidden', 'true');
	return element;
}

const PLACEHOLDERS = {
	title: 'Title',
	point: 'The one thing a reader takes away',
	first: 'Type. Numbers will ask to be weighed.'
};

/** The bracket beside the block one is in, the kind of each block, and grey words on an empty sheet. */
function blockDecorations(state: EditorState): Decoration[] {
	const decorations: Decoration[] = [];
	const { $from } = state.selection;
	const current = $from.depth > 0 ? $from.before(1) : state.selection.from;
	state.doc.forEach((block, offset, index) => {
		const attributes: Record<string, string> = { 'data-word': wordOf(block) };
		if (offset === current) attributes.class = 'current';
		const placeholder = placeholderOf(block, index, state.doc.childCount);
		if (placeholder) attributes['data-placeholder'] = placeholder;
		decorations.push(Decoration.node(offset, offset + block.nodeSize, attributes));
	});
	return decorations;
}

function wordOf(block: Node): string {
	return BLOCK_WORDS[block.type.name as BlockKind] ?? block.type.name;
}

function placeholderOf(block: Node, index: number, count: number): string | null {
	if (block.content.size > 0) return null;
	if (block.type === schema.nodes.title) return PLACEHOLDERS.title;
	if (block.type === schema.nodes.point) return PLACEHOLDERS.point;
	if (index === 2 && count === 3 && block.type === schema.nodes.paragraph)
		return PLACEHOLDERS.first;
	return null;
}
