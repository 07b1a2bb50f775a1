/** State marks as data on a 24 grid: butt caps, mitred, 2 px lines unless said. Shape first, colour second, word always. */

export interface Stroke {
	/** SVG path data. */
	d: string;
	/** Filled instead of stroked. */
	solid?: boolean;
	/** Drawn in the colour of the stamp frame instead of the mark's own. */
	frame?: boolean;
	/** Line width where it isn't 2. */
	width?: number;
	dash?: string;
	/** Degrees about the beam's pivot at 12, 11. */
	turn?: number;
}

/** The token that inks a mark: a state's colour, without the dashes. */
export type Ink = 'slate' | 'steel' | 'iron' | 'moss' | 'brass' | 'madder' | 'blue' | 'indelible';

export interface Drawing {
	/** Read out, and shown beside the mark: a mark never stands alone. */
	word: string;
	ink: Ink;
	frameInk?: Ink;
	strokes: Stroke[];
}
