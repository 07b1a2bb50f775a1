/** What is drawn from good pictures, and what of the old file is left in it: nothing. */
import sharp from 'sharp';
import { describe, expect, test } from 'vitest';
import * as made from '../../../../tests/support/pictures.ts';
import type { PictureType } from '../../pictures/view.ts';
import { redraw } from './redraw.ts';

const of = (bytes: Buffer, type: PictureType) => redraw(async () => bytes, type);
const KINDS: [PictureType, () => Buffer | Promise<Buffer>][] = [
	['image/png', made.png],
	['image/jpeg', made.jpeg],
	['image/webp', made.webp],
	['image/avif', made.avif],
	['image/svg+xml', made.svg]
];

/** Marks of EXIF, XMP, IPTC and colour profiles in the containers that are written. */
const TRACES = [
	'Exif',
	'EXIF',
	'http://ns.adobe.com',
	'xmpmeta',
	'XMP ',
	'8BIM',
	'ICC_PROFILE',
	'ICCP',
	'iCCP',
	'eXIf',
	'Quorrel',
	'tEXt',
	'iTXt'
];

describe.each(KINDS)('%s', (type, make) => {
	test('is drawn in its widths as WebP, and once for every browser', async () => {
		const { width, height, files } = await of(await make(), type);
		const webp = files.filter((file) => file.type === 'image/webp').map((file) => file.width);
		expect(webp).toEqual([
			...[320, 640, 960, 1280].filter((each) => each < width),
			Math.min(width, 1280)
		]);
		expect(files.filter((file) => file.type !== 'image/webp')).toHaveLength(1);
		for (const file of files) {
			const read = await sharp(file.content).metadata();
			expect([read.width, read.height]).toEqual([file.width, file.height]);
			expect(Math.abs(file.height - (file.width * height) / width)).toBeLessThanOrEqual(1);
			expect(read.space).toBe('srgb');
			for (const trace of TRACES) expect(file.content.includes(trace), trace).toBe(false);
		}
	});
});

test('a telephone’s picture comes out upright, without place, device or profile', async () => {
	const bytes = await made.telephoneJpeg();
	const before = await sharp(bytes).metadata();
	expect(before.exif?.includes('Quorrel')).toBe(true);
	expect([before.orientation, before.hasProfile]).toEqual([6, true]);
	expect(bytes.includes('xmpmeta')).toBe(true);

	const { width, height, files } = await of(bytes, 'image/jpeg');
	expect([width, height]).toEqual([600, 800]);
	for (const { content } of files) {
		const after = await sharp(content).metadata();
		expect([after.exif, after.xmp, after.iptc, after.icc, after.orientation]).toEqual(
			Array(5).fill(undefined)
		);
		for (const trace of TRACES) expect(content.includes(trace), trace).toBe(false);
	}
});

test('clear pixels stay clear, and sixteen bits become eight', async () => {
	const clear = await sharp({
		create: { width: 400, height: 300, channels: 4, background: '#0000' }
	})
		.png()
		.toBuffer();
	const { files } = await of(clear, 'image/png');
	expect(files.at(-1)?.type).toBe('image/png');
	for (const { content } of files) expect((await sharp(content).metadata()).hasAlpha).toBe(true);

	const deep = await sharp(await made.png())
		.toColourspace('rgb16')
		.png()
		.toBuffer();
	const [file] = (await of(deep, 'image/png')).files;
	expect((await sharp(file!.content).metadata()).depth).toBe('uchar');
	const middle = await sharp(file!.content)
		.extract({ left: 160, top: 114, width: 1, height: 1 })
		.raw()
		.toBuffer();
	expect(Math.abs(middle[0]! - 128)).toBeLessThan(12);
});

test('a drawing is drawn as large as the widest column, whatever it calls itself', async () => {
	const { width, height } = await of(made.svg(), 'image/svg+xml');
	expect([width, height]).toEqual([1280, 1024]);
	const named = await of(made.svg(undefined, 'width="5000" height="4000"'), 'image/svg+xml');
	expect(named.width).toBe(1280);
});

test('a drawing of lines as drawing programs write them is taken', async () => {
	const bytes = Buffer.from(`<?xml version="1.0" encoding="utf-8" standalone="no"?>
<!DOCTYPE svg PUBLIC "-//W3C//DTD SVG 1.1//EN" "http://www.w3.org/Graphics/SVG/1.1/DTD/svg11.dtd">
<svg xmlns:xlink="http://www.w3.org/1999/xlink" width="460.8pt" height="345.6pt" viewBox="0 0 460.8 345.6" xmlns="http://www.w3.org/2000/svg" version="1.1">
 <metadata><rdf:RDF xmlns:dc="http://purl.org/dc/elements/1.1/" xmlns:cc="http://creativecommons.org/ns#" xmlns:rdf="http://www.w3.org/1999/02/22-rdf-syntax-ns#"><cc:Work><dc:type rdf:resource="http://purl.org/dc/dcmitype/StillImage"/></cc:Work></rdf:RDF></metadata>
 <defs><style type="text/css">*{stroke-linejoin: round; stroke-linecap: butt}</style><path id="m0" d="M 0 0 L 0 3.5" style="stroke: #000000; stroke-width: 0.8"/>
 <clipPath id="p1"><rect x="57.6" y="41.472" width="357.12" height="266.112"/></clipPath></defs>
 <g id="figure_1"><path d="M 0 345.6 L 460.8 345.6 L 460.8 0 L 0 0 z" style="fill: #ffffff"/>
 <g clip-path="url(#p1)"><use xlink:href="#m0" x="73.8" y="307.6" style="stroke: #000000"/></g></g>
</svg>`);
	expect((await of(bytes, 'image/svg+xml')).width).toBe(1280);
});

const entry = (inside: string, attributes = '') => made.svg(inside, attributes);
const REFUSED: [
	what: string,
	why: string,
	type: PictureType,
	make: () => Buffer | Promise<Buffer>
][] = [
	['entities', 'svg-entities', 'image/svg+xml', made.entityBomb],
	['one entity without a type', 'svg-entities', 'image/svg+xml', () => entry('<text>&a;</text>')],
	['repeats that multiply', 'svg-tangled', 'image/svg+xml', made.useBomb],
	[
		'a part inside itself',
		'svg-tangled',
		'image/svg+xml',
		() => entry('<g id="a"><use href="#a"/></g>')
	],
	[
		'dashes too short to see',
		'svg-tangled',
		'image/svg+xml',
		() => entry('<path d="M0 0h100" stroke="#000" stroke-dasharray="0.00001"/>')
	],
	[
		'such dashes in a style',
		'svg-tangled',
		'image/svg+xml',
		() => entry('<path d="M0 0h100" style="stroke:#000;stroke-dasharray:1e-6 1"/>')
	],
	['a script', 'svg-script', 'image/svg+xml', () => entry('<script>1</script>')],
	[
		'an event',
		'svg-script',
		'image/svg+xml',
		() => entry('<rect width="9" height="9" onload="x()"/>')
	],
	[
		'a script under a prefix',
		'svg-script',
		'image/svg+xml',
		() => entry('<svg:script xmlns:svg="http://www.w3.org/2000/svg">1</svg:script>')
	],
	[
		'a scripted link',
		'svg-outside',
		'image/svg+xml',
		() => entry('<a href="javascript:x()"><rect/></a>')
	],
	[
		'a picture from elsewhere',
		'svg-outside',
		'image/svg+xml',
		() => entry('<image href="http://127.0.0.1:9/x.png"/>')
	],
	[
		'a picture from this computer',
		'svg-outside',
		'image/svg+xml',
		() => entry('<image xlink:href="file:///etc/passwd"/>')
	],
	[
		'a packed picture',
		'svg-outside',
		'image/svg+xml',
		() => entry('<image href="data:image/png;base64,AAAA"/>')
	],
	[
		'a filled picture',
		'svg-outside',
		'image/svg+xml',
		() => entry('<rect width="9" height="9" fill="url(http://127.0.0.1:9/#a)"/>')
	],
	[
		'a style sheet',
		'svg-outside',
		'image/svg+xml',
		() => entry('<style>@import url(http://127.0.0.1:9/x.css)</style>')
	],
	[
		'a style sheet in disguise',
		'svg-outside',
		'image/svg+xml',
		() => entry('<style>\\40 import "x"</style>')
	],
	[
		'a style sheet in front',
		'svg-outside',
		'image/svg+xml',
		() =>
			Buffer.concat([Buffer.from('<?xml-stylesheet href="http://127.0.0.1:9/x.css"?>'), made.svg()])
	],
	[
		'a use from elsewhere',
		'svg-outside',
		'image/svg+xml',
		() => entry('<use href="other.svg#a"/>')
	],
	[
		'a base elsewhere',
		'svg-outside',
		'image/svg+xml',
		() => entry('<g xml:base="http://127.0.0.1:9/"/>')
	],
	[
		'HTML inside',
		'svg-outside',
		'image/svg+xml',
		() => entry('<foreignObject><body/></foreignObject>')
	],
	[
		'SVG under another prefix',
		'svg-broken',
		'image/svg+xml',
		() => entry('<q:rect xmlns:q="http://www.w3.org/2000/svg"/>')
	],
	['a filter', 'svg-part', 'image/svg+xml', () => entry('<filter id="f"><feTurbulence/></filter>')],
	['movement', 'svg-part', 'image/svg+xml', () => entry('<animate/>')],
	['an end too early', 'svg-broken', 'image/svg+xml', () => made.svg().subarray(0, -4)],
	[
		'two attributes of one name',
		'svg-broken',
		'image/svg+xml',
		() => entry('<rect width="1" width="2"/>')
	],
	[
		'another encoding',
		'svg-broken',
		'image/svg+xml',
		() => Buffer.concat([Buffer.from('<?xml version="1.0" encoding="UTF-7"?>'), made.svg()])
	],
	[
		'a size beyond measure',
		'too-many-pixels',
		'image/svg+xml',
		() => entry('', 'width="1000000" height="1000000"')
	],
	['too many parts', 'svg-heavy', 'image/svg+xml', () => entry('<rect/>'.repeat(20_001))],
	['depth', 'svg-tangled', 'image/svg+xml', () => entry('<g>'.repeat(70) + '</g>'.repeat(70))],
	[
		'too many pixels in a small file',
		'too-many-pixels',
		'image/png',
		() => made.bombPng(16_000, 16_000)
	],
	['one row beyond measure', 'too-long', 'image/png', () => made.bombPng(200_000, 1)],
	['a moving PNG', 'animated', 'image/png', made.movingPng],
	['a moving WebP', 'animated', 'image/webp', made.movingWebp],
	[
		'a web page behind a PNG',
		'hidden',
		'image/png',
		async () => Buffer.concat([await made.png(), Buffer.from('<html><script>1</script></html>')])
	],
	[
		'an archive behind a JPEG',
		'hidden',
		'image/jpeg',
		async () => Buffer.concat([await made.jpeg(), made.emptyZip()])
	],
	[
		'a web page behind a JPEG',
		'hidden',
		'image/jpeg',
		async () => Buffer.concat([await made.jpeg(), Buffer.from('<SCRIPT>1</SCRIPT>')])
	],
	[
		'a PDF in a JPEG’s comment',
		'hidden',
		'image/jpeg',
		async () => {
			const whole = await made.jpeg();
			const words = Buffer.from('%PDF-1.7');
			return Buffer.concat([
				whole.subarray(0, 2),
				Buffer.from([0xff, 0xfe, 0, words.length + 2]),
				words,
				whole.subarray(2)
			]);
		}
	],
	[
		'an archive behind a WebP',
		'hidden',
		'image/webp',
		async () => Buffer.concat([await made.webp(), made.emptyZip()])
	]
];
test.each(REFUSED)('%s: %s', async (_what, why, type, make) => {
	const start = performance.now();
	await expect(of(await make(), type)).rejects.toMatchObject({
		code: 'picture-refused',
		details: { why }
	});
	expect(performance.now() - start).toBeLessThan(5_000);
});

describe.each(KINDS)('%s cut short', (type, make) => {
	test.each([0.3, 0.6, 0.9, 0.99])('at %d', async (share) => {
		const whole = await make();
		await expect(
			of(whole.subarray(0, Math.floor(whole.length * share)), type)
		).rejects.toMatchObject({
			code: 'picture-refused',
			details: { why: expect.stringMatching(/^(?:damaged|svg-broken)$/) }
		});
	});
});

test('no more than two are drawn at once', async () => {
	let drawing = 0;
	let most = 0;
	const bytes = await made.jpeg();
	await Promise.all(
		Array.from({ length: 8 }, () =>
			redraw(async () => {
				drawing += 1;
				most = Math.max(most, drawing);
				await new Promise((resolve) => setTimeout(resolve, 20));
				drawing -= 1;
				return bytes;
			}, 'image/jpeg')
		)
	);
	expect(most).toBe(2);
});
