/**
 * Lets a drawing through only if it is made of the parts listed here and refers to nothing but itself. It is drawn by a
 * library that loads nothing either; this check stands in front of it, so that neither has to be the only one.
 */
import { readTags, type Tag } from './svg-tags.ts';
import { refuse, refuseIn } from './refusal.ts';

const LARGEST_SVG = 2 * 1024 * 1024;
const MOST_PARTS = 20_000;
const DEEPEST = 64;
/** Parts drawn when every `use` is followed. */
const MOST_DRAWN = 100_000;
const SHORTEST_DASH = 0.01;

const SVG = 'http://www.w3.org/2000/svg';

/** Parts of SVG 1.1 and 2 that draw, and none that load, run, move or filter. */
const PARTS = new Set(
	(
		'svg g path rect circle ellipse line polyline polygon text tspan textPath defs symbol use marker ' +
		'linearGradient radialGradient stop clipPath mask pattern switch title desc metadata style'
	).split(' ')
);
const RUNS = new Set(['script', 'handler', 'listener']);
const LOADS = new Set([
	'image',
	'feImage',
	'foreignObject',
	'iframe',
	'video',
	'audio',
	'a',
	'link'
]);

/** The drawing as text, without a document type; throws a refusal. */
export function safeSvg(bytes: Uint8Array): string {
	if (bytes.length > LARGEST_SVG) throw refuse('svg-heavy');
	const { text, tags } = readTags(bytes, MOST_PARTS);
	const root = tags[0];
	if (!root || localName(root) !== 'svg') throw refuse('svg-broken');
	for (const tag of tags) {
		if (tag.depth > DEEPEST) throw refuse('svg-tangled');
		checkPart(tag, tags);
		for (const [name, value] of tag.attributes) checkAttribute(name, value);
		if (localName(tag) === 'style') checkStyle(tag.text);
	}
	if (drawnParts(tags) > MOST_DRAWN) throw refuse('svg-tangled');
	return text;
}

/** The name without the prefix of SVG’s own namespace; names of other namespaces keep theirs. */
function localName({ name }: Tag): string {
	return name.startsWith('svg:') ? name.slice(4) : name;
}

function checkPart(tag: Tag, tags: readonly Tag[]): void {
	const name = localName(tag);
	const plain = name.slice(name.indexOf(':') + 1);
	if (RUNS.has(plain)) throw refuse('svg-script');
	if (LOADS.has(plain)) throw refuse('svg-outside');
	// What drawing programs note for themselves has prefixes of its own, and isn’t drawn.
	if (name.includes(':') || PARTS.has(name)) return;
	for (let at = tag.parent; at >= 0; at = tags[at]?.parent ?? -1) {
		const above = tags[at];
		if (above && localName(above) === 'metadata') return;
	}
	throw refuseIn(
		'svg-part',
		`This SVG holds a part that isn’t taken: ${name.slice(0, 40)}.`,
		'Save it as plain SVG without it, or as PNG, and send it again.'
	);
}

function checkAttribute(name: string, value: string): void {
	const plain = name.slice(name.indexOf(':') + 1).toLowerCase();
	if (/^on/.test(plain) || /javascript:/i.test(value.replace(/\s/g, '')))
		throw refuse('svg-script');
	// Another prefix for SVG’s namespace would let a part pass under a name that isn’t listed.
	if (
		name === 'xmlns'
			? value !== SVG
			: name.startsWith('xmlns:') && name !== 'xmlns:svg' && value === SVG
	)
		throw refuse('svg-broken');
	if (name === 'xmlns:svg' && value !== SVG) throw refuse('svg-broken');
	if (name === 'xml:base') throw refuse('svg-outside');
	if ((plain === 'href' || plain === 'src') && !/^\s*(?:#[^\s#]+)?\s*$/.test(value)) {
		// Links in the notes of drawing programs go nowhere.
		if (name === 'href' || name === 'src' || name.startsWith('xlink:')) throw refuse('svg-outside');
	}
	if (plain === 'style') checkStyle(value);
	else checkReferences(value);
	if (plain === 'stroke-dasharray') checkDashes(value);
}

/** No rule that loads, no reference outside, and no escapes that could spell either. */
function checkStyle(css: string): void {
	const plain = css.replace(/\/\*.*?\*\//gs, ' ');
	if (plain.includes('\\') || plain.includes('@')) throw refuse('svg-outside');
	checkReferences(plain);
	for (const [, dashes = ''] of plain.matchAll(/stroke-dasharray\s*:([^;}]*)/g))
		checkDashes(dashes);
}

function checkReferences(value: string): void {
	const own = /url\(\s*(["']?)#[\w:.-]+\1\s*\)/g;
	if (/url\s*\(|image\s*\(|image-set\s*\(|src\s*\(/i.test(value.replace(own, '')))
		throw refuse('svg-outside');
}

/** Dashes too short to be seen are drawn all the same, one by one. */
function checkDashes(value: string): void {
	const lengths = (value.match(/[-+.\de]+/gi) ?? []).map(Number);
	if (lengths.some((length) => length > 0 && length < SHORTEST_DASH)) throw refuse('svg-tangled');
}

/** How many parts are drawn once every reference is followed; Infinity when one leads back to itself. */
function drawnParts(tags: readonly Tag[]): number {
	const children: number[][] = tags.map(() => []);
	tags.forEach(({ parent }, index) => children[parent]?.push(index));
	const byId = new Map<string, number>();
	tags.forEach(({ attributes }, index) => {
		const id = attributes.get('id');
		if (id !== undefined) byId.set(id, index);
	});
	const known = new Map<number, number>();
	const open = new Set<number>();

	function drawn(index: number): number {
		const counted = known.get(index);
		if (counted !== undefined) return counted;
		if (open.has(index)) return Infinity;
		open.add(index);
		const tag = tags[index];
		let count = 1;
		for (const child of children[index] ?? []) count += drawn(child);
		for (const target of tag ? referencesOf(tag) : []) {
			const found = byId.get(target);
			if (found !== undefined) count += drawn(found);
		}
		open.delete(index);
		known.set(index, count);
		return count;
	}
	return drawn(0);
}

function referencesOf(tag: Tag): string[] {
	const found: string[] = [];
	for (const [name, value] of tag.attributes) {
		if (/(?:^|:)href$/.test(name)) found.push(value.trim().replace(/^#/, ''));
		for (const [, id = ''] of value.matchAll(/url\(\s*["']?#([\w:.-]+)/g)) found.push(id);
	}
	return found;
}
