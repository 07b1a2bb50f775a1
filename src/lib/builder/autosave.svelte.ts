/**
 * Keeps the draft: into this browser's journal at once, to the server a moment later, and says where it stands.
 * Nothing here is thrown away until the server has said that it keeps it. Where someone else has kept a newer version,
 * it is merged in over the last one that both had, and the result is kept.
 */
import type { WidgetDocument } from '../widget/document.ts';
import { digestOf } from '../widget/freeze.ts';
import type { JournalEntry } from './journal.ts';
import type { PatientJournal } from './patient-journal.svelte.ts';

/** How long typing rests before the server is asked to keep it. */
const REST_MS = 400;
/** A writer who never rests is kept this often. */
const LONGEST_WAIT_MS = 2_000;
const JOURNAL_MS = 200;
const FIRST_RETRY_MS = 1_000;
const LONGEST_RETRY_MS = 15_000;
/** A server that takes longer than this to answer counts as away. */
const LONGEST_ANSWER_MS = 15_000;
const MOST_TURNS = 4;

export type KeepState =
	| { name: 'kept' }
	| { name: 'unsynced' }
	| { name: 'keeping' }
	/** The server doesn't answer; `nextTry` counts from 1. */
	| { name: 'away'; tries: number }
	| { name: 'signed-out' }
	/** Someone's newer version can't be read in this window. */
	| { name: 'unreadable'; theirs: TheirVersion }
	| { name: 'refused'; issues: RefusedIssue[] };

export interface RefusedIssue {
	/** Where in the document: `blocks.3.content.0.text`; '' for the whole of it. */
	path: string;
	message: string;
}

export interface TheirVersion {
	version: number;
	savedAt: string;
	savedBy: { personId: string; name: string };
	document: unknown;
}

/** `unfinished`: one's own words don't hang together, so the server's answer to them comes first. */
export type TakenIn = 'taken' | 'unreadable' | 'unfinished';

export interface Kept {
	version: number;
	/** ISO 8601, UTC. */
	savedAt: string;
}

/** What the sheet starts from: what the server has. */
export interface Started extends Kept {
	document: unknown;
}

export interface AutosaveParts {
	address: string;
	journal: PatientJournal;
	fetch: typeof fetch;
	now: () => Date;
	/** The draft as it stands; called when it is about to be kept. */
	draft: () => WidgetDocument;
	/** Merges their version into the draft, over the document that both grew from; null when that isn't known. */
	takeIn: (base: unknown, theirs: TheirVersion) => TakenIn;
}

export class Autosave {
	state = $state.raw<KeepState>({ name: 'kept' });
	/** When the server last said “kept”; ISO 8601, UTC. */
	keptAt = $state('');
	version = $state(0);

	#parts: AutosaveParts;
	#keepTimer: ReturnType<typeof setTimeout> | undefined;
	#journalTimer: ReturnType<typeof setTimeout> | undefined;
	#waitingSince: number | null = null;
	#changesMade = 0;
	#underWay: Promise<void> | null = null;
	/** The document of `version`, as the server has it; null when it isn't known. */
	#base: unknown;
	/** Digests of drafts sent whose answer never came: the server may have kept one of them all the same. */
	#unanswered = new Set<string>();

	constructor(parts: AutosaveParts, { version, savedAt, document }: Started) {
		this.#parts = parts;
		this.version = version;
		this.keptAt = savedAt;
		this.#base = document;
	}

	get isSynced(): boolean {
		return this.state.name === 'kept';
	}

	/** To be called on every change of the draft. */
	changed(): void {
		this.#changesMade += 1;
		const { name } = this.state;
		if (name === 'kept' || name === 'refused') this.state = { name: 'unsynced' };
		this.#journalTimer ??= setTimeout(() => void this.flushJournal(), JOURNAL_MS);
		// What can't be read waits for a newer window, a lost sign-in and an away server for their own next try.
		if (name === 'unreadable' || name === 'signed-out' || name === 'away') return;
		this.#keepSoon();
	}

	#keepSoon(): void {
		const now = this.#parts.now().getTime();
		this.#waitingSince ??= now;
		const wait = Math.max(0, Math.min(REST_MS, this.#waitingSince + LONGEST_WAIT_MS - now));
		clearTimeout(this.#keepTimer);
		this.#keepTimer = setTimeout(() => void this.keep(), wait);
	}

	/** Writes the journal now: on its timer, and when the page goes away. */
	async flushJournal(): Promise<void> {
		clearTimeout(this.#journalTimer);
		this.#journalTimer = undefined;
		if (this.isSynced) return;
		await this.#parts.journal.write(this.entry());
	}

	/** The draft as it stands, for the journal. */
	entry(): JournalEntry {
		// The journal outlives this page, so it takes plain data, not the editor's own objects.
		const document: unknown = JSON.parse(JSON.stringify(this.#parts.draft()));
		const at = this.#parts.now().toISOString();
		return { baseVersion: this.version, base: this.#base, document, at };
	}

	/** Goes on from words that a window left behind: they grew from this version, and aren't kept yet. */
	goOnFrom({ baseVersion, base }: JournalEntry): void {
		this.version = baseVersion;
		this.#base = base ?? null;
	}

	/** Asks the server to keep the draft as it stands; tries again by itself while the server is away. */
	async keep(): Promise<void> {
		clearTimeout(this.#keepTimer);
		if (this.#underWay) return this.#keepSoon();
		const sending = this.#send();
		this.#underWay = sending;
		try {
			await sending;
		} finally {
			this.#underWay = null;
		}
	}

	/** Waits for the save under way, then keeps what was typed since. True when the server has every word. */
	async keepAll(): Promise<boolean> {
		await this.#underWay;
		// What a merge brings in is one more save; someone who keeps typing beside us could go on for ever.
		for (let turn = 0; turn < MOST_TURNS && !this.isSynced; turn += 1) {
			await this.tryNow();
			if ((this.state as KeepState).name !== 'unsynced') break;
		}
		return this.isSynced;
	}

	async #send(): Promise<void> {
		this.#waitingSince = null;
		const sentChanges = this.#changesMade;
		const tries = this.state.name === 'away' ? this.state.tries : 0;
		if (tries === 0) this.state = { name: 'keeping' };
		const body = JSON.stringify({ baseVersion: this.version, document: this.#parts.draft() });
		this.#unanswered.add(digestOf(documentIn(body)));
		try {
			const response = await this.#parts.fetch(this.#parts.address, {
				method: 'PUT',
				headers: { 'content-type': 'application/json' },
				body,
				signal: AbortSignal.timeout(LONGEST_ANSWER_MS)
			});
			await this.#settle(response, body, sentChanges, tries);
		} catch {
			// No answer, half an answer, or one that isn't the house's own: to the writer, the server is away.
			this.#tryLater(tries);
		}
	}

	async #settle(
		response: Response,
		body: string,
		sentChanges: number,
		tries: number
	): Promise<void> {
		if (response.ok) return this.#settleKept((await response.json()) as Kept, body, sentChanges);
		switch (response.status) {
			case 401:
				this.state = { name: 'signed-out' };
				break;
			case 409:
				this.#settleConflict(theirVersion(await response.json()));
				break;
			case 422:
			case 413:
			case 403:
				this.state = { name: 'refused', issues: issuesOf(await response.json()) };
				break;
			default:
				this.#tryLater(tries);
		}
		void this.flushJournal();
	}

	#settleKept({ version, savedAt }: Kept, body: string, sentChanges: number): void {
		this.#base = documentIn(body);
		this.version = version;
		this.keptAt = savedAt;
		this.#unanswered.clear();
		if (this.#changesMade === sentChanges) {
			this.state = { name: 'kept' };
			clearTimeout(this.#journalTimer);
			this.#journalTimer = undefined;
			void this.#parts.journal.clear();
			return;
		}
		this.state = { name: 'unsynced' };
		this.#keepSoon();
	}

	/** The newer version may be one of our own, whose answer was lost on the way; any other is merged in. */
	#settleConflict(theirs: TheirVersion): void {
		if (!this.#unanswered.has(digestOf(theirs.document))) {
			const taken = this.#parts.takeIn(this.#base, theirs);
			if (taken === 'unreadable') {
				this.state = { name: 'unreadable', theirs };
				return;
			}
			if (taken === 'unfinished') {
				this.state = { name: 'unsynced' };
				this.#keepSoon();
				return;
			}
		}
		this.version = theirs.version;
		this.#base = theirs.document;
		this.keptAt = theirs.savedAt;
		this.state = { name: 'unsynced' };
		this.#keepSoon();
	}

	#tryLater(tries: number): void {
		this.state = { name: 'away', tries: tries + 1 };
		const wait = Math.min(LONGEST_RETRY_MS, FIRST_RETRY_MS * 2 ** tries);
		clearTimeout(this.#keepTimer);
		this.#keepTimer = setTimeout(() => void this.keep(), wait);
	}

	/** After a sign-in in another tab, or when the writer doesn't want to wait. */
	tryNow(): Promise<void> {
		this.state = { name: 'unsynced' };
		return this.keep();
	}

	/** The network is back: what waits for the server needn't wait out its time. */
	online(): void {
		if (this.state.name === 'away') void this.tryNow();
	}

	stop(): void {
		clearTimeout(this.#keepTimer);
		clearTimeout(this.#journalTimer);
	}
}

interface ConflictDetails {
	version: number;
	savedAt: string;
	savedBy: { personId: string; name: string };
	document: unknown;
}

/** The 409 answer's details: who saved what, when. */
function theirVersion(body: unknown): TheirVersion {
	const { version, savedAt, savedBy, document } = (body as { error: { details: ConflictDetails } })
		.error.details;
	return { version, savedAt, savedBy, document };
}

function issuesOf(body: unknown): RefusedIssue[] {
	const { error } = body as {
		error?: { message?: string; help?: string; details?: { issues?: RefusedIssue[] } };
	};
	const issues = error?.details?.issues ?? [];
	if (issues.length > 0) return issues;
	const message = [error?.message, error?.help].filter(Boolean).join(' ');
	return [{ path: '', message: message || 'The server can’t keep this draft.' }];
}

/** A body's document as the server reads it: what JSON doesn't carry is gone. */
function documentIn(body: string): unknown {
	return (JSON.parse(body) as { document: unknown }).document;
}
