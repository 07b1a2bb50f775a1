import { pgTable, primaryKey, text, unique } from 'drizzle-orm/pg-core';
import { ROLES } from '../../../workflow/permissions.ts';
import { id, moment } from './columns.ts';

export const people = pgTable(
	'people',
	{
		id: id(),
		/** Lower case, so that one person has one row. */
		email: text().notNull(),
		name: text().notNull(),
		/** argon2id; null for people who sign in by link alone. */
		passphraseHash: text(),
		createdAt: moment().notNull(),
		disabledAt: moment()
	},
	(table) => [unique('people_email_unique').on(table.email)]
);

export const personRoles = pgTable(
	'person_roles',
	{
		personId: text()
			.notNull()
			.references(() => people.id),
		role: text({ enum: ROLES }).notNull()
	},
	(table) => [primaryKey({ columns: [table.personId, table.role] })]
);
