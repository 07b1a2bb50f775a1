import { bigint, index, jsonb, pgTable, text } from 'drizzle-orm/pg-core';
import { moment } from './columns.ts';

/** What happened, by whom: rows are added in the transaction they tell about, and a trigger refuses any change. */
export const daybook = pgTable(
	'daybook',
	{
		seq: bigint({ mode: 'number' }).primaryKey().generatedAlwaysAsIdentity(),
		at: moment().notNull(),
		personId: text(),
		event: text().notNull(),
		pieceId: text(),
		details: jsonb().$type<Record<string, unknown>>().notNull()
	},
	(table) => [index('daybook_piece_index').on(table.pieceId, table.seq)]
);
