/** What a peg can be fed from: readings and controls in units that convert, and never a ring. */
import { resolveUnit, type Calculator, type CalculatorSet } from '../physics/calculator.ts';
import { commensurable, units, type Unit } from '../physics/units/units.ts';
import { hasOptions, type Option } from '../widget/control.ts';
import type { Control, SettingSource, Step, WidgetDocument } from '../widget/document.ts';
import { wiringOf } from '../widget/graph.ts';
import { fixedSettings, unitOfRef } from '../widget/tie-units.ts';
import type { BenchReading } from './bench-readings.ts';

/** The unit a numeric setting has, given the step's choices; null for choices and parameter sets. */
export function pegUnit(step: Step, calculator: Calculator, key: string): string | null {
	const spec = calculator.inputs[key];
	return spec?.kind === 'number' ? resolveUnit(spec.unit, fixedSettings(step)) : null;
}

/** Units a field may be typed in. Plain numbers stay plain: a factor isn't a per cent by accident. */
export function unitsLike(symbol: string): readonly Unit[] {
	if (symbol === '') return units.filter((unit) => unit.symbol === '');
	return units.filter((unit) => unit.symbol !== '' && commensurable(unit.symbol, symbol));
}

/** By the units that the wiring brings, so that a reading which is refused just now can be tied all the same. */
export function readingsForPeg(
	document: Pick<WidgetDocument, 'formulas' | 'steps' | 'controls'>,
	step: Step,
	unit: string,
	readings: readonly BenchReading[],
	calculators: CalculatorSet
): BenchReading[] {
	return readings.filter(({ ref, tag }) => {
		if (tag === '' || 'control' in ref || !('output' in ref)) return false;
		if (wiringOf(document.steps, ref).steps.some(({ id }) => id === step.id)) return false;
		const own = unitOfRef(document, ref, calculators);
		return own !== null && commensurable(own, unit);
	});
}

/** Controls whose settings are numbers of this kind. */
export function controlsForPeg(controls: readonly Control[], unit: string): Control[] {
	return controls.filter((control) => !offersWords(control) && commensurable(control.unit, unit));
}

/** Controls that offer none but these words. */
export function controlsOfWords(
	controls: readonly Control[],
	options: readonly Option[]
): Control[] {
	const known = new Set(options.map(({ value }) => value));
	return controls.filter(
		(control) => hasOptions(control) && control.options.every(({ value }) => known.has(value))
	);
}

function offersWords(control: Control): boolean {
	return hasOptions(control) && control.options.some(({ value }) => typeof value === 'string');
}

/** One string for each source, for a list to choose from. */
export function sourceKey(source: SettingSource | undefined): string {
	if (!source) return 'none';
	switch (source.from) {
		case 'fixed':
			return 'fixed';
		case 'line':
			return 'line';
		case 'control':
			return `control ${source.control}`;
		case 'reading':
			return `reading ${source.step} ${source.output}`;
	}
}
