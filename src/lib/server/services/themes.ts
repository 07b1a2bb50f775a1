/** Themes for partner pages: kept, taken out, and put before readers. */
import { asc, eq, sql } from 'drizzle-orm';
import { SteelyardError } from '../../errors.ts';
import type { SaveTheme } from '../../forms/save-theme.ts';
import { failingPairs } from '../../themes/contrast-check.ts';
import type { Theme } from '../../themes/theme.ts';
import { requirePermission } from '../../workflow/permissions.ts';
import type { PersonName } from '../../workflow/piece.ts';
import type { Context, Fixtures } from '../context.ts';
import type { Db } from '../db/client.ts';
import { themes } from '../db/schema/index.ts';
import { record } from './daybook.ts';
import { nameBook } from './people.ts';
import { refuseUnstorable } from './storable.ts';

export interface KeptTheme extends Theme {
	id: string;
	savedBy: PersonName;
	/** ISO 8601. */
	savedAt: string;
}

type ThemeRow = typeof themes.$inferSelect;

/** By name. */
export async function listThemes(ctx: Context): Promise<KeptTheme[]> {
	requirePermission(ctx.actor, 'read-themes');
	const rows = await readRows(ctx.db);
	const names = await nameBook(
		ctx.db,
		rows.map(({ savedBy }) => savedBy)
	);
	return rows.map((row) => ({
		id: row.id,
		...themeOf(row),
		savedBy: names(row.savedBy),
		savedAt: row.savedAt.toISOString()
	}));
}

/**
 * Keeps a new theme, or changes one, which changes every frame that shows it. Throws `theme-fails` with the sentence of
 * each pair that doesn't reach its contrast: such a theme is never kept. Returns its id.
 */
export async function saveTheme(ctx: Context, input: SaveTheme): Promise<string> {
	const { actor, now } = ctx;
	requirePermission(actor, 'edit-themes');
	refuseUnstorable(input);
	const { id, name, ground, accent, face, radiusPx } = input;
	const failing = failingPairs({ ground, accent });
	if (failing.length > 0)
		throw new SteelyardError('theme-fails', { problems: failing.map(({ says }) => says) });
	const saved = await ctx.db.transaction(async (tx) => {
		await tx.execute(sql`LOCK TABLE ${themes} IN EXCLUSIVE MODE`); // two may take one name at once
		const [namesake] = await tx.select({ id: themes.id }).from(themes).where(eq(themes.name, name));
		if (namesake && namesake.id !== id) throw new SteelyardError('theme-name-taken');
		const values = {
			name,
			ground,
			accent,
			face,
			radius: radiusPx,
			savedBy: actor.personId,
			savedAt: now
		};
		const [row] = id
			? await tx.update(themes).set(values).where(eq(themes.id, id)).returning({ id: themes.id })
			: await tx.insert(themes).values(values).returning({ id: themes.id });
		if (!row) throw new SteelyardError('not-found');
		await record(tx, ctx, 'theme-saved', { themeId: row.id });
		return row.id;
	});
	await shelveThemes(ctx);
	return saved;
}

/** Frames that name it go back to the house's own look. */
export async function deleteTheme(ctx: Context, id: string): Promise<void> {
	requirePermission(ctx.actor, 'edit-themes');
	await ctx.db.transaction(async (tx) => {
		const gone = await tx.delete(themes).where(eq(themes.id, id)).returning({ id: themes.id });
		if (gone.length === 0) throw new SteelyardError('not-found');
		await record(tx, ctx, 'theme-deleted', { themeId: id });
	});
	await shelveThemes(ctx);
}

/** Puts all themes before readers; at start and after each change. */
export async function shelveThemes({ db, shelf }: Pick<Fixtures, 'db' | 'shelf'>): Promise<void> {
	const rows = await readRows(db);
	await shelf.themes.keep(new Map(rows.map((row) => [row.id, themeOf(row)])));
}

function readRows(db: Db): Promise<ThemeRow[]> {
	return db.select().from(themes).orderBy(asc(themes.name));
}

function themeOf({ name, ground, accent, face, radius }: ThemeRow): Theme {
	return { name, ground, accent, face, radiusPx: radius };
}
