import { describe, expect, test } from 'vitest';
import type { Calculator, RawInputs } from '../calculator.ts';
import { QUANTITY_KINDS } from '../units/quantities.ts';
import { commensurable } from '../units/units.ts';
import { catalogue } from './index.ts';
import { runCalculator } from './run.ts';

const all = [...catalogue.values()].map((calculator) => [calculator.id, calculator] as const);

/** Inputs as a card first lays them out: one of each either-or group, everything else given. */
function firstInputs(calculator: Calculator, chosen?: string): RawInputs {
	const idle = (calculator.oneOf ?? []).flatMap((group) => {
		const given = group.find((key) => key === chosen) ?? group[0];
		return group.filter((key) => key !== given);
	});
	return Object.fromEntries(
		Object.entries(calculator.inputs)
			.filter(([key]) => !idle.includes(key))
			.map(([key, spec]) => [key, spec.initial])
	);
}

describe('both ends of every range', () => {
	const ends = [...catalogue.values()].flatMap((calculator) =>
		Object.entries(calculator.inputs).flatMap(([key, spec]) =>
			spec.kind === 'number'
				? [spec.min, spec.max].map((value) => [calculator.id, key, value, calculator] as const)
				: []
		)
	);

	test.each(ends)('%s, %s at %d: finite values or a sentence', (_id, key, value, calculator) => {
		const result = runCalculator(calculator, { ...firstInputs(calculator, key), [key]: value });
		if (!result.ok) {
			expect(result.refusal.message).toMatch(/^\S.{15,}[.?]$/);
			return;
		}
		for (const [output, spec] of Object.entries(calculator.outputs)) {
			const reading = result.outputs[output];
			if (!reading) expect(result.withheld?.[output]?.message).toMatch(/[.?]$/);
			else if (!spec.text) expect(Number.isFinite(reading.value)).toBe(true);
		}
	});
});

describe('what a calculator declares', () => {
	test.each(all)('%s has units that fit its quantities', (_id, calculator) => {
		for (const [key, spec] of [
			...Object.entries(calculator.inputs),
			...Object.entries(calculator.outputs)
		]) {
			if (!('quantity' in spec)) continue;
			const row = QUANTITY_KINDS[spec.quantity];
			const units = typeof spec.unit === 'string' ? [spec.unit] : Object.values(spec.unit.units);
			if ('quantityBy' in spec && spec.quantityBy) continue;
			for (const unit of units) {
				// Times told without a unit have none to fit.
				if (unit !== 'same') expect(commensurable(unit, row.unit), `${key}: ${unit}`).toBe(true);
			}
		}
	});

	test.each(all)(
		'%s has limits in order, with its first value and its good zone inside',
		(_id, calculator) => {
			for (const [key, spec] of Object.entries(calculator.inputs)) {
				if (spec.kind !== 'number') continue;
				expect(spec.min, key).toBeLessThan(spec.max);
				expect(spec.initial, key).toBeGreaterThanOrEqual(spec.min);
				expect(spec.initial, key).toBeLessThanOrEqual(spec.max);
				if (spec.good) expect(spec.good.min, key).toBeLessThan(spec.good.max);
			}
		}
	);

	test.each(all)('%s speaks in whole, calm sentences', (_id, calculator) => {
		expect(calculator.purpose).toMatch(/\?$/);
		const sentences = [
			...calculator.asks,
			...calculator.notFor,
			...calculator.assumptions,
			...calculator.equations.map(({ says }) => says),
			...calculator.warnings.map(({ message }) => message),
			...(calculator.caution ? [calculator.caution] : [])
		];
		for (const sentence of sentences) {
			expect(sentence).toMatch(/[.?]$/);
			expect(sentence).not.toMatch(/!|'/);
		}
	});

	test.each(all)(
		'%s is known as well as it says: a number above 0, exact, or not available',
		(_id, calculator) => {
			const result = runCalculator(calculator, firstInputs(calculator));
			if (!result.ok) throw new Error(result.refusal.message);
			for (const { uncertainty } of Object.values(result.outputs)) {
				if (typeof uncertainty === 'number') expect(uncertainty).toBeGreaterThanOrEqual(0);
			}
		}
	);
});
