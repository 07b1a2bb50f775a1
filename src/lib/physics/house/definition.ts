/**
 * A house calculator as data: what a scientist of the house writes, and, once its formulas are parsed, what a piece pins
 * and a reader's frame computes with. Plain JSON throughout; `settle.ts` makes the second from the first, on the server.
 */
import type { Source, Validity } from '../calculator.ts';
import type { FormulaTree } from '../formula/tree.ts';
import type { QuantityKind } from '../units/quantities.ts';

/** An input. `name` is its key, and how formulas call it; limits are in `unit`. */
export interface HouseInput {
	name: string;
	label: string;
	quantity: QuantityKind;
	unit: string;
	min: number;
	max: number;
	minExclusive?: boolean;
	maxExclusive?: boolean;
	initial: number;
	whole?: boolean;
	log?: boolean;
	/** The zone where the model is good, and what a reader is told past it. */
	good?: { min: number; max: number; message: string };
}

/** A value on the way, in coherent SI units, that later formulas may use by name. */
export interface HouseDerived {
	name: string;
	label: string;
	formula: string;
}

/** An output. The formula gives it in coherent SI units; the card states it in `unit`. */
export interface HouseOutput {
	name: string;
	label: string;
	quantity: QuantityKind;
	unit: string;
	formula: string;
}

/** When a yes-or-no formula holds, the calculator refuses, or says its sentence and marks the reading. */
export interface HouseCondition {
	code: string;
	/** A test over inputs and derived values: `mass_after > mass_before`. */
	formula: string;
	message: string;
	effect: 'refuse' | Validity;
}

/** A published value that an output must reproduce. Inputs in their units, `published` and `tolerance` in the output's. */
export interface HouseCheck {
	id: string;
	statement: string;
	inputs: Record<string, number>;
	output: string;
	published: number;
	tolerance: number;
	/** Where it was printed, with enough to find it again. */
	source: string;
	/** How far that was verified: “read in the book”, “from memory”. */
	verification: string;
}

interface HouseCard {
	/** `house.` and a slug. */
	id: string;
	revision: string;
	title: string;
	purpose: string;
	asks: string[];
	notFor: string[];
	inputs: HouseInput[];
	checks: HouseCheck[];
	assumptions: string[];
	caution?: string;
	sources: Source[];
	history: { revision: string; date: string; change: string }[];
}

/** As written. */
export interface HouseDraft extends HouseCard {
	derived: HouseDerived[];
	outputs: HouseOutput[];
	conditions: HouseCondition[];
}

/** As settled: each formula with its tree, derived values in an order in which each can be had. */
export interface HouseDefinition extends HouseCard {
	derived: (HouseDerived & { tree: FormulaTree })[];
	outputs: (HouseOutput & { tree: FormulaTree })[];
	conditions: (HouseCondition & { tree: FormulaTree })[];
}

/** What is wrong with a draft, and how to mend it. */
export interface HouseProblem {
	/** The field, as a path into the draft: `outputs.0.formula`, `inputs.2.unit`. */
	path: string;
	/** In a formula, the stretch it is about, in characters of the source. */
	at?: { from: number; to: number };
	code: string;
	says: string;
	mend: string;
}

export type SettledHouse =
	{ ok: true; definition: HouseDefinition } | { ok: false; problems: HouseProblem[] };

/** `house.` and a slug of small letters, digits and single dashes. */
export const HOUSE_ID = /^house\.[a-z][a-z0-9]*(-[a-z0-9]+)*$/;

export function isHouseId(id: string): boolean {
	return HOUSE_ID.test(id);
}

/** How many there may be of each. Inputs and values on the way together are within the names one formula may use. */
export const HOUSE_LIMITS = {
	inputs: 20,
	derived: 20,
	outputs: 20,
	conditions: 20,
	checks: 60
} as const;

/** How many check values with named sources it takes before a house calculator may be vetted. */
export const CHECKS_NEEDED = 3;
