/**
 * The four signs and powers as closures. The commonest shapes, a slot or a number beside something, have closures of
 * their own: each saves a call.
 */
import type { Arithmetic } from './tree.ts';

export type SlotValues = Float64Array | readonly number[];
/** Takes the values of the slots, in the order in which they were named, in coherent SI units. */
export type CompiledFormula = (values: SlotValues) => number;

/** Part of a formula being compiled: a number known now, a slot to be read, or work to be done. */
export type Part =
	| { as: 'fixed'; value: number }
	| { as: 'slot'; at: number }
	| { as: 'work'; run: CompiledFormula };

export function runOf(part: Part): CompiledFormula {
	switch (part.as) {
		case 'fixed': {
			const { value } = part;
			return () => value;
		}
		case 'slot': {
			const { at } = part;
			return (values) => values[at] as number;
		}
		case 'work':
			return part.run;
	}
}

export function arithmetic(sign: Arithmetic, left: Part, right: Part): CompiledFormula {
	switch (sign) {
		case '+':
			return sum(left, right);
		case '-':
			return difference(left, right);
		case '*':
			return product(left, right);
		case '/':
			return quotient(left, right);
		case '^':
			return power(runOf(left), right);
	}
}

function sum(left: Part, right: Part): CompiledFormula {
	if (left.as !== 'work' && right.as === 'work') return sum(right, left);
	const a = runOf(left);
	if (right.as === 'fixed') {
		const { value } = right;
		return (values) => a(values) + value;
	}
	if (right.as === 'slot') {
		const { at } = right;
		return (values) => a(values) + (values[at] as number);
	}
	const b = right.run;
	return (values) => a(values) + b(values);
}

function difference(left: Part, right: Part): CompiledFormula {
	const b = runOf(right);
	if (left.as === 'fixed') {
		const { value } = left;
		return (values) => value - b(values);
	}
	if (left.as === 'slot') {
		const { at } = left;
		return (values) => (values[at] as number) - b(values);
	}
	const a = left.run;
	if (right.as === 'slot') {
		const { at } = right;
		return (values) => a(values) - (values[at] as number);
	}
	return (values) => a(values) - b(values);
}

function product(left: Part, right: Part): CompiledFormula {
	if ((left.as === 'fixed' && right.as !== 'fixed') || (left.as === 'slot' && right.as === 'work'))
		return product(right, left);
	if (left.as === 'slot') {
		const { at } = left;
		if (right.as === 'fixed') {
			const { value } = right;
			return (values) => (values[at] as number) * value;
		}
		if (right.as === 'slot') {
			const { at: other } = right;
			return (values) => (values[at] as number) * (values[other] as number);
		}
	}
	const a = runOf(left);
	if (right.as === 'fixed') {
		const { value } = right;
		return (values) => a(values) * value;
	}
	if (right.as === 'slot') {
		const { at } = right;
		return (values) => a(values) * (values[at] as number);
	}
	const b = right.run;
	return (values) => a(values) * b(values);
}

function quotient(left: Part, right: Part): CompiledFormula {
	const a = runOf(left);
	if (right.as === 'fixed') {
		const { value } = right;
		return (values) => a(values) / value;
	}
	if (right.as === 'slot') {
		const { at } = right;
		if (left.as === 'slot') {
			const { at: top } = left;
			return (values) => (values[top] as number) / (values[at] as number);
		}
		return (values) => a(values) / (values[at] as number);
	}
	const b = right.run;
	if (left.as === 'fixed') {
		const { value } = left;
		return (values) => value / b(values);
	}
	if (left.as === 'slot') {
		const { at } = left;
		return (values) => (values[at] as number) / b(values);
	}
	return (values) => a(values) / b(values);
}

/** Small whole powers by multiplication: several times as fast as a power, and rounded no worse. */
function power(base: CompiledFormula, exponent: Part): CompiledFormula {
	if (exponent.as === 'fixed') {
		const { value } = exponent;
		if (value === 2) {
			return (values) => {
				const x = base(values);
				return x * x;
			};
		}
		if (value === 3) {
			return (values) => {
				const x = base(values);
				return x * x * x;
			};
		}
		return (values) => Math.pow(base(values), value);
	}
	const b = runOf(exponent);
	return (values) => Math.pow(base(values), b(values));
}
