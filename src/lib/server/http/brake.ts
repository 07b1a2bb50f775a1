/** Slows one network address down without keeping anything about it for longer than a minute. */
import { SteelyardError } from '../../errors.ts';

const WINDOW_MS = 60_000;

export interface Brake {
	/** Counts one request; throws `calculations-slowed` past the limit. */
	count(address: string, now: Date): void;
}

/** `most` requests a minute and address. The minute of an address starts at its first request. */
export function brake(most: number): Brake {
	let windows = new Map<string, { from: number; requests: number }>();
	let swept = 0;
	return {
		count(address, now) {
			const at = now.getTime();
			const isOpen = ({ from }: { from: number }) => at - from < WINDOW_MS;
			if (at - swept >= WINDOW_MS) {
				windows = new Map([...windows].filter(([, window]) => isOpen(window)));
				swept = at;
			}
			const known = windows.get(address);
			const window = known && isOpen(known) ? known : { from: at, requests: 0 };
			windows.set(address, window);
			if (window.requests >= most) {
				const retryAfterSeconds = Math.ceil((window.from + WINDOW_MS - at) / 1000);
				throw new SteelyardError('calculations-slowed', { retryAfterSeconds });
			}
			window.requests += 1;
		}
	};
}
