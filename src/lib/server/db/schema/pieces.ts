import { index, integer, jsonb, pgTable, primaryKey, text, unique } from 'drizzle-orm/pg-core';
import type { WidgetDocument } from '../../../widget/document.ts';
import { EMPTY_SLIP, type Slip } from '../../../workflow/slip.ts';
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
		slip: jsonb().$type<Slip>().notNull().default(EMPTY_SLIP),
		document: jsonb().$type<WidgetDocument>().notNull(),
		/** Goes up by one with every save that changes the document. */
		version: integer().notNull().default(1),
		createdBy: person(),
		createdAt: moment().notNull(),
		savedBy: person(),
		savedAt: moment().notNull(),
		/** When the draft was put on the spike; null for one that is on the desk. */
		spikedAt: moment(),
		spikedBy: text().references(() => people.id)
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

/**
 * Earlier drafts: the first, the newest of what one person kept within two minutes, and every one that has a name or
 * that brought an older draft back. Unnamed ones go after ninety days.
 */
export const draftVersions = pgTable(
	'draft_versions',
	{
		pieceId: text()
			.notNull()
			.references(() => pieces.id),
		/** The draft's version that it is a copy of. */
		version: integer().notNull(),
		document: jsonb().$type<WidgetDocument>().notNull(),
		savedBy: person(),
		savedAt: moment().notNull(),
		/** When the first save came that this row stands for. */
		since: moment().notNull(),
		/** “Before the cut”: given by a person, so that it can be found again. */
		name: text(),
		namedBy: text().references(() => people.id),
		/** The version whose words this one brought back. */
		restoredFrom: integer()
	},
	(table) => [
		primaryKey({ columns: [table.pieceId, table.version] }),
		index('draft_versions_saved_index').on(table.savedAt)
	]
);
