/** How a check value, what the calculator reads, and the distance between them are printed. */
import type { CheckValue } from '$lib/physics/calculator.ts';
import type { CheckRow } from '$lib/physics/check-values.ts';
import { printDigits } from '$lib/widget/print-reading.ts';
import { plainDecimal, printNumeral } from '$lib/widget/stated.ts';

/** “13.787 ± 0.02”, “4.184, exact”, or words as they stand. */
export function statedAs({ published, tolerance }: CheckValue): string {
	if (typeof published === 'string') return published;
	return `${plain(published)}${tolerance === 0 ? ', exact' : ` ± ${plain(tolerance)}`}`;
}

/** As many places as the source prints, and one more; very small and very large ones with a power of ten. */
export function readsAs({ reads, check: { published, tolerance } }: CheckRow): string {
	if (reads === null) return '–';
	if (typeof reads === 'string' || typeof published === 'string') return String(reads);
	if (!isPlain(reads)) return printDigits(reads, figures(published) + 1);
	const shown = Math.min(8, Math.max(places(published), places(tolerance)) + 1);
	return printNumeral(reads.toFixed(shown));
}

/** In units of the ±; where it leaves nothing open, the difference itself. */
export function withinAs({ reads, within, check: { published } }: CheckRow): string {
	if (reads === null) return '–';
	if (within !== null) return `${within < 0.05 ? '0.0' : within.toFixed(1)}\u00a0u`;
	if (reads === published) return 'exactly';
	return typeof reads === 'number' && typeof published === 'number'
		? printDigits(reads - published, 2)
		: 'differs';
}

function places(value: number): number {
	return plainDecimal(value).split('.')[1]?.length ?? 0;
}

function isPlain(value: number): boolean {
	return value === 0 || (Math.abs(value) >= 1e-4 && Math.abs(value) < 1e7);
}

function figures(value: number): number {
	return value.toExponential().split('e')[0]?.replace(/\D/g, '').length ?? 1;
}

function plain(value: number): string {
	return isPlain(value) ? printNumeral(plainDecimal(value)) : printDigits(value, figures(value));
}
