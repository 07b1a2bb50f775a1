/** The table of named things along one axis, and what is said of those that can't be drawn. */
import type { Drawn } from '../../widget/chart-data.ts';
import type { Axis } from './axis.ts';
import type { ChartPrint } from './axis-words.ts';
import type { FigureTable } from './figure-parts.ts';

export interface ItemAxis {
	label: string;
	/** Symbol of the unit that values are in. */
	unit: string;
	log: boolean;
}

export interface Placed extends Drawn {
	value: number;
}

export function hasValue(item: Drawn): item is Placed {
	return item.value !== null && Number.isFinite(item.value);
}

/** A value as the axis counts it; the language's “no reading” where there is none. */
export function itemWords(
	{ value, figures }: Drawn,
	words: Axis['words'],
	{ says }: ChartPrint
): string {
	return value === null ? says.noReading : words(value, figures);
}

/** A standard uncertainty is a difference, so an axis that counts from another number doesn't shift it. */
function uncertaintyWords({ value, uncertainty }: Drawn, words: Axis['differenceWords']): string {
	return value === null || uncertainty === null ? '' : words(uncertainty, 2);
}

export function itemTable(
	items: readonly Drawn[],
	label: string,
	axis: Pick<Axis, 'unit' | 'words' | 'differenceWords'>,
	print: ChartPrint
): FigureTable {
	const inUnit = (name: string) => [name, axis.unit].filter(Boolean).join(' / ');
	const uncertain = items.some(({ uncertainty }) => uncertainty !== null);
	return {
		head: [print.says.item, inUnit(label), ...(uncertain ? [inUnit(print.says.uncertainty)] : [])],
		rows: items.map((item) => [
			item.label,
			itemWords(item, axis.words, print),
			...(uncertain ? [uncertaintyWords(item, axis.differenceWords)] : [])
		])
	};
}

/** Readings that are refused, and those that a log scale has no place for. */
export function itemNotes(items: readonly Drawn[], log: boolean, { says }: ChartPrint): string[] {
	return items.flatMap((item) => {
		if (!hasValue(item)) return [says.refused(item.label, item.refusal)];
		return log && item.value <= 0 ? [says.notAboveZero(item.label)] : [];
	});
}

export function valuesWithWhiskers(items: readonly Drawn[]): number[] {
	return items
		.filter(hasValue)
		.flatMap(({ value, uncertainty }) =>
			uncertainty === null ? [value] : [value - uncertainty, value, value + uncertainty]
		);
}
