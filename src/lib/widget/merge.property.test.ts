/** Two people at one base, by chance: whatever they do, neither loses a word, and the merge hangs together. */
import fc from 'fast-check';
import { expect, test } from 'vitest';
import {
	anyDocument,
	Author,
	Chance,
	edited,
	wordsBy
} from '../../../tests/support/edit-scripts.ts';
import { catalogue } from '../physics/calculators/index.ts';
import { canonicalJson } from './freeze.ts';
import type { WidgetDocument } from './document.ts';
import { choicesOf, decideAsk, type AskReason } from './merge-ask.ts';
import { mergeDocuments, type Merged } from './merge.ts';
import { identified, same } from './merge-parts.ts';
import { parseDocument } from './parse.ts';

const RUNS = 1_000;
const LISTS = ['formulas', 'steps', 'controls', 'blocks', 'claims'] as const;

const scripts = fc.record({
	base: fc.array(fc.nat(10_000), { minLength: 20, maxLength: 60 }),
	mine: fc.array(fc.nat(10_000), { minLength: 4, maxLength: 50 }),
	theirs: fc.array(fc.nat(10_000), { minLength: 4, maxLength: 50 }),
	edits: fc.record({
		mine: fc.integer({ min: 1, max: 12 }),
		theirs: fc.integer({ min: 1, max: 12 })
	})
});

interface Played {
	base: WidgetDocument;
	mine: WidgetDocument;
	theirs: WidgetDocument;
}

const me = () => new Author('mine');
const them = () => new Author('theirs');

const played = scripts.map(({ base: seed, mine, theirs, edits }): Played => {
	const base = anyDocument(new Chance(seed));
	return {
		base,
		mine: edited(base, edits.mine, new Chance(mine), me()),
		theirs: edited(base, edits.theirs, new Chance(theirs), them())
	};
});

/** Everything a merge keeps: the document, and both sides of what it asks. */
const keptBy = ({ document, asks }: Merged) => [document, asks];

/** A member without the names of its claims, which a merge may change. */
const unnamed = (member: unknown) =>
	canonicalJson(member)
		.replace(/"claim":"[^"]+"/g, '"claim":""')
		.replace(/"id":"claim[^"]*"/g, '');

/** Members that a side changed or added and that are neither in the document nor in an ask. */
function lostFrom({ base }: Played, side: WidgetDocument, merged: Merged): string[] {
	return LISTS.flatMap((list) => {
		const before = new Map(identified(base[list]).map((member) => [member.id, member]));
		const held = new Set(
			[
				...identified(merged.document[list]),
				...merged.asks.flatMap(({ mine, theirs }) => [
					mine?.value,
					theirs?.value,
					...(mine?.claims ?? []),
					...(theirs?.claims ?? [])
				])
			].map((member) => unnamed(member ?? null))
		);
		return identified(side[list])
			.filter((member) => !same(before.get(member.id), member))
			.filter((member) => !held.has(unnamed(member)))
			.map((member) => `${list}/${member.id}`);
	});
}

function keepsEveryWordAndChange(all: Played, merged: Merged): void {
	for (const [author, side] of [
		[me(), all.mine],
		[them(), all.theirs]
	] as const) {
		const kept = wordsBy(author, keptBy(merged));
		expect([...wordsBy(author, side)].filter((word) => !kept.has(word))).toEqual([]);
		expect(lostFrom(all, side, merged)).toEqual([]);
	}
}

function hangsTogether({ document }: Merged): void {
	const parsed = parseDocument(document, catalogue);
	expect(parsed.ok ? [] : parsed.issues).toEqual([]);
}

/** Places that the two changed in different ways, found without the merge. */
function clashes({ base, mine, theirs }: Played): string[] {
	const clash = (was: unknown, one: unknown, other: unknown) =>
		!same(was, one) && !same(was, other) && !same(one, other);
	const fields = (['title', 'point'] as const).filter((field) =>
		clash(base[field], mine[field], theirs[field])
	);
	const members = (['formulas', 'steps', 'controls', 'blocks'] as const).flatMap((list) => {
		const [was, one, other] = [base, mine, theirs].map(
			(side) => new Map(identified(side[list]).map((member) => [member.id, member]))
		) as [Map<string, unknown>, Map<string, unknown>, Map<string, unknown>];
		return [...was.keys()]
			.filter((id) => clash(was.get(id), one.get(id), other.get(id)))
			.map((id) => `${list}/${id}`);
	});
	return [...fields, ...members];
}

function isTheSameFromTheOtherSide(all: Played, merged: Merged): void {
	const other = mergeDocuments(all.base, all.theirs, all.mine, catalogue);
	for (const author of [me(), them()])
		expect(wordsBy(author, keptBy(other))).toEqual(wordsBy(author, keptBy(merged)));
	const clashing = clashes(all);
	for (const { asks } of [merged, other])
		expect(asks.map(({ place }) => place)).toEqual(expect.arrayContaining(clashing));
}

function isTheOtherSideWhereOneDidNothing({ base, mine, theirs }: Played): void {
	expect(mergeDocuments(base, base, theirs, catalogue)).toEqual({ document: theirs, asks: [] });
	expect(mergeDocuments(base, mine, base, catalogue)).toEqual({ document: mine, asks: [] });
	expect(mergeDocuments(base, mine, mine, catalogue)).toEqual({ document: mine, asks: [] });
}

function everyChoiceHolds({ document, asks }: Merged): void {
	for (const ask of asks) {
		for (const choice of choicesOf(ask)) {
			const made = decideAsk(document, ask, choice, catalogue);
			if (!made.ok) {
				expect(made.message).toMatch(/\S/);
				continue;
			}
			expect(parseDocument(made.document, catalogue).ok).toBe(true);
			if (ask.list !== 'blocks') continue;
			const chosen = choice === 'both' ? [ask.mine, ask.theirs] : [ask[choice]];
			const standing = JSON.stringify(made.document.blocks);
			for (const author of [me(), them()])
				for (const word of wordsBy(
					author,
					chosen.map((side) => side?.value ?? null)
				))
					expect(standing).toContain(word);
		}
	}
}

test(
	`of ${RUNS} pairs of edit scripts, none loses a word, and every merge hangs together`,
	{ timeout: 120_000 },
	() => {
		const asked = new Map<AskReason, number>();
		fc.assert(
			fc.property(played, (all) => {
				const merged = mergeDocuments(all.base, all.mine, all.theirs, catalogue);
				keepsEveryWordAndChange(all, merged);
				hangsTogether(merged);
				isTheSameFromTheOtherSide(all, merged);
				isTheOtherSideWhereOneDidNothing(all);
				everyChoiceHolds(merged);
				for (const { reason } of merged.asks) asked.set(reason, (asked.get(reason) ?? 0) + 1);
			}),
			{ numRuns: RUNS, seed: 20261208 }
		);
		// Scripts that never clash would prove nothing.
		expect(Object.fromEntries(asked)).toEqual({
			'both-changed': expect.any(Number),
			'taken-out': expect.any(Number),
			'still-in-use': expect.any(Number),
			'no-fit': expect.any(Number)
		});
	}
);
