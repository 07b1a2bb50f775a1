/**
 * A control as its form holds it: every field of every kind at once, as typed, so that another kind keeps what it can
 * use and going back loses nothing.
 */
import { convert } from '../physics/units/units.ts';
import { hasOptions, type Control, type ControlKind, type Option } from '../widget/control.ts';
import { largestOnGrid, snapToGrid } from '../widget/grid.ts';
import { endsIn, type Moved, type NumberMoved } from './control-moves.ts';
import { newId } from './ids.ts';
import { fieldText, roundDown, roundUp, typedNumber } from './wiring.ts';

export interface DraftOption {
	/** For the form alone. */
	key: string;
	label: string;
	/** A number as typed, or a calculator's word. */
	value: string;
}

export interface ControlDraft {
	kind: ControlKind;
	label: string;
	unit: string;
	min: string;
	max: string;
	step: string;
	perDecade: string;
	initial: string;
	options: DraftOption[];
	/** Index of the option it starts at. */
	chosen: number;
}

/** Fields that hold a number in the control's unit. */
export const RANGE_FIELDS = ['min', 'max', 'step', 'initial'] as const;

const PER_DECADE = 20;
/** A range this many times its lower end is better walked in equal factors. */
const DECADES = 100;

/** What each kind is called, and when it suits. */
export const CONTROL_WORDS: Record<ControlKind, { name: string; hint: string }> = {
	slider: { name: 'slider', hint: 'even steps from end to end' },
	'log-slider': { name: 'slider by factors', hint: 'each tenfold is equally long' },
	stepper: { name: 'stepper', hint: '− and + alone, for few settings' },
	number: { name: 'number field', hint: 'any number between its ends' },
	choice: { name: 'choice', hint: 'one of a few named settings' },
	toggle: { name: 'toggle', hint: 'off or on' }
};

/** The kinds that suit what is moved, the likeliest first. */
export function kindsFor(moved: Moved | null): ControlKind[] {
	if (moved?.what === 'words')
		return moved.options.length === 2 ? ['toggle', 'choice'] : ['choice', 'toggle'];
	const factors = !moved || (moved.max > 0 && moved.max / Math.max(moved.min, 0) >= DECADES);
	const spans = moved?.good ?? moved;
	const wide = spans !== null && spans.min > 0 && spans.max / spans.min >= DECADES * 10;
	return [
		...(factors && wide ? (['log-slider', 'slider'] as const) : (['slider'] as const)),
		...(factors && !wide ? (['log-slider'] as const) : []),
		'stepper',
		'choice',
		'toggle',
		'number'
	];
}

/** A range to start from: where the model is good, in the unit asked for, in round steps. `first` is in that unit. */
export function suggestRange(
	moved: NumberMoved,
	unit: string,
	first: number
): { min: number; max: number; step: number; initial: number } {
	const inUnit = (value: number) => convert(value, moved.unit, unit);
	const low = inUnit(moved.good?.min ?? moved.min);
	const high = inUnit(moved.good?.max ?? moved.max);
	// A range of many decades makes a useless slider: start with a stretch around the first value.
	const wide = first > 0 && high / Math.max(low, first / 1e3) > DECADES;
	const from = wide ? Math.max(low, roundDown(first / 2)) : low;
	const to = wide ? Math.min(high, roundUp(first * 3)) : high;
	const step = roundDown((to - from) / 40) || (to - from) / 40;
	const grid = { min: tidy(from), max: tidy(to), step: tidy(step) };
	return { ...grid, max: largestOnGrid(grid), initial: snapToGrid(first, grid) };
}

function tidy(value: number): number {
	return Number(value.toPrecision(12));
}

/** A new control of a setting that stands at `first`, a number in `unit` or a word. */
export function freshDraft(
	kind: ControlKind,
	label: string,
	moved: Moved,
	unit: string,
	first: number | string
): ControlDraft {
	if (moved.what === 'words') {
		const chosen = moved.options.findIndex(({ value }) => value === first);
		return {
			...blank(kind, label),
			options: moved.options.map(draftOption),
			chosen: Math.max(0, chosen)
		};
	}
	const range = suggestRange(moved, unit, Number(first));
	const points = [...new Set([range.min, range.initial, range.max])];
	return {
		...blank(kind, label),
		unit,
		...inFields(range),
		...(kind === 'log-slider' ? byFactors(moved, unit, Number(first)) : {}),
		options: points.map((value) => draftOption({ value, label: fieldText(value) })),
		chosen: points.indexOf(range.initial)
	};
}

/** A control that stands in the piece; what its kind doesn't have is filled from what it has. */
export function draftOf(control: Control): ControlDraft {
	const { kind, label, unit } = control;
	const start = { ...blank(kind, label), unit };
	if (hasOptions(control)) {
		const options = control.options.map(draftOption);
		const values = control.options.flatMap(({ value }) =>
			typeof value === 'number' ? [value] : []
		);
		const range = rangeAround(values, control.options[control.initial]?.value);
		return { ...start, options, chosen: control.initial, ...(range ? inFields(range) : {}) };
	}
	const { min, max, initial } = control;
	const points = [...new Set([min, initial, max])];
	return {
		...start,
		...inFields({ min, max, initial, step: 'step' in control ? control.step : stepFor(min, max) }),
		perDecade: String('perDecade' in control ? control.perDecade : PER_DECADE),
		options: points.map((value) => draftOption({ value, label: fieldText(value) })),
		chosen: points.indexOf(initial)
	};
}

/** Another unit: every number in the fields stays the same quantity. */
export function inUnit(draft: ControlDraft, unit: string): ControlDraft {
	const turned = (text: string) => {
		const value = typedNumber(text);
		return value === null ? text : fieldText(convert(value, draft.unit, unit));
	};
	return {
		...draft,
		unit,
		...Object.fromEntries(RANGE_FIELDS.map((key) => [key, turned(draft[key])])),
		options: draft.options.map((option) => ({ ...option, value: turned(option.value) }))
	};
}

/** Another kind: a slider by factors can't start at nought, and a toggle has two options. */
export function asKind(draft: ControlDraft, kind: ControlKind, moved: Moved | null): ControlDraft {
	const next = { ...draft, kind };
	if (kind === 'toggle') {
		const options = draft.options.slice(0, 2);
		return {
			...next,
			options: options.length === 2 ? options : twoOf(options),
			chosen: Math.min(1, draft.chosen)
		};
	}
	if (draft.kind === 'log-slider' && kind !== 'choice' && moved?.what === 'number') {
		// Ends that lie decades apart are no even grid.
		return {
			...next,
			...inFields(suggestRange(moved, draft.unit, typedNumber(draft.initial) ?? 1))
		};
	}
	if (kind !== 'log-slider' || (typedNumber(draft.min) ?? 0) > 0) return next;
	const first = typedNumber(draft.initial) ?? 0;
	return moved?.what === 'number' && first > 0
		? { ...next, ...byFactors(moved, draft.unit, first) }
		: next;
}

function blank(kind: ControlKind, label: string): ControlDraft {
	const fields = { min: '', max: '', step: '', initial: '', perDecade: String(PER_DECADE) };
	return { kind, label: label.slice(0, 120), unit: '', ...fields, options: [], chosen: 0 };
}

function inFields(range: { min: number; max: number; step: number; initial: number }) {
	return {
		min: fieldText(range.min),
		max: fieldText(range.max),
		step: fieldText(range.step),
		initial: fieldText(range.initial)
	};
}

/** Two tenfolds to either side, as far as the calculator goes. */
function byFactors(moved: NumberMoved, unit: string, first: number) {
	const ends = endsIn(moved, unit);
	const min = Math.max(ends.min, roundDown(first / DECADES));
	const max = Math.min(ends.max, roundUp(first * DECADES));
	return { min: fieldText(tidy(min)), max: fieldText(tidy(max)), initial: fieldText(tidy(first)) };
}

function stepFor(min: number, max: number): number {
	return roundDown((max - min) / 40) || (max - min) / 40;
}

function rangeAround(values: readonly number[], first: unknown) {
	if (values.length < 2) return null;
	const [min, max] = [Math.min(...values), Math.max(...values)];
	if (min >= max) return null;
	const step = stepFor(min, max);
	const grid = { min, step, max: largestOnGrid({ min, max, step }) };
	return { ...grid, initial: snapToGrid(typeof first === 'number' ? first : min, grid) };
}

function draftOption({ label, value }: Option): DraftOption {
	return {
		key: newId('option'),
		label: label.slice(0, 80),
		value: typeof value === 'number' ? fieldText(value) : value
	};
}

function twoOf(options: readonly DraftOption[]): DraftOption[] {
	const empty = () => ({ key: newId('option'), label: '', value: '' });
	return [options[0] ?? empty(), options[1] ?? empty()];
}
