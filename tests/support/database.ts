/**
 * A migrated database in memory. Making one takes seconds, so each test file makes one and `fresh` empties it between
 * tests: fast, and every test starts from nothing.
 */
import { PGlite } from '@electric-sql/pglite';
import { getTableName, is, sql } from 'drizzle-orm';
import { PgTable } from 'drizzle-orm/pg-core';
import { fileURLToPath } from 'node:url';
import { connect, type Db } from '../../src/lib/server/db/client.ts';
import * as schema from '../../src/lib/server/db/schema/index.ts';

export const MIGRATIONS = fileURLToPath(new URL('../../drizzle', import.meta.url));

export interface TestDatabase {
	db: Db;
	/** Empties every table. */
	fresh(): Promise<void>;
	close(): Promise<void>;
}

export async function openTestDatabase(): Promise<TestDatabase> {
	const client = await PGlite.create('memory://');
	const db = await connect(client, MIGRATIONS);
	const tables = Object.values(schema)
		.filter((member) => is(member, PgTable))
		.map((table) => `"${getTableName(table)}"`);
	return {
		db,
		async fresh() {
			await db.execute(sql.raw(`TRUNCATE ${tables.join(', ')} RESTART IDENTITY CASCADE`));
		},
		close: () => client.close()
	};
}
