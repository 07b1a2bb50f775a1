/** Weighs every claim of a document: stated words as they stand, live numbers at every setting that matters. */
import type { CalculatorSet } from '../physics/calculator.ts';
import { commensurable } from '../physics/units/units.ts';
import type {
	Claim,
	Control,
	ControlValues,
	ReadingRef,
	WidgetDocument
} from '../widget/document.ts';
import { evaluate, readingAt, type Evaluation, type ReadingOutcome } from '../widget/evaluate.ts';
import { wiringOf } from '../widget/graph.ts';
import { claimPlaces, liveStated, tokenWords, type ClaimPlace } from '../widget/places.ts';
import { plainDecimal, printStated, type Stated } from '../widget/stated.ts';
import { decide, unweighed, type Decision } from './decide.ts';
import { detectQuantities, type DetectedQuantity, type QuantityForm } from './detect.ts';
import { suggestWordings } from './suggestions.ts';
import type { Severity, Verdict } from './verdict.ts';
import type { WeighedReading } from './weighing.ts';

/** Settings of each slider that a live number is weighed at; the one it starts at comes on top. */
const SETTINGS = 11;

type Evaluated = (values: ControlValues) => Evaluation;

/**
 * The verdict on each claim, by id. Stated words are weighed at the first settings. What the widget prints is weighed
 * from end to end of every slider that reaches its reading, and the worst verdict counts.
 */
export function judgeClaims(
	document: WidgetDocument,
	calculators: CalculatorSet
): Map<string, Verdict> {
	const evaluated = evaluateOnce(document, calculators);
	const places = new Map(claimPlaces(document, tokenWords).map((place) => [place.claim.id, place]));
	return new Map(
		document.claims.map((claim) => [
			claim.id,
			judgeClaim(document, claim, places.get(claim.id), evaluated, calculators)
		])
	);
}

/** Live claims share their sliders, and so their evaluations. */
function evaluateOnce(document: WidgetDocument, calculators: CalculatorSet): Evaluated {
	const known = new Map<string, Evaluation>();
	return (values) => {
		const key = JSON.stringify(values);
		const evaluation = known.get(key) ?? evaluate(document, values, calculators);
		known.set(key, evaluation);
		return evaluation;
	};
}

function judgeClaim(
	document: WidgetDocument,
	claim: Claim,
	place: ClaimPlace | undefined,
	evaluated: Evaluated,
	calculators: CalculatorSet
): Verdict {
	if (place === undefined) return silent('Its words are no longer in the copy.');
	switch (claim.form) {
		case 'exempt':
			return silent(`Not a claim: ${asSentence(claim.reason)}`);
		case 'stated':
			return judgeStated(document, claim, place, evaluated, calculators);
		case 'live':
			return judgeLive(document, claim, evaluated, calculators);
	}
}

function silent(reason: string): Verdict {
	return { ...unweighed(reason), suggestions: [] };
}

function asSentence(text: string): string {
	return /[.!?…]$/.test(text.trim()) ? text.trim() : `${text.trim()}.`;
}

type NumberOutcome = { ok: true; reading: WeighedReading } | { ok: false; reason: string };

function numberOf(outcome: ReadingOutcome): NumberOutcome {
	if (!outcome.ok)
		return { ok: false, reason: `No reading: ${asSentence(outcome.refusal.message)}` };
	const { value } = outcome.reading;
	if (typeof value !== 'number')
		return { ok: false, reason: `The reading is words, “${value}”, and no number.` };
	return { ok: true, reading: { ...outcome.reading, value } };
}

/** Kinds of quantity that are found in copy and have no rule in the house yet, as a sentence names them. */
const NO_RULE: Partial<Record<QuantityForm, string>> = {
	range: 'A range isn’t weighed yet: tie one number.',
	uncertainty: 'A number with its uncertainty isn’t weighed yet: give the number alone.',
	'order-word': 'An order word isn’t weighed yet: give a number.',
	'small-word': 'A small word isn’t weighed yet: give a number.'
};

/**
 * Words in a result sentence stand beside numbers that move, so a reader takes them as true at every setting: they are
 * weighed at all of them. Words elsewhere tell of the first settings.
 */
function judgeStated(
	document: WidgetDocument,
	claim: Extract<Claim, { form: 'stated' }>,
	{ words, blockId }: ClaimPlace,
	evaluated: Evaluated,
	calculators: CalculatorSet
): Verdict {
	const weighAt = (values: ControlValues) =>
		weighWords(words, readingAt(document, evaluated(values), claim.reading, calculators));
	const start = weighAt({});
	const suggestions = start.stated ? suggestWordings(start.stated, start.reading) : [];
	const moves = document.blocks.some(({ id, kind }) => id === blockId && kind === 'result');
	const worst = moves ? worstOf(tryThroughout(document, claim.reading, weighAt)) : null;
	if (!worst || rank(worst.decision) <= rank(start.decision)) {
		return { ...start.decision, suggestions };
	}
	return {
		...worst.decision,
		reason: `These words stand still while their sentence moves. At ${worst.setting}: ${worst.decision.reason}`,
		suggestions: []
	};
}

type WeighedWords =
	| { decision: Decision; stated: Stated; reading: WeighedReading }
	| { decision: Decision; stated: null };

function weighWords(words: string, outcome: ReadingOutcome): WeighedWords {
	const untold = (reason: string): WeighedWords => ({ decision: unweighed(reason), stated: null });
	const read = numberOf(outcome);
	if (!read.ok) return untold(read.reason);
	const quantity = quantityFor(words, read.reading.unit);
	if (!quantity?.stated) {
		return untold((quantity && NO_RULE[quantity.kind]) ?? 'No number in these words.');
	}
	const decision: Decision = quantity.doubleHedge
		? {
				...decide(quantity.stated, read.reading),
				severity: 'block',
				reason: 'Two hedges on one number: keep one.'
			}
		: decide(quantity.stated, read.reading);
	return { decision, stated: quantity.stated, reading: read.reading };
}

/** The first quantity of the reading's dimension; where none is, the first at all, so that the mismatch is told. */
export function quantityFor(words: string, unit: string): DetectedQuantity | undefined {
	const found = detectQuantities(words, 'en');
	return found.find((quantity) => commensurable(quantity.unit, unit)) ?? found[0];
}

interface Trial {
	decision: Decision;
	/** “500 million years”, with the slider's label where there are several. */
	setting: string;
}

function judgeLive(
	document: WidgetDocument,
	claim: Extract<Claim, { form: 'live' }>,
	evaluated: Evaluated,
	calculators: CalculatorSet
): Verdict {
	const weighAt = (values: ControlValues): Decision => {
		const evaluation = evaluated(values);
		const read = numberOf(readingAt(document, evaluation, claim.reading, calculators));
		if (!read.ok) return unweighed(read.reason);
		if (!commensurable(read.reading.unit, claim.unit)) {
			return unweighed(
				'The number is printed in a unit that its reading can’t have: choose another unit.'
			);
		}
		const stated = liveStated(document, evaluation, claim.id, calculators);
		return stated ? decide(stated, read.reading) : unweighed('No reading.');
	};
	const start = weighAt({});
	const trials = tryThroughout(document, claim.reading, (values) => ({
		decision: weighAt(values)
	}));
	const worst = worstOf(trials);
	const controls = controlsReaching(document, claim.reading);
	if (!worst || rank(worst.decision) <= rank(start))
		return { ...told(start, trials, controls), suggestions: [] };
	return {
		...worst.decision,
		reason: `At ${worst.setting}: ${worst.decision.reason}`,
		suggestions: []
	};
}

function controlsReaching(document: WidgetDocument, reading: ReadingRef): Control[] {
	const reached = wiringOf(document.steps, reading).controls;
	return document.controls.filter(({ id }) => reached.includes(id));
}

/** Weighs from end to end of every slider that reaches the reading, the others at their first settings. */
function tryThroughout(
	document: WidgetDocument,
	reading: ReadingRef,
	weighAt: (values: ControlValues) => { decision: Decision }
): Trial[] {
	const controls = controlsReaching(document, reading);
	return controls.flatMap((control) =>
		settingsOf(control).map((value): Trial => ({
			decision: weighAt(value === control.initial ? {} : { [control.id]: value }).decision,
			setting: settingWords(control, value, controls.length > 1)
		}))
	);
}

function worstOf(trials: readonly Trial[]): Trial | null {
	return trials.reduce<Trial | null>(
		(worse, trial) => (worse && rank(worse.decision) >= rank(trial.decision) ? worse : trial),
		null
	);
}

/** The first settings are as bad as it gets: their own reason, and for level numbers how far that was tried. */
function told(start: Decision, trials: readonly Trial[], controls: readonly Control[]): Decision {
	const [control] = controls;
	if (start.verdict !== 'level' || !control) return start;
	const reach =
		controls.length === 1
			? `from ${settingWords(control, control.min, false)} to ${settingWords(control, control.max, false)}`
			: 'of its sliders';
	return {
		...start,
		reason: `The number printed fits at all ${trials.length} settings tried, ${reach}.`
	};
}

const VERDICT_RANK = { level: 0, leans: 10, unweighed: 20, tips: 30 };
const SEVERITY_RANK: Record<Severity, number> = { none: 0, note: 1, ask: 11, block: 21 };

/** Worst first: tips, block, unweighed, ask, leans, level. */
function rank({ verdict, severity }: Decision): number {
	return Math.max(VERDICT_RANK[verdict], SEVERITY_RANK[severity]);
}

/** From end to end on the slider's own steps, and where it starts. A slider of few steps is tried at each. */
export function settingsOf(control: Control): number[] {
	const { min, max, step, initial } = control;
	const evenly = Array.from({ length: SETTINGS }, (_, index) => {
		const steps = Math.round(((max - min) * index) / (SETTINGS - 1) / step);
		return index === SETTINGS - 1
			? max
			: Math.min(max, Number((min + steps * step).toPrecision(12)));
	});
	return [...new Set([...evenly, initial])].sort((a, b) => a - b);
}

function settingWords({ label, unit }: Control, value: number, named: boolean): string {
	const numeral = plainDecimal(Number(value.toPrecision(12)));
	const printed = printStated({ hedge: 'bare', hedgeWord: '', numeral, scale: 1, unit });
	return named ? `${printed} (${label})` : printed;
}
