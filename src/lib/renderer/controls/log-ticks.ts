/** Ticks of a logarithmic arm: the given leads, times every power of ten between the ends. Ends are above nought. */
export function logTicks(min: number, max: number, leads: readonly number[]): number[] {
	const found: number[] = [];
	for (let power = Math.floor(Math.log10(min)); power <= Math.ceil(Math.log10(max)); power += 1) {
		for (const lead of leads) {
			const at = Number(`${lead}e${power}`);
			if (at >= min && at <= max) found.push(at);
		}
	}
	return found;
}
