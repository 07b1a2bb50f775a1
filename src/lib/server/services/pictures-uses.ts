/** Where pictures stand: in drafts, proofs and releases. */
import { sql } from 'drizzle-orm';
import type { PictureUse } from '../../pictures/view.ts';
import type { Db } from '../db/client.ts';

/** By picture id; pieces by their slug. */
export type Uses = ReadonlyMap<string, PictureUse[]>;

interface Found extends Record<string, unknown> {
	picture: string;
	slug: string;
	title: string;
	place: 'draft' | 'proof' | 'release';
	number: number;
	newest: boolean;
}

/** The uses of one picture, or of all. */
export async function usesOf(db: Db, id?: string): Promise<Uses> {
	// With one id the containment comes first: it spares unfolding documents that don't hold it.
	const block = id === undefined ? { kind: 'picture' } : { kind: 'picture', picture: id };
	const holds = JSON.stringify({ blocks: [block] });
	const { rows } = (await db.execute(sql`
		with held as (
			select id as piece, document, 'draft' as place, 0 as number, true as newest
				from pieces where document @> ${holds}::jsonb
			union all
			select piece_id, document, 'proof', number, false
				from proofs where document @> ${holds}::jsonb
			union all
			select piece_id, document, 'release', number,
				number = (select max(other.number) from releases other where other.piece_id = releases.piece_id)
				from releases where document @> ${holds}::jsonb
		)
		select distinct block ->> 'picture' as picture, pieces.slug, pieces.document ->> 'title' as title,
			held.place, held.number, held.newest
		from held
		join pieces on pieces.id = held.piece
		cross join lateral jsonb_array_elements(held.document -> 'blocks') as block
		where block ->> 'kind' = 'picture' and block ->> 'picture' is not null
		order by pieces.slug, held.number
	`)) as { rows: Found[] };

	const uses = new Map<string, PictureUse[]>();
	for (const { picture, slug, title, place, number, newest } of rows) {
		if (id !== undefined && picture !== id) continue;
		const ofPicture = uses.get(picture) ?? [];
		uses.set(picture, ofPicture);
		let use = ofPicture.find((known) => known.slug === slug);
		if (!use) {
			use = { slug, title, draft: false, proofs: [], releases: [], live: false };
			ofPicture.push(use);
		}
		switch (place) {
			case 'draft':
				use.draft = true;
				break;
			case 'proof':
				use.proofs.push(number);
				break;
			case 'release':
				use.releases.push(number);
				use.live ||= newest;
		}
	}
	return uses;
}
