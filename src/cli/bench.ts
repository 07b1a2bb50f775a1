/**
 * npm run bench [-- --only calculators] [-- --rounds 7] [-- --json out.json]
 * Measures speeds as ratios within one run. It is no test: a loaded machine may miss an aim, and nothing fails by it.
 */
import { writeFileSync } from 'node:fs';
import { cpus, loadavg } from 'node:os';
import { parseArgs } from 'node:util';
import { benchBuilder } from './bench/builder.ts';
import { benchCalculators } from './bench/calculators.ts';
import { giveUp, Plain, say, seconds } from './set-up/say.mjs';

const PARTS = { calculators: benchCalculators, builder: benchBuilder };
const TURN_SECONDS = 0.1;

function options() {
	const { values } = parseArgs({
		options: {
			only: { type: 'string' },
			rounds: { type: 'string', default: '7' },
			json: { type: 'string' }
		}
	});
	const names = values.only?.split(',').map((name) => name.trim()) ?? Object.keys(PARTS);
	const unknown = names.filter((name) => !Object.hasOwn(PARTS, name));
	if (unknown.length > 0) {
		throw new Plain(
			`There is no part ${unknown.join(', ')}. Parts: ${Object.keys(PARTS).join(', ')}.`
		);
	}
	const rounds = Number(values.rounds);
	if (!Number.isInteger(rounds) || rounds < 1 || rounds > 100) {
		throw new Plain(`--rounds takes a whole number from 1 to 100; ${values.rounds} was given.`);
	}
	return { names: names as (keyof typeof PARTS)[], rounds, json: values.json };
}

const load = () => loadavg()[0]!.toFixed(2);

async function run(): Promise<void> {
	const { names, rounds, json } = options();
	const start = performance.now();
	const before = load();
	say(`Node ${process.versions.node}, ${cpus().length} cores, load ${before}; ${rounds} rounds.`);
	say(
		'Ratios are by seconds of processor: medians over rounds, with their quartiles. “short” is below the aim.'
	);
	const measured = [];
	for (const name of names) {
		measured.push(...(await PARTS[name]({ rounds, seconds: TURN_SECONDS })));
	}
	const aimed = measured.filter(({ aim }) => aim !== null);
	const passed = aimed.filter(({ verdict }) => verdict === 'pass').length;
	say(`\n${passed} of ${aimed.length} aims reached; load ${before} → ${load()}, ${seconds(start)}`);
	if (json) writeFileSync(json, `${JSON.stringify(measured, null, '\t')}\n`);
}

run().catch(giveUp);
