/** What a merge can't decide by itself: both versions of one place, kept until a person has chosen. */
import type { CalculatorSet } from '../physics/calculator.ts';
import type { Claim, WidgetDocument } from './document.ts';
import { claimIdsIn, claimsInCopyOrder, renamedClaims } from './merge-claims.ts';
import { freshId, identified, isIdentifiedList, type Identified } from './merge-parts.ts';
import { parseDocument } from './parse.ts';
import type { Stored } from './upgrades.ts';

/** One version of a place. */
export interface Side {
	/** A block, a step, a control, a claim, a formula, or the value of a field such as the title. */
	value: unknown;
	/** The claims that stand in it, as this side has them. */
	claims: readonly Claim[];
	/** Id of what it follows in its list on this side; null where it is the first, or in no list. */
	after: string | null;
}

/**
 * `both-changed`: in two ways. `taken-out`: by one side, changed by the other. `still-in-use`: taken out by one side,
 * while the other hangs something on it. `no-fit`: their change and mine don't hang together.
 */
export type AskReason = 'both-changed' | 'taken-out' | 'still-in-use' | 'no-fit';

export interface Ask {
	/** Where in the document: `title`, `blocks/opening`. */
	place: string;
	/** The list it is in; null for a field of the document itself. */
	list: string | null;
	/** Its id in the list, or the field’s name. */
	member: string;
	reason: AskReason;
	/** Null where this side has it no more, or never had it. */
	mine: Side | null;
	theirs: Side | null;
	/** Which of the two the merged document holds. */
	stands: 'mine' | 'theirs';
}

export type Choice = 'mine' | 'theirs' | 'both';

/** The choices that an ask has: two blocks can stand one after the other, two titles can't. */
export function choicesOf({ list, mine, theirs }: Ask): Choice[] {
	return list === 'blocks' && mine && theirs ? ['mine', 'theirs', 'both'] : ['mine', 'theirs'];
}

export type Decided = { ok: true; document: WidgetDocument } | { ok: false; message: string };

/**
 * The document with an ask decided. What stands already stays as it is, with all that was written in it since; `both`
 * puts the other version after it. Refused, with the first reason, when the result would not hang together.
 */
export function decideAsk(
	document: WidgetDocument,
	ask: Ask,
	choice: Choice,
	calculators: CalculatorSet
): Decided {
	if (choice === ask.stands) return { ok: true, document };
	const other = ask.stands === 'mine' ? ask.theirs : ask.mine;
	const changed =
		choice === 'both' && other ? withBeside(document, ask, other) : withSide(document, ask, other);
	const parsed = parseDocument(changed, calculators);
	return parsed.ok
		? parsed
		: { ok: false, message: parsed.issues[0]?.message ?? 'This doesn’t fit the rest any more.' };
}

function withSide(document: WidgetDocument, ask: Ask, side: Side | null): Stored {
	const stored: Stored = { ...document };
	if (ask.list === null) return { ...stored, [ask.member]: side?.value };
	const list = identified(stored[ask.list]);
	const at = list.findIndex(({ id }) => id === ask.member);
	const value = side?.value as Identified | undefined;
	if (at >= 0) list.splice(at, 1, ...(value ? [value] : []));
	else if (value) list.splice(placeAfter(list, side?.after ?? null), 0, value);
	return withClaims({ ...stored, [ask.list]: list }, ask.list === 'blocks' ? side : null);
}

/** The other version as a block of its own, right after the one that stands. */
function withBeside(document: WidgetDocument, ask: Ask, side: Side): Stored {
	const list = identified(document.blocks);
	const taken = new Set(list.map(({ id }) => id));
	const standing = new Set(document.claims.map(({ id }) => id));
	const names = new Map<string, string>();
	for (const { id } of side.claims) {
		if (standing.has(id)) names.set(id, freshId(id, standing));
		standing.add(names.get(id) ?? id);
	}
	const copy = {
		...(renamedClaims(side.value, names) as Identified),
		id: freshId(ask.member, taken)
	};
	list.splice(placeAfter(list, taken.has(ask.member) ? ask.member : side.after), 0, copy);
	const claims = side.claims.map((claim) => ({ ...claim, id: names.get(claim.id) ?? claim.id }));
	return withClaims({ ...document, blocks: list }, { ...side, claims });
}

function placeAfter(list: readonly Identified[], after: string | null): number {
	const at = list.findIndex(({ id }) => id === after);
	return at >= 0 ? at + 1 : after === null ? 0 : list.length;
}

/** Claims follow the copy: those that came with a block are added, those whose words went go too. */
function withClaims(stored: Stored, came: Side | null): Stored {
	const own = new Map(identified(stored.claims).map((claim) => [claim.id, claim]));
	for (const claim of came?.claims ?? []) own.set(claim.id, claim);
	const copy = claimsInCopyOrder(identified(stored.blocks), [...own.values()] as Claim[]);
	return { ...stored, ...copy };
}

/** A place of a document as a side of an ask; null where it isn’t there. */
export function sideIn(
	document: WidgetDocument | Stored,
	{ list, member }: Pick<Ask, 'list' | 'member'>
): Side | null {
	const stored: Stored = { ...document };
	if (list === null) return { value: stored[member], claims: [], after: null };
	const members = identified(stored[list]);
	const at = members.findIndex(({ id }) => id === member);
	const value = members[at];
	if (!value) return null;
	const claims = list === 'blocks' ? carriedClaims(value, stored) : [];
	return { value, claims, after: members[at - 1]?.id ?? null };
}

/** The claims of a side that stand in a block. */
function carriedClaims(block: unknown, stored: Stored): Claim[] {
	const placed = new Set(claimIdsIn(block));
	return isIdentifiedList(stored.claims)
		? (stored.claims.filter(({ id }) => placed.has(id)) as unknown as Claim[])
		: [];
}
