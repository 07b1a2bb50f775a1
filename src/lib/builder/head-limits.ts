/** The title and the point are single lines of bounded length: what would make one too long isn't put in. */
import type { Node } from 'prosemirror-model';
import { Plugin, type Transaction } from 'prosemirror-state';
import { WidgetDocument } from '../widget/document.ts';

export interface HeadLine {
	name: 'title' | 'point';
	/** In UTF-16 units, as the document counts them. */
	length: number;
	limit: number;
}

const LIMITS = {
	title: WidgetDocument.shape.title.maxLength ?? Infinity,
	point: WidgetDocument.shape.point.maxLength ?? Infinity
};
/** From this share of the limit on, the count is shown. */
const NEAR = 0.85;
/** Marks a change that brings a whole document, which comes as it is and is mended after. */
const WHOLE = 'whole-document';

export function headLines(doc: Node): HeadLine[] {
	return (['title', 'point'] as const).map((name, index) => ({
		name,
		length: doc.child(index).textContent.length,
		limit: LIMITS[name]
	}));
}

export function isNearLimit({ length, limit }: HeadLine): boolean {
	return length >= limit * NEAR;
}

/** The line that a change makes too long; null when it makes none longer than it may be and than it was. */
export function overfull(before: Node, after: Node): HeadLine | null {
	const were = headLines(before);
	return (
		headLines(after).find(
			({ length, limit }, index) => length > limit && length > (were[index]?.length ?? 0)
		) ?? null
	);
}

export function bringsWholeDocument(transaction: Transaction): Transaction {
	return transaction.setMeta(WHOLE, true);
}

/** Holds back a change that would make a line too long, whole: a part of what was pasted or dragged would be lost. */
export function headLimits(heldBack: (line: HeadLine) => void): Plugin {
	return new Plugin({
		filterTransaction(transaction, state) {
			if (!transaction.docChanged || transaction.getMeta(WHOLE)) return true;
			const line = overfull(state.doc, transaction.doc);
			if (line) heldBack(line);
			return line === null;
		}
	});
}
