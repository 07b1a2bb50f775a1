/** What a piece still lacks before a proof can be pulled: each a sentence, with the place to mend it. */
import type { CalculatorSet } from '../physics/calculator.ts';
import { isTextBlock, type ChartBlock, type WidgetDocument } from './document.ts';
import { evaluate, readingAt } from './evaluate.ts';
import { gridProblem } from './grid.ts';
import { pinnedLineFindings } from './pinned-lines.ts';
import { blockText, tokenWords } from './places.ts';

export interface Finding {
	code: string;
	/** What is missing and how to mend it. */
	says: string;
	/** The block, claim or step to go to. */
	at: { block?: string; claim?: string; step?: string };
}

export function findings(document: WidgetDocument, calculators: CalculatorSet): Finding[] {
	return [
		...wordFindings(document),
		...document.blocks.flatMap((block) => (block.kind === 'chart' ? chartFindings(block) : [])),
		...controlFindings(document),
		...readingFindings(document, calculators),
		...pinnedLineFindings(document, calculators)
	];
}

function wordFindings(document: WidgetDocument): Finding[] {
	const found: Finding[] = [];
	if (!document.title.trim())
		found.push({ code: 'no-title', says: 'Give the piece a title.', at: {} });
	if (!document.point.trim()) {
		found.push({
			code: 'no-point',
			says: 'Say the one thing a reader takes away, under the title.',
			at: {}
		});
	}
	const written = document.blocks.some(
		(block) => isTextBlock(block) && blockText(block, tokenWords).trim()
	);
	if (!written) found.push({ code: 'no-copy', says: 'Write at least one paragraph.', at: {} });
	return found;
}

function chartFindings(chart: ChartBlock): Finding[] {
	const wanted: [string, string, string][] = [
		[chart.title, 'no-chart-title', 'Give the chart a title.'],
		[chart.x.label, 'no-x-label', 'Say which quantity the level axis shows.'],
		[chart.y.label, 'no-y-label', 'Say which quantity the upright axis shows.'],
		[chart.source, 'no-chart-source', 'Say where the chart’s line comes from.'],
		[
			chart.description,
			'no-description',
			'Describe the chart for those who can’t see it: its ends and its trend.'
		]
	];
	return wanted.flatMap(([text, code, says]) =>
		text.trim() ? [] : [{ code, says, at: { block: chart.id } }]
	);
}

/** A control that moves nothing a reader can see, or that has no name, isn't ready. */
function controlFindings(document: WidgetDocument): Finding[] {
	const shown = new Set(
		document.blocks.flatMap((block) => (block.kind === 'control' ? [block.control] : []))
	);
	return document.controls.flatMap((control) => {
		const { id, label, initial } = control;
		const block = document.blocks.find(
			(candidate) => candidate.kind === 'control' && candidate.control === id
		);
		const at = block ? { block: block.id } : {};
		if (!shown.has(id)) {
			return [
				{
					code: 'control-unplaced',
					says: `Put the slider “${label || id}” into the copy, or remove it.`,
					at
				}
			];
		}
		const offGrid = gridProblem(control, initial);
		return [
			...(label.trim()
				? []
				: [{ code: 'no-control-label', says: 'Say what the slider moves, with its unit.', at }]),
			...(offGrid
				? [{ code: 'off-grid', says: `The slider “${label}” can’t be set right: ${offGrid}`, at }]
				: [])
		];
	});
}

/** Readings in use must not be refused at the first settings. */
function readingFindings(document: WidgetDocument, calculators: CalculatorSet): Finding[] {
	const evaluation = evaluate(document, {}, calculators);
	const inUse = [
		...document.claims.flatMap((claim) =>
			claim.form === 'exempt' ? [] : [{ ref: claim.reading, at: { claim: claim.id } }]
		),
		...document.blocks.flatMap((block) =>
			block.kind === 'chart' ? [{ ref: block.y.reading, at: { block: block.id } }] : []
		)
	];
	return inUse.flatMap(({ ref, at }) => {
		const outcome = readingAt(document, evaluation, ref, calculators);
		return outcome.ok
			? []
			: [{ code: 'no-reading', says: `No reading: ${outcome.refusal.message}`, at }];
	});
}
