type PartOfBlock =
	'line' | 'item' | 'column' | 'part' | 'row' | 'value' | 'preset' | 'source' | 'option';

/**
 * A new id for a thing in a document. Random, so that words pasted from another piece can't be taken for a claim of
 * this one.
 */
export function newId(
	prefix: 'step' | 'control' | 'claim' | 'block' | 'formula' | 'check' | PartOfBlock
): string {
	const random = crypto.getRandomValues(new Uint32Array(2));
	return `${prefix}-${[...random].map((part) => part.toString(36).padStart(7, '0')).join('')}`;
}
