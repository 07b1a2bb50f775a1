/** Weighs every claim of a document: stated words as they stand, live numbers at every setting that matters. */
import type { CalculatorSet } from '../physics/calculator.ts';
import { commensurable } from '../physics/units/units.ts';
import { benchSet } from '../widget/bench-set.ts';
import type { Claim, Control, ControlValues, WidgetDocument } from '../widget/document.ts';
import { evaluate, readingAt, type Evaluation, type ReadingOutcome } from '../widget/evaluate.ts';
import { readingWithUncertainty } from '../widget/evaluate-uncertainty.ts';
import { claimPlaces, liveStated, type ClaimPlace } from '../widget/places.ts';
import type { Stated } from '../widget/stated.ts';
import { decide, unweighed, type Decision } from './decide.ts';
import type { QuantityForm } from './detect.ts';
import { ATOM, ownWords, quantityInPlace, type FoundQuantity } from './own-words.ts';
import {
	controlsReaching,
	rank,
	reachWords,
	tryThroughout,
	worstOf,
	type Trial
} from './trials.ts';
import { suggestWordings } from './suggestions.ts';
import type { Verdict } from './verdict.ts';
import type { WeighedReading } from './weighing.ts';

type Evaluated = (values: ControlValues) => Evaluation;

/**
 * The verdict on each claim, by id. Stated words are weighed at the first settings. What the widget prints is weighed
 * from end to end of every slider that reaches its reading, and the worst verdict counts.
 */
export function judgeClaims(document: WidgetDocument, house: CalculatorSet): Map<string, Verdict> {
	const calculators = benchSet(document, house);
	const evaluated = evaluateOnce(document, calculators);
	const places = new Map(claimPlaces(document, ownWords).map((place) => [place.claim.id, place]));
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
 * Words beside numbers that move are taken as true at every setting, so they are weighed at all of them: those in a
 * result sentence, and those whose sentence holds a live number or a slider's value. Words elsewhere tell of the first
 * settings.
 */
function judgeStated(
	document: WidgetDocument,
	claim: Extract<Claim, { form: 'stated' }>,
	place: ClaimPlace,
	evaluated: Evaluated,
	calculators: CalculatorSet
): Verdict {
	const found = quantityInPlace(document, place);
	const weighAt = (values: ControlValues, draws: boolean) =>
		weighWords(
			found,
			readingWithUncertainty(document, evaluated(values), claim.reading, calculators, { draws })
		);
	const start = weighAt({}, true);
	const suggestions = start.stated
		? suggestWordings(start.stated, start.reading, document.language)
		: [];
	// Draws take their time, so the many settings along a slider make do with the straight line.
	const worst = moves(document, place)
		? worstOf(tryThroughout(document, claim.reading, (values) => weighAt(values, false).decision))
		: null;
	if (!worst || rank(worst.decision) <= rank(start.decision)) {
		return { ...start.decision, suggestions };
	}
	return {
		...worst.decision,
		reason: `These words stand still while their sentence moves. At ${worst.setting}: ${worst.decision.reason}`,
		suggestions: []
	};
}

function moves(document: WidgetDocument, { blockId, sentence }: ClaimPlace): boolean {
	return (
		sentence.includes(ATOM) ||
		document.blocks.some(({ id, kind }) => id === blockId && kind === 'result')
	);
}

type WeighedWords =
	| { decision: Decision; stated: Stated; reading: WeighedReading }
	| { decision: Decision; stated: null };

function weighWords(found: FoundQuantity, outcome: ReadingOutcome): WeighedWords {
	const untold = (reason: string): WeighedWords => ({ decision: unweighed(reason), stated: null });
	const read = numberOf(outcome);
	if (!read.ok) return untold(read.reason);
	if (!found.ok) return untold(found.reason);
	const { quantity } = found;
	if (!quantity.stated) return untold(NO_RULE[quantity.kind] ?? 'No number in these words.');
	const decision: Decision = quantity.doubleHedge
		? {
				...decide(quantity.stated, read.reading),
				severity: 'block',
				reason: 'Two hedges on one number: keep one.'
			}
		: decide(quantity.stated, read.reading);
	return { decision, stated: quantity.stated, reading: read.reading };
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
	const trials = tryThroughout(document, claim.reading, weighAt);
	const worst = worstOf(trials);
	const controls = controlsReaching(document, claim.reading);
	if (!worst || rank(worst.decision) <= rank(start))
		return { ...told(document, start, trials, controls), suggestions: [] };
	return {
		...worst.decision,
		reason: `At ${worst.setting}: ${worst.decision.reason}`,
		suggestions: []
	};
}

/** The first settings are as bad as it gets: their own reason, and for level numbers how far that was tried. */
function told(
	document: WidgetDocument,
	start: Decision,
	trials: readonly Trial[],
	controls: readonly Control[]
): Decision {
	const [control] = controls;
	if (start.verdict !== 'level' || !control) return start;
	const reach = controls.length === 1 ? reachWords(control, document.language) : 'of its sliders';
	return {
		...start,
		reason: `The number printed fits at all ${trials.length} settings tried, ${reach}.`
	};
}
