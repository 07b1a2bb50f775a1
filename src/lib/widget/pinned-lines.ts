/** Lines of the catalogue that a piece names: a pinned value must be the line's own. */
import { resolveUnit, type CalculatorSet, type InputSpec } from '../physics/calculator.ts';
import { lineById, restValue } from '../physics/lines/catalogue.ts';
import type { SettingSource, Step, WidgetDocument } from './document.ts';
import type { Finding } from './findings.ts';
import { fixedSettings } from './tie-units.ts';

/** Held back at the proof and not at the save: a draft from before a change of the catalogue still opens. */
export function pinnedLineFindings(
	document: WidgetDocument,
	calculators: CalculatorSet
): Finding[] {
	return document.steps.flatMap((step) =>
		Object.entries(step.settings).flatMap(([key, source]) => {
			const spec = calculators.get(step.calculator)?.inputs[key];
			const says = source.from === 'line' && spec ? lineIssue(source, spec, step) : null;
			return says ? [{ code: 'line-moved', says, at: { step: step.id } }] : [];
		})
	);
}

/** A pinned line says whose number it is, so it must be that number. */
function lineIssue(
	source: Extract<SettingSource, { from: 'line' }>,
	spec: InputSpec,
	step: Step
): string | null {
	const line = lineById(source.line);
	if (!line) return `The catalogue has no line “${source.line}”.`;
	if (spec.kind !== 'number' || !LINE_QUANTITIES.has(spec.quantity)) {
		return `“${spec.label}” can’t take a line of the catalogue.`;
	}
	const value = restValue(line, resolveUnit(spec.unit, fixedSettings(step)));
	return Math.abs(value / source.value - 1) < ROUNDING
		? null
		: `${line.label} has another value in the catalogue now: choose the line anew.`;
}

/** Converting a line's own value to the setting's unit may cost the last bit. */
const ROUNDING = 1e-14;

const LINE_QUANTITIES: ReadonlySet<string> = new Set(['wavelength', 'frequency', 'photon-energy']);
