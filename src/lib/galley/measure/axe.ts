/** axe-core inside a strip. It is large, so it comes when the first strip asks for it. */
import type { StripFault } from '../report.ts';
import { quote, wordsOf, type Parts } from './parts.ts';

/** WCAG 2.0 to 2.2, A and AA. */
const TAGS = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'];

export async function axeFaults(
	root: HTMLElement,
	parts: Parts,
	what: 'all' | 'contrast'
): Promise<Omit<StripFault, 'setting'>[]> {
	const { default: axe } = await import('axe-core');
	const { violations } = await axe.run(root, {
		runOnly:
			what === 'all' ? { type: 'tag', values: TAGS } : { type: 'rule', values: ['color-contrast'] },
		resultTypes: ['violations'],
		elementRef: true,
		preload: false
	});
	return violations.flatMap(({ id, help, nodes }) =>
		nodes.map(({ element, any }) => {
			const at = element ?? root;
			const { left, top } = at.getBoundingClientRect();
			return {
				measure: 'axe' as const,
				block: parts.blockOf(at),
				subject: quote(at.getAttribute('aria-label') ?? wordsOf(at)),
				byPx: 0,
				says: id === 'color-contrast' ? contrastWords(any[0]?.data) : `${help} (axe: ${id}).`,
				spot: { x: left, y: top }
			};
		})
	);
}

function contrastWords(data: unknown): string {
	const { contrastRatio, expectedContrastRatio } = (data ?? {}) as {
		contrastRatio?: number;
		expectedContrastRatio?: string;
	};
	if (contrastRatio === undefined) return 'Its contrast with the ground is too low.';
	const needed = (expectedContrastRatio ?? '4.5').replace(':1', '');
	return `Its contrast with the ground is ${contrastRatio.toFixed(1)} to 1, and ${needed} is needed.`;
}
