import { eq } from 'drizzle-orm';
import { SteelyardError } from '../../errors.ts';
import { copyAsMarkdown } from '../../export/copy-as-markdown.ts';
import { benchSet } from '../../widget/bench-set.ts';
import { evaluate } from '../../widget/evaluate.ts';
import { requirePermission } from '../../workflow/permissions.ts';
import type { Context } from '../context.ts';
import { pieces } from '../db/schema/index.ts';
import { calculatorsOf } from './stock.ts';
import { readStored } from './stored-document.ts';

/** The working draft’s copy as Markdown, at its first settings. The slug is letters, digits and dashes, fit for a file name. */
export async function exportCopy(
	ctx: Context,
	slug: string
): Promise<{ fileName: string; markdown: string }> {
	requirePermission(ctx.actor, 'read-proof');
	const [piece] = await ctx.db
		.select({ document: pieces.document, version: pieces.version })
		.from(pieces)
		.where(eq(pieces.slug, slug));
	if (!piece) throw new SteelyardError('not-found');
	const house = await calculatorsOf(ctx);
	const document = readStored(piece.document, house);
	const calculators = benchSet(document, house);
	const evaluation = evaluate(document, {}, calculators);
	return {
		fileName: `${slug}-version-${piece.version}.md`,
		markdown: copyAsMarkdown(document, evaluation, calculators)
	};
}
