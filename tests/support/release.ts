/** A release of a document, printed as the house prints it, for tests of the frame and of the shelf. */
import { fileURLToPath } from 'node:url';
import { catalogue } from '../../src/lib/physics/calculators/index.ts';
import { makeBundle, type Bundle } from '../../src/lib/server/press/press.ts';
import { recordsOf } from '../../src/lib/server/press/records.ts';
import { freeze } from '../../src/lib/widget/freeze.ts';
import type { WidgetDocument } from '../../src/lib/widget/document.ts';

export const PRESS_FOLDER = fileURLToPath(new URL('../../build/press', import.meta.url));

/** Needs the frame's build: npm run build. */
export async function releaseOf(
	document: WidgetDocument,
	slug: string,
	releaseNumber = 1
): Promise<Bundle> {
	const signedAt = new Date('2026-12-12T09:00:00Z');
	return makeBundle({
		frozen: freeze(document, catalogue),
		calculators: catalogue,
		houseCalculators: [],
		slug,
		releaseNumber,
		releasedAt: new Date('2026-12-15T10:00:00Z'),
		house: 'Varrowmere Institute, Public Desk',
		makers: {
			writers: ['Tamsin Orrelby'],
			checkers: ['Dr Mateus Quevarro'],
			editor: 'Perpetua Lindqvane'
		},
		records: recordsOf(
			document,
			catalogue,
			document.claims.map(({ id }) => ({ claim: id, name: 'Dr Mateus Quevarro', signedAt }))
		),
		pressFolder: PRESS_FOLDER
	});
}
