/** What a draft declares, apart from its formulas: names, units, kinds, ranges, codes, check values. */
import { QUANTITY_KINDS } from '../units/quantities.ts';
import { commensurable, suggestUnit, unitOf } from '../units/units.ts';
import { nameProblem } from '../formula/scope.ts';
import {
	HOUSE_LIMITS,
	isHouseId,
	type HouseCheck,
	type HouseCondition,
	type HouseDraft,
	type HouseInput,
	type HouseProblem
} from './definition.ts';

/** Lists longer than anything sensible, so that nothing that follows has to fear their length. */
export function sizeProblems(draft: HouseDraft): HouseProblem[] {
	return (Object.keys(HOUSE_LIMITS) as (keyof typeof HOUSE_LIMITS)[]).flatMap((key) =>
		draft[key].length > HOUSE_LIMITS[key]
			? [
					{
						path: key,
						code: 'too-many',
						says: `There are ${draft[key].length} of these; ${HOUSE_LIMITS[key]} are the most.`,
						mend: 'Make two calculators of it, and chain them.'
					}
				]
			: []
	);
}

export function declaredProblems(draft: HouseDraft): HouseProblem[] {
	return [
		...idProblems(draft),
		...nameProblems(draft),
		...draft.inputs.flatMap((input, at) => inputProblems(input, `inputs.${at}`)),
		...draft.outputs.flatMap((output, at) => unitProblems(output, `outputs.${at}`)),
		...draft.conditions.flatMap((condition, at) =>
			codeProblems(condition, draft, `conditions.${at}.code`)
		),
		...draft.checks.flatMap((check, at) => checkProblems(check, draft, `checks.${at}`))
	];
}

function idProblems({ id, inputs, outputs }: HouseDraft): HouseProblem[] {
	const problems: HouseProblem[] = [];
	if (!isHouseId(id)) {
		problems.push({
			path: 'id',
			code: 'id-broken',
			says: `“${id.slice(0, 60)}” can't be the id of a house calculator.`,
			mend: 'It is “house.” and small letters, digits and single dashes: house.bell-period.'
		});
	}
	for (const [path, list] of [
		['inputs', inputs],
		['outputs', outputs]
	] as const) {
		if (list.length > 0) continue;
		problems.push({
			path,
			code: 'none',
			says: `It has no ${path} yet.`,
			mend: 'Add one.'
		});
	}
	return problems;
}

function nameProblems({ inputs, derived, outputs }: HouseDraft): HouseProblem[] {
	const seen = new Set<string>();
	const lists = { inputs, derived, outputs };
	return Object.entries(lists).flatMap(([list, entries]) =>
		entries.flatMap(({ name }, at): HouseProblem[] => {
			const path = `${list}.${at}.name`;
			const problem = nameProblem(name);
			if (problem) return [{ path, ...problem }];
			if (!seen.has(name)) {
				seen.add(name);
				return [];
			}
			return [
				{
					path,
					code: 'name-twice',
					says: `“${name}” is there already.`,
					mend: 'Inputs, values on the way and outputs each need a name of their own.'
				}
			];
		})
	);
}

function unitProblems(
	{ unit, quantity }: Pick<HouseInput, 'unit' | 'quantity'>,
	path: string
): HouseProblem[] {
	const kind = Object.hasOwn(QUANTITY_KINDS, quantity) ? QUANTITY_KINDS[quantity] : undefined;
	if (!kind || quantity === 'text') {
		return [
			{
				path: `${path}.quantity`,
				code: 'kind-unknown',
				says: 'This is no kind of quantity that a number can measure.',
				mend: 'Choose one of the list.'
			}
		];
	}
	if (!unitOf(unit)) {
		const near = suggestUnit(unit);
		return [
			{
				path: `${path}.unit`,
				code: 'unit-unknown',
				says: `There is no unit “${unit.slice(0, 40)}” in the table.`,
				mend: near ? `Did you mean ${near.symbol}?` : 'Choose a unit of the table.'
			}
		];
	}
	if (commensurable(unit, kind.unit)) return [];
	return [
		{
			path: `${path}.unit`,
			code: 'unit-differs',
			says: `“${kind.label}” isn't measured in ${unit === '' ? 'pure numbers' : unit}.`,
			mend: `Choose a unit such as ${kind.unit || 'none (a pure number)'}, or another kind of quantity.`
		}
	];
}

function inputProblems(input: HouseInput, path: string): HouseProblem[] {
	const { min, max, initial, minExclusive, maxExclusive, whole, log, good } = input;
	const problems = unitProblems(input, path);
	const add = (field: string, code: string, says: string, mend: string) =>
		problems.push({ path: `${path}.${field}`, code, says, mend });

	if (![min, max, initial].every(Number.isFinite)) {
		add('min', 'not-finite', 'Limits and the first value must be finite.', 'Give numbers.');
		return problems;
	}
	if (min >= max) {
		add(
			'min',
			'range-empty',
			'The lowest value must be below the highest.',
			'Correct one of them.'
		);
		return problems;
	}
	const below = minExclusive ? initial <= min : initial < min;
	const above = maxExclusive ? initial >= max : initial > max;
	if (below || above || (whole && !Number.isInteger(initial))) {
		add(
			'initial',
			'initial-outside',
			'The first value must be one that the input takes.',
			`Choose one between ${min} and ${max}${whole ? ', a whole number' : ''}.`
		);
	}
	if (log && min < 0) {
		add(
			'log',
			'log-of-negative',
			'A logarithmic scale has no place for values below nought.',
			'Draw it evenly, or raise the lowest value.'
		);
	}
	if (good && !(good.min < good.max && good.min >= min && good.max <= max)) {
		add(
			'good',
			'zone-outside',
			'The good zone must lie inside the limits.',
			`Choose it between ${min} and ${max}.`
		);
	}
	return problems;
}

const CODE = /^[a-z][a-z0-9-]{0,39}$/;

function codeProblems({ code }: HouseCondition, draft: HouseDraft, path: string): HouseProblem[] {
	const isTwice = draft.conditions.filter((other) => other.code === code).length > 1;
	if (CODE.test(code) && !isTwice && !code.startsWith('past-')) return [];
	return [
		{
			path,
			code: 'code-broken',
			says: isTwice
				? `Two conditions are called “${code.slice(0, 40)}”.`
				: `“${code.slice(0, 40)}” can't be the short name of a condition.`,
			mend: 'Use small letters, digits and dashes, each name once, and none that begins with past-.'
		}
	];
}

function checkProblems(
	{ inputs, output, published, tolerance }: HouseCheck,
	draft: HouseDraft,
	path: string
): HouseProblem[] {
	const problems: HouseProblem[] = [];
	const names = draft.inputs.map(({ name }) => name);
	const missing = names.filter((name) => !Number.isFinite(inputs[name]));
	const unknown = Object.keys(inputs).filter((name) => !names.includes(name));
	if (missing.length > 0 || unknown.length > 0) {
		problems.push({
			path: `${path}.inputs`,
			code: 'check-inputs',
			says:
				missing.length > 0
					? `This check value gives no number for ${missing.join(', ')}.`
					: `There is no input “${unknown[0]?.slice(0, 40)}”.`,
			mend: `Give a number for each input, and nothing else: ${names.join(', ')}.`
		});
	}
	if (!draft.outputs.some(({ name }) => name === output)) {
		problems.push({
			path: `${path}.output`,
			code: 'check-output',
			says: `There is no output “${output.slice(0, 40)}”.`,
			mend: 'Say which output was published.'
		});
	}
	if (!Number.isFinite(published) || !Number.isFinite(tolerance) || tolerance < 0) {
		problems.push({
			path: `${path}.published`,
			code: 'check-number',
			says: 'The published value and its tolerance must be finite, the tolerance not below nought.',
			mend: 'Give the printed number, and half of its last digit.'
		});
	}
	return problems;
}
