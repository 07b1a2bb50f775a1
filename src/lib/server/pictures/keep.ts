/**
 * The bytes of pictures in the store. Puts and removals take turns, so that nothing is removed that another upload has
 * just found there and relies on; the house is one process, which `db/lock.ts` sees to.
 */
import { sql } from 'drizzle-orm';
import { SteelyardError } from '../../errors.ts';
import { fileNamed, storeKey } from '../../pictures/address.ts';
import type { PictureFile } from '../../pictures/view.ts';
import type { Fixtures } from '../context.ts';
import type { Db } from '../db/client.ts';
import { pictures } from '../db/schema/index.ts';
import type { ObjectStore } from '../store/object-store.ts';
import type { Redrawn } from './redraw.ts';
import { Turns } from './turns.ts';

const PREFIX = 'pictures/';
/** What nothing refers to is left alone for so long, for the sake of a database that was put back to an earlier hour. */
export const SWEPT_AFTER_MS = 24 * 3_600_000;

const turnsOfStores = new WeakMap<ObjectStore, Turns>();
function inTurn<T>(store: ObjectStore, work: () => Promise<T>): Promise<T> {
	const turns = turnsOfStores.get(store) ?? new Turns(1);
	turnsOfStores.set(store, turns);
	return turns.take(work);
}

/** Puts the files that aren't there yet, then runs `commit`. When either fails, what was put is taken away again. */
export async function keepFiles<T>(
	store: ObjectStore,
	files: Redrawn['files'],
	commit: () => Promise<T>
): Promise<T> {
	return inTurn(store, async () => {
		const put: string[] = [];
		try {
			for (const file of files) {
				const key = storeKey(file);
				if (await store.head(key)) continue;
				put.push(key); // first: a put without an answer may have arrived
				await store.put(key, file.content, file.type);
			}
			return await commit();
		} catch (error) {
			await removeAll(store, put);
			throw error;
		}
	});
}

/** Removes the files that no picture refers to any more. */
export async function dropFiles(
	{ db, store }: Pick<Fixtures, 'db' | 'store'>,
	files: readonly PictureFile[]
): Promise<void> {
	await inTurn(store, async () => {
		const used = await referredTo(db);
		await removeAll(
			store,
			files.map(storeKey).filter((key) => !used.has(key))
		);
	});
}

/** Removes what an upload left behind that was cut short between the store and the database; how many objects. */
export async function sweepPictures(
	{ db, store }: Pick<Fixtures, 'db' | 'store'>,
	now: Date
): Promise<number> {
	return inTurn(store, async () => {
		const kept = await store.list(PREFIX);
		const used = await referredTo(db);
		const orphans = kept.filter(
			({ key, putAt }) => !used.has(key) && now.getTime() - putAt.getTime() >= SWEPT_AFTER_MS
		);
		for (const { key } of orphans) await store.remove(key);
		return orphans.length;
	});
}

async function referredTo(db: Db): Promise<Set<string>> {
	const rows = await db.select({ files: pictures.files }).from(pictures);
	return new Set(rows.flatMap(({ files }) => files.map(storeKey)));
}

/** As far as the store answers; the sweep finds the rest. */
async function removeAll(store: ObjectStore, keys: readonly string[]): Promise<void> {
	for (const key of keys) {
		try {
			await store.remove(key);
		} catch (error) {
			if (!(error instanceof SteelyardError && error.code === 'store-away')) throw error;
			return;
		}
	}
}

/** A stored width by its name; null when no picture has it. */
export async function findFile(db: Db, name: string): Promise<PictureFile | null> {
	const named = fileNamed(name);
	if (!named) return null;
	const rows = await db
		.select({ files: pictures.files })
		.from(pictures)
		.where(sql`${pictures.files} @> ${JSON.stringify([named])}::jsonb`)
		.limit(1);
	return rows[0]?.files.find(({ digest }) => digest === named.digest) ?? null;
}
