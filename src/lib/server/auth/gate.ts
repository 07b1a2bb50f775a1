/** Lets a few through at once and keeps a short queue; whoever comes after that is told so at once. */
export interface GateSize {
	atOnce: number;
	/** How many may wait. */
	queue: number;
}

/** `refusal` makes the error for those who find the queue full. Who waits goes in the order of coming. */
export function gate(
	{ atOnce, queue }: GateSize,
	refusal: () => Error
): <T>(work: () => Promise<T>) => Promise<T> {
	const waiting: (() => void)[] = [];
	let inside = 0;
	return async (work) => {
		if (inside < atOnce) inside += 1;
		else if (waiting.length < queue) await new Promise<void>((resolve) => waiting.push(resolve));
		else throw refusal();
		try {
			return await work();
		} finally {
			// The place goes straight to the next in line, so that nobody slips in between.
			const next = waiting.shift();
			if (next) next();
			else inside -= 1;
		}
	};
}
