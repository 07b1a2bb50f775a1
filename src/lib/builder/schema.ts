/**
 * The manuscript as one structured text. Words are nodes and marks; the wiring (calculators, controls, what each
 * number is tied to) stands in the top node's attributes, so that one undo covers words and wiring alike.
 */
import { Schema, type DOMOutputSpec, type Node } from 'prosemirror-model';
import {
	TEXT_KINDS,
	type Block,
	type BlockKind,
	type Claim,
	type Control,
	type FormulaStep,
	type Step,
	type TextBlock,
	type WidgetDocument
} from '../widget/document.ts';

/** What the top node carries beside the text. */
export interface Wiring {
	language: WidgetDocument['language'];
	constants: string;
	formulas: readonly FormulaStep[];
	steps: readonly Step[];
	controls: readonly Control[];
	claims: readonly Claim[];
}

export const TEXT_BLOCKS = TEXT_KINDS;
export type TextBlockKind = TextBlock['kind'];

/** Blocks that the widget draws from fields, and that have no text of their own to write in. */
export const FIELD_BLOCKS = [
	'chart',
	'table',
	'equation',
	'picture',
	'guess',
	'presets',
	'sources'
] as const satisfies readonly BlockKind[];
export type FieldBlockKind = (typeof FIELD_BLOCKS)[number];
export type FieldBlock = Extract<Block, { kind: FieldBlockKind }>;

type Fields<B> = B extends FieldBlock ? Omit<B, 'id' | 'kind'> : never;
/** What a block of a kind says of itself, beside its id. */
export type FieldsOf<K extends FieldBlockKind> = Fields<Extract<FieldBlock, { kind: K }>>;
export type { BlockKind };
export type ChartFields = FieldsOf<'chart'>;

/** What each block is called in the margin and in the insert list. */
export const BLOCK_WORDS: Record<BlockKind, string> = {
	paragraph: 'paragraph',
	heading: 'heading',
	aside: 'aside',
	result: 'result sentence',
	limits: 'what this can’t tell you',
	caution: 'caution',
	control: 'control',
	chart: 'chart',
	table: 'table of readings',
	equation: 'equation',
	picture: 'picture',
	guess: 'guess first',
	presets: 'settings to try',
	sources: 'sources'
};

const ELEMENTS: Record<TextBlockKind, string> = {
	paragraph: 'p',
	heading: 'h2',
	aside: 'p',
	result: 'p',
	limits: 'p',
	caution: 'p'
};

function textBlock(kind: TextBlockKind) {
	const element = ELEMENTS[kind];
	return {
		group: 'block',
		content: 'inline*',
		attrs: { id: { default: '' } },
		defining: kind !== 'paragraph',
		// Paragraphs take any foreign paragraph; the rest only what was copied from a manuscript.
		parseDOM: [
			{ tag: `${element}[data-kind="${kind}"]`, priority: 60 },
			...(kind === 'paragraph' ? [{ tag: 'p' }] : []),
			...(kind === 'heading' ? [{ tag: 'h1' }, { tag: 'h2' }, { tag: 'h3' }] : [])
		],
		toDOM: (): DOMOutputSpec => [element, { 'data-kind': kind }, 0]
	};
}

/** It is moved within a piece, never pasted from elsewhere: its fields don't travel as HTML. */
function fieldBlock(kind: FieldBlockKind) {
	return {
		group: 'block',
		atom: true,
		attrs: { id: { default: '' }, fields: { default: null } },
		toDOM: (): DOMOutputSpec => ['div', { 'data-kind': kind }]
	};
}

/** A single line of plain words above the blocks. */
function headLine(kind: 'title' | 'point', element: string) {
	return {
		content: 'text*',
		marks: '',
		defining: true,
		isolating: true,
		parseDOM: [{ tag: `${element}[data-kind="${kind}"]`, priority: 60 }],
		toDOM: (): DOMOutputSpec => [element, { 'data-kind': kind }, 0]
	};
}

export const schema = new Schema({
	nodes: {
		doc: {
			content: 'title point block+',
			attrs: {
				language: { default: 'en' },
				constants: { default: '' },
				formulas: { default: [] },
				steps: { default: [] },
				controls: { default: [] },
				claims: { default: [] }
			}
		},
		title: headLine('title', 'h1'),
		point: headLine('point', 'p'),
		paragraph: textBlock('paragraph'),
		heading: textBlock('heading'),
		result: textBlock('result'),
		aside: textBlock('aside'),
		limits: textBlock('limits'),
		caution: textBlock('caution'),
		control: {
			group: 'block',
			atom: true,
			attrs: { id: { default: '' }, control: { default: '' } },
			parseDOM: [
				{
					tag: 'div[data-kind="control"]',
					getAttrs: (element) => ({ control: element.dataset.control ?? '' })
				}
			],
			toDOM: (node): DOMOutputSpec => [
				'div',
				{ 'data-kind': 'control', 'data-control': node.attrs.control as string }
			]
		},
		chart: fieldBlock('chart'),
		table: fieldBlock('table'),
		equation: fieldBlock('equation'),
		picture: fieldBlock('picture'),
		guess: fieldBlock('guess'),
		presets: fieldBlock('presets'),
		sources: fieldBlock('sources'),
		live: {
			group: 'inline',
			inline: true,
			atom: true,
			attrs: { claim: { default: '' } },
			marks: '',
			parseDOM: [
				{
					tag: 'span[data-live]',
					getAttrs: (element) => ({ claim: element.dataset.live ?? '' })
				}
			],
			toDOM: (node): DOMOutputSpec => ['span', { 'data-live': node.attrs.claim as string }]
		},
		setting: {
			group: 'inline',
			inline: true,
			atom: true,
			attrs: { control: { default: '' } },
			marks: '',
			parseDOM: [
				{
					tag: 'span[data-setting]',
					getAttrs: (element) => ({ control: element.dataset.setting ?? '' })
				}
			],
			toDOM: (node): DOMOutputSpec => ['span', { 'data-setting': node.attrs.control as string }]
		},
		text: { group: 'inline' }
	},
	marks: {
		em: {
			parseDOM: [{ tag: 'em' }, { tag: 'i' }, { style: 'font-style=italic' }],
			toDOM: (): DOMOutputSpec => ['em', 0]
		},
		strong: {
			parseDOM: [
				{ tag: 'strong' },
				{ tag: 'b', getAttrs: (element) => element.style.fontWeight !== 'normal' && null },
				{ style: 'font-weight', getAttrs: (value) => /^(bold|[7-9]\d\d)$/.test(value) && null }
			],
			toDOM: (): DOMOutputSpec => ['strong', 0]
		},
		claim: {
			attrs: { id: {} },
			inclusive: false,
			// Stated words are weighed as they stand and carry no emphasis of their own.
			excludes: '_',
			parseDOM: [
				{ tag: 'span[data-claim]', getAttrs: (element) => ({ id: element.dataset.claim ?? '' }) }
			],
			toDOM: (mark): DOMOutputSpec => [
				'span',
				{ 'data-claim': mark.attrs.id as string, class: 'claim' },
				0
			]
		}
	}
});

export function wiringOf(doc: Node): Wiring {
	return doc.attrs as Wiring;
}

export function isTextBlockKind(name: string): name is TextBlockKind {
	return (TEXT_BLOCKS as readonly string[]).includes(name);
}

export function isFieldBlockKind(name: string): name is FieldBlockKind {
	return (FIELD_BLOCKS as readonly string[]).includes(name);
}

/** Finds a claim's id on a text node, or null. */
export function claimOf(node: Node): string | null {
	const mark = node.marks.find(({ type }) => type === schema.marks.claim);
	return mark ? (mark.attrs.id as string) : null;
}
