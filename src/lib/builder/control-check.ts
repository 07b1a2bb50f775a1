/** Reads a control's form: the control it makes, or what is wrong with it and, where one is near, the range that would do. */
import type { Control } from '../widget/control.ts';
import { gridProblem, largestOnGrid, snapToGrid } from '../widget/grid.ts';
import { endsIn, type Moved } from './control-moves.ts';
import { type ControlDraft } from './control-draft.ts';
import { fieldText, typedNumber } from './wiring.ts';

type WithoutId<C> = C extends Control ? Omit<C, 'id'> : never;
/** A control before it has an id. */
export type ControlFields = WithoutId<Control>;

export type Checked =
	| { ok: true; fields: ControlFields }
	| { ok: false; says: string; nearest?: { words: string; fields: Partial<ControlDraft> } };

const wrong = (says: string): Checked => ({ ok: false, says });

const NAMES = { min: 'From', max: 'To', step: 'Step', initial: 'Starts at' } as const;

export function checkDraft(draft: ControlDraft, moved: Moved | null): Checked {
	const label = draft.label.trim();
	if (!label) return wrong('Say what the control moves.');
	return draft.kind === 'choice' || draft.kind === 'toggle'
		? checkOptions({ ...draft, label }, draft.kind, moved)
		: checkRange({ ...draft, label }, draft.kind, moved);
}

function checkRange(
	draft: ControlDraft,
	kind: Exclude<ControlDraft['kind'], 'choice' | 'toggle'>,
	moved: Moved | null
): Checked {
	const read = (key: keyof typeof NAMES) => typedNumber(draft[key]);
	const [min, max, initial, step] = [read('min'), read('max'), read('initial'), read('step')];
	const missing = (['min', 'max', 'initial', 'step'] as const).find(
		(key) => read(key) === null && (key !== 'step' || kind !== 'log-slider')
	);
	if (missing || min === null || max === null || initial === null)
		return wrong(`“${NAMES[missing ?? 'min']}” takes a number.`);
	if (min >= max) return wrong('“From” must be below “To”.');

	const past = pastDomain(draft, moved, { min, max, initial, step });
	if (past) return past;
	if (initial < min || initial > max)
		return near('The control must start between its ends.', {
			initial: Math.min(max, Math.max(min, initial))
		});
	const common = { label: draft.label, unit: draft.unit, min, max, initial };

	if (kind === 'log-slider') {
		if (min <= 0) return wrong('A slider by factors starts above nought.');
		const perDecade = typedNumber(draft.perDecade);
		if (perDecade === null || !Number.isInteger(perDecade) || perDecade < 1 || perDecade > 100)
			return wrong('Steps to each tenfold are a whole number from 1 to 100.');
		return { ok: true, fields: { kind, ...common, perDecade } };
	}
	if (step === null || step <= 0 || step > max - min)
		return wrong('A step is more than nothing and no longer than from end to end.');
	const grid = { min, max, step };
	const end = largestOnGrid(grid);
	const start = snapToGrid(initial, grid);
	// Past fifteen digits a step leaves dust in binary: that is no other number.
	if (kind !== 'number' && isSame(end, max) && isSame(start, initial))
		return { ok: true, fields: { kind, ...common, max: end, initial: start, step } };
	const problem = kind === 'number' ? '' : gridProblem(grid, initial);
	if (!problem) return { ok: true, fields: { kind, ...common, step } };
	return near(problem, { max: end, initial: snapToGrid(initial, { ...grid, max: end }) });
}

function isSame(one: number, other: number): boolean {
	return Math.abs(one - other) <= 1e-12 * Math.abs(other);
}

/** A calculator refuses what lies past its ends; readers are never led there. */
function pastDomain(
	draft: ControlDraft,
	moved: Moved | null,
	range: { min: number; max: number; initial: number; step: number | null }
): Checked | null {
	if (moved?.what !== 'number') return null;
	const ends = endsIn(moved, draft.unit);
	// A hair of a conversion is no trespass.
	const hair = 1e-9 * Math.max(Math.abs(range.min), Math.abs(range.max));
	if (range.min >= ends.min - hair && range.max <= ends.max + hair) return null;
	const min = Math.max(range.min, ends.min);
	const top = Math.min(range.max, ends.max);
	const says = `The calculator takes ${fieldText(ends.min)} to ${fieldText(ends.max)} here.`;
	if (min >= top) return wrong(says);
	const usesStep = draft.kind !== 'log-slider' && range.step !== null && range.step < top - min;
	const max =
		usesStep && range.step !== null ? largestOnGrid({ min, max: top, step: range.step }) : top;
	const inside = Math.min(max, Math.max(min, range.initial));
	const initial =
		usesStep && range.step !== null && draft.kind !== 'number'
			? snapToGrid(inside, { min, max, step: range.step })
			: inside;
	return near(says, { min, max, initial });
}

function near(says: string, values: { min?: number; max?: number; initial: number }): Checked {
	const { min, max, initial } = values;
	const words = [
		min !== undefined && `from ${fieldText(min)}`,
		max !== undefined && `to ${fieldText(max)}`,
		`start at ${fieldText(initial)}`
	];
	const fields: Partial<ControlDraft> = {
		...(min === undefined ? {} : { min: fieldText(min) }),
		...(max === undefined ? {} : { max: fieldText(max) }),
		initial: fieldText(initial)
	};
	return { ok: false, says, nearest: { words: words.filter(Boolean).join(', '), fields } };
}

function checkOptions(
	draft: ControlDraft,
	kind: 'choice' | 'toggle',
	moved: Moved | null
): Checked {
	const { label, unit } = draft;
	if (draft.options.length < 2) return wrong('A choice has at least two options.');
	if (draft.options.some((option) => !option.label.trim())) return wrong('Name every option.');
	const words = moved?.what === 'words' || (moved === null && isWords(draft));
	const options = draft.options.map((option) => ({
		label: option.label.trim(),
		value: words ? option.value : typedNumber(option.value)
	}));
	const bad = options.find(({ value }) => value === null);
	if (bad) return wrong(`“${bad.label}” takes a number.`);
	if (new Set(options.map(({ value }) => value)).size < options.length)
		return wrong('Two options are the same setting.');
	if (moved?.what === 'number') {
		const ends = endsIn(moved, unit);
		const past = options.find(({ value }) => Number(value) < ends.min || Number(value) > ends.max);
		if (past)
			return wrong(
				`“${past.label}” lies outside what the calculator takes, ${fieldText(ends.min)} to ${fieldText(ends.max)}.`
			);
	}
	const given = options.map((option) => ({ label: option.label, value: option.value ?? 0 }));
	const initial = Math.min(draft.chosen, given.length - 1);
	const [off, on] = given;
	if (kind === 'toggle') {
		if (!off || !on || given.length > 2) return wrong('A toggle has two options: off, then on.');
		return { ok: true, fields: { kind, label, unit, options: [off, on], initial } };
	}
	return { ok: true, fields: { kind, label, unit, options: given, initial } };
}

/** A control that nothing hangs on keeps the words it has. */
function isWords({ options }: ControlDraft): boolean {
	return options.some(({ value }) => value.trim() !== '' && typedNumber(value) === null);
}
