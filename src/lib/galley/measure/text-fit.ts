/** Whether words keep inside their strip and their column, and whole. */
import type { StripFault } from '../report.ts';
import { inScroller, isUnseen, quote, type Parts } from './parts.ts';

type Found = Omit<StripFault, 'setting' | 'says'>;

/** Less than this is rounding, in CSS pixels. */
const SLACK = 1.5;
/** Shorter words fit a line of any strip. */
const LONG_WORD = /[\p{L}\p{N}]{12,}/gu;
const RUNNING = '.sy-title, .sy-point, .sy-heading, .sy-copy, .sy-result, .sy-control-label';

export function textFit(root: HTMLElement, parts: Parts): Found[] {
	const widthPx = root.ownerDocument.documentElement.clientWidth;
	const found: Found[] = [];
	const range = root.ownerDocument.createRange();
	const walker = root.ownerDocument.createTreeWalker(root, NodeFilter.SHOW_TEXT);
	for (let node = walker.nextNode(); node; node = walker.nextNode()) {
		const text = node.nodeValue ?? '';
		const parent = node.parentElement;
		if (!text.trim() || !parent || isUnseen(parent) || inScroller(parent)) continue;
		range.selectNodeContents(node);
		const rects = [...range.getClientRects()].filter(({ width }) => width > 0);
		if (rects.length === 0) continue;
		const right = Math.max(...rects.map((rect) => rect.right));
		const left = Math.min(...rects.map((rect) => rect.left));
		const top = Math.min(...rects.map((rect) => rect.top));
		const place = { block: parts.blockOf(parent), subject: quote(text), spot: { x: left, y: top } };
		const past = Math.max(right - widthPx, -left);
		if (past > SLACK) {
			found.push({ ...place, measure: 'overflow', byPx: Math.ceil(past) });
			continue;
		}
		if (parent.closest('svg')) continue;
		const column = columnOf(parent);
		const spilt = right - column.getBoundingClientRect().right;
		if (spilt > SLACK) found.push({ ...place, measure: 'spill', byPx: Math.ceil(spilt) });
		if (!parent.closest(RUNNING)) continue;
		for (const match of text.matchAll(LONG_WORD)) {
			range.setStart(node, match.index);
			range.setEnd(node, match.index + match[0].length);
			const tops = new Set([...range.getClientRects()].map((rect) => Math.round(rect.top)));
			if (tops.size > 1)
				found.push({ ...place, measure: 'broken-word', subject: match[0], byPx: 0 });
		}
	}
	return [...found, ...boxes(root, parts, widthPx), ...cut(root, parts)];
}

/** The box that the element's lines are set in. */
function columnOf(element: Element): Element {
	let at = element;
	while (at.parentElement && /^(?:inline|contents)$/.test(getComputedStyle(at).display))
		at = at.parentElement;
	return at;
}

/** Drawings, pictures and fields wider than the strip. */
function boxes(root: HTMLElement, parts: Parts, widthPx: number): Found[] {
	const drawn = root.querySelectorAll('img, input, select, button, table, [role="img"]');
	return [...drawn].flatMap((element) => {
		if (isUnseen(element) || inScroller(element)) return [];
		const { left, right, top } = element.getBoundingClientRect();
		const past = Math.max(right - widthPx, -left);
		if (past <= SLACK) return [];
		const subject = quote(element.getAttribute('aria-label') ?? element.tagName.toLowerCase());
		const block = parts.blockOf(element);
		return [
			{ measure: 'overflow', block, subject, byPx: Math.ceil(past), spot: { x: left, y: top } }
		];
	});
}

/** Words behind an edge where nothing scrolls. */
function cut(root: HTMLElement, parts: Parts): Found[] {
	return [...root.querySelectorAll<HTMLElement>('*:not(svg *)')].flatMap((element) => {
		const { overflowX, overflowY } = getComputedStyle(element);
		const field = element instanceof HTMLInputElement && element.type === 'text';
		const hides = (overflow: string) => overflow === 'hidden' || overflow === 'clip';
		const wide = field || hides(overflowX) ? element.scrollWidth - element.clientWidth : 0;
		const high = hides(overflowY) ? element.scrollHeight - element.clientHeight : 0;
		const by = Math.max(wide, high);
		const words = field ? element.value : (element.textContent ?? '');
		if (by <= SLACK || !words.trim() || isUnseen(element)) return [];
		const { left, top } = element.getBoundingClientRect();
		return [
			{
				measure: 'cut',
				block: parts.blockOf(element),
				subject: quote(words),
				byPx: Math.ceil(by),
				spot: { x: left, y: top }
			}
		];
	});
}
