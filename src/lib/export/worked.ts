/** Readings at the settings a document is evaluated at, in the words of a table. */
import type { CalculatorSet } from '../physics/calculator.ts';
import type { ReadingRef, WidgetDocument } from '../widget/document.ts';
import { readingAt, valueIn, type Evaluation } from '../widget/evaluate.ts';
import { NO_READING } from '../widget/places.ts';
import { printDigits, printUnit } from '../widget/print-reading.ts';

export interface Worked {
	document: WidgetDocument;
	evaluation: Evaluation;
	calculators: CalculatorSet;
}

export interface Shown {
	reading: ReadingRef;
	unit: string;
	figures: number;
}

/** The number and its unit; “…” where there is no reading. */
export function figuresIn({ reading, unit, figures }: Shown, worked: Worked): string {
	const { document, evaluation, calculators } = worked;
	const value = valueIn(readingAt(document, evaluation, reading, calculators), unit);
	return value === null ? NO_READING : inUnit(value, unit, figures);
}

export function inUnit(value: number, unit: string, figures: number): string {
	const printed = printUnit(unit);
	return printDigits(value, figures) + (printed ? `\u00a0${printed}` : '');
}
