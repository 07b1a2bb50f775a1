/** Packs parts into a plain ZIP without compression (PKWARE, APPNOTE.TXT 6.3): what the .docx reader gets to see. */
import { crc32 } from 'node:zlib';

const UTF8_NAMES = 0x0800;
/** 1 January 1980, the first day that ZIP knows. */
const FIRST_DAY = 0x21;

export function packStored(parts: ReadonlyMap<string, Buffer>): Buffer {
	const files: Buffer[] = [];
	const directory: Buffer[] = [];
	let offset = 0;
	for (const [name, bytes] of parts) {
		const label = Buffer.from(name, 'utf8');
		const shared = Buffer.alloc(26);
		shared.writeUInt16LE(20, 0);
		shared.writeUInt16LE(UTF8_NAMES, 2);
		shared.writeUInt16LE(FIRST_DAY, 8);
		shared.writeUInt32LE(crc32(bytes), 10);
		shared.writeUInt32LE(bytes.length, 14);
		shared.writeUInt32LE(bytes.length, 18);
		shared.writeUInt16LE(label.length, 22);
		const local = Buffer.concat([signature(0x04034b50), shared, label, bytes]);
		const place = Buffer.alloc(14);
		place.writeUInt32LE(offset, 10);
		directory.push(
			Buffer.concat([signature(0x02014b50), Buffer.from([20, 0]), shared, place, label])
		);
		files.push(local);
		offset += local.length;
	}
	const listed = Buffer.concat(directory);
	const end = Buffer.alloc(18);
	end.writeUInt16LE(parts.size, 4);
	end.writeUInt16LE(parts.size, 6);
	end.writeUInt32LE(listed.length, 8);
	end.writeUInt32LE(offset, 12);
	return Buffer.concat([...files, listed, signature(0x06054b50), end]);
}

function signature(value: number): Buffer {
	const bytes = Buffer.alloc(4);
	bytes.writeUInt32LE(value);
	return bytes;
}
