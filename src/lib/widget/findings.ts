/** What a piece still lacks before a proof can be pulled: each a sentence, with the place to mend it. */
import type { CalculatorSet } from '../physics/calculator.ts';
import { benchSet } from './bench-set.ts';
import { blockFindings } from './block-findings.ts';
import { shownReadings } from './block-readings.ts';
import { chartFindings } from './chart-findings.ts';
import { isTextBlock, type Control, type WidgetDocument } from './document.ts';
import { evaluate, readingAt } from './evaluate.ts';
import { hasOptions } from './control.ts';
import { nearestSetting } from './control-grid.ts';
import { formulaFindings } from './formula-findings.ts';
import { gridProblem } from './grid.ts';
import { plainDecimal } from './stated.ts';
import { pinnedLineFindings } from './pinned-lines.ts';
import { blockText, tokenWords } from './places.ts';

export interface Finding {
	code: string;
	/** What is missing and how to mend it. */
	says: string;
	/** The block, claim, step or formula to go to. */
	at: { block?: string; claim?: string; step?: string; formula?: string };
}

export function findings(document: WidgetDocument, house: CalculatorSet): Finding[] {
	const calculators = benchSet(document, house);
	return [
		...wordFindings(document),
		...document.blocks.flatMap((block) =>
			block.kind === 'chart' ? chartFindings(block, document, calculators) : []
		),
		...document.blocks.flatMap((block) => blockFindings(block, document)),
		...controlFindings(document),
		...formulaFindings(document, calculators),
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

/** A control that moves nothing a reader can see, or that has no name, isn't ready. */
function controlFindings(document: WidgetDocument): Finding[] {
	const shown = new Set(
		document.blocks.flatMap((block) => (block.kind === 'control' ? [block.control] : []))
	);
	return document.controls.flatMap((control) => {
		const { id, label } = control;
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
		const offGrid = settingProblem(control);
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

/** Why no step of a control leads to its ends or its first setting; '' when a reader can reach them all. */
function settingProblem(control: Control): string {
	if (hasOptions(control) || control.kind === 'number') return '';
	if (control.kind !== 'log-slider') return gridProblem(control, control.initial);
	const near = nearestSetting(control, control.initial);
	return near === control.initial
		? ''
		: `No whole step leads to ${plainDecimal(control.initial)}; the nearest is ${plainDecimal(near)}.`;
}

/** Readings in use must not be refused at the first settings. */
function readingFindings(document: WidgetDocument, calculators: CalculatorSet): Finding[] {
	const evaluation = evaluate(document, {}, calculators);
	const inUse = [
		...document.claims.flatMap((claim) =>
			claim.form === 'exempt' ? [] : [{ ref: claim.reading, at: { claim: claim.id } }]
		),
		...document.blocks.flatMap((block) =>
			shownReadings(block).map(({ reading }) => ({ ref: reading, at: { block: block.id } }))
		)
	];
	return inUse.flatMap(({ ref, at }) => {
		const outcome = readingAt(document, evaluation, ref, calculators);
		return outcome.ok
			? []
			: [{ code: 'no-reading', says: `No reading: ${outcome.refusal.message}`, at }];
	});
}
