/** Where lines and blocks of the copy stand on the sheet, for what is placed beside them. */
import type { EditorView } from 'prosemirror-view';
import type { NumberInCopy } from './quantities.ts';

export interface Line {
	/** Numbers on this line, in order. */
	numbers: NumberInCopy[];
	/** Middle of the line, from the top of the sheet. */
	middle: number;
}

/** Something a note is about, at the first line of its words. */
export interface Spot {
	key: string;
	from: number;
}

export interface BlockPlace {
	pos: number;
	id: string;
	kind: string;
	top: number;
	height: number;
}

/** Two numbers whose line ends are nearer than this stand on one line. */
const SAME_LINE = 8;

export class Geometry {
	lines = $state.raw<Line[]>([]);
	blocks = $state.raw<BlockPlace[]>([]);
	height = $state(0);
	/** Middle of the line by a spot's key. */
	spots = $state.raw<ReadonlyMap<string, number>>(new Map());

	measure(view: EditorView, sheet: HTMLElement, numbers: readonly NumberInCopy[]): void {
		const origin = sheet.getBoundingClientRect().top;
		const lines: Line[] = [];
		for (const number of numbers) {
			// Positions of a text that has changed since: the next round will have them.
			if (number.to > view.state.doc.content.size) continue;
			const { top, bottom } = lastLineOf(view, number);
			const middle = (top + bottom) / 2 - origin;
			const last = lines.at(-1);
			if (last && Math.abs(last.middle - middle) < SAME_LINE) last.numbers.push(number);
			else lines.push({ numbers: [number], middle });
		}
		this.lines = lines;

		const blocks: BlockPlace[] = [];
		view.state.doc.forEach((block, pos) => {
			const dom = view.nodeDOM(pos);
			if (!(dom instanceof HTMLElement)) return;
			const box = dom.getBoundingClientRect();
			blocks.push({
				pos,
				id: (block.attrs.id as string | undefined) ?? '',
				kind: block.type.name,
				top: box.top - origin,
				height: box.height
			});
		});
		this.blocks = blocks;
		this.height = sheet.getBoundingClientRect().height;
	}

	measureSpots(view: EditorView, sheet: HTMLElement, spots: readonly Spot[]): void {
		const origin = sheet.getBoundingClientRect().top;
		const { doc } = view.state;
		this.spots = new Map(
			spots.flatMap(({ key, from }): [string, number][] => {
				if (from >= doc.content.size) return [];
				const dom = doc.nodeAt(from)?.isBlock ? view.nodeDOM(from) : null;
				const box = dom instanceof HTMLElement ? dom.getBoundingClientRect() : null;
				if (box) return [[key, box.top + Math.min(box.height / 2, 14) - origin]];
				const { top, bottom } = view.coordsAtPos(from, 1);
				return [[key, (top + bottom) / 2 - origin]];
			})
		);
	}

	/** Where the block at `pos` stands just now, for what can't wait for the next round. */
	blockAt(view: EditorView, sheet: HTMLElement, pos: number): BlockPlace | null {
		const block = view.state.doc.nodeAt(pos);
		const dom = view.nodeDOM(pos);
		if (!block || !(dom instanceof HTMLElement)) return null;
		const box = dom.getBoundingClientRect();
		return {
			pos,
			id: (block.attrs.id as string | undefined) ?? '',
			kind: block.type.name,
			top: box.top - sheet.getBoundingClientRect().top,
			height: box.height
		};
	}
}

/** The line a number ends on; what is hung after it (its letter, its mark) may stand on the next. */
function lastLineOf(view: EditorView, number: NumberInCopy): { top: number; bottom: number } {
	const atom = number.words === '' ? view.nodeDOM(number.from) : null;
	const box = atom instanceof HTMLElement ? [...atom.getClientRects()].at(-1) : undefined;
	return box ?? view.coordsAtPos(number.to - 1, 1);
}
