import { index, integer, jsonb, pgTable, text } from 'drizzle-orm/pg-core';
import type { PictureRecord } from '../../../pictures/record.ts';
import type { PictureFile, PictureType } from '../../../pictures/view.ts';
import { id, moment } from './columns.ts';
import { people } from './people.ts';

const person = () =>
	text()
		.notNull()
		.references(() => people.id);

/** The picture desk. Bytes lie in the store under the hashes that `files` lists; the row is written after them. */
export const pictures = pgTable(
	'pictures',
	{
		id: id(),
		/** As the file was called where it came from; never part of an address. */
		fileName: text().notNull(),
		/** What was uploaded: its kind, and the SHA-256 of its bytes in hex. */
		sourceType: text().$type<PictureType>().notNull(),
		sourceDigest: text().notNull(),
		/** In pixels, upright. */
		width: integer().notNull(),
		height: integer().notNull(),
		files: jsonb().$type<PictureFile[]>().notNull(),
		record: jsonb().$type<PictureRecord>().notNull(),
		/** Goes up by one with every save of the record. */
		version: integer().notNull().default(1),
		addedBy: person(),
		addedAt: moment().notNull(),
		savedBy: person(),
		savedAt: moment().notNull()
	},
	(table) => [index('pictures_added_index').on(table.addedAt)]
);
