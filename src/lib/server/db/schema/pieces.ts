import { index, integer, jsonb, pgTable, primaryKey, text, unique } from 'drizzle-orm/pg-core';
import type { WidgetDocument } from '../../../widget/document.ts';
import { id, moment } from './columns.ts';
import { people } from './people.ts';

const person = () =>
	text()
		.notNull()
		.references(() => people.id);

/** A piece is one explainer through all its proofs and releases; the row holds the working draft. */
export const pieces = pgTable(
	'pieces',
	{
		id: id(),
		slug: text().notNull(),
		document: jsonb().$type<WidgetDocument>().notNull(),
		/** Goes up by one with every save that changes the document. */
		version: integer().notNull().default(1),
		createdBy: person(),
		createdAt: moment().notNull(),
		savedBy: person(),
		savedAt: moment().notNull()
	},
	(table) => [
		unique('pieces_slug_unique').on(table.slug),
		index('pieces_saved_index').on(table.savedAt)
	]
);

/** Who has changed the draft since the last release, and at which version last: they can neither check nor pass it. */
export const pieceWriters = pgTable(
	'piece_writers',
	{
		pieceId: text()
			.notNull()
			.references(() => pieces.id),
		personId: person(),
		changedAt: moment().notNull(),
		/** The draft's version after their last change: versions are counted under the piece's lock, clocks aren't. */
		version: integer().notNull()
	},
	(table) => [primaryKey({ columns: [table.pieceId, table.personId] })]
);
