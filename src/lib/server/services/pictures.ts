/** The picture desk: pictures brought in, described, deleted. */
import { count, desc, eq, sql } from 'drizzle-orm';
import { SteelyardError } from '../../errors.ts';
import { storeKey } from '../../pictures/address.ts';
import { emptyRecord } from '../../pictures/record.ts';
import type { SavePicture } from '../../pictures/save-picture.ts';
import type { PictureFile, PictureUse, PictureView } from '../../pictures/view.ts';
import { requirePermission } from '../../workflow/permissions.ts';
import type { Context } from '../context.ts';
import type { Db } from '../db/client.ts';
import { pictures } from '../db/schema/index.ts';
import { dropFiles, findFile, keepFiles } from '../pictures/keep.ts';
import { kindOf, refuseDisguise } from '../pictures/kind.ts';
import { received } from '../pictures/receive.ts';
import { redraw } from '../pictures/redraw.ts';
import { record } from './daybook.ts';
import { nameBook } from './people.ts';
import { usesOf, type Uses } from './pictures-uses.ts';
import { refuseUnstorable } from './storable.ts';

export type PictureRow = typeof pictures.$inferSelect;

/** Pictures one person may have brought to the desk. */
export const MOST_PICTURES = 500;
const LONGEST_NAME = 120;

export interface Upload {
	body: AsyncIterable<Uint8Array>;
	fileName: string;
	/** As the sender declares it; empty when they don’t. */
	declaredType: string;
}

/**
 * Takes a picture in: received to a file, judged by its bytes, drawn anew, stored, and then written down. Throws
 * `picture-refused` with its own sentence; whatever fails, nothing of it stays.
 */
export async function addPicture(ctx: Context, upload: Upload): Promise<PictureView> {
	const { actor, now, db, store } = ctx;
	requirePermission(actor, 'add-picture');
	const fileName = plainName(upload.fileName);
	await refuseFull(db, actor.personId);
	return received(upload.body, async ({ digest, head, read }) => {
		const sourceType = kindOf(await head());
		refuseDisguise(sourceType, { fileName, declaredType: upload.declaredType });
		const { width, height, files } = await redraw(read, sourceType);
		const row = await keepFiles(store, files, () =>
			db.transaction(async (tx) => {
				await refuseFull(tx, actor.personId);
				const [added] = await tx
					.insert(pictures)
					.values({
						fileName,
						sourceType,
						sourceDigest: digest,
						width,
						height,
						files: files.map(({ content: _content, ...file }) => file),
						record: emptyRecord(),
						addedBy: actor.personId,
						addedAt: now,
						savedBy: actor.personId,
						savedAt: now
					})
					.returning();
				if (!added) throw new Error('The database took a picture and gave back no row.');
				await record(tx, ctx, 'picture-added', { pictureId: added.id, digest });
				return added;
			})
		);
		return viewOf(row, () => actor.name, new Map());
	});
}

/** Every picture, the newest first. */
export async function listPictures(ctx: Context): Promise<PictureView[]> {
	requirePermission(ctx.actor, 'read-pictures');
	const rows = await ctx.db
		.select()
		.from(pictures)
		.orderBy(desc(pictures.addedAt), desc(pictures.id));
	return viewsOf(ctx.db, rows);
}

export async function getPicture(ctx: Context, id: string): Promise<PictureView> {
	requirePermission(ctx.actor, 'read-pictures');
	return viewRow(ctx.db, await findPicture(ctx.db, id));
}

/** What is stored of a picture, for those who print it. */
export async function pictureFiles(
	ctx: Pick<Context, 'db'>,
	id: string
): Promise<(PictureFile & { key: string })[]> {
	const { files } = await findPicture(ctx.db, id);
	return files.map((file) => ({ ...file, key: storeKey(file) }));
}

/** The bytes of one stored width, by its name. */
export async function readPictureFile(
	ctx: Context,
	name: string
): Promise<{ file: PictureFile; bytes: Uint8Array }> {
	requirePermission(ctx.actor, 'read-pictures');
	const file = await findFile(ctx.db, name);
	const bytes = file && (await ctx.store.get(storeKey(file)));
	if (!file || !bytes) throw new SteelyardError('not-found');
	return { file, bytes };
}

/** Keeps a record, complete or not, on top of `baseVersion`. */
export async function savePictureRecord(
	ctx: Context,
	id: string,
	input: SavePicture
): Promise<PictureView> {
	const { actor, now } = ctx;
	requirePermission(actor, 'record-picture');
	refuseUnstorable(input.record);
	const row = await ctx.db.transaction(async (tx) => {
		const picture = await lockPicture(tx, id);
		if (picture.version !== input.baseVersion)
			throw new SteelyardError('picture-changed', { picture: await viewRow(tx, picture) });
		const [saved] = await tx
			.update(pictures)
			.set({
				record: input.record,
				version: sql`${pictures.version} + 1`,
				savedBy: actor.personId,
				savedAt: now
			})
			.where(eq(pictures.id, id))
			.returning();
		if (!saved) throw new SteelyardError('not-found');
		await record(tx, ctx, 'picture-recorded', { pictureId: id, version: saved.version });
		return saved;
	});
	return viewRow(ctx.db, row);
}

/** Deletes a picture that no draft, proof or release holds, with its files. */
export async function deletePicture(ctx: Context, id: string): Promise<void> {
	requirePermission(ctx.actor, 'delete-picture');
	const files = await ctx.db.transaction(async (tx) => {
		const picture = await lockPicture(tx, id);
		const uses = (await usesOf(tx, id)).get(id) ?? [];
		if (uses.length > 0) throw new SteelyardError('picture-used', { uses });
		await tx.delete(pictures).where(eq(pictures.id, id));
		await record(tx, ctx, 'picture-deleted', { pictureId: id, digest: picture.sourceDigest });
		return picture.files;
	});
	await dropFiles(ctx, files);
}

/** The row, held until the transaction ends. */
export async function lockPicture(tx: Db, id: string): Promise<PictureRow> {
	const [row] = await tx.select().from(pictures).where(eq(pictures.id, id)).for('update');
	if (!row) throw new SteelyardError('not-found');
	return row;
}

async function findPicture(db: Db, id: string): Promise<PictureRow> {
	const [row] = await db.select().from(pictures).where(eq(pictures.id, id));
	if (!row) throw new SteelyardError('not-found');
	return row;
}

async function refuseFull(db: Db, personId: string): Promise<void> {
	const [row] = await db
		.select({ many: count() })
		.from(pictures)
		.where(eq(pictures.addedBy, personId));
	if ((row?.many ?? 0) >= MOST_PICTURES) throw new SteelyardError('pictures-full');
}

/** Only ever shown: no folders, no control or direction marks, and short. */
function plainName(given: string): string {
	const last = given.replaceAll('\\', '/').split('/').at(-1) ?? '';
	const plain = last
		.replace(/[\p{C}\p{Zl}\p{Zp}]/gu, '')
		.trim()
		.normalize('NFC');
	const ending = /\.[^.]{1,12}$/.exec(plain)?.[0] ?? '';
	const stem = [...plain.slice(0, plain.length - ending.length)];
	return `${stem.slice(0, LONGEST_NAME - ending.length).join('') || 'picture'}${ending}`;
}

async function viewRow(db: Db, row: PictureRow): Promise<PictureView> {
	const [view] = await viewsOf(db, [row]);
	if (!view) throw new SteelyardError('not-found');
	return view;
}

async function viewsOf(db: Db, rows: readonly PictureRow[]): Promise<PictureView[]> {
	const names = await nameBook(
		db,
		rows.flatMap(({ addedBy, savedBy }) => [addedBy, savedBy])
	);
	const uses = await usesOf(db, rows.length === 1 ? rows[0]?.id : undefined);
	return rows.map((row) => viewOf(row, (id) => names(id).name, uses));
}

function viewOf(row: PictureRow, nameOf: (personId: string) => string, uses: Uses): PictureView {
	const { id, fileName, sourceType, width, height, files, version } = row;
	const used: PictureUse[] = uses.get(id) ?? [];
	return {
		id,
		fileName,
		sourceType,
		width,
		height,
		files,
		record: row.record,
		version,
		addedBy: nameOf(row.addedBy),
		addedAt: row.addedAt.toISOString(),
		savedBy: nameOf(row.savedBy),
		savedAt: row.savedAt.toISOString(),
		uses: used
	};
}
