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
import { EditorView } from 'prosemirror-view';
import { judgeClaims } from '../factcheck/judge.ts';
import type { Calculator, CalculatorSet } from '../physics/calculator.ts';
import { LiveWidget } from '../renderer/live-widget.svelte.ts';
import type { Control, Step, WidgetDocument } from '../widget/document.ts';
import { evaluate, type Evaluation } from '../widget/evaluate.ts';
import { MediaQuery } from 'svelte/reactivity';
import { parseDocument, type Issue } from '../widget/parse.ts';
import { claimPlaces, wordsAt, type ClaimPlace, type Words } from '../widget/places.ts';
import type { QueryView } from '../workflow/piece.ts';
import { mayCompose, type VettingState } from '../workflow/vetting.ts';
import { benchReadings, sameRef, type BenchReading } from './bench-readings.ts';
import { toDocument, toManuscript } from './convert.ts';
import { createState } from './editor-state.ts';
import { bringsWholeDocument, type HeadLine } from './head-limits.ts';
import { changeChart, insertChart, insertControl } from './insert.ts';
import { looseEnds, remove, type PrintedWords, type Removed } from './loosen.ts';
import { BlockView, InlineView } from './node-views.svelte.ts';
import { isUndeclared, type NumberInCopy } from './quantities.ts';
import { wiringOf, type ChartFields } from './schema.ts';
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

export type BenchHeight = 'closed' | 'half' | 'full';

export interface ManuscriptParts {
	document: WidgetDocument;
	calculators: CalculatorSet;
	/** Where the house's own calculators stand in their vetting; the software's are vetted. */
	states: Readonly<Record<string, VettingState>>;
	readOnly: boolean;
	/** Open queries on the newest proof. */
	queries: readonly QueryView[];
	/** Told of every change of words or wiring. */
	changed: () => void;
}

export class Manuscript {
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
	bench = $state<BenchHeight>('closed');
	/** Key of the number whose list of readings is open. */
	tying = $state<string | null>(null);
	/** Position of the block at which something is to be inserted. */
	inserting = $state<number | null>(null);
	/** The chart whose fields are open: a new one at a block, or one that stands there. */
	charting = $state.raw<{ pos: number; fields: ChartFields | null } | null>(null);
	/** The search for a calculator is open on the bench. */
	searching = $state(false);
	/** Key of the number whose note is raised from below, where there is no margin. */
	raised = $state<string | null>(null);

	readonly calculators: CalculatorSet;
	readonly #states: Readonly<Record<string, VettingState>>;
	readonly readOnly: boolean;
	readonly queries: readonly QueryView[];
	readonly widget: LiveWidget;

	/** On a phone the copy can be edited; the bench is for looking at. */
	readonly #phone = new MediaQuery('width < 640px', false);

	#changed: () => void;
	#view: EditorView | null = null;
	#settleTimer: ReturnType<typeof setTimeout> | undefined;

	constructor(parts: ManuscriptParts) {
		this.calculators = parts.calculators;
		this.#states = parts.states;
		this.readOnly = parts.readOnly;
		this.queries = parts.queries;
		this.#changed = parts.changed;
		this.document = $state.raw(parts.document);
		this.state = $state.raw(createState(toManuscript(parts.document), this));
		this.widget = new LiveWidget(
			() => this.document,
			() => parts.calculators
		);
	}

	vettingOf(calculatorId: string): VettingState {
		return this.#states[calculatorId] ?? 'vetted';
	}

	/** The calculators that may be hung on the bench: what was superseded or withdrawn stays where it hangs, and is not offered. */
	get offered(): Calculator[] {
		return [...this.calculators.values()].filter(({ id }) => mayCompose(this.vettingOf(id)));
	}

	// What follows from the state

	focused = $derived.by(() => focusedNumber(this.state));
	wiring = $derived.by(() => wiringOf(this.state.doc));
	/** Readings as the sliders stand now, for the bench. */
	readings: BenchReading[] = $derived.by(() =>
		benchReadings(this.document, this.widget.evaluation, this.calculators)
	);
	/** Readings at the first settings: what stated words are weighed against. */
	firstEvaluation: Evaluation = $derived.by(() => evaluate(this.document, {}, this.calculators));
	firstReadings: BenchReading[] = $derived.by(() =>
		benchReadings(this.document, this.firstEvaluation, this.calculators)
	);
	/** The words of any inline as the sliders stand now. */
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
		const view = new EditorView(
			{ mount: target },
			{
				state: this.state,
				editable: () => !this.readOnly,
				// Cells of a pasted table have no place here; their words must not run together into other numbers.
				transformPastedHTML: (html) => html.replace(/<\/t[dh]\s*>/gi, ' $&'),
				// The bench lies over the sheet's foot: a line one goes to must stand above it.
				get scrollMargin() {
					const bench = document.querySelector('.bench-and-foot');
					return { top: 24, right: 0, bottom: (bench?.clientHeight ?? 0) + 32, left: 0 };
				},
				get scrollThreshold() {
					return this.scrollMargin;
				},
				attributes: {
					role: 'textbox',
					'aria-multiline': 'true',
					'aria-label': label,
					'aria-readonly': String(this.readOnly),
					// The router gives the focus of a new page to what asks for it.
					...(isFresh ? { autofocus: '' } : {}),
					spellcheck: 'true'
				},
				nodeViews: {
					control: (node) => new BlockView(node, this),
					chart: (node) => new BlockView(node, this),
					live: (node) => new InlineView(node, this),
					setting: (node) => new InlineView(node, this)
				},
				dispatchTransaction: (transaction) => this.#apply(transaction)
			}
		);
		this.#view = view;
		this.settle();
		if (isFresh) this.#startWriting();
		return () => {
			clearTimeout(this.#settleTimer);
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

	get isPhone(): boolean {
		return this.#phone.current;
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
		this.#changed();
		clearTimeout(this.#settleTimer);
		this.#settleTimer = setTimeout(() => this.settle(), REST_MS);
	}

	/** Reads and weighs the document as it stands. */
	settle(): void {
		clearTimeout(this.#settleTimer);
		this.#settleTimer = undefined;
		this.numbers = numbersOf(this.state.doc);
		const parsed = parseDocument(toDocument(this.state.doc), this.calculators);
		if (parsed.ok) {
			this.document = parsed.document;
			this.issues = [];
			this.weighing = {
				verdicts: judgeClaims(parsed.document, this.calculators),
				tags: this.#tags(parsed.document),
				queried: new Set(this.queries.filter(({ closedAt }) => !closedAt).map(({ claim }) => claim))
			};
			this.#apply(this.state.tr.setMeta(weighingKey, this.weighing).setMeta('addToHistory', false));
		} else this.issues = parsed.issues;
		this.laidOut += 1;
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

	closeTie(): void {
		this.tying = null;
		this.focus();
	}

	openSearch(): void {
		if (this.bench === 'closed') this.bench = 'half';
		this.searching = true;
	}

	cycleBench(): void {
		this.bench = this.bench === 'closed' ? 'half' : 'closed';
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

	/** Takes the server's own version: there is nothing to keep. */
	loadWithoutSaving(document: WidgetDocument): void {
		const changed = this.#changed;
		this.#changed = () => undefined;
		this.replaceDocument(document);
		this.#changed = changed;
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

	replaceStep(step: Step): void {
		this.change((transaction) =>
			transaction.setDocAttribute(
				'steps',
				this.wiring.steps.map((other) => (other.id === step.id ? step : other))
			)
		);
	}

	/** Adds a slider and hangs a calculator's setting on it in the same change. */
	addControl(control: Control, step: Step): void {
		this.change((transaction) =>
			transaction.setDocAttribute('controls', [...this.wiring.controls, control]).setDocAttribute(
				'steps',
				this.wiring.steps.map((other) => (other.id === step.id ? step : other))
			)
		);
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

	/** Puts the chart whose fields were open into the copy, or changes the one that stands there. */
	keepChart(fields: ChartFields): void {
		const open = this.charting;
		if (!open) return;
		this.charting = null;
		this.change((transaction) =>
			open.fields
				? changeChart(transaction, open.pos, fields)
				: insertChart(transaction, open.pos, fields)
		);
		this.focus();
	}

	looseEnds(removed: Removed): string[] {
		return looseEnds(this.state.doc, removed, this.calculators, this.#printed);
	}

	remove(removed: Removed): void {
		this.change((transaction) => remove(transaction, removed, this.calculators, this.#printed));
	}
}
