/** Bytes in the forms a reader's browser may ask for. */
import { promisify } from 'node:util';
import { brotliCompress, brotliDecompress, constants, gunzip, gzip } from 'node:zlib';

const toBrotli = promisify(brotliCompress);
const toGzip = promisify(gzip);
const fromBrotli = promisify(brotliDecompress);
const fromGzip = promisify(gunzip);

export const ENCODINGS = ['br', 'gzip'] as const;
export type Encoding = (typeof ENCODINGS)[number];

/** Null where packing saves nothing, as with fonts and pictures. */
export type Packed = Record<Encoding, Buffer | null>;

/** Off the main thread; the smallest form there is, since it is made once and served often. */
export async function pack(bytes: Uint8Array, contentType: string): Promise<Packed> {
	if (/^(?:font|image)\//.test(contentType)) return { br: null, gzip: null };
	const [br, gzipped] = await Promise.all([
		toBrotli(bytes, {
			params: {
				[constants.BROTLI_PARAM_MODE]: constants.BROTLI_MODE_TEXT,
				[constants.BROTLI_PARAM_QUALITY]: constants.BROTLI_MAX_QUALITY,
				[constants.BROTLI_PARAM_SIZE_HINT]: bytes.length
			}
		}),
		toGzip(bytes, { level: 9 })
	]);
	return { br: smaller(br, bytes), gzip: smaller(gzipped, bytes) };
}

/** True when a packed form holds exactly these bytes. */
export async function unpacksTo(
	packed: Uint8Array,
	encoding: Encoding,
	bytes: Uint8Array
): Promise<boolean> {
	try {
		const unpacked = await (encoding === 'br' ? fromBrotli : fromGzip)(packed);
		return unpacked.equals(bytes);
	} catch {
		return false; // not a packed form at all
	}
}

/** The first of br and gzip that the header allows; null for the plain bytes. */
export function acceptedEncoding(header: string | undefined): Encoding | null {
	if (!header) return null;
	const refused = new Set<string>();
	const allowed = new Set<string>();
	for (const part of header.toLowerCase().split(',')) {
		const [name = '', ...parameters] = part.split(';').map((piece) => piece.trim());
		const weight = parameters.find((parameter) => parameter.startsWith('q='))?.slice(2);
		(weight !== undefined && !(Number(weight) > 0) ? refused : allowed).add(name);
	}
	return (
		ENCODINGS.find((name) => !refused.has(name) && (allowed.has(name) || allowed.has('*'))) ?? null
	);
}

function smaller(packed: Buffer, bytes: Uint8Array): Buffer | null {
	return packed.length < bytes.length ? packed : null;
}
