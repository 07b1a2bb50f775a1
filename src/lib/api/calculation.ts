/**
 * One calculation as JSON: what `npm run calc` reads and writes a line at a time, and what
 * POST /api/v1/calculators/{id} answers. Anything a person can send wrong comes back as `refused`.
 */
import {
	type Calculator,
	type CalculatorDefinition,
	type CalculatorSet,
	type InputSpec,
	type Refusal,
	type DrawnSpread,
	type Reading,
	type Result,
	type Uncertainty,
	type Validity,
	type Warning
} from '../physics/calculator.ts';
import { COSMOLOGY_PARAMETERS } from '../physics/calculators/cosmology/parameters.ts';
import { catalogue } from '../physics/calculators/index.ts';
import { nearestOf } from '../physics/calculators/nearest.ts';
import { runCalculator } from '../physics/calculators/run.ts';
import { constants } from '../physics/constants/index.ts';
import { runWithUncertainty } from '../physics/uncertainty/run-with-uncertainty.ts';

export interface CalculationRequest {
	calculator: string;
	inputs: Record<string, unknown>;
	/** Standard uncertainties by input key; given, even empty, the answer tells the outputs' uncertainties. */
	uncertainties?: Record<string, number>;
	/** `["cosmology.H0", "cosmology.Om0", -0.98]`: correlations of inputs that have uncertainties. */
	correlations?: [string, string, number][];
}

export interface AnsweredReading {
	value: number | string;
	unit: string;
	/** These three only when uncertainties were asked for: standard uncertainty in `unit`, how it was found, and its draws. */
	uncertainty?: Uncertainty;
	note?: string;
	drawn?: DrawnSpread;
}

export interface Refused {
	code: string;
	/** Names inputs as people do. */
	message: string;
	/** Key of the input that caused it, where one did. */
	input?: string;
}

export type CalculationAnswer =
	| {
			outputs: Record<string, AnsweredReading>;
			warnings: Warning[];
			validity: Validity;
			/** Present only when a declared output has no value for these inputs. */
			withheld?: Record<string, { code: string; message: string }>;
	  }
	| { refused: Refused };

/** What may be run here. */
export interface OfferedCalculators {
	calculators: CalculatorSet;
	/** Why a calculator that is there isn't run; null for one that isn't there at all. */
	withheld(id: string): { code: string; message: string } | null;
}

/** Without a house: what comes with the software. */
const SOFTWARE: OfferedCalculators = {
	calculators: catalogue,
	withheld: (id) =>
		id.startsWith(HOUSE_PREFIX)
			? {
					code: 'calculator-of-a-house',
					message: `“${id.slice(0, 60)}” belongs to a house, and this command knows none. Ask the house: POST /api/v1/calculators/${encodeURIComponent(id.slice(0, 60))}.`
				}
			: null
};

/** Runs one request of any shape. Never throws on what was sent. */
export function calculate(
	request: unknown,
	{ calculators, withheld }: OfferedCalculators = SOFTWARE
): CalculationAnswer {
	if (!isRecord(request)) {
		return refused('request-broken', 'A calculation is an object with “calculator” and “inputs”.');
	}
	const stray = Object.keys(request).find((key) => !MEMBERS.includes(key));
	if (stray !== undefined) {
		return refused(
			'request-broken',
			`“${stray.slice(0, 40)}” isn't known here. Send “calculator” and “inputs”, and “uncertainties” and “correlations” where you want them carried.`
		);
	}
	const { calculator: id, inputs, uncertainties, correlations } = request;
	if (typeof id !== 'string') {
		return refused(
			'request-broken',
			'“calculator” is missing. Give the id of one, such as “cosmo.at_z”.'
		);
	}
	const calculator = calculators.get(id);
	if (!calculator) {
		const why = withheld(id);
		if (why) return { refused: why };
		const near = nearestOf(id, [...calculators.keys()]);
		const hint = near
			? `Did you mean “${near}”?`
			: `There are ${[...calculators.keys()].join(', ')}.`;
		return refused('unknown-calculator', `There is no calculator “${id.slice(0, 60)}”. ${hint}`);
	}
	if (!isRecord(inputs)) {
		return refused('inputs-broken', '“inputs” must be an object with one entry for each input.');
	}
	if (uncertainties === undefined && correlations === undefined) {
		return answerOf(runCalculator(calculator, inputs));
	}
	if (!isRecord(uncertainties)) {
		return refused(
			'uncertainties-broken',
			'“uncertainties” must be an object with a standard uncertainty for each input that has one.'
		);
	}
	if (correlations !== undefined && !Array.isArray(correlations)) {
		return refused(
			'correlations-broken',
			'“correlations” must be a list such as [["cosmology.H0", "cosmology.Om0", -0.98]].'
		);
	}
	return uncertainAnswerOf(
		runWithUncertainty(calculator, inputs, { uncertainties, correlations: correlations ?? [] })
	);
}

/** Ids of calculators that a house added start with it. */
const HOUSE_PREFIX = 'house.';

const MEMBERS = ['calculator', 'inputs', 'uncertainties', 'correlations'];

function uncertainAnswerOf(result: Result): CalculationAnswer {
	const answer = answerOf(result);
	if (!result.ok || 'refused' in answer) return answer;
	const outputs = Object.entries(result.outputs).map(
		([key, { value, unit, uncertainty, uncertaintyNote, drawn }]: [string, Reading]) => [
			key,
			{
				value,
				unit,
				uncertainty,
				...(uncertaintyNote === undefined ? {} : { note: uncertaintyNote }),
				...(drawn === undefined ? {} : { drawn })
			}
		]
	);
	return { ...answer, outputs: Object.fromEntries(outputs) };
}

/** A result as the public sees it: values and units, without the bench's bookkeeping. */
export function answerOf(result: Result): CalculationAnswer {
	if (!result.ok) {
		const { code, message, input } = result.refusal;
		return { refused: { code, message, ...(input === undefined ? {} : { input }) } };
	}
	const outputs = Object.fromEntries(
		Object.entries(result.outputs).map(([key, { value, unit }]) => [key, { value, unit }])
	);
	const answer = { outputs, warnings: result.warnings, validity: result.validity };
	if (!result.withheld) return answer;
	const withheld = Object.entries(result.withheld).map(
		([key, { code, message }]: [string, Refusal]) => [key, { code, message }]
	);
	return { ...answer, withheld: Object.fromEntries(withheld) };
}

export type InputDescription = InputSpec & { sets?: object; parameters?: object };

export type CalculatorDescription = Omit<CalculatorDefinition, 'compute' | 'curve' | 'inputs'> & {
	inputs: Record<string, InputDescription>;
};

/** Every calculator as plain JSON: ids, inputs, outputs, units, ranges, equations, sources and checks. */
export function describeCalculators(
	calculators: CalculatorSet = catalogue
): CalculatorDescription[] {
	return [...calculators.values()].map(describeCalculator);
}

export function describeCalculator({
	compute: _compute,
	curve: _curve,
	inputs,
	...rest
}: Calculator): CalculatorDescription {
	const described = Object.entries(inputs).map(([key, spec]): [string, InputDescription] => [
		key,
		spec.kind === 'cosmology'
			? { ...spec, sets: constants.cosmologies, parameters: COSMOLOGY_PARAMETERS }
			: spec
	]);
	return { ...rest, inputs: Object.fromEntries(described) };
}

function refused(code: string, message: string): CalculationAnswer {
	return { refused: { code, message } };
}

function isRecord(value: unknown): value is Record<string, unknown> {
	return typeof value === 'object' && value !== null && !Array.isArray(value);
}
