/**
 * A piece with a formula of its own, chained into a calculator: y = v t − g t²/2 at 13 m/s and 9.80 m/s². What OpenStax,
 * College Physics, §2.7, Table 2.1 prints for 1, 2 and 3 s is 8.10, 6.40 and −5.10 m; recalled, not read again.
 */
import { readFileSync } from 'node:fs';
import { catalogue } from '../../src/lib/physics/calculators/index.ts';
import type { WidgetDocument } from '../../src/lib/widget/document.ts';
import { parseDocument } from '../../src/lib/widget/parse.ts';

const file = new URL('../documents/v2-thrown-stone.json', import.meta.url);

/** A fresh copy. */
export function thrownStone(): WidgetDocument {
	const parsed = parseDocument(JSON.parse(readFileSync(file, 'utf8')), catalogue);
	if (!parsed.ok) throw new Error(JSON.stringify(parsed.issues));
	// What was parsed has been looked at and remembered; a test may change its own copy.
	return structuredClone(parsed.document);
}
