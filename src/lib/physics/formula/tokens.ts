/** A source cut into numbers, words and signs, within the limits on length, brackets and number of parts. */
import { FormulaRefused, quoted, type Span } from './problem.ts';
import { FORMULA_LIMITS } from './tree.ts';

export interface Token extends Span {
	kind: 'number' | 'name' | 'function' | 'sign' | 'prefix' | 'open' | 'close' | 'comma';
	text: string;
}

/** Signs that are read as another of the same length. */
export const SAME_AS: Readonly<Record<string, string>> = {
	'−': '-',
	'×': '*',
	'·': '*',
	'÷': '/',
	'⋅': '*'
};

/** Spaces that a keyboard makes, the thin ones of number style among them. */
const BLANK = /[ \t\r\n\u00a0\u2009\u202f]+/y;
const NUMBER = /(?:\d+(?:\.\d+)?|\.\d+)(?:[eE][+-]?\d+)?/y;
const WORD = /[A-Za-z_$\p{L}][A-Za-z0-9_$\p{L}]*/uy;
const COMPARED = /==|!=|<=|>=/y;
/** Not the beginnings of ** and :=, which mean nothing. */
const SIGN = /\*(?!\*)|:(?!=)|[-+/^<>?(),]/y;

/** What people write instead of what a formula knows. */
const MENDS: readonly [RegExp, string, string][] = [
	[/\*\*/y, 'power', 'Write ^ for a power.'],
	[/&&?/y, 'word-sign', 'Write the word and.'],
	[/\|\|?/y, 'word-sign', 'Write the word or; for a size without sign, write abs(x).'],
	[/=>|=</y, 'comparison', 'Write >= or <=.'],
	[/[≤≥≠]/y, 'comparison', 'Write <=, >= or !=.'],
	[/:?=/y, 'assignment', 'Write the right-hand side alone; to compare two values, write ==.'],
	[/!/y, 'factorial', 'There are no factorials; for “is not”, write != or the word not.'],
	[/%/y, 'per-cent', 'Write /100 for a per cent.'],
	[/[²³⁴⁵⁶⁷⁸⁹]/y, 'power', 'Write powers with ^, as in x^2.'],
	[/√/y, 'root', 'Write sqrt( ).'],
	[/[°'′″]/y, 'unit', 'Units stand with the inputs: declare an input in deg, and use its name.'],
	[/["“”‘’`]/y, 'text', 'Take the text out; a formula holds numbers and names.'],
	[/[[\]{}]/y, 'brackets', 'Use round brackets; a formula has no lists.'],
	[/\./y, 'point', 'Put a digit after a decimal point: 2.0. Nothing else has a point in it.'],
	[/;/y, 'several', 'Write one formula only; give steps on the way a name of their own.'],
	[/#/y, 'remark', 'Take the remark out.']
];

/** @throws {FormulaRefused} at the first sign that means nothing, or where a limit is passed. */
export function tokensOf(source: string): Token[] {
	const tokens: Token[] = [];
	let nodes = 0;
	let open = 0;
	let from = 0;
	const take = (pattern: RegExp): string | undefined => {
		pattern.lastIndex = from;
		return pattern.exec(source)?.[0];
	};
	const add = (kind: Token['kind'], text: string, length = text.length): void => {
		const token = { kind, text, from, to: from + length };
		if (kind !== 'open' && kind !== 'close' && kind !== 'comma' && text !== ':') nodes += 1;
		if (nodes > FORMULA_LIMITS.nodes) {
			throw new FormulaRefused(
				token,
				'too-large',
				`The formula has more than ${FORMULA_LIMITS.nodes} numbers, names and signs.`,
				'Give parts of it names of their own, as values on the way.'
			);
		}
		tokens.push(token);
		from = token.to;
	};
	while (from < source.length) {
		const blank = take(BLANK);
		if (blank) {
			from += blank.length;
			continue;
		}
		const operand = isOperand(tokens.at(-1));
		const number = take(NUMBER);
		if (number) {
			if (!Number.isFinite(Number(number))) {
				throw new FormulaRefused(
					{ from, to: from + number.length },
					'number-too-large',
					`${quoted(number)} is larger than any number that can be worked with.`,
					'Numbers go to 1.7e308.'
				);
			}
			add('number', number);
			continue;
		}
		const word = take(WORD);
		if (word) {
			add(kindOfWord(word, source, from + word.length, operand), word);
			continue;
		}
		const compared = take(COMPARED);
		if (compared) {
			add('sign', compared);
			continue;
		}
		const sign = take(SIGN) ?? SAME_AS[source[from] ?? ''];
		if (!sign) {
			refuseSign(
				source,
				from,
				MENDS.find(([pattern]) => take(pattern) !== undefined)
			);
		}
		if (sign === '(') {
			add('open', sign);
			open += 1;
			if (open > FORMULA_LIMITS.depth) refuseDepth(tokens.at(-1) as Token);
		} else if (sign === ')') {
			add('close', sign);
			open -= 1;
		} else if (sign === ',') add('comma', sign);
		else add(sign === '-' && !operand ? 'prefix' : 'sign', sign);
	}
	return tokens;
}

function kindOfWord(word: string, source: string, after: number, operand: boolean): Token['kind'] {
	if (word === 'and' || word === 'or') return 'sign';
	if (word === 'not' && !operand) return 'prefix';
	return /^\s*\(/.test(source.slice(after, after + 64)) ? 'function' : 'name';
}

function refuseDepth(token: Token): never {
	throw new FormulaRefused(
		token,
		'too-deep',
		`More than ${FORMULA_LIMITS.depth} brackets stand inside one another here.`,
		'Give the inner part a name of its own, as a value on the way.'
	);
}

function refuseSign(
	source: string,
	from: number,
	foreign: readonly [RegExp, string, string] | undefined
): never {
	// By code point, so that a sign outside the first plane is shown whole.
	const sign = String.fromCodePoint(source.codePointAt(from) ?? 0);
	throw new FormulaRefused(
		{ from, to: from + sign.length },
		foreign ? `no-${foreign[1]}` : 'unknown-sign',
		`${quoted(sign)} has no meaning in a formula.`,
		foreign?.[2] ?? 'Use numbers, names, + - * / ^, comparisons, and, or, not, and round brackets.'
	);
}

/** True after something that has a value, so that a sign between two values is due. */
export function isOperand(token: Token | undefined): boolean {
	return token?.kind === 'number' || token?.kind === 'name' || token?.kind === 'close';
}
