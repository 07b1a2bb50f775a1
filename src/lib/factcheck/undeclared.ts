/** Numbers that nobody answers for yet: neither tied to a reading nor named as no claim. They hold a proof back. */
import { constants } from '../physics/constants/index.ts';
import { blockCaptions } from '../widget/block-captions.ts';
import { hasOptions } from '../widget/control.ts';
import { isTextBlock, type WidgetDocument } from '../widget/document.ts';
import type { Finding } from '../widget/findings.ts';
import { blockText } from '../widget/places.ts';
import { detectQuantities, type DetectedQuantity } from './detect.ts';
import { ownWords } from './own-words.ts';

export interface UndeclaredNumber {
	/** A block's id; `title` or `point`; a slider's id for its label. */
	blockId: string;
	/** Words that nothing can be tied in: “the title”, “the chart’s description”. */
	caption?: string;
	/** UTF-16 offsets in the block's text, where each live number or setting counts as one character. */
	start: number;
	end: number;
	surface: string;
}

/** Words like “several” alone are let be. */
export function wantsWeighing({ kind, unit }: DetectedQuantity): boolean {
	return unit !== '' || (kind !== 'small-word' && kind !== 'order-word');
}

/** In captions, where nothing can be tied, a number word without a unit (“Two holes”) is let be as well. */
function wantsRewording(quantity: DetectedQuantity): boolean {
	return wantsWeighing(quantity) && (quantity.unit !== '' || /\d/.test(quantity.surface));
}

export function undeclared(document: WidgetDocument): UndeclaredNumber[] {
	const lines = [
		...captions(document).map((caption) => ({ ...caption, declared: [], wanted: wantsRewording })),
		...document.blocks.filter(isTextBlock).map((block) => {
			let offset = 0;
			const declared = block.content.flatMap((inline) => {
				const start = offset;
				offset += ownWords(inline).length;
				return inline.kind === 'claim' ? [{ start, end: offset }] : [];
			});
			return {
				blockId: block.id,
				text: blockText(block, ownWords),
				declared,
				wanted: wantsWeighing
			};
		})
	];
	return lines.flatMap(({ blockId, text, declared, wanted, caption }: Line) =>
		detectQuantities(text, document.language)
			.filter(wanted)
			.filter(({ start, end }) => !declared.some((claim) => start < claim.end && end > claim.start))
			.map(({ start, end, surface }) => ({
				blockId,
				start,
				end,
				surface,
				...(caption === undefined ? {} : { caption })
			}))
	);
}

interface Line {
	blockId: string;
	caption?: string;
	text: string;
	declared: { start: number; end: number }[];
	wanted: (quantity: DetectedQuantity) => boolean;
}

/** Everything readers can meet beside the copy. A chart's source is a citation, and full of numbers that are none of ours. */
function captions(document: WidgetDocument): Pick<Line, 'blockId' | 'caption' | 'text'>[] {
	return [
		{ blockId: 'title', caption: 'the title', text: document.title },
		{ blockId: 'point', caption: 'the point', text: document.point },
		...document.controls.flatMap((control) => [
			{ blockId: control.id, caption: 'a slider’s label', text: control.label },
			...(hasOptions(control)
				? control.options.filter(isNoSetName).map(({ label }) => ({
						blockId: control.id,
						caption: 'an option’s label',
						text: label
					}))
				: [])
		]),
		...document.blocks.flatMap((block) =>
			blockCaptions(block).map((words) => ({ blockId: block.id, ...words }))
		)
	];
}

/** “WMAP, nine years” is the name of a parameter set, whatever numbers stand in it. */
const SET_NAMES = new Set<string>(Object.values(constants.cosmologies).map(({ label }) => label));

function isNoSetName({ label }: { label: string }): boolean {
	return !SET_NAMES.has(label);
}

/** Undeclared numbers as findings, each with its mend. */
export function undeclaredFindings(document: WidgetDocument): Finding[] {
	const blocks = new Set(document.blocks.map(({ id }) => id));
	return undeclared(document).map(({ blockId, surface, caption }) => ({
		code: caption === undefined ? 'number-unweighed' : 'number-in-caption',
		says:
			caption === undefined
				? `“${surface}” isn’t weighed. Tie it to a reading, or say that it is no claim.`
				: `“${surface}” stands in ${caption}, where it can’t be tied to a reading yet. Say it in the copy instead.`,
		at: blocks.has(blockId) ? { block: blockId } : {}
	}));
}
