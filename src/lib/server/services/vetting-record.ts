/** The record of one revision's vetting: a step is added, never changed. */
import { and, eq } from 'drizzle-orm';
import { SteelyardError } from '../../errors.ts';
import type { VettingState } from '../../workflow/vetting.ts';
import type { Context } from '../context.ts';
import type { Db } from '../db/client.ts';
import { vettings } from '../db/schema/index.ts';

export interface Revision {
	calculator: string;
	revision: string;
}

export type StepRow = typeof vettings.$inferSelect;

/** The last step; null where there is no record. */
export async function lastStep(
	tx: Db,
	{ calculator, revision }: Revision
): Promise<StepRow | null> {
	const steps = await tx
		.select()
		.from(vettings)
		.where(and(eq(vettings.calculator, calculator), eq(vettings.revision, revision)))
		.orderBy(vettings.seq);
	return steps.at(-1) ?? null;
}

export async function writeStep(
	tx: Db,
	{ actor, now }: Pick<Context, 'actor' | 'now'>,
	{ calculator, revision }: Revision,
	state: VettingState,
	note: string
): Promise<void> {
	if (!actor) throw new SteelyardError('not-signed-in');
	await tx
		.insert(vettings)
		.values({ calculator, revision, state, personId: actor.personId, at: now, note });
}
