import type { CalculatorUse } from '$lib/server/services/calculator-uses.ts';

/** “Used in 2 pieces, for 12 numbers.” A number that stands in draft and release alike counts once. */
export function usesWords(uses: readonly CalculatorUse[]): string {
	if (uses.length === 0) return 'No piece uses it now.';
	const numbers = uses.reduce(
		(sum, { draft, release }) => sum + Math.max(draft?.claims ?? 0, release?.claims ?? 0),
		0
	);
	const pieces = uses.length === 1 ? 'one piece' : `${uses.length} pieces`;
	const claims =
		numbers === 0
			? 'as a step on the way'
			: numbers === 1
				? 'for one number'
				: `for ${numbers} numbers`;
	return `Used in ${pieces}, ${claims}.`;
}
