/** A piece that rests on a revision taken out of use, or left behind by a newer one: what the people of the piece are told. */
import type { PersonName } from './piece.ts';
import { mayAnswerDifferently } from './vetting.ts';

export interface CalculatorFlag {
	piece: { slug: string; title: string };
	calculator: { id: string; title: string; revision: string };
	state: 'withdrawn' | 'superseded';
	by: PersonName;
	/** Since when. ISO 8601, UTC. */
	at: string;
	/** What whoever did it wrote; '' when a newer revision took its place. */
	reason: string;
	/** Number of the live release that works with it; null when readers don't meet it. */
	release: number | null;
	/** Whether the draft as it stands works with it. */
	inDraft: boolean;
	/** The vetted revision that runs now; null when there is none. */
	instead: string | null;
	/** Ids of everyone who has written the piece. */
	writers: string[];
}

/** Whether someone has to act: what a newer revision answers just as before needs nobody. */
export function asksForWork({ state, calculator, instead }: CalculatorFlag): boolean {
	return (
		state === 'withdrawn' || instead === null || mayAnswerDifferently(calculator.revision, instead)
	);
}

/** “Release 2, which readers have now, works with Speed of sound in air, 1.0.0.” */
export function whatUses({ calculator, release, inDraft }: CalculatorFlag): string {
	const name = `${calculator.title}, ${calculator.revision}`;
	if (release === null) return `The draft works with ${name}.`;
	const live = `Release ${release}, which readers have now,`;
	return inDraft ? `${live} and the draft work with ${name}.` : `${live} works with ${name}.`;
}

/** Who, and why: “Withdrawn by Ama Tindleforth: the constant was mistyped.” */
export function whatHappened({ state, by, reason, instead }: CalculatorFlag): string {
	if (state === 'withdrawn') return `Withdrawn by ${by.name}: ${ended(reason)}`;
	return `Superseded: ${by.name} vetted ${instead ? `revision ${instead}` : 'a newer revision'}.`;
}

/** What to do about it. */
export function wayOut(flag: CalculatorFlag): string {
	const { state, release, inDraft, instead } = flag;
	if (!asksForWork(flag)) return 'Every answer stays; the next release takes it along.';
	const again = release === null ? 'pull a proof' : 'pull a proof and release anew';
	const look = `look over what has moved, then ${again}.`;
	if (instead !== null)
		return state === 'withdrawn'
			? `Revision ${instead} runs in its place: ${look}`
			: `L${look.slice(1)}`;
	return inDraft
		? `Hang another calculator in its place, then ${again}.`
		: `The draft no longer works with it: ${again}.`;
}

function ended(sentence: string): string {
	return /[.!?…]$/.test(sentence) ? sentence : `${sentence}.`;
}
