/** Times on the wall of a place, and the instants they stand for, by the time zone data of the runtime. */

/** True for a zone of the IANA time zone database that this runtime knows. */
export function isZone(zone: string): boolean {
	try {
		clockIn(zone);
		return true;
	} catch (error) {
		// Intl throws a RangeError for a zone it doesn’t know.
		if (error instanceof RangeError) return false;
		throw error;
	}
}

/**
 * The instant at which the clocks in `zone` show `wall` (`2026-12-17T15:00`). Where they show it twice, as on the night
 * when summer time ends, the first; null where they never do, or where there is no such day.
 */
export function instantOf(wall: string, zone: string): Date | null {
	const asUtc = Date.parse(`${wall}:00Z`);
	if (Number.isNaN(asUtc)) return null;
	// No zone has ever been a day away from UTC; both sides of a change of clocks are tried.
	const candidates = [-24, 24].map((hours) => {
		const near = new Date(asUtc + hours * 3_600_000);
		return asUtc - (Date.parse(`${wallTime(near, zone)}:00Z`) - near.getTime());
	});
	const fitting = candidates.filter((at) => wallTime(new Date(at), zone) === wall);
	return fitting.length > 0 ? new Date(Math.min(...fitting)) : null;
}

/** What the clocks in `zone` show at an instant: `2026-12-17T15:00`. */
export function wallTime(at: Date, zone: string): string {
	const parts = Object.fromEntries(
		clockIn(zone)
			.formatToParts(at)
			.map(({ type, value }) => [type, value])
	);
	return `${parts.year}-${parts.month}-${parts.day}T${parts.hour}:${parts.minute}`;
}

function clockIn(zone: string): Intl.DateTimeFormat {
	return new Intl.DateTimeFormat('en-GB', {
		timeZone: zone,
		year: 'numeric',
		month: '2-digit',
		day: '2-digit',
		hour: '2-digit',
		minute: '2-digit',
		hourCycle: 'h23'
	});
}
