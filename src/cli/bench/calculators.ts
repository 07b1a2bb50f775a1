/** The calculators’ part of the bench: against astropy, formulas against hand-written code and mathjs, thermal history. */
import { resolveCosmology } from '../../lib/physics/calculators/cosmology/parameters.ts';
import { thermalHistory } from '../../lib/physics/calculators/thermal/history.ts';
import { findPython, HOW_TO_INSTALL } from '../python.ts';
import { say } from '../set-up/say.mjs';
import { startAnchor, type Anchor } from './anchor.ts';
import { cells, POINTS, type Cell } from './astronomy.ts';
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
		const one = await race(anchor, cells.map(once), pace, AIMS.scalar);
		say(
			`\nA curve of ${POINTS} points, against astropy’s arithmetic on one array of them (aim: 20 times)\n` +
				'  Both sides give columns of numbers; our warnings and refusals are told on asking.'
		);
		const many = await race(anchor, cells.flatMap(curve), pace, AIMS.curve);
		return [...one, ...many];
	} finally {
		anchor.close();
	}
}

/** One line of the table: what is raced, and answers to compare first. */
interface Heat extends Pick<Cell, 'says' | 'within'> {
	/** The anchor’s name of the work. */
	name: string;
	work(index: number): number;
	/** The first answers. */
	answers(): ArrayLike<number>;
}

function once({ name, says, within, at }: Cell): Heat {
	return {
		name,
		says,
		within,
		work: (index) => at((index % POINTS) / POINTS),
		answers: () => Array.from({ length: CHECKED }, (_, index) => at(index / POINTS))
	};
}

function curve({ name, says, within, curve: whole }: Cell): Heat[] {
	if (!whole) return [];
	return [
		{
			name: `curve ${name}`,
			says,
			within,
			work: (index) => whole()[index % POINTS]!,
			answers: whole
		}
	];
}

async function race(
	anchor: Anchor,
	heats: readonly Heat[],
	pace: Pace,
	aim: number
): Promise<Measured[]> {
	const measured: Measured[] = [];
	for (const heat of heats) {
		const { name, says, work } = heat;
		await refuseWrong(anchor, heat);
		const { ratios, rates } = await takeTurns(
			repeating(work),
			{ astropy: anchor.contestant(name) },
			pace
		);
		measured.push(tell(name, says, 'astropy', ratios.astropy!, rates.ours!, aim));
	}
	return measured;
}

/** A wrong answer may not win by being quick. */
async function refuseWrong(anchor: Anchor, { name, within, answers }: Heat): Promise<void> {
	const theirs = await anchor.values(name, CHECKED);
	const ours = answers();
	theirs.forEach((value, index) => {
		const own = ours[index]!;
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
