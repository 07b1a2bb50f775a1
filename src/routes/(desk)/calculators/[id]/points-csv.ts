/** The points of a line as a file: where they come from, then a head with units, then the numbers as they are. */
import type { Calculator, RawInputs } from '$lib/physics/calculator.ts';
import { resolveUnit } from '$lib/physics/calculator.ts';
import type { Sweep, Sweepable, SweptPoint } from '$lib/physics/calculators/sweep.ts';
import { csvOf, type Cell } from './csv.ts';
import { standIn } from './stand-in.ts';

export interface PointsFile {
	calculator: Calculator;
	/** Name of the constants edition. */
	constants: string;
	inputs: RawInputs;
	sweep: Sweep;
	along: Pick<Sweepable, 'label' | 'unit'>;
	points: readonly SweptPoint[];
}

export function fileName({ calculator, sweep }: Pick<PointsFile, 'calculator' | 'sweep'>): string {
	const parts = [calculator.id, calculator.revision, sweep.output, 'by', sweep.input];
	return `${parts.join('-').replace(/[^A-Za-z0-9.-]+/g, '_')}.csv`;
}

export function pointsCsv(file: PointsFile): string {
	const { calculator, constants, inputs, sweep, along, points } = file;
	const output = calculator.outputs[sweep.output];
	if (!output) throw new Error(`${calculator.id} has no output “${sweep.output}”.`);
	const unit = resolveUnit(output.unit, inputs);
	const steps = sweep.log ? 'at even ratios' : 'at even distances';
	const rows: Cell[][] = [
		[`# calculator: ${calculator.title} (${calculator.id}), revision ${calculator.revision}`],
		[`# constants: edition ${constants}`],
		...settingLines(file).map((line) => [line]),
		[
			`# varied: ${along.label}, ${withUnit(sweep.from, along.unit)} to ${withUnit(sweep.to, along.unit)}, ${points.length} points ${steps}`
		],
		[headOf(along.label, along.unit), headOf(output.label, unit), 'Note'],
		...points.map(({ x, y, refusal, warnings }): Cell[] => [
			x,
			y,
			refusal ?? warnings?.join(' ') ?? null
		])
	];
	return csvOf(rows);
}

function settingLines({ calculator, inputs, sweep }: PointsFile): string[] {
	const [swept, part] = sweep.input.split('.');
	const left = Object.entries(calculator.inputs).flatMap(([key, { label }]) => {
		const instead = key === swept || inputs[key] !== undefined ? '' : standIn(calculator, key);
		return instead ? [`# setting: ${label} (${key}) left empty: ${plain(instead)}`] : [];
	});
	const given = Object.entries(inputs).flatMap(([key, value]) => {
		if (key === swept && part === undefined) return [];
		const spec = calculator.inputs[key];
		const unit = spec?.kind === 'number' ? resolveUnit(spec.unit, inputs) : '';
		const written =
			typeof value === 'object' && value !== null
				? Object.entries(value)
						.filter(([name]) => name !== part)
						.map(([name, own]) => `${name} ${String(own)}`)
						.join(', ')
				: withUnit(value, unit);
		return [`# setting: ${spec?.label ?? key} (${key}) = ${written}`];
	});
	return [...given, ...left];
}

/** Signs that a spreadsheet of another encoding would garble are of no use here. */
const plain = (words: string) => words.replaceAll('\u00a0', ' ').replaceAll('\u202f', '');

const withUnit = (value: unknown, unit: string) => `${String(value)}${unit ? ` ${unit}` : ''}`;
const headOf = (label: string, unit: string) => (unit ? `${label} (${unit})` : label);
