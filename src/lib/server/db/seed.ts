/**
 * What a house starts with, by STEELYARD_SEED. Pieces go through the same services and the same hands as any other:
 * written, checked, passed and released by different people. Every step does nothing when it was done before, so a
 * start that was cut short is finished by the next one.
 */
import { eq } from 'drizzle-orm';
import type { WidgetDocument } from '../../widget/document.ts';
import { emptyDocument } from '../../widget/empty-document.ts';
import { canonicalJson } from '../../widget/freeze.ts';
import { hashPassphrase } from '../auth/passphrase.ts';
import type { Context, Fixtures } from '../context.ts';
import { firstLight } from '../demo/first-light.ts';
import { DEMO_PASSPHRASE, DEMO_PEOPLE } from '../demo/people.ts';
import { sameDrop } from '../demo/same-drop.ts';
import { signClaim } from '../services/claims.ts';
import { addPerson, readActor } from '../services/people.ts';
import { createPiece } from '../services/draft-start.ts';
import { getPiece, saveDraft } from '../services/pieces.ts';
import { passConditions, passProof, pullProof } from '../services/proofs.ts';
import { releaseProof } from '../services/releases.ts';
import { signWhatCame } from '../services/vettings.ts';
import { people, pieces } from './schema/index.ts';

export type Seed = 'none' | 'people' | 'demo';

type Who = keyof typeof DEMO_PEOPLE;

interface DemoPiece {
	slug: string;
	document: WidgetDocument;
	writer: Who;
	scientist: Who;
	editor: Who;
}

const DEMO_PIECES: DemoPiece[] = [
	{
		slug: 'first-light-on-the-dial',
		document: firstLight,
		writer: 'tamsin',
		scientist: 'ama',
		editor: 'perpetua'
	},
	{
		slug: 'same-drop-same-blow',
		document: sameDrop,
		writer: 'tamsin',
		scientist: 'mateus',
		editor: 'perpetua'
	}
];

export async function seed(fixtures: Fixtures, what: Seed): Promise<void> {
	if (what === 'none') return;
	const ids = await seedPeople(fixtures);
	await signWhatCame(fixtures, new Date(), [ids.mateus, ids.ama]);
	if (what === 'people') return;
	for (const piece of DEMO_PIECES) await seedPiece(fixtures, ids, piece);
}

async function seedPeople(fixtures: Fixtures): Promise<Record<Who, string>> {
	const ids: [string, string][] = [];
	for (const [who, person] of Object.entries(DEMO_PEOPLE)) {
		const [known] = await fixtures.db
			.select({ id: people.id })
			.from(people)
			.where(eq(people.email, person.email));
		const id =
			known?.id ??
			(await addPerson(unattended(fixtures), {
				...person,
				passphraseHash: await hashPassphrase(DEMO_PASSPHRASE)
			}));
		ids.push([who, id]);
	}
	return Object.fromEntries(ids) as Record<Who, string>;
}

async function seedPiece(
	fixtures: Fixtures,
	ids: Record<Who, string>,
	piece: DemoPiece
): Promise<void> {
	const { slug, document } = piece;
	const writer = await as(fixtures, ids[piece.writer]);
	const made = await fixtures.db.$count(pieces, eq(pieces.slug, slug));
	if (made === 0) await createPiece(writer, { title: document.title, slug });
	const { version, releases, spiked, document: draft } = await getPiece(writer, slug);
	if (releases.length > 0 || spiked) return;
	// Someone has made the piece their own, or writes another one under this slug: it stays as they left it.
	const untouched = [emptyDocument(document.title), document].some(
		(left) => canonicalJson(left) === canonicalJson(draft)
	);
	if (!untouched) return;

	await saveDraft(writer, slug, { baseVersion: version, document });
	const { proofId } = await pullProof(writer, slug);
	const scientist = await as(fixtures, ids[piece.scientist]);
	for (const { id, state } of (await getPiece(scientist, slug)).proof?.claims ?? []) {
		if (state === 'unsigned' || state === 'lapsed')
			await signClaim(scientist, slug, { proofId, claim: id });
	}
	const editor = await as(fixtures, ids[piece.editor]);
	// A query that someone has asked meanwhile is theirs to settle.
	if ((await passConditions(editor, slug)).some(({ met }) => !met)) return;
	await passProof(editor, slug, { proofId });
	await releaseProof(editor, slug, { proofId });
}

function unattended(fixtures: Fixtures): Context {
	return {
		...fixtures,
		actor: null,
		session: null,
		client: { address: '', device: null },
		now: new Date()
	};
}

/** As if this person sat at the desk, signed in this minute. */
async function as(fixtures: Fixtures, personId: string): Promise<Context> {
	const now = new Date();
	return {
		...unattended(fixtures),
		actor: await readActor(fixtures.db, personId),
		session: { id: '', freshAt: now },
		now
	};
}
