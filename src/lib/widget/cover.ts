/**
 * What a signature covers: the sentence, the claim's words and tie, and everything upstream of its reading. Two
 * covers with one hash are the same promise; any difference lapses the signature, and nothing else does.
 */
import type { CalculatorSet } from '../physics/calculator.ts';
import { benchSet } from './bench-set.ts';
import type { Claim, Control, Step, WidgetDocument } from './document.ts';
import { digestOf } from './freeze.ts';
import { wiringOf } from './graph.ts';
import { claimPlaces, tokenWords } from './places.ts';

/** Goes up when the number rules change what a signature vouches for. */
export const RULES_EDITION = 2;

export interface ClaimCover {
	rules: number;
	language: string;
	constants: string;
	/** The sentence with live numbers and settings as tokens. */
	sentence: string;
	words: string;
	/** It stands in the sentence that moves with the sliders, and so is weighed at every setting. */
	moves: boolean;
	/** Where the words start in the sentence, in UTF-16 units: the same words may stand there twice. */
	start: number;
	claim: Claim;
	steps: (Step & { running: string })[];
	controls: Control[];
}

/** Null when the document has no such claim in its copy. */
export function claimCover(
	document: WidgetDocument,
	claimId: string,
	calculators: CalculatorSet
): ClaimCover | null {
	return claimCovers(document, calculators).get(claimId) ?? null;
}

/** Covers of all claims, by claim id. */
export function claimCovers(
	document: WidgetDocument,
	house: CalculatorSet
): Map<string, ClaimCover> {
	const calculators = benchSet(document, house);
	const moving = new Set(
		document.blocks.filter(({ kind }) => kind === 'result').map(({ id }) => id)
	);
	return new Map(
		claimPlaces(document, tokenWords).map((place) => [
			place.claim.id,
			{
				rules: RULES_EDITION,
				language: document.language,
				constants: document.constants,
				sentence: place.sentence,
				words: place.words,
				moves: moving.has(place.blockId),
				start: place.start,
				claim: place.claim,
				...upstream(document, place.claim, place.sentence, calculators)
			}
		])
	);
}

/** Steps with the revision that runs beside the one pinned, and the controls that reach them or stand in the sentence. */
function upstream(
	document: WidgetDocument,
	claim: Claim,
	sentence: string,
	calculators: CalculatorSet
) {
	const wiring =
		claim.form === 'exempt' ? { steps: [], controls: [] } : wiringOf(document.steps, claim.reading);
	const said = document.controls.filter(({ id }) => sentence.includes(`{setting ${id}}`));
	const reaching = new Set([...wiring.controls, ...said.map(({ id }) => id)]);
	return {
		steps: wiring.steps.map((step) => ({
			...step,
			running: calculators.get(step.calculator)?.revision ?? ''
		})),
		controls: document.controls.filter(({ id }) => reaching.has(id))
	};
}

export function coverHash(cover: ClaimCover): string {
	return digestOf(cover);
}
