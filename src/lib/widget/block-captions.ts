/** Words of blocks that aren't copy: titles, labels, descriptions. Sources are citations, full of numbers that are none of ours. */
import type { Block } from './block.ts';
import type { ChartBlock } from './chart.ts';

export interface Caption {
	/** What it is, as a sentence names it: “the chart's title”. */
	caption: string;
	text: string;
}

export function blockCaptions(block: Block): Caption[] {
	switch (block.kind) {
		case 'chart':
			return [
				{ caption: 'the chart’s title', text: block.title },
				{ caption: 'the chart’s description', text: block.description },
				...chartLabels(block)
			];
		case 'table':
			return [
				{ caption: 'the table’s title', text: block.title },
				...block.rows.map(({ label }) => ({ caption: 'the name of a row', text: label }))
			];
		case 'equation':
			return [{ caption: 'the words under the equation', text: block.caption }];
		case 'picture':
			return [
				{ caption: 'the picture’s caption', text: block.caption },
				{ caption: 'the picture’s description', text: block.alt }
			];
		case 'guess':
			return [{ caption: 'the question', text: block.question }];
		case 'presets':
			return [
				{ caption: 'the words over the presets', text: block.label },
				...block.presets.map(({ label }) => ({ caption: 'the name of a preset', text: label }))
			];
		default:
			return [];
	}
}

function chartLabels(chart: ChartBlock): Caption[] {
	switch (chart.form) {
		case 'line':
			return [
				{ caption: 'the chart’s level axis', text: chart.x.label },
				{ caption: 'the chart’s upright axis', text: chart.y.label },
				...chart.series.map(({ label }) => ({ caption: 'the name of a line', text: label })),
				...chart.bands.map(({ label }) => ({
					caption: 'the name of the chart’s band',
					text: label
				}))
			];
		case 'ledger':
			return [
				{ caption: 'the chart’s axis', text: chart.axis.label },
				...chart.columns.flatMap(({ label, parts }) => [
					{ caption: 'the name of a column', text: label },
					...parts.map((part) => ({ caption: 'the name of a part', text: part.label }))
				])
			];
		default:
			return [
				{ caption: 'the chart’s axis', text: chart.axis.label },
				...chart.items.map(({ label }) => ({ caption: 'a name on the chart', text: label }))
			];
	}
}
