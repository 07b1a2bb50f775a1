/**
 * Every pair of colours that stand on each other in a frame, with its contrast. W3C, Web Content Accessibility Guidelines
 * 2.2, 2023: 1.4.3 Contrast (Minimum), 4.5 to 1 for text; 1.4.11 Non-text Contrast, 3 to 1 for controls and lines that
 * carry. Hairlines are ornament.
 */
import { contrast, toHex, toOklch, type Hex } from './colour.ts';
import {
	FIXED,
	ownScheme,
	schemeOf,
	SCHEMES,
	type Fixed,
	type Scheme,
	type SchemeName,
	type Themed
} from './scheme.ts';
import type { Theme } from './theme.ts';

const TEXT = 4.5;
const LINE = 3;

interface Pair {
	/** As a sentence names it, at its beginning. */
	words: string;
	front: Themed | Fixed;
	back: Themed | Fixed;
	needs: typeof TEXT | typeof LINE;
}

const pair = (words: string, front: Pair['front'], back: Pair['back'], needs: Pair['needs']) => ({
	words,
	front,
	back,
	needs
});

export const PAIRS: readonly Pair[] = [
	pair('Text on the ground', 'iron', 'sheet', TEXT),
	pair('Text on a bar', 'iron', 'stone', TEXT),
	pair('Text in the record of a number', 'iron', 'tint-violet', TEXT),
	pair('Text in a caution', 'iron', 'tint-brass', TEXT),
	pair('Secondary text on the ground', 'steel', 'sheet', TEXT),
	pair('Secondary text in the record of a number', 'steel', 'tint-violet', TEXT),
	pair('Hints on the ground', 'slate', 'sheet', TEXT),
	pair('Links on the ground', 'indelible', 'sheet', TEXT),
	pair('Links on a bar', 'indelible', 'stone', TEXT),
	pair('Links in the record of a number', 'indelible', 'tint-violet', TEXT),
	pair('Words where there is no reading', 'brass', 'sheet', TEXT),
	pair('The word “fits”', 'moss', 'sheet', TEXT),
	pair('The word “wrong”', 'madder', 'sheet', TEXT),
	pair('Queries', 'blue', 'sheet', TEXT),
	pair('The border of a field', 'rule', 'sheet', LINE),
	pair('The edge of a button', 'iron', 'sheet', LINE),
	pair('The rider on the slider', 'indelible', 'sheet', LINE),
	pair('The slot in the rider', 'on-indelible', 'indelible', LINE),
	pair('The line around a caution', 'brass-line', 'sheet', LINE),
	pair('The first line of a chart', 'series-1', 'sheet', LINE),
	pair('The second line of a chart', 'series-2', 'sheet', LINE),
	pair('The third line of a chart', 'series-3', 'sheet', LINE),
	pair('The fourth line of a chart', 'series-4', 'sheet', LINE),
	pair('The fifth line of a chart', 'series-5', 'sheet', LINE)
];

export interface PairReading extends Pair {
	scheme: SchemeName;
	frontColour: Hex;
	backColour: Hex;
	ratio: number;
	passes: boolean;
}

export interface Failing extends PairReading {
	/** Which of the theme’s two colours would have to change. */
	change: 'ground' | 'accent';
	/** The nearest colour with which all pairs of that colour pass; null where there is none. */
	nearest: Hex | null;
	says: string;
}

type Colours = Pick<Theme, 'ground' | 'accent'>;

/** Every pair in both schemes, in the order of `PAIRS`, light first. */
export function readPairs(theme: Colours): PairReading[] {
	return SCHEMES.flatMap((name) => pairsIn(schemeOf(theme, name), name));
}

/** What keeps a theme from being saved; empty when it may be. */
export function failingPairs(theme: Colours): Failing[] {
	const failing = readPairs(theme).filter(({ passes }) => !passes);
	const nearest = {
		ground: failing.some((reading) => !isOfAccent(reading)) ? nearestGround(theme) : null,
		accent: failing.some(isOfAccent) ? nearestAccent(theme) : null
	};
	return failing.map((reading) => {
		const change = isOfAccent(reading) ? 'accent' : 'ground';
		return {
			...reading,
			change,
			nearest: nearest[change],
			says: sentence(reading, change, nearest[change])
		};
	});
}

/** Rounded down, so that 4.496 isn’t told as 4.5. */
export function printRatio(ratio: number): string {
	return (Math.floor(ratio * 10) / 10).toFixed(1);
}

function pairsIn(scheme: Scheme, name: SchemeName): PairReading[] {
	const colour = (token: Themed | Fixed): Hex =>
		token in FIXED ? FIXED[token as Fixed][name === 'light' ? 0 : 1] : scheme[token as Themed];
	return PAIRS.map((each) => {
		const frontColour = colour(each.front);
		const backColour = colour(each.back);
		const ratio = contrast(frontColour, backColour);
		return { ...each, scheme: name, frontColour, backColour, ratio, passes: ratio >= each.needs };
	});
}

function isOfAccent({ front, back }: Pair): boolean {
	return front === 'indelible' || back === 'indelible';
}

function sentence(
	{ words, scheme, ratio, needs }: PairReading,
	change: 'ground' | 'accent',
	nearest: Hex | null
): string {
	const told = `${words}, ${scheme} scheme: ${printRatio(ratio)} to 1, and ${needs} is needed.`;
	return nearest
		? `${told} The nearest ${change} that would do is ${nearest}.`
		: `${told} No lightness of this ${change} would do.`;
}

/** Lighter in the light scheme, darker in the dark one: towards the other side there is only the middle. */
function nearestGround(theme: Colours): Hex | null {
	const name = ownScheme(theme);
	return nearestTowards(theme.ground, name === 'light' ? 1 : 0, (ground) =>
		pairsIn(schemeOf({ ...theme, ground }, name), name).every(
			(reading) => reading.passes || isOfAccent(reading)
		)
	);
}

function nearestAccent(theme: Colours): Hex | null {
	const name = ownScheme(theme);
	return nearestTowards(theme.accent, name === 'light' ? 0 : 1, (accent) =>
		pairsIn(schemeOf({ ...theme, accent }, name), name).every(
			(reading) => reading.passes || !isOfAccent(reading)
		)
	);
}

/** Halvings until a step of lightness is too fine to be seen. */
const HALVINGS = 10;

/** The lightness nearest to the colour’s own that passes, towards `end`; contrast only grows that way. */
function nearestTowards(colour: Hex, end: 0 | 1, passes: (tried: Hex) => boolean): Hex | null {
	const base = toOklch(colour);
	const at = (lightness: number) => toHex({ ...base, lightness });
	if (!passes(at(end))) return null;
	let near = base.lightness;
	let far: number = end;
	for (let step = 0; step < HALVINGS; step++) {
		const middle = (near + far) / 2;
		if (passes(at(middle))) far = middle;
		else near = middle;
	}
	return at(far);
}
