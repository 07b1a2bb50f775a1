import { isTextBlock, type WidgetDocument } from '../widget/document.ts';
import { blockText, type Words } from '../widget/places.ts';

/** Words a reader reads in the copy, as they stand now; title, point and charts aside. */
export function countWords(document: WidgetDocument, words: Words): number {
	const text = document.blocks
		.filter(isTextBlock)
		.map((block) => blockText(block, words))
		.join(' ');
	return text.match(/[\p{L}\p{N}][\p{L}\p{N}’'.,\u202f-]*/gu)?.length ?? 0;
}
