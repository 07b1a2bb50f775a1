/**
 * Joins a document with what the reader set, and derives the evaluation. The manuscript passes a document that
 * changes, the frame one that doesn't: the same components draw both. It travels by context, so that two widgets on a
 * page, or two requests on a server, never meet.
 */
import { createContext } from 'svelte';
import type { CalculatorSet, Refusal } from '../physics/calculator.ts';
import { commensurable } from '../physics/units/units.ts';
import type { Claim, Control, ReadingRef, WidgetDocument } from '../widget/document.ts';
import { evaluate, readingAt, type Evaluation, type ReadingOutcome } from '../widget/evaluate.ts';
import { settingStated } from '../widget/places.ts';
import { printStated, stateReading } from '../widget/stated.ts';
import { snapToGrid } from '../widget/grid.ts';
import type { ClaimRecord } from './records.ts';
import type { Released } from './release.ts';

/** What stands where a number is printed: its words, or the sentence that says why there is none. */
export type Printed = { ok: true; words: string } | { ok: false; refusal: Refusal };

export class LiveWidget {
	#document: () => WidgetDocument;
	#calculators: () => CalculatorSet;

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
		readonly released: Released | null = null
	) {
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
		if (control && Number.isFinite(value)) this.values[controlId] = snapToGrid(value, control);
	}

	reset(): void {
		this.values = {};
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
		if (!Number.isFinite(value)) return noNumber('There is no number to give at this setting.');
		if (!commensurable(unit, claim.unit))
			return noNumber(`This reading can’t be given in ${claim.unit || 'plain numbers'}.`);
		return { ok: true, words: printStated(stateReading(value, unit, claim, quantity)) };
	}

	/** A control's value in words: “180 million years”. */
	printSetting(controlId: string): string {
		return this.#printValue(controlId, this.evaluation);
	}

	/** The value a control starts at, in words. */
	printFirstSetting(controlId: string): string {
		return this.#printValue(controlId, { values: {}, steps: {} });
	}

	#printValue(controlId: string, evaluation: Evaluation): string {
		const stated = settingStated(this.document, evaluation, controlId);
		return stated ? printStated(stated) : '';
	}
}

function noNumber(message: string): Printed {
	return { ok: false, refusal: { code: 'no-number', message } };
}

export const [getLiveWidget, setLiveWidget] = createContext<LiveWidget>();
