/** Which pieces rest on a calculator: their draft, or what their readers get. */
import { desc, eq, sql } from 'drizzle-orm';
import type { WidgetDocument } from '../../widget/document.ts';
import { requirePermission } from '../../workflow/permissions.ts';
import type { Context } from '../context.ts';
import { pieces, releases } from '../db/schema/index.ts';

/** How one document uses the calculator. */
export interface UseIn {
	/** Revisions its steps are pinned to, each once. */
	revisions: string[];
	/** Claims tied to a reading of the calculator itself. */
	claims: number;
}

export interface CalculatorUse {
	slug: string;
	title: string;
	draft: UseIn | null;
	/** The newest release; older ones are no longer what readers get. */
	release: (UseIn & { number: number }) | null;
}

/** The pieces that use the calculator now, the one saved last first. */
export async function listUses(ctx: Context, calculatorId: string): Promise<CalculatorUse[]> {
	requirePermission(ctx.actor, 'read-calculators');
	const live = ctx.db
		.selectDistinctOn([releases.pieceId], {
			pieceId: releases.pieceId,
			number: releases.number,
			document: releases.document
		})
		.from(releases)
		.orderBy(releases.pieceId, desc(releases.number))
		.as('live');
	const step = JSON.stringify({ steps: [{ calculator: calculatorId }] });
	const rows = await ctx.db
		.select({
			slug: pieces.slug,
			draft: pieces.document,
			number: live.number,
			released: live.document
		})
		.from(pieces)
		.leftJoin(live, eq(live.pieceId, pieces.id))
		.where(sql`${pieces.document} @> ${step}::jsonb or ${live.document} @> ${step}::jsonb`)
		.orderBy(desc(pieces.savedAt), desc(pieces.id));
	return rows.map(({ slug, draft, number, released }) => {
		const use = released && useIn(released, calculatorId);
		return {
			slug,
			title: draft.title,
			draft: useIn(draft, calculatorId),
			release: use && number !== null ? { number, ...use } : null
		};
	});
}

function useIn({ steps, claims }: WidgetDocument, calculatorId: string): UseIn | null {
	const own = steps.filter(({ calculator }) => calculator === calculatorId);
	if (own.length === 0) return null;
	const ids = new Set(own.map(({ id }) => id));
	return {
		revisions: [...new Set(own.map(({ revision }) => revision))],
		claims: claims.filter(
			(claim) => claim.form !== 'exempt' && 'step' in claim.reading && ids.has(claim.reading.step)
		).length
	};
}
