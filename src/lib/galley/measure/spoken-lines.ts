/**
 * What a screen reader meets in the frame, line by line and in order: roles, names, values and states, read from the
 * drawn frame itself. Readers word these a little differently; the order and the words are the frame's.
 */
import type { SpokenLine } from '../report.ts';
import { wordsOf, type Parts } from './parts.ts';

const OWN_LINES =
	'h1,h2,h3,h4,h5,h6,p,div,figure,figcaption,section,ul,ol,li,dl,dt,dd,table,details,summary,' +
	'fieldset,legend,label,button,input,select,img,a,aside,footer,[role="img"],[role="spinbutton"]';

export function spokenLines(root: HTMLElement, parts: Parts): SpokenLine[] {
	const lines: SpokenLine[] = [];
	const say = (element: Element, text: string) => {
		const words = text.replace(/\s+/g, ' ').trim();
		if (words) lines.push({ text: words, block: parts.blockOf(element) });
	};
	const visit = (element: Element): void => {
		if (element.matches('svg, [aria-hidden="true"], .sy-unseen')) return;
		if (!element.checkVisibility()) return;
		const special = lineOf(element);
		if (special !== null) return say(element, special);
		if (element.matches('details')) return sayFold(element, say);
		if (!element.querySelector(OWN_LINES)) return say(element, wordsOf(element));
		for (const node of element.childNodes) {
			if (node instanceof Element) visit(node);
			else if (node instanceof Text) say(element, node.data);
		}
	};
	visit(root);
	return lines;
}

/** The whole line of an element that is one thing to a listener; null for what is only a holder of others. */
function lineOf(element: Element): string | null {
	const heading = /^H([1-6])$/.exec(element.tagName);
	if (heading) return `Heading level ${heading[1]}. ${wordsOf(element)}`;
	const radio = element.matches('label') ? lineOfRadio(element) : null;
	if (radio !== null) return radio;
	if (element.matches('.sy-control legend')) return `${wordsOf(element)}, choices`;
	// Said with the control that it names.
	if (element.matches('.sy-control .sy-control-label')) return '';
	if (element.matches('[role="img"]')) {
		const words = describedBy(element);
		return `Picture: ${element.getAttribute('aria-label') ?? ''}. ${words}`;
	}
	if (element instanceof HTMLImageElement) return element.alt ? `Picture: ${element.alt}` : '';
	if (element.matches('.sy-equation-line')) return `Equation: ${nameOf(element)}`;
	if (element instanceof HTMLInputElement || element instanceof HTMLSelectElement)
		return lineOfField(element);
	if (element.matches('[role="spinbutton"]'))
		return `${nameOf(element)}, ${element.getAttribute('aria-valuetext') ?? ''}, number to step`;
	if (element instanceof HTMLButtonElement)
		return `${nameOf(element)}, button${element.getAttribute('aria-disabled') === 'true' ? ', can’t go on' : ''}`;
	if (element.matches('a[href]')) return `${nameOf(element)}, link`;
	if (element instanceof HTMLTableElement) return tableLine(element);
	return null;
}

function lineOfRadio(label: Element): string | null {
	const field = label.querySelector('input');
	if (field?.type !== 'radio') return null;
	return `${wordsOf(label)}, choice${field.checked ? ', chosen' : ''}`;
}

function lineOfField(field: HTMLInputElement | HTMLSelectElement): string {
	const name = nameOf(field);
	if (field instanceof HTMLSelectElement)
		return `${name}, ${field.selectedOptions[0]?.text ?? ''}, list`;
	if (field.type === 'range')
		return `${name}, ${field.getAttribute('aria-valuetext') ?? field.value}, slider`;
	if (field.type === 'checkbox')
		return `${name}, switch, ${field.checked ? 'on' : 'off'}. ${describedBy(field)}`;
	return [`${name}, ${field.value}, field`, describedBy(field)].filter(Boolean).join('. ');
}

/** A closed fold says that it is one; the galley adds the head of the table in it. */
function sayFold(fold: Element, say: (element: Element, text: string) => void): void {
	const summary = fold.querySelector('summary');
	say(fold, `${summary ? wordsOf(summary) : ''}, fold, closed`);
	const table = fold.querySelector('table');
	if (table) say(fold, tableLine(table));
}

function tableLine(table: HTMLTableElement): string {
	const head = [...table.querySelectorAll('thead th')].map(wordsOf).join('; ');
	const rows = table.querySelectorAll('tbody tr').length;
	return `Table of ${rows} ${rows === 1 ? 'row' : 'rows'}${head ? `: ${head}` : ''}`;
}

function nameOf(element: Element): string {
	const named = element.getAttribute('aria-label');
	if (named) return named;
	const by = element.getAttribute('aria-labelledby');
	if (by) return textOfIds(element, by);
	if (element instanceof HTMLInputElement || element instanceof HTMLSelectElement)
		return [...(element.labels ?? [])].map(wordsOf).join(' ');
	return wordsOf(element);
}

function describedBy(element: Element): string {
	return textOfIds(element, element.getAttribute('aria-describedby') ?? '');
}

function textOfIds(element: Element, ids: string): string {
	return ids
		.split(/\s+/)
		.filter(Boolean)
		.map((id) => element.ownerDocument.getElementById(id)?.textContent?.trim() ?? '')
		.join(' ');
}
