/**
 * Copy out of HTML: what word processors put on the clipboard, and what a .docx file gives. Keeps words, headings and
 * emphasis; lists become lines, tables lines with tabs; styles, comments and tracked deletions stay behind.
 */
import { htmlEvents, VOID, type HtmlEvent } from './html-events.ts';
import {
	CopyGatherer,
	type ImportedCopy,
	type ImportedText,
	type LeftOut
} from './imported-copy.ts';
import { lowered, raised } from './raised-lowered.ts';

export interface HtmlOptions {
	/** A whole file, whose first heading is its title; a pasted passage has none. */
	whole?: boolean;
	/** Things already seen to be missing from the HTML, as a .docx reader knows. */
	missing?: readonly LeftOut[];
}

export function copyFromHtml(html: string, options: HtmlOptions = {}): ImportedCopy {
	const reader = new HtmlReader();
	for (const kind of options.missing ?? []) reader.gathered.note(kind);
	for (const event of htmlEvents(html)) reader.take(event);
	return reader.finish(options.whole ?? false);
}

const BLOCKS = new Set(
	'address article aside blockquote body center dd details dialog div dl dt fieldset figcaption figure footer form h1 h2 h3 h4 h5 h6 header hr html li main nav ol p pre section summary table tbody tfoot thead tr ul td th caption'.split(
		' '
	)
);
/** Nested deeper than this is no copy; the words are still kept. */
const DEEPEST = 400;

interface Open {
	name: string;
	em: boolean;
	strong: boolean;
	/** Everything inside stays behind. */
	dropped: boolean;
	/** Its words are a list’s number or bullet. */
	bullet: boolean;
	shift: 'raised' | 'lowered' | null;
	link: { url: string; text: string } | null;
	/** Inside an element of preformatted text, or one that a footnote stands in. */
	footnote: boolean;
	quoted: boolean;
	heading: boolean;
	list: { ordered: boolean; count: number } | null;
	cell: number;
}

const ROOT: Open = {
	name: '',
	em: false,
	strong: false,
	dropped: false,
	bullet: false,
	shift: null,
	link: null,
	footnote: false,
	quoted: false,
	heading: false,
	list: null,
	cell: 0
};

class HtmlReader {
	readonly gathered = new CopyGatherer();
	readonly #open: Open[] = [ROOT];
	readonly #footnotes: ImportedText[][] = [];
	#line: ImportedText[] = [];
	#bullet = '';
	#tables = 0;
	#lostLevels = 0;

	get #now(): Open {
		return this.#open.at(-1) ?? ROOT;
	}

	take(event: HtmlEvent): void {
		if (event.kind === 'text') this.#say(event.text);
		else if (event.kind === 'close') this.#close(event.name);
		else if (VOID.has(event.name)) this.#mark(event.name);
		else this.#enter(event.name, event.attributes);
	}

	finish(whole: boolean): ImportedCopy {
		this.#endLine();
		for (const words of this.#footnotes) this.gathered.add('aside', words);
		return this.gathered.finish({ whole });
	}

	#say(text: string): void {
		const now = this.#now;
		if (now.dropped) return;
		if (now.bullet) {
			this.#bullet += text;
			return;
		}
		if (text.trim() === '' && this.#line.length === 0) return;
		// A return in the source is a space; only our own rows hold tabs.
		const flat = text.replace(/[\t\n\r\f]+/gu, ' ');
		const words =
			now.shift === 'raised' ? raised(flat) : now.shift === 'lowered' ? lowered(flat) : flat;
		if (now.link) now.link.text += flat;
		const marks: ImportedText['marks'] = [
			...(now.em ? (['em'] as const) : []),
			...(now.strong && !now.heading ? (['strong'] as const) : [])
		];
		this.#line.push({ kind: 'text', text: words, ...(marks.length > 0 ? { marks } : {}) });
	}

	#mark(name: string): void {
		if (this.#now.dropped) return;
		if (name === 'img' || name === 'embed') this.gathered.note('picture');
		if (name === 'br') {
			if (this.#now.cell > 0) this.#say(' ');
			else this.#endLine();
		}
		if (name === 'hr') this.#endLine();
	}

	#enter(name: string, attributes: ReadonlyMap<string, string>): void {
		if (this.#open.length >= DEEPEST) {
			this.#lostLevels += 1;
			return;
		}
		const outer = this.#now;
		const style = attributes.get('style')?.toLowerCase().replace(/\s+/gu, '') ?? '';
		const kind = attributes.get('class')?.toLowerCase() ?? '';
		const dropped = outer.dropped || this.#isDropped(name, style, kind, attributes);
		if (!dropped && BLOCKS.has(name)) this.#enterBlock(name, outer);
		const now: Open = {
			...outer,
			name,
			dropped,
			bullet: outer.bullet || style.includes('mso-list:ignore'),
			em: isEmphasis(name, style) ?? outer.em,
			strong: isStrong(name, style) ?? outer.strong,
			shift: shiftOf(name, style) ?? outer.shift,
			link: name === 'a' && !dropped ? { url: attributes.get('href') ?? '', text: '' } : outer.link,
			footnote: outer.footnote || isFootnote(name, style, attributes),
			quoted: outer.quoted || name === 'blockquote',
			heading: outer.heading || /^h[1-6]$/u.test(name) || /\bmso(?:title|heading)/u.test(kind),
			list:
				name === 'ul' || name === 'ol'
					? { ordered: name === 'ol', count: Number(attributes.get('start') ?? 1) - 1 || 0 }
					: outer.list,
			cell: outer.cell + (name === 'td' || name === 'th' ? 1 : 0)
		};
		this.#open.push(now);
		if (!dropped && name === 'li' && outer.cell === 0) this.#startItem(outer);
	}

	#isDropped(
		name: string,
		style: string,
		kind: string,
		attributes: ReadonlyMap<string, string>
	): boolean {
		const outer = this.#now;
		const note = (what: LeftOut) => {
			if (!outer.dropped) this.gathered.note(what);
			return true;
		};
		if (name === 'head' || name === 'select' || name === 'button') return true;
		if (name === 'svg' || name === 'canvas' || name === 'video' || name === 'audio')
			return note('picture');
		if (name === 'object' || name === 'applet') return note('embedded');
		if (name === 'math' || name === 'm:omath') return note('equation');
		if (name === 'del' || /\bmsodel\b/u.test(kind)) return note('deletion');
		if (
			/mso-element:comment(?!-reference)|mso-comment-reference|mso-element:comment-list/u.test(
				style
			)
		)
			return style.includes('mso-element:comment-list') ? true : note('comment');
		if (/\bmsocomment/u.test(kind)) return true;
		if (/display:none|mso-hide:all|visibility:hidden/u.test(style)) return note('hidden');
		if (name === 'a' && isFootnoteLink(attributes)) return true;
		// A picture’s frame in the clipboard’s own dialect.
		return /^v:|^o:(?!p$)/u.test(name);
	}

	/** A block inside a cell is one of its lines; anywhere else it starts a line of the copy. */
	#enterBlock(name: string, outer: Open): void {
		if (name === 'table') {
			if (this.#tables === 0) {
				this.#endLine();
				this.gathered.note('table');
			}
			this.#tables += 1;
			return;
		}
		if (name === 'td' || name === 'th') {
			const parted = this.#line.length === 0 || this.#line.at(-1)?.text === '\t';
			if (outer.cell === 0 && this.#line.length > 0) this.#line.push({ kind: 'text', text: '\t' });
			else if (!parted) this.#line.push({ kind: 'text', text: '; ' });
			return;
		}
		if (outer.cell > 0) {
			if (this.#line.length > 0 && !/[\t ]$/u.test(this.#line.at(-1)?.text ?? ''))
				this.#line.push({ kind: 'text', text: ' ' });
			return;
		}
		this.#endLine();
	}

	#startItem(outer: Open): void {
		if (!outer.list || outer.footnote || this.#now.footnote) return;
		outer.list.count += 1;
		this.#bullet = outer.list.ordered ? `${outer.list.count}.` : '–';
	}

	#close(name: string): void {
		if (this.#lostLevels > 0) {
			this.#lostLevels -= 1;
			return;
		}
		const at = this.#open.findLastIndex((open) => open.name === name);
		if (at <= 0) {
			if (name === 'p') this.#endLine();
			return;
		}
		// A tag that was never closed ends with the one around it; a row keeps what a stray tag would end.
		const ends = this.#open[at] ?? ROOT;
		if (ends.link?.url && name === 'a') this.gathered.link(ends.link.url, ends.link.text);
		if (!ends.dropped && BLOCKS.has(name) && (this.#open[at - 1]?.cell ?? 0) === 0) {
			if (name !== 'td' && name !== 'th') this.#endLine();
		}
		if (name === 'table' && !ends.dropped) this.#tables = Math.max(0, this.#tables - 1);
		this.#open.length = at;
	}

	#endLine(): void {
		const words = this.#line;
		this.#line = [];
		if (words.every(({ text }) => text.trim() === '')) return;
		const now = this.#now;
		const number = /^\s*([(]?[\p{L}\d]{1,4}[.)])/u.exec(this.#bullet)?.[1];
		const bullet = this.#bullet.trim() === '' ? '' : `${number ?? '–'}\u00a0`;
		this.#bullet = '';
		if (now.footnote) {
			this.gathered.note('footnote');
			this.#footnotes.push(words);
			return;
		}
		const line: ImportedText[] = bullet ? [{ kind: 'text', text: bullet }, ...words] : words;
		this.gathered.add(now.heading ? 'heading' : now.quoted ? 'aside' : 'paragraph', line);
	}
}

function isEmphasis(name: string, style: string): boolean | null {
	if (/font-style:(?:italic|oblique)/u.test(style)) return true;
	if (style.includes('font-style:normal')) return false;
	return name === 'em' || name === 'i' || name === 'cite' ? true : null;
}

function isStrong(name: string, style: string): boolean | null {
	const weight = /font-weight:([a-z]+|\d+)/u.exec(style)?.[1];
	if (weight) return weight === 'bold' || weight === 'bolder' || Number(weight) >= 600;
	return name === 'strong' || name === 'b' ? true : null;
}

function shiftOf(name: string, style: string): Open['shift'] {
	if (name === 'sup' || style.includes('vertical-align:super')) return 'raised';
	if (name === 'sub' || style.includes('vertical-align:sub')) return 'lowered';
	return null;
}

/** A note’s own text, in the clipboard’s dialect and in that of the .docx reader. */
function isFootnote(name: string, style: string, attributes: ReadonlyMap<string, string>): boolean {
	const id = attributes.get('id') ?? '';
	return (
		/mso-element:(?:foot|end)note(?:$|;)/u.test(style) ||
		(name === 'li' && /^(?:foot|end)note-\d/u.test(id))
	);
}

/** The number that points to a note, or back from it. */
function isFootnoteLink(attributes: ReadonlyMap<string, string>): boolean {
	return /#(?:_?(?:ftn|edn)(?:ref)?\d|(?:foot|end)note-)/u.test(attributes.get('href') ?? '');
}
