/** Discs in true proportion: by area, or by width where the quantity is one. */
import type { Drawn } from '../../widget/chart-data.ts';
import { axisName, type ChartPrint } from './axis-words.ts';
import type { FigureTable } from './figure-parts.ts';
import { hasValue, itemNotes, itemTable, itemWords, type ItemAxis } from './item-table.ts';

export interface Shape {
	id: string;
	label: string;
	words: string;
	/** Pixels; 0 where nothing can be drawn. */
	radius: number;
	/** Too small to be seen: a ring says where it is. */
	ringed: boolean;
}

export interface ShapeModel {
	caption: string;
	shapes: Shape[];
	notes: string[];
	table: FigureTable;
}

/** The largest disc, in pixels: two of them fit the narrowest frame. */
export const LARGEST_RADIUS = 54;
const SMALLEST_RADIUS = 1.5;
export const RING = 9;

export function shapeModel(
	shows: 'area' | 'width',
	{ label, unit }: ItemAxis,
	items: readonly Drawn[],
	print: ChartPrint
): ShapeModel | null {
	const values = items.filter(hasValue).map(({ value }) => value);
	const largest = Math.max(0, ...values);
	if (largest === 0) return null;
	const shapes = items.map((item): Shape => {
		const share = hasValue(item) && item.value > 0 ? item.value / largest : 0;
		const radius = LARGEST_RADIUS * (shows === 'area' ? Math.sqrt(share) : share);
		return {
			id: item.id,
			label: item.label,
			words: itemWords(item, print.value, print),
			radius,
			ringed: share > 0 && radius < SMALLEST_RADIUS
		};
	});
	return {
		caption: axisName(label, print.unit(unit)),
		shapes,
		notes: [
			shows === 'area' ? print.says.byArea : print.says.byWidth,
			...shapes.filter(({ ringed }) => ringed).map((shape) => print.says.tooSmall(shape.label)),
			...items
				.filter((item) => hasValue(item) && item.value < 0)
				.map((item) => print.says.noShape(item.label)),
			...itemNotes(items, false, print)
		],
		table: itemTable(
			items,
			label,
			{
				unit: print.unit(unit),
				words: print.value,
				differenceWords: print.value
			},
			print
		)
	};
}
