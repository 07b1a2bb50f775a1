/** The public account of a released piece: its text, its makers, how each number was checked. Needs no session. */
import { eq } from 'drizzle-orm';
import { SteelyardError } from '../../errors.ts';
import type { Verdict } from '../../factcheck/verdict.ts';
import type { WidgetDocument } from '../../widget/document.ts';
import type { PersonName, ReleaseView } from '../../workflow/piece.ts';
import type { Context } from '../context.ts';
import { proofs, releases } from '../db/schema/index.ts';
import { readDossier } from './dossier.ts';
import { nameBook } from './people.ts';
import { viewRelease } from './piece-view.ts';
import { standingOf } from './standing.ts';

export interface CheckedNumber {
	id: string;
	label: string;
	words: string;
	verdict: Verdict;
	checkedBy: { name: string; /** ISO 8601. */ on: string }[];
}

/** Names only: a reader has no use for our ids. */
export interface Colophon {
	slug: string;
	document: WidgetDocument;
	numbers: CheckedNumber[];
	writers: string[];
	/** Who passed it. */
	editor: string;
	/** Newest first; the first one is live. */
	releases: Pick<ReleaseView, 'number' | 'digest' | 'releasedAt'>[];
}

/** Throws `not-found` for a piece that was never released, just as for one that isn't there. */
export async function readColophon(ctx: Pick<Context, 'db'>, slug: string): Promise<Colophon> {
	const dossier = await readDossier(ctx.db, { slug });
	const newest = dossier?.releases[0];
	if (!dossier || !newest) throw new SteelyardError('not-found');
	const [proof] = await ctx.db.select().from(proofs).where(eq(proofs.id, newest.proofId));
	const [released] = await ctx.db
		.select({ document: releases.document })
		.from(releases)
		.where(eq(releases.id, newest.id));
	if (!proof || !released)
		throw new Error(`Release ${newest.number} of ${slug} has lost its proof.`);

	const { claims, people } = standingOf(dossier, proof, newest.releasedAt);
	const names = await nameBook(ctx.db, [
		...people.writers,
		proof.passedBy,
		newest.releasedBy,
		...dossier.signatures.map(({ personId }) => personId)
	]);
	const nameOf = (personId: string): PersonName['name'] => names(personId).name;
	return {
		slug,
		document: released.document,
		numbers: claims
			.filter(({ examined }) => examined.claim.form !== 'exempt')
			.map(({ examined, signatures }) => ({
				id: examined.claim.id,
				label: examined.label,
				words: examined.words,
				verdict: examined.verdict,
				checkedBy: signatures
					.filter(({ inForce }) => inForce)
					.map(({ personId, signedAt }) => ({ name: nameOf(personId), on: signedAt.toISOString() }))
			})),
		writers: people.writers.map(nameOf),
		editor: nameOf(proof.passedBy ?? newest.releasedBy),
		releases: dossier.releases.map((row) => {
			const { number, digest, releasedAt } = viewRelease(row, names);
			return { number, digest, releasedAt };
		})
	};
}
