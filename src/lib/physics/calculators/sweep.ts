/** One output of a calculator against one of its inputs, all other inputs standing still. */
import { resolveUnit, type Calculator, type NumberInput, type RawInputs } from '../calculator.ts';
import { COSMOLOGY_PARAMETERS } from './cosmology/parameters.ts';
import { sweepCalculator } from './sweep-calculator.ts';

export const SWEEP_POINTS = 200;

/** An input that a line can run along. A parameter of a set has a key in two parts: `cosmology.H0`. */
export interface Sweepable {
	key: string;
	label: string;
	unit: string;
	spec: Omit<NumberInput, 'kind'>;
}

export interface Sweep {
	input: string;
	output: string;
	/** In the input's unit; `from` lies below `to`. */
	from: number;
	to: number;
	/** Points at even ratios; both ends lie above nought then. */
	log: boolean;
}

export interface SweptPoint {
	x: number;
	/** In the output's unit; null where there is no reading. */
	y: number | null;
	/** Why there is none. */
	refusal?: string;
	/** Sentences that come with the reading. */
	warnings?: string[];
}

/** Numbers of which one is given, and the parameters of a set; of a group those alone that stand in `inputs`. */
export function sweepables(calculator: Calculator, inputs: RawInputs): Sweepable[] {
	const grouped = new Set((calculator.oneOf ?? []).flat());
	return Object.entries(calculator.inputs).flatMap(([key, spec]): Sweepable[] => {
		if (spec.kind === 'number') {
			if (grouped.has(key) && inputs[key] === undefined) return [];
			return [{ key, label: spec.label, unit: resolveUnit(spec.unit, inputs), spec }];
		}
		if (spec.kind !== 'cosmology') return [];
		return Object.entries(COSMOLOGY_PARAMETERS).map(([part, parameter]) => ({
			key: `${key}.${part}`,
			label: parameter.label,
			unit: resolveUnit(parameter.unit, {}),
			spec: parameter
		}));
	});
}

/**
 * Where a line first runs: the good zone, or the domain. A domain of many decades that isn't measured by the logarithm
 * gives a stretch around the value that is set.
 */
export function firstStretch(
	{ spec }: Pick<Sweepable, 'spec'>,
	set: number | undefined
): Pick<Sweep, 'from' | 'to' | 'log'> {
	const low = spec.good?.min ?? spec.min;
	const high = spec.good?.max ?? spec.max;
	const at = set !== undefined && set >= low && set <= high ? set : spec.initial;
	const wide = at > 0 && high / (low > 0 ? low : at) > WIDE;
	const from = wide ? Math.max(low, at / AROUND) : low;
	const to = wide ? Math.min(high, at * AROUND) : high;
	const log = from > 0 && (spec.log === true || wide);
	return { from: Math.max(spec.min, tidy(from)), to: Math.min(spec.max, tidy(to)), log };
}
const WIDE = 1000;
const AROUND = 10;
const tidy = (value: number) => Number(value.toPrecision(3));

/** The places of the points, ends included; whole numbers where the input takes no others. */
export function sweepPlaces(
	{ from, to, log }: Pick<Sweep, 'from' | 'to' | 'log'>,
	whole = false,
	points = SWEEP_POINTS
): number[] {
	const places = Array.from({ length: points }, (_, index) => {
		const share = index / (points - 1);
		if (index === points - 1) return to;
		return log ? from * (to / from) ** share : from + (to - from) * share;
	});
	return whole ? [...new Set(places.map(Math.round))] : places;
}

/** The readings at these places. Refusals and readings that are words have no `y`. */
export function sweptPoints(
	calculator: Calculator,
	inputs: RawInputs,
	{ input, output }: Pick<Sweep, 'input' | 'output'>,
	places: readonly number[]
): SweptPoint[] {
	const swept = sweepCalculator(calculator, inputs, input, places);
	return places.map((x, index) => {
		const y = swept.columns[output]?.[index] ?? NaN;
		if (Number.isNaN(y)) {
			const refusal = swept.refusalAt(index, output)?.message ?? 'This output has no number here.';
			return { x, y: null, refusal };
		}
		const warnings = swept.warningsAt(index).map(({ message }) => message);
		return { x, y, ...(warnings.length > 0 ? { warnings } : {}) };
	});
}
