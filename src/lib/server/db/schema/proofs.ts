import { index, integer, jsonb, pgTable, text, unique } from 'drizzle-orm/pg-core';
import type { ClaimCover } from '../../../widget/cover.ts';
import type { WidgetDocument } from '../../../widget/document.ts';
import { id, moment } from './columns.ts';
import { people } from './people.ts';
import { pieces } from './pieces.ts';

const piece = () =>
	text()
		.notNull()
		.references(() => pieces.id);
const person = () =>
	text()
		.notNull()
		.references(() => people.id);

/** A frozen, numbered copy of a draft. All checking is of a proof. */
export const proofs = pgTable(
	'proofs',
	{
		id: id(),
		pieceId: piece(),
		number: integer().notNull(),
		/** The draft's version that it is a copy of; 0 for proofs from before this was kept. */
		version: integer().notNull(),
		document: jsonb().$type<WidgetDocument>().notNull(),
		digest: text().notNull(),
		pulledBy: person(),
		pulledAt: moment().notNull(),
		/** Ids of everyone who changed the draft between the last release and this proof. */
		writers: jsonb().$type<string[]>().notNull(),
		passedBy: text().references(() => people.id),
		passedAt: moment()
	},
	(table) => [unique('proofs_number_unique').on(table.pieceId, table.number)]
);

/**
 * A scientist's name under one claim. It holds for as long as what it covers hashes to `coverHash`, on this proof and
 * on later ones; nothing marks it as lapsed.
 */
export const signatures = pgTable(
	'signatures',
	{
		id: id(),
		pieceId: piece(),
		claim: text().notNull(),
		coverHash: text().notNull(),
		cover: jsonb().$type<ClaimCover>().notNull(),
		/** The sentence as it stood, for the two-line difference after a lapse. */
		sentence: text().notNull(),
		proofId: text()
			.notNull()
			.references(() => proofs.id),
		personId: person(),
		signedAt: moment().notNull(),
		takenBackAt: moment()
	},
	(table) => [index('signatures_piece_index').on(table.pieceId, table.claim)]
);

/** A question about one claim, its answer, and its end. */
export const queries = pgTable(
	'queries',
	{
		id: id(),
		pieceId: piece(),
		proofId: text()
			.notNull()
			.references(() => proofs.id),
		claim: text().notNull(),
		question: text().notNull(),
		askedBy: person(),
		askedAt: moment().notNull(),
		answer: text(),
		answeredBy: text().references(() => people.id),
		answeredAt: moment(),
		closedBy: text().references(() => people.id),
		closedAt: moment()
	},
	(table) => [index('queries_piece_index').on(table.pieceId, table.claim)]
);
