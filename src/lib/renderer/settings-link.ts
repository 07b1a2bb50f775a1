/** Settings in a link's fragment: `#wave-age=270`. They stay in the reader's browser; nothing is sent. */
import { unitOf } from '../physics/units/units.ts';
import type { Control } from '../widget/document.ts';
import { plainDecimal, printStated } from '../widget/stated.ts';
import { snapToGrid } from '../widget/grid.ts';

export interface LinkSettings {
	/** By control id; each inside its control's range. */
	values: Record<string, number>;
	/** What was asked and can't be had, in a sentence; '' when all could. */
	notice: string;
}

/** Names that aren't controls, and values that aren't numbers, are passed over. */
export function settingsInLink(fragment: string, controls: readonly Control[]): LinkSettings {
	const values: Record<string, number> = {};
	const notices: string[] = [];
	const asked = new URLSearchParams(fragment.replace(/^#/, ''));
	for (const control of controls) {
		const written = asked.get(control.id)?.trim();
		const value = written ? Number(written) : NaN;
		if (!Number.isFinite(value)) continue;
		const set = snapToGrid(value, control);
		values[control.id] = set;
		if (value < control.min || value > control.max) {
			const range = `${inWords(control.min, '')} to ${inWords(control.max, control.unit)}`;
			notices.push(
				`The link you followed asks for ${inWords(value, control.unit)}. The slider goes from ${range}, so it stands at ${inWords(set, '')}.`
			);
		}
	}
	return { values, notice: notices.join(' ') };
}

function inWords(value: number, unit: string): string {
	const known = unitOf(unit) ? unit : '';
	return printStated({
		hedge: 'bare',
		hedgeWord: '',
		numeral: plainDecimal(value),
		scale: 1,
		unit: known
	});
}
