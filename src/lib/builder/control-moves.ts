/** What a control can move: the settings that hang on it, with the ends their calculators give them. */
import type { Calculator, CalculatorSet } from '../physics/calculator.ts';
import { constants } from '../physics/constants/index.ts';
import { commensurable, convert } from '../physics/units/units.ts';
import type { Control, Option } from '../widget/control.ts';
import type { Step, WidgetDocument } from '../widget/document.ts';
import { pegUnit } from './peg-sources.ts';

/** A number between the ends a calculator takes, in `unit`; where the model is good may be narrower. */
export interface NumberMoved {
	what: 'number';
	unit: string;
	min: number;
	max: number;
	good?: { min: number; max: number };
}
/** One of the words a calculator knows. */
export interface WordsMoved {
	what: 'words';
	options: readonly Option[];
}
export type Moved = NumberMoved | WordsMoved;

/** A parameter set is moved by its name; the rest of a calculator's inputs by their own key. */
export function movedKey(calculator: Calculator, key: string): string {
	return calculator.inputs[key]?.kind === 'cosmology' ? `${key}.set` : key;
}

/** What a control of this setting would move; null where none can: written digits, and choices that a unit hangs on. */
export function movedBySetting(step: Step, calculator: Calculator, key: string): Moved | null {
	const [head = key] = key.split('.');
	const spec = calculator.inputs[head];
	switch (spec?.kind) {
		case 'number': {
			const { min, max, good } = spec;
			const unit = pegUnit(step, calculator, head) ?? '';
			return { what: 'number', unit, min, max, ...(good ? { good } : {}) };
		}
		case 'choice':
			return decidesUnit(calculator, head) || spec.options.length < 2
				? null
				: {
						what: 'words',
						options: spec.options.slice(0, 12).map(({ value, label }) => ({ value, label }))
					};
		case 'cosmology':
			return {
				what: 'words',
				options: Object.entries(constants.cosmologies)
					.slice(0, 12)
					.map(([value, { label }]) => ({ value, label }))
			};
		default:
			return null;
	}
}

function decidesUnit({ inputs, outputs }: Calculator, key: string): boolean {
	return [...Object.values(inputs), ...Object.values(outputs)].some(
		(spec) =>
			'unit' in spec &&
			spec.unit !== undefined &&
			typeof spec.unit !== 'string' &&
			spec.unit.by === key
	);
}

/** All that hangs on a control at once: where their ends differ, the narrower ones. Null where nothing hangs on it. */
export function movedByControl(
	control: Control,
	{ steps }: Pick<WidgetDocument, 'steps'>,
	calculators: CalculatorSet
): Moved | null {
	const all = steps.flatMap((step) => {
		const calculator = calculators.get(step.calculator);
		if (!calculator) return [];
		return Object.entries(step.settings).flatMap(([key, source]) => {
			if (source.from !== 'control' || source.control !== control.id) return [];
			return movedBySetting(step, calculator, key) ?? [];
		});
	});
	const words = all.find((moved) => moved.what === 'words');
	if (words) return words;
	return all.filter((moved) => moved.what === 'number').reduce<NumberMoved | null>(narrower, null);
}

function narrower(one: NumberMoved | null, other: NumberMoved): NumberMoved {
	if (!one || !commensurable(one.unit, other.unit)) return other;
	const ends = endsIn(other, one.unit);
	return { ...one, min: Math.max(one.min, ends.min), max: Math.min(one.max, ends.max) };
}

/** The ends in another unit of the same kind. */
export function endsIn(moved: NumberMoved, unit: string): { min: number; max: number } {
	return { min: convert(moved.min, moved.unit, unit), max: convert(moved.max, moved.unit, unit) };
}
