/** A control in words: what kind it is, what it moves, from where to where, and where it stands. */
import { hasOptions, type Control } from '../widget/control.ts';
import type { WidgetDocument } from '../widget/document.ts';
import type { Evaluation } from '../widget/evaluate.ts';
import { settingWords } from '../widget/places.ts';
import { printNumeral, plainDecimal } from '../widget/stated.ts';

const KINDS: Record<Control['kind'], string> = {
	slider: 'slider',
	'log-slider': 'logarithmic slider',
	stepper: 'stepper',
	number: 'number field',
	choice: 'choice',
	toggle: 'switch'
};

/** “(slider: Redshift, 0 to 20, at 6)”. */
export function controlWords(
	control: Control,
	document: Pick<WidgetDocument, 'controls' | 'language'>,
	evaluation: Pick<Evaluation, 'values'>
): string {
	const stands = settingWords(document, evaluation, control.id);
	const numeral = (value: number) => printNumeral(plainDecimal(value), document.language);
	const range = hasOptions(control)
		? control.options.map(({ label }) => label).join(' or ')
		: `${numeral(control.min)} to ${numeral(control.max)}`;
	return `(${KINDS[control.kind]}: ${control.label}, ${range}, at ${stands})`;
}
