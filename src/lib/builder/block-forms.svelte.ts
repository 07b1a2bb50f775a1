/** Which block's fields are open: one that is about to be put in, or one that stands in the copy. */
import type { EditorState, Transaction } from 'prosemirror-state';
import { freshFields, type Bench, type FormKind } from './forms/fresh-fields.ts';
import { changeFields, insertFields } from './insert.ts';
import { isFieldBlockKind, type FieldBlockKind, type FieldsOf } from './schema.ts';

/** What the forms need of the manuscript they write in. */
export interface FormHome {
	state: EditorState;
	document: Bench['document'];
	firstReadings: Bench['readings'];
	calculators: Bench['calculators'];
	benchReadOnly: boolean;
	change(make: (transaction: Transaction) => Transaction): void;
	focus(): void;
}

export interface OpenForm {
	pos: number;
	kind: FieldBlockKind;
	fields: FieldsOf<FieldBlockKind> | null;
	isNew: boolean;
	/** Pictures that were dropped on the copy or pasted into it. */
	files: readonly File[];
}

export class BlockForms {
	open = $state.raw<OpenForm | null>(null);
	/** Why what was asked for can't be put in yet, and where. */
	notYet = $state.raw<{ pos: number; says: string } | null>(null);
	/** The picture desk is open, to choose from. */
	choosing = $state(false);

	readonly #home: FormHome;

	constructor(home: FormHome) {
		this.#home = home;
	}

	/** Opens the form of a new block; says what has to be there first where nothing can be shown yet. */
	start(kind: FormKind, pos: number): void {
		const { document, firstReadings: readings, calculators } = this.#home;
		const fresh = freshFields(kind, { document, readings, calculators });
		this.notYet = fresh.ok ? null : { pos, says: fresh.says };
		if (fresh.ok)
			this.open = { pos, kind: fresh.kind, fields: fresh.fields, isNew: true, files: [] };
	}

	startPicture(pos: number, files: readonly File[] = []): void {
		this.notYet = null;
		this.choosing = true;
		this.open = { pos, kind: 'picture', fields: null, isNew: true, files };
	}

	/** Opens the form of the block at `pos`; false where it has none. */
	change(pos: number): boolean {
		const node = this.#home.state.doc.nodeAt(pos);
		const kind = node?.type.name ?? '';
		if (!node || !isFieldBlockKind(kind) || this.#home.benchReadOnly) return false;
		const fields = node.attrs.fields as FieldsOf<FieldBlockKind>;
		this.open = { pos, kind, fields, isNew: false, files: [] };
		return true;
	}

	/** A picture from the desk; the caption it had stays with its place. */
	placed(picture: FieldsOf<'picture'>): void {
		const { open } = this;
		if (!open) return;
		const before = open.fields as FieldsOf<'picture'> | null;
		this.choosing = false;
		this.open = { ...open, fields: { ...picture, caption: before?.caption ?? picture.caption } };
	}

	/** The desk is closed; the form goes with it when there is no picture yet. */
	chosenNone(): void {
		this.choosing = false;
		if (!this.open?.fields) this.leave();
	}

	keep(fields: FieldsOf<FieldBlockKind>): void {
		const { open } = this;
		if (!open) return;
		this.open = null;
		this.#home.change((transaction) =>
			open.isNew
				? insertFields(transaction, open.pos, open.kind, fields)
				: changeFields(transaction, open.pos, fields)
		);
		this.#home.focus();
	}

	leave(): void {
		this.open = null;
		this.choosing = false;
		this.notYet = null;
		this.#home.focus();
	}
}
