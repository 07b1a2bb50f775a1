/** One JSON line an event on standard error. No copy, no addresses, no cookies, no tokens. */
export function logLine(
	level: 'info' | 'warn' | 'error',
	event: string,
	details: Record<string, unknown> = {}
): void {
	process.stderr.write(
		`${JSON.stringify({ at: new Date().toISOString(), level, event, ...details })}\n`
	);
}

/** A fault of ours, under the number that the page shows. */
export function logFault(reference: string, route: string | null, error: unknown): void {
	logLine('error', 'fault', {
		reference,
		route,
		name: error instanceof Error ? error.name : typeof error,
		stack: error instanceof Error ? error.stack : undefined
	});
}
