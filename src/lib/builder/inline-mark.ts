/** On a narrow screen there is no gutter: the mark stands after its number, and tapping it raises the number's note. */
import { claimMarks, type ClaimMark } from '../renderer/marks/claim-marks.ts';
import type { Drawing } from '../renderer/marks/drawing.ts';
import { markOf, STATE_WORDS } from './state-words.ts';
import type { NumberState } from './weighing.ts';

const SVG = 'http://www.w3.org/2000/svg';

export function inlineMark(state: NumberState, words: string, raise: () => void): HTMLElement {
	const button = document.createElement('button');
	button.type = 'button';
	button.className = 'inline-mark';
	button.setAttribute('aria-label', `${words}: ${STATE_WORDS[state]}`);
	// A tap must not move the caret first: the keyboard would come up over the note.
	button.addEventListener('mousedown', (event) => event.preventDefault());
	button.addEventListener('click', raise);
	const mark = markOf(state);
	if (mark) button.append(drawing(mark));
	return button;
}

function drawing(mark: ClaimMark): SVGElement {
	const { strokes, ink }: Drawing = claimMarks[mark];
	const svg = document.createElementNS(SVG, 'svg');
	svg.setAttribute('class', `sy-mark sy-ink-${ink}`);
	svg.setAttribute('viewBox', '0 0 24 24');
	svg.setAttribute('width', '18');
	svg.setAttribute('height', '18');
	svg.setAttribute('aria-hidden', 'true');
	for (const { d, solid, width = 2, dash, turn } of strokes) {
		const path = document.createElementNS(SVG, 'path');
		path.setAttribute('d', d);
		path.setAttribute('fill', solid ? 'currentColor' : 'none');
		path.setAttribute('stroke', solid ? 'none' : 'currentColor');
		path.setAttribute('stroke-width', String(width));
		if (dash) path.setAttribute('stroke-dasharray', dash);
		if (turn) path.setAttribute('transform', `rotate(${turn} 12 11)`);
		svg.append(path);
	}
	return svg;
}
