/** Whether each name and each function is one that is known here, and what was probably meant where it isn't. */
import { nearestOf } from '../calculators/nearest.ts';
import { FUNCTIONS, isFunctionName } from './functions.ts';
import { FormulaRefused, quoted } from './problem.ts';
import type { FormulaScope } from './scope.ts';
import type { Token } from './tokens.ts';
import { FORMULA_LIMITS } from './tree.ts';

const LONGEST_NAME = 32;

/** @throws {FormulaRefused} at the first that isn't known, or one name too many. */
export function checkNames(tokens: readonly Token[], scope: FormulaScope): void {
	const used = new Set<string>();
	for (const token of tokens) {
		if (token.kind === 'function') checkFunction(token, scope);
		if (token.kind !== 'name') continue;
		if (!scope.has(token.text)) refuseName(token, scope);
		used.add(token.text);
		if (used.size > FORMULA_LIMITS.names) {
			throw new FormulaRefused(
				token,
				'too-many-names',
				`The formula uses more than ${FORMULA_LIMITS.names} names.`,
				'Split it: give parts of it names of their own, as values on the way.'
			);
		}
	}
}

function checkFunction(token: Token, scope: FormulaScope): void {
	const name = token.text;
	if (isFunctionName(name)) return;
	if (scope.has(name)) {
		throw new FormulaRefused(
			token,
			'not-a-function',
			`${quoted(name)} is a value and takes no brackets.`,
			`To multiply, write ${name.slice(0, 32)}*(…).`
		);
	}
	if (name === 'log') {
		throw new FormulaRefused(
			token,
			'which-logarithm',
			'“log” is read in two ways.',
			'Write ln for the natural logarithm, or log10 for that to base ten.'
		);
	}
	const near = nearName(name, Object.keys(FUNCTIONS));
	throw new FormulaRefused(
		token,
		'unknown-function',
		`There is no function ${quoted(name)}.`,
		near ? `Did you mean ${near}?` : `There are ${Object.keys(FUNCTIONS).join(', ')}.`
	);
}

function refuseName(token: Token, scope: FormulaScope): never {
	const name = token.text;
	if (isFunctionName(name)) {
		throw new FormulaRefused(
			token,
			'function-alone',
			`${quoted(name)} is a function and needs its brackets.`,
			`Write ${name}(${FUNCTIONS[name].arity === 1 ? 'a' : 'a, b'}).`
		);
	}
	const near = name === 'π' ? 'pi' : nearName(name, [...scope.keys(), ...Object.keys(FUNCTIONS)]);
	throw new FormulaRefused(
		token,
		'unknown-name',
		`${quoted(name)} is neither an input, nor a value on the way, nor a constant.`,
		near ? `Did you mean “${near}”?` : 'Declare it as an input, or correct the name.'
	);
}

/** Nothing is near a word that is too long to be a name. */
function nearName(name: string, names: readonly string[]): string | undefined {
	return name.length > LONGEST_NAME ? undefined : nearestOf(name, names);
}
