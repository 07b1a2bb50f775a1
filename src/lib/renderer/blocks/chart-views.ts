/**
 * The component of each form of chart. A reader's frame loads only the forms that its piece has: its build takes
 * `chart-views-later.ts` in place of this file (`embed/vite.config.ts`), which has the same exports.
 */
import '../figures/chart-words/all.ts';
import type { Component } from 'svelte';
import type { ItemChart, LineChart, WidgetDocument } from '../../widget/document.ts';
import type { ItemFigure, LedgerFigure } from '../figures/figure-parts.ts';
import LedgerChart from '../figures/LedgerChart.svelte';
import RowChart from '../figures/RowChart.svelte';
import ShapeChart from '../figures/ShapeChart.svelte';
import StemChart from '../figures/StemChart.svelte';
import TimelineChart from '../figures/TimelineChart.svelte';
import LineChartBlock from './LineChartBlock.svelte';

export function lineView(): Component<{ block: LineChart }> {
	return LineChartBlock;
}

export function ledgerView(): Component<LedgerFigure> {
	return LedgerChart;
}

export function itemView(form: ItemChart['form']): Component<ItemFigure> {
	switch (form) {
		case 'bars':
		case 'dots':
			return RowChart;
		case 'number-line':
		case 'spectrum':
			return StemChart;
		case 'timeline':
			return TimelineChart;
		case 'shapes':
			return ShapeChart;
	}
}

/** Afterwards every chart of the document can be drawn. Here they all can be from the start. */
export async function loadChartViews(
	_document: Pick<WidgetDocument, 'blocks' | 'language'>
): Promise<void> {}
