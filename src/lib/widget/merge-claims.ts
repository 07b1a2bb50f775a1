/** Claims follow the copy: each stands in it once, in the form that its words have there. */
import type { Claim } from './document.ts';
import { freshId, type Identified } from './merge-parts.ts';

type Standing = 'live' | 'words';

/** Anything in a block that carries a claim’s id is where the claim stands. */
function isPlace(value: object): value is { claim: string; kind?: unknown } {
	return 'claim' in value && typeof value.claim === 'string';
}

function* placesIn(value: unknown): Generator<{ claim: string; standing: Standing }> {
	if (typeof value !== 'object' || value === null) return;
	if (isPlace(value))
		yield { claim: value.claim, standing: value.kind === 'live' ? 'live' : 'words' };
	for (const member of Object.values(value)) yield* placesIn(member);
}

/** Ids of the claims that stand in a block, in order. */
export function claimIdsIn(block: unknown): string[] {
	return [...placesIn(block)].map(({ claim }) => claim);
}

/** The value with its claims under other names, where a name is given. */
export function renamedClaims(value: unknown, names: ReadonlyMap<string, string>): unknown {
	return names.size === 0 ? value : withClaimsNamed(value, (id) => names.get(id) ?? id);
}

function withClaimsNamed(value: unknown, nameOf: (id: string) => string): unknown {
	if (Array.isArray(value)) return value.map((member) => withClaimsNamed(member, nameOf));
	if (typeof value !== 'object' || value === null) return value;
	const named = isPlace(value) ? { ...value, claim: nameOf(value.claim) } : value;
	return Object.fromEntries(
		Object.entries(named).map(([key, member]) => [key, withClaimsNamed(member, nameOf)])
	);
}

/**
 * Blocks and claims that belong together: a claim that stands twice becomes two, one whose words have gone goes, and
 * each is taken in the form its words have. `spare` are other versions of the claims, the better ones first.
 */
export function claimsInCopyOrder(
	blocks: readonly Identified[],
	claims: readonly Claim[],
	spare: readonly Claim[] = []
): { blocks: Identified[]; claims: Claim[] } {
	const offered = [...claims, ...spare];
	const taken = new Set(offered.map(({ id }) => id));
	const placed = new Map<string, Claim>();
	const settled = blocks.map((block) => {
		const standings = [...placesIn(block)];
		if (standings.length === 0) return block;
		let at = 0;
		let renamed = false;
		const nameOf = (id: string) => {
			const standing = standings[at]?.standing ?? 'words';
			at += 1;
			const claim = offered.find((one) => one.id === id && formOf(one) === standing);
			if (!claim) return id;
			if (!placed.has(id)) {
				placed.set(id, claim);
				return id;
			}
			const fresh = freshId(id, taken);
			taken.add(fresh);
			placed.set(fresh, { ...claim, id: fresh });
			renamed = true;
			return fresh;
		};
		const named = withClaimsNamed(block, nameOf) as Identified;
		return renamed ? named : block;
	});
	// Those that were there keep their order; the renamed ones follow.
	const kept = [...new Set(claims.map(({ id }) => id))].flatMap((id) => placed.get(id) ?? []);
	const others = [...placed.values()].filter((claim) => !kept.includes(claim));
	return { blocks: settled, claims: [...kept, ...others] };
}

function formOf(claim: Claim): Standing {
	return claim.form === 'live' ? 'live' : 'words';
}
