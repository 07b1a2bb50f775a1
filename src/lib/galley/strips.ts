/** The strips that hang in the galley, in the order in which they are looked at. */

/** How a strip shows the frame. `spaced`: with the text spacing that WCAG 2.2, 1.4.12 asks a page to bear. */
export type Look = 'light' | 'dark' | 'forced' | 'print' | 'spaced';

export interface StripKind {
	id: string;
	name: string;
	/** Of the frame’s viewport, in CSS pixels. */
	widthPx: number;
	look: Look;
	/** What the strip stands for, where its name doesn’t say it. */
	note: string;
	/** Whether axe looks at all its rules here, at contrast alone, or at nothing. */
	axe: 'all' | 'contrast' | 'none';
}

/** A4 at 96 CSS pixels an inch, less margins of 15 mm (common practice of browsers: about a centimetre and a half). */
export const A4 = { widthPx: 680, heightPx: 1009 };

export const STRIPS: readonly StripKind[] = [
	{ id: '320', name: '320, phone', widthPx: 320, look: 'light', note: '', axe: 'all' },
	{ id: '390', name: '390, phone', widthPx: 390, look: 'light', note: '', axe: 'none' },
	{ id: '620', name: '620, article', widthPx: 620, look: 'light', note: '', axe: 'contrast' },
	{ id: '800', name: '800, wide', widthPx: 800, look: 'light', note: '', axe: 'none' },
	{ id: 'dark', name: '320, dark', widthPx: 320, look: 'dark', note: '', axe: 'contrast' },
	{
		id: 'forced',
		name: '320, forced colours',
		widthPx: 320,
		look: 'forced',
		note: 'system colours by the frame’s own rules; a browser’s real palette may differ',
		axe: 'none'
	},
	{
		id: 'larger',
		name: 'four times larger',
		widthPx: 320,
		look: 'spaced',
		note: '1280 px at 400 %, with wide text spacing, shown scaled down',
		axe: 'none'
	},
	{
		id: 'print',
		name: 'print, A4',
		widthPx: A4.widthPx,
		look: 'print',
		note: 'one side at a time; dashed lines are page ends',
		axe: 'none'
	}
];

/** Pages of A4 that a printed height takes. */
export function pagesOf(heightPx: number): number {
	return Math.max(1, Math.ceil((heightPx - 1) / A4.heightPx));
}
