/** Wordings that would be level: tried one by one on the same weigh, so that none is offered that doesn't hold. */
import type { Language } from '../widget/language.ts';
import { printWordsOf, type PrintedHedge } from '../widget/languages/print-words.ts';
import { printStated, type Stated } from '../widget/stated.ts';
import { decide } from './decide.ts';
import { decimalOf, divide, firstPlace, roundSize, signOf, toText } from './decimal.ts';
import { inUnit, sameDimension, type WeighedReading } from './weighing.ts';

const MOST = 3;
/** Nearer to nought there is no power of ten left to state a number by. */
const SMALLEST = 1e-300;
/** A “more than” that misses by more than this looks for a nearer number first. */
const SNUG_PERCENT = 10;

interface Wording {
	hedge: 'bare' | PrintedHedge;
	way: 'nearest' | 'up' | 'down';
	/** Lengths in significant figures, tried in this order until one is level. */
	figures: readonly number[];
}

/** Best first: round and honest, then one-sided, then bare. */
const WORDINGS: readonly Wording[] = [
	{ hedge: 'around', way: 'nearest', figures: [2, 3, 1] },
	{ hedge: 'below', way: 'up', figures: [1, 2, 3] },
	{ hedge: 'more-than', way: 'down', figures: [1, 2, 3] },
	{ hedge: 'bare', way: 'nearest', figures: [3, 2, 1] },
	{ hedge: 'around', way: 'nearest', figures: [1, 3] }
];

/** Up to three wordings that weigh level, other than the one given; none when the two can't be compared. */
export function suggestWordings(
	stated: Stated,
	reading: WeighedReading,
	language: Language = 'en'
): string[] {
	if (!Number.isFinite(reading.value) || !sameDimension(reading.unit, stated.unit)) return [];
	const value = inUnit(reading, stated.unit);
	if (!(Math.abs(value) > SMALLEST && Math.abs(value) < Infinity)) return [];
	const said = new Set([printStated(stated, language)]);
	for (const wording of WORDINGS) {
		if (said.size > MOST) break;
		const text = firstLevel(wording, stated, value, reading, said, language);
		if (text) said.add(text);
	}
	return [...said].slice(1);
}

function firstLevel(
	wording: Wording,
	stated: Stated,
	value: number,
	reading: WeighedReading,
	said: ReadonlySet<string>,
	language: Language
): string | undefined {
	// One-sided words on negative numbers are a question of their own; none is suggested.
	if (value < 0 && wording.way !== 'nearest') return undefined;
	const level = wording.figures
		.map((figures) => word(wording, stated, value, figures, language))
		.filter(
			(candidate) => candidate.numeral.length <= 12 && !said.has(printStated(candidate, language))
		)
		.map((candidate) => ({ candidate, decision: decide(candidate, reading) }))
		.filter(({ decision }) => decision.verdict === 'level' && decision.severity === 'none')
		// “About” before the very number says less than is known.
		.filter(({ decision }) => wording.hedge === 'bare' || decision.departurePercent !== 0);
	const snug = level.find(
		({ decision }) => Math.abs(decision.departurePercent ?? 0) <= SNUG_PERCENT
	);
	const chosen = snug ?? level[0];
	return chosen && printStated(chosen.candidate, language);
}

function word(
	{ hedge, way }: Wording,
	stated: Stated,
	value: number,
	figures: number,
	language: Language
): Stated {
	const scale = scaleFor(value, stated.scale);
	const scaled = divide(decimalOf(value), decimalOf(scale));
	const rounded = roundSize(scaled, firstPlace(scaled) - figures + 1, way);
	const sign = signOf(scaled) < 0 && signOf(rounded) !== 0 ? '-' : '';
	return {
		hedge,
		hedgeWord: hedge === 'bare' ? '' : printWordsOf(language).hedges[hedge],
		numeral: sign + toText(rounded),
		scale,
		unit: stated.unit,
		...(stated.unitWord ? { unitWord: stated.unitWord } : {})
	};
}

/**
 * The writer's own scale word while it leaves one to three digits, else the one that does; a power of ten past the
 * trillions, and where the writer wrote one.
 */
export function scaleFor(value: number, given: number): number {
	const size = Math.abs(value);
	if (size / given >= 1 && size / given < 1000) return given;
	if (size >= 1e15 || given < 1) return Number(`1e${firstPlace(decimalOf(size))}`);
	return [1e12, 1e9, 1e6].find((scale) => size >= scale) ?? 1;
}
