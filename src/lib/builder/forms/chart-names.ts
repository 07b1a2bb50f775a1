/** What each form of chart is called, and what it is good for. */
import type { ChartForm } from '../../widget/chart.ts';

export const CHART_NAMES: Record<ChartForm, string> = {
	line: 'Line chart',
	bars: 'Bars',
	dots: 'Dots',
	'number-line': 'Number line',
	shapes: 'Shapes in proportion',
	spectrum: 'Spectrum strip',
	ledger: 'Energy ledger',
	timeline: 'Timeline'
};

export const CHART_HINTS: Record<ChartForm, string> = {
	line: 'readings against a slider',
	bars: 'amounts side by side, from nought',
	dots: 'readings with their uncertainty',
	'number-line': 'several on one line',
	shapes: 'sizes you can see',
	spectrum: 'lines of light along a strip',
	ledger: 'parts that add up',
	timeline: 'when things happened'
};

export const CHART_FORMS = Object.keys(CHART_NAMES) as ChartForm[];
