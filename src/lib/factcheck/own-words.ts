/** A writer's own words in a block, and the one quantity that a claim's words give as a reader meets them there. */
import { isTextBlock, type WidgetDocument } from '../widget/document.ts';
import { blockText, type ClaimPlace, type Words } from '../widget/places.ts';
import { detectQuantities, type DetectedQuantity } from './detect.ts';

/** Stands for a live number or a setting where only the writer's own words count. */
export const ATOM = '\ufffc';

export const ownWords: Words = (inline) =>
	inline.kind === 'text' || inline.kind === 'claim' ? inline.text : ATOM;

export type FoundQuantity =
	{ ok: true; quantity: DetectedQuantity } | { ok: false; reason: string };

/**
 * Found in the whole block, not in the claim's words alone: “more than” or a digit just before them changes what a
 * reader is told. `place` comes from `claimPlaces` with `ownWords`.
 */
export function quantityInPlace(document: WidgetDocument, place: ClaimPlace): FoundQuantity {
	const block = document.blocks.find(({ id }) => id === place.blockId);
	if (!block || !isTextBlock(block)) return nothing;
	const start = place.startInBlock;
	const end = start + place.words.length;
	const touching = detectQuantities(blockText(block, ownWords), document.language).filter(
		(quantity) => quantity.start < end && quantity.end > start
	);
	const [quantity, other] = touching;
	if (other) {
		return refuse(
			`Two numbers stand in one claim, “${quantity?.surface}” and “${other.surface}”: tie each by itself.`
		);
	}
	if (quantity && (quantity.start < start || quantity.end > end)) {
		return refuse(
			`Part of this number stands outside the claim: tie the whole of “${quantity.surface}”.`
		);
	}
	// A number marked by hand that isn't found in its block may still be found by itself.
	const alone = quantity ?? detectQuantities(place.words, document.language)[0];
	return alone ? { ok: true, quantity: alone } : nothing;
}

const nothing: FoundQuantity = { ok: false, reason: 'No number in these words.' };

function refuse(reason: string): FoundQuantity {
	return { ok: false, reason };
}
