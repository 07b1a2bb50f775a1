/**
 * Colours as sRGB hex and as OKLCH, and the contrast between two. Contrast: W3C, Web Content Accessibility Guidelines
 * 2.2, 2023, definitions of relative luminance and contrast ratio. OKLCH: B. Ottosson, A perceptual color space for image
 * processing, 2020; the matrices as in W3C, CSS Color Module Level 4.
 */

/** “#5a2a82”, in small letters. */
export type Hex = `#${string}`;

export function isHex(text: unknown): text is Hex {
	return typeof text === 'string' && /^#[0-9a-f]{6}$/.test(text);
}

/** Lightness 0 to 1, chroma from 0, hue in degrees. */
export interface Oklch {
	lightness: number;
	chroma: number;
	hue: number;
}

type Triple = readonly [number, number, number];

/** Channels from 0 to 1. */
function channels(hex: Hex): Triple {
	const at = (start: number) => parseInt(hex.slice(start, start + 2), 16) / 255;
	return [at(1), at(3), at(5)];
}

/** WCAG’s 0.04045 and sRGB’s agree since the 2021 erratum. */
function linear(channel: number): number {
	return channel <= 0.04045 ? channel / 12.92 : ((channel + 0.055) / 1.055) ** 2.4;
}

function encoded(channel: number): number {
	return channel <= 0.0031308 ? channel * 12.92 : 1.055 * channel ** (1 / 2.4) - 0.055;
}

export function luminance(hex: Hex): number {
	const [red, green, blue] = channels(hex);
	return 0.2126 * linear(red) + 0.7152 * linear(green) + 0.0722 * linear(blue);
}

/** From 1 to 21, the same both ways. */
export function contrast(one: Hex, other: Hex): number {
	const [low = 0, high = 0] = [luminance(one), luminance(other)].sort((a, b) => a - b);
	return (high + 0.05) / (low + 0.05);
}

export function toOklch(hex: Hex): Oklch {
	const [red, green, blue] = channels(hex);
	const [r, g, b] = [linear(red), linear(green), linear(blue)];
	const long = Math.cbrt(0.4122214708 * r + 0.5363325363 * g + 0.0514459929 * b);
	const medium = Math.cbrt(0.2119034982 * r + 0.6806995451 * g + 0.1073969566 * b);
	const short = Math.cbrt(0.0883024619 * r + 0.2817188376 * g + 0.6299787005 * b);
	const lightness = 0.2104542553 * long + 0.793617785 * medium - 0.0040720468 * short;
	const a = 1.9779984951 * long - 2.428592205 * medium + 0.4505937099 * short;
	const bee = 0.0259040371 * long + 0.7827717662 * medium - 0.808675766 * short;
	return {
		lightness,
		chroma: Math.hypot(a, bee),
		hue: ((Math.atan2(bee, a) * 180) / Math.PI + 360) % 360
	};
}

/** The nearest colour a screen has: lightness and hue stay, chroma gives way. */
export function toHex({ lightness, chroma, hue }: Oklch): Hex {
	const light = Math.min(1, Math.max(0, lightness));
	if (fits(light, chroma, hue)) return hexOf(light, chroma, hue);
	let low = 0;
	let high = chroma;
	for (let step = 0; step < 20; step++) {
		const middle = (low + high) / 2;
		if (fits(light, middle, hue)) low = middle;
		else high = middle;
	}
	return hexOf(light, low, hue);
}

function linearOf(lightness: number, chroma: number, hue: number): Triple {
	const a = chroma * Math.cos((hue * Math.PI) / 180);
	const b = chroma * Math.sin((hue * Math.PI) / 180);
	const long = (lightness + 0.3963377774 * a + 0.2158037573 * b) ** 3;
	const medium = (lightness - 0.1055613458 * a - 0.0638541728 * b) ** 3;
	const short = (lightness - 0.0894841775 * a - 1.291485548 * b) ** 3;
	return [
		4.0767416621 * long - 3.3077115913 * medium + 0.2309699292 * short,
		-1.2684380046 * long + 2.6097574011 * medium - 0.3413193965 * short,
		-0.0041960863 * long - 0.7034186147 * medium + 1.707614701 * short
	];
}

/** Half a step of 8 bits. */
const DUST = 0.002;

function fits(lightness: number, chroma: number, hue: number): boolean {
	return linearOf(lightness, chroma, hue).every((value) => value >= -DUST && value <= 1 + DUST);
}

function hexOf(lightness: number, chroma: number, hue: number): Hex {
	const digits = linearOf(lightness, chroma, hue).map((value) => {
		const byte = Math.round(encoded(Math.min(1, Math.max(0, value))) * 255);
		return byte.toString(16).padStart(2, '0');
	});
	return `#${digits.join('')}`;
}
