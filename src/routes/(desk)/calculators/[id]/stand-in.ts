/** What a calculator takes where an optional input is left empty. */
import { resolveUnit, type Calculator } from '$lib/physics/calculator.ts';
import { constants } from '$lib/physics/constants/index.ts';
import { printDigits, printUnit } from '$lib/widget/print-reading.ts';
import { groupOf } from './fields.ts';

/** In words, “0.06 eV stands in”; '' for an input that must be given. */
export function standIn(calculator: Calculator, key: string): string {
	const spec = calculator.inputs[key];
	if (!spec?.optional || groupOf(calculator, key)) return '';
	switch (spec.kind) {
		case 'number': {
			if (spec.absent !== undefined) return `${spec.absent} stands in`;
			const needed = spec.neededWith && calculator.inputs[spec.neededWith]?.label;
			if (needed) return `needed with “${needed}” alone`;
			const unit = printUnit(typeof spec.unit === 'string' ? resolveUnit(spec.unit, {}) : '');
			return `${[printDigits(spec.initial, 12, true), unit].filter(Boolean).join('\u00a0')} stands in`;
		}
		case 'choice': {
			const first = spec.options.find(({ value }) => value === spec.initial);
			return `${first?.label ?? spec.initial} stands in`;
		}
		case 'list':
			return `${spec.absent ?? spec.initial} stands in`;
		case 'decimal':
			return `${spec.initial} stands in`;
		case 'cosmology':
			return `${setWords(spec.initial)} stands in`;
	}
}

/** A published parameter set by its name in words: “Planck 2018”. */
export function setWords({ set }: { set?: string }): string {
	return Object.entries(constants.cosmologies).find(([key]) => key === set)?.[1].label ?? '';
}
