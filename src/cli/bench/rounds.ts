/**
 * Ratios of speeds, measured fairly: all contestants of a cell take turns in one run, the order moves on each round, and
 * a ratio is formed within its round, so that a busy neighbour slows both sides alike.
 */

/** Runs for about so many seconds and answers how often it did its work in each. */
export type Contestant = (seconds: number) => number | Promise<number>;

export interface Spread {
	median: number;
	/** Lower and upper quartile. */
	quartiles: readonly [low: number, high: number];
}

export interface Outcome {
	/** Times a second, by contestant. */
	rates: Record<string, Spread>;
	/** Ours over the other's, by the other's name. */
	ratios: Record<string, Spread>;
}

/** Sets `ours` against the others, all of them named. One unmeasured turn each comes first. */
export async function takeTurns(
	ours: Contestant,
	others: Readonly<Record<string, Contestant>>,
	{ rounds, seconds }: { rounds: number; seconds: number }
): Promise<Outcome> {
	const field: [string, Contestant][] = [['ours', ours], ...Object.entries(others)];
	for (const [, contestant] of field) await contestant(seconds / 2);
	const rates: Record<string, number[]> = Object.fromEntries(field.map(([name]) => [name, []]));
	for (let round = 0; round < rounds; round += 1) {
		for (let turn = 0; turn < field.length; turn += 1) {
			const [name, contestant] = field[(turn + round) % field.length]!;
			rates[name]!.push(await contestant(seconds));
		}
	}
	const own = rates.ours!;
	return {
		rates: Object.fromEntries(field.map(([name]) => [name, spreadOf(rates[name]!)])),
		ratios: Object.fromEntries(
			Object.keys(others).map((name) => [
				name,
				spreadOf(own.map((rate, round) => rate / rates[name]![round]!))
			])
		)
	};
}

/** Median and quartiles, between neighbours where they fall there. */
export function spreadOf(values: readonly number[]): Spread {
	const sorted = [...values].sort((a, b) => a - b);
	const at = (share: number) => {
		const place = share * (sorted.length - 1);
		const below = sorted[Math.floor(place)]!;
		return below + (place % 1) * (sorted[Math.ceil(place)]! - below);
	};
	return { median: at(0.5), quartiles: [at(0.25), at(0.75)] };
}

export type Standing = 'pass' | 'short' | 'unstable';

/** Passes only with its lower quartile; too wide a spread says nothing either way. */
export function standing({ median, quartiles: [low, high] }: Spread, aim: number): Standing {
	if (low >= aim) return 'pass';
	return (high - low) / median > 0.25 && high >= aim ? 'unstable' : 'short';
}

/** Seconds of processor that this process has used: a busy machine takes turns, and those are not ours. */
export function processorSeconds(): number {
	const { user, system } = process.cpuUsage();
	return (user + system) / 1e6;
}

/**
 * A contestant that does `work(i)` over and over; `work` answers a number that depends on it. The rate is by seconds of
 * processor.
 */
export function repeating(work: (index: number) => number): Contestant {
	let index = 0;
	return (seconds) => {
		const start = processorSeconds();
		let now = start;
		let done = 0;
		let batch = 1;
		let sum = 0;
		while (now - start < seconds) {
			for (let i = 0; i < batch; i += 1) sum += work((index += 1));
			done += batch;
			const before = now;
			now = processorSeconds();
			// Batches of some milliseconds, so that reading the clock costs nothing.
			if (now - before < 0.002) batch *= 2;
		}
		// Looked at, so that no compiler may drop the work.
		if (Number.isNaN(sum)) throw new Error('The work gave no number.');
		return done / (now - start);
	};
}
