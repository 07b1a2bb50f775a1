/** An office for service tests: people with roles, a clock that moves when told, a store in memory, a shelf on disk. */
import type { Client, Context, Fixtures } from '../../src/lib/server/context.ts';
import type { Db } from '../../src/lib/server/db/client.ts';
import { addPerson, readActor } from '../../src/lib/server/services/people.ts';
import { openSession } from '../../src/lib/server/services/sessions.ts';
import type { ObjectStore, StoredKey } from '../../src/lib/server/store/object-store.ts';
import type { Role } from '../../src/lib/workflow/permissions.ts';

export const ORIGIN = 'http://localhost:4700';
export const SECRET = 'a secret for tests that is long enough';

/** For tests that publish nothing: touching it fails. */
export const noShelf = {} as Fixtures['shelf'];

export class MemoryStore implements ObjectStore {
	readonly objects = new Map<string, Uint8Array>();
	/** When each was put. */
	readonly putAt = new Map<string, Date>();
	/** Thrown by every call while it is set. */
	failure: Error | null = null;

	async put(key: string, bytes: Uint8Array): Promise<void> {
		this.#answer();
		this.objects.set(key, bytes);
		this.putAt.set(key, new Date());
	}
	async get(key: string): Promise<Uint8Array | null> {
		this.#answer();
		return this.objects.get(key) ?? null;
	}
	async head(key: string): Promise<boolean> {
		this.#answer();
		return this.objects.has(key);
	}
	async remove(key: string): Promise<void> {
		this.#answer();
		this.objects.delete(key);
	}
	async list(prefix: string): Promise<StoredKey[]> {
		this.#answer();
		return [...this.objects.keys()]
			.filter((key) => key.startsWith(prefix))
			.map((key) => ({ key, putAt: this.putAt.get(key) ?? new Date() }));
	}
	close(): void {
		this.objects.clear();
	}
	#answer(): void {
		if (this.failure) throw this.failure;
	}
}

export class Office {
	now = new Date('2026-12-08T10:00:00Z');
	readonly store = new MemoryStore();
	/** A build of the reader's frame, for tests that release. */
	pressFolder = '';
	client: Client = { address: '192.0.2.7', device: null };
	#woken = 0;

	constructor(
		readonly db: Db,
		readonly shelf: Fixtures['shelf']
	) {}

	/** Moves the clock on. */
	wait(minutes: number): void {
		this.now = new Date(this.now.getTime() + minutes * 60_000);
	}

	/** How often a service has told the mail sender to look. */
	get woken(): number {
		return this.#woken;
	}

	stranger(): Context {
		return {
			db: this.db,
			store: this.store,
			shelf: this.shelf,
			mail: { wake: () => (this.#woken += 1) },
			house: { name: 'A house for tests', origin: ORIGIN },
			pressFolder: this.pressFolder,
			secret: SECRET,
			actor: null,
			session: null,
			client: this.client,
			now: this.now
		};
	}

	/** Adds a person; returns their id. The e-mail address is the first name's. */
	add(name: string, roles: Role[], passphraseHash: string | null = null): Promise<string> {
		const email = `${name.split(' ')[0]}@varrowmere.example`;
		return addPerson(this.stranger(), { email, name, roles, passphraseHash });
	}

	/** A context for this person as they stand now, signed in this minute. */
	async as(personId: string): Promise<Context> {
		return {
			...this.stranger(),
			actor: await readActor(this.db, personId),
			session: await openSession(this.db, this.now, personId)
		};
	}
}
