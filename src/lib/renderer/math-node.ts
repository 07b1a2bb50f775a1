/** Presentation MathML as plain JSON: set on the server, drawn by `MathTree.svelte`, never passed on as HTML. */
export type MathNode =
	string | { tag: MathTag; attributes: Record<string, string>; children: MathNode[] };

/** The elements that are drawn; whatever else a typesetter writes is left out. */
export const MATH_TAGS = [
	'math',
	'mrow',
	'mi',
	'mn',
	'mo',
	'mtext',
	'mspace',
	'mfrac',
	'msqrt',
	'mroot',
	'msup',
	'msub',
	'msubsup',
	'mover',
	'munder',
	'munderover',
	'mtable',
	'mtr',
	'mtd',
	'mstyle',
	'mpadded',
	'mphantom'
] as const;
export type MathTag = (typeof MATH_TAGS)[number];

export interface SetMath {
	tree: MathNode;
	/** The equation in words. */
	says: string;
}

/** By `mathKey`. */
export type MathBook = Readonly<Record<string, SetMath>>;

/** Which equation of which calculator, in which revision. */
export function mathKey(calculator: string, revision: string, equation: number): string {
	return `${calculator} ${revision} ${equation}`;
}

export function mathKeyParts(key: string): { calculator: string; equation: number } {
	const [calculator = '', , equation] = key.split(' ');
	return { calculator, equation: Number(equation) };
}
