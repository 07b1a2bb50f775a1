/** Units known from the wiring alone, before anything is worked: what may be tied to what. */
import { resolveUnit, type CalculatorSet } from '../physics/calculator.ts';
import type { ReadingRef, Step, WidgetDocument } from './document.ts';

/** The fixed settings of a step as plain inputs: enough to know which unit a choice brings. */
export function fixedSettings(step: Step): Record<string, unknown> {
	return Object.fromEntries(
		Object.entries(step.settings).flatMap(([key, source]) =>
			source.from === 'fixed' ? [[key, source.value]] : []
		)
	);
}

/** The unit a reading will have; null for words and for what isn't there. */
export function unitOfRef(
	document: Pick<WidgetDocument, 'steps' | 'controls'>,
	ref: ReadingRef,
	calculators: CalculatorSet
): string | null {
	if ('control' in ref) return document.controls.find(({ id }) => id === ref.control)?.unit ?? null;
	const step = document.steps.find(({ id }) => id === ref.step);
	const calculator = step && calculators.get(step.calculator);
	if (!step || !calculator) return null;
	if ('output' in ref) {
		const output = calculator.outputs[ref.output];
		return !output || output.text ? null : resolveUnit(output.unit, fixedSettings(step));
	}
	const input = calculator.inputs[ref.setting];
	return input?.kind === 'number' ? resolveUnit(input.unit, fixedSettings(step)) : null;
}
