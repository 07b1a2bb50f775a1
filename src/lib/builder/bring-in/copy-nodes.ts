/** Copy from elsewhere as blocks of the manuscript, and the one change that puts it in. */
import { Fragment, Slice, type Node } from 'prosemirror-model';
import type { Transaction } from 'prosemirror-state';
import type { ImportedBlock, ImportedCopy, ImportedText } from '../../import/imported-copy.ts';
import { newId } from '../ids.ts';
import { schema } from '../schema.ts';

/** As many blocks as a document holds. */
export const MOST_BLOCKS = 200;

/** How a change came in, for the notes beside the copy. */
export interface BroughtIn {
	transaction: Transaction;
	/** Blocks that found no room. */
	left: number;
}

function textNode({ text, marks = [] }: ImportedText): Node {
	return schema.text(
		text,
		marks.map((name) => schema.mark(name))
	);
}

function blockNode({ kind, content }: ImportedBlock): Node {
	return schema.node(kind, { id: newId('block') }, content.map(textNode));
}

/** Pasted copy: into the line one is in, and on from there. Titles take plain words in one line. */
export function pasteCopy(transaction: Transaction, { blocks }: ImportedCopy): Transaction {
	const { $from } = transaction.selection;
	if ($from.parent.type === schema.nodes.title || $from.parent.type === schema.nodes.point) {
		const words = blocks.map(({ content }) => content.map(({ text }) => text).join(''));
		return transaction.insertText(words.join(' ')).scrollIntoView();
	}
	const nodes = blocks.map(blockNode);
	const [only] = nodes;
	const slice =
		nodes.length === 1 && only?.type === schema.nodes.paragraph
			? new Slice(only.content, 0, 0)
			: new Slice(Fragment.from(nodes), 1, 1);
	return transaction.replaceSelection(slice).scrollIntoView();
}

/** A whole file: in place of the empty line one is on, otherwise after the block one is in. Its title fills an empty one. */
export function bringInCopy(transaction: Transaction, copy: ImportedCopy): BroughtIn {
	const { doc } = transaction;
	const title = copy.title ?? '';
	const isUntitled = doc.child(0).content.size === 0;
	const heading: ImportedBlock[] =
		title && !isUntitled ? [{ kind: 'heading', content: [{ kind: 'text', text: title }] }] : [];
	const all = [...heading, ...copy.blocks];
	const { from, to } = place(transaction);
	const room = MOST_BLOCKS - (doc.childCount - 2) + (to > from ? 1 : 0);
	const nodes = all.slice(0, Math.max(0, room)).map(blockNode);
	if (nodes.length > 0) transaction.replaceWith(from, to, nodes);
	if (title && isUntitled) transaction.insertText(title, 1);
	return { transaction: transaction.scrollIntoView(), left: all.length - nodes.length };
}

function place({ doc, selection }: Transaction): { from: number; to: number } {
	const index = Math.max(1, selection.$from.index(0));
	let from = 0;
	for (let each = 0; each < index; each += 1) from += doc.child(each).nodeSize;
	const block = doc.child(index);
	const after = from + block.nodeSize;
	const isEmptyLine =
		index > 1 && block.type === schema.nodes.paragraph && block.content.size === 0;
	if (isEmptyLine) return { from, to: after };
	// On the point, the first line under it is often the empty one of a fresh sheet.
	const next = doc.maybeChild(index + 1);
	const nextIsEmpty = next?.type === schema.nodes.paragraph && next.content.size === 0;
	return { from: after, to: nextIsEmpty ? after + next.nodeSize : after };
}
