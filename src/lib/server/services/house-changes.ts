/** How large the change between two revisions of a house calculator is at least, whatever it is labelled. */
import type { HouseDefinition, HouseInput } from '../../physics/house/definition.ts';
import { canonicalJson } from '../../widget/freeze.ts';
import { CHANGES, type Change } from '../../workflow/vetting.ts';

/**
 * `major` when the same inputs may give another answer, or a tie of a widget may break; `minor` when there is an output
 * more; `patch` when only words differ. A formula that was only written differently, with the same tree, is words.
 */
export function leastChange(before: HouseDefinition, after: HouseDefinition): Change {
	const same = (a: unknown, b: unknown) => canonicalJson(a) === canonicalJson(b);
	const kept = (old: readonly { name: string }[], now: readonly { name: string }[]) =>
		old.every(({ name }) => now.some((each) => each.name === name));
	const sharedWays = after.derived.filter(({ name }) => named(before.derived, name));
	const answersAlike =
		same(limitsOf(before), limitsOf(after)) &&
		same(testsOf(before), testsOf(after)) &&
		kept(before.outputs, after.outputs) &&
		before.outputs.every((output) =>
			same(gives(output), gives(named(after.outputs, output.name)))
		) &&
		sharedWays.every(({ name, tree }) => same(tree, named(before.derived, name)?.tree));
	if (!answersAlike) return 'major';
	return kept(after.outputs, before.outputs) ? 'patch' : 'minor';
}

export function isSmaller(change: Change, least: Change): boolean {
	return CHANGES.indexOf(change) < CHANGES.indexOf(least);
}

function named<T extends { name: string }>(all: readonly T[], name: string): T | undefined {
	return all.find((each) => each.name === name);
}

/** What decides which inputs are taken, and how. */
function limitsOf({ inputs }: HouseDefinition) {
	const limits = inputs.map((input: HouseInput) => ({
		name: input.name,
		quantity: input.quantity,
		unit: input.unit,
		min: input.min,
		max: input.max,
		minExclusive: input.minExclusive ?? false,
		maxExclusive: input.maxExclusive ?? false,
		whole: input.whole ?? false,
		good: input.good ? { min: input.good.min, max: input.good.max } : null
	}));
	return limits.sort((a, b) => (a.name < b.name ? -1 : 1));
}

function testsOf({ conditions }: HouseDefinition) {
	return conditions.map(({ code, effect, tree }) => ({ code, effect, tree }));
}

function gives(output: HouseDefinition['outputs'][number] | undefined) {
	return output && { quantity: output.quantity, unit: output.unit, tree: output.tree };
}
