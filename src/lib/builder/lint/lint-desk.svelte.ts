/** Notes on the copy, for the margin. The reader of copy comes when the page rests; what was put away stays away here. */
import type { Node } from 'prosemirror-model';
import type { Transaction } from 'prosemirror-state';
import type { LintNote } from '../../copy-lint/note.ts';
import type { WidgetDocument } from '../../widget/document.ts';
import { schema } from '../schema.ts';
import { readPutAway, writePutAway } from './put-away.ts';

/** A note at its words in the manuscript. */
export interface PlacedNote {
	key: string;
	note: LintNote;
	/** Positions in the manuscript; of a block's field, the block's own. */
	from: number;
	to: number;
	blockId: string;
	/** The words it is about; '' where they stand in a field. */
	words: string;
}

interface Home {
	readonly state: { doc: Node; selection: { from: number; to: number } };
	readonly readOnly: boolean;
	change(make: (transaction: Transaction) => Transaction): void;
	focus(): void;
}

/** After a settled text, so that no keystroke waits for it. */
const REST_MS = 500;

export class LintDesk {
	notes = $state.raw<readonly PlacedNote[]>([]);

	readonly #home: Home;
	readonly #personId: string;
	readonly #slug: string;
	#putAway: Set<string> | null = null;
	#timer: ReturnType<typeof setTimeout> | undefined;

	constructor(home: Home, personId: string, slug: string) {
		this.#home = home;
		this.#personId = personId;
		this.#slug = slug;
	}

	/** Reads the document when the hands have rested a while longer. */
	later(document: WidgetDocument, doc: Node): void {
		if (this.#home.readOnly) return;
		clearTimeout(this.#timer);
		this.#timer = setTimeout(() => void this.#read(document, doc), REST_MS);
	}

	stop(): void {
		clearTimeout(this.#timer);
	}

	async #read(document: WidgetDocument, doc: Node): Promise<void> {
		const { lintCopy } = await import('../../copy-lint/lint.ts');
		this.#putAway ??= readPutAway(this.#personId, this.#slug);
		// Meanwhile the text may have changed: its own round comes.
		if (doc !== this.#home.state.doc) return;
		const putAway = this.#putAway;
		this.notes = placeNotes(doc, lintCopy(document)).filter(
			(placed) => !putAway.has(memoryOf(placed))
		);
	}

	/** Out of the margin, for this piece and on this device. */
	putAway(placed: PlacedNote): void {
		this.#putAway ??= new Set();
		this.#putAway.add(memoryOf(placed));
		writePutAway(this.#personId, this.#slug, this.#putAway);
		this.notes = this.notes.filter((other) => memoryOf(other) !== memoryOf(placed));
		this.#home.focus();
	}

	/** Puts the words it offers in place of those it is about. */
	take({ note, from, to, words }: PlacedNote): void {
		const { replacement } = note;
		const { doc } = this.#home.state;
		if (replacement === undefined || to > doc.content.size) return;
		if (words === '' || doc.textBetween(from, to) !== words) return;
		this.notes = this.notes.filter((other) => other.from !== from || other.to !== to);
		this.#home.change((transaction) =>
			replacement === ''
				? transaction.delete(from, to)
				: transaction.insertText(replacement, from, to)
		);
		this.#home.focus();
	}

	/** The note one stands in or, in its block, the nearest that offers words; false where there is none. */
	takeHere(): boolean {
		const { from } = this.#home.state.selection;
		const block = this.#home.state.doc.resolve(from).node(1) as Node | undefined;
		const blockId = block?.attrs.id as string | undefined;
		const offering = this.notes.filter(
			(placed) => placed.note.replacement !== undefined && placed.words !== ''
		);
		const nearest = offering
			.filter((placed) => placed.blockId === blockId || (placed.from <= from && from <= placed.to))
			.sort((a, b) => Math.abs(a.from - from) - Math.abs(b.from - from))[0];
		if (nearest) this.take(nearest);
		return nearest !== undefined;
	}
}

/** The same words under the same rule are put away wherever they stand. */
function memoryOf({ note, words }: PlacedNote): string {
	return `${note.code} ${words || note.block}`;
}

export function placeNotes(doc: Node, notes: readonly LintNote[]): PlacedNote[] {
	const starts = new Map<string, { pos: number; node: Node }>();
	doc.forEach((node, pos) => {
		const { name } = node.type;
		const isHead = name === 'title' || name === 'point';
		starts.set(isHead ? name : (node.attrs.id as string), { pos, node });
	});
	return notes.flatMap((note, index): PlacedNote[] => {
		const start = starts.get(note.block);
		if (!start) return [];
		const { pos, node } = start;
		const key = `lint ${note.block} ${note.code} ${note.from} ${index}`;
		if (!node.isTextblock) {
			return [{ key, note, from: pos, to: pos + node.nodeSize, blockId: note.block, words: '' }];
		}
		const [from, to] = [pos + 1 + note.from, pos + 1 + note.to];
		if (to > pos + 1 + node.content.size) return [];
		// What the widget prints is no word of the writer's.
		const words = hasAtoms(doc, from, to) ? '' : doc.textBetween(from, to);
		return [{ key, note, from, to, blockId: note.block, words }];
	});
}

function hasAtoms(doc: Node, from: number, to: number): boolean {
	let found = false;
	doc.nodesBetween(from, to, (node) => {
		if (node.type === schema.nodes.live || node.type === schema.nodes.setting) found = true;
	});
	return found;
}
