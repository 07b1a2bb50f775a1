/** A form tried out by the house a moment after each change: its problems, and whatever else its address answers. */
import type { Result } from '../physics/calculator.ts';
import type { HouseProblem } from '../physics/house/definition.ts';

/** What is said of a house calculator. */
export interface TrialAnswer {
	problems: HouseProblem[];
	checks: {
		statement: string;
		published: number;
		got: number | null;
		unit: string;
		agrees: boolean;
	}[];
	preview: Result | null;
}

/** How long the form rests before it is tried. */
const REST_MS = 350;

export const NOTHING_TRIED: TrialAnswer = { problems: [], checks: [], preview: null };

export class Trial<Answer extends { problems: HouseProblem[] } = TrialAnswer> {
	answer: Answer;
	/** Why it couldn't be tried; '' when it could. */
	away = $state('');
	#address: string;
	#timer: ReturnType<typeof setTimeout> | undefined;
	#asked: AbortController | undefined;

	constructor(address: string, nothing: Answer) {
		this.#address = address;
		this.answer = $state.raw(nothing);
	}

	/** Tries this once nothing has changed for a moment. */
	soon(draft: unknown): void {
		clearTimeout(this.#timer);
		const body = JSON.stringify(draft);
		this.#timer = setTimeout(() => void this.#ask(body), REST_MS);
	}

	/** Tries this at once; null when there was no answer, or something else was tried meanwhile. */
	async now(draft: unknown): Promise<Answer | null> {
		clearTimeout(this.#timer);
		return this.#ask(JSON.stringify(draft));
	}

	/** Problems that came with a refused proposal stand until the next trial. */
	refused(problems: HouseProblem[]): void {
		this.answer = { ...this.answer, problems };
	}

	at(path: string): HouseProblem[] {
		return this.answer.problems.filter((problem) => problem.path === path);
	}

	stop(): void {
		clearTimeout(this.#timer);
		this.#asked?.abort();
	}

	async #ask(body: string): Promise<Answer | null> {
		this.#asked?.abort();
		const asked = new AbortController();
		this.#asked = asked;
		try {
			const response = await fetch(this.#address, {
				method: 'POST',
				headers: { 'content-type': 'application/json' },
				body,
				signal: asked.signal
			});
			const answer: unknown = await response.json();
			if (response.ok) {
				this.answer = answer as Answer;
				this.away = '';
				return this.answer;
			}
			const { error } = answer as { error: { message: string; help?: string } };
			this.away = [error.message, error.help].filter(Boolean).join(' ');
		} catch (error) {
			if (asked.signal.aborted) return null;
			this.away = `The house doesn’t answer, so this isn’t tried yet: ${error instanceof Error ? error.message : 'no connection'}.`;
		}
		return null;
	}
}
