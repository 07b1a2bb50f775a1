/** The readings that blocks show by themselves: drawn, set in a table, under an equation, behind a guess. */
import type { Block } from './block.ts';
import { chartReadings } from './chart.ts';
import type { ReadingRef } from './references.ts';

export interface ShownReading {
	/** Where in the block: `series.0`, `rows.2`. */
	path: string;
	reading: ReadingRef;
	/** The unit it is shown in. */
	unit: string;
}

export function shownReadings(block: Block): ShownReading[] {
	switch (block.kind) {
		case 'chart':
			return chartReadings(block);
		case 'table':
			return block.rows.map(({ reading, unit }, index) => ({
				path: `rows.${index}`,
				reading,
				unit
			}));
		case 'equation':
			return block.values.map(({ reading, unit }, index) => ({
				path: `values.${index}`,
				reading,
				unit
			}));
		case 'guess':
			return [{ path: 'reading', reading: block.reading, unit: block.unit }];
		default:
			return [];
	}
}

/** Ids of the controls that a block itself names, beside those in its text. */
export function controlsNamed(block: Block): string[] {
	switch (block.kind) {
		case 'control':
			return [block.control];
		case 'chart':
			return block.form === 'line' ? [block.x.control] : [];
		case 'table':
			return block.across ? [block.across.control] : [];
		case 'presets':
			return [...new Set(block.presets.flatMap(({ values }) => Object.keys(values)))];
		default:
			return [];
	}
}
