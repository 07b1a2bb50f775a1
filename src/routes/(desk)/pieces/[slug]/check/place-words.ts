/** Where a claim stands, in words: “First light on the dial, result”. */
import { isTextBlock, type TextBlock, type WidgetDocument } from '$lib/widget/document.ts';

const KINDS: Record<TextBlock['kind'], string> = {
	paragraph: 'paragraph',
	heading: 'heading',
	aside: 'aside',
	result: 'result sentence',
	limits: 'what this can’t tell you',
	caution: 'caution'
};
const ORDINALS = [
	'first',
	'second',
	'third',
	'fourth',
	'fifth',
	'sixth',
	'seventh',
	'eighth',
	'ninth'
];

export function placeWords(document: WidgetDocument, claimId: string): string {
	const block = document.blocks.find(
		(each): each is TextBlock =>
			isTextBlock(each) &&
			each.content.some((inline) => 'claim' in inline && inline.claim === claimId)
	);
	if (!block) return document.title;
	const alike = document.blocks.filter(({ kind }) => kind === block.kind);
	const ordinal = alike.length > 1 ? `${ORDINALS[alike.indexOf(block)] ?? 'later'} ` : '';
	return `“${document.title}”, ${ordinal}${KINDS[block.kind]}`;
}
