import { bigint, index, jsonb, pgTable, primaryKey, text } from 'drizzle-orm/pg-core';
import type { HouseDefinition } from '../../../physics/house/definition.ts';
import { VETTING_STATES } from '../../../workflow/vetting.ts';
import { moment } from './columns.ts';
import { people } from './people.ts';

const person = () =>
	text()
		.notNull()
		.references(() => people.id);

/** Calculators that this house added, as data: one row a revision, which never changes. */
export const houseCalculators = pgTable(
	'house_calculators',
	{
		calculator: text().notNull(),
		revision: text().notNull(),
		definition: jsonb().$type<HouseDefinition>().notNull(),
		/** SHA-256 of the definition's canonical JSON, in hex. */
		digest: text().notNull(),
		proposedBy: person(),
		proposedAt: moment().notNull()
	},
	(table) => [primaryKey({ columns: [table.calculator, table.revision] })]
);

/** Steps in the vetting of a revision, built in or the house's own: the last one says where it stands. */
export const vettings = pgTable(
	'vettings',
	{
		seq: bigint({ mode: 'number' }).primaryKey().generatedAlwaysAsIdentity(),
		calculator: text().notNull(),
		revision: text().notNull(),
		state: text({ enum: VETTING_STATES }).notNull(),
		personId: person(),
		at: moment().notNull(),
		note: text().notNull()
	},
	(table) => [index('vettings_revision_index').on(table.calculator, table.revision)]
);
