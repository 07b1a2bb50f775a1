import { boolean, index, pgTable, text, unique } from 'drizzle-orm/pg-core';
import { id, moment } from './columns.ts';
import { people } from './people.ts';

/** One row a signed-in browser. The cookie carries nothing but the id; everything else is re-read on every request. */
export const sessions = pgTable(
	'sessions',
	{
		id: id(),
		personId: text()
			.notNull()
			.references(() => people.id),
		createdAt: moment().notNull(),
		lastSeenAt: moment().notNull(),
		/** The absolute end; the idle end follows from lastSeenAt. */
		expiresAt: moment().notNull(),
		revokedAt: moment(),
		/** When the person last proved who they are: signing and passing want it recent. */
		freshAt: moment().notNull()
	},
	(table) => [index('sessions_person_index').on(table.personId)]
);

/** A link sent by mail. The token and the browser's nonce are kept as SHA-256 only. */
export const signInLinks = pgTable(
	'sign_in_links',
	{
		id: id(),
		personId: text()
			.notNull()
			.references(() => people.id),
		tokenHash: text().notNull(),
		nonceHash: text().notNull(),
		createdAt: moment().notNull(),
		expiresAt: moment().notNull(),
		usedAt: moment()
	},
	(table) => [
		unique('sign_in_links_token_unique').on(table.tokenHash),
		index('sign_in_links_person_index').on(table.personId)
	]
);

/** Tries at signing in, counted for the limits; accounts, network addresses and devices are kept as hashes. */
export const signInAttempts = pgTable(
	'sign_in_attempts',
	{
		id: id(),
		kind: text({ enum: ['passphrase', 'link'] }).notNull(),
		accountHash: text().notNull(),
		addressHash: text().notNull(),
		/** The browser's device cookie; null when it has none yet. */
		deviceHash: text(),
		succeeded: boolean().notNull(),
		at: moment().notNull()
	},
	(table) => [
		index('sign_in_attempts_account_index').on(table.accountHash, table.at),
		index('sign_in_attempts_address_index').on(table.addressHash, table.at)
	]
);
