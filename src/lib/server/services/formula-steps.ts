/** Formulas that writers add to a piece: read while they are written, and read again whenever a draft is saved. */
import { SteelyardError } from '../../errors.ts';
import { FormulaDraft, type FormulaAnswer } from '../../forms/formula-draft.ts';
import type { HouseDraft, HouseProblem } from '../../physics/house/definition.ts';
import { settleHouse } from '../../physics/house/settle.ts';
import { formulaCalculator } from '../../widget/bench-set.ts';
import { canonicalJson } from '../../widget/canonical.ts';
import type { WidgetDocument } from '../../widget/document.ts';
import {
	formulaDefinition,
	formulaDigest,
	formulaRevision
} from '../../widget/formula-definition.ts';
import { inFormula } from '../../widget/formula-issues.ts';
import type { FormulaStep } from '../../widget/formula-step.ts';
import type { Issue } from '../../widget/parse.ts';
import { requirePermission } from '../../workflow/permissions.ts';
import type { Context } from '../context.ts';
import { typeset } from '../typeset.ts';
import { fieldProblems, testHouseCalculator } from './house-test.ts';

/** Reads what stands in the form at this moment. Keeps nothing. */
export function tryFormula(ctx: Pick<Context, 'actor'>, sent: unknown): FormulaAnswer {
	requirePermission(ctx.actor, 'edit-draft');
	const read = FormulaDraft.safeParse(sent);
	if (!read.success) {
		const issues = fieldProblems(read.error).map(({ path, says }) => ({ path, message: says }));
		throw new SteelyardError('input-broken', { issues });
	}
	const draft = read.data;
	const unfinished = unfinishedFields(draft);
	const { formula, rows } = filledIn(draft);
	const test = testHouseCalculator(houseDraft(formula));
	const [settled] = test.definition?.outputs ?? [];
	const problems = test.problems
		.map((problem) => atRow(inFormula(problem, draft), rows))
		.filter(({ path, at }) => path !== 'sources' && (at || !isBeside(unfinished, path)));
	const worked = settled ? { ...formula, tree: settled.tree } : null;
	const isWhole = worked !== null && unfinished.length === 0;
	return {
		formula: isWhole ? worked : null,
		revision: isWhole ? formulaRevision(worked) : null,
		problems: [...unfinished, ...problems],
		checks: draft.checks.map((_, row) => test.checks[rows.indexOf(row)] ?? null),
		preview: test.preview,
		equation: worked && equationOf(worked)
	};
}

function equationOf(formula: FormulaStep): FormulaAnswer['equation'] {
	const [equation] = formulaCalculator(formula).equations;
	return equation ? typeset(equation) : null;
}

/** Sources that were read and found to say what their trees say, by digest: a draft is saved every few seconds. */
const found = new Set<string>();
const KEPT = 500;

/**
 * Every formula of a document read anew from its source: only what the house's own parser makes of it is kept, so that no
 * other tree can come in by its side.
 */
export function formulaSourceIssues({ formulas }: Pick<WidgetDocument, 'formulas'>): Issue[] {
	return formulas.flatMap((formula, index) => {
		const digest = formulaDigest(formula);
		if (found.has(digest)) return [];
		const issues = sourceIssues(formula).map(({ path, message }) => ({
			path: `formulas.${index}.${path}`,
			message
		}));
		if (issues.length === 0) remember(digest);
		return issues;
	});
}

function sourceIssues(formula: FormulaStep): Issue[] {
	const settled = settleHouse(houseDraft(formula));
	if (!settled.ok) {
		return settled.problems
			.map((problem) => inFormula(problem, formula))
			.filter(({ path }) => !path.startsWith('checks'))
			.map(({ path, at, says, mend }) => ({
				path,
				message: `${at ? `At character ${at.from + 1}: ` : ''}${says} ${mend}`.trim()
			}));
	}
	const [output] = settled.definition.outputs;
	return canonicalJson(output?.tree) === canonicalJson(formula.tree)
		? []
		: [
				{
					path: 'tree',
					message: `The formula “${formula.title}” isn’t what its source says. Open it on the bench and keep it again.`
				}
			];
}

/** All that keeps a whole formula from being vetted: its source, its dimensions, its check values. */
export function formulaProblems(formula: FormulaStep): HouseProblem[] {
	return testHouseCalculator(houseDraft(formula))
		.problems.map((problem) => inFormula(problem, formula))
		.filter(({ path }) => path !== 'sources');
}

function remember(digest: string): void {
	const [oldest] = found;
	if (found.size >= KEPT && oldest !== undefined) found.delete(oldest);
	found.add(digest);
}

/** Settled under a name that the rules for house calculators take; what comes of it is never kept as one. */
function houseDraft(formula: FormulaStep): HouseDraft {
	return { ...formulaDefinition(formula, ''), id: 'house.formula' };
}

function unfinishedFields({ title, inputs, output, checks }: FormulaDraft): HouseProblem[] {
	const wanted: [value: unknown, path: string, says: string][] = [
		[title, 'title', 'Give it a title.'],
		...inputs.flatMap(({ name, label, min, max, initial }, at): typeof wanted => [
			[name, `inputs.${at}.name`, 'Give it a name that the formula calls it by.'],
			[label, `inputs.${at}.label`, 'Say what it is.'],
			[min, `inputs.${at}.min`, 'Give a number.'],
			[max, `inputs.${at}.max`, 'Give a number.'],
			[initial, `inputs.${at}.initial`, 'Give a number.']
		]),
		[output.label, 'output.label', 'Say what it gives.'],
		...checks.flatMap(({ published, tolerance, source, inputs: at }, row): typeof wanted => [
			...inputs.map(({ name }): (typeof wanted)[number] => [
				name === '' ? 'unnamed' : at[name],
				`checks.${row}.inputs.${name}`,
				'Give a number.'
			]),
			[published, `checks.${row}.published`, 'Give the printed number.'],
			[tolerance, `checks.${row}.tolerance`, 'Give half of its last digit.'],
			[source, `checks.${row}.source`, 'Say where it was printed, with enough to find it again.']
		])
	];
	return wanted.flatMap(([value, path, says]) =>
		value === '' || value === null || value === undefined
			? [{ path, code: 'field', says, mend: '' }]
			: []
	);
}

/** The draft with something in every empty field, so that the formula is looked at while the rest is still to come. */
function filledIn(draft: FormulaDraft): { formula: FormulaStep; rows: number[] } {
	const names = draft.inputs.map(({ name }) => name);
	const rows = draft.checks.flatMap(({ published, tolerance, inputs }, row) =>
		published !== null && tolerance !== null && names.every((name) => inputs[name] != null)
			? [row]
			: []
	);
	return {
		rows,
		formula: {
			...draft,
			inputs: draft.inputs.map(({ name, label, quantity, unit, ...range }, at) => {
				const { min, max, initial } = filledRange(range);
				return { name: name || `unnamed${at + 1}`, label, quantity, unit, min, max, initial };
			}),
			tree: { is: 'number', value: 0 },
			checks: rows.flatMap((row) => {
				const check = draft.checks[row];
				return check ? [{ ...check, ...numbersOf(check, names) }] : [];
			})
		}
	};
}

function numbersOf(check: FormulaDraft['checks'][number], names: readonly string[]) {
	return {
		inputs: Object.fromEntries(names.map((name) => [name, check.inputs[name] ?? 0])),
		published: check.published ?? 0,
		tolerance: check.tolerance ?? 0
	};
}

function filledRange(range: Pick<FormulaDraft['inputs'][number], 'min' | 'max' | 'initial'>) {
	const min = range.min ?? (range.max ?? range.initial ?? 1) - 1;
	const max = range.max ?? Math.max(min, range.initial ?? min) + 1;
	return { min, max, initial: range.initial ?? min };
}

/** Unfinished check values aren't tried: what is said of the others belongs to other rows of the form. */
function atRow(problem: HouseProblem, rows: readonly number[]): HouseProblem {
	const path = problem.path.replace(
		/^checks\.(\d+)/,
		(_, tried: string) => `checks.${rows[Number(tried)] ?? tried}`
	);
	return { ...problem, path };
}

/** In one row with something unfinished, where it may come from what was filled in. */
function isBeside(unfinished: readonly HouseProblem[], path: string): boolean {
	const rowOf = (where: string) => where.split('.').slice(0, 2).join('.');
	return path.includes('.') && unfinished.some((each) => rowOf(each.path) === rowOf(path));
}
