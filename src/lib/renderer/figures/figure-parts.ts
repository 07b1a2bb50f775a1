/** What every chart's figure takes, and what it has around its drawing. */
import type { Drawn, DrawnColumn } from '../../widget/chart-data.ts';
import type { ItemChart } from '../../widget/document.ts';
import type { Language } from '../../widget/language.ts';
import type { ItemAxis } from './item-table.ts';

export interface FigureWords {
	title: string;
	source?: string;
	/** The trend, the ends and the crossings, in words. */
	description?: string;
	/** Its words for print must have been loaded. English by default. */
	language?: Language;
}

export interface ItemFigure extends FigureWords {
	form: ItemChart['form'];
	/** For shapes. */
	shows: ItemChart['shows'];
	axis: ItemAxis;
	items: readonly Drawn[];
}

export interface LedgerFigure extends FigureWords {
	axis: { label: string; unit: string };
	columns: readonly DrawnColumn[];
}

export interface FigureTable {
	/** One cell for each column, unit included. */
	head: readonly string[];
	/** The first cell of a row names it. */
	rows: readonly (readonly string[])[];
}

/** Content width, in pixels, at which the narrowest frame draws: 280 less its padding and a little. */
export const NARROWEST = 244;
/** Where the style sheet gives charts more room; see `@container widget` in chart.css. */
export const WIDE = 480;
export const WIDEST = 752;
