/**
 * What a calculator is: everything it declares is data, so that a card, a slider, the fact-check and the API
 * read the same limits. `runCalculator` is the one way to get a reading; it never throws on bad input.
 */
import { unitOf } from './units/units.ts';
import type { ConstantsEdition } from './constants/index.ts';
import type { QuantityKind } from './units/quantities.ts';

/** A published work. `fromMemory` marks one that was recalled and not read again. */
export interface Source {
	title: string;
	locator?: string;
	doi?: string;
	url?: string;
	fromMemory?: boolean;
}

/** A refusal is an answer: it says what is wrong and how to mend it, in a reader's words. */
export interface Refusal {
	code: string;
	message: string;
	/** The input that caused it, where one did. */
	input?: string;
}

export interface Warning {
	code: string;
	message: string;
}

/** `ok` inside the good zone, `approximate` with a warning, `outside` past the zone where the model was checked. */
export type Validity = 'ok' | 'approximate' | 'outside';

/** Standard uncertainty in the reading's own unit, or a statement why there is no number. */
export type Uncertainty = number | 'exact' | 'not-available';

/** What many seeded draws of the inputs made of a reading, in its unit. */
export interface DrawnSpread {
	median: number;
	/** Ends of the central 95 per cent. */
	low: number;
	high: number;
	draws: number;
}

/** One output of a calculator. Text outputs (a band's name) have a string value and no unit. */
export interface Reading {
	value: number | string;
	unit: string;
	quantity: QuantityKind;
	uncertainty: Uncertainty;
	/** How the uncertainty was found, or why there is none; only where it was asked for (`uncertainty/`). */
	uncertaintyNote?: string;
	/** Where the spread is lopsided: the middle and the central 95 per cent of seeded draws, in the reading's unit. */
	drawn?: DrawnSpread;
}

export type Result =
	| {
			ok: true;
			outputs: Record<string, Reading>;
			warnings: Warning[];
			validity: Validity;
			/** Declared outputs that have no value for these inputs (a distance modulus at no distance), and why. */
			withheld?: Record<string, Refusal>;
	  }
	| { ok: false; refusal: Refusal };

/** A unit that another input decides: `{ by: 'kind', units: { z_from_age: 'Gyr', … } }`. */
export type UnitSpec = string | { by: string; units: Record<string, string> };

export interface NumberInput {
	kind: 'number';
	label: string;
	symbol?: string;
	quantity: QuantityKind;
	/** Where another input decides what this one is. */
	quantityBy?: { by: string; kinds: Record<string, QuantityKind> };
	unit: UnitSpec;
	/** Hard limits: outside them the calculator refuses. Exclusive where said. */
	min: number;
	max: number;
	minExclusive?: boolean;
	maxExclusive?: boolean;
	/** The zone where the model is good; past it the declared warning of this code is given. */
	good?: { min: number; max: number; warning: string };
	/** The value a fresh try-out starts from; used by `runCalculator` only when `optional`. */
	initial: number;
	optional?: boolean;
	/** What stands in when an optional input isn't given, where no single number does (“the gas temperature”). */
	absent?: string;
	/** Needed when this other input is given; left out without a word otherwise. */
	neededWith?: string;
	/** Only whole numbers are taken. */
	whole?: boolean;
	/** Draw and step the input on a logarithmic scale. */
	log?: boolean;
}

export interface ChoiceInput {
	kind: 'choice';
	label: string;
	options: { value: string; label: string }[];
	initial: string;
	optional?: boolean;
}

/** The parameter set of an expanding universe: `{ set: 'Planck18' }`, or its parameters one by one. */
export interface CosmologyInput {
	kind: 'cosmology';
	label: string;
	initial: { set: string };
	optional?: boolean;
}

/**
 * A number whose written digits matter (rounding). Given as text, “2.345”, or as a number, which then stands for its
 * shortest decimal form.
 */
export interface DecimalInput {
	kind: 'decimal';
	label: string;
	symbol?: string;
	initial: string;
	optional?: boolean;
}

/**
 * Numbers in a row, or rows of numbers. Given as arrays, or as text with commas between numbers and semicolons between
 * rows: “67.4, 73.04”, “1, 0.5; 0.5, 1”.
 */
export interface ListInput {
	kind: 'list';
	label: string;
	symbol?: string;
	shape: 'row' | 'rows';
	/** What the numbers of each row are, where every row has the same ones. */
	columns?: string[];
	/** Hard limits of every number. */
	min: number;
	max: number;
	minExclusive?: boolean;
	/** The longest row, and the most rows. */
	longest: number;
	initial: string;
	optional?: boolean;
	/** What stands in when an optional list isn't given. */
	absent?: string;
}

export type InputSpec = NumberInput | ChoiceInput | CosmologyInput | DecimalInput | ListInput;

export interface OutputSpec {
	label: string;
	symbol?: string;
	quantity: QuantityKind;
	/** '' for a pure number; `text` outputs carry words. */
	unit: UnitSpec;
	text?: boolean;
}

/** A warning as data: its condition is told in words beside the sentence a reader gets. */
export interface WarningSpec {
	code: string;
	message: string;
	when: string;
	/** What the warning does to the reading's validity; `ok` for advice that leaves the number as good as it was. */
	validity: Validity;
}

/** A published value that the calculator must reproduce, with where it was printed. */
export interface CheckValue {
	id: string;
	statement: string;
	inputs: RawInputs;
	output: string;
	/** Multiply the output by this to get the published unit. */
	outputScale: number;
	/** Words where the output is words. */
	published: number | string;
	tolerance: number;
	unit: string;
	source: string;
	verification: string;
	/** True where nobody printed the value: it was worked with another method, which `verification` names. */
	computed?: true;
}

export type RawInputs = Record<string, unknown>;

/**
 * Inputs after checking: numbers in the declared unit, choices among the options, cosmologies as full parameters,
 * decimals as plain text, lists as arrays.
 */
// eslint-disable-next-line @typescript-eslint/no-explicit-any
export type CheckedInputs = Record<string, any>;

export type Computed =
	| {
			ok: true;
			values: Record<string, number | string>;
			/**
			 * Given the inputs as exact: `exact` where no formula holds a measured constant, or by output. One that isn't named
			 * has no known uncertainty.
			 */
			uncertainties?: 'exact' | Record<string, Uncertainty>;
			/** Codes of declared warnings that apply. */
			warnings?: string[];
			withheld?: Record<string, Refusal>;
	  }
	| { ok: false; refusal: Refusal };

export interface CalculatorDefinition {
	id: string;
	/** Major: the same inputs may give another result. Minor: a new output. Patch: words only. */
	revision: string;
	title: string;
	/** The question it answers, in one line. */
	purpose: string;
	/** Other words a writer may ask with. */
	asks: string[];
	notFor: string[];
	inputs: Record<string, InputSpec>;
	/** Groups of inputs of which exactly one is given. */
	oneOf?: string[][];
	outputs: Record<string, OutputSpec>;
	/**
	 * Outputs that nothing but the parameters of the universe makes uncertain, so that their uncertainty follows from the
	 * parameter set's. One given by `compute` for such an output is the published one, and stands.
	 */
	restsOnCosmology?: readonly string[];
	equations: { tex: string; says: string }[];
	assumptions: string[];
	warnings: WarningSpec[];
	/** Shown wherever the calculator's work could hurt someone in the real world. */
	caution?: string;
	sources: Source[];
	checks: CheckValue[];
	history: { revision: string; date: string; change: string }[];
	/**
	 * Whether `compute` rests on constants that adjustments move; one that doesn't is the same in every edition. What is
	 * taken when the file is loaded must not move (`constants.test.ts` keeps watch).
	 */
	followsEdition?: true;
	/** With the edition in use, unless another one is given: see `calculators/in-edition.ts`. */
	compute(inputs: CheckedInputs, edition?: ConstantsEdition): Computed;
	/**
	 * A quick way for lines of many points, which plain arithmetic may have: the numbers of `compute`, bit for bit, at many
	 * places of the input `key`, with the warnings that hold everywhere; null where it has none for that input. Only for a
	 * `compute` that neither refuses nor withholds. Places outside the input's limits are among them; what comes out there
	 * is thrown away.
	 */
	curve?(inputs: CheckedInputs, key: string, places: Float64Array): Curve | null;
}

export interface Curve {
	/** By output, in the order of the places. */
	columns: Record<string, Float64Array>;
	warnings?: readonly string[];
}

export type Calculator = Readonly<CalculatorDefinition>;

/** Calculators by id: all of them on the server, just those of one widget in a reader's frame. */
export type CalculatorSet = ReadonlyMap<string, Calculator>;

/** Checks once, at load, what the compiler cannot: units exist, and warnings and groups name what is declared. */
export function defineCalculator(definition: CalculatorDefinition): Calculator {
	for (const [key, spec] of [
		...Object.entries(definition.inputs).filter(([, input]) => input.kind === 'number'),
		...Object.entries(definition.outputs)
	] as [string, NumberInput | OutputSpec][]) {
		const units = typeof spec.unit === 'string' ? [spec.unit] : Object.values(spec.unit.units);
		for (const unit of units) {
			if (!unitOf(unit)) throw new Error(`${definition.id}: ${key} has the unknown unit “${unit}”`);
		}
	}
	const codes = new Set(definition.warnings.map((warning) => warning.code));
	for (const [key, input] of Object.entries(definition.inputs)) {
		if (input.kind === 'number' && input.good && !codes.has(input.good.warning)) {
			throw new Error(
				`${definition.id}: ${key} names the undeclared warning “${input.good.warning}”`
			);
		}
	}
	const companions = Object.values(definition.inputs).flatMap((input) =>
		input.kind === 'number' && input.neededWith ? [input.neededWith] : []
	);
	for (const key of definition.restsOnCosmology ?? []) {
		if (!Object.hasOwn(definition.outputs, key))
			throw new Error(`${definition.id}: no output “${key}”`);
	}
	for (const key of [...(definition.oneOf ?? []).flat(), ...companions]) {
		if (!Object.hasOwn(definition.inputs, key))
			throw new Error(`${definition.id}: no input “${key}”`);
	}
	return Object.freeze(definition);
}

export function refuse(
	code: string,
	message: string,
	input?: string
): { ok: false; refusal: Refusal } {
	return { ok: false, refusal: input ? { code, message, input } : { code, message } };
}

/** The unit an input or output has, given the other inputs. */
export function resolveUnit(spec: UnitSpec, inputs: RawInputs): string {
	if (typeof spec === 'string') return spec;
	const chosen = String(inputs[spec.by]);
	return (Object.hasOwn(spec.units, chosen) ? spec.units[chosen] : undefined) ?? '';
}

/** What a number input is a measure of, given the other inputs. */
export function resolveQuantity(spec: NumberInput, inputs: RawInputs): QuantityKind {
	const { quantityBy, quantity } = spec;
	if (!quantityBy) return quantity;
	const chosen = String(inputs[quantityBy.by]);
	return (
		(Object.hasOwn(quantityBy.kinds, chosen) ? quantityBy.kinds[chosen] : undefined) ?? quantity
	);
}
