import { printDigits } from '$lib/widget/print-reading.ts';

/** More than any constant of ours has, and few enough to hide the dust of binary fractions. */
const ALL_FIGURES = 16;

/** A constant with every digit it has. */
export function exactDigits(value: number): string {
	return printDigits(value, ALL_FIGURES, true);
}

/** How a value got here. */
export function verification({ fromMemory }: { fromMemory?: boolean }): string {
	return fromMemory
		? 'From memory, not read again in the publication.'
		: 'As the source prints it.';
}
