/** What a strip measured: plain data, since it travels between windows. */

export const MEASURES = [
	'overflow',
	'spill',
	'broken-word',
	'cut',
	'small-target',
	'small-control',
	'first-view',
	'jump',
	'heading-order',
	'no-alt',
	'no-description',
	'no-table',
	'axe'
] as const;
export type Measure = (typeof MEASURES)[number];

/** In the strip's CSS pixels, from the top left of its document. */
export interface Spot {
	x: number;
	y: number;
}

export interface StripFault {
	measure: Measure;
	/** The block it stands in; null for title, point and foot. */
	block: string | null;
	/** The words it is about, or what it is called. */
	subject: string;
	/** By how much, in CSS pixels; 0 where that says nothing. */
	byPx: number;
	/** “The wave left at this age: 500 million years”; '' at the first settings. */
	setting: string;
	/** What axe says of it; '' for the galley's own measures. */
	says: string;
	spot: Spot;
}

export interface SpokenLine {
	text: string;
	block: string | null;
}

export interface StripReport {
	/** At the first settings. */
	heightPx: number;
	tallestPx: number;
	/** The settings at which it is tallest; '' for the first ones. */
	tallestAt: string;
	faults: StripFault[];
}
