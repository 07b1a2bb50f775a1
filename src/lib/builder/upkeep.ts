/** What the manuscript mends by itself after each change: ids stay unique, marks stay on their numbers. */
import type { Node } from 'prosemirror-model';
import { Plugin, type EditorState, type Transaction } from 'prosemirror-state';
import type { Claim } from '../widget/document.ts';
import { newId } from './ids.ts';
import { claimRuns, quantitiesOf } from './quantities.ts';
import { schema, wiringOf } from './schema.ts';

export function upkeep(): Plugin {
	return new Plugin({
		appendTransaction(transactions, _before, state) {
			if (!transactions.some(({ docChanged }) => docChanged)) return null;
			const transaction = mend(state);
			return transaction.docChanged ? transaction : null;
		}
	});
}

/** Block ids after a split or a paste, claims that stand twice, claims of another piece, and hedges typed later. */
export function mend(state: EditorState): Transaction {
	const transaction = state.tr;
	const { language, claims: entries } = wiringOf(state.doc);
	const claims = new Map(entries.map((claim) => [claim.id, claim]));
	const controls = new Set(wiringOf(state.doc).controls.map(({ id }) => id));
	const blockIds = new Set<string>();
	const placed = new Set<string>();
	const added: Claim[] = [];

	/** The id this place may keep: its own the first time, a copy's after that, none if the claim is unknown. */
	const idFor = (id: string): string | null => {
		const claim = claims.get(id);
		if (!claim) return null;
		if (!placed.has(id)) {
			placed.add(id);
			return id;
		}
		const copy = { ...claim, id: newId('claim') };
		added.push(copy);
		return copy.id;
	};

	state.doc.forEach((block, offset) => {
		if ('id' in block.attrs) {
			const id = block.attrs.id as string;
			if (!id || blockIds.has(id)) {
				const fresh = newId('block');
				transaction.setNodeAttribute(offset, 'id', fresh);
				blockIds.add(fresh);
			} else blockIds.add(id);
		}
		if (!block.inlineContent) return;

		const start = offset + 1;
		const quantities = quantitiesOf(block, language);
		for (const run of claimRuns(block)) {
			const id = idFor(run.claim);
			const from = start + run.start;
			const to = start + run.end;
			if (id === null) {
				transaction.removeMark(from, to, schema.marks.claim);
				continue;
			}
			if (id !== run.claim) transaction.addMark(from, to, schema.mark('claim', { id }));
			// “about” typed before a tied number belongs to it, and so does a unit typed after it.
			const touching = quantities.filter(
				(quantity) => quantity.start < run.end && quantity.end > run.start
			);
			const [quantity] = touching;
			if (
				touching.length === 1 &&
				quantity &&
				(quantity.start < run.start || quantity.end > run.end)
			) {
				const wide = {
					from: Math.min(from, start + quantity.start),
					to: Math.max(to, start + quantity.end)
				};
				if (onlyText(block, wide.from - start, wide.to - start)) {
					transaction.addMark(wide.from, wide.to, schema.mark('claim', { id }));
				}
			}
		}
	});

	// Atoms last and from the end, since replacing them moves what follows.
	const atoms: { pos: number; id: string | null; live: boolean }[] = [];
	state.doc.descendants((node, pos) => {
		if (node.type === schema.nodes.live)
			atoms.push({ pos, id: idFor(node.attrs.claim as string), live: true });
		if (node.type === schema.nodes.setting && !controls.has(node.attrs.control as string)) {
			atoms.push({ pos, id: null, live: false });
		}
		if (node.type === schema.nodes.control && !controls.has(node.attrs.control as string)) {
			atoms.push({ pos, id: null, live: false });
		}
	});
	for (const { pos, id, live } of atoms.reverse()) {
		if (id === null) transaction.deleteRange(pos, pos + 1);
		else if (live && state.doc.nodeAt(pos)?.attrs.claim !== id) {
			transaction.setNodeAttribute(pos, 'claim', id);
		}
	}
	if (added.length > 0) {
		transaction.setDocAttribute('claims', [...wiringOf(state.doc).claims, ...added]);
	}
	return transaction;
}

function onlyText(block: Node, from: number, to: number): boolean {
	let text = true;
	block.nodesBetween(from, to, (node) => {
		if (!node.isText) text = false;
	});
	return text;
}
