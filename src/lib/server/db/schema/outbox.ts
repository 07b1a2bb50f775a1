import { index, integer, jsonb, pgTable, text } from 'drizzle-orm/pg-core';
import { id, moment } from './columns.ts';

/** Mail to be sent, written in the transaction of what it tells about. The row's id makes the Message-ID. */
export const outbox = pgTable(
	'outbox',
	{
		id: id(),
		event: text().notNull(),
		toName: text().notNull(),
		toAddress: text().notNull(),
		/** What the template needs; never a secret. */
		input: jsonb().$type<Record<string, string>>().notNull(),
		createdAt: moment().notNull(),
		/** Not to be tried before this; moves back after a failure. */
		dueAt: moment().notNull(),
		/** Of no use to anyone after this; null when it never grows old. */
		goodUntil: moment(),
		/** While this lies ahead, one sender has the row. */
		leaseUntil: moment(),
		attempts: integer().notNull().default(0),
		lastError: text(),
		sentAt: moment(),
		/** Given up after the last attempt. */
		parkedAt: moment()
	},
	(table) => [index('outbox_due_index').on(table.sentAt, table.dueAt)]
);
