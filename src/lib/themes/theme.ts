/** How a frame looks on a partner’s page: two colours, one of four faces, and how round its corners are. */
import type { Hex } from './colour.ts';

export const FACES = {
	literata: 'Literata',
	'fira-sans': 'Fira Sans',
	'host-serif': 'the host system’s serif',
	'host-sans': 'the host system’s sans-serif'
} as const;
export type Face = keyof typeof FACES;

/** In CSS pixels. */
export const LARGEST_RADIUS = 12;

export interface Theme {
	name: string;
	/** What the words stand on. Light or dark: the other scheme follows by rule. */
	ground: Hex;
	/** What a reader can act on: links, the slider’s rider, a number that can be asked about. */
	accent: Hex;
	face: Face;
	radiusPx: number;
}

/** The house’s own look, as in tokens.css. */
export const HOUSE_THEME: Theme = {
	name: '',
	ground: '#ffffff',
	accent: '#5a2a82',
	face: 'literata',
	radiusPx: 2
};
