import { expect, test } from 'vitest';
import { processorSeconds, repeating, spreadOf, standing, takeTurns } from './rounds.ts';

test('median and quartiles', () => {
	expect(spreadOf([5, 1, 4, 2, 3])).toEqual({ median: 3, quartiles: [2, 4] });
	expect(spreadOf([1, 2])).toEqual({ median: 1.5, quartiles: [1.25, 1.75] });
	expect(spreadOf([7])).toEqual({ median: 7, quartiles: [7, 7] });
});

test.each([
	[10, 11, 12, 10, 'pass'],
	[9, 11, 12, 10, 'unstable'],
	[9.9, 10, 10.1, 10, 'short'],
	[1, 3, 5, 10, 'short']
])('quartile %d, median %d, quartile %d against %d: %s', (low, median, high, aim, wanted) => {
	expect(standing({ median, quartiles: [low, high] }, aim)).toBe(wanted);
});

test('every contestant has its turn in every round, in moving order, and ratios stay in their round', async () => {
	const turns: string[] = [];
	let load = 1;
	const at = (name: string, rate: number) => () => {
		turns.push(name);
		return rate / load;
	};
	const outcome = await takeTurns(
		(seconds) => {
			// A neighbour that wakes up in the second round.
			if (turns.length > 4) load = 3;
			return at('ours', 20)() + 0 * seconds;
		},
		{ theirs: at('theirs', 2), reference: at('reference', 5) },
		{ rounds: 3, seconds: 0.001 }
	);
	expect(turns.slice(3)).toEqual([
		...['ours', 'theirs', 'reference'],
		...['theirs', 'reference', 'ours'],
		...['reference', 'ours', 'theirs']
	]);
	expect(Object.keys(outcome.ratios)).toEqual(['theirs', 'reference']);
	expect(outcome.rates.ours!.median).toBeGreaterThan(0);
	expect(outcome.ratios.theirs!.median).toBeCloseTo(10, 10);
});

test('a rate is what was done over the processor’s time', async () => {
	let done = 0;
	const start = processorSeconds();
	const rate = await repeating(() => (done += 1))(0.03);
	const took = processorSeconds() - start;
	expect(took).toBeGreaterThanOrEqual(0.03);
	expect(rate * took).toBeGreaterThanOrEqual(done);
});
