/** The letter that goes out when a revision which pieces rest on is withdrawn or superseded. */
import { and, eq, inArray, isNull } from 'drizzle-orm';
import type { CalculatorFlag } from '../../workflow/vetting-flags.ts';
import type { Context } from '../context.ts';
import type { Db } from '../db/client.ts';
import { people, personRoles, pieces, signatures } from '../db/schema/index.ts';
import { queueMail } from '../mail/outbox.ts';
import { flagsOfCalculator } from './vetting-flags.ts';

/**
 * One letter a person, whatever number of pieces: to who wrote them, who signed a number in them, and every editor; not
 * to who did it. Written in the transaction of the act; the screens need none of it.
 */
export async function queueFlagMail(
	tx: Db,
	{ actor, now }: Pick<Context, 'actor' | 'now'>,
	calculator: string,
	revisions: readonly string[]
): Promise<void> {
	const flags = (await flagsOfCalculator(tx, calculator)).filter((flag) =>
		revisions.includes(flag.calculator.revision)
	);
	const [first] = flags;
	if (!first || !actor) return;
	const slugs = [...new Set(flags.map(({ piece }) => piece.slug))];
	const concerned = await concernedBy(tx, flags, slugs);
	concerned.delete(actor.personId);
	for (const { id, name, email } of await mailboxes(tx, [...concerned.keys()])) {
		await queueMail(
			tx,
			now,
			{ name, email },
			{
				event: 'calculator-flagged',
				input: {
					calculator,
					title: first.calculator.title,
					revision: revisions.join(', '),
					state: first.state,
					by: actor.name,
					pieces: (concerned.get(id) ?? []).join(', ')
				}
			}
		);
	}
}

/** Slugs of the pieces that each person is told about, by the person's id. */
async function concernedBy(
	tx: Db,
	flags: readonly CalculatorFlag[],
	slugs: string[]
): Promise<Map<string, string[]>> {
	const editors = await tx
		.select({ personId: personRoles.personId })
		.from(personRoles)
		.where(eq(personRoles.role, 'editor'));
	const signers = await tx
		.selectDistinct({ personId: signatures.personId, slug: pieces.slug })
		.from(signatures)
		.innerJoin(pieces, eq(pieces.id, signatures.pieceId))
		.where(and(inArray(pieces.slug, slugs), isNull(signatures.takenBackAt)));
	const told = new Map<string, string[]>();
	const tell = (personId: string, slug: string) => {
		const before = told.get(personId) ?? [];
		if (!before.includes(slug)) told.set(personId, [...before, slug]);
	};
	for (const slug of slugs) {
		for (const { personId } of editors) tell(personId, slug);
		for (const signer of signers) if (signer.slug === slug) tell(signer.personId, slug);
		for (const { piece, writers } of flags)
			if (piece.slug === slug) for (const personId of writers) tell(personId, slug);
	}
	return told;
}

async function mailboxes(tx: Db, ids: readonly string[]) {
	if (ids.length === 0) return [];
	return tx
		.select({ id: people.id, name: people.name, email: people.email })
		.from(people)
		.where(and(inArray(people.id, [...ids]), isNull(people.disabledAt)))
		.orderBy(people.id);
}
