/** All that is missing before a proof can be pulled, each with the way to it. */
import { undeclaredFindings } from '../factcheck/undeclared.ts';
import type { CalculatorSet } from '../physics/calculator.ts';
import type { WidgetDocument } from '../widget/document.ts';
import { findings, type Finding } from '../widget/findings.ts';
import type { Issue } from '../widget/parse.ts';
import { isUndeclared, type NumberInCopy } from './quantities.ts';

export interface Missing {
	key: string;
	says: string;
	go:
		| { number: NumberInCopy }
		| { block: string }
		| { formula: string }
		| { step: string }
		| { title: true };
}

export function missingForProof(
	document: WidgetDocument,
	issues: readonly Issue[],
	numbers: readonly NumberInCopy[],
	calculators: CalculatorSet
): Missing[] {
	return [
		...issues.map(({ path, message }): Missing => ({
			key: `issue ${path}`,
			says: message,
			go: { title: true }
		})),
		...[
			...findings(document, calculators),
			// Those in the copy follow below, each with its own place.
			...undeclaredFindings(document).filter(({ code }) => code === 'number-in-caption')
		].map((finding, index) => missingOf(finding, index, numbers)),
		...numbers.filter(isUndeclared).map((number): Missing => ({
			key: `number ${number.key}`,
			says: `“${number.words}” isn’t weighed. Tie it to a reading, or say that it is no claim.`,
			go: { number }
		}))
	];
}

function missingOf(
	{ code, says, at }: Finding,
	index: number,
	numbers: readonly NumberInCopy[]
): Missing {
	const key = `${code} ${index}`;
	const number = numbers.find(({ claim }) => claim !== null && claim.id === at.claim);
	if (number) return { key, says, go: { number } };
	if (at.block) return { key, says, go: { block: at.block } };
	if (at.formula) return { key, says, go: { formula: at.formula } };
	if (at.step) return { key, says, go: { step: at.step } };
	return { key, says, go: { title: true } };
}
