/**
 * A theme as the style of a frame. Nothing of it comes from what someone typed: colours are read and written anew as hex,
 * the face and the corner are looked up, and the name stays out. What a reader’s system forces wins over it.
 */
import { isHex, type Hex } from './colour.ts';
import { FIXED, schemeOf, type Scheme, type SchemeName, type Themed } from './scheme.ts';
import { LARGEST_RADIUS, type Face, type Theme } from './theme.ts';

const SIGNS = "'Steelyard Signs'";
const FACE_STACKS: Record<Face, string | null> = {
	// The frame’s own.
	literata: null,
	'fira-sans': `'Frame Fira Sans','Fira Sans',Arial,${SIGNS},sans-serif`,
	'host-serif': `ui-serif,Georgia,Cambria,'Times New Roman',${SIGNS},serif`,
	'host-sans': `system-ui,'Segoe UI',Roboto,'Helvetica Neue',Arial,${SIGNS},sans-serif`
};

/** Custom properties by name; throws where a theme isn’t one, which only broken code can bring about. */
export function frameProperties(theme: Theme): Record<`--${string}`, string> {
	const { ground, accent, face, radiusPx } = theme;
	if (!isHex(ground) || !isHex(accent) || !(face in FACE_STACKS))
		throw new Error('This is no theme: a colour or the face can’t be read.');
	if (!Number.isInteger(radiusPx) || radiusPx < 0 || radiusPx > LARGEST_RADIUS)
		throw new Error(`This is no theme: a corner is 0 to ${LARGEST_RADIUS} px.`);
	const light = schemeOf(theme, 'light');
	const dark = schemeOf(theme, 'dark');
	const stack = FACE_STACKS[face];
	return {
		...Object.fromEntries(
			(Object.keys(light) as Themed[]).map((token) => [`--${token}`, both(light, dark, token)])
		),
		...(stack ? { '--face-copy': stack } : {}),
		...(face === 'host-sans' || face === 'fira-sans' ? { '--face-ui': stack ?? '' } : {}),
		'--corner': `${radiusPx}px`
	};
}

/** The same for one scheme on a page of ours, whose own tokens follow the page: states and series come along. */
export function previewProperties(theme: Theme, name: SchemeName): Record<string, string> {
	const fixed = Object.entries(FIXED).map(([token, [light, dark]]) => [
		`--${token}`,
		name === 'light' ? light : dark
	]);
	const own = Object.entries(schemeOf(theme, name)).map(([token, hex]) => [`--${token}`, hex]);
	return { ...frameProperties(theme), ...Object.fromEntries([...fixed, ...own]) };
}

function both(light: Scheme, dark: Scheme, token: Themed): string {
	const [day, night]: [Hex, Hex] = [light[token], dark[token]];
	return day === night ? day : `light-dark(${day},${night})`;
}

/** The style element’s text, to stand after the frame’s own style. */
export function frameStyle(theme: Theme): string {
	const properties = Object.entries(frameProperties(theme)).map(
		([name, value]) => `${name}:${value}`
	);
	return `@media (forced-colors:none){:root{${properties.join(';')}}}`;
}
