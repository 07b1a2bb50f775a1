/**
 * Charts of a widget. All that is drawn comes from readings; what misleads can't be written down: bars always start at
 * zero, shapes say whether their area or their width is the quantity, and a logarithmic axis is named as one.
 */
import { z } from 'zod';
import { finite, Id, ReadingRef, UnitSymbol } from './references.ts';

/** Words are required before a proof, not before a save. */
const common = {
	id: Id,
	kind: z.literal('chart'),
	title: z.string().max(160),
	source: z.string().max(240),
	description: z.string().max(600)
};

const label = z.string().max(120);
const scale = z.enum(['linear', 'log']);
export type AxisScale = z.infer<typeof scale>;

/** Lines: readings against one control, over that control's range. */
export const LineChart = z.strictObject({
	...common,
	form: z.literal('line'),
	x: z.strictObject({ control: Id, label, scale }),
	y: z.strictObject({
		unit: UnitSymbol,
		label,
		scale,
		/** Where a linear axis starts: at zero, or near the lowest point. A logarithmic one has no zero. */
		from: z.enum(['zero', 'data'])
	}),
	series: z
		.array(z.strictObject({ id: Id, reading: ReadingRef, label: z.string().max(80) }))
		.min(1)
		.max(4),
	/** Named stretches of the upright axis, in its unit. */
	bands: z.array(z.strictObject({ from: finite, to: finite, label: z.string().max(80) })).max(4)
});
export type LineChart = z.infer<typeof LineChart>;

/** One thing on a chart: a reading, or a line of the catalogue with the value it had when it was placed, in the axis's unit. */
export const ChartItem = z.union([
	z.strictObject({ id: Id, label: z.string().max(80), reading: ReadingRef }),
	z.strictObject({ id: Id, label: z.string().max(80), line: z.string().max(60), value: finite })
]);
export type ChartItem = z.infer<typeof ChartItem>;

export const ITEM_FORMS = [
	'bars',
	'dots',
	'number-line',
	'shapes',
	'spectrum',
	'timeline'
] as const;

/** Named things along one axis. Bars and shapes are linear from zero, whatever `scale` says. */
export const ItemChart = z.strictObject({
	...common,
	form: z.enum(ITEM_FORMS),
	axis: z.strictObject({ label, unit: UnitSymbol, scale }),
	/** For shapes: what is in proportion to the quantity. A diameter is drawn as a width, the rest as areas. */
	shows: z.enum(['area', 'width']),
	items: z.array(ChartItem).min(1).max(16)
});
export type ItemChart = z.infer<typeof ItemChart>;

/** Energy ledger: columns of parts that stand on zero and add up. */
export const LedgerChart = z.strictObject({
	...common,
	form: z.literal('ledger'),
	axis: z.strictObject({ label, unit: UnitSymbol }),
	columns: z
		.array(
			z.strictObject({
				id: Id,
				label: z.string().max(80),
				parts: z
					.array(z.strictObject({ id: Id, label: z.string().max(80), reading: ReadingRef }))
					.min(1)
					.max(6)
			})
		)
		.min(1)
		.max(8)
});
export type LedgerChart = z.infer<typeof LedgerChart>;

export const ChartBlock = z.discriminatedUnion('form', [LineChart, ItemChart, LedgerChart]);
export type ChartBlock = z.infer<typeof ChartBlock>;
export type ChartForm = ChartBlock['form'];

/** Every reading a chart draws, with the unit it is drawn in and where in the block it stands. */
export function chartReadings(
	chart: ChartBlock
): { path: string; reading: ReadingRef; unit: string }[] {
	switch (chart.form) {
		case 'line':
			return chart.series.map(({ reading }, index) => ({
				path: `series.${index}`,
				reading,
				unit: chart.y.unit
			}));
		case 'ledger':
			return chart.columns.flatMap(({ parts }, column) =>
				parts.map(({ reading }, part) => ({
					path: `columns.${column}.parts.${part}`,
					reading,
					unit: chart.axis.unit
				}))
			);
		default:
			return chart.items.flatMap((item, index) =>
				'reading' in item
					? [{ path: `items.${index}`, reading: item.reading, unit: chart.axis.unit }]
					: []
			);
	}
}
