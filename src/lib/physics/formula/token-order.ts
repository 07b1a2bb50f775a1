/** Whether each token stands where one of its kind may stand, and brackets, choices and arguments come out even. */
import { FUNCTIONS, isFunctionName } from './functions.ts';
import { FormulaRefused, quoted } from './problem.ts';
import { isOperand, type Token } from './tokens.ts';
import { FORMULA_LIMITS } from './tree.ts';

/** Words that stand between two values elsewhere. */
const NO_SIGNS: Readonly<Record<string, string>> = {
	mod: 'For what is left over, write x - y*floor(x/y).',
	xor: 'Write (a or b) and not (a and b), with a test for each.',
	to: 'Take it out: an output is stated in the unit that is chosen for it.',
	in: 'Take it out: an output is stated in the unit that is chosen for it.',
	not: 'Write the word and, or the word or, before it.'
};

/** A bracket, and what is open inside it: how many “?” wait for their “:”, and for a call its commas. */
interface Level {
	open: Token | undefined;
	call: { token: Token; commas: number } | undefined;
	waiting: Token[];
	/** Minus signs, nots and powers in a row, each of which stands inside the one before it. */
	chain: number;
}

/** @throws {FormulaRefused} at the first that doesn't. */
export function checkOrder(tokens: readonly Token[], source: string): void {
	const levels: Level[] = [{ open: undefined, call: undefined, waiting: [], chain: 0 }];
	let before: Token | undefined;
	for (const token of tokens) {
		const level = levels.at(-1) as Level;
		const operandDue = !isOperand(before);
		switch (token.kind) {
			case 'number':
			case 'name':
			case 'function':
				if (!operandDue) refuseNeighbours(before as Token, token, source);
				break;
			case 'prefix':
				level.chain += 1;
				break;
			case 'open':
				if (!operandDue) refuseNeighbours(before as Token, token, source);
				levels.push({
					open: token,
					call: before?.kind === 'function' ? { token: before, commas: 0 } : undefined,
					waiting: [],
					chain: 0
				});
				break;
			case 'close':
				if (levels.length === 1) {
					throw new FormulaRefused(
						token,
						'bracket-not-open',
						'This bracket closes nothing.',
						'Take it out, or open one before it.'
					);
				}
				if (operandDue) refuseGap(before, token);
				refuseWaiting(level);
				checkArity(level);
				levels.pop();
				break;
			case 'comma':
				if (operandDue) refuseGap(before, token);
				refuseWaiting(level);
				if (!level.call) {
					throw new FormulaRefused(
						token,
						'comma',
						'A comma stands only between the arguments of a function.',
						'Write decimals with a point: 1.5.'
					);
				}
				level.call.commas += 1;
				level.chain = 0;
				break;
			case 'sign':
				if (operandDue) refuseGap(before, token);
				level.chain = token.text === '^' ? level.chain + 1 : 0;
				if (token.text === '?') level.waiting.push(token);
				if (token.text === ':' && !level.waiting.pop()) {
					throw new FormulaRefused(
						token,
						'range',
						'A colon stands only after a “?”; there are no ranges.',
						'Write test ? value : other value.'
					);
				}
				break;
		}
		if (levels.reduce((sum, { chain }) => sum + chain, 0) >= FORMULA_LIMITS.depth)
			refuseChain(token);
		before = token;
	}
	if (!isOperand(before)) refuseGap(before, undefined);
	const level = levels.at(-1) as Level;
	refuseWaiting(level);
	if (level.open) {
		throw new FormulaRefused(
			level.open,
			'bracket-not-closed',
			'This bracket is never closed.',
			'Close it, or take it out.'
		);
	}
}

function refuseChain(token: Token): never {
	throw new FormulaRefused(
		token,
		'too-deep',
		`More than ${FORMULA_LIMITS.depth} signs stand inside one another here.`,
		'Give the inner part a name of its own, as a value on the way.'
	);
}

function refuseNeighbours(before: Token, token: Token, source: string): never {
	const [left, right] = [before.text, token.text];
	const word = [token, before].find(({ text }) => Object.hasOwn(NO_SIGNS, text));
	if (word) {
		throw new FormulaRefused(
			word,
			'no-word-sign',
			`${quoted(word.text)} has no meaning in a formula.`,
			NO_SIGNS[word.text] as string
		);
	}
	const isCall = token.kind === 'open' && before.kind === 'name';
	throw new FormulaRefused(
		{ from: before.from, to: token.to },
		'sign-missing',
		before.kind === 'number' && token.kind === 'number'
			? `${quoted(source.slice(before.from, token.to))} is no number.`
			: `Between ${quoted(left)} and ${quoted(right)} a sign is missing.`,
		isCall || token.kind !== 'number' || before.kind !== 'number'
			? `Write the *: ${left === ')' ? '…)' : left.slice(0, 32)}*${right === '(' ? '(…' : right.slice(0, 32)}.`
			: 'Write one number, with a point for the decimals.'
	);
}

function refuseGap(before: Token | undefined, token: Token | undefined): never {
	const at = token ?? before ?? { from: 0, to: 0 };
	if (token?.text === '+' && before?.text !== '+') {
		throw new FormulaRefused(
			token,
			'plus-alone',
			'This + has nothing before it.',
			'Leave it out, or put a value before it.'
		);
	}
	throw new FormulaRefused(
		at,
		'value-missing',
		token
			? `A value is missing before ${quoted(token.text)}.`
			: `A value is missing after ${quoted(before?.text ?? '')}.`,
		'Put a number, a name or a bracket there, or take the sign out.'
	);
}

function refuseWaiting({ waiting }: Level): void {
	const [token] = waiting;
	if (!token) return;
	throw new FormulaRefused(
		token,
		'otherwise-missing',
		'This “?” has no “:” after it.',
		'Write test ? value : other value.'
	);
}

function checkArity({ call }: Level): void {
	if (!call || !isFunctionName(call.token.text)) return;
	const { arity } = FUNCTIONS[call.token.text];
	const given = call.commas + 1;
	if (given === arity) return;
	throw new FormulaRefused(
		call.token,
		'arguments',
		`${quoted(call.token.text)} takes ${arity === 1 ? 'one value' : 'two values'}; ${given} ${given === 1 ? 'is' : 'are'} given.`,
		arity === 2 && given > 2
			? `Nest it: ${call.token.text}(a, ${call.token.text}(b, c)).`
			: `Write ${call.token.text}(${arity === 1 ? 'a' : 'a, b'}).`
	);
}
