/**
 * What this browser keeps of a piece for one person: the words of each window that the server doesn’t have yet, what a
 * merge asks about, and versions that were set aside. Windows have entries of their own, so that none clears another’s.
 */
import { createStore, del, entries, set, type UseStore } from 'idb-keyval';
import type { OpenAsk } from './keep-asks.ts';

export interface JournalEntry {
	/** The server’s version that these words grew from, and its document; entries of older houses don’t have it. */
	baseVersion: number;
	base?: unknown;
	document: unknown;
	/** ISO 8601, UTC. Tells versions set aside from each other. */
	at: string;
}

/** An entry that a window which is gone has left behind. */
export interface LeftEntry extends JournalEntry {
	key: string;
}

export interface Journal {
	/** What windows that are gone have left, oldest first; never this window’s own. */
	read(): Promise<LeftEntry[]>;
	/** Lets go of what a window left, once its words are safe elsewhere. */
	letGo(left: LeftEntry): Promise<void>;
	/** This window’s newest words. */
	write(entry: JournalEntry): Promise<void>;
	/** The server has this window’s words. */
	clear(): Promise<void>;
	/** Puts words aside under a name of their own, so that another version can be loaded without losing them. */
	setAside(entry: JournalEntry): Promise<void>;
	/** Newest first. */
	listAside(): Promise<JournalEntry[]>;
	dropAside(at: string): Promise<void>;
	/** What a merge asks, until it is decided. One that is kept again takes the place of itself. */
	keepAsk(ask: OpenAsk): Promise<void>;
	/** Oldest first. */
	listAsks(): Promise<OpenAsk[]>;
	dropAsk(id: string): Promise<void>;
	/** This window goes: what it couldn’t send is there for the next one. */
	close(): void;
}

export function browserJournal(personId: string, slug: string): Journal {
	const store: UseStore = createStore('steelyard-manuscripts', 'entries');
	const piece = `${personId}/${slug}`;
	const own = `${piece}#${crypto.randomUUID()}`;
	// Not before the window reads or writes: the server draws the page too, and holds nothing.
	let held: WindowLock | null = null;
	const lock = () => (held ??= holdLock(own));

	const listed = async <T>(prefix: string): Promise<[string, T][]> =>
		(await entries<string, T>(store)).filter(([key]) => key.startsWith(prefix));

	return {
		async read() {
			const alive = await lock().others();
			// Before windows had entries of their own, there was one for the piece.
			return (await listed<JournalEntry>(piece))
				.filter(([key]) => key === piece || key.startsWith(`${piece}#`))
				.filter(([key]) => key !== own && !alive.has(key))
				.map(([key, entry]) => ({ ...entry, key }))
				.sort((a, b) => a.at.localeCompare(b.at));
		},
		letGo: ({ key }) => del(key, store),
		write: (entry) => set(own, entry, store),
		clear: () => del(own, store),
		setAside: (entry) => set(`${piece}/${entry.at}`, entry, store),
		listAside: async () =>
			(await listed<JournalEntry>(`${piece}/`))
				.map(([, entry]) => entry)
				.sort((a, b) => b.at.localeCompare(a.at)),
		dropAside: (at) => del(`${piece}/${at}`, store),
		keepAsk: (ask) => set(`${piece}?${ask.id}`, ask, store),
		listAsks: async () =>
			(await listed<OpenAsk>(`${piece}?`))
				.map(([, ask]) => ask)
				.sort((a, b) => a.at.localeCompare(b.at)),
		dropAsk: (id) => del(`${piece}?${id}`, store),
		close: () => held?.end()
	};
}

/** A lock that lives as long as its window does, however that ends. */
interface WindowLock {
	/** The names that other windows hold. */
	others(): Promise<Set<string>>;
	end(): void;
}

function holdLock(name: string): WindowLock {
	// Without locks every entry counts as left: its words are then merged in, which loses none.
	if (!('locks' in navigator))
		return { others: () => Promise.resolve(new Set()), end: () => undefined };
	let end: () => void = () => undefined;
	const held = new Promise<void>((resolve) => {
		void navigator.locks.request(name, () => {
			resolve();
			return new Promise<void>((over) => (end = over));
		});
	});
	return {
		async others() {
			await held;
			const locks = (await navigator.locks.query()).held ?? [];
			const self = locks.find((lock) => lock.name === name)?.clientId;
			return new Set(
				locks.flatMap((lock) => (lock.name && lock.clientId !== self ? [lock.name] : []))
			);
		},
		end: () => end()
	};
}
