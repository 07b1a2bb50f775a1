/** Putting blocks into the copy: in place of the empty line one is on, otherwise after the block one is in. */
import type { Node } from 'prosemirror-model';
import { TextSelection, type Transaction } from 'prosemirror-state';
import { newId } from './ids.ts';
import { schema, type ChartFields, type TextBlockKind } from './schema.ts';

/** Where a block goes that is asked for at `pos`; never above the point. */
function place(doc: Node, pos: number): { from: number; to: number } {
	let found: { from: number; to: number } | null = null;
	doc.forEach((block, offset, index) => {
		const end = offset + block.nodeSize;
		if (pos < offset || pos >= end) return;
		const isEmptyLine =
			index > 1 && block.type === schema.nodes.paragraph && block.content.size === 0;
		const after = index === 0 ? end + doc.child(1).nodeSize : end;
		found = isEmptyLine ? { from: offset, to: end } : { from: after, to: after };
	});
	return found ?? { from: doc.content.size, to: doc.content.size };
}

function insertBlock(transaction: Transaction, pos: number, block: Node): Transaction {
	const { from, to } = place(transaction.doc, pos);
	if (!block.isAtom) {
		transaction.replaceWith(from, to, block);
		return transaction
			.setSelection(TextSelection.create(transaction.doc, from + 1))
			.scrollIntoView();
	}
	// After a slider or a chart one goes on writing: in the empty line that follows, or in a new one.
	const next = transaction.doc.nodeAt(to);
	const hasLine = next?.type === schema.nodes.paragraph && next.content.size === 0;
	transaction.replaceWith(
		from,
		to,
		hasLine ? block : [block, schema.node('paragraph', { id: newId('block') })]
	);
	return transaction
		.setSelection(TextSelection.create(transaction.doc, from + block.nodeSize + 1))
		.scrollIntoView();
}

export function insertText(
	transaction: Transaction,
	pos: number,
	kind: TextBlockKind
): Transaction {
	return insertBlock(transaction, pos, schema.node(kind, { id: newId('block') }));
}

export function insertControl(transaction: Transaction, pos: number, control: string): Transaction {
	return insertBlock(transaction, pos, schema.node('control', { id: newId('block'), control }));
}

export function insertChart(
	transaction: Transaction,
	pos: number,
	fields: ChartFields
): Transaction {
	return insertBlock(transaction, pos, schema.node('chart', { id: newId('block'), fields }));
}

export function changeChart(
	transaction: Transaction,
	pos: number,
	fields: ChartFields
): Transaction {
	return transaction.setNodeAttribute(pos, 'fields', fields);
}
