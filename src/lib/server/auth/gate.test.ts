import { expect, test } from 'vitest';
import { gate } from './gate.ts';

const full = () => new Error('full');
/** Work that goes on until it is told to end. */
function work() {
	let started = false;
	let end = () => {};
	const done = new Promise<void>((resolve) => (end = resolve));
	return { run: () => ((started = true), done), end: () => end(), started: () => started };
}
const settle = () => new Promise((resolve) => setTimeout(resolve, 0));

test('lets so many through at once, keeps a queue, and refuses the rest', async () => {
	const through = gate({ atOnce: 2, queue: 2 }, full);
	const works = Array.from({ length: 5 }, work);
	const outcomes = works.map(({ run }) => through(run).then(() => 'done', String));
	await settle();
	expect(works.map(({ started }) => started())).toEqual([true, true, false, false, false]);
	expect(await outcomes[4]).toBe('Error: full');

	works[0]!.end();
	await outcomes[0];
	await settle();
	expect(works[2]!.started()).toBe(true);
	expect(works[3]!.started()).toBe(false);
	for (const { end } of works) end();
	expect(await Promise.all(outcomes.slice(0, 4))).toEqual(Array(4).fill('done'));
});

test('a failure frees its place', async () => {
	const through = gate({ atOnce: 1, queue: 0 }, full);
	await expect(through(() => Promise.reject(new Error('broken')))).rejects.toThrow('broken');
	await expect(through(() => Promise.resolve('next'))).resolves.toBe('next');
});
