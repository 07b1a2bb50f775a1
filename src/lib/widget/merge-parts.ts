/** Documents as the merge sees them: fields, and lists whose members carry stable ids. */
import { canonicalJson } from './freeze.ts';

export type Identified = { id: string } & Record<string, unknown>;

export function isIdentifiedList(value: unknown): value is Identified[] {
	return (
		Array.isArray(value) &&
		value.every(
			(member: unknown) =>
				typeof member === 'object' &&
				member !== null &&
				typeof (member as { id?: unknown }).id === 'string'
		)
	);
}

/** A copy of a list whose members have ids; an empty one for anything else. */
export function identified(value: unknown): Identified[] {
	return isIdentifiedList(value) ? [...value] : [];
}

export function idsOf(list: unknown): string[] {
	return identified(list).map(({ id }) => id);
}

/** Alike as JSON, whatever the order of keys; `undefined` is alike to itself alone. */
export function same(a: unknown, b: unknown): boolean {
	if (a === undefined || b === undefined) return a === b;
	return a === b || canonicalJson(a) === canonicalJson(b);
}

/** An id like this one that isn’t taken: `note` → `note-2`. At most 40 characters, as ids are. */
export function freshId(id: string, taken: ReadonlySet<string>): string {
	for (let number = 2; ; number += 1) {
		const ending = `-${number}`;
		const fresh = `${id.slice(0, 40 - ending.length)}${ending}`;
		if (!taken.has(fresh)) return fresh;
	}
}

/** Every string in a value, keys included: all the ways in which one part can name another. */
export function* stringsIn(value: unknown): Generator<string> {
	if (typeof value === 'string') yield value;
	if (typeof value !== 'object' || value === null) return;
	for (const [key, member] of Object.entries(value)) {
		if (!Array.isArray(value)) yield key;
		yield* stringsIn(member);
	}
}
