/**
 * What a chart lacks before it can be passed, and what would make it mislead: each a sentence that says how to mend it.
 * The readings are tried where a reader can bring them, at the first settings and at both ends of every control.
 */
import type { CalculatorSet } from '../physics/calculator.ts';
import { lineById, restValue } from '../physics/lines/catalogue.ts';
import { commensurable, unitOf } from '../physics/units/units.ts';
import { columnsDrawn, itemsDrawn, type Drawn } from './chart-data.ts';
import { chartReadings } from './chart.ts';
import { isMeasured } from './control.ts';
import { settingWords } from './places.ts';
import type {
	ChartBlock,
	ControlValues,
	ItemChart,
	LedgerChart,
	LineChart,
	WidgetDocument
} from './document.ts';
import { evaluate, readingAt, sampleChart } from './evaluate.ts';
import type { Finding } from './findings.ts';

/** A description shorter than this can't tell ends and trend. */
const SHORTEST_DESCRIPTION = 40;
/** Points at which a line is tried. */
const TRIAL_POINTS = 25;

type Said = [code: string, says: string];

export function chartFindings(
	chart: ChartBlock,
	document: WidgetDocument,
	calculators: CalculatorSet
): Finding[] {
	const said = [
		...wordsWanted(chart),
		...unitFindings(chart, document, calculators),
		...formFindings(chart, document, calculators)
	];
	const once = new Map(said.map(([code, says]) => [code + says, { code, says }]));
	return [...once.values()].map((finding) => ({ ...finding, at: { block: chart.id } }));
}

function formFindings(
	chart: ChartBlock,
	document: WidgetDocument,
	calculators: CalculatorSet
): Said[] {
	switch (chart.form) {
		case 'line':
			return lineFindings(chart, document, calculators);
		case 'ledger':
			return ledgerFindings(chart, document, calculators);
		default:
			return itemFindings(chart, document, calculators);
	}
}

function wordsWanted(chart: ChartBlock): Said[] {
	const description = chart.description.trim();
	return [
		...wanted(chart.title, 'no-chart-title', 'Give the chart a title.'),
		...axisLabels(chart),
		...wanted(chart.source, 'no-chart-source', 'Say where the chart’s numbers come from.'),
		...wanted(
			description,
			'no-description',
			'Describe the chart for those who can’t see it: its ends and its trend.'
		),
		...(description && description.length < SHORTEST_DESCRIPTION
			? [
					[
						'short-description',
						'The chart’s description is too short to tell what it shows: say its ends and its trend, with numbers.'
					] as Said
				]
			: [])
	];
}

function wanted(text: string, code: string, says: string): Said[] {
	return text.trim() ? [] : [[code, says]];
}

function axisLabels(chart: ChartBlock): Said[] {
	if (chart.form !== 'line')
		return wanted(chart.axis.label, 'no-axis-label', 'Say which quantity the axis shows.');
	return [
		...wanted(chart.x.label, 'no-x-label', 'Say which quantity the level axis shows.'),
		...wanted(chart.y.label, 'no-y-label', 'Say which quantity the upright axis shows.')
	];
}

/** All that one axis shows must be the same kind of quantity. */
function unitFindings(
	chart: ChartBlock,
	document: WidgetDocument,
	calculators: CalculatorSet
): Said[] {
	const evaluation = evaluate(document, {}, calculators);
	return chartReadings(chart).flatMap(({ reading, unit }): Said[] => {
		const outcome = readingAt(document, evaluation, reading, calculators);
		if (!outcome.ok || typeof outcome.reading.value === 'string') return [];
		if (commensurable(outcome.reading.unit, unit)) return [];
		const [own, axis] = [unitWords(outcome.reading.unit), unitWords(unit)];
		return [
			[
				'mixed-units',
				`One of the chart’s readings is in ${own} and can’t stand on an axis in ${axis}. Choose another reading or unit.`
			]
		];
	});
}

function unitWords(unit: string): string {
	return unitOf(unit)?.words.many || unit || 'plain numbers';
}

function lineFindings(
	chart: LineChart,
	document: WidgetDocument,
	calculators: CalculatorSet
): Said[] {
	const said = [
		...(chart.series.length > 1 ? labelsWanted(chart.series, 'line') : []),
		...chart.bands.flatMap(({ from, to, label }): Said[] => [
			...wanted(label, 'no-band-label', 'Name every band of the chart.'),
			...(from < to
				? []
				: [['band-order', 'A band goes from the lower number to the higher.'] as Said])
		])
	];
	const control = document.controls.find(({ id }) => id === chart.x.control);
	if (!control || !isMeasured(control)) {
		const says = 'The lines need a control that goes from one number to another: choose one.';
		return [...said, ['no-x-control', says]];
	}
	if (chart.x.scale === 'log' && control.min <= 0) {
		said.push([
			'log-x',
			'The level axis is logarithmic and its control reaches 0 or below. Raise its lowest setting, or draw it evenly.'
		]);
	}
	for (const end of [control.min, control.max]) {
		const evaluation = evaluate(document, { [control.id]: end }, calculators);
		for (const { label, reading } of chart.series) {
			const outcome = readingAt(document, evaluation, reading, calculators);
			if (outcome.ok) continue;
			const where = settingWords(document, evaluation, control.id);
			said.push([
				'refused-end',
				`${label.trim() ? `“${label.trim()}”` : 'The line'} has no reading at ${where}, where the chart ends. Narrow the control’s range. ${outcome.refusal.message}`
			]);
		}
	}
	const points = sampleChart(document, {}, chart, calculators, TRIAL_POINTS).flat();
	if (chart.y.scale === 'log' && points.some(({ y }) => y !== null && y <= 0)) {
		said.push([
			'log-values',
			'The upright axis is logarithmic and a line reaches 0 or below, where it has no place. Draw it evenly, or narrow the range.'
		]);
	}
	return said;
}

function labelsWanted(named: readonly { label: string }[], thing: string): Said[] {
	const labels = named.map(({ label }) => label.trim());
	const given = labels.filter(Boolean);
	return [
		...(given.length < labels.length
			? [['no-series-label', `Name every ${thing} of the chart.`] as Said]
			: []),
		...(new Set(given).size < given.length
			? [['same-label', `Two ${thing}s of the chart have one name. Tell them apart.`] as Said]
			: [])
	];
}

const COMPARING: ReadonlySet<string> = new Set([
	'bars',
	'dots',
	'number-line',
	'shapes',
	'timeline'
]);

function itemFindings(
	chart: ItemChart,
	document: WidgetDocument,
	calculators: CalculatorSet
): Said[] {
	const said = [...labelsWanted(chart.items, 'item'), ...zeroFindings(chart.axis.unit, chart.form)];
	if (COMPARING.has(chart.form) && chart.items.length < 2)
		said.push(['one-item', 'A comparison needs at least two things. Add another.']);
	if (chart.form === 'shapes') said.push(...shapeFindings(chart));
	said.push(...pinnedFindings(chart));
	const isLog = chart.axis.scale === 'log' && chart.form !== 'bars' && chart.form !== 'shapes';
	for (const { label, value, refusal } of reachable(document, calculators, (evaluation) =>
		itemsDrawn(chart, { document, evaluation, calculators })
	)) {
		const name = label.trim() || 'One of the chart’s things';
		if (value === null)
			said.push(['refused-item', `${name} has no reading at some setting: ${refusal}`]);
		else if (isLog && value <= 0)
			said.push([
				'log-values',
				`${name} can be 0 or below and has no place on a logarithmic axis. Draw the axis evenly.`
			]);
		else if (chart.form === 'shapes' && value < 0)
			said.push([
				'negative-shape',
				`${name} can be below 0, and no shape has such a size. Draw bars.`
			]);
	}
	return said;
}

/** What stands on zero, or is as large as its number, needs a unit whose zero means nothing is there. */
function zeroFindings(unit: string, form: ChartBlock['form']): Said[] {
	if (form !== 'bars' && form !== 'shapes' && form !== 'ledger') return [];
	const found = unitOf(unit);
	if (!found || (found.offset === 0 && found.dimension.magnitude === undefined)) return [];
	return [
		[
			'no-true-zero',
			`Zero in ${unitWords(unit)} doesn’t mean that nothing is there, so lengths and sizes would mislead. Draw dots, or choose another unit.`
		]
	];
}

/** A length is as wide as it is long; nothing else is a width. */
function shapeFindings({ axis, shows }: ItemChart): Said[] {
	const isLength = commensurable(axis.unit, 'm');
	if (isLength && shows === 'area') {
		const says = `${axis.label.trim() || 'This quantity'} is a length: drawn as an area, twice as long would look less than twice. Show it as a width.`;
		return [['length-as-area', says]];
	}
	if (!isLength && shows === 'width') {
		const says = `${axis.label.trim() || 'This quantity'} isn’t a length: drawn as a width, twice as much would look like four times. Show it as an area.`;
		return [['width-of-other', says]];
	}
	return [];
}

/** A pinned line says whose number it is, so it must be that number. */
function pinnedFindings({ items, axis }: ItemChart): Said[] {
	return items.flatMap((item): Said[] => {
		if (!('line' in item)) return [];
		const line = lineById(item.line);
		if (!line) return [['line-gone', `The catalogue has no line “${item.line}”.`]];
		if (!['m', 'Hz', 'J'].some((unit) => commensurable(axis.unit, unit))) {
			const says = `${line.label} has no place on an axis in ${unitWords(axis.unit)}. Choose a unit of wavelength, frequency or energy.`;
			return [['line-unit', says]];
		}
		return Math.abs(restValue(line, axis.unit) / item.value - 1) < ROUNDING
			? []
			: [
					[
						'line-moved',
						`${line.label} has another value in the catalogue now: choose the line anew.`
					]
				];
	});
}

/** Converting a line's own value to the axis's unit may cost the last bits. */
const ROUNDING = 1e-12;

function ledgerFindings(
	chart: LedgerChart,
	document: WidgetDocument,
	calculators: CalculatorSet
): Said[] {
	const said: Said[] = [
		...labelsWanted(chart.columns, 'column'),
		...chart.columns.flatMap(({ parts }) => labelsWanted(parts, 'part')),
		...zeroFindings(chart.axis.unit, chart.form)
	];
	for (const { label, parts } of chart.columns) {
		const refs = parts.map(({ reading }) => JSON.stringify(reading));
		if (new Set(refs).size < refs.length)
			said.push(['counted-twice', `“${label}” counts one reading twice. Each part stands once.`]);
	}
	for (const { label, value, refusal } of reachable(document, calculators, (evaluation) =>
		columnsDrawn(chart, { document, evaluation, calculators }).flatMap(({ parts }) => parts)
	)) {
		const name = label.trim() || 'One of the parts';
		if (value === null)
			said.push(['refused-item', `${name} has no reading at some setting: ${refusal}`]);
		else if (value < 0)
			said.push([
				'negative-part',
				`${name} can be below 0, and what is stacked must add up from 0. Leave it out, or draw bars.`
			]);
	}
	return said;
}

/** What is drawn at the first settings and with each control at either of its ends. */
function reachable(
	document: WidgetDocument,
	calculators: CalculatorSet,
	draw: (evaluation: ReturnType<typeof evaluate>) => Drawn[]
): Drawn[] {
	const settings: ControlValues[] = [
		{},
		...document.controls
			.filter(isMeasured)
			.flatMap(({ id, min, max }) => [{ [id]: min }, { [id]: max }])
	];
	return settings.flatMap((values) => draw(evaluate(document, values, calculators)));
}
