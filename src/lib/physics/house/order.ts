/** Values on the way in an order in which each can be had, and the circles in which none comes first. */
import { FORMULA_LIMITS } from '../formula/tree.ts';
import type { HouseDerived, HouseProblem } from './definition.ts';

/** Not the e of 2e5. */
const WORD = /(?<![A-Za-z0-9_.])[A-Za-z][A-Za-z0-9_]*/g;

/** The words of a formula that may be names. None of one that is too long to be read at all. */
export function wordsOf(formula: string): Set<string> {
	return new Set(formula.length > FORMULA_LIMITS.characters ? [] : formula.match(WORD));
}

export interface Order {
	/** Positions in the draft; what stands in a circle is left out. */
	order: number[];
	/** Names that stand in a circle. */
	circular: Set<string>;
	problems: HouseProblem[];
}

export function orderDerived(derived: readonly HouseDerived[]): Order {
	const positions = new Map(derived.map(({ name }, at) => [name, at]));
	const needs = derived.map(({ formula }) =>
		[...wordsOf(formula)].flatMap((word) => positions.get(word) ?? [])
	);
	const order: number[] = [];
	const circular = new Set<string>();
	const problems: HouseProblem[] = [];
	const done = new Set<number>();
	const path: number[] = [];

	const visit = (at: number): void => {
		if (done.has(at)) return;
		const start = path.indexOf(at);
		if (start >= 0) {
			const circle = path.slice(start).map((step) => derived[step] as HouseDerived);
			for (const { name } of circle) circular.add(name);
			problems.push(circleProblem(circle, at));
			return;
		}
		path.push(at);
		needs[at]?.forEach(visit);
		path.pop();
		done.add(at);
		if (!circular.has(derived[at]?.name ?? '')) order.push(at);
	};
	derived.forEach((_, at) => visit(at));
	return { order, circular, problems };
}

function circleProblem(circle: readonly HouseDerived[], at: number): HouseProblem {
	const [first] = circle as [HouseDerived];
	const next = circle[1]?.name ?? first.name;
	const links = circle.map(
		({ name }, index) => `“${name}” needs “${circle[index + 1]?.name ?? first.name}”`
	);
	const from = first.formula.search(new RegExp(`\\b${next}\\b`));
	return {
		path: `derived.${at}.formula`,
		at: { from, to: from + next.length },
		code: 'circle',
		says:
			circle.length === 1
				? `“${first.name}” needs itself.`
				: `${links.slice(0, -1).join(', ')}, and ${links.at(-1)}: none of them can be had first.`,
		mend: 'Write one of them over the inputs alone.'
	};
}
