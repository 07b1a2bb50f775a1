/**
 * A reader for the XML that drawings are written in: tags, attributes and the text of styles. It knows no document type
 * and no entity but the five of XML, and stops at the first thing it doesn’t know.
 */
import { refuse } from './refusal.ts';

export interface Tag {
	/** With its prefix. */
	name: string;
	attributes: ReadonlyMap<string, string>;
	/** Place of the tag around it in the list; -1 for the root. */
	parent: number;
	depth: number;
	/** Text directly inside. */
	text: string;
}

const NAME = String.raw`[A-Za-z_][\w.-]*(?::[A-Za-z_][\w.-]*)?`;
const OPEN = new RegExp(
	String.raw`<(${NAME})((?:\s+${NAME}\s*=\s*(?:"[^"<]*"|'[^'<]*'))*)\s*(/?)>`,
	'y'
);
const CLOSE = new RegExp(String.raw`</(${NAME})\s*>`, 'y');
const ATTRIBUTE = new RegExp(String.raw`(${NAME})\s*=\s*(?:"([^"]*)"|'([^']*)')`, 'g');
const DECLARATION = /^<\?xml\s[^?]*\?>/;
const DOCTYPE = /<!DOCTYPE\b[^>[]*(\[)?[^>]*>?/y;

/** Tags in the order they open, and the text without its document type. Throws `svg-broken`, `svg-entities`, or `svg-heavy` at one more than `most`. */
export function readTags(bytes: Uint8Array, most: number): { text: string; tags: Tag[] } {
	let text = decoded(bytes);
	const tags: Tag[] = [];
	const open: number[] = [];
	let at = DECLARATION.exec(text)?.[0].length ?? 0;

	const inside = () => tags[open.at(-1) ?? -1];
	function skipTo(end: string): string {
		const found = text.indexOf(end, at);
		if (found < 0) throw refuse('svg-broken');
		const skipped = text.slice(at, found);
		at = found + end.length;
		return skipped;
	}

	while (at < text.length) {
		if (text.startsWith('<!--', at)) {
			at += 4;
			skipTo('-->');
		} else if (text.startsWith('<![CDATA[', at)) {
			at += 9;
			const tag = inside();
			const words = skipTo(']]>');
			if (!tag) throw refuse('svg-broken');
			tag.text += words;
		} else if (text.startsWith('<?', at)) {
			if (!text.startsWith('<?xpacket', at)) throw refuse('svg-outside');
			skipTo('?>');
		} else if (text.startsWith('<!', at)) {
			DOCTYPE.lastIndex = at;
			const type = DOCTYPE.exec(text);
			if (!type || tags.length > 0) throw refuse('svg-broken');
			if (type[1]) throw refuse('svg-entities');
			text = text.slice(0, at) + text.slice(DOCTYPE.lastIndex);
		} else if (text.startsWith('</', at)) {
			CLOSE.lastIndex = at;
			const name = CLOSE.exec(text)?.[1];
			if (name === undefined || inside()?.name !== name) throw refuse('svg-broken');
			open.pop();
			at = CLOSE.lastIndex;
		} else if (text[at] === '<') {
			OPEN.lastIndex = at;
			const [, name, attributes = '', closed] = OPEN.exec(text) ?? [];
			if (name === undefined || (tags.length > 0 && open.length === 0)) throw refuse('svg-broken');
			if (tags.length >= most) throw refuse('svg-heavy');
			tags.push({
				name,
				attributes: readAttributes(attributes),
				parent: open.at(-1) ?? -1,
				depth: open.length,
				text: ''
			});
			if (!closed) open.push(tags.length - 1);
			at = OPEN.lastIndex;
		} else {
			const next = text.indexOf('<', at);
			const words = text.slice(at, next < 0 ? undefined : next);
			const tag = inside();
			if (tag) tag.text += unescaped(words);
			else if (words.trim() !== '') throw refuse('svg-broken');
			at += words.length;
		}
	}
	if (open.length > 0 || tags.length === 0) throw refuse('svg-broken');
	return { text, tags };
}

/** UTF-8 alone: another encoding, announced or not, could be read otherwise than it was checked. */
function decoded(bytes: Uint8Array): string {
	let text: string;
	try {
		text = new TextDecoder('utf-8', { fatal: true }).decode(bytes);
	} catch {
		throw refuse('svg-broken');
	}
	const encoding = /encoding\s*=\s*["']([^"']*)["']/.exec(DECLARATION.exec(text)?.[0] ?? '')?.[1];
	// eslint-disable-next-line no-control-regex -- XML allows no other control characters
	if (/[\0-\x08\x0b\x0c\x0e-\x1f]/.test(text) || (encoding && !/^utf-?8$/i.test(encoding)))
		throw refuse('svg-broken');
	return text;
}

function readAttributes(source: string): Map<string, string> {
	const attributes = new Map<string, string>();
	for (const [, name = '', double, single] of source.matchAll(ATTRIBUTE)) {
		if (attributes.has(name)) throw refuse('svg-broken');
		attributes.set(name, unescaped(double ?? single ?? ''));
	}
	return attributes;
}

const ENTITIES: Record<string, string> = { lt: '<', gt: '>', amp: '&', quot: '"', apos: "'" };

function unescaped(text: string): string {
	return text.replace(
		/&(#x[\da-f]{1,6}|#\d{1,7}|\w{1,32})?(;)?/gi,
		(_all, name: string | undefined, end) => {
			if (!name || !end) throw refuse('svg-broken');
			const known = ENTITIES[name];
			if (known !== undefined) return known;
			if (!name.startsWith('#')) throw refuse('svg-entities');
			const code = /^#x/i.test(name) ? parseInt(name.slice(2), 16) : Number(name.slice(1));
			if (code > 0x10ffff) throw refuse('svg-broken');
			return String.fromCodePoint(code);
		}
	);
}
