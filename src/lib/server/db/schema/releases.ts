import { integer, jsonb, pgTable, text, unique } from 'drizzle-orm/pg-core';
import type { WidgetDocument } from '../../../widget/document.ts';
import type { PublicAccount } from '../../press/account.ts';
import type { BundleManifest } from '../../press/bundle.ts';
import { id, moment } from './columns.ts';
import { people } from './people.ts';
import { pieces } from './pieces.ts';
import { proofs } from './proofs.ts';

/** What readers get, for good. Its bytes lie in the store under the hashes that `manifest` lists. */
export const releases = pgTable(
	'releases',
	{
		id: id(),
		pieceId: text()
			.notNull()
			.references(() => pieces.id),
		number: integer().notNull(),
		digest: text().notNull(),
		proofId: text()
			.notNull()
			.references(() => proofs.id),
		document: jsonb().$type<WidgetDocument>().notNull(),
		manifest: jsonb().$type<BundleManifest>().notNull(),
		/** What the public page says of it; null for releases from before this was kept. */
		account: jsonb().$type<PublicAccount>(),
		releasedBy: text()
			.notNull()
			.references(() => people.id),
		releasedAt: moment().notNull()
	},
	(table) => [
		unique('releases_number_unique').on(table.pieceId, table.number),
		unique('releases_proof_unique').on(table.proofId)
	]
);
