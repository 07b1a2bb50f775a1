/** The database: PGlite in the data folder, under the folder's lock, through Drizzle. Takes options, reads no settings. */
import type { PGlite } from '@electric-sql/pglite';
import type { PgDatabase, PgQueryResultHKT } from 'drizzle-orm/pg-core';
import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { lockDataFolder } from './lock.ts';
import * as schema from './schema/index.ts';

/**
 * Database and transaction alike. Inside `db.transaction(async (tx) => …)` use `tx` alone: there is one connection, and
 * asking `db` meanwhile waits for ever. Never await network, mail or password hashing in there.
 */
export type Db = PgDatabase<PgQueryResultHKT, typeof schema>;

export interface OpenDatabase {
	db: Db;
	/** The data folder's real path. */
	folder: string;
	close(): Promise<void>;
}

/** Locks the folder, opens the database in it (making it when new) and brings it up to the newest migration. */
export async function openDatabase(options: {
	dataDir: string;
	migrations: string;
}): Promise<OpenDatabase> {
	const lock = await lockDataFolder(options.dataDir);
	try {
		const { PGlite } = await import('@electric-sql/pglite');
		const client = await PGlite.create(join(lock.folder, 'database'));
		try {
			const db = await connect(client, options.migrations);
			return {
				db,
				folder: lock.folder,
				async close() {
					await client.close();
					await lock.release();
				}
			};
		} catch (error) {
			await client.close();
			throw error;
		}
	} catch (error) {
		await lock.release();
		throw error;
	}
}

/** Drizzle over an open PGlite, migrated. `migrations` is the folder with drizzle-kit's SQL. */
export async function connect(client: PGlite, migrations: string): Promise<Db> {
	if (!existsSync(join(migrations, 'meta/_journal.json'))) {
		throw new Error(
			`${migrations} holds no migrations. Start in the project’s folder, or set STEELYARD_MIGRATIONS to its drizzle folder.`
		);
	}
	const { drizzle } = await import('drizzle-orm/pglite');
	const { migrate } = await import('drizzle-orm/pglite/migrator');
	const db = drizzle({ client, schema, casing: 'snake_case' });
	await migrate(db, { migrationsFolder: migrations });
	return db;
}

/** SQLSTATE of a refused statement, or undefined: Drizzle wraps the driver's error. */
export function sqlState(error: unknown): string | undefined {
	const cause = error instanceof Error && error.cause ? error.cause : error;
	return cause instanceof Error && 'code' in cause && typeof cause.code === 'string'
		? cause.code
		: undefined;
}

export const UNIQUE_VIOLATION = '23505';
