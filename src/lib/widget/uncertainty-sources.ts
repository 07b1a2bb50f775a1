/** What isn't exact behind a reading, and how each of it is moved when the chain is worked again. */
import type { Calculator, CalculatorSet, RawInputs, Result } from '../physics/calculator.ts';
import type { CosmologySetName } from '../physics/constants/index.ts';
import {
	BY_HAND,
	carriedNote,
	cosmologyKeyOf,
	cosmologySetOf,
	ownUncertaintyOf,
	publishedNote,
	spreadOfSet,
	type OwnUncertainty
} from '../physics/uncertainty/own.ts';
import type { Correlation, UncertainQuantity } from '../physics/uncertainty/spread.ts';
import type { Step } from './document.ts';

/** A step's inputs, and its result as if they were exact. */
export interface Worked {
	inputs: RawInputs;
	result: Result;
}

export type Sources =
	| {
			ok: true;
			quantities: UncertainQuantity[];
			correlations: Correlation[];
			note: string | null;
	  }
	| { ok: false; reason: string };

/** An output that the reading, or a step before it, takes; and what makes it uncertain by itself. */
interface Taken {
	step: string;
	output: string;
	own: OwnUncertainty;
}

/**
 * What isn't exact behind a reading: parameters of each published set, shared by all steps that use it, and a shift of
 * each output whose calculator rests on measured constants. A published uncertainty stands in for its set where
 * nothing else takes the set.
 */
export function sourcesOf(
	steps: readonly Step[],
	ref: { step: string; output: string },
	worked: ReadonlyMap<string, Worked>,
	calculators: CalculatorSet
): Sources {
	const taken = takenOutputs(steps, ref).flatMap(({ step, output }): Taken[] => {
		const calculator = calculators.get(steps.find(({ id }) => id === step)?.calculator ?? '');
		const at = worked.get(step);
		const reading = at?.result.ok ? at.result.outputs[output] : undefined;
		return calculator && at && reading
			? [{ step, output, own: ownUncertaintyOf(calculator, at.inputs, output, reading) }]
			: [];
	});

	const quantities: UncertainQuantity[] = [];
	const correlations: Correlation[] = [];
	const notes: string[] = [];
	const shift = ({ step, output }: Taken, kind: string, u: number) =>
		quantities.push({ name: `${kind}:${step}.${output}`, value: 0, u });

	for (const one of taken) {
		if (one.own.kind === 'unknown') return { ok: false, reason: one.own.reason };
		if (one.own.kind === 'by-hand') return { ok: false, reason: BY_HAND };
		if (one.own.kind === 'constants') shift(one, CONSTANTS, one.own.u);
	}
	const sets = new Set(taken.flatMap(({ own }) => (own.kind === 'set' ? [own.set] : [])));
	for (const set of sets) {
		const users = taken.filter(({ own }) => own.kind === 'set' && own.set === set);
		const [only] = users;
		if (users.length === 1 && only?.own.kind === 'set' && only.own.published !== null) {
			shift(only, PUBLISHED, only.own.published);
			notes.push(publishedNote(set));
			continue;
		}
		const fit = spreadOfSet(set);
		if (!fit.ok) return fit;
		quantities.push(
			...fit.spread.quantities.map((one) => ({ ...one, name: parameterName(set, one.name) }))
		);
		correlations.push(
			...fit.spread.correlations.map(
				([a, b, r]) => [parameterName(set, a), parameterName(set, b), r] as const
			)
		);
		notes.push(carriedNote(set));
	}
	return { ok: true, quantities, correlations, note: notes.join(' ') || null };
}

/** Names of the shifts due to measured constants start so. */
export const CONSTANTS = 'constants';
const PUBLISHED = 'published';
const parameterName = (set: CosmologySetName, key: string) => `set:${set}.${key}`;

function takenOutputs(
	steps: readonly Step[],
	ref: { step: string; output: string }
): { step: string; output: string }[] {
	const all = [
		...steps.flatMap(({ settings }) =>
			Object.values(settings).flatMap((source) =>
				source.from === 'reading' ? [{ step: source.step, output: source.output }] : []
			)
		),
		ref
	];
	return [...new Map(all.map((one) => [`${one.step}.${one.output}`, one])).values()];
}

/** Inputs with the parameters of their published set moved. */
export function inSet(
	calculator: Calculator,
	inputs: RawInputs,
	moved: ReadonlyMap<string, number>
): RawInputs {
	const key = cosmologyKeyOf(calculator);
	const set = cosmologySetOf(calculator, inputs);
	if (key === undefined || set === null) return inputs;
	const prefix = parameterName(set, '');
	const parameters = [...moved].flatMap(([name, value]) =>
		name.startsWith(prefix) ? [[name.slice(prefix.length), value] as const] : []
	);
	return { ...inputs, [key]: { ...(inputs[key] as object), ...Object.fromEntries(parameters) } };
}

/** A result with its outputs shifted by what their own constants leave open. */
export function shifted(step: Step, result: Result, moved: ReadonlyMap<string, number>): Result {
	if (!result.ok) return result;
	const outputs = { ...result.outputs };
	for (const [key, reading] of Object.entries(outputs)) {
		const name = `${step.id}.${key}`;
		const by = moved.get(`${CONSTANTS}:${name}`) ?? moved.get(`${PUBLISHED}:${name}`);
		if (by !== undefined && typeof reading.value === 'number') {
			outputs[key] = { ...reading, value: reading.value + by };
		}
	}
	return { ...result, outputs };
}
