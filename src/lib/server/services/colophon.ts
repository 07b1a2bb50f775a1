/** The public account of a released piece: its text, its makers, how each number was checked. Needs no session. */
import { desc, eq } from 'drizzle-orm';
import { SteelyardError } from '../../errors.ts';
import type { ReleaseView } from '../../workflow/piece.ts';
import type { Context } from '../context.ts';
import type { Db } from '../db/client.ts';
import { pieces, proofs, releases } from '../db/schema/index.ts';
import { accountOf, type PublicAccount } from '../press/account.ts';
import { recordsOf } from '../press/records.ts';
import { readDossier } from './dossier.ts';
import { nameBook } from './people.ts';
import { makersOf, namedBy, signingsOf } from './release-makers.ts';
import { standingOf } from './standing.ts';
import { readStock } from './stock.ts';
import { readStored } from './stored-document.ts';

export interface Colophon {
	slug: string;
	/** Of the live release. */
	account: PublicAccount;
	/** Newest first; the first one is live. */
	releases: Pick<ReleaseView, 'number' | 'digest' | 'releasedAt'>[];
}

/** Throws `not-found` for a piece that was never released, just as for one that isn't there. */
export async function readColophon({ db }: Pick<Context, 'db'>, slug: string): Promise<Colophon> {
	const rows = await db
		.select({
			id: releases.id,
			number: releases.number,
			digest: releases.digest,
			releasedAt: releases.releasedAt
		})
		.from(releases)
		.innerJoin(pieces, eq(pieces.id, releases.pieceId))
		.where(eq(pieces.slug, slug))
		.orderBy(desc(releases.number));
	const [newest] = rows;
	if (!newest) throw new SteelyardError('not-found');
	const [kept] = await db
		.select({ account: releases.account })
		.from(releases)
		.where(eq(releases.id, newest.id));
	return {
		slug,
		account: kept?.account ?? (await accountAnew(db, slug, newest.id)),
		releases: rows.map(({ number, digest, releasedAt }) => ({
			number,
			digest,
			releasedAt: releasedAt.toISOString()
		}))
	};
}

/** For releases from before accounts were kept: worked out with the revisions that ran when it went out. */
async function accountAnew(db: Db, slug: string, releaseId: string): Promise<PublicAccount> {
	const dossier = await readDossier(db, { slug });
	const [row] = await db
		.select({ release: releases, proof: proofs })
		.from(releases)
		.innerJoin(proofs, eq(proofs.id, releases.proofId))
		.where(eq(releases.id, releaseId));
	if (!dossier || !row) throw new Error(`A release of ${slug} has lost its proof.`);
	const at = row.release.releasedAt;
	const stock = await readStock(db, at);
	const document = readStored(row.release.document, stock.calculators);
	const standing = standingOf({ ...dossier, stock }, { ...row.proof, document }, at);
	const editor = row.proof.passedBy ?? row.release.releasedBy;
	const names = await nameBook(db, namedBy(standing, editor));
	return accountOf(
		document,
		stock.calculators,
		recordsOf(document, stock.calculators, signingsOf(standing, names)),
		makersOf(standing, editor, names)
	);
}
