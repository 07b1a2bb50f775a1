/**
 * How a chart prints numbers and what it says, in the language of its piece. Numbers go through `widget/stated.ts`;
 * this is the one place that knows how, so that a chart and the copy beside it print alike.
 */
import type { Language } from '../../widget/language.ts';
import { printWordsOf } from '../../widget/languages/print-words.ts';
import { plainDecimal, printNumeral, roundToFigures, superscript } from '../../widget/stated.ts';
import { chartWordsOf, type ChartWords } from './chart-words/shelf.ts';

const NO_BREAK = '\u00a0';

/** What stands after what, kept on one line. */
function joined(...parts: string[]): string {
	return parts.filter(Boolean).join(NO_BREAK);
}

export interface ChartPrint {
	says: ChartWords;
	/** A decimal numeral, as `stated.ts` writes it, as readers see it. */
	numeral: (numeral: string) => string;
	/** Significant figures without idle noughts: plain from 0.0001 to ten million, else with a power of ten. */
	value: (value: number, figures: number) => string;
	/** All the digits a number has, up to twelve, which hide the binary dust of a division. */
	whole: (value: number) => string;
	/** Every digit without a power of ten, for numbers that differ only in their last ones. */
	allDigits: (value: number) => string;
	/** So many decimal places, idle noughts kept: parts of a sum line up. */
	places: (value: number, places: number) => string;
	/** A power of ten on a log axis: “10⁹”, “2 × 10⁹”. */
	power: (value: number) => string;
	/** A unit's name in words, for an axis; '' for a plain number. */
	unit: (symbol: string) => string;
}

/** @throws {RangeError} when nothing has loaded the language's words, for print or for charts. */
export function chartPrint(language: Language): ChartPrint {
	const { timesSign, units } = printWordsOf(language);
	const numeral = (text: string) => printNumeral(text, language);
	const scaled = (lead: string, power: string) => {
		const ten = powerWords(Number(power));
		return lead === '1' ? ten : joined(numeral(lead), timesSign, ten);
	};
	const value = (number: number, figures: number) => {
		const text = withoutIdleNoughts(roundToFigures(number, figures));
		const size = Math.abs(Number(text));
		if (size === 0 || (size >= 1e-4 && size < 1e7)) return numeral(text);
		const [lead = '0', power = '0'] = size.toExponential().split('e');
		return scaled((number < 0 ? '-' : '') + lead, power);
	};
	return {
		says: chartWordsOf(language),
		numeral,
		value,
		whole: (number) => value(number, 12),
		allDigits: (number) => numeral(plainDecimal(Number(number.toPrecision(14)))),
		places: (number, places) => numeral(toPlaces(number, places)),
		power: (number) => {
			const [lead = '1', power = '0'] = Number(number.toPrecision(3)).toExponential().split('e');
			return scaled(lead, power);
		},
		unit: (symbol) => units(symbol)?.[1] ?? symbol
	};
}

export function powerWords(power: number): string {
	return `10${superscript(power)}`;
}

function toPlaces(value: number, places: number): string {
	const magnitude = value === 0 ? 0 : Math.floor(Math.log10(Math.abs(value))) + 1;
	if (value === 0 || magnitude + places <= 0) return (0).toFixed(places);
	const [whole = '0', fraction = ''] = roundToFigures(value, magnitude + places).split('.');
	const kept = fraction.padEnd(places, '0').slice(0, places);
	return kept ? `${whole}.${kept}` : whole;
}

function withoutIdleNoughts(numeral: string): string {
	return numeral.includes('.') ? numeral.replace(/\.?0+$/, '') : numeral;
}

/** A quantity with its unit's symbol: “68.1 MHz”. */
export function withSymbol(numeral: string, symbol: string): string {
	return joined(
		numeral,
		symbol.replace(/(?<=[a-zA-Z])-?\d+/g, (power) => superscript(Number(power)))
	);
}

/** “frequency / megahertz”: the numbers on the axis are the quantity divided by this. */
export function axisName(label: string, unit: string, power = 0): string {
	return [label, scaledUnit(unit, power)].filter(Boolean).join(' / ');
}

/** “10²⁴ kilograms”. */
export function scaledUnit(unit: string, power: number): string {
	return joined(power ? powerWords(power) : '', unit);
}

/** What a power of ten in an axis's name stands for. */
export function powerNote({ says }: ChartPrint, unit: string, power: number): string {
	return power ? says.power(joined((unit && says.powers[power]) || powerWords(power), unit)) : '';
}

export function baseNote({ says, numeral }: ChartPrint, base: number, unit: string): string {
	return base ? says.base(joined(numeral(plainDecimal(base)), unit)) : '';
}

/** The kind of a log axis in words. `factor` is what lies between neighbouring ticks, where it is always the same. */
export function stepWords({ says }: ChartPrint, factor: number | null): string {
	if (factor === null) return says.unevenStep;
	return says.step(says.factors[factor] ?? powerWords(Math.round(Math.log10(factor))));
}

/** The kinds of both scales of a line chart. */
export function scaleWords({ says }: ChartPrint, upLog: boolean, levelLog: boolean): string {
	if (upLog) return levelLog ? says.bothLog : says.upLog;
	return levelLog ? says.levelLog : says.bothEven;
}

/** What stands under the title: the axis, its kind, and all that must be known to read it. */
export function axisCaption(
	{ says }: ChartPrint,
	{ name, notes, step }: { name: string; notes: readonly string[]; step: string }
): string {
	return [name, step && says.logScale(step), ...notes].filter(Boolean).join('; ');
}

/** A stretch with its unit: “from 100 to 500 million years”; one number where both print alike. */
export function rangeWords(
	{ says, value }: ChartPrint,
	from: number,
	to: number,
	unit: string
): string {
	const [low, high] = [value(from, 3), value(to, 3)];
	return joined(low === high ? says.at(low) : says.fromTo(low, high), unit);
}
