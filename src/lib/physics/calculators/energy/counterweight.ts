import { defineCalculator, refuse, type Computed, type NumberInput } from '../../calculator.ts';
import { printNumber } from '../wording.ts';
import { LAUNCHER_CAUTION } from './caution.ts';
import { gravityInput } from './gravity.ts';
import { checksOf } from '../published-checks.ts';

function mass(label: string, symbol: string, initial: number): NumberInput {
	return {
		kind: 'number',
		label,
		symbol,
		quantity: 'mass',
		unit: 'kg',
		min: 0,
		minExclusive: true,
		max: 1e9,
		initial,
		log: true
	};
}

/**
 * A falling counterweight throws a stone: stored energy MgH, launch speed √(2ηMgH/m), range on flat ground v²/g, and
 * what is left of energy and speed after a climb. The beam has no mass. Refuses a climb the stone can't make.
 */
export const counterweight = defineCalculator({
	id: 'energy.counterweight',
	revision: '1.0.0',
	title: 'Counterweight and stone',
	purpose:
		'A weight comes down and throws a stone: how much energy is there, and how fast does the stone leave?',
	asks: [
		'How fast does the stone leave?',
		'How far could it fly at best?',
		'How fast does it arrive at the top of a wall?',
		'How much of its energy does the climb cost?'
	],
	notFor: ['What a real machine does: its beam, sling and friction are left out.', 'Building one.'],
	inputs: {
		counterweight_kg: mass('Mass of the counterweight', 'M', 1000),
		projectile_kg: mass('Mass of the stone', 'm', 10),
		drop_m: {
			kind: 'number',
			label: 'Drop of the counterweight’s centre of mass',
			symbol: 'H',
			quantity: 'drop',
			unit: 'm',
			min: 0,
			max: 100,
			initial: 3
		},
		efficiency: {
			kind: 'number',
			label: 'Share of the energy that goes into the stone',
			symbol: 'η',
			quantity: 'efficiency',
			unit: '',
			min: 0,
			minExclusive: true,
			max: 10,
			good: { min: 0, max: 1, warning: 'more-than-all' },
			initial: 0.6,
			optional: true
		},
		climb_m: {
			kind: 'number',
			label: 'Height of the target above the release',
			symbol: 'Δh',
			quantity: 'height',
			unit: 'm',
			min: -1e4,
			max: 1e4,
			initial: 0,
			optional: true
		},
		g_ms2: gravityInput
	},
	outputs: {
		storedEnergy: {
			label: 'Energy the counterweight gives up',
			symbol: 'E',
			quantity: 'energy',
			unit: 'J'
		},
		launchSpeed: {
			label: 'Speed of the stone at release',
			symbol: 'v',
			quantity: 'speed',
			unit: 'm/s'
		},
		idealRange: {
			label: 'Longest range on flat ground without air',
			symbol: 'R',
			quantity: 'range',
			unit: 'm'
		},
		launchEnergy: { label: 'Energy of the stone at release', quantity: 'energy', unit: 'J' },
		climbEnergy: { label: 'Energy the climb costs', quantity: 'energy', unit: 'J' },
		climbShare: { label: 'Share of its energy the climb costs', quantity: 'fraction', unit: '%' },
		arrivalEnergy: { label: 'Energy of the stone at the target', quantity: 'energy', unit: 'J' },
		arrivalSpeed: { label: 'Speed of the stone at the target', quantity: 'speed', unit: 'm/s' }
	},
	equations: [
		{
			tex: 'E = M g H',
			says: 'The counterweight can give no more than its weight times the drop of its centre of mass.'
		},
		{
			tex: 'v = \\sqrt{\\frac{2\\,\\eta\\,M g H}{m}}',
			says: 'A share of that goes into the stone and sets its speed.'
		},
		{
			tex: 'R = \\frac{v^2}{g} = 2\\,\\eta\\,\\frac{M}{m}\\,H',
			says: 'Without air the longest throw depends on masses and drop, not on gravity.'
		},
		{
			tex: 'v_\\mathrm{target} = \\sqrt{v^2 - 2 g\\,\\Delta h}',
			says: 'The climb to a target takes its price in speed, whatever the path.'
		}
	],
	assumptions: [
		'The beam and sling have no mass, and nothing rubs; the efficiency stands for all that.',
		'No air.',
		'H is the drop of the counterweight’s centre of mass, not the travel of the arm.'
	],
	warnings: [
		{
			code: 'more-than-all',
			message:
				'More energy than the counterweight gives up can’t reach the stone. Set the share to 1 or less.',
			when: 'efficiency above 1',
			validity: 'outside'
		},
		{
			code: 'slow-beam',
			message:
				'With so light a counterweight the beam swings slowly and little of the energy reaches the stone.',
			when: 'counterweight less than 20 times as heavy as the stone',
			validity: 'approximate'
		}
	],
	caution: LAUNCHER_CAUTION,
	sources: [
		{ title: 'Siano 2013, Trebuchet mechanics', locator: 'range 2(M/m)h', fromMemory: true },
		{
			title: 'OpenStax 2016, University Physics, volume 1',
			locator: '§8.3, conservation of energy',
			fromMemory: true
		}
	],
	checks: checksOf('energy.counterweight'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute({
		counterweight_kg: M,
		projectile_kg: m,
		drop_m: H,
		efficiency,
		climb_m: climb,
		g_ms2: g
	}): Computed {
		const reach = efficiency * (M / m) * H; // height the stone gets to when thrown straight up
		if (climb > reach) {
			return refuse(
				'too-high',
				`The stone gets no higher than ${printNumber(reach)} m. Lower the target, or give the counterweight more mass or drop.`,
				'climb_m'
			);
		}
		const storedEnergy = M * g * H;
		const launchEnergy = efficiency * storedEnergy;
		const values = {
			storedEnergy,
			launchSpeed: Math.sqrt(2 * g * reach),
			idealRange: 2 * reach,
			launchEnergy,
			climbEnergy: m * g * climb,
			climbShare: (100 * climb) / reach,
			arrivalEnergy: m * g * (reach - climb),
			arrivalSpeed: Math.sqrt(2 * g * (reach - climb))
		};
		const exact = Object.fromEntries(Object.keys(values).map((key) => [key, 'exact' as const]));
		const noShare = reach === 0;
		return {
			ok: true,
			values: noShare ? withoutShare(values) : values,
			uncertainties: exact,
			warnings: M / m < 20 ? ['slow-beam'] : [],
			...(noShare
				? {
						withheld: {
							climbShare: {
								code: 'no-energy',
								message: 'Without a drop there is no energy to share. Set a drop above 0.'
							}
						}
					}
				: {})
		};
	}
});

function withoutShare<T extends { climbShare: number }>(
	values: T
): Omit<T, 'climbShare'> & Record<string, number> {
	const { climbShare: _none, ...rest } = values;
	return rest as Omit<T, 'climbShare'> & Record<string, number>;
}
