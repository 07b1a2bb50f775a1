/**
 * Three-way merge of documents: what two people made of the same base. Each keeps what only they changed; where both
 * changed one thing, the document holds one version and an ask holds both. Fields and lists of things with ids are
 * all it knows of a document, so a new kind of block or control needs nothing here.
 */
import type { CalculatorSet } from '../physics/calculator.ts';
import type { Claim, WidgetDocument } from './document.ts';
import { sideIn, type Ask, type AskReason } from './merge-ask.ts';
import { claimIdsIn, claimsInCopyOrder } from './merge-claims.ts';
import { mergeOrder } from './merge-order.ts';
import {
	identified,
	idsOf,
	isIdentifiedList,
	same,
	stringsIn,
	type Identified
} from './merge-parts.ts';
import { parseDocument } from './parse.ts';
import type { Stored } from './upgrades.ts';

export interface Merged {
	document: WidgetDocument;
	asks: Ask[];
}

/**
 * Merges two documents that grew from `base`; all three are of the newest version. The result hangs together when
 * `mine` does: what of theirs doesn’t fit mine is left out of the document and asked about. Nothing that either side
 * wrote is lost: it is in the document or in an ask.
 */
export function mergeDocuments(
	base: WidgetDocument,
	mine: WidgetDocument,
	theirs: WidgetDocument,
	calculators: CalculatorSet
): Merged {
	if (same(mine, theirs) || same(base, theirs)) return { document: mine, asks: [] };
	if (same(base, mine)) return { document: theirs, asks: [] };
	const merge = new Merge(base, mine, theirs);
	const all = merge.without(new Set());
	if (holds(all, calculators)) return all;

	// Their changes come in one by one; those that don’t fit are asked about. One may need another that comes later.
	const refused = new Set(merge.theirChanges());
	for (let before = -1; before !== refused.size;) {
		before = refused.size;
		for (const place of [...refused]) {
			refused.delete(place);
			if (!holds(merge.without(refused), calculators)) refused.add(place);
		}
	}
	return merge.without(refused);
}

function holds({ document }: Merged, calculators: CalculatorSet): boolean {
	return parseDocument(document, calculators).ok;
}

/** One thing on all three sides, and who changed it. */
interface Three<T> {
	base: T;
	mine: T;
	theirs: T;
	byMe: boolean;
	byThem: boolean;
	/** Both sides have the same. */
	alike: boolean;
}

function three<T>(base: T, mine: T, theirs: T): Three<T> {
	return {
		base,
		mine,
		theirs,
		byMe: !same(base, mine),
		byThem: !same(base, theirs),
		alike: same(mine, theirs)
	};
}

type Members = ReadonlyMap<string, Three<Identified | undefined>>;

class Merge {
	readonly #base: Stored;
	readonly #mine: Stored;
	readonly #theirs: Stored;
	readonly #fields: ReadonlyMap<string, Three<unknown>>;
	/** By list; claims apart, since they follow the blocks. */
	readonly #lists: ReadonlyMap<string, Members>;
	readonly #claimMembers: Members;

	constructor(base: WidgetDocument, mine: WidgetDocument, theirs: WidgetDocument) {
		const sides: Stored[] = [{ ...mine }, { ...theirs }, { ...base }];
		[this.#mine, this.#theirs, this.#base] = sides as [Stored, Stored, Stored];
		const keys = [...new Set(sides.flatMap((side) => Object.keys(side)))];
		const isList = (key: string) => sides.every((side) => isIdentifiedList(side[key] ?? []));
		this.#fields = new Map(
			keys
				.filter((key) => !isList(key))
				.map((key) => [key, three(this.#base[key], this.#mine[key], this.#theirs[key])])
		);
		this.#lists = new Map(
			keys
				.filter((key) => isList(key) && key !== 'claims')
				.map((key) => [key, this.#membersOf(key)])
		);
		this.#claimMembers = this.#membersOf('claims');
	}

	/** Places of all that they changed, in the order in which it is best tried: the copy hangs on the wiring. */
	theirChanges(): string[] {
		const members = (list: string, all: Members) =>
			[...all].flatMap(([id, { byThem }]) => (byThem ? [`${list}/${id}`] : []));
		const lists = [...this.#lists].sort(([a], [b]) => copyLast(a) - copyLast(b));
		return [
			...[...this.#fields].flatMap(([field, { byThem }]) => (byThem ? [field] : [])),
			...lists.flatMap(([list, all]) => members(list, all)),
			...members('claims', this.#claimMembers)
		];
	}

	/** The merge with these changes of theirs left out of the document. */
	without(refused: ReadonlySet<string>): Merged {
		const asks: Ask[] = [];
		const merged: Stored = {};
		for (const [field, values] of this.#fields)
			merged[field] = this.#field(field, values, refused, asks);
		for (const [list, members] of this.#lists)
			merged[list] = this.#list(list, members, refused, asks);
		Object.assign(merged, this.#claims(identified(merged.blocks), refused, asks));
		this.#bringBack(merged, asks);
		// In mine’s order of keys, so that the same content is written in the same way.
		const keys = new Set([...Object.keys(this.#mine), ...Object.keys(merged)]);
		const document = Object.fromEntries([...keys].map((key) => [key, merged[key]]));
		return { document: document as unknown as WidgetDocument, asks };
	}

	#field(
		field: string,
		{ mine, theirs, byMe, byThem, alike }: Three<unknown>,
		refused: ReadonlySet<string>,
		asks: Ask[]
	): unknown {
		const isRefused = refused.has(field);
		if (alike || !byThem || (!byMe && !isRefused)) return alike || !byThem ? mine : theirs;
		asks.push(this.#ask(null, field, isRefused ? 'no-fit' : 'both-changed', 'mine'));
		return mine;
	}

	#list(list: string, members: Members, refused: ReadonlySet<string>, asks: Ask[]): Identified[] {
		const chosen = new Map<string, Identified>();
		for (const [id, { mine, theirs, byMe, byThem, alike }] of members) {
			const isRefused = refused.has(`${list}/${id}`);
			const isSettled = alike || !byThem || (!byMe && !isRefused);
			// What one side took out and the other worked on stays, and is asked about.
			const own = alike || !byThem || isRefused;
			const member = own ? mine : isSettled ? theirs : (mine ?? theirs);
			if (!isSettled) {
				const reason = isRefused ? 'no-fit' : mine && theirs ? 'both-changed' : 'taken-out';
				asks.push(this.#ask(list, id, reason, isRefused || mine ? 'mine' : 'theirs'));
			}
			if (member) chosen.set(id, member);
		}
		return this.#ordered(list, chosen);
	}

	#ordered(list: string, members: ReadonlyMap<string, Identified>): Identified[] {
		const [base, mine, theirs] = [this.#base, this.#mine, this.#theirs].map((side) =>
			idsOf(side[list])
		) as [string[], string[], string[]];
		const order = mergeOrder(base, mine, theirs, new Set(members.keys()));
		return order.flatMap((id) => members.get(id) ?? []);
	}

	/** The claims that the merged copy holds. One that both changed is asked about, unless its block is asked about whole. */
	#claims(
		blocks: readonly Identified[],
		refused: ReadonlySet<string>,
		asks: Ask[]
	): { blocks: Identified[]; claims: Claim[] } {
		const standing = new Set(blocks.flatMap(claimIdsIn));
		const isHeld = (side: 'mine' | 'theirs', claim: string) =>
			asks.some((ask) => ask[side]?.claims.some(({ id }) => id === claim));
		const claims: Identified[] = [];
		const spare: Identified[] = [];
		for (const [id, { base, mine, theirs, byMe, byThem, alike }] of this.#claimMembers) {
			spare.push(...[mine, theirs, base].filter((claim) => claim !== undefined));
			const isRefused = refused.has(`claims/${id}`);
			const isOpen = !alike && byThem && (byMe || isRefused);
			const chosen =
				mine && theirs ? (isOpen || !byThem ? mine : theirs) : (mine ?? theirs ?? base);
			if (chosen) claims.push(chosen);
			if (standing.has(id)) {
				const isAsked = isHeld('mine', id) && isHeld('theirs', id);
				if (isOpen && mine && theirs && !isAsked)
					asks.push(this.#ask('claims', id, isRefused ? 'no-fit' : 'both-changed', 'mine'));
				continue;
			}
			// Its words went on one side while the other gave it another reading or reason: the block is asked about.
			if (base && theirs && byThem && !isHeld('theirs', id))
				asks.push(this.#askAboutBlockOf(id, 'theirs'));
			if (base && mine && byMe && !isHeld('mine', id) && !(alike && isHeld('theirs', id)))
				asks.push(this.#askAboutBlockOf(id, 'mine'));
		}
		return claimsInCopyOrder(blocks, claims as unknown as Claim[], spare as unknown as Claim[]);
	}

	#askAboutBlockOf(claim: string, worked: 'mine' | 'theirs'): Ask {
		const side = worked === 'mine' ? this.#mine : this.#theirs;
		const block = identified(side.blocks).find((one) => claimIdsIn(one).includes(claim));
		const members = this.#lists.get('blocks')?.get(block?.id ?? '');
		const reason = members?.mine && members.theirs ? 'both-changed' : 'taken-out';
		return this.#ask('blocks', block?.id ?? '', reason, worked === 'mine' ? 'theirs' : 'mine');
	}

	/** What one side took out while something in the merged document still names it comes back, and is asked about. */
	#bringBack(merged: Stored, asks: Ask[]): void {
		for (let isAdding = true; isAdding;) {
			isAdding = false;
			const named = new Set(stringsIn(merged));
			for (const [list, members] of this.#lists) {
				if (list === 'blocks') continue;
				const present = new Map(identified(merged[list]).map((one) => [one.id, one]));
				for (const [id, { mine, theirs }] of members) {
					const back = mine ?? theirs;
					const isNamed = named.has(id) || named.has(`${list.replace(/s$/, '')}.${id}`);
					if (present.has(id) || !isNamed || !back) continue;
					present.set(id, back);
					asks.push(this.#ask(list, id, 'still-in-use', mine ? 'mine' : 'theirs'));
					isAdding = true;
				}
				if (isAdding) merged[list] = this.#ordered(list, present);
			}
		}
	}

	#ask(list: string | null, member: string, reason: AskReason, stands: Ask['stands']): Ask {
		const where = { list, member };
		return {
			...where,
			place: list === null ? member : `${list}/${member}`,
			reason,
			mine: sideIn(this.#mine, where),
			theirs: sideIn(this.#theirs, where),
			stands
		};
	}

	/** Every member of a list on any side, by id. */
	#membersOf(list: string): Members {
		const by = (stored: Stored) => new Map(identified(stored[list]).map((one) => [one.id, one]));
		const [base, mine, theirs] = [by(this.#base), by(this.#mine), by(this.#theirs)];
		const ids = new Set([...mine.keys(), ...theirs.keys(), ...base.keys()]);
		return new Map([...ids].map((id) => [id, three(base.get(id), mine.get(id), theirs.get(id))]));
	}
}

function copyLast(list: string): number {
	return list === 'blocks' ? 1 : 0;
}
