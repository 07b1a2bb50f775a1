/**
 * Draws a picture anew: whatever came in, out go plain WebP files in a few widths and one that every browser shows.
 * Nothing of the old file survives but its pixels: no place, no device, no text, no colour profile; colours are sRGB.
 */
import sharp, { type Sharp } from 'sharp';
import { SteelyardError } from '../../errors.ts';
import {
	MOST_PIXELS,
	type PictureFile,
	type PictureType,
	type StoredType
} from '../../pictures/view.ts';
import { sha256 } from '../auth/hashes.ts';
import { checkContainer } from './containers.ts';
import { refuse, refuseIn } from './refusal.ts';
import { safeSvg } from './svg.ts';
import { Turns } from './turns.ts';

// What five kinds need, and no other of the library’s loaders; one thread a picture and nothing kept between them.
sharp.block({ operation: ['VipsForeignLoad'] });
sharp.unblock({
	operation: [
		'VipsForeignLoadPng',
		'VipsForeignLoadJpeg',
		'VipsForeignLoadWebp',
		'VipsForeignLoadHeif',
		'VipsForeignLoadSvg'
	]
});
sharp.cache(false);
sharp.concurrency(1);

/** Pixels are what memory goes to: 24 million take some 100 MB while they are drawn. */
const turns = new Turns(2);

/** Widths in pixels that pages ask for; the last is what the widest column needs on a fine screen. */
const WIDTHS = [320, 640, 960, 1280] as const;
const WIDEST = 1280;
/** Within what a document’s picture may have, and what WebP can hold (16383). */
const LONGEST_SIDE = 12_000;
/** A drawing has no pixels of its own, so a tall one is drawn smaller. */
const TALLEST_DRAWING = 4_000;
const PATIENCE_S = 20;

const FORMATS: Record<PictureType, string> = {
	'image/png': 'png',
	'image/jpeg': 'jpeg',
	'image/webp': 'webp',
	'image/avif': 'heif',
	'image/svg+xml': 'svg'
};

export interface Redrawn {
	/** In pixels, upright. */
	width: number;
	height: number;
	files: (PictureFile & { content: Buffer })[];
}

/** Throws `picture-refused` with its sentence. At most two at once, off the main thread. */
export async function redraw(read: () => Promise<Buffer>, type: PictureType): Promise<Redrawn> {
	return turns.take(async () => {
		try {
			const bytes = await read();
			return await (type === 'image/svg+xml' ? redrawDrawing(bytes) : redrawRaster(bytes, type));
		} catch (error) {
			if (error instanceof SteelyardError) throw error;
			// The library’s own words name its insides; what a person can do is the same for all of them.
			if (error instanceof Error && !('code' in error)) throw refuse('damaged');
			throw error;
		}
	});
}

async function redrawRaster(
	bytes: Buffer,
	type: Exclude<PictureType, 'image/svg+xml'>
): Promise<Redrawn> {
	checkContainer(bytes, type);
	// Reads the header alone, whatever size it announces.
	const header = await sharp(bytes, { limitInputPixels: false }).metadata();
	if (header.format !== FORMATS[type] || (header.format === 'heif' && header.compression !== 'av1'))
		throw refuse('damaged');
	if ((header.pages ?? 1) > 1) throw refuse('animated');
	refuseSize(header.width, header.height);
	const { width, height } = header.autoOrient;
	const source = sharp(bytes, {
		limitInputPixels: MOST_PIXELS,
		failOn: 'warning',
		sequentialRead: true,
		pages: 1
	}).autoOrient();
	return { width, height, files: await filesOf(source, type === 'image/png') };
}

async function redrawDrawing(bytes: Buffer): Promise<Redrawn> {
	const text = Buffer.from(safeSvg(bytes));
	const { width, height } = await sharp(text, { limitInputPixels: false })
		.metadata()
		.catch(() => {
			throw refuse('svg-sizeless');
		});
	refuseSize(width, height);
	const scale = Math.min(WIDEST / width, TALLEST_DRAWING / height);
	const density = Math.min(100_000, Math.max(1, 72 * scale));
	const source = sharp(text, { limitInputPixels: MOST_PIXELS, failOn: 'warning', density });
	const files = await filesOf(source, true);
	const largest = files.find((file) => file.width === Math.max(...files.map((each) => each.width)));
	return { width: largest?.width ?? 0, height: largest?.height ?? 0, files };
}

function refuseSize(width: number, height: number): void {
	const size = `${grouped(width)} × ${grouped(height)} pixels`;
	if (width * height > MOST_PIXELS) {
		throw refuseIn(
			'too-many-pixels',
			`This picture has ${size}; 24 million in all are taken.`,
			'Make it smaller in a picture program; 2,500 pixels across are plenty.'
		);
	}
	if (Math.max(width, height) > LONGEST_SIDE) {
		throw refuseIn(
			'too-long',
			`This picture has ${size}; a side may have ${grouped(LONGEST_SIDE)}.`,
			'Cut it, or make it smaller, in a picture program.'
		);
	}
}

function grouped(count: number): string {
	return count.toLocaleString('en-GB');
}

/** Decoded once, at the largest width; every file is made from those pixels. */
async function filesOf(source: Sharp, hasSharpEdges: boolean): Promise<Redrawn['files']> {
	const { data, info } = await source
		.resize({ width: WIDEST, withoutEnlargement: true })
		.toColourspace('srgb')
		.timeout({ seconds: PATIENCE_S })
		.raw()
		.toBuffer({ resolveWithObject: true });
	const pixels = () =>
		sharp(data, { raw: { width: info.width, height: info.height, channels: info.channels } });
	const isOpaque = info.channels === 3 || (await pixels().stats()).isOpaque;
	const drawn = () => (isOpaque ? pixels().removeAlpha() : pixels());

	const widths = [...WIDTHS.filter((width) => width < info.width), info.width];
	const files: Redrawn['files'] = [];
	for (const width of widths) {
		const webp = drawn()
			.resize({ width })
			.webp({ quality: hasSharpEdges ? 90 : 82, smartSubsample: true });
		files.push(await fileOf(webp, 'image/webp'));
	}
	files.push(await plainFileOf(drawn, isOpaque, hasSharpEdges));
	return files;
}

/** For programs that know no WebP: PNG where pixels are clear or edges sharp, unless a JPEG is smaller by far. */
async function plainFileOf(
	drawn: () => Sharp,
	isOpaque: boolean,
	hasSharpEdges: boolean
): Promise<Redrawn['files'][number]> {
	const png = () => fileOf(drawn().png({ compressionLevel: 9 }), 'image/png');
	if (!isOpaque) return png();
	const quality = hasSharpEdges ? 90 : 84;
	const jpeg = await fileOf(drawn().jpeg({ quality, mozjpeg: true }), 'image/jpeg');
	if (!hasSharpEdges) return jpeg;
	const lossless = await png();
	return lossless.bytes <= 2 * jpeg.bytes ? lossless : jpeg;
}

async function fileOf(picture: Sharp, type: StoredType): Promise<Redrawn['files'][number]> {
	const { data, info } = await picture.toBuffer({ resolveWithObject: true });
	const { width, height } = info;
	return { digest: sha256(data), width, height, type, bytes: data.length, content: data };
}
