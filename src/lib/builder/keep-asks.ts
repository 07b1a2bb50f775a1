/** Questions that merges leave open: whose the other version is, and how they follow what happens later. */
import type { WidgetDocument } from '../widget/document.ts';
import { sideIn, type Ask } from '../widget/merge-ask.ts';
import { same } from '../widget/merge-parts.ts';

/** An ask with whose the other version is. */
export interface OpenAsk extends Ask {
	/** One for each place and other person. */
	id: string;
	by: { personId: string; name: string };
	/** When their version was kept; ISO 8601, UTC. */
	at: string;
}

export function openAsk(ask: Ask, by: OpenAsk['by'], at: string): OpenAsk {
	return { ...ask, id: `${ask.place}@${by.personId}`, by, at };
}

/** A merge, as the asks that were open before it see it. */
export interface MergeDone {
	fresh: readonly OpenAsk[];
	/** One's own document, theirs, and what the merge made of them. */
	before: WidgetDocument;
	theirs: WidgetDocument;
	after: WidgetDocument;
	by: OpenAsk['by'];
}

/**
 * The open asks after a merge. A newer ask about the same place and person takes the place of an older one, unless one's
 * own words are in nothing but the older one. Where the merge took their newer version, the ask goes on with that; where
 * they have written by now what stands here, there is nothing left to ask.
 */
export function followedAsks(
	open: readonly OpenAsk[],
	{ fresh, before, theirs, after, by }: MergeDone
): OpenAsk[] {
	const isAgreed = (ask: OpenAsk) =>
		ask.stands === 'mine' &&
		ask.by.personId === by.personId &&
		same(sideIn(theirs, ask)?.value ?? null, sideIn(before, ask)?.value ?? null);
	const followed = open
		.filter((ask) => ask.stands === 'theirs' || fresh.every(({ id }) => id !== ask.id))
		.filter((ask) => !isAgreed(ask))
		.map((ask) => follow(ask, before, after));
	const taken = new Set(followed.map(({ id }) => id));
	const named = fresh.map((ask) =>
		taken.has(ask.id) ? { ...ask, id: `${ask.id} ${ask.at}` } : ask
	);
	return [...followed, ...named].filter((ask) => !isMoot(ask, after));
}

function follow(ask: OpenAsk, before: WidgetDocument, after: WidgetDocument): OpenAsk {
	const was = sideIn(before, ask);
	const is = sideIn(after, ask);
	if (same(was?.value ?? null, is?.value ?? null)) return ask;
	return { ...ask, mine: ask.stands === 'mine' ? was : ask.mine, theirs: is, stands: 'theirs' };
}

/** Both sides are in the sheet by now, or are one and the same: there is nothing left to ask. */
export function isMoot(ask: OpenAsk, document: WidgetDocument): boolean {
	const standing = sideIn(document, ask)?.value ?? null;
	const other = (ask.stands === 'mine' ? ask.theirs : ask.mine)?.value ?? null;
	return same(standing, other);
}
