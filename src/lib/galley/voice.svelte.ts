/** Reads lines aloud with the browser's own voices, from a chosen line on. It never starts by itself. */
export class Voice {
	/** Index of the line that is being read; null while it is still. */
	reading = $state<number | null>(null);
	readonly here = typeof window !== 'undefined' && 'speechSynthesis' in window;
	#turn = 0;

	readFrom(lines: readonly string[], index: number, language: string): void {
		this.stop();
		const turn = this.#turn;
		const next = (at: number) => {
			const line = lines[at];
			if (turn !== this.#turn) return;
			if (line === undefined) {
				this.reading = null;
				return;
			}
			this.reading = at;
			const words = new SpeechSynthesisUtterance(line);
			words.lang = language;
			words.onend = () => next(at + 1);
			words.onerror = () => {
				if (turn === this.#turn) this.reading = null;
			};
			speechSynthesis.speak(words);
		};
		next(index);
	}

	stop(): void {
		this.#turn += 1;
		this.reading = null;
		if (this.here) speechSynthesis.cancel();
	}
}
