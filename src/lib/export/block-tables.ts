/** Charts and tables of readings as tables of numbers. */
import { settingFrom } from '../widget/control-grid.ts';
import { hasOptions } from '../widget/control.ts';
import type { Block, ChartBlock, ItemChart, LedgerChart, LineChart } from '../widget/document.ts';
import { evaluate, sampleChart } from '../widget/evaluate.ts';
import { NO_READING } from '../widget/places.ts';
import { printDigits, printUnit } from '../widget/print-reading.ts';
import { table } from './markdown-text.ts';
import { figuresIn, inUnit, type Worked } from './worked.ts';

/** As many figures as a reader takes from a line. */
const FIGURES = 4;
/** Rows of a line’s table, its ends among them. */
const ROWS = 9;

export function chartTable(chart: ChartBlock, worked: Worked): string {
	switch (chart.form) {
		case 'line':
			return lineTable(chart, worked);
		case 'ledger':
			return ledgerTable(chart, worked);
		default:
			return itemTable(chart, worked);
	}
}

function lineTable(chart: LineChart, worked: Worked): string {
	const { document, evaluation, calculators } = worked;
	const control = document.controls.find(({ id }) => id === chart.x.control);
	const lines = sampleChart(document, evaluation.values, chart, calculators, ROWS);
	const [first = []] = lines;
	const unit = control?.unit ?? '';
	const named = (label: string, of: string) => (of ? `${label}, ${printUnit(of)}` : label);
	return table(
		[
			named(chart.x.label, unit),
			...chart.series.map(({ label }) => named(label || chart.y.label, chart.y.unit))
		],
		first.map(({ x }, row) => [
			printDigits(x, FIGURES, true),
			...lines.map((line) => {
				const y = line[row]?.y ?? null;
				return y === null ? NO_READING : inUnit(y, '', FIGURES);
			})
		])
	);
}

function itemTable({ axis, items }: ItemChart, worked: Worked): string {
	const rows = items.map((item) => [
		item.label,
		'reading' in item
			? figuresIn({ reading: item.reading, unit: axis.unit, figures: FIGURES }, worked)
			: inUnit(item.value, axis.unit, FIGURES)
	]);
	return table(['', axis.label], rows);
}

function ledgerTable({ axis, columns }: LedgerChart, worked: Worked): string {
	const rows = columns.flatMap(({ label, parts }) =>
		parts.map((part) => [
			label,
			part.label,
			figuresIn({ reading: part.reading, unit: axis.unit, figures: FIGURES }, worked)
		])
	);
	return table(['', '', axis.label], rows);
}

type TableBlock = Extract<Block, { kind: 'table' }>;

export function readingTable({ rows, across }: TableBlock, worked: Worked): string {
	const control = across && worked.document.controls.find(({ id }) => id === across.control);
	if (!across || !control)
		return table(
			['', ''],
			rows.map((row) => [row.label, figuresIn(row, worked)])
		);
	const columns = across.values.map((value) => ({
		head: String(
			hasOptions(control) ? settingFrom(control, value) : inUnit(value, control.unit, 12)
		),
		worked: {
			...worked,
			evaluation: evaluate(
				worked.document,
				{ ...worked.evaluation.values, [control.id]: value },
				worked.calculators
			)
		}
	}));
	return table(
		[control.label, ...columns.map(({ head }) => head)],
		rows.map((row) => [row.label, ...columns.map((column) => figuresIn(row, column.worked))])
	);
}
