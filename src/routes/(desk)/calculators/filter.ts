import type { Calculator } from '$lib/physics/calculator.ts';

/** Words that say nothing about what is asked. */
const IDLE = new Set([
	'a',
	'an',
	'the',
	'of',
	'is',
	'it',
	'how',
	'what',
	'does',
	'do',
	'did',
	'in',
	'to',
	'for'
]);

/** Calculators whose title, purpose or other ways of asking hold every word, in any order. */
export function matching(calculators: readonly Calculator[], wanted: string): Calculator[] {
	const words = wanted
		.toLowerCase()
		.split(/[^\p{L}\p{N}]+/u)
		.filter((word) => word && !IDLE.has(word));
	return calculators.filter(({ id, title, purpose, asks }) => {
		const text = [id, title, purpose, ...asks].join(' ').toLowerCase();
		return words.every((word) => text.includes(word));
	});
}
