/** What a reader without a mouse, or without sight, finds in the frame: targets, headings, words for pictures. */
import type { StripFault } from '../report.ts';
import { isUnseen, quote, wordsOf, type Parts } from './parts.ts';

type Found = Omit<StripFault, 'setting' | 'says'>;

/** WCAG 2.2, 2.5.8 Target size (minimum), in CSS pixels. */
const TARGET = 24;
/** House rule for what is moved by a thumb; WCAG 2.2, 2.5.5 asks the same at level AAA. */
const CONTROL = 44;
const SLACK = 0.5;

export function targets(root: HTMLElement, parts: Parts): Found[] {
	const all = root.querySelectorAll(
		'a[href], button, summary, select, input, [role="button"], [role="switch"]'
	);
	return [...all].flatMap((element): Found[] => {
		// A phrase in a line of text is as high as its line (2.5.8, exception “inline”).
		if (element.matches('.sy-ask') || isUnseen(element)) return [];
		const target = element.closest('.sy-choice-plate, .sy-toggle-row') ?? element;
		const { width, height, left, top } = target.getBoundingClientRect();
		const least = element.closest('.sy-control') ? CONTROL : TARGET;
		const short = least - Math.min(width, height);
		if (short <= SLACK) return [];
		return [
			{
				measure: least === CONTROL ? 'small-control' : 'small-target',
				block: parts.blockOf(element),
				subject: quote(element.getAttribute('aria-label') ?? wordsOf(target)),
				byPx: Math.ceil(short),
				spot: { x: left, y: top }
			}
		];
	});
}

export function headings(root: HTMLElement, parts: Parts): Found[] {
	const levels = [...root.querySelectorAll('h1, h2, h3, h4, h5, h6')].map((element) => ({
		element,
		level: Number(element.tagName.slice(1))
	}));
	return levels.flatMap(({ element, level }, index): Found[] => {
		const before = levels[index - 1]?.level ?? 1;
		const isEmpty = wordsOf(element) === '';
		if (level <= before + 1 && level > 1 && !isEmpty) return [];
		return [found('heading-order', element, wordsOf(element) || `heading ${index + 1}`, parts)];
	});
}

export function wordsForPictures(root: HTMLElement, parts: Parts): Found[] {
	const pictures = [...root.querySelectorAll('img:not([alt])')].map((image) =>
		found('no-alt', image, 'a picture', parts)
	);
	const charts = [...root.querySelectorAll('.sy-chart')].flatMap((chart) => {
		const name = quote(chart.querySelector('.sy-chart-title')?.textContent ?? '') || 'a chart';
		const drawing = chart.querySelector('[role="img"]');
		if (!drawing) return [];
		const described = drawing.getAttribute('aria-describedby');
		const words = described ? root.ownerDocument.getElementById(described)?.textContent : '';
		// Some charts print every number beside its drawing.
		const numbers = 'table, .sy-chart-name b, .sy-chart-parts b, .sy-chart-shapes b';
		return [
			...(words?.trim() ? [] : [found('no-description', chart, name, parts)]),
			...(chart.querySelector(numbers) ? [] : [found('no-table', chart, name, parts)])
		];
	});
	return [...pictures, ...charts];
}

/** The house's rule for phones: title, point, control and result in the first view. */
export const FIRST_VIEW = { widthPx: 320, heightPx: 480 };

export function firstView(root: HTMLElement, parts: Parts): Found[] {
	const names: [selector: string, name: string][] = [
		['.sy-title', 'the title'],
		['.sy-point', 'the point'],
		['.sy-result', 'the result'],
		['.sy-control', 'the control']
	];
	return names.flatMap(([selector, name]) => {
		const element = root.querySelector(selector);
		if (!element) return [];
		const past = element.getBoundingClientRect().bottom - FIRST_VIEW.heightPx;
		return past > 0
			? [{ ...found('first-view', element, name, parts), byPx: Math.ceil(past) }]
			: [];
	});
}

function found(
	measure: StripFault['measure'],
	element: Element,
	subject: string,
	parts: Parts
): Found {
	const { left, top } = element.getBoundingClientRect();
	return {
		measure,
		block: parts.blockOf(element),
		subject: quote(subject),
		byPx: 0,
		spot: { x: left, y: top }
	};
}
