/** The document of a frame, as text. Everything that comes from copy is escaped here or by the renderer. */
import type { FrameRelease } from '../../renderer/release.ts';

export interface FramePage {
	release: FrameRelease;
	/** Markup of the drawn frame. */
	body: string;
	css: string;
	/** Addresses under /press/. */
	script: string;
	/** Scripts that the frame will want, loaded ahead. */
	ahead: string[];
	copyFace: string;
	calculators: Record<string, string>;
}

export function framePage(page: FramePage): string {
	const { release } = page;
	const title = [release.document.title, 'interactive explainer'].filter(Boolean).join(' – ');
	const head = [
		'<meta charset="utf-8">',
		'<meta name="viewport" content="width=device-width, initial-scale=1">',
		`<title>${escapeText(title)}</title>`,
		`<link rel="canonical" href="${escapeText(`${release.origin}/w/${release.slug}`)}">`,
		`<link rel="preload" as="font" type="font/woff2" crossorigin href="${escapeText(page.copyFace)}">`,
		`<style>${page.css}</style>`,
		...page.ahead.map((href) => `<link rel="modulepreload" crossorigin href="${escapeText(href)}">`)
	];
	const inlined = { release, calculators: page.calculators };
	return [
		'<!doctype html>',
		`<html lang="${escapeText(release.document.language)}">`,
		`<head>${head.join('')}</head>`,
		`<body><div id="frame">${page.body}</div>`,
		`<script type="application/json" id="release">${scriptJson(inlined)}</script>`,
		`<script type="module" crossorigin src="${escapeText(page.script)}"></script></body></html>`
	].join('\n');
}

/** JSON that can't end the element it stands in, nor be read as anything but data. */
export function scriptJson(value: unknown): string {
	return JSON.stringify(value).replace(
		/[<>&\u2028\u2029]/g,
		(character) => `\\u${character.charCodeAt(0).toString(16).padStart(4, '0')}`
	);
}

export function escapeText(text: string): string {
	return text.replace(/[&<>"']/g, (character) => `&#${character.charCodeAt(0)};`);
}
