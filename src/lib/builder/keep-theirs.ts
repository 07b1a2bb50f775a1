/**
 * Undo brings back a list of the wiring as it was before one’s own change, and with it what a merge has put there since.
 * This plugin puts that back: undo undoes one’s own, never what came from others.
 */
import { isHistoryTransaction } from 'prosemirror-history';
import { Plugin, PluginKey, type Transaction } from 'prosemirror-state';
import { identified, same, type Identified } from '../widget/merge-parts.ts';
import { wiringOf, type Wiring } from './schema.ts';

const LISTS = ['formulas', 'steps', 'controls', 'claims'] as const;

/** One thing that a merge changed: as it was, and as they have it; undefined where it isn’t there. */
interface Theirs {
	list: (typeof LISTS)[number];
	id: string;
	from: Identified | undefined;
	to: Identified | undefined;
}

const key = new PluginKey<readonly Theirs[]>('theirs');

/** Marks a merge’s change, made on `before`, with what of the wiring it brings from others. */
export function takesTheirs(transaction: Transaction, before: Wiring): Transaction {
	const after = wiringOf(transaction.doc);
	const theirs = LISTS.flatMap((list) => {
		const were = byId(before[list]);
		const are = byId(after[list]);
		return [...new Set([...were.keys(), ...are.keys()])].flatMap((id): Theirs[] => {
			const [from, to] = [were.get(id), are.get(id)];
			return same(from, to) ? [] : [{ list, id, from, to }];
		});
	});
	return transaction.setMeta(key, theirs);
}

export function keepTheirs(): Plugin<readonly Theirs[]> {
	return new Plugin<readonly Theirs[]>({
		key,
		state: {
			init: () => [],
			apply(transaction, known) {
				const came = transaction.getMeta(key) as readonly Theirs[] | undefined;
				if (!came) return known;
				const isNew = ({ list, id }: Theirs) =>
					came.every((one) => one.list !== list || one.id !== id);
				return [...known.filter(isNew), ...came];
			}
		},
		appendTransaction(transactions, before, state) {
			if (!transactions.some(isHistoryTransaction)) return null;
			const transaction = state.tr;
			const [were, are] = [wiringOf(before.doc), wiringOf(state.doc)];
			for (const list of LISTS) {
				const wanted = (key.getState(state) ?? []).filter((one) => one.list === list);
				const restored = withTheirs(were[list], are[list], wanted);
				if (restored) transaction.setDocAttribute(list, restored);
			}
			return transaction.docChanged ? transaction : null;
		}
	});
}

/** The list with theirs put back where undo took it from what they have to what was before; null when it took nothing. */
function withTheirs(
	before: readonly { id: string }[],
	after: readonly { id: string }[],
	theirs: readonly Theirs[]
): Identified[] | null {
	const were = byId(before);
	const are = byId(after);
	const undone = theirs.filter(
		({ id, from, to }) =>
			same(were.get(id), to) && !same(are.get(id), to) && same(are.get(id), from)
	);
	if (undone.length === 0) return null;
	for (const { id, to } of undone) {
		if (to) are.set(id, to);
		else are.delete(id);
	}
	return [...are.values()];
}

function byId(list: readonly { id: string }[]): Map<string, Identified> {
	return new Map(identified(list).map((member) => [member.id, member]));
}
