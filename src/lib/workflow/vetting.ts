/** How far a calculator's revision is trusted, and who may be asked to trust it further. One record for each revision. */
import { SteelyardError } from '../errors.ts';
import type { PersonName } from './piece.ts';

/**
 * `proposed`: written down. `tested`: every check value agrees. `vetted`: a second scientist has signed it. `superseded`:
 * a newer revision was vetted. `withdrawn`: a scientist took it out of use, with a reason.
 */
export const VETTING_STATES = ['proposed', 'tested', 'vetted', 'superseded', 'withdrawn'] as const;
export type VettingState = (typeof VETTING_STATES)[number];

/** What each state may become. `new`: there is no record yet. */
const NEXT: Record<VettingState | 'new', readonly VettingState[]> = {
	new: ['proposed'],
	proposed: ['tested', 'withdrawn'],
	tested: ['vetted', 'superseded', 'withdrawn'],
	vetted: ['superseded', 'withdrawn'],
	superseded: ['withdrawn'],
	withdrawn: []
};

export function mayBecome(from: VettingState | 'new', to: VettingState): boolean {
	return NEXT[from].includes(to);
}

/**
 * A calculator of the software can't be revised here, so what was withdrawn of it may be put to the test again, and then
 * takes a second scientist like anything tested. One of the house's own is revised instead.
 */
export function mayRetest({ state, house }: Pick<VettingView, 'state' | 'house'>): boolean {
	return state === 'withdrawn' && !house;
}

/** Throws `vetting-out-of-order`, saying where the revision stands. */
export function requireStep(from: VettingState | 'new', to: VettingState): void {
	if (!mayBecome(from, to)) throw new SteelyardError('vetting-out-of-order', { from, to });
}

/** A revision may be hung on a bench before it is vetted, so that it can be tried; it can't be published. */
export function mayCompose(state: VettingState): boolean {
	return state === 'tested' || state === 'vetted';
}

export function mayPublish(state: VettingState): boolean {
	return state === 'vetted';
}

/** Which of a calculator's revisions the house runs: the first kind that there is, and of it the newest. */
export const RUNNING_ORDER: readonly VettingState[] = [
	'vetted',
	'tested',
	'superseded',
	'withdrawn',
	'proposed'
];

/** One step of a revision's vetting. */
export interface VettingStep {
	state: VettingState;
	/** Null where the software itself vouches. */
	by: PersonName | null;
	/** ISO 8601, UTC. */
	at: string | null;
	note: string;
}

export interface VettingView {
	calculator: string;
	revision: string;
	state: VettingState;
	/** True for a calculator that came with the software and that nobody of this house has signed. */
	withSoftware: boolean;
	/** True for a calculator that this house added. */
	house: boolean;
	proposedBy: PersonName | null;
	/** Oldest first. */
	steps: VettingStep[];
}

const VETTED_WITH_SOFTWARE: VettingStep = {
	state: 'vetted',
	by: null,
	at: null,
	note: 'Vetted with the software: its check values run in the software’s own tests.'
};

/** The record of a revision from its steps, oldest first; one that came with the software needs none. */
export function vettingOf(
	revision: Pick<VettingView, 'calculator' | 'revision' | 'house' | 'proposedBy'>,
	steps: readonly VettingStep[]
): VettingView {
	const last = steps.at(-1);
	const withSoftware = !revision.house && !last;
	return {
		...revision,
		withSoftware,
		state: last?.state ?? (revision.house ? 'proposed' : 'vetted'),
		steps: withSoftware ? [VETTED_WITH_SOFTWARE] : [...steps]
	};
}

/** What a record of vetting says of the check values that were run: 'computed' ones are nobody's publication. */
export function checksAgree(checks: readonly { computed?: true }[]): string {
	if (checks.length === 0)
		return 'It has no check value of its own; the software’s tests compare it with reference values.';
	const computed = checks.filter((check) => check.computed).length;
	const all = checks.length === 1 ? '1 check value agrees' : `${checks.length} check values agree`;
	if (computed === 0) return `${all}.`;
	const of = computed === checks.length ? '' : `${computed} of them `;
	return `${all}, ${of}worked with an independent method.`;
}

/** The three kinds of change, smallest first. */
export const CHANGES = ['patch', 'minor', 'major'] as const;
export type Change = (typeof CHANGES)[number];

/** The revision after a change of this size: 1.2.3 becomes 1.2.4, 1.3.0 or 2.0.0. */
export function raised(revision: string, change: Change): string {
	const [major, minor, patch] = numbersOf(revision);
	switch (change) {
		case 'major':
			return `${major + 1}.0.0`;
		case 'minor':
			return `${major}.${minor + 1}.0`;
		case 'patch':
			return `${major}.${minor}.${patch + 1}`;
	}
}

/** Orders revisions by their numbers: below zero when `a` is the older one. */
export function compareRevisions(a: string, b: string): number {
	const [first, second] = [numbersOf(a), numbersOf(b)];
	return first[0] - second[0] || first[1] - second[1] || first[2] - second[2];
}

/** False between revisions of which only words, or one output more, differ: what a piece shows stays as it is. */
export function mayAnswerDifferently(a: string, b: string): boolean {
	return numbersOf(a)[0] !== numbersOf(b)[0];
}

function numbersOf(revision: string): [number, number, number] {
	const [major = 0, minor = 0, patch = 0] = revision.split('.').map(Number);
	return [major, minor, patch];
}
