import { integer, pgTable, text } from 'drizzle-orm/pg-core';
import type { Hex } from '../../../themes/colour.ts';
import type { Face } from '../../../themes/theme.ts';
import { id, moment } from './columns.ts';
import { people } from './people.ts';

/** How frames look on a partner's pages. The id stands in the partner's page, so it never changes its meaning. */
export const themes = pgTable('themes', {
	id: id(),
	name: text().notNull().unique(),
	ground: text().$type<Hex>().notNull(),
	accent: text().$type<Hex>().notNull(),
	face: text().$type<Face>().notNull(),
	/** CSS pixels. */
	radius: integer().notNull(),
	savedBy: text()
		.notNull()
		.references(() => people.id),
	savedAt: moment().notNull()
});
