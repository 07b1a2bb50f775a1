import { defineCalculator, refuse, type Computed, type NumberInput } from '../../calculator.ts';
import { LAUNCHER_CAUTION } from '../energy/caution.ts';
import { gravityInput } from '../energy/gravity.ts';
import { STANDARD_GRAVITY_SOURCE } from '../sources.ts';
import { counterweightHeight, projectileAt, throwOf, velocityOf, type Machine } from './machine.ts';
import { checksOf } from '../published-checks.ts';

function length(label: string, symbol: string, [min, initial]: [number, number]): NumberInput {
	return { kind: 'number', label, symbol, quantity: 'length', unit: 'm', min, max: 100, initial };
}

function mass(label: string, symbol: string, [min, initial]: [number, number]): NumberInput {
	return {
		kind: 'number',
		label,
		symbol,
		quantity: 'mass',
		unit: 'kg',
		min,
		max: 1e6,
		initial,
		log: min > 0
	};
}

/**
 * The whole throw of a machine with a hinged counterweight and a sling, from rest to release, then flight without air:
 * times in s, speed in m/s, lengths in m, angle in degrees. Energy is kept to about 1 part in 10¹¹. Refuses machines that
 * don't stand, and those that don't throw forward within a minute or swing too wildly to tell.
 */
export const hinged = defineCalculator({
	id: 'launcher.hinged',
	revision: '1.0.0',
	title: 'Throwing machine with a hinged counterweight',
	purpose:
		'How does a medieval throwing machine turn the fall of a weight into the flight of a stone?',
	asks: [
		'How fast does the stone leave the sling?',
		'What share of the energy goes into the stone?',
		'Why does the counterweight hang from a hinge?'
	],
	notFor: [
		'Building one: strength, friction and safety are not in this model.',
		'Aiming at anything.'
	],
	inputs: {
		longArm_m: length('Long arm of the beam', 'l_1', [0.1, 4]),
		shortArm_m: length('Short arm of the beam', 'l_2', [0.01, 1]),
		sling_m: length('Sling', 'l_3', [0.05, 3.5]),
		hanger_m: length(
			'Hanger of the counterweight, from hinge to centre of mass',
			'l_4',
			[0.02, 0.8]
		),
		projectile_kg: mass('Mass of the stone', 'm', [1e-3, 10]),
		counterweight_kg: mass('Mass of the counterweight', 'M', [1e-2, 1000]),
		beam_kg: mass('Mass of the beam', 'm_b', [0, 100]),
		pivotHeight_m: length('Height of the pivot above the ground', 'h', [0.05, 3]),
		releaseAngle_deg: {
			kind: 'number',
			label: 'Direction of flight at release, above the horizontal',
			symbol: 'r',
			quantity: 'angle',
			unit: 'deg',
			min: 0,
			max: 90,
			initial: 42
		},
		g_ms2: { ...gravityInput, min: 0.01, minExclusive: false }
	},
	outputs: {
		releaseSpeed: {
			label: 'Speed of the stone at release',
			symbol: 'v',
			quantity: 'speed',
			unit: 'm/s'
		},
		range: {
			label: 'Range from the pivot, without air',
			symbol: 'R',
			quantity: 'range',
			unit: 'm'
		},
		energyEfficiency: {
			label: 'Share of the counterweight’s energy that the stone takes along',
			symbol: 'η',
			quantity: 'efficiency',
			unit: ''
		},
		counterweightDrop: {
			label: 'Drop of the counterweight’s centre of mass',
			symbol: 'H',
			quantity: 'drop',
			unit: 'm'
		},
		liftOffTime: { label: 'Time until the stone lifts off', quantity: 'duration', unit: 's' },
		releaseTime: { label: 'Time until release', quantity: 'duration', unit: 's' },
		releaseHeight: {
			label: 'Height of the release above the ground',
			quantity: 'height',
			unit: 'm'
		},
		beamAngle: {
			label: 'Angle of the long arm at release',
			symbol: 'a',
			quantity: 'angle',
			unit: 'deg'
		}
	},
	equations: [
		{
			tex: '\\frac{\\mathrm{d}}{\\mathrm{d}t}\\frac{\\partial L}{\\partial\\dot q_i} - \\frac{\\partial L}{\\partial q_i} = 0,\\qquad q = (a, s, w)',
			says: 'Arm, sling and hanger swing as three coupled pendulums; their energies alone give the motion.'
		},
		{
			tex: '\\eta = \\frac{\\tfrac12 m v^2}{M g H}',
			says: 'What the stone takes along, of what the counterweight gives up; the rest stays in beam and weight.'
		}
	],
	assumptions: [
		'Nothing rubs and nothing bends. The beam is uniform, sling and hanger have no mass, the stone is a point.',
		'The stone first slides on a level trough without friction, from rest, the sling stretched under the beam.',
		'The stone is let go when its flight has come down to the direction given; then it flies without air to level ground.',
		'The drop is that of the counterweight’s centre of mass.'
	],
	warnings: [
		{
			code: 'hits-ground',
			message:
				'Arm and hanger together are longer than the pivot is high: the counterweight would strike the ground.',
			when: 'short arm and hanger together as long as the pivot is high, or longer',
			validity: 'outside'
		},
		{
			code: 'slack-sling',
			message:
				'The sling would have to push at some moment; a real one goes slack, and the throw is another.',
			when: 'the pull of the sling falls below 0',
			validity: 'outside'
		},
		{
			code: 'air-matters',
			message:
				'Above 50 metres a second air takes a good part of the range: a real stone falls short of this.',
			when: 'speed at release above 50 m/s',
			validity: 'approximate'
		}
	],
	caution: LAUNCHER_CAUTION,
	sources: [
		{
			title: 'Siano 2013, Trebuchet mechanics',
			locator: 'the same machine; derived here anew',
			fromMemory: true
		},
		{
			title: 'Landau & Lifshitz 1976, Mechanics',
			locator: '§§2–5, Lagrange’s equations',
			fromMemory: true
		},
		{
			title: 'Dormand & Prince 1980, J. Comput. Appl. Math. 6, 19',
			locator: 'the method of solution',
			doi: '10.1016/0771-050X(80)90013-3',
			fromMemory: true
		},
		STANDARD_GRAVITY_SOURCE
	],
	checks: checksOf('launcher.hinged'),
	history: [{ revision: '1.0.0', date: '2026-12-01', change: 'First version.' }],
	compute(inputs): Computed {
		const machine: Machine = {
			longArm: inputs.longArm_m,
			shortArm: inputs.shortArm_m,
			sling: inputs.sling_m,
			hanger: inputs.hanger_m,
			projectile: inputs.projectile_kg,
			counterweight: inputs.counterweight_kg,
			beam: inputs.beam_kg,
			pivotHeight: inputs.pivotHeight_m,
			releaseAngle: (inputs.releaseAngle_deg * Math.PI) / 180,
			gravity: inputs.g_ms2
		};
		const { longArm, shortArm, hanger, pivotHeight, gravity, counterweight, projectile } = machine;
		if (pivotHeight >= longArm) {
			return refuse(
				'tip-in-air',
				'At rest the long arm must reach the ground: make it longer than the pivot is high.',
				'longArm_m'
			);
		}
		if (shortArm >= pivotHeight) {
			return refuse(
				'arm-in-ground',
				'The short arm would swing into the ground: make it shorter than the pivot is high.',
				'shortArm_m'
			);
		}
		const thrown = throwOf(machine);
		if (thrown === 'lost') {
			return refuse(
				'not-followed',
				'This machine swings too wildly to be followed to a release. Give it a longer hanger, a lighter stone or a heavier counterweight.'
			);
		}
		const flight = thrown === 'none' ? undefined : flightOf(machine, thrown.release);
		if (thrown === 'none' || !flight || flight.range < 0) {
			return refuse(
				'does-not-throw',
				'This machine does not throw. Give it a heavier counterweight, a lighter stone or a shorter sling.'
			);
		}
		const { start, release } = thrown;
		const counterweightDrop =
			counterweightHeight(machine, start) - counterweightHeight(machine, release);
		const held: Record<string, boolean> = {
			'hits-ground': shortArm + hanger >= pivotHeight,
			'slack-sling': thrown.leastTension < 0,
			'air-matters': flight.speed > 50
		};
		return {
			ok: true,
			values: {
				releaseSpeed: flight.speed,
				range: flight.range,
				energyEfficiency:
					(projectile * flight.speed ** 2) / (2 * counterweight * gravity * counterweightDrop),
				counterweightDrop,
				liftOffTime: thrown.liftOffTime,
				releaseTime: thrown.releaseTime,
				releaseHeight: flight.height,
				beamAngle: ((release[0] ?? NaN) * 180) / Math.PI
			},
			warnings: Object.keys(held).filter((code) => held[code])
		};
	}
});

function flightOf(
	machine: Machine,
	release: readonly number[]
): { speed: number; height: number; range: number } | undefined {
	const [x, y] = projectileAt(machine, release);
	const [vx, vy] = velocityOf(machine, release);
	const height = y + machine.pivotHeight;
	const underRoot = vy * vy + 2 * machine.gravity * height;
	if (height < 0 || underRoot < 0) return undefined;
	const time = (vy + Math.sqrt(underRoot)) / machine.gravity;
	return { speed: Math.hypot(vx, vy), height, range: x + vx * time };
}
