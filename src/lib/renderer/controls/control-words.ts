/** What a control is called and where it stands, in words, for labels and for listeners. */
import type { Control } from '../../widget/document.ts';
import type { Language } from '../../widget/language.ts';
import { printWordsOf } from '../../widget/languages/print-words.ts';
import { settingWords } from '../../widget/places.ts';

/** “million years”; '' for plain numbers. */
export function unitInWords(unit: string, language: Language): string {
	return printWordsOf(language).units(unit)?.[1] ?? '';
}

/** “The wave left at this age, in million years”. */
export function labelWithUnit(
	{ label, unit }: Pick<Control, 'label' | 'unit'>,
	language: Language
): string {
	const many = unitInWords(unit, language);
	if (!many) return label;
	return language === 'en' ? `${label}, in ${many}` : `${label} (${many})`;
}

/** “180 million years”, or the option's own label. */
export function valueInWords(control: Control, value: number, language: Language): string {
	const words = settingWords(
		{ controls: [control], language },
		{ values: { [control.id]: value } },
		control.id
	);
	return words.replaceAll('\u00a0', ' ');
}
