/** What a caller says of how well the inputs are known, checked against the inputs themselves. */
import { refuse, type Calculator, type RawInputs, type Refusal } from '../calculator.ts';
import {
	COSMOLOGY_PARAMETERS,
	resolveCosmology,
	type CosmologyParameters
} from '../calculators/cosmology/parameters.ts';
import { nearestOf } from '../calculators/nearest.ts';
import { constants } from '../constants/index.ts';
import { cosmologySetOf, cosmologyKeyOf } from './own.ts';
import { correlationMatrix, triangleOf, type Correlation, type Spread } from './spread.ts';

export interface GivenUncertainties {
	/** Standard uncertainties by input key, in the input's unit; `cosmology.H0` reaches into a parameter set. */
	uncertainties: Readonly<Record<string, unknown>>;
	/** `["cosmology.H0", "cosmology.Om0", -0.98]`; pairs that aren't named are independent. */
	correlations?: readonly unknown[];
}

type Checked<T> = { ok: true; value: T } | { ok: false; refusal: Refusal };

/** Names in the spread are the keys as given. `inputs` are ones that the calculator takes. */
export function checkGiven(
	calculator: Calculator,
	inputs: RawInputs,
	{ uncertainties, correlations = [] }: GivenUncertainties
): Checked<Spread> {
	const quantities: { name: string; value: number; u: number }[] = [];
	for (const [name, u] of Object.entries(uncertainties)) {
		const value = valueOf(calculator, inputs, name);
		if (!value.ok) return value;
		if (typeof u !== 'number' || !Number.isFinite(u) || u < 0) {
			return refuse(
				'uncertainty-broken',
				`The standard uncertainty of “${name}” must be a number of at least 0, in the unit of the input.`,
				name
			);
		}
		if (u > 0) quantities.push({ name, value: value.value, u });
	}
	const pairs: Correlation[] = [];
	for (const given of correlations) {
		const pair = checkPair(given, Object.keys(uncertainties));
		if (!pair.ok) return pair;
		pairs.push(pair.value);
	}
	const spread = { quantities, correlations: pairs };
	const untied = untiedParameters(calculator, spread);
	if (untied) {
		return refuse(
			'correlation-missing',
			`Parameters of one universe are tied to each other. Give the correlation of “${untied[0]}” with “${untied[1]}”.`,
			untied[1]
		);
	}
	if (triangleOf(correlationMatrix(spread)) === null) {
		return refuse(
			'correlations-impossible',
			'These correlations can’t all hold at once. Check their signs and sizes.'
		);
	}
	return { ok: true, value: spread };
}

function valueOf(calculator: Calculator, inputs: RawInputs, name: string): Checked<number> {
	const [head = name, part] = name.split('.');
	const spec = Object.hasOwn(calculator.inputs, head) ? calculator.inputs[head] : undefined;
	if (!spec) {
		const near = nearestOf(head, Object.keys(calculator.inputs));
		const hint = near ? `Did you mean “${near}”?` : 'Name one of its inputs.';
		return refuse(
			'unknown-input',
			`“${calculator.title}” has no input “${name.slice(0, 40)}”. ${hint}`,
			name
		);
	}
	if (spec.kind === 'cosmology') return parameterOf(calculator, inputs, head, part);
	if (spec.kind !== 'number' || spec.whole || part !== undefined) {
		return refuse(
			'no-spread',
			`${spec.label} can’t carry an uncertainty: only an input that is one number, not a count, can.`,
			name
		);
	}
	const value = inputs[head];
	return typeof value === 'number'
		? { ok: true, value }
		: refuse(
				'uncertainty-without-value',
				`“${head}” has an uncertainty and no value. Give its value too.`,
				name
			);
}

function parameterOf(
	calculator: Calculator,
	inputs: RawInputs,
	head: string,
	part: string | undefined
): Checked<number> {
	const name = part === undefined ? head : `${head}.${part}`;
	if (part === undefined || !Object.hasOwn(COSMOLOGY_PARAMETERS, part)) {
		return refuse(
			'unknown-parameter',
			`Name a parameter of the universe, such as “${head}.H0”, to give it an uncertainty.`,
			name
		);
	}
	const set = cosmologySetOf(calculator, inputs);
	if (set !== null && constants.cosmologies[set].published?.correlation) {
		return refuse(
			'set-has-its-own',
			`The set “${set}” brings its own uncertainties, as published. Leave “${name}” out, or give the parameters one by one without a set.`,
			name
		);
	}
	const resolved = resolveCosmology(inputs[head], head);
	if (!resolved.ok) return resolved;
	const value = resolved.value[part as keyof CosmologyParameters];
	return typeof value === 'number'
		? { ok: true, value }
		: refuse(
				'uncertainty-without-value',
				`“${name}” follows from the other parameters here. Give its value before its uncertainty.`,
				name
			);
}

function checkPair(given: unknown, names: readonly string[]): Checked<Correlation> {
	const [one, other, r] = Array.isArray(given) ? (given as unknown[]) : [];
	const named = (name: unknown): name is string => typeof name === 'string' && names.includes(name);
	if (!named(one) || !named(other) || one === other || typeof r !== 'number' || !(r ** 2 <= 1)) {
		return refuse(
			'correlation-broken',
			'A correlation is two inputs that have uncertainties and a number from −1 to 1: ["cosmology.H0", "cosmology.Om0", -0.98].'
		);
	}
	return { ok: true, value: [one, other, r] };
}

/** Two uncertain parameters of the universe that no correlation ties. */
function untiedParameters(
	calculator: Calculator,
	{ quantities, correlations }: Spread
): [string, string] | null {
	const key = cosmologyKeyOf(calculator);
	const parameters = quantities
		.map(({ name }) => name)
		.filter((name) => key !== undefined && name.startsWith(`${key}.`));
	for (const [index, one] of parameters.entries()) {
		const other = parameters
			.slice(index + 1)
			.find(
				(name) =>
					!correlations.some(([a, b]) => (a === one && b === name) || (a === name && b === one))
			);
		if (other !== undefined) return [one, other];
	}
	return null;
}
