/** Numbers that nobody answers for yet: neither tied to a reading nor named as no claim. They hold a proof back. */
import { isTextBlock, type WidgetDocument } from '../widget/document.ts';
import type { Finding } from '../widget/findings.ts';
import { blockText, type Words } from '../widget/places.ts';
import { detectQuantities, type DetectedQuantity } from './detect.ts';

/** Stands for a live number or a setting where only the writer's own words count. */
const ATOM = '\ufffc';

const ownWords: Words = (inline) =>
	inline.kind === 'text' || inline.kind === 'claim' ? inline.text : ATOM;

export interface UndeclaredNumber {
	/** A block's id, or `title` or `point`. */
	blockId: string;
	/** UTF-16 offsets in the block's text, where each live number or setting counts as one character. */
	start: number;
	end: number;
	surface: string;
}

/** Words like “several” alone are let be. */
export function wantsWeighing({ kind, unit }: DetectedQuantity): boolean {
	return unit !== '' || (kind !== 'small-word' && kind !== 'order-word');
}

/** In a title or point, where nothing can be tied, a number word without a unit (“Two holes”) is let be as well. */
function wantsRewording(quantity: DetectedQuantity): boolean {
	return wantsWeighing(quantity) && (quantity.unit !== '' || /\d/.test(quantity.surface));
}

export function undeclared(document: WidgetDocument): UndeclaredNumber[] {
	const lines = [
		{ blockId: 'title', text: document.title, declared: [], wanted: wantsRewording },
		{ blockId: 'point', text: document.point, declared: [], wanted: wantsRewording },
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
	return lines.flatMap(({ blockId, text, declared, wanted }) =>
		detectQuantities(text, document.language)
			.filter(wanted)
			.filter(({ start, end }) => !declared.some((claim) => start < claim.end && end > claim.start))
			.map(({ start, end, surface }) => ({ blockId, start, end, surface }))
	);
}

/** Undeclared numbers as findings, each with its mend. */
export function undeclaredFindings(document: WidgetDocument): Finding[] {
	return undeclared(document).map(({ blockId, surface }) =>
		blockId === 'title' || blockId === 'point'
			? {
					code: 'number-in-headline',
					says: `“${surface}” stands in the ${blockId}, where it can’t be tied to a reading yet. Say it in the copy instead.`,
					at: {}
				}
			: {
					code: 'number-unweighed',
					says: `“${surface}” isn’t weighed. Tie it to a reading, or say that it is no claim.`,
					at: { block: blockId }
				}
	);
}
