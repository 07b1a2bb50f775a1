/** People and their roles. Adding them is a matter of the house's own start for now; see seed.ts. */
import { eq, inArray } from 'drizzle-orm';
import type { Actor, Role } from '../../workflow/permissions.ts';
import type { PersonName } from '../../workflow/piece.ts';
import type { Context } from '../context.ts';
import type { Db } from '../db/client.ts';
import { people, personRoles } from '../db/schema/index.ts';
import { record } from './daybook.ts';
import { revokeSessions } from './session-end.ts';

/** One spelling for one mailbox. */
export function normalEmail(email: string): string {
	return email.trim().toLowerCase();
}

export interface NewPerson {
	email: string;
	name: string;
	roles: readonly Role[];
	/** argon2id, or null for sign-in by link alone. */
	passphraseHash: string | null;
}

/** Adds a person; the e-mail address must be new. Returns their id. */
export async function addPerson(
	ctx: Pick<Context, 'db' | 'actor' | 'now'>,
	person: NewPerson
): Promise<string> {
	return ctx.db.transaction(async (tx) => {
		const [added] = await tx
			.insert(people)
			.values({
				email: normalEmail(person.email),
				name: person.name,
				passphraseHash: person.passphraseHash,
				createdAt: ctx.now
			})
			.returning({ id: people.id });
		if (!added) throw new Error('The database took a person and gave back no id.');
		await setRolesIn(tx, added.id, person.roles);
		await record(tx, ctx, 'person-added', { addedId: added.id, roles: person.roles });
		return added.id;
	});
}

/** Replaces a person's roles; acts at their next request. */
export async function setRoles(
	ctx: Pick<Context, 'db' | 'actor' | 'now'>,
	personId: string,
	roles: readonly Role[]
): Promise<void> {
	await ctx.db.transaction(async (tx) => {
		await setRolesIn(tx, personId, roles);
		await record(tx, ctx, 'roles-changed', { changedId: personId, roles });
	});
}

async function setRolesIn(tx: Db, personId: string, roles: readonly Role[]): Promise<void> {
	await tx.delete(personRoles).where(eq(personRoles.personId, personId));
	if (roles.length > 0)
		await tx.insert(personRoles).values(roles.map((role) => ({ personId, role })));
}

/** Closes a person's account and ends their sessions, for good. Their signatures stay. */
export async function disablePerson(
	ctx: Pick<Context, 'db' | 'actor' | 'now'>,
	personId: string
): Promise<void> {
	await ctx.db.transaction(async (tx) => {
		await tx.update(people).set({ disabledAt: ctx.now }).where(eq(people.id, personId));
		await revokeSessions(tx, ctx.now, personId);
		await record(tx, ctx, 'person-disabled', { disabledId: personId });
	});
}

/** The person as an actor with the roles of this moment; null when there is no such person, or no longer. */
export async function readActor(db: Db, personId: string): Promise<Actor | null> {
	const rows = await db
		.select({ name: people.name, disabledAt: people.disabledAt, role: personRoles.role })
		.from(people)
		.leftJoin(personRoles, eq(personRoles.personId, people.id))
		.where(eq(people.id, personId));
	const [person] = rows;
	if (!person || person.disabledAt) return null;
	return { personId, name: person.name, roles: rows.flatMap(({ role }) => (role ? [role] : [])) };
}

/** A lookup from id to name for everyone named in `ids`. */
export async function nameBook(
	db: Db,
	ids: Iterable<string | null>
): Promise<(personId: string) => PersonName> {
	const wanted = [...new Set(ids)].filter((id) => id !== null);
	const rows =
		wanted.length > 0
			? await db
					.select({ id: people.id, name: people.name })
					.from(people)
					.where(inArray(people.id, wanted))
			: [];
	const names = new Map(rows.map(({ id, name }) => [id, name]));
	return (personId) => ({ personId, name: names.get(personId) ?? 'Someone who has left' });
}
