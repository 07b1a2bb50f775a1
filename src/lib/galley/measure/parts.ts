/** Which block of the document a part of the drawn frame is. The frame marks none, so parts of a kind are counted. */
import type { Block, WidgetDocument } from '$lib/widget/document.ts';

const PARTS: readonly [selector: string, is: (block: Block) => boolean][] = [
	['.sy-copy', ({ kind }) => kind === 'paragraph' || kind === 'limits'],
	['.sy-result', ({ kind }) => kind === 'result'],
	['.sy-heading', ({ kind }) => kind === 'heading'],
	['.sy-aside', ({ kind }) => kind === 'aside'],
	['.sy-notice:not(.sy-notice-plain)', ({ kind }) => kind === 'caution'],
	['.sy-control', ({ kind }) => kind === 'control'],
	['.sy-chart', ({ kind }) => kind === 'chart'],
	['.sy-table', ({ kind }) => kind === 'table'],
	['.sy-equation', ({ kind }) => kind === 'equation'],
	['.sy-picture', ({ kind }) => kind === 'picture'],
	['.sy-guess', ({ kind }) => kind === 'guess'],
	['.sy-presets', ({ kind }) => kind === 'presets'],
	['.sy-sources', ({ kind }) => kind === 'sources']
];

export class Parts {
	readonly blocks = new Map<Element, string>();

	constructor(root: Element, document: Pick<WidgetDocument, 'blocks'>) {
		for (const [selector, is] of PARTS) {
			const blocks = document.blocks.filter(is);
			// A guess has a slider of its own, which is no control of the piece.
			const drawn = [...root.querySelectorAll(selector)].filter(
				(element) => selector === '.sy-guess' || !element.closest('.sy-guess')
			);
			drawn.forEach((element, index) => {
				const block = blocks[index];
				if (block) this.blocks.set(element, block.id);
			});
		}
	}

	/** The block that an element stands in; null for title, point and foot. */
	blockOf(element: Element): string | null {
		for (let at: Element | null = element; at; at = at.parentElement) {
			const block = this.blocks.get(at);
			if (block !== undefined) return block;
		}
		return null;
	}
}

/** Heard, not seen; or not drawn at all. */
export function isUnseen(element: Element): boolean {
	return (
		element.closest('.sy-unseen, .sy-chart-unseen, caption') !== null || !element.checkVisibility()
	);
}

/** What scrolls inside itself is no wider than its strip. */
export function inScroller(element: Element): boolean {
	for (let at: Element | null = element; at; at = at.parentElement) {
		const { overflowX } = getComputedStyle(at);
		if (overflowX === 'auto' || overflowX === 'scroll') return true;
		if (at.classList.contains('sy-frame')) return false;
	}
	return false;
}

/** Words as heard: without drawings. */
export function wordsOf(element: Element): string {
	const walker = element.ownerDocument.createTreeWalker(element, NodeFilter.SHOW_TEXT);
	let words = '';
	for (let node = walker.nextNode(); node; node = walker.nextNode()) {
		if (!node.parentElement?.closest('svg, [aria-hidden="true"]')) words += node.nodeValue ?? '';
	}
	return words
		.replace(/\u2060/g, '')
		.replace(/[ \n\t]+/g, ' ')
		.trim();
}

/** A quotation no longer than a line of the list. */
export function quote(words: string): string {
	const short = words.replace(/\s+/g, ' ').trim();
	return short.length <= 48 ? short : `${short.slice(0, 46).trimEnd()}…`;
}
