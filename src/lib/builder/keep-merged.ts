/** A merged document written into the sheet: only what differs is touched, so that the caret and the undo steps stay. */
import type { Node } from 'prosemirror-model';
import type { EditorState, Transaction } from 'prosemirror-state';
import type { WidgetDocument } from '../widget/document.ts';
import { same } from '../widget/merge-parts.ts';
import { moved } from '../widget/merge-order.ts';
import { toManuscript } from './convert.ts';
import { bringsWholeDocument } from './head-limits.ts';
import { takesTheirs } from './keep-theirs.ts';
import { wiringOf, type Wiring } from './schema.ts';

/** What a merge made of this sheet and someone else’s: no part of undo, which goes on over it. */
export function takeIn(state: EditorState, document: WidgetDocument): Transaction {
	const transaction = writeInto(state.tr, document).setMeta('addToHistory', false);
	return takesTheirs(transaction, wiringOf(state.doc));
}

/** Turns the sheet into this document. */
export function writeInto(transaction: Transaction, document: WidgetDocument): Transaction {
	const before = transaction.doc;
	const after = toManuscript(document);
	bringsWholeDocument(transaction);
	// From the end, so that no position has moved when it is used.
	writeBlocks(transaction, before, after);
	for (const line of [1, 0])
		rewrite(transaction, before.child(line), startOf(before, line), after.child(line));
	writeWiring(transaction, wiringOf(before), wiringOf(after));
	return transaction;
}

function writeBlocks(transaction: Transaction, before: Node, after: Node): void {
	const were = blocksOf(before);
	const are = blocksOf(after);
	const moves = moved([...were.keys()], [...are.keys()]);
	const stay = [...are.keys()].filter((id) => were.has(id) && !moves.has(id));
	const order = [...are.keys()];
	for (let at = stay.length; at >= 0; at -= 1) {
		const last = stay[at - 1];
		const next = stay[at];
		// Between one block that stays and the next, everything is put in anew.
		const from = last === undefined ? startOf(before, 2) : endOf(before, were, last);
		const to = next === undefined ? before.content.size : startOf(before, were.get(next) ?? 0);
		const put = order
			.slice(
				last === undefined ? 0 : order.indexOf(last) + 1,
				next === undefined ? undefined : order.indexOf(next)
			)
			.map((id) => after.child(are.get(id) ?? 0));
		if (to > from || put.length > 0) transaction.replaceWith(from, to, put);
		if (last === undefined) continue;
		const index = were.get(last) ?? 0;
		const node = after.child(are.get(last) ?? 0);
		rewrite(transaction, before.child(index), startOf(before, index), node);
	}
}

/** Index of each block by its id. */
function blocksOf(doc: Node): Map<string, number> {
	const found = new Map<string, number>();
	doc.forEach((block, _offset, index) => {
		if (index >= 2) found.set(block.attrs.id as string, index);
	});
	return found;
}

function startOf(doc: Node, index: number): number {
	let at = 0;
	for (let before = 0; before < index; before += 1) at += doc.child(before).nodeSize;
	return at;
}

function endOf(doc: Node, were: ReadonlyMap<string, number>, id: string): number {
	const index = were.get(id) ?? 0;
	return startOf(doc, index) + doc.child(index).nodeSize;
}

/** Makes one node at `at` into another, from the first to the last place where they differ. */
function rewrite(transaction: Transaction, before: Node, at: number, after: Node): void {
	if (before.eq(after)) return;
	if (before.type !== after.type || before.isAtom) {
		transaction.replaceWith(at, at + before.nodeSize, after);
		return;
	}
	const from = before.content.findDiffStart(after.content);
	const ends = before.content.findDiffEnd(after.content);
	if (from === null || !ends) return;
	// Where the same letter stands on both edges, the ends may lie before the start.
	const over = Math.max(0, from - Math.min(ends.a, ends.b));
	transaction.replace(at + 1 + from, at + 1 + ends.a + over, after.slice(from, ends.b + over));
}

function writeWiring(transaction: Transaction, before: Wiring, after: Wiring): void {
	for (const [name, value] of Object.entries(after)) {
		const was = before[name as keyof Wiring];
		// Claims whose words are gone wait in the sheet for undo.
		const next =
			name === 'claims' ? [...after.claims, ...waiting(before, after)] : (value as unknown);
		if (!same(was, next)) transaction.setDocAttribute(name, next);
	}
}

function waiting(before: Wiring, after: Wiring) {
	const standing = new Set(after.claims.map(({ id }) => id));
	return before.claims.filter(({ id }) => !standing.has(id));
}
