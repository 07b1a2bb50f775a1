/** What is said about a line, for those who can't see it and for those who look twice. */
import { QUANTITY_KINDS } from '$lib/physics/units/quantities.ts';
import type { OutputSpec } from '$lib/physics/calculator.ts';
import type { SweptPoint } from '$lib/physics/calculators/sweep.ts';
import { printDigits } from '$lib/widget/print-reading.ts';

const FIGURES = 4;
export const figures = (value: number) => printDigits(value, FIGURES, true);

/** The ends, the lowest and the highest, in numbers. */
export function describeLine(points: readonly SweptPoint[]): string {
	const read = points.filter((point): point is SweptPoint & { y: number } => point.y !== null);
	const [first, last] = [read[0], read.at(-1)];
	if (!first || !last) return 'There is no reading anywhere on this stretch.';
	const lowest = read.reduce((least, point) => (point.y < least.y ? point : least), first);
	const highest = read.reduce((most, point) => (point.y > most.y ? point : most), first);
	const at = ({ x, y }: { x: number; y: number }) => `${figures(y)} at ${figures(x)}`;
	const inside = [lowest, highest].filter((point) => point !== first && point !== last);
	return [
		`From ${at(first)} to ${at(last)}.`,
		...inside.map((point) => `${point === lowest ? 'Lowest' : 'Highest'}: ${at(point)}.`)
	].join(' ');
}

export interface Stretch {
	from: number;
	to: number;
	message: string;
}

/** Neighbouring points that `tell` has a sentence for, as stretches; the sentence is the first point's. */
export function stretches(
	points: readonly SweptPoint[],
	tell: (point: SweptPoint) => string | undefined
): Stretch[] {
	const found: Stretch[] = [];
	let open: Stretch | null = null;
	for (const point of points) {
		const message = tell(point);
		if (message === undefined) open = null;
		else if (open) open.to = point.x;
		else {
			open = { from: point.x, to: point.x, message };
			found.push(open);
		}
	}
	return found;
}

/** “from 0 to 3.2 m”, “at 5”. */
export function stretchWords({ from, to }: Stretch, unit: string): string {
	const after = unit ? `\u00a0${unit}` : '';
	return from === to
		? `at ${figures(from)}${after}`
		: `from ${figures(from)} to ${figures(to)}${after}`;
}

/** An output of numbers has a line; one of words hasn't. */
export function isDrawable({ text, quantity }: OutputSpec): boolean {
	return !text && QUANTITY_KINDS[quantity] !== QUANTITY_KINDS.text;
}
