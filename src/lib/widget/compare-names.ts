/** What the things of one document are called, and how their parts are printed. */
import { resolveUnit, type CalculatorSet } from '../physics/calculator.ts';
import type { ReadingRef, SettingSource, Step, WidgetDocument } from './document.ts';
import { claimPlaces, type Words } from './places.ts';
import { plainDecimal, printNumeral, roundToFigures } from './stated.ts';
import { fixedSettings } from './tie-units.ts';

const CONTROL_WORDS: Record<string, string> = {
	slider: 'Slider',
	'log-slider': 'Slider',
	stepper: 'Stepper',
	choice: 'Choice',
	toggle: 'Toggle',
	number: 'Number field'
};

export class Names {
	readonly #document: WidgetDocument;
	readonly #calculators: CalculatorSet;
	readonly #claims: ReadonlyMap<string, string>;

	constructor(document: WidgetDocument, calculators: CalculatorSet, words: Words) {
		this.#document = document;
		this.#calculators = calculators;
		this.#claims = new Map(
			claimPlaces(document, words).map((place) => [place.claim.id, place.words])
		);
	}

	/** A part of the wiring, as a person knows it. */
	of(list: 'formulas' | 'steps' | 'controls' | 'claims', id: string): string {
		switch (list) {
			case 'steps':
				return `Calculator “${this.#stepTitle(id)}”`;
			case 'controls': {
				const control = this.#document.controls.find((one) => one.id === id);
				return `${CONTROL_WORDS[control?.kind ?? ''] ?? 'Control'} “${control?.label || id}”`;
			}
			case 'claims':
				return `Number “${this.#claims.get(id) ?? id}”`;
			case 'formulas':
				return `Formula “${this.#document.formulas.find((one) => one.id === id)?.title || id}”`;
		}
	}

	/** The label of a control; null for any other key. */
	controlLabel(id: string): string | null {
		return this.#document.controls.find((control) => control.id === id)?.label ?? null;
	}

	/** The settings of a step under their labels; none for anything else. */
	settingsOf(thing: Record<string, unknown>): [string, string][] {
		if (!isStep(thing)) return [];
		const inputs = this.#calculators.get(thing.calculator)?.inputs ?? {};
		return Object.entries(thing.settings).map(([key, source]) => {
			const spec = inputs[key];
			const unit = spec?.kind === 'number' ? resolveUnit(spec.unit, fixedSettings(thing)) : '';
			return [spec?.label ?? key, this.#source(source, unit, spec)];
		});
	}

	/** A value that names something else in the document; null for one that doesn’t. */
	print(key: string, value: unknown): string | null {
		if (isReadingRef(value)) return this.#reading(value);
		if (typeof value !== 'string') return null;
		if (key === 'control') return `the slider “${this.controlLabel(value) || value}”`;
		if (key === 'step') return this.#stepTitle(value);
		if (key === 'calculator') return this.#calculators.get(value)?.title ?? value;
		return null;
	}

	/** A plain value with its unit: “5.5 m”. */
	quantity(value: unknown, unit: string): string {
		if (typeof value !== 'number') return String(value);
		// Twelve figures hide the binary dust of stepping by tenths.
		const numeral = printNumeral(plainDecimal(Number(roundToFigures(value, 12))));
		return unit ? `${numeral} ${unit}` : numeral;
	}

	#stepTitle(id: string): string {
		const step = this.#document.steps.find((one) => one.id === id);
		return (step && this.#calculators.get(step.calculator)?.title) ?? id;
	}

	#reading(ref: ReadingRef): string {
		if ('control' in ref) return `the slider “${this.controlLabel(ref.control) || ref.control}”`;
		const step = this.#document.steps.find((one) => one.id === ref.step);
		const calculator = step && this.#calculators.get(step.calculator);
		const part =
			'output' in ref
				? calculator?.outputs[ref.output]?.label
				: calculator?.inputs[ref.setting]?.label;
		return `${this.#stepTitle(ref.step)}: ${part ?? ('output' in ref ? ref.output : ref.setting)}`;
	}

	#source(
		source: SettingSource,
		unit: string,
		spec: { kind: string; options?: { value: string; label: string }[] } | undefined
	): string {
		switch (source.from) {
			case 'control':
				return `follows the slider “${this.controlLabel(source.control) || source.control}”`;
			case 'reading':
				return `takes ${this.#reading({ step: source.step, output: source.output })}`;
			case 'line':
				return `the line ${source.line}, ${this.quantity(source.value, unit)}`;
			case 'fixed': {
				const { value } = source;
				if (typeof value === 'object') return Object.values(value).map(String).join(', ');
				const chosen = spec?.options?.find((option) => option.value === value);
				return chosen?.label ?? this.quantity(value, unit);
			}
		}
	}
}

function isStep(thing: Record<string, unknown>): thing is Omit<Step, 'id'> & { id: string } {
	return typeof thing.calculator === 'string' && typeof thing.settings === 'object';
}

function isReadingRef(value: unknown): value is ReadingRef {
	if (typeof value !== 'object' || value === null) return false;
	const keys = Object.keys(value).sort().join();
	return keys === 'control' || keys === 'output,step' || keys === 'setting,step';
}
