/** Every check value again in Chromium, from the same source as in Node, and how far the two engines differ. */
import type { Browser } from 'playwright-core';
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import type { Result } from '../../src/lib/physics/calculator.ts';
import { catalogue } from '../../src/lib/physics/calculators/index.ts';
import { runCalculator } from '../../src/lib/physics/calculators/run.ts';
import { answersOf, serveCalculators } from '../support/calculators-in-page.ts';
import { launchChromium } from '../support/chromium.ts';
import type { Listening } from '../support/fakes/listen.ts';
import {
	faultOf,
	readReferences,
	REFERENCE_TABLES,
	type ReferenceCase
} from '../support/reference-cases.ts';
import { stepsBetween } from '../support/ulp.ts';

/** The engines’ logarithms and sines may differ in the last bit; straight formulas carry on no more than this. */
const STRAIGHT_APART = 1e-13;
/** The gas’s history is solved step by step with a slope found by differences: to 1e-6, and the last bits sway it. */
const HISTORY_APART = 1e-6;
const FROM_HISTORY = ['thermal.tla1', 'g21.deepest', 'g21.dark_ages'];

const cases = REFERENCE_TABLES.flatMap((table) =>
	readReferences(table).map((one) => ({ table, one }))
);
let served: Listening;
let browser: Browser;
let inChromium: Result[];
let inNode: Result[];

beforeAll(async () => {
	served = await serveCalculators();
	browser = await launchChromium();
	const page = await browser.newPage();
	await page.goto(served.url);
	const questions = cases.map(({ one: { calculator, inputs } }) => ({ calculator, inputs }));
	inNode = questions.map(({ calculator, inputs }) =>
		runCalculator(catalogue.get(calculator)!, inputs)
	);
	inChromium = await answersOf(page, questions);
});

afterAll(async () => {
	await browser?.close();
	await served?.close();
});

describe.each([
	['Node', () => inNode],
	['Chromium', () => inChromium]
])('in %s', (engine, answers) => {
	test('every case is within its stated tolerance', () => {
		const faults = cases.flatMap(({ one }, index) => {
			const fault = faultOf(one, answers()[index]!);
			return fault ? [`${one.id} ${one.calculator} ${one.output}: ${fault}`] : [];
		});
		expect(faults).toEqual([]);
		for (const table of REFERENCE_TABLES) {
			const ran = cases.filter((one, index) => one.table === table && answers()[index]).length;
			expect(ran).toBe(readReferences(table).length);
			process.stdout.write(`${table}: ${ran} cases ran in ${engine}\n`);
		}
	});
});

test('Node and Chromium agree, to the bit or nearly', () => {
	const pairs = cases.flatMap(({ one }, index) => pairsOf(one, inNode[index]!, inChromium[index]!));
	process.stdout.write(`Node ${process.versions.node} and Chromium ${browser.version()}:\n`);
	for (const [title, limit] of [
		['straight formulas', STRAIGHT_APART],
		['from the gas’s history', HISTORY_APART]
	] as const) {
		const group = pairs.filter(({ allowed }) => allowed === limit);
		const same = group.filter(({ steps }) => steps === 0).length;
		const worst = group.reduce((most, pair) => (pair.steps > most.steps ? pair : most));
		process.stdout.write(
			`  ${title}: ${same} of ${group.length} numbers the same to the bit; farthest apart by ` +
				`${worst.steps} ulp, ${worst.apart.toExponential(1)} (${worst.name})\n`
		);
	}
	expect(pairs.length).toBeGreaterThan(cases.length);
	for (const { name, apart, allowed } of pairs) expect(apart, name).toBeLessThan(allowed);
});

/** Every number of both results, not just the one that the table checks. */
function pairsOf(one: ReferenceCase, a: Result, b: Result) {
	expect(b.ok).toBe(a.ok);
	if (!a.ok || !b.ok) return [];
	expect(Object.keys(b.outputs)).toEqual(Object.keys(a.outputs));
	return Object.entries(a.outputs).flatMap(([key, { value }]) => {
		const other = b.outputs[key]!.value;
		if (typeof value !== 'number' || typeof other !== 'number') {
			expect(other).toBe(value);
			return [];
		}
		const apart = value === other ? 0 : Math.abs(other - value) / Math.abs(value || other);
		const allowed = FROM_HISTORY.includes(one.calculator) ? HISTORY_APART : STRAIGHT_APART;
		return [
			{ name: `${one.calculator} ${key}`, steps: stepsBetween(value, other), apart, allowed }
		];
	});
}
