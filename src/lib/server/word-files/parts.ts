/**
 * Unpacks the parts of a .docx that hold text, and no others, and never more than a limit. The layout is that of PKWARE’s
 * APPNOTE.TXT 6.3 (ZIP); what parts there are is from ECMA-376, Office Open XML, parts 1 and 2.
 */
import { inflateRawSync } from 'node:zlib';
import { WordFileRefused } from './refusal.ts';

/** Two hundred pages have some 2 MB of XML. */
const MOST_TEXT_BYTES = 4 * 1024 * 1024;
/** What the file says of itself, pictures included; real ones of 5 MB stay far below. */
const MOST_DECLARED_BYTES = 200 * 1024 * 1024;
const MOST_ENTRIES = 2_000;

const END_OF_DIRECTORY = 0x06054b50;
const DIRECTORY_ENTRY = 0x02014b50;
const LOCAL_HEADER = 0x04034b50;
const END_BYTES = 22;
const ENTRY_BYTES = 46;
const LOCAL_BYTES = 30;
const STORED = 0;
const DEFLATED = 8;
const LOCKED = 1;

interface Entry {
	name: string;
	flags: number;
	method: number;
	packed: number;
	unpacked: number;
	/** Where its local header is. */
	at: number;
}

export interface Parts {
	/** By name, as the package names them: `word/document.xml`. */
	texts: ReadonlyMap<string, Buffer>;
	/** Every name in the package. */
	names: readonly string[];
}

/** The parts with text. Throws a refusal for anything that isn’t a whole, honest package. */
export function readParts(file: Buffer, wanted: (name: string) => boolean): Parts {
	const entries = directoryOf(file);
	if (entries.reduce((sum, { unpacked }) => sum + unpacked, 0) > MOST_DECLARED_BYTES)
		throw new WordFileRefused('bomb');
	const texts = new Map<string, Buffer>();
	let left = MOST_TEXT_BYTES;
	for (const entry of entries) {
		if (!wanted(entry.name)) continue;
		// Two parts of one name are two readings of one file.
		if (texts.has(entry.name)) throw new WordFileRefused('broken');
		const text = unpack(file, entry, left);
		left -= text.length;
		texts.set(entry.name, text);
	}
	return { texts, names: entries.map(({ name }) => name) };
}

function directoryOf(file: Buffer): Entry[] {
	const end = endOfDirectory(file);
	const count = file.readUInt16LE(end + 10);
	let at = file.readUInt32LE(end + 16);
	if (count > MOST_ENTRIES) throw new WordFileRefused('bomb');
	const entries: Entry[] = [];
	for (let index = 0; index < count; index++) {
		if (at + ENTRY_BYTES > file.length || file.readUInt32LE(at) !== DIRECTORY_ENTRY)
			throw new WordFileRefused('broken');
		const nameLength = file.readUInt16LE(at + 28);
		const nameEnd = at + ENTRY_BYTES + nameLength;
		if (nameEnd > file.length) throw new WordFileRefused('broken');
		entries.push({
			name: file.toString('utf8', at + ENTRY_BYTES, nameEnd),
			flags: file.readUInt16LE(at + 8),
			method: file.readUInt16LE(at + 10),
			packed: file.readUInt32LE(at + 20),
			unpacked: file.readUInt32LE(at + 24),
			at: file.readUInt32LE(at + 42)
		});
		at = nameEnd + file.readUInt16LE(at + 30) + file.readUInt16LE(at + 32);
	}
	return entries;
}

/** The directory’s end stands last, before a comment of at most 64 kB. */
function endOfDirectory(file: Buffer): number {
	const first = Math.max(0, file.length - END_BYTES - 0xffff);
	for (let at = file.length - END_BYTES; at >= first; at--) {
		if (file.readUInt32LE(at) === END_OF_DIRECTORY) return at;
	}
	throw new WordFileRefused('broken');
}

function unpack(file: Buffer, entry: Entry, limit: number): Buffer {
	if (entry.flags & LOCKED) throw new WordFileRefused('old-word');
	if (entry.unpacked > limit) throw new WordFileRefused('too-long');
	const { at } = entry;
	if (at + LOCAL_BYTES > file.length || file.readUInt32LE(at) !== LOCAL_HEADER)
		throw new WordFileRefused('broken');
	const start = at + LOCAL_BYTES + file.readUInt16LE(at + 26) + file.readUInt16LE(at + 28);
	const packed = file.subarray(start, start + entry.packed);
	if (packed.length < entry.packed) throw new WordFileRefused('broken');
	if (entry.method === STORED) {
		if (packed.length > limit) throw new WordFileRefused('too-long');
		return packed;
	}
	if (entry.method !== DEFLATED) throw new WordFileRefused('broken');
	return inflate(packed, limit);
}

/** What is really in there counts, whatever the directory declares. */
function inflate(packed: Buffer, limit: number): Buffer {
	try {
		return inflateRawSync(packed, { maxOutputLength: limit });
	} catch (error) {
		const tooLong = error instanceof RangeError;
		throw new WordFileRefused(tooLong ? 'bomb' : 'broken');
	}
}
