/** Notes that a person put away on a piece, kept on this device. Where it keeps nothing, they come back with the page. */
const MOST = 400;

const nameOf = (personId: string, slug: string) => `steelyard lint ${personId} ${slug}`;

export function readPutAway(personId: string, slug: string): Set<string> {
	try {
		const kept: unknown = JSON.parse(localStorage.getItem(nameOf(personId, slug)) ?? '[]');
		return new Set(Array.isArray(kept) ? kept.filter((each) => typeof each === 'string') : []);
	} catch {
		// The browser keeps nothing, or what it kept isn't ours.
		return new Set();
	}
}

export function writePutAway(personId: string, slug: string, putAway: ReadonlySet<string>): void {
	try {
		localStorage.setItem(nameOf(personId, slug), JSON.stringify([...putAway].slice(-MOST)));
	} catch {
		// Full or forbidden: the notes stay away until the page goes.
		return;
	}
}
