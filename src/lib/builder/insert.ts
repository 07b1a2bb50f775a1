/** Putting blocks into the copy: in place of the empty line one is on, otherwise after the block one is in. */
import type { Node } from 'prosemirror-model';
import { NodeSelection, TextSelection, type Transaction } from 'prosemirror-state';
import { newId } from './ids.ts';
import { schema, type FieldBlockKind, type FieldsOf, type TextBlockKind } from './schema.ts';

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

export function insertFields<K extends FieldBlockKind>(
	transaction: Transaction,
	pos: number,
	kind: K,
	fields: FieldsOf<K>
): Transaction {
	return insertBlock(transaction, pos, schema.node(kind, { id: newId('block'), fields }));
}

export function changeFields(
	transaction: Transaction,
	pos: number,
	fields: FieldsOf<FieldBlockKind>
): Transaction {
	return transaction.setNodeAttribute(pos, 'fields', fields);
}

/** The block at `pos` one place up or down among the blocks; null at either end. */
export function moveBlock(
	transaction: Transaction,
	pos: number,
	direction: 'up' | 'down'
): Transaction | null {
	const { doc } = transaction;
	const index = doc.resolve(pos).index(0);
	const block = doc.child(index);
	const other = direction === 'up' ? index - 1 : index + 1;
	// The title and the point stand first and stay there.
	if (index < 2 || other < 2 || other >= doc.childCount) return null;
	const beside = doc.child(other);
	const to = direction === 'up' ? pos - beside.nodeSize : pos + beside.nodeSize;
	transaction.delete(pos, pos + block.nodeSize).insert(to, block);
	const selection = block.isAtom
		? NodeSelection.create(transaction.doc, to)
		: TextSelection.near(transaction.doc.resolve(to + 1));
	return transaction.setSelection(selection).scrollIntoView();
}
