/** What a file is, by its first bytes alone: neither its name nor what the browser calls it counts. */
import type { PictureType } from '../../pictures/view.ts';
import { refuse, refuseIn } from './refusal.ts';

const NAMES: Record<PictureType, { word: string; endings: readonly string[] }> = {
	'image/png': { word: 'PNG', endings: ['png'] },
	'image/jpeg': { word: 'JPEG', endings: ['jpg', 'jpeg', 'jpe', 'jfif'] },
	'image/webp': { word: 'WebP', endings: ['webp'] },
	'image/avif': { word: 'AVIF', endings: ['avif'] },
	'image/svg+xml': { word: 'SVG', endings: ['svg'] }
};

type Signature = [at: number, bytes: string, is: PictureType | Parameters<typeof refuse>[0]];

/** In Latin-1. Sources: the formats’ own specifications. */
const SIGNATURES: Signature[] = [
	[0, '\x89PNG\r\n\x1a\n', 'image/png'],
	[0, '\xff\xd8\xff', 'image/jpeg'],
	[8, 'WEBP', 'image/webp'],
	[0, 'GIF8', 'gif'],
	[0, 'II*\0', 'tiff'],
	[0, 'MM\0*', 'tiff'],
	[0, 'BM', 'bmp'],
	[0, '%PDF-', 'pdf'],
	[0, 'PK\x03\x04', 'packed'],
	[0, '\x1f\x8b', 'packed'],
	[0, '\x1aE\xdf\xa3', 'film']
];

/** Throws the refusal that fits when it is none of the five kinds. */
export function kindOf(bytes: Uint8Array): PictureType {
	if (bytes.length === 0) throw refuse('empty');
	const head = Buffer.from(bytes.subarray(0, 64)).toString('latin1');
	if (head.slice(4, 8) === 'ftyp') return isoMedia(bytes);
	const found = SIGNATURES.find(([at, signature]) => head.startsWith(signature, at));
	const kind = found ? found[2] : textKind(bytes);
	if (isPicture(kind)) return kind;
	throw refuse(kind);
}

function isPicture(kind: string): kind is PictureType {
	return kind in NAMES;
}

/** The brands of a file of boxes (ISO/IEC 14496-12) say whether it is a still, a sequence or a film. */
function isoMedia(bytes: Uint8Array): PictureType {
	const view = Buffer.from(bytes.buffer, bytes.byteOffset, Math.min(bytes.length, 4096));
	const end = Math.min(view.readUInt32BE(0), view.length);
	const brands: string[] = [view.toString('latin1', 8, 12)];
	for (let at = 16; at + 4 <= end; at += 4) brands.push(view.toString('latin1', at, at + 4));
	if (brands.includes('avis')) throw refuse('animated');
	if (brands.includes('avif')) return 'image/avif';
	throw refuse(brands.some((brand) => /^(?:hei|hev|mif1|msf1)/.test(brand)) ? 'heic' : 'film');
}

function textKind(bytes: Uint8Array): PictureType | 'text' | 'html' | 'xml' | 'unknown' {
	const head = Buffer.from(bytes.subarray(0, 65_536));
	// A character may be cut at the end of the head, hence the stream.
	let text: string;
	try {
		text = new TextDecoder('utf-8', { fatal: true }).decode(head, { stream: true });
	} catch {
		return 'unknown';
	}
	// eslint-disable-next-line no-control-regex -- what text never holds
	if (/[\0-\x08\x0e-\x1f]/.test(text)) return 'unknown';
	const rest = text.replace(/^(?:\s|<\?.*?\?>|<!--.*?-->)+/s, '');
	if (/^<!doctype\s+html|^<(?:html|head|body|script)\b/i.test(rest)) return 'html';
	if (/^<!doctype\s+svg\b|^<(?:svg:)?svg\b/i.test(rest)) return 'image/svg+xml';
	if (/^<!doctype\b/i.test(rest)) return /<(?:svg:)?svg\b/i.test(rest) ? 'image/svg+xml' : 'xml';
	if (/^<\w/.test(rest)) return 'xml';
	return 'text';
}

/**
 * Throws when the name’s ending or the declared type says something else than the bytes: whoever sent it believes it to
 * be another file. A name without an ending, and bytes declared as such, say nothing.
 */
export function refuseDisguise(
	kind: PictureType,
	{ fileName, declaredType }: { fileName: string; declaredType: string }
): void {
	const { word, endings } = NAMES[kind];
	const ending = /\.([^.\s]{1,12})$/.exec(fileName)?.[1]?.toLowerCase();
	if (ending !== undefined && !endings.includes(ending)) {
		throw refuseIn(
			'renamed',
			`The name ends in .${ending}, but this is a ${word} picture.`,
			`If it is the right one, let its name end in .${endings[0]}, and send it again.`
		);
	}
	const declared = declaredType.split(';')[0]?.trim().toLowerCase() ?? '';
	if (!['', 'application/octet-stream', kind].includes(declared)) {
		throw refuseIn(
			'declared',
			`It was sent as ${declared}, but this is a ${word} picture.`,
			`Send it as ${kind}.`
		);
	}
}
