/** The beam in all its states: how a claim stands. The crook opens to the left, so that it isn't taken for a “?”. */
import type { Drawing, Stroke } from './drawing.ts';

const HOOK: Stroke = { d: 'M12 11V6a2.5 2.5 0 0 0-5 0v1' };
const BEAM = 'M2 11H22';
const FEET: Stroke = { d: 'M3 11v5M21 11v5' };
const RIDER: Stroke = { d: 'M13.5 12h5v5h-5z', solid: true };
const STAMP = 'M3 3H21V21H3z';
/** A level beam small enough to stand inside a stamp. */
const SMALL_LEVEL: Stroke[] = [
	{ d: 'M12 12.5V9.2a1.7 1.7 0 0 0-3.4 0v.6', width: 1.5 },
	{ d: 'M6 12.5H18M6.8 12.5v3M17.2 12.5v3', width: 1.6 },
	{ d: 'M12.8 13h3.4v3.6h-3.4z', solid: true }
];
/** Clock hands at lower left: a newer reading has come in. */
const HANDS: Stroke = { d: 'M5 16v5h5' };

/** The mark beside a reader's number, and of a claim whose words fit its reading. */
export const level: Drawing = {
	word: 'level',
	ink: 'moss',
	strokes: [HOOK, { d: BEAM }, FEET, RIDER]
};

const drawings = {
	unweighed: {
		word: 'not weighed',
		ink: 'slate',
		strokes: [
			HOOK,
			{ d: 'M1.5 11h4.5M8 11h8M18 11h4.5' },
			{ d: 'M3 11v3M21 11v3', dash: '1.5 1.5' }
		]
	},
	level,
	leans: {
		word: 'leans: decide',
		ink: 'brass',
		strokes: [HOOK, { d: BEAM, turn: 10 }, { d: 'M15 12.8h4.4v4.4H15z', width: 1.8, turn: 10 }]
	},
	tips: {
		word: 'tips: doesn’t fit',
		ink: 'madder',
		strokes: [
			{ d: 'M12 11V5.5a2.5 2.5 0 0 0-5 0v1' },
			{ d: BEAM, turn: 28 },
			{ d: 'M14.5 12h5v5h-5z', solid: true, turn: 28 },
			{ d: 'M12 22h11' }
		]
	},
	queried: {
		word: 'queried',
		ink: 'blue',
		strokes: [
			{ d: 'M9 6.2A3.3 3.3 0 0 1 12.3 3a3.2 3.2 0 0 1 3.3 3.1c0 2.9-3.4 2.8-3.4 6.4' },
			{ d: 'M11.1 14.6h2.2v2.2h-2.2z', solid: true },
			{ d: 'M2 20.5H22' }
		]
	},
	stet: {
		word: 'stet',
		ink: 'iron',
		strokes: [HOOK, { d: BEAM }, { d: 'M5 15h3v3H5zM10.5 15h3v3h-3zM16 15h3v3h-3z', solid: true }]
	},
	signed: {
		word: 'signed',
		ink: 'moss',
		frameInk: 'indelible',
		strokes: [{ d: STAMP, frame: true }, ...SMALL_LEVEL]
	},
	countersigned: {
		word: 'countersigned',
		ink: 'moss',
		frameInk: 'indelible',
		strokes: [
			{ d: 'M2 2H19V19H2z', frame: true },
			{ d: 'M22.5 6V22.5H6', frame: true },
			{ d: 'M10.8 11V7.8a1.6 1.6 0 0 0-3.2 0v.6M5 11h11M5.8 11v3M15.2 11v3', width: 1.5 },
			{ d: 'M11.3 11.5h3v3.4h-3z', solid: true }
		]
	},
	lapsed: {
		word: 'signature lapsed',
		ink: 'madder',
		frameInk: 'madder',
		strokes: [
			{ d: 'M14 3H3V21H21V11', frame: true },
			{ d: 'M17 7.5L22 2', frame: true },
			{ d: 'M6 12.5H18M6.8 12.5v3M17.2 12.5v3', width: 1.6 },
			{ d: 'M12.8 13h3.4v3.6h-3.4z', solid: true }
		]
	},
	'stale-same': {
		word: 'newer reading, same verdict',
		ink: 'slate',
		strokes: [
			{ d: 'M12 9V4.5a2.5 2.5 0 0 0-5 0v1M2 9H22M3 9v4M21 9v4' },
			{ d: 'M13.5 10h5v5h-5z', solid: true },
			HANDS
		]
	},
	'stale-moved': {
		word: 'newer reading, no longer fits',
		ink: 'madder',
		strokes: [
			{ d: 'M12 10V4.5a2.5 2.5 0 0 0-5 0v1' },
			{ d: 'M2 10H22', turn: 24 },
			{ d: 'M14 11.2h5v5h-5z', solid: true, turn: 24 },
			HANDS
		]
	},
	sourced: {
		word: 'sourced',
		ink: 'moss',
		strokes: [
			{ d: 'M12 9V5a2.5 2.5 0 0 0-5 0v1' },
			{ d: 'M5.5 9.5H18.5V21.5H5.5zM9.5 9.5V21.5', width: 1.8 }
		]
	},
	setting: {
		word: 'setting',
		ink: 'steel',
		strokes: [{ d: 'M12 3L16 7.5L12 12L8 7.5zM12 12V20M2 20H22' }]
	}
} satisfies Record<string, Drawing>;

export type ClaimMark = keyof typeof drawings;

export const claimMarks: Record<ClaimMark, Drawing> = drawings;
