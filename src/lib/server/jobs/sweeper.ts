/** Clears away what nobody wants any more: at the start, and once a day. */
const EVERY_MS = 24 * 3_600_000;

export interface Sweeper {
	/** Waits for the sweep in hand. */
	stop(): Promise<void>;
}

export interface SweeperParts {
	/** How many things were removed. */
	sweep(now: Date): Promise<number>;
	/** “Interrupted uploads had left 3 files; they are removed.” */
	removedSentence(removed: number): string;
	/** “Pictures couldn’t be swept”; the reason follows. */
	failed: string;
	clock(): Date;
	/** Told of failures, and of what was found. */
	report(message: string): void;
}

export function startSweeper(parts: SweeperParts): Sweeper {
	const { sweep, removedSentence, failed, clock, report } = parts;
	let sweeping: Promise<void> = Promise.resolve();
	const begin = () => {
		sweeping = sweep(clock()).then(
			(removed) => {
				if (removed > 0) report(removedSentence(removed));
			},
			// What can’t be reached may be away for a while; the next sweep finds the same.
			(error: unknown) =>
				report(`${failed}: ${error instanceof Error ? error.message : String(error)}`)
		);
	};
	begin();
	const timer = setInterval(begin, EVERY_MS);
	timer.unref();
	return {
		async stop() {
			clearInterval(timer);
			await sweeping;
		}
	};
}
