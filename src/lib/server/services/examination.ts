/** What the machine finds in a document: its claims, what a signature on each would cover, the verdicts, what is missing. */
import { judgeClaims } from '../../factcheck/judge.ts';
import { undeclaredFindings } from '../../factcheck/undeclared.ts';
import type { Verdict } from '../../factcheck/verdict.ts';
import { catalogue } from '../../physics/calculators/index.ts';
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

/** The same document gives the same findings while the process runs, so the desk needn't weigh everything again. */
const seen = new Map<string, Examination>();
const KEPT = 200;

export function examine(document: WidgetDocument): Examination {
	const key = digestOf(document);
	const kept = seen.get(key);
	if (kept) return kept;
	const fresh = examineAnew(document);
	const [oldest] = seen.keys();
	if (seen.size >= KEPT && oldest !== undefined) seen.delete(oldest);
	seen.set(key, fresh);
	return fresh;
}

function examineAnew(document: WidgetDocument): Examination {
	const verdicts = judgeClaims(document, catalogue);
	const covers = claimCovers(document, catalogue);
	const places = claimPlaces(
		document,
		wordsAt(document, evaluate(document, {}, catalogue), catalogue)
	);
	const claims = places.flatMap((place) => {
		const verdict = verdicts.get(place.claim.id);
		const cover = covers.get(place.claim.id);
		return verdict && cover ? [{ ...place, verdict, cover, coverHash: coverHash(cover) }] : [];
	});
	return {
		claims,
		findings: [...findings(document, catalogue), ...undeclaredFindings(document)],
		digest: freeze(document, catalogue).digest
	};
}
