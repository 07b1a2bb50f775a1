/** The names a formula may use: what its calculator declares, and the constants book. */
import { unitOf, type Dimension } from '../units/units.ts';
import { formulaBook } from './book.ts';
import { isFunctionName } from './functions.ts';
import { NAME } from './tree.ts';

export interface ScopeName {
	dimension: Dimension;
	/** What it is, for lists of what can be used. */
	says: string;
	/** How a card prints it; by its name where absent. */
	tex?: string;
}

export type FormulaScope = ReadonlyMap<string, ScopeName>;

/** Words with a meaning of their own in a formula, or in the language it is read with. */
const RESERVED = new Set(
	'and or not xor mod to in end true false null undefined NaN Infinity log'.split(' ')
);

/** The book with a calculator's own names added. Names are checked with `nameProblem` before they come here. */
export function formulaScope(own: Iterable<readonly [string, ScopeName]>): FormulaScope {
	return new Map<string, ScopeName>([...formulaBook(), ...own]);
}

/** The dimension of a unit of the table; pure for one that isn't there, which the caller has refused already. */
export function dimensionOfUnit(symbol: string): Dimension {
	return unitOf(symbol)?.dimension ?? {};
}

/** Why a name can't be given to an input, a value or an output; undefined when it can. */
export function nameProblem(
	name: string
): { code: string; says: string; mend: string } | undefined {
	if (!NAME.test(name)) {
		return {
			code: 'name-broken',
			says: `“${name.slice(0, 40)}” can't be a name in a formula.`,
			mend: 'Start with a letter from a to z, then letters, digits and underscores, 32 at most: mass_1.'
		};
	}
	const constant = formulaBook().get(name);
	if (constant) {
		return {
			code: 'name-taken',
			says: `“${name}” stands for ${constant.says} in every formula.`,
			mend: `Choose another name, such as ${name.slice(0, 26)}_1 or a whole word.`
		};
	}
	if (isFunctionName(name) || RESERVED.has(name) || name in Object.prototype) {
		return {
			code: 'name-taken',
			says: `“${name}” has a meaning of its own and can't be a name.`,
			mend: `Choose another name, such as ${name.slice(0, 26)}_1.`
		};
	}
	return undefined;
}
