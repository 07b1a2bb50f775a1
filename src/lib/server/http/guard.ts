/** Which addresses ask for a session. A layout's load is no guard, so this looks at the route before anything runs. */
export type Guard = 'open' | 'page' | 'api' | 'public-api';

/** `routeId` is SvelteKit's, such as `/(desk)/pieces/[slug]/check`; null when no route matches. */
export function guardOf(routeId: string | null): Guard {
	if (routeId === null) return 'open';
	if (routeId.startsWith('/api/v1/')) return 'public-api';
	if (routeId.startsWith('/api/')) return 'api';
	return routeId.startsWith('/(desk)') || routeId.startsWith('/(strip)') ? 'page' : 'open';
}
