/** A document from the database, in today's shape: what was stored by an older house climbs here, and nowhere else. */
import { SteelyardError } from '../../errors.ts';
import type { CalculatorSet } from '../../physics/calculator.ts';
import type { WidgetDocument } from '../../widget/document.ts';
import { parseDocument } from '../../widget/parse.ts';

/** Throws `document-broken` when it no longer hangs together, such as after a calculator was taken away. */
export function readStored(stored: unknown, calculators: CalculatorSet): WidgetDocument {
	const parsed = parseDocument(stored, calculators);
	if (!parsed.ok) throw new SteelyardError('document-broken', { issues: parsed.issues });
	return parsed.document;
}
