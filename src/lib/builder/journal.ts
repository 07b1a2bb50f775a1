/**
 * What was typed and not yet kept by the server, in this browser: one entry for each person and piece, and beside it
 * the versions that were set aside so that another could be loaded.
 */
import { createStore, del, entries, get, set, type UseStore } from 'idb-keyval';

export interface JournalEntry {
	/** The server's version that these words grew from. */
	baseVersion: number;
	document: unknown;
	/** ISO 8601, UTC. Tells versions set aside from each other. */
	at: string;
}

export interface Journal {
	read(): Promise<JournalEntry | null>;
	write(entry: JournalEntry): Promise<void>;
	clear(): Promise<void>;
	/** Puts words aside under a name of their own, so that another version can be loaded without losing them. */
	setAside(entry: JournalEntry): Promise<void>;
	/** Newest first. */
	listAside(): Promise<JournalEntry[]>;
	dropAside(at: string): Promise<void>;
}

export function browserJournal(personId: string, slug: string): Journal {
	const store: UseStore = createStore('steelyard-manuscripts', 'entries');
	const key = `${personId}/${slug}`;
	return {
		read: async () => (await get<JournalEntry>(key, store)) ?? null,
		write: (entry) => set(key, entry, store),
		clear: () => del(key, store),
		setAside: (entry) => set(`${key}/${entry.at}`, entry, store),
		listAside: async () =>
			(await entries<string, JournalEntry>(store))
				.filter(([name]) => name.startsWith(`${key}/`))
				.map(([, entry]) => entry)
				.sort((a, b) => b.at.localeCompare(a.at)),
		dropAside: (at) => del(`${key}/${at}`, store)
	};
}
