/** The calculators’ part of the bench: against astropy, formulas against hand-written code and mathjs, thermal history. */
import { resolveCosmology } from '../../lib/physics/calculators/cosmology/parameters.ts';
import { thermalHistory } from '../../lib/physics/calculators/thermal/history.ts';
import { findPython, HOW_TO_INSTALL } from '../python.ts';
import { say } from '../set-up/say.mjs';
import { startAnchor, type Anchor } from './anchor.ts';
import { curves, scalars, type Cell } from './astronomy.ts';
import { formulaMatches } from './formulas.ts';
import {
	processorSeconds,
	repeating,
	spreadOf,
	standing,
	takeTurns,
	type Spread
} from './rounds.ts';

export interface Measured {
	cell: string;
	against: string;
	ratio: Spread | null;
	aim: number | null;
	verdict: string;
}

interface Pace {
	rounds: number;
	seconds: number;
}

const AIMS = { scalar: 10, curve: 20, byHand: 0.5 };
const POINTS = 1000;
const THERMAL_AIM_MS = 10;
/** Cells whose two sides are compared before they race. */
const CHECKED = 5;

/** Runs all of it and prints a table as it goes. */
export async function benchCalculators(pace: Pace): Promise<Measured[]> {
	return [...(await againstAstropy(pace)), ...(await formulas(pace)), ...thermal(pace.rounds)];
}

async function againstAstropy(pace: Pace): Promise<Measured[]> {
	const python = findPython();
	if (!python) {
		say(`\nAgainst astropy: skipped, it isn’t installed. ${HOW_TO_INSTALL}`);
		return [{ cell: 'astronomy', against: 'astropy', ratio: null, aim: null, verdict: 'skipped' }];
	}
	const anchor = startAnchor(python);
	try {
		say('\nOne value, as often as can be, against astropy (aim: 10 times as often)');
		const one = await race(anchor, scalars, pace, AIMS.scalar, ({ name }) => name, once);
		say(`\nA curve of ${POINTS} points, against one array call of astropy (aim: 20 times)`);
		const many = await race(anchor, curves, pace, AIMS.curve, ({ name }) => `curve ${name}`, curve);
		return [...one, ...many];
	} finally {
		anchor.close();
	}
}

const once =
	({ at }: Cell) =>
	(index: number) =>
		at((index % POINTS) / POINTS);

const curve =
	({ at }: Cell) =>
	() => {
		let sum = 0;
		for (let i = 0; i < POINTS; i += 1) sum += at(i / POINTS);
		return sum;
	};

async function race(
	anchor: Anchor,
	cells: readonly Cell[],
	pace: Pace,
	aim: number,
	nameOf: (cell: Cell) => string,
	workOf: (cell: Cell) => (index: number) => number
): Promise<Measured[]> {
	const measured: Measured[] = [];
	for (const cell of cells) {
		const name = nameOf(cell);
		await refuseWrong(anchor, cell, name);
		const { ratios, rates } = await takeTurns(
			repeating(workOf(cell)),
			{ astropy: anchor.contestant(name) },
			pace
		);
		measured.push(tell(name, cell.says, 'astropy', ratios.astropy!, rates.ours!, aim));
	}
	return measured;
}

/** A wrong answer may not win by being quick. */
async function refuseWrong(anchor: Anchor, { at, within }: Cell, name: string): Promise<void> {
	const theirs = await anchor.values(name, CHECKED);
	theirs.forEach((value, index) => {
		const own = at(index / POINTS);
		if (!(Math.abs(own - value) <= within * Math.abs(value))) {
			throw new Error(`${name} at input ${index}: ${own} here, ${value} by astropy.`);
		}
	});
}

async function formulas(pace: Pace): Promise<Measured[]> {
	say('\nHouse formulas, compiled (aim: half the speed of hand-written code)');
	const measured: Measured[] = [];
	for (const { says, source, ours, byHand, mathjs, apart } of formulaMatches()) {
		if (!(apart < 1e-12)) throw new Error(`${source}: the three sides differ by ${apart}.`);
		const { ratios, rates } = await takeTurns(ours, { 'by hand': byHand, mathjs }, pace);
		measured.push(
			tell(says, source, 'by hand', ratios['by hand']!, rates.ours!, AIMS.byHand),
			tell(says, source, 'mathjs', ratios.mathjs!, rates.ours!, null)
		);
	}
	return measured;
}

/** A new cosmology each time, so that nothing is kept from the last. */
function thermal(rounds: number): Measured[] {
	const times = Array.from({ length: 3 * rounds }, (_, index) => {
		const cosmology = resolveCosmology({ set: 'Planck18', H0: 66 + index / 100 });
		if (!cosmology.ok) throw new Error(cosmology.refusal.message);
		const start = processorSeconds();
		thermalHistory(cosmology.value, 0.245);
		return (processorSeconds() - start) * 1000;
	}).slice(rounds);
	const { median, quartiles } = spreadOf(times);
	const verdict = quartiles[1] <= THERMAL_AIM_MS ? 'pass' : 'short';
	say(`\nThermal history of a new cosmology (aim: ${THERMAL_AIM_MS} ms at most)`);
	say(
		`  ${median.toFixed(1)} ms, quartiles ${quartiles.map((time) => time.toFixed(1)).join(' to ')}: ${verdict}`
	);
	return [
		{ cell: 'thermal history, ms', against: '', ratio: { median, quartiles }, aim: 10, verdict }
	];
}

function tell(
	cell: string,
	says: string,
	against: string,
	ratio: Spread,
	rate: Spread,
	aim: number | null
): Measured {
	const verdict = aim === null ? 'told' : standing(ratio, aim);
	const range = ratio.quartiles.map(round3).join(' to ');
	const columns = [
		`  ${cell.padEnd(28)}`,
		`${against} × ${round3(ratio.median)}`.padEnd(18),
		`(${range})`.padEnd(18),
		`${Math.round(rate.median).toLocaleString('en')} a second`.padEnd(20),
		verdict.padEnd(8),
		says
	];
	say(columns.join('  '));
	return { cell, against, ratio, aim, verdict };
}

function round3(value: number): string {
	return String(Number(value.toPrecision(3)));
}
