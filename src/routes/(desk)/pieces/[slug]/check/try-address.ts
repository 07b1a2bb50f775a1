import type { CalculatorSet } from '$lib/physics/calculator.ts';
import { routes } from '$lib/routes.ts';
import type { Step, WidgetDocument } from '$lib/widget/document.ts';
import { readingAt, type Evaluation } from '$lib/widget/evaluate.ts';

/** Settings travel in the address, numbers in the input's own unit, so that the page can be opened by anyone. */
export function tryAddress(
	document: WidgetDocument,
	evaluation: Evaluation,
	step: Step,
	calculators: CalculatorSet
): string {
	const query = new URLSearchParams();
	for (const [key, source] of Object.entries(step.settings)) {
		const outcome = readingAt(document, evaluation, { step: step.id, setting: key }, calculators);
		if (outcome.ok) query.set(key, String(outcome.reading.value));
		else if (source.from === 'fixed' && typeof source.value === 'object') {
			for (const [part, value] of Object.entries(source.value))
				query.set(`${key}.${part}`, String(value));
		} else if (source.from === 'fixed') query.set(key, String(source.value));
	}
	return `${routes.calculator(step.calculator)}?${query}`;
}
