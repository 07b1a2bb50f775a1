/** Pictures made for tests, good and bad, by hand and with the library that reads them. */
import sharp, { type Sharp } from 'sharp';
import { crc32, deflateSync } from 'node:zlib';

/** A scene with a gradient and an edge, so that a picture of it compresses like one. */
function scene(width: number, height: number): Sharp {
	const pixels = Buffer.alloc(width * height * 3);
	for (let y = 0; y < height; y += 1) {
		for (let x = 0; x < width; x += 1) {
			const at = (y * width + x) * 3;
			pixels[at] = (x * 255) / width;
			pixels[at + 1] = (y * 255) / height;
			pixels[at + 2] = x > y ? 40 : 200;
		}
	}
	return sharp(pixels, { raw: { width, height, channels: 3 } });
}

export const png = (width = 700, height = 500) => scene(width, height).png().toBuffer();
export const jpeg = (width = 700, height = 500) => scene(width, height).jpeg().toBuffer();
export const webp = (width = 700, height = 500) => scene(width, height).webp().toBuffer();
export const avif = (width = 320, height = 200) =>
	scene(width, height).avif({ effort: 0 }).toBuffer();
export const svg = (inside = '<circle cx="50" cy="40" r="30" fill="#356"/>', attributes = '') =>
	Buffer.from(
		`<svg xmlns="http://www.w3.org/2000/svg" xmlns:xlink="http://www.w3.org/1999/xlink" viewBox="0 0 100 80" ${attributes}>${inside}</svg>`
	);

/** From a telephone: where it was taken, on which device, lying on its side. */
export const telephoneJpeg = () =>
	scene(800, 600)
		.withExif({
			IFD0: { Make: 'Quorrel', Model: 'Pocket 7', Software: 'Quorrel 1.2' },
			IFD3: {
				GPSLatitudeRef: 'N',
				GPSLatitude: '52/1 31/1 12/1',
				GPSLongitudeRef: 'E',
				GPSLongitude: '13/1 24/1 36/1'
			}
		})
		.withXmp(
			'<x:xmpmeta xmlns:x="adobe:ns:meta/"><rdf:RDF xmlns:rdf="http://www.w3.org/1999/02/22-rdf-syntax-ns#"><rdf:Description xmlns:dc="http://purl.org/dc/elements/1.1/" dc:creator="Somebody"/></rdf:RDF></x:xmpmeta>'
		)
		.withIccProfile('p3', { attach: true })
		.withMetadata({ orientation: 6 })
		.jpeg()
		.toBuffer();

/** Two frames. */
export const movingWebp = async () => {
	const frames = await Promise.all([
		scene(40, 30).png().toBuffer(),
		sharp(await png(40, 30))
			.negate()
			.png()
			.toBuffer()
	]);
	return sharp(frames, { join: { animated: true } })
		.webp()
		.toBuffer();
};
export const movingGif = async () => {
	const frames = await Promise.all([
		scene(40, 30).png().toBuffer(),
		sharp(await png(40, 30))
			.negate()
			.png()
			.toBuffer()
	]);
	return sharp(frames, { join: { animated: true } })
		.gif()
		.toBuffer();
};

function chunk(type: string, data: Buffer): Buffer {
	const body = Buffer.concat([Buffer.from(type, 'latin1'), data]);
	const length = Buffer.alloc(4);
	length.writeUInt32BE(data.length);
	const check = Buffer.alloc(4);
	check.writeUInt32BE(crc32(body));
	return Buffer.concat([length, body, check]);
}

/** A PNG of this size, all black, whose pixels take almost no bytes; by W3C, PNG (Third Edition). */
export function bombPng(width: number, height: number): Buffer {
	const header = Buffer.alloc(13);
	header.writeUInt32BE(width, 0);
	header.writeUInt32BE(height, 4);
	header[8] = 1; // one bit a pixel, grey
	const rows = Buffer.alloc((Math.ceil(width / 8) + 1) * height);
	return Buffer.concat([
		Buffer.from('\x89PNG\r\n\x1a\n', 'latin1'),
		chunk('IHDR', header),
		chunk('IDAT', deflateSync(rows, { level: 9 })),
		chunk('IEND', Buffer.alloc(0))
	]);
}

/** A PNG that says it moves. */
export async function movingPng(): Promise<Buffer> {
	const still = await png(40, 30);
	const control = Buffer.alloc(8);
	control.writeUInt32BE(2, 0);
	const afterHeader = 8 + 25;
	return Buffer.concat([
		still.subarray(0, afterHeader),
		chunk('acTL', control),
		still.subarray(afterHeader)
	]);
}

/** An archive with one empty file in it. */
export function emptyZip(): Buffer {
	const name = Buffer.from('a.html');
	const local = Buffer.alloc(30);
	local.write('PK\x03\x04', 0, 'latin1');
	local.writeUInt16LE(name.length, 26);
	const central = Buffer.alloc(46);
	central.write('PK\x01\x02', 0, 'latin1');
	central.writeUInt16LE(name.length, 28);
	const end = Buffer.alloc(22);
	end.write('PK\x05\x06', 0, 'latin1');
	end.writeUInt16LE(1, 8);
	end.writeUInt16LE(1, 10);
	end.writeUInt32LE(central.length + name.length, 12);
	end.writeUInt32LE(local.length + name.length, 16);
	return Buffer.concat([local, name, central, name, end]);
}

/** Nested entities: a few hundred bytes that would be read as a thousand million. */
export const entityBomb = () =>
	Buffer.from(
		`<?xml version="1.0"?><!DOCTYPE svg [<!ENTITY a "aaaaaaaaaa">${'bcdefghi'
			.split('')
			.map((name, index) => `<!ENTITY ${name} "${`&${'abcdefgh'[index]};`.repeat(10)}">`)
			.join(
				''
			)}]><svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 10 10"><text>&i;</text></svg>`
	);

/** Groups that repeat the one before ten times each, nine deep. */
export const useBomb = () =>
	svg(
		`<defs><rect id="u0" width="1" height="1"/>${Array.from(
			{ length: 9 },
			(_, level) => `<g id="u${level + 1}">${`<use xlink:href="#u${level}"/>`.repeat(10)}</g>`
		).join('')}</defs><use xlink:href="#u9"/>`
	);
