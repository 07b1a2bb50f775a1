/** Settings in a link's fragment: `#wave-age=270`. They stay in the reader's browser; nothing is sent. */
import { unitOf } from '../physics/units/units.ts';
import { hasOptions } from '../widget/control-kind.ts';
import { nearestSetting } from '../widget/control-grid.ts';
import type { WidgetDocument } from '../widget/document.ts';
import type { Language } from '../widget/language.ts';
import { plainDecimal, printStated } from '../widget/stated.ts';
import { readerWords } from './reader-words.ts';

export interface LinkSettings {
	/** By control id; each inside its control's range. */
	values: Record<string, number>;
	/** What was asked and can't be had, in a sentence; '' when all could. */
	notice: string;
}

/** Names that aren't controls, and values that aren't numbers, are passed over. */
export function settingsInLink(
	fragment: string,
	{ controls, language }: Pick<WidgetDocument, 'controls' | 'language'>
): LinkSettings {
	const says = readerWords(language);
	const inWords = (value: number, unit: string) => quantity(value, unit, language);
	const values: Record<string, number> = {};
	const notices: string[] = [];
	const asked = new URLSearchParams(fragment.replace(/^#/, ''));
	for (const control of controls) {
		const written = asked.get(control.id)?.trim();
		const value = written ? Number(written) : NaN;
		if (!Number.isFinite(value)) continue;
		const set = nearestSetting(control, value);
		values[control.id] = set;
		if (hasOptions(control)) continue;
		if (value < control.min || value > control.max) {
			notices.push(
				says.linkOutside(
					inWords(value, control.unit),
					inWords(control.min, ''),
					inWords(control.max, control.unit),
					inWords(set, '')
				)
			);
		}
	}
	return { values, notice: notices.join(' ') };
}

function quantity(value: number, unit: string, language: Language): string {
	const known = unitOf(unit) ? unit : '';
	return printStated(
		{ hedge: 'bare', hedgeWord: '', numeral: plainDecimal(value), scale: 1, unit: known },
		language
	);
}
