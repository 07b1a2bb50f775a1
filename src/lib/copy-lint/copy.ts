/** The words of a document, part by part, as a reader meets them. Sources are left out: they are cited as published. */
import {
	isTextBlock,
	type Block,
	type Inline,
	type TextBlock,
	type WidgetDocument
} from '../widget/document.ts';
import type { Field } from './note.ts';

/** Stands for what the widget prints: one character, so that offsets are positions in the manuscript’s block. */
export const PRINTED = '\ufffc';

export interface CopyPart {
	block: string;
	field: Field;
	/** The block's kind; `title` and `point` for the two lines above. */
	kind: string;
	text: string;
	/** A number in it is worked out or weighed: it is a reading, and no proof of a cause. */
	reads: boolean;
	/** A caption or label that stands beside these words. */
	beside?: string;
	/** Of a heading, where it is known: 2 stands under the title. */
	level?: number;
}

export function partsOf(document: WidgetDocument): CopyPart[] {
	return [
		{ block: 'title', field: 'title', kind: 'title', text: document.title, reads: false },
		{ block: 'point', field: 'point', kind: 'point', text: document.point, reads: false },
		...document.blocks.flatMap(blockParts)
	];
}

function blockParts(block: Block): CopyPart[] {
	if (isTextBlock(block)) return [textPart(block)];
	const { id, kind } = block;
	return linesOf(block).map((line) => ({ block: id, kind, reads: kind !== 'picture', ...line }));
}

function textPart({ id, kind, content }: TextBlock): CopyPart {
	return {
		block: id,
		field: 'copy',
		kind,
		text: content.map(wordsOf).join(''),
		reads: content.some((inline) => inline.kind === 'live' || inline.kind === 'claim')
	};
}

type Line = Pick<CopyPart, 'field' | 'text' | 'beside'>;

function linesOf(block: Exclude<Block, TextBlock>): Line[] {
	switch (block.kind) {
		case 'chart':
			return [
				{ field: 'title', text: block.title },
				{ field: 'description', text: block.description, beside: block.title }
			];
		case 'table':
			return [{ field: 'title', text: block.title }];
		case 'equation':
			return [{ field: 'caption', text: block.caption }];
		case 'picture':
			return [
				{ field: 'alt', text: block.alt, beside: block.caption },
				{ field: 'caption', text: block.caption }
			];
		case 'guess':
			return [{ field: 'question', text: block.question }];
		case 'presets':
			return [{ field: 'label', text: block.label }];
		case 'control':
		case 'sources':
			return [];
	}
}

function wordsOf(inline: Inline): string {
	return inline.kind === 'text' || inline.kind === 'claim' ? inline.text : PRINTED;
}
