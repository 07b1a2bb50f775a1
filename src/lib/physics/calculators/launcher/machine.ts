/**
 * The machine with a hinged counterweight, as three angles measured from the direction of the target: arm a, sling s and
 * hanger w, the pivot at the origin. Lagrange's equations; the projectile first slides along a level trough without
 * friction, held there by a constraint, then flies round on the sling. SI units.
 *
 * Positions: projectile l₁u(a) + l₃u(s), counterweight −l₂u(a) + l₄u(w), with u(θ) = (cos θ, sin θ).
 */
import { follow, type Slope, type State } from '../../numerics/dormand-prince.ts';

export interface Machine {
	longArm: number;
	shortArm: number;
	sling: number;
	hanger: number;
	projectile: number;
	counterweight: number;
	beam: number;
	pivotHeight: number;
	/** Direction of the projectile's flight at release, radians above the horizontal. */
	releaseAngle: number;
	gravity: number;
}

/** Angles and their rates: a, s, w, a′, s′, w′. */
export type Pose = State;

export interface Throw {
	liftOffTime: number;
	releaseTime: number;
	/** Poses at the start, at lift-off and at release. */
	start: Pose;
	liftOff: Pose;
	release: Pose;
	/** Pull of the sling at its weakest, in N, at the ends of the steps taken. */
	leastTension: number;
	/** Largest departure of the energy from what it was at the start, over the counterweight's energy of fall. */
	energyDrift: number;
}

const LONGEST_S = 60;
const TOLERANCE = 1e-11;
/** A throw takes a few hundred; machines with a short hanger swing fast and take more. */
const MOST_STEPS = 4000;

/**
 * One whole throw; `none` when the machine doesn't lift and let go within a minute, `lost` when it swings too wildly to be
 * followed for so long.
 */
export function throwOf(machine: Machine): Throw | 'none' | 'lost' {
	const { longArm, pivotHeight, releaseAngle } = machine;
	const start: Pose = [Math.PI + Math.asin(pivotHeight / longArm), 0, -Math.PI / 2, 0, 0, 0];
	// The long arm must come up from the ground, not press into it.
	if (accelerations(machine, start, 'trough').rates[0] >= 0) return 'none';
	const energyAtStart = energyOf(machine, start);
	let leastTension = Infinity;
	let energyDrift = 0;
	const watch = (phase: Phase) => (_t: number, pose: State) => {
		leastTension = Math.min(leastTension, tensionOf(machine, pose, phase));
		energyDrift = Math.max(energyDrift, Math.abs(energyOf(machine, pose) - energyAtStart));
	};
	const motion = (phase: Phase, t: number, pose: Pose, event: (pose: State) => number) => ({
		slope: slopeOf(machine, phase),
		x: t,
		y: pose,
		end: LONGEST_S,
		relative: TOLERANCE,
		absolute: [1, 1, 1, 1, 1, 1].map(() => TOLERANCE),
		events: [(_t: number, y: State) => event(y)],
		onStep: watch(phase),
		mostSteps: MOST_STEPS
	});

	const sliding = follow(motion('trough', 0, start, (pose) => troughForce(machine, pose)));
	if (sliding.by !== 'event') return sliding.by === 'end' ? 'none' : 'lost';
	watch('trough')(sliding.x, sliding.y);
	const steepness = (pose: State) => {
		const [vx, vy] = velocityOf(machine, pose);
		return vy * Math.cos(releaseAngle) - vx * Math.sin(releaseAngle);
	};
	const swinging = follow(motion('free', sliding.x, sliding.y, steepness));
	if (swinging.by !== 'event') return swinging.by === 'end' ? 'none' : 'lost';
	watch('free')(swinging.x, swinging.y);
	return {
		liftOffTime: sliding.x,
		releaseTime: swinging.x,
		start,
		liftOff: sliding.y,
		release: swinging.y,
		leastTension,
		energyDrift: energyDrift / (machine.counterweight * machine.gravity * machine.shortArm)
	};
}

type Phase = 'trough' | 'free';

type Triple = [number, number, number];

/** Second derivatives of a, s and w, and the trough's push on the projectile (0 once it flies), in N. */
function accelerations(
	machine: Machine,
	pose: State,
	phase: Phase
): { rates: Triple; push: number } {
	const { longArm: l1, shortArm: l2, sling: l3, hanger: l4, gravity: g } = machine;
	const { projectile: m, counterweight: M, beam: mb, pivotHeight: h } = machine;
	const [a = NaN, s = NaN, w = NaN, da = NaN, ds = NaN, dw = NaN] = pose;
	const centre = (l1 - l2) / 2;
	const inertia = mb * ((l1 + l2) ** 2 / 12 + centre ** 2) + m * l1 ** 2 + M * l2 ** 2;
	const armSling = m * l1 * l3;
	const armHanger = M * l2 * l4;
	const weight = m * l1 - M * l2 + mb * centre;
	const cosAS = armSling * Math.cos(a - s);
	const sinAS = armSling * Math.sin(a - s);
	const cosAW = armHanger * Math.cos(a - w);
	const sinAW = armHanger * Math.sin(a - w);
	const forces: Triple = [
		-sinAS * ds * ds + sinAW * dw * dw - g * Math.cos(a) * weight,
		sinAS * da * da - m * g * l3 * Math.cos(s),
		-sinAW * da * da - M * g * l4 * Math.cos(w)
	];
	// Sling and hanger hang from the arm alone, so that both can be eliminated by hand.
	const slingInertia = m * l3 ** 2;
	const hangerInertia = M * l4 ** 2;
	const armInertia = inertia - cosAS ** 2 / slingInertia - cosAW ** 2 / hangerInertia;
	const answer = (onArm: number, onSling: number, onHanger: number): Triple => {
		const arm =
			(onArm - (cosAS * onSling) / slingInertia + (cosAW * onHanger) / hangerInertia) / armInertia;
		return [arm, (onSling - cosAS * arm) / slingInertia, (onHanger + cosAW * arm) / hangerInertia];
	};
	const free = answer(...forces);
	if (phase === 'free') return { rates: free, push: 0 };

	// The projectile keeps to height −h: l₁ sin a + l₃ sin s = −h, twice differentiated, with the push as multiplier. The
	// small spring and damper draw back what rounding lets slip (Baumgarte 1972).
	const reachA = l1 * Math.cos(a);
	const reachS = l3 * Math.cos(s);
	const slip = l1 * Math.sin(a) + l3 * Math.sin(s) + h;
	const slipRate = reachA * da + reachS * ds;
	const held = l1 * Math.sin(a) * da * da + l3 * Math.sin(s) * ds * ds;
	const wanted = held - STIFFNESS * (2 * slipRate + STIFFNESS * slip);
	const pushed = answer(reachA, reachS, 0);
	const push =
		(wanted - reachA * free[0] - reachS * free[1]) / (reachA * pushed[0] + reachS * pushed[1]);
	return {
		rates: [free[0] + push * pushed[0], free[1] + push * pushed[1], free[2] + push * pushed[2]],
		push
	};
}

/** 1/s */
const STIFFNESS = 10;

function slopeOf(machine: Machine, phase: Phase): Slope {
	return (_t, pose, out) => {
		const { rates } = accelerations(machine, pose, phase);
		for (let i = 0; i < 3; i += 1) {
			out[i] = pose[i + 3] ?? NaN;
			out[i + 3] = rates[i] ?? NaN;
		}
	};
}

/** The trough's push on the projectile in N; it lifts off where this falls to 0. */
function troughForce(machine: Machine, pose: State): number {
	return accelerations(machine, pose, 'trough').push;
}

/** Pull of the sling on the projectile in N. */
function tensionOf(machine: Machine, pose: State, phase: Phase): number {
	const { longArm: l1, sling: l3, projectile: m, gravity: g } = machine;
	const [a = NaN, s = NaN, , da = NaN, ds = NaN] = pose;
	const {
		rates: [dda, dds],
		push
	} = accelerations(machine, pose, phase);
	const ax =
		-l1 * (Math.sin(a) * dda + Math.cos(a) * da * da) -
		l3 * (Math.sin(s) * dds + Math.cos(s) * ds * ds);
	const ay =
		l1 * (Math.cos(a) * dda - Math.sin(a) * da * da) +
		l3 * (Math.cos(s) * dds - Math.sin(s) * ds * ds);
	return -(m * ax * Math.cos(s) + (m * (ay + g) - push) * Math.sin(s));
}

/** Position of the projectile from the pivot, in m. */
export function projectileAt(
	{ longArm, sling }: Machine,
	[a = NaN, s = NaN]: State
): [number, number] {
	return [longArm * Math.cos(a) + sling * Math.cos(s), longArm * Math.sin(a) + sling * Math.sin(s)];
}

/** Velocity of the projectile, in m/s. */
export function velocityOf({ longArm, sling }: Machine, pose: State): [number, number] {
	const [a = NaN, s = NaN, , da = NaN, ds = NaN] = pose;
	return [
		-longArm * Math.sin(a) * da - sling * Math.sin(s) * ds,
		longArm * Math.cos(a) * da + sling * Math.cos(s) * ds
	];
}

/** Height of the counterweight's centre of mass above the pivot, in m. */
export function counterweightHeight(
	{ shortArm, hanger }: Machine,
	[a = NaN, , w = NaN]: State
): number {
	return -shortArm * Math.sin(a) + hanger * Math.sin(w);
}

/** Kinetic and potential energy of all parts, in J, from velocities and heights and not from the equations of motion. */
export function energyOf(machine: Machine, pose: State): number {
	const { longArm: l1, shortArm: l2, hanger: l4, gravity: g } = machine;
	const { projectile: m, counterweight: M, beam: mb } = machine;
	const [a = NaN, , w = NaN, da = NaN, , dw = NaN] = pose;
	const [vx, vy] = velocityOf(machine, pose);
	const [, y] = projectileAt(machine, pose);
	const Vx = l2 * Math.sin(a) * da - l4 * Math.sin(w) * dw;
	const Vy = -l2 * Math.cos(a) * da + l4 * Math.cos(w) * dw;
	const centre = (l1 - l2) / 2;
	const inertia = mb * ((l1 + l2) ** 2 / 12 + centre ** 2);
	return (
		(m * (vx * vx + vy * vy) + M * (Vx * Vx + Vy * Vy) + inertia * da * da) / 2 +
		g * (m * y + M * counterweightHeight(machine, pose) + mb * centre * Math.sin(a))
	);
}
