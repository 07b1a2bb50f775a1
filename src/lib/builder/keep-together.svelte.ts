/** Brings what someone else kept meanwhile into one’s own sheet, and holds what only a person can decide. */
import type { CalculatorSet } from '../physics/calculator.ts';
import type { WidgetDocument } from '../widget/document.ts';
import { decideAsk, type Choice } from '../widget/merge-ask.ts';
import { mergeDocuments } from '../widget/merge.ts';
import { parseDocument } from '../widget/parse.ts';
import type { TakenIn, TheirVersion } from './autosave.svelte.ts';
import { toDocument, toManuscript } from './convert.ts';
import { followedAsks, isMoot, openAsk, type OpenAsk } from './keep-asks.ts';
import type { PatientJournal } from './patient-journal.svelte.ts';

/** The sheet as far as merging goes; the manuscript is one. */
export interface Sheet {
	draft(): WidgetDocument;
	/** Takes in a merged document, outside undo. */
	takeIn(document: WidgetDocument): void;
	/** Turns the sheet into a document, in one undoable change. */
	rewrite(document: WidgetDocument): void;
}

export interface TogetherParts {
	sheet: Sheet;
	/** The house’s calculators; a document’s own formulas come with it. */
	calculators: CalculatorSet;
	journal: PatientJournal;
	/** Whose desk it is. */
	personId: string;
}

export class Together {
	/** What is still to be decided, oldest first. */
	asks = $state.raw<readonly OpenAsk[]>([]);
	/** Whose version came in last; null once that has been read. */
	taken = $state.raw<{ name: string; at: string; isSelf: boolean } | null>(null);

	readonly #parts: TogetherParts;

	constructor(parts: TogetherParts) {
		this.#parts = parts;
	}

	/** What a window of before left open. */
	async recall(): Promise<void> {
		const draft = this.#parts.sheet.draft();
		const listed = await this.#parts.journal.listAsks();
		const added = this.asks.filter(({ id }) => listed.every((ask) => ask.id !== id));
		this.asks = [...listed.filter((ask) => !isMoot(ask, draft)), ...added];
	}

	isSelf({ by }: Pick<OpenAsk, 'by'>): boolean {
		return by.personId === this.#parts.personId;
	}

	/** Merges their version into the sheet, over the document that both grew from (null: nobody knows it any more). */
	takeIn(base: unknown, theirs: TheirVersion): TakenIn {
		const { sheet, calculators } = this.#parts;
		const them = this.#read(theirs.document);
		if (!them) return 'unreadable';
		// Words that don’t hang together can’t be merged yet; the server says what to mend.
		const mine = this.#read(sheet.draft());
		if (!mine) return 'unfinished';
		const merged = mergeDocuments(this.#read(base) ?? nothingOf(them), mine, them, calculators);
		sheet.takeIn(merged.document);
		const by = theirs.savedBy;
		const fresh = merged.asks.map((ask) => openAsk(ask, by, theirs.savedAt));
		const after = merged.document;
		this.#keep(followedAsks(this.asks, { fresh, before: mine, theirs: them, after, by }));
		this.taken = { name: by.name, at: theirs.savedAt, isSelf: this.isSelf({ by }) };
		return 'taken';
	}

	/** Null when it is done; otherwise why it can’t be, and the ask stays open. */
	decide(ask: OpenAsk, choice: Choice): string | null {
		const { sheet, calculators } = this.#parts;
		const made = decideAsk(sheet.draft(), ask, choice, calculators);
		if (!made.ok) return made.message;
		if (choice !== ask.stands) sheet.rewrite(made.document);
		this.#keep(this.asks.filter(({ id }) => id !== ask.id));
		return null;
	}

	/** As the sheet would have it, so that nothing counts as changed that nobody changed. */
	#read(stored: unknown): WidgetDocument | null {
		const parsed = parseDocument(stored, this.#parts.calculators);
		if (!parsed.ok) return null;
		// An empty document gets a first line in the sheet, which is nobody’s change.
		return parsed.document.blocks.length === 0
			? parsed.document
			: toDocument(toManuscript(parsed.document));
	}

	#keep(asks: readonly OpenAsk[]): void {
		const { journal } = this.#parts;
		const open = new Set(asks.map(({ id }) => id));
		for (const { id } of this.asks) if (!open.has(id)) void journal.dropAsk(id);
		for (const ask of asks) if (!this.asks.includes(ask)) void journal.keepAsk(ask);
		this.asks = asks;
	}
}

/** Where nobody knows what both grew from, all that either has counts as new: nothing is taken for deleted. */
function nothingOf(document: WidgetDocument): WidgetDocument {
	return {
		...document,
		title: '',
		point: '',
		formulas: [],
		steps: [],
		controls: [],
		blocks: [],
		claims: []
	};
}
