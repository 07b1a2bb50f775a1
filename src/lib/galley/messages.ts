/** What the galley tells a strip, and what a strip tells the galley. Both are windows of one origin. */
import type { HouseDefinition } from '$lib/physics/house/definition.ts';
import type { FrameRelease } from '$lib/renderer/release.ts';
import type { ControlValues } from '$lib/widget/document.ts';
import type { SpokenLine, StripReport } from './report.ts';
import type { StripKind } from './strips.ts';

export type Order =
	| {
			galley: 'show';
			release: FrameRelease;
			house: readonly HouseDefinition[];
			kind: StripKind;
			values: ControlValues;
	  }
	| { galley: 'set'; values: ControlValues }
	| { galley: 'measure' };

export type News =
	| { galley: 'open' }
	| { galley: 'shown'; heightPx: number }
	| { galley: 'height'; heightPx: number }
	| { galley: 'moved'; values: ControlValues }
	| { galley: 'spoken'; lines: SpokenLine[] }
	| { galley: 'measured'; report: StripReport }
	| { galley: 'failed'; says: string };

function isOurs(event: MessageEvent, from: Window | null): boolean {
	return (
		event.origin === window.location.origin &&
		event.source === from &&
		typeof event.data === 'object' &&
		event.data !== null &&
		'galley' in event.data
	);
}

/** The order in a message; null for messages from anywhere but the page around this window. */
export function orderIn(event: MessageEvent): Order | null {
	return isOurs(event, window.parent) ? (event.data as Order) : null;
}

/** The news in a message; null for messages from anywhere but that window. */
export function newsIn(event: MessageEvent, from: Window | null): News | null {
	return from && isOurs(event, from) ? (event.data as News) : null;
}

export function tellGalley(news: News): void {
	if (window.parent !== window) window.parent.postMessage(news, window.location.origin);
}

/** One text for the same settings, in whatever order they were made. */
export function settingsText(values: ControlValues): string {
	return JSON.stringify(Object.entries(values).sort(([a], [b]) => (a < b ? -1 : 1)));
}
