/**
 * All colours of a frame from a theme’s two, for light and for dark. Neutral inks take the ground’s hue at the lightness
 * that gives them their contrast; the accent stands as chosen in its own scheme, and moves in lightness in the other.
 */
import { contrast, luminance, toHex, toOklch, type Hex } from './colour.ts';
import type { Theme } from './theme.ts';

export const SCHEMES = ['light', 'dark'] as const;
export type SchemeName = (typeof SCHEMES)[number];

/** Colours that follow from the theme, by their names in tokens.css. */
export type Themed =
	| 'sheet'
	| 'flimsy'
	| 'stone'
	| 'iron'
	| 'steel'
	| 'slate'
	| 'rule'
	| 'hairline'
	| 'indelible'
	| 'indelible-hover'
	| 'on-indelible'
	| 'tint-violet';
export type Scheme = Readonly<Record<Themed, Hex>>;

/** Colours that mean a state, or tell one line from another: the same in every theme, light and dark, as in tokens.css. */
export const FIXED = {
	brass: ['#8a6200', '#e3b341'],
	'brass-line': ['#ac7c07', '#e3b341'],
	moss: ['#1f6a44', '#7fd1a3'],
	madder: ['#a3213a', '#f29aaa'],
	blue: ['#1b5fa8', '#8fc1f2'],
	'tint-brass': ['#fbf1d6', '#3a3119'],
	'series-1': ['#1b5fa8', '#8fc1f2'],
	'series-2': ['#a8511a', '#e9a06c'],
	'series-3': ['#1f6a44', '#7fd1a3'],
	'series-4': ['#7a3e9d', '#cfa3ec'],
	'series-5': ['#5f6b66', '#aebbb4']
} as const satisfies Record<string, readonly [light: Hex, dark: Hex]>;
export type Fixed = keyof typeof FIXED;

/** The contrast each ink is given with the ground and the bars. */
const INKS = { iron: 12, steel: 7.2, slate: 5.2, rule: 3.4, hairline: 1.5 } as const;
/** Some above 4.5, so that rounding to 8 bits can’t undo it. */
const ACCENT_IN_OTHER_SCHEME = 5;
const GROUND_IN_OTHER_SCHEME = { light: 0.985, dark: 0.21 } as const;
const MOST_GROUND_CHROMA = 0.02;
const INK_CHROMA = 0.015;

/** Which scheme the theme’s own colours are for. */
export function ownScheme({ ground }: Pick<Theme, 'ground'>): SchemeName {
	return contrast(ground, '#000000') >= contrast(ground, '#ffffff') ? 'light' : 'dark';
}

export function schemeOf(theme: Pick<Theme, 'ground' | 'accent'>, name: SchemeName): Scheme {
	const own = ownScheme(theme) === name;
	const ground = own ? theme.ground : otherGround(theme.ground, name);
	const towardsInk = name === 'light' ? -1 : 1;
	const base = toOklch(ground);
	const shade = (by: number) => toHex({ ...base, lightness: base.lightness + towardsInk * by });
	const stone = shade(0.05);
	const tint = tintOf(ground, theme.accent, name);
	const ink = (target: number) => inkOn([ground, stone, tint], target, base.hue, base.chroma);
	const accent = own ? theme.accent : otherAccent(theme.accent, [ground, stone, tint], name);
	const acting = toOklch(accent);
	return {
		sheet: ground,
		flimsy: shade(0.015),
		stone,
		iron: ink(INKS.iron),
		steel: ink(INKS.steel),
		slate: ink(INKS.slate),
		rule: ink(INKS.rule),
		hairline: ink(INKS.hairline),
		indelible: accent,
		'indelible-hover': toHex({ ...acting, lightness: acting.lightness + towardsInk * 0.06 }),
		'on-indelible':
			contrast(accent, '#ffffff') >= contrast(accent, '#141a18') ? '#ffffff' : '#141a18',
		'tint-violet': tint
	};
}

function otherGround(ground: Hex, name: SchemeName): Hex {
	const { chroma, hue } = toOklch(ground);
	return toHex({
		lightness: GROUND_IN_OTHER_SCHEME[name],
		chroma: Math.min(chroma, MOST_GROUND_CHROMA),
		hue
	});
}

/** The ground with a breath of the accent, for the record of a number. */
function tintOf(ground: Hex, accent: Hex, name: SchemeName): Hex {
	const { lightness } = toOklch(ground);
	const { hue, chroma } = toOklch(accent);
	const shift = name === 'light' ? -0.035 : 0.07;
	return toHex({ lightness: lightness + shift, chroma: Math.min(chroma, 0.025), hue });
}

/** The lightness nearest to the ground’s that reaches the contrast on all of them; the far end where none does. */
function inkOn(grounds: readonly Hex[], target: number, hue: number, chroma: number): Hex {
	const [ground = '#ffffff'] = grounds;
	const end = luminance(ground) > 0.179 ? 0 : 1;
	const inkAt = (lightness: number) =>
		toHex({ lightness, chroma: Math.min(chroma, INK_CHROMA), hue });
	return nearestReaching(grounds, target, toOklch(ground).lightness, end, inkAt);
}

function otherAccent(accent: Hex, grounds: readonly Hex[], name: SchemeName): Hex {
	const base = toOklch(accent);
	const at = (lightness: number) => toHex({ ...base, lightness });
	const end = name === 'light' ? 0 : 1;
	if (reaches(grounds, ACCENT_IN_OTHER_SCHEME, accent)) return accent;
	return nearestReaching(grounds, ACCENT_IN_OTHER_SCHEME, base.lightness, end, at);
}

function reaches(grounds: readonly Hex[], target: number, ink: Hex): boolean {
	return grounds.every((ground) => contrast(ground, ink) >= target);
}

/** By halving, since contrast grows towards the end. */
function nearestReaching(
	grounds: readonly Hex[],
	target: number,
	start: number,
	end: number,
	at: (lightness: number) => Hex
): Hex {
	if (!reaches(grounds, target, at(end))) return at(end);
	let near = start;
	let far = end;
	for (let step = 0; step < 16; step++) {
		const middle = (near + far) / 2;
		if (reaches(grounds, target, at(middle))) far = middle;
		else near = middle;
	}
	return at(far);
}
