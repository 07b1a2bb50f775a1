/**
 * One manuscript on the desk of one writer: the editor, the document that follows from it, and how its numbers weigh.
 * Typing changes the editor at once; the document and the verdicts follow when the hands rest.
 */
import { closeHistory } from 'prosemirror-history';
import {
	NodeSelection,
	TextSelection,
	type EditorState,
	type Transaction
} from 'prosemirror-state';
import type { EditorView } from 'prosemirror-view';
import { judgeClaims } from '../factcheck/judge.ts';
import { loadLexicon } from '../factcheck/lexicon/load.ts';
import { hasLexicon } from '../factcheck/lexicon/shelf.ts';
import type { Calculator, CalculatorSet } from '../physics/calculator.ts';
import { LiveWidget } from '../renderer/live-widget.svelte.ts';
import { officeParts } from '../typeset/office-parts.svelte.ts';
import { benchSet } from '../widget/bench-set.ts';
import type { Control, FormulaStep, Step, WidgetDocument } from '../widget/document.ts';
import type { Language } from '../widget/language.ts';
import { evaluate, type Evaluation } from '../widget/evaluate.ts';
import { formulaCalculatorId } from '../widget/formula-id.ts';
import { parseDocument, type Issue } from '../widget/parse.ts';
import { claimPlaces, wordsAt, type ClaimPlace, type Words } from '../widget/places.ts';
import type { QueryView } from '../workflow/piece.ts';
import { mayCompose, type VettingState } from '../workflow/vetting.ts';
import { BenchDrawer } from './bench-drawer.svelte.ts';
import { Bringing } from './bring-in/bringing.svelte.ts';
import { BlockForms } from './block-forms.svelte.ts';
import { benchReadings, sameRef, type BenchReading } from './bench-readings.ts';
import { toDocument, toManuscript } from './convert.ts';
import { createState } from './editor-state.ts';
import { withFormula } from './formula/keep-formula.ts';
import { formulaState } from './formula/formula-state.ts';
import { bringsWholeDocument, type HeadLine } from './head-limits.ts';
import { insertControl } from './insert.ts';
import { takeIn, writeInto } from './keep-merged.ts';
import { looseEnds, remove, type PrintedWords, type Removed } from './loosen.ts';
import { LintDesk } from './lint/lint-desk.svelte.ts';
import { mountEditor } from './mount-editor.ts';
import { isUndeclared, numberByHand, type NumberInCopy } from './quantities.ts';
import { wiringOf } from './schema.ts';
import {
	focusedNumber,
	NOTHING_WEIGHED,
	numbersOf,
	stateOf,
	weighingKey,
	type NumberState,
	type Weighing
} from './weighing.ts';

/** Typing rests this long before the document is read and weighed again. */
const REST_MS = 200;

export interface ManuscriptParts {
	document: WidgetDocument;
	calculators: CalculatorSet;
	/** Where the house's own calculators stand in their vetting; the software's are vetted. */
	states: Readonly<Record<string, VettingState>>;
	readOnly: boolean;
	/** Open queries on the newest proof. */
	queries: readonly QueryView[];
	/** Digests of formulas that are vetted. */
	vettedFormulas: readonly string[];
	/** Whose desk it is, and which piece: what isn't in the document yet is kept in this browser under both. */
	personId: string;
	slug: string;
	/** Told of every change of words or wiring. */
	changed: () => void;
}

export class Manuscript extends BenchDrawer {
	state: EditorState;
	/** The newest document that hangs together. */
	document: WidgetDocument;
	/** Why the newest one doesn't, if it doesn't. */
	issues = $state.raw<Issue[]>([]);
	weighing = $state.raw<Weighing>(NOTHING_WEIGHED);
	/** The copy's numbers as they stood when the hands last rested; what is drawn on them follows every key. */
	numbers = $state.raw<readonly NumberInCopy[]>([]);
	/** Goes up whenever the copy has been laid out anew, for what is placed beside it. */
	laidOut = $state(0);

	/** The line that would have grown too long by the last change, which wasn't made. */
	heldBack = $state.raw<HeadLine | null>(null);
	/** Key of the number whose list of readings is open. */
	tying = $state<string | null>(null);
	/** Position of the block at which something is to be inserted. */
	inserting = $state<number | null>(null);
	readonly forms: BlockForms = new BlockForms(this);
	readonly bringing: Bringing = new Bringing(this);
	readonly lint: LintDesk;
	/** Words that were selected to be marked by hand. */
	byHand = $state.raw<NumberInCopy | null>(null);
	/** Key of the number whose note is raised from below, where there is no margin. */
	raised = $state<string | null>(null);

	readonly personId: string;
	readonly slug: string;
	readonly #house: CalculatorSet;
	readonly #vettedFormulas: ReadonlySet<string>;
	readonly #states: Readonly<Record<string, VettingState>>;
	readonly readOnly: boolean;
	readonly queries: readonly QueryView[];
	readonly widget: LiveWidget;

	#changed: () => void;
	#view: EditorView | null = null;
	#settleTimer: ReturnType<typeof setTimeout> | undefined;

	constructor(parts: ManuscriptParts) {
		super();
		this.personId = parts.personId;
		this.slug = parts.slug;
		this.lint = new LintDesk(this, parts.personId, parts.slug);
		this.#house = parts.calculators;
		this.#vettedFormulas = new Set(parts.vettedFormulas);
		this.#states = parts.states;
		this.readOnly = parts.readOnly;
		this.queries = parts.queries;
		this.#changed = parts.changed;
		this.document = $state.raw(parts.document);
		this.state = $state.raw(createState(toManuscript(parts.document), this));
		this.widget = new LiveWidget(
			() => this.document,
			() => this.calculators,
			null,
			officeParts(() => this.calculators)
		);
	}

	vettingOf(calculatorId: string): VettingState {
		const formula = this.document.formulas.find(
			({ id }) => formulaCalculatorId(id) === calculatorId
		);
		if (!formula) return this.#states[calculatorId] ?? 'vetted';
		return formulaState(formula, this.calculators, this.#vettedFormulas);
	}

	/** The calculators that may be hung on the bench: what was superseded or withdrawn stays where it hangs, and is not offered. */
	get offered(): Calculator[] {
		return [...this.calculators.values()].filter(({ id }) => mayCompose(this.vettingOf(id)));
	}

	// What follows from the state

	/** The house's calculators, and the piece's own formulas in front of them. */
	calculators: CalculatorSet = $derived.by(() => benchSet(this.document, this.#house));
	focused = $derived.by(() => focusedNumber(this.state));
	wiring = $derived.by(() => wiringOf(this.state.doc));
	/** Readings as the controls stand now, for the bench. */
	readings: BenchReading[] = $derived.by(() =>
		benchReadings(this.document, this.widget.evaluation, this.calculators)
	);
	/** Readings at the first settings: what stated words are weighed against. */
	firstEvaluation: Evaluation = $derived.by(() => evaluate(this.document, {}, this.calculators));
	firstReadings: BenchReading[] = $derived.by(() =>
		benchReadings(this.document, this.firstEvaluation, this.calculators)
	);
	/** The words of any inline as the controls stand now. */
	words: Words = $derived.by(() =>
		wordsAt(this.document, this.widget.evaluation, this.calculators)
	);
	places: ReadonlyMap<string, ClaimPlace> = $derived.by(
		() => new Map(claimPlaces(this.document, this.words).map((place) => [place.claim.id, place]))
	);
	unweighed = $derived.by(() => this.numbers.filter(isUndeclared));

	stateOf(number: NumberInCopy): NumberState {
		return stateOf(number, this.weighing);
	}

	/** The number's words as they stand in the copy now. */
	wordsOf(number: NumberInCopy): string {
		if (number.words) return number.words;
		if (number.control !== null) return this.words({ kind: 'setting', control: number.control });
		return number.claim ? this.words({ kind: 'live', claim: number.claim.id }) : '';
	}

	readonly #printed: PrintedWords = {
		live: (claim) => this.words({ kind: 'live', claim }),
		setting: (control) => this.words({ kind: 'setting', control })
	};

	// The editor

	mount(target: HTMLElement, label: string): () => void {
		const isFresh = !this.readOnly && this.document.blocks.length === 0;
		const view = mountEditor(target, this, { label, isFresh }, (transaction) =>
			this.#apply(transaction)
		);
		this.#view = view;
		this.settle();
		if (isFresh) this.#startWriting();
		return () => {
			clearTimeout(this.#settleTimer);
			this.lint.stop();
			this.#view = null;
			view.destroy();
		};
	}

	/** On a sheet nobody has written on, the caret waits in the first line that is still empty. */
	#startWriting(): void {
		const { doc } = this.state;
		const title = doc.child(0);
		const at = title.content.size === 0 ? 1 : title.nodeSize + 1;
		this.#apply(this.state.tr.setSelection(TextSelection.create(doc, at)));
		this.focus();
	}

	get benchReadOnly(): boolean {
		return this.readOnly || this.isPhone;
	}

	get view(): EditorView | null {
		return this.#view;
	}

	#apply(transaction: Transaction): void {
		const before = this.state.doc;
		const next = this.state.apply(transaction);
		this.#view?.updateState(next);
		this.state = next;
		if (next.doc === before) return;
		this.heldBack = null;
		this.forms.notYet = null;
		this.byHand = null;
		this.#changed();
		clearTimeout(this.#settleTimer);
		this.#settleTimer = setTimeout(() => this.settle(), REST_MS);
	}

	/** Reads and weighs the document as it stands. */
	settle(): void {
		clearTimeout(this.#settleTimer);
		this.#settleTimer = undefined;
		const { language } = this.wiring;
		if (!hasLexicon(language)) void this.#fetchLanguage(language);
		this.numbers = this.#withByHand(numbersOf(this.state.doc));
		const parsed = parseDocument(toDocument(this.state.doc), this.#house);
		if (parsed.ok) {
			this.document = parsed.document;
			this.issues = [];
			this.weighing = {
				verdicts: judgeClaims(parsed.document, this.calculators),
				tags: this.#tags(parsed.document),
				queried: new Set(this.queries.filter(({ closedAt }) => !closedAt).map(({ claim }) => claim))
			};
			this.#apply(this.state.tr.setMeta(weighingKey, this.weighing).setMeta('addToHistory', false));
			this.lint.later(parsed.document, this.state.doc);
		} else this.issues = parsed.issues;
		this.laidOut += 1;
	}

	#withByHand(numbers: readonly NumberInCopy[]): readonly NumberInCopy[] {
		const { byHand } = this;
		if (!byHand) return numbers;
		const apart = numbers.filter(({ from, to }) => to <= byHand.from || from >= byHand.to);
		return [...apart, byHand].sort((a, b) => a.from - b.from);
	}

	/** Another language for words, numbers and print; its lexicon comes first. */
	async setLanguage(language: Language): Promise<void> {
		await loadLexicon(language);
		this.change((transaction) => transaction.setDocAttribute('language', language));
	}

	/** A version of the piece in a language that isn't at hand yet. */
	async #fetchLanguage(language: Language): Promise<void> {
		await loadLexicon(language);
		if (this.#view) this.settle();
	}

	pasteHtml(html: string): void {
		void this.bringing.paste(html);
	}

	bringFile(file: File): void {
		void this.bringing.file(file);
	}

	#tags(document: WidgetDocument): Map<string, string> {
		const readings = this.firstReadings;
		return new Map(
			document.claims.flatMap((claim): [string, string][] => {
				if (claim.form === 'exempt') return [];
				const tag = readings.find(({ ref }) => sameRef(ref, claim.reading))?.tag;
				return tag ? [[claim.id, tag]] : [];
			})
		);
	}

	/** One change of words and wiring that undo takes back whole. */
	change(make: (transaction: Transaction) => Transaction): void {
		if (this.readOnly) return;
		this.#apply(closeHistory(make(this.state.tr)));
		this.settle();
	}

	focus(): void {
		this.#view?.focus();
	}

	/** Puts the caret right after a number, so that it is the focused one. */
	goToNumber(number: NumberInCopy): void {
		const { doc } = this.state;
		const selection =
			number.words === ''
				? NodeSelection.create(doc, number.from)
				: TextSelection.create(doc, number.to);
		this.#apply(this.state.tr.setSelection(selection).scrollIntoView());
		this.focus();
	}

	goToBlock(blockId: string): void {
		this.state.doc.forEach((block, offset) => {
			if (block.attrs.id !== blockId) return;
			const selection = block.isAtom
				? NodeSelection.create(this.state.doc, offset)
				: TextSelection.near(this.state.doc.resolve(offset + 1));
			this.#apply(this.state.tr.setSelection(selection).scrollIntoView());
			this.focus();
		});
	}

	goToTop(): void {
		this.#apply(this.state.tr.setSelection(TextSelection.atStart(this.state.doc)).scrollIntoView());
		this.focus();
	}

	/** From the caret on, around the end; false when every number is declared. */
	goToNextUnweighed(): boolean {
		if (this.#settleTimer !== undefined) this.settle();
		const { from } = this.state.selection;
		const next = this.unweighed.find((number) => number.to > from) ?? this.unweighed[0];
		if (!next) return false;
		this.goToNumber(next);
		return true;
	}

	openTie(number: NumberInCopy): void {
		if (this.readOnly || number.control !== null) return;
		// The list compares with readings: it can't wait until the hands rest.
		if (this.#settleTimer !== undefined) this.settle();
		this.tying = number.key;
	}

	/** Marks the selected words as a number, whatever the detector makes of them; false where they can't be one. */
	tieSelection(): boolean {
		const { from, to } = this.state.selection;
		const number = numberByHand(this.state.doc, from, to);
		if (!number || this.readOnly) return false;
		if (this.#settleTimer !== undefined) this.settle();
		this.byHand = number;
		this.numbers = this.#withByHand(this.numbers);
		this.laidOut += 1;
		this.tying = number.key;
		return true;
	}

	closeTie(): void {
		this.tying = null;
		if (this.byHand) {
			this.byHand = null;
			this.numbers = numbersOf(this.state.doc);
		}
		this.focus();
	}

	/** Takes another version of the whole piece; undo brings the old one back. */
	replaceDocument(document: WidgetDocument): void {
		const next = toManuscript(document);
		this.change((transaction) => {
			bringsWholeDocument(transaction);
			transaction.replaceWith(0, transaction.doc.content.size, next.content);
			for (const [name, value] of Object.entries(next.attrs))
				transaction.setDocAttribute(name, value);
			return transaction;
		});
	}

	/** Takes in what a merge made of this sheet and another's, block by block: undo goes on over it. */
	takeIn(document: WidgetDocument): void {
		this.#apply(takeIn(this.state, document));
		this.settle();
	}

	/** Turns the sheet into this document in one undoable change that leaves alone what is the same. */
	rewrite(document: WidgetDocument): void {
		this.change((transaction) => writeInto(transaction, document));
	}

	/** The document as typed, whether or not it hangs together yet. */
	draft(): WidgetDocument {
		return toDocument(this.state.doc);
	}

	// The bench

	addStep(step: Step): void {
		this.change((transaction) =>
			transaction.setDocAttribute('steps', [...this.wiring.steps, step])
		);
	}

	/**
	 * Hangs a formula on the bench, or puts it in the place of what it was, with all that hangs on it. Says why it can't be
	 * so; '' when it is done.
	 */
	keepFormula(formula: FormulaStep, renamed: ReadonlyMap<string, string>): string {
		const next = withFormula(this.state.tr, formula, renamed);
		const parsed = parseDocument(toDocument(next.doc), this.#house);
		if (!parsed.ok && this.issues.length === 0)
			return parsed.issues.map(({ message }) => message).join(' ');
		this.change((transaction) => withFormula(transaction, formula, renamed));
		return '';
	}

	replaceStep(step: Step): void {
		this.change((transaction) =>
			transaction.setDocAttribute(
				'steps',
				this.wiring.steps.map((other) => (other.id === step.id ? step : other))
			)
		);
	}

	/** Adds a control and hangs a calculator's setting on it, and puts it into the copy at `pos`, in one change. */
	addControl(control: Control, step: Step, pos: number | null = null): void {
		this.change((transaction) => {
			const { controls, steps } = this.wiring;
			transaction.setDocAttribute('controls', [...controls, control]).setDocAttribute(
				'steps',
				steps.map((other) => (other.id === step.id ? step : other))
			);
			return pos === null ? transaction : insertControl(transaction, pos, control.id);
		});
	}

	replaceControl(control: Control): void {
		this.change((transaction) =>
			transaction.setDocAttribute(
				'controls',
				this.wiring.controls.map((other) => (other.id === control.id ? control : other))
			)
		);
	}

	insertControl(control: string, pos: number = this.state.selection.from): void {
		this.change((transaction) => insertControl(transaction, pos, control));
	}

	looseEnds(removed: Removed): string[] {
		return looseEnds(this.state.doc, removed, this.calculators, this.#printed);
	}

	remove(removed: Removed): void {
		this.change((transaction) => remove(transaction, removed, this.calculators, this.#printed));
	}
}
