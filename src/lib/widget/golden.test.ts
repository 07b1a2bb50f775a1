import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { catalogue } from '../physics/calculators/index.ts';
import { benchSet } from './bench-set.ts';
import { DOCUMENT_VERSION } from './document.ts';
import { evaluate } from './evaluate.ts';
import { parseDocument } from './parse.ts';

/** Documents as they were stored by each version. They are never edited: what was kept must open for good. */
const folder = new URL('../../../tests/documents/', import.meta.url);
const documents = readdirSync(folder).map((name) => ({
	name,
	stored: JSON.parse(readFileSync(new URL(name, folder), 'utf8')) as unknown
}));

test('every version has a golden document', () => {
	for (let version = 1; version <= DOCUMENT_VERSION; version += 1) {
		expect(documents.some(({ name }) => name.startsWith(`v${version}-`))).toBe(true);
	}
});

describe.each(documents)('$name', ({ stored }) => {
	test('opens in the newest version with every reading', () => {
		const parsed = parseDocument(stored, catalogue);
		if (!parsed.ok) throw new Error(JSON.stringify(parsed.issues));
		const { steps } = evaluate(parsed.document, {}, benchSet(parsed.document, catalogue));
		expect(Object.values(steps).filter(({ ok }) => !ok)).toEqual([]);
	});
});
