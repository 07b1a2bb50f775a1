/**
 * Whether a raster file is whole and nothing but itself, before any decoder sees it: it ends where its format says it
 * ends, holds one still picture, and carries no other file that a browser or a system could be made to run.
 */
import type { PictureType } from '../../pictures/view.ts';
import { refuse } from './refusal.ts';

export type RasterType = Exclude<PictureType, 'image/svg+xml'>;

const CHECKS: Record<RasterType, (bytes: Buffer) => void> = {
	'image/png': checkPng,
	'image/jpeg': checkJpeg,
	'image/webp': checkWebp,
	'image/avif': checkAvif
};

/** Throws `damaged`, `animated` or `hidden`. */
export function checkContainer(bytes: Buffer, type: RasterType): void {
	CHECKS[type](bytes);
	if (hidesAnother(bytes)) throw refuse('hidden');
}

/** W3C, Portable Network Graphics (Third Edition), §5: chunks until IEND; acTL announces an animation. */
function checkPng(bytes: Buffer): void {
	for (let at = 8; at + 12 <= bytes.length;) {
		const end = at + 12 + bytes.readUInt32BE(at);
		const type = bytes.toString('latin1', at + 4, at + 8);
		if (end > bytes.length) break;
		if (type === 'acTL') throw refuse('animated');
		if (type === 'IEND') {
			if (end !== bytes.length) throw refuse('hidden');
			return;
		}
		at = end;
	}
	throw refuse('damaged');
}

/**
 * ITU-T T.81, Annex B: ends with EOI. Cameras add previews and trailers of their own after it, which are left behind
 * when the picture is drawn anew, so what follows is judged by `hidesAnother` alone.
 */
function checkJpeg(bytes: Buffer): void {
	if (bytes.lastIndexOf(Buffer.from([0xff, 0xd9])) < 0) throw refuse('damaged');
}

/** RFC 9649, §2.3: one RIFF chunk, padded to an even length; the flag for animation stands in VP8X. */
function checkWebp(bytes: Buffer): void {
	if (bytes.length < 21) throw refuse('damaged');
	const size = bytes.readUInt32LE(4) + 8;
	if (size + (size % 2) > bytes.length && size > bytes.length) throw refuse('damaged');
	if (size + (size % 2) < bytes.length) throw refuse('hidden');
	const isExtended = bytes.toString('latin1', 12, 16) === 'VP8X';
	if (isExtended && ((bytes[20] ?? 0) & 0x02) !== 0) throw refuse('animated');
}

/** ISO/IEC 14496-12, §4.2: boxes one after another; a size of 1 stands before a long size, 0 reaches to the end. */
function checkAvif(bytes: Buffer): void {
	let at = 0;
	while (at + 8 <= bytes.length) {
		const short = bytes.readUInt32BE(at);
		const size =
			short === 0
				? bytes.length - at
				: short === 1 && at + 16 <= bytes.length
					? Number(bytes.readBigUInt64BE(at + 8))
					: short;
		if (size < 8 || at + size > bytes.length) throw refuse('damaged');
		at += size;
	}
	if (at !== bytes.length) throw refuse('damaged');
}

const MARKUP = ['<script', '<html>', '<html ', '<!doctype', '<?php', '<iframe'];
const LONGEST = Math.max(...MARKUP.map(({ length }) => length));
/** Where readers of PDF look for the header: within the first 1024 bytes. */
const PDF_REACH = 1024;
/** The end record of a ZIP archive and the longest comment that may follow it. */
const ZIP_RECORD = 22;
const ZIP_REACH = ZIP_RECORD + 0xffff;

function hidesAnother(bytes: Buffer): boolean {
	if (bytes.subarray(0, PDF_REACH).includes('%PDF-')) return true;
	if (endsAsZip(bytes)) return true;
	for (let at = bytes.indexOf(0x3c); at >= 0; at = bytes.indexOf(0x3c, at + 1)) {
		const word = bytes.toString('latin1', at, at + LONGEST).toLowerCase();
		if (MARKUP.some((markup) => word.startsWith(markup))) return true;
	}
	return false;
}

/** The end record, its comment reaching exactly to the end of the file. */
function endsAsZip(bytes: Buffer): boolean {
	const from = Math.max(0, bytes.length - ZIP_REACH);
	const signature = Buffer.from('PK\x05\x06', 'latin1');
	for (let at = bytes.indexOf(signature, from); at >= 0; at = bytes.indexOf(signature, at + 1)) {
		if (at + ZIP_RECORD > bytes.length) return false;
		if (at + ZIP_RECORD + bytes.readUInt16LE(at + 20) === bytes.length) return true;
	}
	return false;
}
