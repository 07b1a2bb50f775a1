/** House formulas compiled to closures, against the same written by hand and against mathjs on plain numbers. */
import { all, create } from 'mathjs';
import { formulaBook } from '../../lib/physics/formula/book.ts';
import { compileFormula } from '../../lib/physics/formula/compile.ts';
import { parseFormula } from '../../lib/physics/formula/parse.ts';
import { dimensionOfUnit, formulaScope } from '../../lib/physics/formula/scope.ts';
import { repeating, type Contestant } from './rounds.ts';

const math = create(all ?? {});
const book = new Map([...formulaBook()].map(([name, { value }]) => [name, value]));
const [G, g0, h, c, kB] = ['G', 'g_0', 'h', 'c', 'k_B'].map((name) => book.get(name)!) as [
	number,
	number,
	number,
	number,
	number
];

interface FormulaCell {
	says: string;
	source: string;
	/** Names with their units, in the order of the values. */
	names: Record<string, string>;
	/** SI values at a share of the way. */
	at(share: number): number[];
	byHand(values: readonly number[]): number;
}

const FORMULAS: FormulaCell[] = [
	{
		says: 'escape speed',
		source: 'sqrt(2 * G * mass / radius)',
		names: { mass: 'kg', radius: 'm' },
		at: (share) => [1e24 * (1 + share), 6.4e6],
		byHand: (values) => Math.sqrt((2 * G * values[0]!) / values[1]!)
	},
	{
		says: 'length of a throw',
		source: 'speed^2 * sin(2 * slope) / g_0',
		names: { speed: 'm/s', slope: 'rad' },
		at: (share) => [30, 0.2 + share],
		byHand: (values) => (values[0]! ** 2 * Math.sin(2 * values[1]!)) / g0
	},
	{
		says: 'glow at one wavelength',
		source: '2 * h * c^2 / wave^5 / (exp(h * c / (wave * k_B * warmth)) - 1)',
		names: { wave: 'm', warmth: 'K' },
		at: (share) => [(200 + 2000 * share) * 1e-9, 5772],
		byHand(values) {
			const wave = values[0]!;
			const warmth = values[1]!;
			return (2 * h * c ** 2) / wave ** 5 / (Math.exp((h * c) / (wave * kB * warmth)) - 1);
		}
	},
	{
		says: 'sum of seven terms',
		source: 'a + 2 * b + 3 * a * b + a^2 - b^2 / 4 + 5 * a^3 - 6',
		names: { a: '', b: '' },
		at: (share) => [share, 1 - share],
		byHand(values) {
			const a = values[0]!;
			const b = values[1]!;
			return a + 2 * b + 3 * a * b + a ** 2 - b ** 2 / 4 + 5 * a ** 3 - 6;
		}
	}
];

export interface FormulaMatch {
	says: string;
	source: string;
	ours: Contestant;
	byHand: Contestant;
	mathjs: Contestant;
	/** Largest relative difference of the three over a thousand inputs. */
	apart: number;
}

export function formulaMatches(): FormulaMatch[] {
	return FORMULAS.map(({ says, source, names, at, byHand }) => {
		const slots = Object.keys(names);
		const parsed = parseFormula(
			source,
			formulaScope(
				Object.entries(names).map(
					([name, unit]) => [name, { dimension: dimensionOfUnit(unit), says: name }] as const
				)
			)
		);
		if (!parsed.ok) throw new Error(`${source}: ${parsed.problem.says}`);
		const ours = compileFormula(parsed.tree, { slots, fixed: book });
		const theirs = math.compile(source);
		// The inputs are laid out before the race, since all three would wait for them alike.
		const inputs = Array.from({ length: 1000 }, (_, i) => at(i / 1000));
		const scopes = inputs.map((values) => {
			const scope = new Map<string, number>(book);
			slots.forEach((name, i) => scope.set(name, values[i]!));
			return scope;
		});
		const workers = {
			ours: (i: number) => ours(inputs[i % 1000]!),
			byHand: (i: number) => byHand(inputs[i % 1000]!),
			mathjs: (i: number) => theirs.evaluate(scopes[i % 1000]!) as number
		};
		const apart = inputs.reduce((most, _, i) => {
			const wanted = workers.byHand(i);
			const off = (value: number) => Math.abs(value - wanted) / Math.abs(wanted);
			return Math.max(most, off(workers.ours(i)), off(workers.mathjs(i)));
		}, 0);
		return {
			says,
			source,
			ours: repeating(workers.ours),
			byHand: repeating(workers.byHand),
			mathjs: repeating(workers.mathjs),
			apart
		};
	});
}
