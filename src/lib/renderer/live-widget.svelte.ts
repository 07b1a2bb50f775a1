/**
 * Joins a document with what the reader set, and derives the evaluation. The manuscript passes a document that
 * changes, the frame one that doesn't: the same components draw both. It travels by context, so that two widgets on a
 * page, or two requests on a server, never meet.
 */
import { createContext } from 'svelte';
import type { CalculatorSet, Refusal } from '../physics/calculator.ts';
import { commensurable } from '../physics/units/units.ts';
import type {
	Claim,
	Control,
	ControlValues,
	PictureBlock,
	ReadingRef,
	WidgetDocument
} from '../widget/document.ts';
import { evaluate, readingAt, type Evaluation, type ReadingOutcome } from '../widget/evaluate.ts';
import { settingWords } from '../widget/places.ts';
import {
	plainDecimal,
	printNumeral,
	printStated,
	statedValue,
	stateReading,
	type LiveFormat
} from '../widget/stated.ts';
import type { SetMath } from './math-node.ts';
import { readerWords, type ReaderWords } from './reader-words.ts';
import { nearestSetting } from '../widget/control-grid.ts';
import type { ClaimRecord } from './records.ts';
import type { Released } from './release.ts';

/** What stands where a number is printed: its words, or the sentence that says why there is none. */
export type Printed = { ok: true; words: string } | { ok: false; refusal: Refusal };

type PictureFile = PictureBlock['files'][number];

const ENDINGS: Record<PictureFile['type'], string> = {
	'image/webp': 'webp',
	'image/jpeg': 'jpg',
	'image/png': 'png'
};

/** What the office brings, where nothing has been printed yet. */
export interface OfficeParts {
	math(key: string): SetMath | undefined;
	pictureAddress(file: PictureFile): string;
}

export class LiveWidget {
	#document: () => WidgetDocument;
	#calculators: () => CalculatorSet;
	readonly #office: OfficeParts | null;

	/** What the reader moved, by control id; a control that is missing stands at its first setting. */
	values = $state<Record<string, number>>({});
	/** The claim whose record is open. */
	openClaim = $state<string | null>(null);
	/** True once the page answers to the reader. */
	awake = $state(false);

	evaluation: Evaluation = $derived.by(() =>
		evaluate(this.#document(), this.values, this.#calculators())
	);

	constructor(
		document: () => WidgetDocument,
		calculators: () => CalculatorSet,
		/** What was worked out when the piece was released; null in the office, where everything is worked out anew. */
		readonly released: Released | null = null,
		office: OfficeParts | null = null
	) {
		this.#office = office;
		this.#document = document;
		this.#calculators = calculators;
	}

	get document(): WidgetDocument {
		return this.#document();
	}

	get calculators(): CalculatorSet {
		return this.#calculators();
	}

	/** How a claim is known; undefined where nobody may ask. */
	record(claimId: string): ClaimRecord | undefined {
		const { records } = this.released ?? {};
		return records && Object.hasOwn(records, claimId) ? records[claimId] : undefined;
	}

	get atStart(): boolean {
		return this.document.controls.every((control) => this.valueOf(control) === control.initial);
	}

	control(id: string): Control | undefined {
		return this.document.controls.find((control) => control.id === id);
	}

	claim(id: string): Claim | undefined {
		return this.document.claims.find((claim) => claim.id === id);
	}

	valueOf(control: Control): number {
		return this.evaluation.values[control.id] ?? control.initial;
	}

	/** Takes the nearest value the control can have. Unknown controls and values that aren't finite change nothing. */
	setValue(controlId: string, value: number): void {
		const control = this.control(controlId);
		if (control && Number.isFinite(value)) this.values[controlId] = nearestSetting(control, value);
	}

	reset(): void {
		this.values = {};
	}

	/** Sets the given controls, and all others back to where they start. */
	setAll(values: ControlValues): void {
		this.reset();
		for (const [id, value] of Object.entries(values)) this.setValue(id, value);
	}

	/** What the widget itself says, in the language of the piece. */
	get words(): ReaderWords {
		return readerWords(this.document.language);
	}

	/** An equation as set on the server; undefined until it is there. */
	math(key: string): SetMath | undefined {
		return this.#office?.math(key) ?? this.released?.math[key];
	}

	/** Where a picture's file is: beside the release for readers, behind the door for the office. */
	pictureAddress(file: PictureFile): string {
		return this.#office?.pictureAddress(file) ?? `/press/${file.digest}.${ENDINGS[file.type]}`;
	}

	reading(ref: ReadingRef): ReadingOutcome {
		return readingAt(this.document, this.evaluation, ref, this.calculators);
	}

	/** A live claim as it prints at these settings. */
	printClaim(claim: Extract<Claim, { form: 'live' }>): Printed {
		const outcome = this.reading(claim.reading);
		if (!outcome.ok) return outcome;
		const { value, unit, quantity } = outcome.reading;
		if (typeof value === 'string') return { ok: true, words: value };
		if (!Number.isFinite(value)) return noNumber(this.words.noNumberAtSetting);
		if (!commensurable(unit, claim.unit))
			return noNumber(`This reading can’t be given in ${claim.unit || 'plain numbers'}.`);
		const { language } = this.document;
		const stated = stateReading(
			value,
			unit,
			claim,
			quantity,
			language,
			outcome.reading.uncertainty
		);
		return { ok: true, words: printStated(stated, language) };
	}

	/** A reading by a format, in words; the sentence that says why there is none where it is refused. */
	printReading(ref: ReadingRef, format: LiveFormat): string {
		return this.printOutcome(this.reading(ref), format, 'words');
	}

	/** `number` leaves the unit out, where a row or an axis has said it. */
	printOutcome(outcome: ReadingOutcome, format: LiveFormat, as: 'words' | 'number'): string {
		if (!outcome.ok) return as === 'words' ? outcome.refusal.message : '–';
		const { value, unit, quantity } = outcome.reading;
		if (typeof value === 'string') return value;
		if (!Number.isFinite(value) || !commensurable(unit, format.unit)) return '–';
		const { language } = this.document;
		const stated = stateReading(value, unit, format, quantity, language);
		if (as === 'words') return printStated(stated, language);
		return printNumeral(plainDecimal(statedValue(stated)), language);
	}

	/** A control's value in words: “180 million years”. */
	printSetting(controlId: string): string {
		return settingWords(this.document, this.evaluation, controlId);
	}

	/** The value a control starts at, in words. */
	printFirstSetting(controlId: string): string {
		return settingWords(this.document, { values: {} }, controlId);
	}
}

function noNumber(message: string): Printed {
	return { ok: false, refusal: { code: 'no-number', message } };
}

export const [getLiveWidget, setLiveWidget] = createContext<LiveWidget>();
