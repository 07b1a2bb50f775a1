/** What tables, equations, pictures, guesses, presets and sources lack before a proof can be pulled. */
import type { Block } from './block.ts';
import { isMeasured } from './control.ts';
import { nearestSetting } from './control-grid.ts';
import type { WidgetDocument } from './document.ts';
import type { Finding } from './findings.ts';
import { plainDecimal } from './stated.ts';

export function blockFindings(block: Block, document: Pick<WidgetDocument, 'controls'>): Finding[] {
	return wantsOf(block, document).flatMap(([isThere, code, says]) =>
		isThere ? [] : [{ code, says, at: { block: block.id } }]
	);
}

/** Whether it is there, the finding's code, and the sentence when it isn't. */
type Want = [isThere: boolean, code: string, says: string];

function wantsOf(block: Block, document: Pick<WidgetDocument, 'controls'>): Want[] {
	switch (block.kind) {
		case 'table':
			return [
				[filled(block.title), 'no-table-title', 'Give the table a title.'],
				[
					block.rows.every(({ label }) => filled(label)),
					'no-row-label',
					'Name every row of the table.'
				],
				[filled(block.source), 'no-table-source', 'Say where the table’s numbers come from.'],
				...acrossWants(block, document)
			];
		case 'picture':
			return [
				[
					filled(block.alt) || filled(block.decorative),
					'no-alt',
					'Describe the picture for those who can’t see it, or say why it needs no words.'
				],
				[filled(block.credit), 'no-credit', 'Say whose picture it is.'],
				[filled(block.licence), 'no-licence', 'Say under which licence the picture is used.'],
				[
					block.labels.length > 0,
					'no-picture-label',
					'Say what kind of picture it is: a photograph, an artist’s impression, a simulation.'
				]
			];
		case 'guess':
			return [
				[filled(block.question), 'no-question', 'Ask the question that a reader guesses at.'],
				[
					block.min < block.max && (block.scale === 'linear' || block.min > 0),
					'no-guess-range',
					'Give the guess a range from a lower to a higher number; on a logarithmic arm both above nought.'
				]
			];
		case 'presets':
			return [
				[
					block.presets.every(({ label }) => filled(label)),
					'no-preset-label',
					'Name every one of the settings to try.'
				],
				[
					block.presets.every(({ values }) => reachable(values, document)),
					'preset-off-grid',
					'A setting to try lies where no step of its control leads: take it anew.'
				]
			];
		case 'sources':
			return [
				[
					block.items.every(({ text }) => filled(text)),
					'no-source-text',
					'Say what each source is, not only where.'
				]
			];
		default:
			return [];
	}
}

function filled(text: string): boolean {
	return text.trim() !== '';
}

function acrossWants(
	{ across }: Extract<Block, { kind: 'table' }>,
	{ controls }: Pick<WidgetDocument, 'controls'>
): Want[] {
	const control = across && controls.find(({ id }) => id === across.control);
	if (!control) return [];
	const off = across.values.find((value) => nearestSetting(control, value) !== value);
	return [
		[
			off === undefined,
			'table-off-grid',
			`The table has a column for ${off === undefined ? '' : plainDecimal(off)}, where no step of “${control.label}” leads.`
		]
	];
}

function reachable(
	values: Readonly<Record<string, number>>,
	{ controls }: Pick<WidgetDocument, 'controls'>
): boolean {
	return controls.every((control) => {
		const value = values[control.id];
		if (value === undefined) return true;
		return isMeasured(control)
			? nearestSetting(control, value) === value
			: Number.isInteger(value) && value < control.options.length && value >= 0;
	});
}
