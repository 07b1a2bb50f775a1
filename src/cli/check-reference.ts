/**
 * npm run check:reference [-- --seed 7] [-- --count 500]
 * Fresh random inputs for each family of calculators, answered here and by astropy and scipy, and the worst relative
 * difference of every output. Without those two it says so and how to get them, and counts as skipped.
 */
import { spawnSync } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import { parseArgs } from 'node:util';
import { closedFormFamilies } from './check-reference/closed-forms.ts';
import { compareFamily, type Worst } from './check-reference/compare.ts';
import { expandingFamilies } from './check-reference/expanding.ts';
import type { Answers, Family, Row } from './check-reference/family.ts';
import { findPython, HOW_TO_INSTALL } from './python.ts';
import { seeded } from './seeded.ts';
import { giveUp, Plain, say, seconds, step } from './set-up/say.mjs';

const FEWEST = 500;
const SCRIPT = fileURLToPath(new URL('check-reference/reference.py', import.meta.url));
const families = [...expandingFamilies, ...closedFormFamilies];

interface Reference {
	versions: Record<string, string>;
	families: Record<string, Answers[]>;
}

function options(): { seed: number; count: number } {
	const { values } = parseArgs({
		options: { seed: { type: 'string' }, count: { type: 'string' } }
	});
	const whole = (name: string, text: string | undefined, otherwise: number): number => {
		const value = text === undefined ? otherwise : Number(text);
		if (!Number.isSafeInteger(value) || value < 1) {
			throw new Plain(`--${name} takes a whole number above 0; ${text} was given.`);
		}
		return value;
	};
	return {
		seed: whole('seed', values.seed, Date.now() % 2 ** 31),
		count: whole('count', values.count, FEWEST)
	};
}

function ask(python: string, rows: Record<string, Row[]>): Reference {
	// -B: no compiled copies beside the sources. -I would hide the script's own folder.
	const { status, stdout, stderr, error } = spawnSync(python, ['-B', SCRIPT], {
		input: JSON.stringify(rows),
		encoding: 'utf8',
		maxBuffer: 2 ** 28
	});
	if (error) throw error;
	if (status !== 0) throw new Plain(`The reference could not be computed:\n\n${stderr.trim()}`);
	return JSON.parse(stdout) as Reference;
}

function print({ title, reference }: Family, count: number, worst: Worst[]): void {
	say(`\n${title}: ${count} inputs, against ${reference}`);
	for (const one of worst) {
		const { key, compared, leftOut, relative, allowed, excused, excusedRelative, faults } = one;
		const columns = [
			`  ${faults === 0 ? '✓' : '✗'} ${key.padEnd(26)}`,
			relative.toExponential(1).padStart(8),
			`allowed ${allowed.toExponential(0)}`,
			`${compared} compared`,
			...(excused > 0
				? [`${excused} of them by the reference’s limit, up to ${excusedRelative.toExponential(1)}`]
				: []),
			...(leftOut > 0 ? [`${leftOut} that it can’t answer`] : [])
		];
		say(columns.join('  '));
		if (faults > 0) say(`      ${faults} past it, the first: ${JSON.stringify(one.row)}`);
	}
	const limits = worst.flatMap(({ limit, excused, leftOut }) =>
		excused + leftOut > 0 ? (limit ?? []) : []
	);
	for (const limit of new Set(limits)) {
		say(`    Limit of the reference: ${limit}.`);
	}
}

async function run(): Promise<void> {
	const { seed, count } = options();
	const python = findPython();
	if (!python) {
		say(`skipped: there is no Python with astropy and scipy here. ${HOW_TO_INSTALL}`);
		return;
	}
	const start = performance.now();
	const chance = seeded(seed);
	const rows = Object.fromEntries(families.map((one) => [one.name, one.rows(chance, count)]));
	const reference = await step('Asking astropy and scipy', () =>
		Promise.resolve(ask(python, rows))
	);
	const named = Object.entries(reference.versions).map((pair) => pair.join(' '));
	say(`Seed ${seed}; ${named.join(', ')}. Worst relative difference of every output:`);

	let faults = 0;
	let compared = 0;
	for (const family of families) {
		const own = rows[family.name]!;
		const worst = compareFamily(family, own, reference.families[family.name]!);
		print(family, own.length, worst);
		for (const one of worst) {
			faults += one.faults;
			compared += one.compared;
		}
	}
	say(`\n${compared} values compared, ${faults} past what is allowed, ${seconds(start)}`);
	process.exitCode = faults === 0 ? 0 : 1;
}

run().catch(giveUp);
