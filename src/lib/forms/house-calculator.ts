/**
 * What a scientist writes when adding or revising a house calculator. The schema keeps sizes and kinds; whether the
 * formulas hold together is settled by physics, which names each problem by its path in here.
 */
import { z } from 'zod';
import type { HouseDefinition, HouseDraft } from '../physics/house/definition.ts';
import { QUANTITY_KINDS, type QuantityKind } from '../physics/units/quantities.ts';
import { CHANGES } from '../workflow/vetting.ts';

const line = (longest: number) =>
	z.string().trim().max(longest, `Keep it under ${longest} characters.`).default('');
const needed = (longest: number, missing: string) =>
	z
		.string({ error: missing })
		.trim()
		.min(1, missing)
		.max(longest, `Keep it under ${longest} characters.`);
const lines = (most: number) => z.array(line(200)).max(most, `${most} lines at most.`).default([]);
const number = z.number({ error: 'Give a number.' });
const quantity = z.enum(Object.keys(QUANTITY_KINDS) as [QuantityKind, ...QuantityKind[]], {
	error: 'Choose what it is a measure of.'
});
const name = needed(32, 'Give it a name that formulas call it by.');
const label = needed(80, 'Say what it is.');
const unit = line(20);
/** Longer than any formula may be: the limit itself is told with its mend, like every other problem of a formula. */
const formula = z
	.string({ error: 'Write the formula.' })
	.max(100_000, 'This is no formula: it is far too long.');

export const HouseInputForm = z.object({
	name,
	label,
	quantity,
	unit,
	min: number,
	max: number,
	minExclusive: z.boolean().default(false),
	maxExclusive: z.boolean().default(false),
	initial: number,
	whole: z.boolean().default(false),
	log: z.boolean().default(false),
	good: z
		.object({
			min: number,
			max: number,
			message: needed(240, 'Say what a reader is told past it.')
		})
		.nullable()
		.default(null)
});

export const HouseDerivedForm = z.object({ name, label, formula });
export const HouseOutputForm = z.object({ name, label, quantity, unit, formula });
export const HouseConditionForm = z.object({
	code: needed(40, 'Give it a short name.'),
	formula,
	message: needed(240, 'Write the sentence a reader gets.'),
	effect: z.enum(['refuse', 'ok', 'approximate', 'outside'])
});
export const HouseCheckForm = z.object({
	statement: needed(240, 'Say what was published.'),
	inputs: z.record(z.string().max(32), number),
	output: line(32),
	published: number,
	tolerance: number,
	source: line(240),
	verification: line(160)
});
export const HouseSourceForm = z.object({
	title: needed(200, 'Name the work.'),
	locator: line(80),
	doi: line(120),
	fromMemory: z.boolean().default(false)
});

/** All but the id, which stays through every revision. */
const HouseCard = z.object({
	title: needed(80, 'Give it a title.'),
	purpose: needed(200, 'Say in one line which question it answers.'),
	asks: lines(12),
	notFor: lines(12),
	assumptions: lines(12),
	caution: line(400),
	inputs: z.array(HouseInputForm).max(16, '16 inputs at most.'),
	derived: z.array(HouseDerivedForm).max(16, '16 values on the way at most.').default([]),
	outputs: z.array(HouseOutputForm).max(16, '16 outputs at most.'),
	conditions: z.array(HouseConditionForm).max(12, '12 conditions at most.').default([]),
	checks: z.array(HouseCheckForm).max(40, '40 check values at most.'),
	sources: z.array(HouseSourceForm).max(12, '12 sources at most.')
});
export type HouseCard = z.infer<typeof HouseCard>;

export const ProposeHouseCalculator = HouseCard.extend({
	slug: z
		.string()
		.trim()
		.max(48, 'A short name has at most 48 characters.')
		.regex(
			/^[a-z][a-z0-9]*(?:-[a-z0-9]+)*$/,
			'A short name is small letters, digits and single dashes, and starts with a letter.'
		)
});
export type ProposeHouseCalculator = z.infer<typeof ProposeHouseCalculator>;

export const ReviseHouseCalculator = HouseCard.extend({
	/** The revision the change was made on. */
	base: z.string().max(20),
	change: z.enum(CHANGES, { error: 'Say how large the change is.' }),
	note: needed(240, 'Say what changed, for the history on the card.')
});
export type ReviseHouseCalculator = z.infer<typeof ReviseHouseCalculator>;

const revisionOf = { calculator: z.string().min(1).max(60), revision: z.string().min(1).max(20) };

export const VetCalculator = z.object({
	...revisionOf,
	note: line(240)
});
export type VetCalculator = z.infer<typeof VetCalculator>;

export const WithdrawCalculator = z.object({
	...revisionOf,
	note: needed(240, 'Say why it is taken out of use.')
});
export type WithdrawCalculator = z.infer<typeof WithdrawCalculator>;

export const RetestCalculator = z.object({
	...revisionOf,
	note: needed(240, 'Say why it may be tested again.')
});
export type RetestCalculator = z.infer<typeof RetestCalculator>;

/** From the form to what physics settles: what was left empty isn't there. */
export function draftOf(
	card: HouseCard,
	kept: Pick<HouseDraft, 'id' | 'revision' | 'history'>
): HouseDraft {
	const { caution, ...rest } = card;
	const written = (texts: readonly string[]) => texts.filter(Boolean);
	return {
		...kept,
		title: rest.title,
		purpose: rest.purpose,
		asks: written(rest.asks),
		notFor: written(rest.notFor),
		assumptions: written(rest.assumptions),
		...(caution ? { caution } : {}),
		inputs: rest.inputs.map(({ minExclusive, maxExclusive, whole, log, good, ...input }) => ({
			...input,
			...(minExclusive ? { minExclusive } : {}),
			...(maxExclusive ? { maxExclusive } : {}),
			...(whole ? { whole } : {}),
			...(log ? { log } : {}),
			...(good ? { good } : {})
		})),
		derived: rest.derived,
		outputs: rest.outputs,
		conditions: rest.conditions,
		checks: rest.checks.map((check, index) => ({ id: `check-${index + 1}`, ...check })),
		sources: rest.sources.map(({ title, locator, doi, fromMemory }) => ({
			title,
			...(locator ? { locator } : {}),
			...(doi ? { doi } : {}),
			...(fromMemory ? { fromMemory } : {})
		}))
	};
}

/** The form of a calculator that is there, to be revised. */
export function cardOf(definition: HouseDefinition): HouseCard {
	return {
		title: definition.title,
		purpose: definition.purpose,
		asks: definition.asks,
		notFor: definition.notFor,
		assumptions: definition.assumptions,
		caution: definition.caution ?? '',
		inputs: definition.inputs.map(
			({ minExclusive = false, maxExclusive = false, whole = false, log = false, ...input }) => ({
				...input,
				minExclusive,
				maxExclusive,
				whole,
				log,
				good: input.good ?? null
			})
		),
		derived: definition.derived.map(({ name, label, formula }) => ({ name, label, formula })),
		outputs: definition.outputs.map(({ name, label, quantity, unit, formula }) => ({
			name,
			label,
			quantity,
			unit,
			formula
		})),
		conditions: definition.conditions.map(({ code, formula, message, effect }) => ({
			code,
			formula,
			message,
			effect
		})),
		checks: definition.checks.map(({ id: _, ...check }) => check),
		sources: definition.sources.map(({ title, locator = '', doi = '', fromMemory = false }) => ({
			title,
			locator,
			doi,
			fromMemory
		}))
	};
}
