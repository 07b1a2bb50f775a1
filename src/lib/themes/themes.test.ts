import { readFileSync } from 'node:fs';
import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { contrast, toHex, toOklch, type Hex } from './colour.ts';
import { failingPairs, readPairs } from './contrast-check.ts';
import { frameProperties, frameStyle } from './frame-style.ts';
import { FIXED, ownScheme } from './scheme.ts';
import { HOUSE_THEME, type Theme } from './theme.ts';

const theme = (over: Partial<Theme>): Theme => ({ ...HOUSE_THEME, name: 'A partner', ...over });
const anyHex = fc
	.integer({ min: 0, max: 0xffffff })
	.map((value): Hex => `#${value.toString(16).padStart(6, '0')}`);

describe('contrast', () => {
	// W3C, Understanding SC 1.4.3: #777777 on white is 4.48 to 1, below 4.5; #767676 is 4.54. Black on white is 21.
	test.each([
		['#000000', '#ffffff', 21],
		['#777777', '#ffffff', 4.48],
		['#767676', '#ffffff', 4.54],
		['#ff0000', '#ffffff', 4.0]
	] as const)('%s on %s', (one, other, printed) => {
		expect(contrast(one, other)).toBeCloseTo(printed, 2);
		expect(contrast(other, one)).toBe(contrast(one, other));
	});

	// B. Ottosson, 2020, and CSS Color Module Level 4: white is L 1, red is L 0.628, C 0.2577, h 29.23°.
	test('OKLCH of known colours', () => {
		expect(toOklch('#ffffff').lightness).toBeCloseTo(1, 4);
		const red = toOklch('#ff0000');
		expect(red.lightness).toBeCloseTo(0.628, 3);
		expect(red.chroma).toBeCloseTo(0.2577, 3);
		expect(red.hue).toBeCloseTo(29.23, 1);
	});

	test('there and back is the same colour', () => {
		fc.assert(
			fc.property(anyHex, (hex) => toHex(toOklch(hex)) === hex),
			{ numRuns: 500 }
		);
	});
});

test('fixed colours are those of tokens.css', () => {
	const css = readFileSync(new URL('../renderer/tokens.css', import.meta.url), 'utf8');
	for (const [token, [light, dark]] of Object.entries(FIXED))
		expect(css).toContain(`--${token}: light-dark(${light}, ${dark});`);
});

test('every token that the frame’s styles colour text or lines with is in a pair or has a reason', () => {
	const used = new Set<string>();
	for (const file of [
		'widget',
		'frame',
		'blocks/text',
		'blocks/record',
		'blocks/blocks',
		'controls/slider',
		'figures/chart',
		'figures/beam'
	]) {
		const css = readFileSync(new URL(`../renderer/${file}.css`, import.meta.url), 'utf8');
		for (const [, token = ''] of css.matchAll(/var\(--([a-z0-9-]+)/g)) used.add(token);
	}
	const paired = new Set<string>(
		readPairs(HOUSE_THEME).flatMap(({ front, back }) => [front, back])
	);
	// Ornament, metrics, faces, and `series`, which stands for one of the five.
	const others =
		/^(?:hairline|flimsy|indelible-hover|series|sy-.*|face-.*|corner|at|share|.*-(?:at|share|width|height))$/;
	expect([...used].filter((token) => !paired.has(token) && !others.test(token))).toEqual([]);
});

describe('what may be saved', () => {
	test.each([
		['the house’s own', {}],
		['warm paper and a dark red', { ground: '#fdf6ec', accent: '#8b1a2b' }],
		['a dark page', { ground: '#10151c', accent: '#ffd166' }],
		['black and white', { ground: '#ffffff', accent: '#000000' }]
	] as [string, Partial<Theme>][])('%s', (_, over) => {
		expect(failingPairs(theme(over)).map(({ says }) => says)).toEqual([]);
	});

	test('a pale accent fails by name, ratio and the nearest that would do', () => {
		const failing = failingPairs(theme({ accent: '#f0a030' }));
		const links = failing.find(({ words }) => words === 'Links on the ground');
		expect(links?.says).toMatch(
			/^Links on the ground, light scheme: 2\.1 to 1, and 4\.5 is needed\. The nearest accent that would do is #[0-9a-f]{6}\.$/
		);
		expect(new Set(failing.map(({ change }) => change))).toEqual(new Set(['accent']));
		expect(failingPairs(theme({ accent: links?.nearest ?? '#f0a030' }))).toEqual([]);
	});

	test('a ground of middle grey fails, and a lighter one is named', () => {
		const [first] = failingPairs(theme({ ground: '#8a8a8a', accent: '#000000' }));
		expect(first?.change).toBe('ground');
		expect(failingPairs(theme({ ground: first?.nearest ?? '#8a8a8a', accent: '#000000' }))).toEqual(
			[]
		);
	});

	test(
		'the scheme that follows by rule never fails, whatever was chosen',
		{ timeout: 30_000 },
		() => {
			fc.assert(
				fc.property(anyHex, anyHex, (ground, accent) => {
					const own = ownScheme({ ground });
					const failing = readPairs({ ground, accent }).filter(
						({ passes, scheme }) => !passes && scheme !== own
					);
					expect(failing.map(({ words, ratio }) => `${words} ${ratio}`)).toEqual([]);
				}),
				{ numRuns: 300 }
			);
		}
	);

	test('the colour that is named does pass, for any theme', { timeout: 30_000 }, () => {
		fc.assert(
			fc.property(anyHex, anyHex, (ground, accent) => {
				for (const { change, nearest, words } of failingPairs({ ground, accent })) {
					if (!nearest) continue;
					const mended = { ground, accent, [change]: nearest };
					expect(
						failingPairs(mended).filter((one) => one.change === change && one.words === words)
					).toEqual([]);
				}
			}),
			{ numRuns: 25 }
		);
	});
});

describe('the frame’s style', () => {
	test('is made of hex, known faces and pixels alone', () => {
		const style = frameStyle(theme({ face: 'host-serif', radiusPx: 8, name: '</style><script>' }));
		expect(style).toMatch(/^@media \(forced-colors:none\)\{:root\{[-a-z0-9:;#,()' ]+\}\}$/i);
		expect(style).toContain('--sheet:light-dark(#ffffff,#');
		expect(style).toContain('--corner:8px');
	});

	test.each([
		{ ground: '#fff;}</style>' },
		{ accent: 'red' },
		{ accent: '#FFFFFF' },
		{ face: 'x;}' },
		{ radiusPx: 13 },
		{ radiusPx: 1.5 },
		{ radiusPx: Number.NaN }
	])('%j is refused', (over) => {
		expect(() => frameProperties({ ...HOUSE_THEME, ...over } as Theme)).toThrow('no theme');
	});
});
