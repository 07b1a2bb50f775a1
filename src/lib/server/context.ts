/** What a service needs besides its input: who asks, when, and the house's fixtures. */
import type { Actor } from '../workflow/permissions.ts';
import type { Db } from './db/client.ts';
import type { ReleaseShelf } from './shelf/shelf.ts';
import type { ObjectStore } from './store/object-store.ts';

/** Open once at start, the same for everyone. */
export interface Fixtures {
	db: Db;
	store: ObjectStore;
	shelf: ReleaseShelf;
	/** Tells the sender that there is mail; called after the commit. */
	mail: { wake(): void };
	house: { name: string; origin: string };
	/** The folder of the frame's build. */
	pressFolder: string;
	/** Keys what is derived and never stored, such as the tokens of sign-in links. */
	secret: string;
}

/** The browser session a request came with. */
export interface SessionInfo {
	id: string;
	/** When the person last proved who they are. */
	freshAt: Date;
}

/** Where a request comes from, for the limits on guessing. */
export interface Client {
	/** Network address. */
	address: string;
	/** Value of the device cookie, set after the first sign-in; null before. */
	device: string | null;
}

export interface Context extends Fixtures {
	/** Null for strangers. */
	actor: Actor | null;
	session: SessionInfo | null;
	client: Client;
	now: Date;
}
