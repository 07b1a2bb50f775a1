/** Everything on the bench that a number can be tied to, in the order it hangs there, with its letter tag. */
import type { CalculatorSet } from '../physics/calculator.ts';
import type { ReadingRef } from '../widget/document.ts';
import { readingAt, type Evaluation, type ReadingOutcome, type Wired } from '../widget/evaluate.ts';
import { tagLetter } from './wiring.ts';

export interface BenchReading {
	ref: ReadingRef;
	/** Letter on the hook; '' for settings and sliders. */
	tag: string;
	label: string;
	/** The calculator's title, or “slider”. */
	where: string;
	outcome: ReadingOutcome;
}

/** Outputs first, then sliders, then settings that aren't wired from elsewhere on the bench. */
export function benchReadings(
	document: Wired,
	evaluation: Evaluation,
	calculators: CalculatorSet
): BenchReading[] {
	const at = (ref: ReadingRef) => readingAt(document, evaluation, ref, calculators);
	const outputs: BenchReading[] = [];
	const settings: BenchReading[] = [];
	for (const step of document.steps) {
		const calculator = calculators.get(step.calculator);
		if (!calculator) continue;
		for (const [output, spec] of Object.entries(calculator.outputs)) {
			if (spec.text) continue;
			const ref = { step: step.id, output };
			const tag = tagLetter(outputs.length);
			outputs.push({ ref, tag, label: spec.label, where: calculator.title, outcome: at(ref) });
		}
		for (const [setting, source] of Object.entries(step.settings)) {
			const spec = calculator.inputs[setting];
			if (spec?.kind !== 'number' || source.from === 'control' || source.from === 'reading')
				continue;
			const ref = { step: step.id, setting };
			const where = `${calculator.title}, setting`;
			settings.push({ ref, tag: '', label: spec.label, where, outcome: at(ref) });
		}
	}
	const controls = document.controls.map((control): BenchReading => {
		const ref = { control: control.id };
		return { ref, tag: '', label: control.label, where: 'slider', outcome: at(ref) };
	});
	return [...outputs, ...controls, ...settings];
}

export function sameRef(a: ReadingRef, b: ReadingRef): boolean {
	if ('control' in a || 'control' in b)
		return 'control' in a && 'control' in b && a.control === b.control;
	if (a.step !== b.step) return false;
	if ('output' in a) return 'output' in b && a.output === b.output;
	return 'setting' in b && a.setting === b.setting;
}
