/**
 * What a partner pastes: an iframe in a sandbox, and under it a plain link that stays where a content system strips
 * frames. No script. The height is kept free before the frame arrives, so that the page around it doesn't jump.
 */
import { routes } from './routes.ts';
import { isTextBlock, type Block, type WidgetDocument } from './widget/document.ts';
import { blockText, tokenWords } from './widget/places.ts';

export function embedSnippet(release: {
	origin: string;
	slug: string;
	document: WidgetDocument;
}): string {
	const { document, ...place } = release;
	return frameSnippet({ ...place, title: document.title, height: reservedHeight(document) });
}

/** The same for a release whose height was worked out before. */
export function frameSnippet(release: {
	origin: string;
	slug: string;
	title: string;
	/** From `reservedHeight`. */
	height: string;
}): string {
	const { origin, slug, height } = release;
	const title = escapeAttribute(release.title);
	return `<iframe src="${escapeAttribute(origin + routes.frame(slug))}"
  title="${title} – interactive explainer" loading="lazy"
  sandbox="allow-scripts allow-popups allow-popups-to-escape-sandbox"
  allow="" referrerpolicy="strict-origin-when-cross-origin"
  style="display:block;width:100%;border:0;height:${height}"></iframe>
<p><a href="${escapeAttribute(origin + routes.publicPage(slug))}">${title}: text version and who checked it</a></p>`;
}

/** Widths between which the kept height slides, and the sizes of the parts there, in CSS pixels; `small` is a letter of captions. */
const NARROW = {
	width: 320,
	padding: 32,
	title: 30,
	letter: 8.6,
	small: 6,
	line: 28,
	chart: 326,
	control: 112
};
const WIDE = {
	width: 620,
	padding: 48,
	title: 34,
	letter: 8.6,
	small: 6,
	line: 28,
	chart: 296,
	control: 100
};

/**
 * A CSS height that fits the frame from 320 px wide to 620 and beyond. Worked out from the copy's length; too much is
 * kept rather than too little, since a frame that is too low scrolls inside the page.
 */
export function reservedHeight(document: WidgetDocument): string {
	const narrow = Math.ceil(heightAt(document, NARROW) / 10) * 10;
	const wide = Math.ceil(heightAt(document, WIDE) / 10) * 10;
	if (narrow <= wide) return `${wide}px`;
	const slope = (narrow - wide) / (WIDE.width - NARROW.width);
	const base = Math.round(narrow + slope * NARROW.width);
	return `clamp(${wide}px,calc(${base}px - ${Math.round(slope * 100)}vw),${narrow}px)`;
}

/** What `reservedHeight` keeps where page and frame are this wide, in CSS pixels. */
export function reservedPx(document: WidgetDocument, widthPx: number): number {
	const narrow = Math.ceil(heightAt(document, NARROW) / 10) * 10;
	const wide = Math.ceil(heightAt(document, WIDE) / 10) * 10;
	const share = Math.min(1, Math.max(0, (widthPx - NARROW.width) / (WIDE.width - NARROW.width)));
	return narrow <= wide ? wide : Math.round(narrow - share * (narrow - wide));
}

function heightAt(document: WidgetDocument, at: typeof NARROW): number {
	const lines = linesOf(at.letter, at);
	const blocks = document.blocks.reduce((sum, block) => sum + blockHeight(block, at), 0);
	const head = lines(document.title) * at.title + lines(document.point) * at.line + 24;
	const foot = 140;
	return at.padding + head + blocks + foot;
}

function linesOf(letter: number, at: typeof NARROW): (text: string) => number {
	return (text) => Math.ceil((text.length * letter) / (at.width - at.padding));
}

function blockHeight(block: Block, at: typeof NARROW): number {
	if (isTextBlock(block))
		return linesOf(at.letter, at)(blockText(block, tokenWords)) * at.line + 16;
	const small = linesOf(at.small, at);
	switch (block.kind) {
		case 'chart':
			return at.chart + small(block.title) * 20 + small(`Source: ${block.source}`) * 18;
		case 'picture': {
			const [file] = block.files;
			const high = file ? ((at.width - at.padding) * file.height) / file.width : 0;
			return high + small(block.caption) * 20 + 48;
		}
		case 'table':
			return 80 + block.rows.length * 34;
		case 'equation':
			return 110 + block.values.length * 26;
		case 'guess':
			return small(block.question) * 26 + 170;
		case 'sources':
			return 40 + block.items.reduce((sum, { text }) => sum + small(text) * 24, 0);
		default:
			return at.control;
	}
}

function escapeAttribute(text: string): string {
	return text
		.replaceAll('&', '&amp;')
		.replaceAll('"', '&quot;')
		.replaceAll('<', '&lt;')
		.replaceAll('>', '&gt;');
}
