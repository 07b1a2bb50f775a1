/** What the machine finds in a document: its claims, what a signature on each would cover, the verdicts, what is missing. */
import '../../factcheck/lexicon/all.ts';
import { judgeClaims } from '../../factcheck/judge.ts';
import { undeclaredFindings } from '../../factcheck/undeclared.ts';
import type { Verdict } from '../../factcheck/verdict.ts';
import type { CalculatorSet } from '../../physics/calculator.ts';
import { benchSet } from '../../widget/bench-set.ts';
import { claimCovers, coverHash, type ClaimCover } from '../../widget/cover.ts';
import type { WidgetDocument } from '../../widget/document.ts';
import { evaluate } from '../../widget/evaluate.ts';
import { findings, type Finding } from '../../widget/findings.ts';
import { digestOf, freeze } from '../../widget/freeze.ts';
import { claimPlaces, wordsAt, type ClaimPlace } from '../../widget/places.ts';

export interface ExaminedClaim extends ClaimPlace {
	verdict: Verdict;
	cover: ClaimCover;
	coverHash: string;
}

export interface Examination {
	/** In reading order. */
	claims: ExaminedClaim[];
	findings: Finding[];
	/** The digest a proof of it would have, with the calculators that run now. */
	digest: string;
}

/** The same document worked with the same calculators gives the same findings, so the desk needn't weigh everything again. */
const seenWith = new WeakMap<CalculatorSet, Map<string, Examination>>();
const KEPT = 200;

export function examine(document: WidgetDocument, calculators: CalculatorSet): Examination {
	const seen = seenWith.get(calculators) ?? new Map<string, Examination>();
	seenWith.set(calculators, seen);
	const key = digestOf(document);
	const kept = seen.get(key);
	if (kept) return kept;
	const fresh = examineAnew(document, calculators);
	const [oldest] = seen.keys();
	if (seen.size >= KEPT && oldest !== undefined) seen.delete(oldest);
	seen.set(key, fresh);
	return fresh;
}

function examineAnew(document: WidgetDocument, house: CalculatorSet): Examination {
	const calculators = benchSet(document, house);
	const verdicts = judgeClaims(document, calculators);
	const covers = claimCovers(document, calculators);
	const places = claimPlaces(
		document,
		wordsAt(document, evaluate(document, {}, calculators), calculators)
	);
	const claims = places.flatMap((place) => {
		const verdict = verdicts.get(place.claim.id);
		const cover = covers.get(place.claim.id);
		return verdict && cover ? [{ ...place, verdict, cover, coverHash: coverHash(cover) }] : [];
	});
	return {
		claims,
		findings: [...findings(document, calculators), ...undeclaredFindings(document)],
		digest: freeze(document, calculators).digest
	};
}
