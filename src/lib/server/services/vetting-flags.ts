/**
 * Pieces that rest on a revision which was withdrawn or superseded. Derived from the record of vetting and from what each
 * piece works with, whenever it is asked for: nothing has to run for a flag to appear, or to go again.
 */
import { and, desc, eq, inArray, or, sql } from 'drizzle-orm';
import { catalogue } from '../../physics/calculators/index.ts';
import type { WidgetDocument } from '../../widget/document.ts';
import { requirePermission } from '../../workflow/permissions.ts';
import type { CalculatorFlag } from '../../workflow/vetting-flags.ts';
import type { Context } from '../context.ts';
import type { Db } from '../db/client.ts';
import {
	houseCalculators,
	pieces,
	pieceWriters,
	proofs,
	releases,
	vettings
} from '../db/schema/index.ts';
import { nameBook } from './people.ts';
import { readRunningRevisions, type RunningRevision } from './stock.ts';

/** Every flag that stands, or those of one piece: withdrawn before superseded, live before draft, the newest first. */
export async function listFlags(ctx: Context, slug?: string): Promise<CalculatorFlag[]> {
	requirePermission(ctx.actor, 'read-proof');
	return readFlags(ctx.db, slug === undefined ? undefined : eq(pieces.slug, slug));
}

/** The flags of every piece that works with this calculator. */
export async function flagsOfCalculator(db: Db, calculator: string): Promise<CalculatorFlag[]> {
	const flags = await readFlags(db);
	return flags.filter((flag) => flag.calculator.id === calculator);
}

type Ended = typeof vettings.$inferSelect & { state: CalculatorFlag['state'] };

async function readFlags(db: Db, which?: ReturnType<typeof eq>): Promise<CalculatorFlag[]> {
	const ended = await readEnded(db);
	if (ended.length === 0) return [];
	const running = await readRunningRevisions(db);
	const names = await nameBook(
		db,
		ended.map(({ personId }) => personId)
	);
	const titles = await titlesOf(db, ended);
	const resting = await readResting(db, [...new Set(ended.map((row) => row.calculator))], which);
	const writers = await writersOf(
		db,
		resting.map(({ id }) => id)
	);
	const endedKeys = new Set(ended.map(keyOf));
	const flags = resting.flatMap((piece) =>
		ended.flatMap((row): CalculatorFlag[] => {
			const uses = (document: WidgetDocument | null, at?: Date) =>
				document !== null && workedWith(document, row.calculator, running, at).has(row.revision);
			const inDraft = uses(piece.draft);
			const isLive = uses(piece.released, piece.releasedAt ?? undefined);
			if (!inDraft && !isLive) return [];
			const now = runsNow(row.calculator, running);
			return [
				{
					piece: { slug: piece.slug, title: piece.draft.title },
					calculator: {
						id: row.calculator,
						title: titles.get(keyOf(row)) ?? row.calculator,
						revision: row.revision
					},
					state: row.state,
					by: names(row.personId),
					at: row.at.toISOString(),
					reason: row.state === 'withdrawn' ? row.note : '',
					release: isLive ? piece.number : null,
					inDraft,
					instead:
						now !== undefined && !endedKeys.has(keyOf({ ...row, revision: now })) ? now : null,
					writers: writers.get(piece.id) ?? []
				}
			];
		})
	);
	return flags.sort(byUrgency);
}

function byUrgency(a: CalculatorFlag, b: CalculatorFlag): number {
	const weight = ({ state, release }: CalculatorFlag) =>
		(state === 'withdrawn' ? 0 : 2) + (release === null ? 1 : 0);
	return weight(a) - weight(b) || b.at.localeCompare(a.at);
}

function keyOf({ calculator, revision }: { calculator: string; revision: string }): string {
	return `${calculator} ${revision}`;
}

/** Revisions whose record ends with being withdrawn or superseded. */
async function readEnded(db: Db): Promise<Ended[]> {
	const last = await db
		.selectDistinctOn([vettings.calculator, vettings.revision])
		.from(vettings)
		.orderBy(vettings.calculator, vettings.revision, desc(vettings.seq));
	return last.filter(
		(row): row is Ended => row.state === 'withdrawn' || row.state === 'superseded'
	);
}

async function titlesOf(db: Db, ended: readonly Ended[]): Promise<Map<string, string>> {
	const own = await db
		.select({
			calculator: houseCalculators.calculator,
			revision: houseCalculators.revision,
			title: sql<string>`${houseCalculators.definition} ->> 'title'`
		})
		.from(houseCalculators)
		.where(
			inArray(
				houseCalculators.calculator,
				ended.map(({ calculator }) => calculator)
			)
		);
	return new Map([
		...ended.flatMap((row): [string, string][] => {
			const builtIn = catalogue.get(row.calculator);
			return builtIn ? [[keyOf(row), builtIn.title]] : [];
		}),
		...own.map((row): [string, string] => [keyOf(row), row.title])
	]);
}

function runsNow(calculator: string, running: RunningRevision): string | undefined {
	return catalogue.get(calculator)?.revision ?? running(calculator);
}

/**
 * The revisions of a calculator that a document works with: of the house's own the one that runs, or ran `at` the moment
 * of a release; of the software's the one that runs, or for a release those its steps were wired with.
 */
function workedWith(
	{ steps }: WidgetDocument,
	calculator: string,
	running: RunningRevision,
	at?: Date
): Set<string> {
	const pinned = steps.filter((step) => step.calculator === calculator);
	if (pinned.length === 0) return new Set();
	if (at && catalogue.has(calculator)) return new Set(pinned.map(({ revision }) => revision));
	const one = at ? running(calculator, at) : runsNow(calculator, running);
	return new Set(one === undefined ? [] : [one]);
}

/** Pieces whose draft or live release has a step with one of the calculators. */
async function readResting(
	db: Db,
	calculators: readonly string[],
	which: ReturnType<typeof eq> | undefined
) {
	const live = db
		.selectDistinctOn([releases.pieceId], {
			pieceId: releases.pieceId,
			number: releases.number,
			document: releases.document,
			releasedAt: releases.releasedAt
		})
		.from(releases)
		.orderBy(releases.pieceId, desc(releases.number))
		.as('live');
	const has = calculators.flatMap((calculator) => {
		const step = JSON.stringify({ steps: [{ calculator }] });
		return [sql`${pieces.document} @> ${step}::jsonb`, sql`${live.document} @> ${step}::jsonb`];
	});
	return db
		.select({
			id: pieces.id,
			slug: pieces.slug,
			draft: pieces.document,
			number: live.number,
			released: live.document,
			releasedAt: live.releasedAt
		})
		.from(pieces)
		.leftJoin(live, eq(live.pieceId, pieces.id))
		.where(and(which, or(...has)))
		.orderBy(desc(pieces.savedAt), desc(pieces.id));
}

/** Everyone who has ever written a piece, by the piece's id. */
async function writersOf(db: Db, ids: readonly string[]): Promise<Map<string, string[]>> {
	if (ids.length === 0) return new Map();
	const now = await db
		.select({ pieceId: pieceWriters.pieceId, personId: pieceWriters.personId })
		.from(pieceWriters)
		.where(inArray(pieceWriters.pieceId, [...ids]));
	const before = await db
		.select({ pieceId: proofs.pieceId, writers: proofs.writers })
		.from(proofs)
		.where(inArray(proofs.pieceId, [...ids]));
	const started = await db
		.select({ pieceId: pieces.id, personId: pieces.createdBy })
		.from(pieces)
		.where(inArray(pieces.id, [...ids]));
	const wrote = new Map<string, Set<string>>();
	const add = (pieceId: string, people: readonly string[]) =>
		wrote.set(pieceId, new Set([...(wrote.get(pieceId) ?? []), ...people]));
	for (const { pieceId, personId } of [...started, ...now]) add(pieceId, [personId]);
	for (const { pieceId, writers } of before) add(pieceId, writers);
	return new Map([...wrote].map(([pieceId, people]) => [pieceId, [...people]]));
}
