import { expect, test } from 'vitest';
import { acceptedEncoding } from './encodings.ts';

test.each([
	['gzip, deflate, br, zstd', 'br'],
	['gzip, deflate', 'gzip'],
	['gzip;q=1.0, br;q=0', 'gzip'],
	['GZIP', 'gzip'],
	['*', 'br'],
	['br;q=0, *', 'gzip'],
	['identity', null],
	['gzip;q=0', null],
	['gzip;q=nonsense', null],
	['', null],
	[undefined, null]
])('%s gives %s', (header, encoding) => {
	expect(acceptedEncoding(header)).toBe(encoding);
});
