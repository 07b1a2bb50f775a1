/** An equation of our own calculators as a MathML tree, for where no HTML may be passed on: the widget and its frame. */
import katex from 'katex';
import { MATH_TAGS, type MathNode, type MathTag } from '../renderer/math-node.ts';

const LONGEST_SOURCE = 2000;
const LONGEST_OUTPUT = 60_000;

/** Null for a source or a tree past the limits; the words alone are shown then. Throws on TeX that can't be set. */
export function mathTree(tex: string): MathNode | null {
	if (tex.length > LONGEST_SOURCE) return null;
	const markup = katex.renderToString(tex, {
		displayMode: true,
		output: 'mathml',
		throwOnError: true,
		strict: 'error',
		trust: false,
		maxExpand: 100,
		maxSize: 20
	});
	if (markup.length > LONGEST_OUTPUT) return null;
	const math = readMarkup(markup).flatMap(drawn);
	return math.find((node) => typeof node !== 'string' && node.tag === 'math') ?? null;
}

interface Markup {
	tag: string;
	attributes: Record<string, string>;
	children: (Markup | string)[];
}

/** Reads what KaTeX writes: elements, quoted attributes, text with the five entities of XML, and nothing else. */
function readMarkup(markup: string): Markup[] {
	const root: Markup = { tag: '', attributes: {}, children: [] };
	const open = [root];
	for (const [, close, tag, attributes = '', empty, text] of markup.matchAll(
		/<(\/?)([a-z]+)((?:\s+[\w:-]+="[^"]*")*)\s*(\/?)>|([^<]+)/g
	)) {
		const parent = open.at(-1) ?? root;
		if (text !== undefined) parent.children.push(unescaped(text));
		else if (close) open.pop();
		else {
			const node: Markup = { tag: tag ?? '', attributes: attributesOf(attributes), children: [] };
			parent.children.push(node);
			if (!empty) open.push(node);
		}
	}
	return root.children.filter((child) => typeof child !== 'string');
}

function attributesOf(text: string): Record<string, string> {
	return Object.fromEntries(
		[...text.matchAll(/([\w:-]+)="([^"]*)"/g)].map(([, name = '', value = '']) => [
			name,
			unescaped(value)
		])
	);
}

const ENTITIES: Record<string, string> = { lt: '<', gt: '>', amp: '&', quot: '"', apos: "'" };

function unescaped(text: string): string {
	return text.replace(/&(?:#x([0-9a-f]+)|#(\d+)|([a-z]+));/gi, (whole, hex, decimal, name) => {
		if (hex) return String.fromCodePoint(parseInt(String(hex), 16));
		if (decimal) return String.fromCodePoint(Number(decimal));
		return ENTITIES[String(name)] ?? whole;
	});
}

/** Attributes that say how a sign is set. Names, classes and addresses stay behind. */
const KEPT = new Set([
	'mathvariant',
	'stretchy',
	'fence',
	'separator',
	'accent',
	'displaystyle',
	'scriptlevel',
	'display',
	'lspace',
	'rspace',
	'width',
	'height',
	'columnalign',
	'rowspacing',
	'columnspacing',
	'minsize',
	'maxsize',
	'linethickness'
]);

/** Wrappers are opened; the source that KaTeX notes beside its tree is left out. */
function drawn(node: Markup | string): MathNode[] {
	if (typeof node === 'string') return [node];
	if (node.tag === 'annotation') return [];
	const children = node.children.flatMap(drawn);
	if (!isMathTag(node.tag)) return children;
	const attributes = Object.fromEntries(
		Object.entries(node.attributes).filter(([name]) => KEPT.has(name))
	);
	return [{ tag: node.tag, attributes, children }];
}

function isMathTag(tag: string): tag is MathTag {
	return (MATH_TAGS as readonly string[]).includes(tag);
}
