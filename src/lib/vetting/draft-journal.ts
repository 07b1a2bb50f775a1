/** What was typed into a calculator's form and not yet taken by the house, in this browser: one entry a person and form. */
import { createStore, del, get, set, type UseStore } from 'idb-keyval';

export interface DraftJournal<T> {
	read(): Promise<T | null>;
	write(draft: T): Promise<void>;
	clear(): Promise<void>;
}

/** `form`: the id of the calculator that is revised, or `new`. */
export function draftJournal<T>(personId: string, form: string): DraftJournal<T> {
	const store: UseStore = createStore('steelyard-calculators', 'drafts');
	const key = `${personId}/${form}`;
	return {
		read: async () => (await get<T>(key, store)) ?? null,
		write: (draft) => set(key, draft, store),
		clear: () => del(key, store)
	};
}
