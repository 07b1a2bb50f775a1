/**
 * What a reader can move. Every control holds one number: a quantity in its unit, or, where it offers options, the
 * index of the one that is chosen. `control-grid.ts` says which numbers those are.
 */
import { z } from 'zod';
import { hasOptions } from './control-kind.ts';
import { finite, Id, UnitSymbol } from './references.ts';

export { hasOptions, isMeasured } from './control-kind.ts';

const label = z.string().max(120);

/** A quantity from `min` to `max` in whole steps from `min`. */
const measured = {
	id: Id,
	label,
	unit: UnitSymbol,
	min: finite,
	max: finite,
	step: finite.positive(),
	initial: finite
};

const Option = z.strictObject({
	label: z.string().max(80),
	/** In the control's unit, or a word that a calculator's choice knows. */
	value: z.union([finite, z.string().max(80)])
});
export type Option = z.infer<typeof Option>;

const Slider = z.strictObject({ kind: z.literal('slider'), ...measured });

/** Equal steps are equal factors: `perDecade` of them make a tenfold. Settings are kept to three figures. */
const LogSlider = z.strictObject({
	kind: z.literal('log-slider'),
	id: Id,
	label,
	unit: UnitSymbol,
	min: finite.positive(),
	max: finite.positive(),
	perDecade: z.number().int().min(1).max(100),
	initial: finite.positive()
});

/** − and + alone, for few settings. */
const Stepper = z.strictObject({ kind: z.literal('stepper'), ...measured });

/** A field to type into. Any number from `min` to `max` is taken; `step` is what its arrow keys add. */
const NumberField = z.strictObject({ kind: z.literal('number'), ...measured });

const Choice = z.strictObject({
	kind: z.literal('choice'),
	id: Id,
	label,
	unit: UnitSymbol,
	options: z.array(Option).min(2).max(12),
	/** Index of the option it starts at. */
	initial: z.number().int().min(0).max(11)
});

/** Off is option 0, on is option 1. */
const Toggle = z.strictObject({
	kind: z.literal('toggle'),
	id: Id,
	label,
	unit: UnitSymbol,
	options: z.tuple([Option, Option]),
	initial: z.number().int().min(0).max(1)
});

export const Control = z
	.discriminatedUnion('kind', [Slider, LogSlider, Stepper, NumberField, Choice, Toggle])
	.superRefine((control, context) => {
		const say = (path: string, message: string) =>
			context.addIssue({ code: 'custom', path: [path], message });
		if (hasOptions(control)) {
			if (control.initial >= control.options.length)
				say('initial', 'It must start at one of its options.');
			const kinds = new Set<string>(control.options.map(({ value }) => typeof value));
			if (kinds.size > 1) say('options', 'Its options are all numbers or all words.');
			return;
		}
		if (control.min >= control.max) say('min', 'The lowest setting must be below the highest.');
		if (control.initial < control.min || control.initial > control.max)
			say('initial', 'The first setting must lie between the lowest and the highest.');
	});
export type Control = z.infer<typeof Control>;
export type ControlKind = Control['kind'];
export type Slider = z.infer<typeof Slider>;
export type LogSlider = z.infer<typeof LogSlider>;
export type OptionControl = Extract<Control, { kind: 'choice' | 'toggle' }>;
export type MeasuredControl = Exclude<Control, OptionControl>;

/** What a reader or the builder has set, by control id; a control that is missing stands at its initial value. */
export type ControlValues = Readonly<Record<string, number>>;
