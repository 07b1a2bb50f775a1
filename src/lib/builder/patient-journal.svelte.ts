/**
 * A journal that never stands in the way: a browser that keeps no data, is full, or never answers makes it say
 * `works === false`, and everything else goes on.
 */
import type { Journal, JournalEntry, LeftEntry } from './journal.ts';
import type { OpenAsk } from './keep-asks.ts';

/** A browser that blocks its store may leave a request without any answer. */
const LONGEST_WAIT_MS = 2_000;

export class PatientJournal {
	/** False once this browser has failed to keep a copy; true again when it keeps one. */
	works = $state(true);
	/** Versions set aside, newest first. */
	aside = $state.raw<readonly JournalEntry[]>([]);

	#journal: Journal;

	constructor(journal: Journal) {
		this.#journal = journal;
	}

	read(): Promise<LeftEntry[]> {
		return this.#patiently(() => this.#journal.read(), []);
	}

	letGo(left: LeftEntry): Promise<void> {
		return this.#patiently(() => this.#journal.letGo(left), undefined);
	}

	write(entry: JournalEntry): Promise<void> {
		return this.#patiently(() => this.#journal.write(entry), undefined);
	}

	clear(): Promise<void> {
		return this.#patiently(() => this.#journal.clear(), undefined);
	}

	keepAsk(ask: OpenAsk): Promise<void> {
		return this.#patiently(() => this.#journal.keepAsk(ask), undefined);
	}

	listAsks(): Promise<OpenAsk[]> {
		return this.#patiently(() => this.#journal.listAsks(), []);
	}

	dropAsk(id: string): Promise<void> {
		return this.#patiently(() => this.#journal.dropAsk(id), undefined);
	}

	close(): void {
		this.#journal.close();
	}

	/** Sets words aside; they stay listed here even where the browser couldn't keep them. */
	async setAside(entry: JournalEntry): Promise<void> {
		this.aside = [entry, ...this.aside.filter(({ at }) => at !== entry.at)];
		await this.#patiently(() => this.#journal.setAside(entry), undefined);
	}

	async dropAside(at: string): Promise<void> {
		this.aside = this.aside.filter((entry) => entry.at !== at);
		await this.#patiently(() => this.#journal.dropAside(at), undefined);
	}

	/** Reads which versions are set aside. */
	async recallAside(): Promise<void> {
		const listed = await this.#patiently(() => this.#journal.listAside(), []);
		// One that was set aside while the list was read isn't in it yet.
		const added = this.aside.filter(({ at }) => listed.every((entry) => entry.at !== at));
		this.aside = [...added, ...listed];
	}

	async #patiently<Answer>(ask: () => Promise<Answer>, otherwise: Answer): Promise<Answer> {
		let timer: ReturnType<typeof setTimeout> | undefined;
		const tooLong = new Promise<never>((_, reject) => {
			timer = setTimeout(
				() => reject(new Error('The browser’s store gives no answer.')),
				LONGEST_WAIT_MS
			);
		});
		try {
			const answer = await Promise.race([ask(), tooLong]);
			this.works = true;
			return answer;
		} catch {
			// Whatever the store's trouble is, the writer learns of it from `works`, and the server still keeps the draft.
			this.works = false;
			return otherwise;
		} finally {
			clearTimeout(timer);
		}
	}
}
