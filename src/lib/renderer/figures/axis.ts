/**
 * An axis with its ticks: round numbers that don't touch, printed short, with the unit, power of ten or starting
 * number they are counted in chosen once for the whole axis.
 */
import { ticks as roundTicks } from 'd3-array';
import { unitOf, units } from '../../physics/units/units.ts';
import {
	axisName,
	baseNote,
	powerNote,
	scaledUnit,
	stepWords,
	type ChartPrint
} from './axis-words.ts';
import { shareOf, type Span } from './span.ts';
import { textWidth } from './text-size.ts';

export interface Tick {
	/** In the chart's unit. */
	at: number;
	share: number;
	words: string;
	anchor: 'start' | 'middle' | 'end';
}

export interface Axis {
	span: Span;
	ticks: Tick[];
	label: string;
	/** “frequency / megahertz”. */
	name: string;
	/** What else must be known to read it: “axis starts at 40”, “1 on the axis is 10⁹ hertz”. */
	notes: string[];
	/** Of a log axis: “each step is ten times”. */
	step: string;
	/** The unit its numbers are in, in words, with the power of ten where there is one. */
	unit: string;
	/** A value of the chart's unit as the axis counts it. */
	words: (value: number, figures: number) => string;
	/** A value as a number on the axis. */
	counted: (value: number) => number;
	/** A difference of two values, as the axis counts it. */
	differenceWords: (difference: number, figures: number) => string;
	/** A linear axis that doesn't hold nought. */
	cut: boolean;
}

export interface AxisOptions {
	label: string;
	/** Symbol of the unit that the span is in. */
	unit: string;
	/** Pixels the axis is at its shortest. */
	length: number;
	/** Upright axes are limited by the height of letters. */
	upright?: boolean;
	print: ChartPrint;
	/** Say that a linear axis doesn't start at nought; off where nobody would expect it to. */
	sayCut?: boolean;
}

export const TICK_SIZE = 12;
const GAP = 7;
const MOST_TICKS = 8;
const LINE = 15;
/** Letters of a tick that an axis counts from another number to avoid. */
const LONGEST = 7;

export function axisOf(span: Span, options: AxisOptions): Axis {
	const counting = span.log ? logCounting(span, options.unit) : linearCounting(span, options.unit);
	const ticks = fittingTicks(span, counting, options);
	const { print } = options;
	const unit = print.unit(counting.unit);
	const baseUnit = print.unit(counting.baseUnit);
	const cut = !span.log && (span.from > 0 || span.to < 0);
	const counted = (value: number, figures: number) => print.value(counting.toAxis(value), figures);
	const notes = [
		powerNote(print, unit, counting.power),
		baseNote(print, counting.base, baseUnit),
		cut && options.sayCut && !counting.base
			? print.says.cut(print.whole(counting.toAxis(span.from)))
			: ''
	].filter(Boolean);
	return {
		span,
		ticks,
		name: axisName(options.label, unit, counting.power),
		label: options.label,
		notes,
		step: span.log ? stepWords(print, evenFactor(ticks)) : '',
		unit: counting.base ? baseUnit : scaledUnit(unit, counting.power),
		words: counting.base ? print.allDigits : counted,
		counted: counting.toAxis,
		differenceWords: (difference, figures) =>
			print.value(
				counting.base ? difference : counting.toAxis(difference) - counting.toAxis(0),
				figures
			),
		cut
	};
}

interface Counting {
	/** Symbol of the unit counted in. */
	unit: string;
	power: number;
	/** What is counted from, in the chart's unit; 0 for most. */
	base: number;
	baseUnit: string;
	toAxis: (value: number) => number;
}

/** Plain numbers under a million and down to a hundredth are left as they are. */
function isReadable(size: number): boolean {
	return size === 0 || (size >= 0.01 && size < 1e6);
}

function linearCounting(span: Span, unit: string): Counting {
	const base = baseOf(span);
	const size = Math.max(Math.abs(span.from - base), Math.abs(span.to - base));
	const { unit: counted, power, decade } = scaleFor(size, unit, base !== 0);
	// Twelve figures hide the dust that dividing by a power of ten leaves.
	const toAxis = (value: number) => {
		const scaled = decade >= 0 ? (value - base) / 10 ** decade : (value - base) * 10 ** -decade;
		return Number(scaled.toPrecision(12));
	};
	return { unit: counted, power, base, baseUnit: unit, toAxis };
}

/** Where neighbouring ticks differ only in their last digits, they are counted from the first. */
function baseOf({ from, to }: Span): number {
	const ends = roundTicks(from, to, 5);
	const [first, second] = ends;
	if (first === undefined || second === undefined) return 0;
	const size = Math.max(Math.abs(from), Math.abs(to));
	const digits = Math.floor(Math.log10(size)) - Math.floor(Math.log10(second - first)) + 1;
	return digits >= LONGEST - 1 ? first : 0;
}

function logCounting({ from, to }: Span, unit: string): Counting {
	const asIs = { unit, power: 0, base: 0, baseUnit: unit, toAxis: (value: number) => value };
	const spread = Math.log10(to) - Math.log10(from);
	if (spread > 5 || (isReadable(from) && isReadable(to))) return asIs;
	const { unit: counted, power, decade } = scaleFor(Math.sqrt(from) * Math.sqrt(to), unit, true);
	if (power !== 0) return asIs;
	return {
		...asIs,
		unit: counted,
		toAxis: (value) => Number((value * 10 ** -decade).toPrecision(12))
	};
}

/** The unit's own relative with an SI prefix where the table has one, else a power of ten. */
function scaleFor(
	size: number,
	unit: string,
	plainUnitOnly: boolean
): { unit: string; power: number; decade: number } {
	if (isReadable(size)) return { unit, power: 0, decade: 0 };
	const wanted = Math.floor(Math.log10(size) / 3) * 3;
	const relative = plainUnitOnly && unit === '' ? undefined : relativeOf(unit, wanted);
	return relative
		? { unit: relative, power: 0, decade: wanted }
		: { unit, power: wanted, decade: wanted };
}

const PREFIXES: Record<string, number> = { '': 0, G: 9, M: 6, T: 12, k: 3, m: -3, n: -9, µ: -6 };

/** The symbol that is `decade` powers of ten larger than this one and differs by an SI prefix alone. */
function relativeOf(symbol: string, decade: number): string | undefined {
	const own = unitOf(symbol);
	if (!own || symbol === '') return undefined;
	for (const [prefix, power] of Object.entries(PREFIXES)) {
		const base = symbol.slice(prefix.length);
		if (base === '' || !symbol.startsWith(prefix)) continue;
		for (const candidate of units) {
			const other = candidate.symbol.endsWith(base)
				? PREFIXES[candidate.symbol.slice(0, -base.length)]
				: undefined;
			const fits =
				other !== undefined &&
				other - power === decade &&
				candidate.factor === own.factor &&
				candidate.decade - own.decade === decade &&
				candidate.offset === 0;
			if (fits) return candidate.symbol;
		}
	}
	return undefined;
}

/** The fullest set of ticks whose words keep apart; the two ends where none does. */
function fittingTicks(span: Span, counting: Counting, options: AxisOptions): Tick[] {
	let last: Tick[] = [];
	for (const candidates of tickSets(span, options.upright ?? false)) {
		const inside = candidates.filter((at) => {
			const share = shareOf(at, span);
			return share >= -1e-9 && share <= 1 + 1e-9;
		});
		if (inside.length < 2 || inside.length > MOST_TICKS) continue;
		last = tickWords(inside, span, counting, options);
		if (keepApart(last, options)) return last;
	}
	const [first, end] = [last[0], last.at(-1)];
	const ends = first && end && first !== end ? [first, end] : [];
	return keepApart(ends, options) ? ends : ends.slice(0, 1);
}

function* tickSets(span: Span, upright: boolean): Generator<number[]> {
	if (span.log) {
		yield* logTickSets(span);
		return;
	}
	for (let count = upright ? 6 : 5; count >= 1; count -= 1)
		yield roundTicks(span.from, span.to, count);
	yield [span.from, span.to];
}

function* logTickSets({ from, to }: Span): Generator<number[]> {
	const first = Math.ceil(Math.log10(from) - 1e-9);
	const last = Math.floor(Math.log10(to) + 1e-9);
	if (last - first < 2) {
		for (const steps of [
			[1, 2, 5],
			[1, 3],
			[1, 5]
		]) {
			yield range(first - 1, last + 1, 1).flatMap((power) =>
				steps.map((step) => Number(`${step}e${power}`))
			);
		}
		for (const count of [4, 3, 2]) yield roundTicks(from, to, count);
	}
	for (let stride = 1; stride <= Math.max(1, last - first); stride += 1)
		yield range(first, last, stride).map((power) => Number(`1e${power}`));
	yield [from, to];
}

function range(first: number, last: number, stride: number): number[] {
	return Array.from(
		{ length: Math.max(0, Math.floor((last - first) / stride) + 1) },
		(_, index) => first + index * stride
	);
}

function tickWords(
	values: readonly number[],
	span: Span,
	counting: Counting,
	{ length, upright, print }: AxisOptions
): Tick[] {
	const counted = values.map(counting.toAxis);
	const powers = span.log && !counted.every((value) => value >= 1e-3 && value < 1e5);
	return values.map((at, index) => {
		const share = Math.min(1, Math.max(0, shareOf(at, span)));
		const value = counted[index] ?? at;
		const words = powers ? print.power(value) : print.whole(value);
		const half = textWidth(words, TICK_SIZE) / 2;
		const anchor = upright
			? 'middle'
			: share * length + half > length + MARGIN
				? 'end'
				: share * length - half < -MARGIN
					? 'start'
					: 'middle';
		return { at, share, words, anchor };
	});
}

/** Pixels a tick's words may stand out past the end of a level axis. */
export const MARGIN = 12;

/** Left and right end of a tick's words, in pixels. */
export function tickBox({ share, words, anchor }: Tick, length: number): [number, number] {
	const width = textWidth(words, TICK_SIZE);
	const at = share * length;
	if (anchor === 'start') return [at - 4, at - 4 + width];
	return anchor === 'end' ? [at + 4 - width, at + 4] : [at - width / 2, at + width / 2];
}

function keepApart(ticks: readonly Tick[], { length, upright }: AxisOptions): boolean {
	return ticks.every((tick, index) => {
		const before = ticks[index - 1];
		if (!before) return true;
		if (upright) return (tick.share - before.share) * length >= LINE;
		return tickBox(tick, length)[0] - tickBox(before, length)[1] >= GAP;
	});
}

/** The factor between neighbouring ticks, where it is one power of ten throughout. */
function evenFactor(ticks: readonly Tick[]): number | null {
	const powers = ticks.map(({ at }) => Math.log10(at));
	const steps = powers.slice(1).map((power, index) => power - (powers[index] ?? 0));
	const [first] = steps;
	if (first === undefined) return null;
	const whole = Math.round(first);
	return whole > 0 && steps.every((step) => Math.abs(step - whole) < 1e-6) ? 10 ** whole : null;
}
