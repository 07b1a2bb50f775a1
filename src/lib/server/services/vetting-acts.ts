/** What scientists do to a revision, the house's own or the software's: sign it, take it out of use, test it again. */
import { SteelyardError } from '../../errors.ts';
import type {
	RetestCalculator,
	VetCalculator,
	WithdrawCalculator
} from '../../forms/house-calculator.ts';
import type { Calculator } from '../../physics/calculator.ts';
import { catalogue } from '../../physics/calculators/index.ts';
import { checkRows } from '../../physics/check-values.ts';
import { requirePermission } from '../../workflow/permissions.ts';
import {
	checksAgree,
	compareRevisions,
	mayAnswerDifferently,
	mayBecome,
	mayRetest,
	requireStep,
	type VettingState
} from '../../workflow/vetting.ts';
import type { Context } from '../context.ts';
import type { Db } from '../db/client.ts';
import { record } from './daybook.ts';
import { revisionsOf, settled, type HouseRow } from './house-calculators.ts';
import { requireFresh } from './sessions.ts';
import { refuseUnstorable } from './storable.ts';
import { inTransaction } from './transaction.ts';
import { queueFlagMail } from './vetting-flag-mail.ts';
import { lastStep, writeStep, type Revision } from './vetting-record.ts';

/**
 * A second scientist's signature: from now on it may be published, and the revisions before it are superseded. The people
 * of pieces that went out with one of those are written to, where answers may differ.
 */
export async function vetCalculator(ctx: Context, input: VetCalculator): Promise<void> {
	const { actor } = ctx;
	requirePermission(actor, 'vet-calculator');
	refuseUnstorable(input);
	await inTransaction(ctx, async (tx) => {
		const { own, others, builtIn } = await find(tx, input);
		const last = await lastStep(tx, input);
		const proposer = own?.proposedBy ?? last?.personId;
		requirePermission(actor, 'vet-calculator', {
			proof: null,
			...(proposer === undefined ? {} : { proposer })
		});
		await requireFresh(ctx, tx);
		requireStep(standing(last?.state, builtIn), 'vetted');
		// What runs now, not what ran when it was proposed.
		if (own) settled(own.definition);
		if (builtIn) requireAgreement(builtIn);

		await writeStep(tx, ctx, input, 'vetted', input.note);
		const superseded: string[] = [];
		for (const older of others) {
			if (compareRevisions(older.revision, input.revision) >= 0) continue;
			if (!mayBecome((await lastStep(tx, older))?.state ?? 'new', 'superseded')) continue;
			await writeStep(tx, ctx, older, 'superseded', `Revision ${input.revision} was vetted.`);
			if (mayAnswerDifferently(older.revision, input.revision)) superseded.push(older.revision);
		}
		await queueFlagMail(tx, ctx, input.calculator, superseded);
		await record(tx, ctx, 'calculator-vetted', about(input, own));
	});
}

/**
 * Takes a revision out of use, with a reason. What was published with it stays as it is; the people of the pieces that
 * rest on it are written to, and find them flagged.
 */
export async function withdrawCalculator(ctx: Context, input: WithdrawCalculator): Promise<void> {
	requirePermission(ctx.actor, 'withdraw-calculator');
	refuseUnstorable(input);
	await inTransaction(ctx, async (tx) => {
		const { own, builtIn } = await find(tx, input);
		await requireFresh(ctx, tx);
		requireStep(standing((await lastStep(tx, input))?.state, builtIn), 'withdrawn');
		await writeStep(tx, ctx, input, 'withdrawn', input.note);
		await queueFlagMail(tx, ctx, input.calculator, [input.revision]);
		await record(tx, ctx, 'calculator-withdrawn', about(input, own));
	});
}

/** Puts a withdrawn calculator of the software to the test again, with a reason; a second scientist then signs it. */
export async function retestCalculator(ctx: Context, input: RetestCalculator): Promise<void> {
	requirePermission(ctx.actor, 'propose-calculator');
	refuseUnstorable(input);
	await ctx.db.transaction(async (tx) => {
		const { own, builtIn } = await find(tx, input);
		const state = standing((await lastStep(tx, input))?.state, builtIn);
		if (!builtIn || state === 'new' || !mayRetest({ state, house: false }))
			throw new SteelyardError('vetting-out-of-order', { from: state, to: 'tested' });
		requireAgreement(builtIn);
		await writeStep(tx, ctx, input, 'tested', `${checksAgree(builtIn.checks)} ${input.note}`);
		await record(tx, ctx, 'calculator-retested', about(input, own));
	});
}

interface Found {
	/** The house's row; null for a calculator of the software. */
	own: HouseRow | null;
	/** Every revision of the house's calculator. */
	others: HouseRow[];
	/** The software's, in the revision that runs; null for one of the house's own. */
	builtIn: Calculator | null;
}

/** Throws `not-found` for a revision that is neither kept here nor the one the software runs. */
async function find(tx: Db, { calculator, revision }: Revision): Promise<Found> {
	const builtIn = catalogue.get(calculator) ?? null;
	if (builtIn?.revision === revision) return { own: null, others: [], builtIn };
	const others = await revisionsOf(tx, calculator);
	const own = others.find((each) => each.revision === revision);
	if (!own) throw new SteelyardError('not-found');
	return { own, others, builtIn: null };
}

/** What came with the software stands as vetted until the house says otherwise. */
function standing(
	state: VettingState | undefined,
	builtIn: Calculator | null
): VettingState | 'new' {
	return state ?? (builtIn ? 'vetted' : 'new');
}

function requireAgreement(calculator: Calculator): void {
	const problems = checkRows(calculator)
		.filter(({ agrees }) => !agrees)
		.map(({ check, refusal }) => ({
			path: `checks.${check.id}`,
			code: 'check-disagrees',
			says: `“${check.statement}” doesn’t agree.`,
			mend: refusal ?? ''
		}));
	if (problems.length > 0) throw new SteelyardError('calculator-broken', { problems });
}

function about({ calculator, revision }: Revision, own: HouseRow | null) {
	return { calculator, revision, ...(own ? { digest: own.digest } : {}) };
}
