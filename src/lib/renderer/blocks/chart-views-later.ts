/** What `chart-views.ts` gives, for a reader's frame: each form comes as a script of its own, before the frame wakes. */
import type { Component } from 'svelte';
import type { ChartBlock, ItemChart, LineChart, WidgetDocument } from '../../widget/document.ts';
import { loadChartWords } from '../figures/chart-words/load.ts';
import type { ItemFigure, LedgerFigure } from '../figures/figure-parts.ts';

let line: Component<{ block: LineChart }> | undefined;
let ledger: Component<LedgerFigure> | undefined;
const items: Partial<Record<ItemChart['form'], Component<ItemFigure>>> = {};

export function lineView(): Component<{ block: LineChart }> {
	return loaded(line);
}

export function ledgerView(): Component<LedgerFigure> {
	return loaded(ledger);
}

export function itemView(form: ItemChart['form']): Component<ItemFigure> {
	return loaded(items[form]);
}

function loaded<T>(view: T | undefined): T {
	if (!view) throw new Error('A chart is drawn before loadChartViews has loaded its form.');
	return view;
}

/** Afterwards every chart of the document can be drawn. A document without charts loads nothing. */
export async function loadChartViews({
	blocks,
	language
}: Pick<WidgetDocument, 'blocks' | 'language'>): Promise<void> {
	const forms = blocks.flatMap((block) => (block.kind === 'chart' ? [block.form] : []));
	if (forms.length === 0) return;
	await Promise.all([loadChartWords(language), ...[...new Set(forms)].map(load)]);
}

async function load(form: ChartBlock['form']): Promise<void> {
	switch (form) {
		case 'line':
			line = (await import('./LineChartBlock.svelte')).default;
			return;
		case 'ledger':
			ledger = (await import('../figures/LedgerChart.svelte')).default;
			return;
		case 'bars':
		case 'dots':
			items[form] = (await import('../figures/RowChart.svelte')).default;
			return;
		case 'number-line':
		case 'spectrum':
			items[form] = (await import('../figures/StemChart.svelte')).default;
			return;
		case 'timeline':
			items[form] = (await import('../figures/TimelineChart.svelte')).default;
			return;
		case 'shapes':
			items[form] = (await import('../figures/ShapeChart.svelte')).default;
	}
}
