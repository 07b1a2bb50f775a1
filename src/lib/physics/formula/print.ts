/** A formula tree in writing: plain, for messages, and as TeX, for a card. Brackets stand only where they are needed. */
import { FUNCTIONS } from './functions.ts';
import { isTruth, type BinarySign, type FormulaTree } from './tree.ts';

/** How tightly a sign binds; what binds less tightly than its surroundings needs brackets. */
const BINDS: Readonly<Record<BinarySign, number>> = {
	or: 1, and: 2, '<': 4, '<=': 4, '>': 4, '>=': 4, '==': 4, '!=': 4, '+': 5, '-': 5, '*': 6, '/': 6, '^': 8
}; // prettier-ignore
const PREFIX_BINDS = 7;
const LEAF_BINDS = 9;

function bindingOf(tree: FormulaTree): number {
	switch (tree.is) {
		case 'if':
			return 0;
		case 'binary':
			return BINDS[tree.sign];
		case 'unary':
			return PREFIX_BINDS;
		case 'number':
			return tree.value < 0 ? PREFIX_BINDS : LEAF_BINDS;
		case 'name':
		case 'call':
			return LEAF_BINDS;
	}
}

/** As a person would type it: `2*pi*sqrt(a^3/(G*M))`. Parsing it gives the same tree. */
export function formulaText(tree: FormulaTree): string {
	const within = (part: FormulaTree, least: number): string => {
		const text = formulaText(part);
		return bindingOf(part) < least ? `(${text})` : text;
	};
	switch (tree.is) {
		case 'number':
			return String(tree.value).replace('e+', 'e');
		case 'name':
			return tree.name;
		case 'unary':
			return tree.sign === '-'
				? `-${within(tree.of, PREFIX_BINDS + 1)}`
				: `not ${within(tree.of, LEAF_BINDS)}`;
		case 'binary': {
			const binds = BINDS[tree.sign];
			const isPower = tree.sign === '^';
			const left = within(tree.left, isPower || isTruth(tree) ? binds + 1 : binds);
			const right = within(tree.right, isPower ? PREFIX_BINDS : binds + 1);
			return '*/^'.includes(tree.sign)
				? `${left}${tree.sign}${right}`
				: `${left} ${tree.sign} ${right}`;
		}
		case 'call':
			return `${tree.name}(${tree.args.map(formulaText).join(', ')})`;
		case 'if':
			return `${within(tree.test, 1)} ? ${within(tree.then, 1)} : ${formulaText(tree.otherwise)}`;
	}
}

const TEX_SIGNS: Readonly<Record<Exclude<BinarySign, '/' | '^'>, string>> = {
	'+': '+', '-': '-', '*': '\\,', '<': '<', '<=': '\\le', '>': '>', '>=': '\\ge', '==': '=', '!=': '\\ne',
	and: '\\text{ and }', or: '\\text{ or }'
}; // prettier-ignore

/** A formula as TeX. `texOf` says how names are printed; by default as written, with what follows an underscore below. */
export function formulaTex(tree: FormulaTree, texOf: (name: string) => string = nameTex): string {
	const tex = (part: FormulaTree): string => formulaTex(part, texOf);
	const within = (part: FormulaTree, least: number): string =>
		bindingOf(part) < least ? `\\left(${tex(part)}\\right)` : tex(part);
	switch (tree.is) {
		case 'number':
			return numberTex(tree.value);
		case 'name':
			return texOf(tree.name);
		case 'unary':
			return tree.sign === '-'
				? `-${within(tree.of, BINDS['*'])}`
				: `\\text{not }${within(tree.of, LEAF_BINDS)}`;
		case 'binary':
			return binaryTex(tree, tex, within);
		case 'call':
			return callTex(tree.name, tree.args.map(tex));
		case 'if':
			return `\\begin{cases}${tex(tree.then)} & \\text{if }${tex(tree.test)}\\\\ ${tex(tree.otherwise)} & \\text{otherwise}\\end{cases}`;
	}
}

function binaryTex(
	{ sign, left, right }: Extract<FormulaTree, { is: 'binary' }>,
	tex: (part: FormulaTree) => string,
	within: (part: FormulaTree, least: number) => string
): string {
	if (sign === '/') return `\\frac{${tex(left)}}{${tex(right)}}`;
	if (sign === '^') {
		// A fraction, a function and a power of ten need their brackets too before they are raised.
		const base =
			left.is === 'name' || isPlainNumber(left) ? tex(left) : `\\left(${tex(left)}\\right)`;
		return `{${base}}^{${tex(right)}}`;
	}
	const binds = BINDS[sign];
	const [before, after] = [
		within(left, isTruth({ is: 'binary', sign, left, right }) ? binds + 1 : binds),
		within(right, binds + 1)
	];
	// Between digits a thin space would read as one number.
	const times = sign === '*' && /^[\d\\]/.test(after) && startsWithDigit(right);
	return `${before} ${times ? '\\cdot' : TEX_SIGNS[sign]} ${after}`;
}

function isPlainNumber(tree: FormulaTree): boolean {
	return tree.is === 'number' && /^[\d.]+$/.test(numberTex(tree.value));
}

function startsWithDigit(tree: FormulaTree): boolean {
	if (tree.is === 'number') return true;
	return tree.is === 'binary' && tree.sign !== '/' && startsWithDigit(tree.left);
}

function callTex(name: keyof typeof FUNCTIONS, args: string[]): string {
	const [a = '', b = ''] = args;
	switch (name) {
		case 'abs':
			return `\\left|${a}\\right|`;
		case 'sqrt':
			return `\\sqrt{${a}}`;
		case 'cbrt':
			return `\\sqrt[3]{${a}}`;
		case 'floor':
			return `\\left\\lfloor ${a}\\right\\rfloor`;
		case 'ceil':
			return `\\left\\lceil ${a}\\right\\rceil`;
		case 'exp':
			return `\\mathrm{e}^{${a}}`;
		case 'expm1':
			return `\\left(\\mathrm{e}^{${a}} - 1\\right)`;
		case 'log1p':
			return `\\ln\\left(1 ${a.startsWith('-') ? a : `+ ${a}`}\\right)`;
		case 'hypot':
			return `\\sqrt{\\left(${a}\\right)^{2} + \\left(${b}\\right)^{2}}`;
		default:
			return `${FUNCTIONS[name].tex}\\left(${args.join(', ')}\\right)`;
	}
}

const GREEK = new Set(
	(
		'alpha beta gamma delta epsilon zeta eta theta iota kappa lambda mu nu xi rho sigma tau phi chi psi omega ' +
		'Gamma Delta Theta Lambda Xi Sigma Phi Psi Omega'
	).split(' ')
);

/** `mass_before` as a word with a word below it; one letter as a variable; Greek letters by their names. */
export function nameTex(name: string): string {
	const [head = '', ...below] = name.split('_').filter((part) => part !== '');
	const lead = GREEK.has(head) ? `\\${head}` : head.length === 1 ? head : `\\mathrm{${head}}`;
	return below.length > 0 ? `{${lead}}_{\\mathrm{${below.join('\\,')}}}` : lead;
}

/** Large and small numbers in powers of ten, so that nobody has to count noughts. */
function numberTex(value: number): string {
	const size = Math.abs(value);
	const plain = size === 0 || (size >= 1e-4 && size < 1e6);
	const [digits = '', exponent] = (plain ? String(value) : value.toExponential()).split('e');
	if (exponent === undefined) return digits;
	const power = `10^{${Number(exponent)}}`;
	return digits === '1' ? power : `${digits}\\times ${power}`;
}
