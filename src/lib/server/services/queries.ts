/** A query is one question about one claim: asked, answered, closed. While it is open the claim can't be signed. */
import { and, eq, inArray, isNull } from 'drizzle-orm';
import { SteelyardError } from '../../errors.ts';
import type { AnswerQuery, CloseQuery, RaiseQuery } from '../../forms/check.ts';
import { can, requirePermission } from '../../workflow/permissions.ts';
import type { Context } from '../context.ts';
import type { Db } from '../db/client.ts';
import { people, queries } from '../db/schema/index.ts';
import { queueMail } from '../mail/outbox.ts';
import { record } from './daybook.ts';
import type { QueryRow } from './dossier.ts';
import { dropPass, lockAnyProof, lockNewestProof, type LockedProof } from './proofs.ts';
import { refuseUnstorable } from './storable.ts';
import { inTransaction } from './transaction.ts';

/** Asks the writers about one claim of the newest proof. A pass drops. */
export async function raiseQuery(
	ctx: Context,
	slug: string,
	input: RaiseQuery
): Promise<{ queryId: string }> {
	const { actor, now } = ctx;
	requirePermission(actor, 'query-claim');
	refuseUnstorable({ question: input.question });
	return inTransaction(ctx, async (tx) => {
		const locked = await lockNewestProof(tx, slug, input.proofId);
		const { dossier, proof } = locked;
		const label = labelOf(locked, input.claim);
		if (label === null) throw new SteelyardError('not-found');

		const [query] = await tx
			.insert(queries)
			.values({
				pieceId: proof.pieceId,
				proofId: proof.id,
				claim: input.claim,
				question: input.question,
				askedBy: actor.personId,
				askedAt: now
			})
			.returning({ id: queries.id });
		if (!query) throw new Error('The database took a query and gave back no id.');
		await record(tx, ctx, 'query-raised', {
			pieceId: proof.pieceId,
			queryId: query.id,
			claim: input.claim
		});
		await dropPass(tx, ctx, dossier, proof, 'query-raised');
		const about = { slug, title: proof.document.title, by: actor.name, claim: label };
		for (const writer of await mailboxes(
			tx,
			proof.writers.filter((id) => id !== actor.personId)
		)) {
			await queueMail(tx, now, writer, { event: 'query-raised', input: about });
		}
		return { queryId: query.id };
	});
}

/** Answers an open query; a second answer takes the first one's place. */
export async function answerQuery(ctx: Context, slug: string, input: AnswerQuery): Promise<void> {
	const { actor, now } = ctx;
	requirePermission(actor, 'answer-query');
	refuseUnstorable({ answer: input.answer });
	await inTransaction(ctx, async (tx) => {
		const locked = await lockAnyProof(tx, slug);
		const query = openQuery(locked, input.queryId);
		await tx
			.update(queries)
			.set({ answer: input.answer, answeredBy: actor.personId, answeredAt: now })
			.where(eq(queries.id, query.id));
		await record(tx, ctx, 'query-answered', { pieceId: query.pieceId, queryId: query.id });
		if (query.askedBy === actor.personId) return;
		const about = {
			slug,
			title: locked.proof.document.title,
			by: actor.name,
			claim: labelOf(locked, query.claim) ?? ''
		};
		for (const asker of await mailboxes(tx, [query.askedBy])) {
			await queueMail(tx, now, asker, { event: 'query-answered', input: about });
		}
	});
}

/** Closes a query: who asked may, and so may anyone who could sign or pass the proof in their place. */
export async function closeQuery(ctx: Context, slug: string, input: CloseQuery): Promise<void> {
	const { actor, now } = ctx;
	requirePermission(actor, 'query-claim');
	await ctx.db.transaction(async (tx) => {
		const locked = await lockAnyProof(tx, slug);
		const query = openQuery(locked, input.queryId);
		const resource = { proof: locked.standing.people };
		const may =
			query.askedBy === actor.personId ||
			can(actor, 'sign-claim', resource) ||
			can(actor, 'pass-proof', resource);
		if (!may) throw new SteelyardError('not-permitted');
		await tx
			.update(queries)
			.set({ closedBy: actor.personId, closedAt: now })
			.where(eq(queries.id, query.id));
		await record(tx, ctx, 'query-closed', { pieceId: query.pieceId, queryId: query.id });
	});
}

function openQuery({ dossier }: LockedProof, queryId: string): QueryRow {
	const query = dossier.queries.find(({ id }) => id === queryId);
	if (!query) throw new SteelyardError('not-found');
	if (query.closedAt) throw new SteelyardError('query-closed');
	return query;
}

/** “2b”; null when the proof has no such claim. */
function labelOf({ standing }: LockedProof, claimId: string): string | null {
	return (
		standing.claims.find(({ examined }) => examined.claim.id === claimId)?.examined.label ?? null
	);
}

async function mailboxes(tx: Db, ids: readonly string[]) {
	if (ids.length === 0) return [];
	return tx
		.select({ name: people.name, email: people.email })
		.from(people)
		.where(and(inArray(people.id, [...ids]), isNull(people.disabledAt)));
}
