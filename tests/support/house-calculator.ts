/** A calculator as a scientist of the house would add one, for service tests. */
import { emptyCard } from '../../src/lib/vetting/fresh.ts';
import type { ProposeHouseCalculator } from '../../src/lib/forms/house-calculator.ts';

/**
 * Speed of sound in dry air taken as an ideal gas: v = √(γ R T / M), γ = 1.4, R T / M by the molar mass of dry air,
 * 28.9647 g/mol. The check values are what OpenStax, University Physics Volume 1, §17.2 prints for 0 °C (331 m/s) and
 * 20 °C (343 m/s), and for 40 °C the same text's v = 331 m/s · √(T/273 K), 354 m/s; recalled, not read again.
 */
export function soundInAir(): ProposeHouseCalculator {
	const check = (kelvins: number, printed: number) => ({
		statement: `Sound in dry air at ${kelvins} K`,
		inputs: { T: kelvins },
		output: 'speed',
		published: printed,
		tolerance: 1,
		source: 'OpenStax, University Physics Volume 1, §17.2',
		verification: 'from memory'
	});
	return {
		...emptyCard(),
		slug: 'sound-in-air',
		title: 'Speed of sound in air',
		purpose: 'How fast does sound go in dry air?',
		asks: ['how long does thunder take to arrive'],
		notFor: ['Moist air.'],
		assumptions: ['Dry air is an ideal gas of fixed composition.'],
		inputs: [
			{
				name: 'T',
				label: 'Air temperature',
				quantity: 'temperature',
				unit: 'K',
				min: 200,
				max: 400,
				minExclusive: false,
				maxExclusive: false,
				initial: 293.15,
				whole: false,
				log: false,
				good: null
			}
		],
		derived: [
			{
				name: 'molecule',
				label: 'Mass of a mean molecule',
				formula: '0.0289647*kilogram/mole/N_A'
			}
		],
		outputs: [
			{
				name: 'speed',
				label: 'Speed of sound',
				quantity: 'speed',
				unit: 'm/s',
				formula: 'sqrt(1.4*k_B*T/molecule)'
			}
		],
		conditions: [],
		checks: [check(273.15, 331), check(293.15, 343), check(313.15, 354)],
		sources: [
			{
				title: 'OpenStax, University Physics Volume 1',
				locator: '§17.2',
				doi: '',
				fromMemory: true
			}
		]
	};
}
