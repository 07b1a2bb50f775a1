/** The functions a formula may call: real ones of a fixed number of numbers, each with what it does to dimensions. */

/**
 * `pure`: takes pure numbers (or angles) and gives one. `angle`: takes pure numbers and gives an angle.
 * `root`: takes anything and gives that root of its dimension. `same`: arguments alike, result as they are.
 * `alike-angle`: arguments alike, gives an angle. `sign`: takes anything, gives a pure number.
 */
export type DimensionRule =
	'pure' | 'angle' | 'root-2' | 'root-3' | 'same' | 'alike-angle' | 'sign';

export interface FormulaFunction {
	arity: 1 | 2;
	rule: DimensionRule;
	/** How a card prints it, without its argument. */
	tex: string;
	/** What it is, for lists and hints. */
	says: string;
	work: (a: number, b: number) => number;
}

/** To the nearest whole number; a half goes away from nought, on either side of it. */
function roundHalfAway(value: number): number {
	return value < 0 ? -Math.round(-value) : Math.round(value);
}

export const FUNCTIONS = {
	abs: { arity: 1, rule: 'same', tex: '', says: 'size without sign', work: Math.abs },
	sqrt: { arity: 1, rule: 'root-2', tex: '', says: 'square root', work: Math.sqrt },
	cbrt: { arity: 1, rule: 'root-3', tex: '', says: 'cube root', work: Math.cbrt },
	exp: { arity: 1, rule: 'pure', tex: '\\exp', says: 'e to the power', work: Math.exp },
	expm1: { arity: 1, rule: 'pure', tex: '', says: 'e to the power, less 1', work: Math.expm1 },
	ln: { arity: 1, rule: 'pure', tex: '\\ln', says: 'natural logarithm', work: Math.log },
	log1p: { arity: 1, rule: 'pure', tex: '', says: 'natural logarithm of 1 more', work: Math.log1p },
	log2: { arity: 1, rule: 'pure', tex: '\\log_2', says: 'logarithm to base 2', work: Math.log2 },
	log10: {
		arity: 1,
		rule: 'pure',
		tex: '\\log_{10}',
		says: 'logarithm to base 10',
		work: Math.log10
	},
	sin: { arity: 1, rule: 'pure', tex: '\\sin', says: 'sine', work: Math.sin },
	cos: { arity: 1, rule: 'pure', tex: '\\cos', says: 'cosine', work: Math.cos },
	tan: { arity: 1, rule: 'pure', tex: '\\tan', says: 'tangent', work: Math.tan },
	asin: { arity: 1, rule: 'angle', tex: '\\arcsin', says: 'angle of a sine', work: Math.asin },
	acos: { arity: 1, rule: 'angle', tex: '\\arccos', says: 'angle of a cosine', work: Math.acos },
	atan: { arity: 1, rule: 'angle', tex: '\\arctan', says: 'angle of a tangent', work: Math.atan },
	atan2: {
		arity: 2,
		rule: 'alike-angle',
		tex: '\\operatorname{atan2}',
		says: 'angle of y over x',
		work: Math.atan2
	},
	sinh: { arity: 1, rule: 'pure', tex: '\\sinh', says: 'hyperbolic sine', work: Math.sinh },
	cosh: { arity: 1, rule: 'pure', tex: '\\cosh', says: 'hyperbolic cosine', work: Math.cosh },
	tanh: { arity: 1, rule: 'pure', tex: '\\tanh', says: 'hyperbolic tangent', work: Math.tanh },
	asinh: {
		arity: 1,
		rule: 'pure',
		tex: '\\operatorname{arsinh}',
		says: 'inverse of sinh',
		work: Math.asinh
	},
	acosh: {
		arity: 1,
		rule: 'pure',
		tex: '\\operatorname{arcosh}',
		says: 'inverse of cosh',
		work: Math.acosh
	},
	atanh: {
		arity: 1,
		rule: 'pure',
		tex: '\\operatorname{artanh}',
		says: 'inverse of tanh',
		work: Math.atanh
	},
	min: { arity: 2, rule: 'same', tex: '\\min', says: 'smaller of two', work: Math.min },
	max: { arity: 2, rule: 'same', tex: '\\max', says: 'larger of two', work: Math.max },
	hypot: {
		arity: 2,
		rule: 'same',
		tex: '',
		says: 'root of the sum of two squares',
		work: Math.hypot
	},
	floor: { arity: 1, rule: 'pure', tex: '', says: 'next whole number below', work: Math.floor },
	ceil: { arity: 1, rule: 'pure', tex: '', says: 'next whole number above', work: Math.ceil },
	round: {
		arity: 1,
		rule: 'pure',
		tex: '\\operatorname{round}',
		says: 'nearest whole number',
		work: roundHalfAway
	},
	sign: { arity: 1, rule: 'sign', tex: '\\operatorname{sgn}', says: '−1, 0 or 1', work: Math.sign }
} as const satisfies Record<string, FormulaFunction>;

export type FunctionName = keyof typeof FUNCTIONS;

export function isFunctionName(name: unknown): name is FunctionName {
	return typeof name === 'string' && Object.hasOwn(FUNCTIONS, name);
}
