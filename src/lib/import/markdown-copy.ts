/** Copy out of Markdown (CommonMark with tables). HTML in it is taken as the words it is. */
import MarkdownIt from 'markdown-it';
import type Token from 'markdown-it/lib/token.mjs';
import { CopyGatherer, type ImportedCopy, type ImportedText } from './imported-copy.ts';

const reader = new MarkdownIt({ html: false, linkify: false, typographer: false });

/** A note’s own line, “[^3]: words”: no part of CommonMark, and common practice. */
const FOOTNOTE = /^\[\^([^\]\s]{1,40})\]:[ \t]*(.*)$/u;
const FOOTNOTE_NUMBER = /\[\^[^\]\s]{1,40}\]/uy;

/** A rule of its own, so that an escaped one stays the signs it is. */
reader.inline.ruler.before('link', 'footnote-number', (state) => {
	FOOTNOTE_NUMBER.lastIndex = state.pos;
	const found = FOOTNOTE_NUMBER.exec(state.src);
	if (!found) return false;
	state.pos += found[0].length;
	return true;
});

export function copyFromMarkdown(markdown: string): ImportedCopy {
	const { title, body, footnotes } = apart(markdown);
	const gathered = new CopyGatherer();
	const walk = new Walk(gathered);
	for (const token of reader.parse(body, {})) walk.take(token);
	for (const note of footnotes) {
		gathered.note('footnote');
		const [inline] = reader.parseInline(note, {});
		gathered.add('aside', inline ? walk.words(inline) : []);
	}
	return gathered.finish({ ...(title ? { title } : {}), whole: true });
}

/** A title from the lines between two rules at the top, and the notes from wherever they stand. */
function apart(markdown: string): { title: string; body: string; footnotes: string[] } {
	const text = markdown.replace(/^\ufeff/u, '').replace(/\r\n?/gu, '\n');
	const head = /^---\n([^]{0,4000}?)\n---(?:\n|$)/u.exec(text);
	const title = head ? (/^title:\s*(.+)$/mu.exec(head[1] ?? '')?.[1] ?? '') : '';
	const footnotes: string[] = [];
	const lines = text.slice(head?.[0].length ?? 0).split('\n');
	const body = lines.filter((line) => {
		const note = FOOTNOTE.exec(line);
		if (note?.[2] !== undefined) footnotes.push(note[2]);
		return !note;
	});
	return { title: title.trim().replace(/^(["'])(.*)\1$/u, '$2'), body: body.join('\n'), footnotes };
}

class Walk {
	readonly #gathered: CopyGatherer;
	readonly #lists: { ordered: boolean; count: number }[] = [];
	#kind: 'paragraph' | 'heading' = 'paragraph';
	#quotes = 0;
	#bullet = '';
	#row: ImportedText[] | null = null;

	constructor(gathered: CopyGatherer) {
		this.#gathered = gathered;
	}

	take(token: Token): void {
		switch (token.type) {
			case 'heading_open':
				this.#kind = 'heading';
				return;
			case 'heading_close':
				this.#kind = 'paragraph';
				return;
			case 'blockquote_open':
				this.#quotes += 1;
				return;
			case 'blockquote_close':
				this.#quotes -= 1;
				return;
			case 'bullet_list_open':
				this.#lists.push({ ordered: false, count: 0 });
				return;
			case 'ordered_list_open':
				this.#lists.push({ ordered: true, count: Number(token.attrGet('start') ?? 1) - 1 });
				return;
			case 'bullet_list_close':
			case 'ordered_list_close':
				this.#lists.pop();
				return;
			case 'list_item_open':
				this.#startItem();
				return;
			case 'table_open':
				this.#gathered.note('table');
				return;
			case 'tr_open':
				this.#row = [];
				return;
			case 'tr_close':
				this.#gathered.add('paragraph', this.#row ?? []);
				this.#row = null;
				return;
			case 'inline':
				this.#add(this.words(token));
				return;
			case 'fence':
			case 'code_block':
			case 'html_block':
				for (const line of token.content.split('\n')) this.#add([{ kind: 'text', text: line }]);
				return;
		}
	}

	#startItem(): void {
		const list = this.#lists.at(-1);
		if (!list) return;
		list.count += 1;
		this.#bullet = list.ordered ? `${list.count}.\u00a0` : '–\u00a0';
	}

	#add(words: readonly ImportedText[]): void {
		if (this.#row) {
			if (this.#row.length > 0) this.#row.push({ kind: 'text', text: '\t' });
			this.#row.push(...words);
			return;
		}
		const bullet = this.#bullet;
		this.#bullet = '';
		for (const line of linesOf(words)) {
			const kind = this.#quotes > 0 && this.#kind === 'paragraph' ? 'aside' : this.#kind;
			this.#gathered.add(kind, bullet ? [{ kind: 'text', text: bullet }, ...line] : line);
		}
	}

	/** The words of one inline token, with a line feed where the source breaks a line on purpose. */
	words(token: Token): ImportedText[] {
		const words: ImportedText[] = [];
		let em = 0;
		let strong = 0;
		let link: { url: string; text: string } | null = null;
		const say = (text: string) => {
			if (link) link.text += text;
			const marks: ImportedText['marks'] = [
				...(em > 0 ? (['em'] as const) : []),
				...(strong > 0 && this.#kind !== 'heading' ? (['strong'] as const) : [])
			];
			words.push({ kind: 'text', text, ...(marks.length > 0 ? { marks } : {}) });
		};
		for (const child of token.children ?? []) {
			if (child.type === 'em_open') em += 1;
			else if (child.type === 'em_close') em -= 1;
			else if (child.type === 'strong_open') strong += 1;
			else if (child.type === 'strong_close') strong -= 1;
			else if (child.type === 'link_open') link = { url: child.attrGet('href') ?? '', text: '' };
			else if (child.type === 'link_close') {
				if (link) this.#gathered.link(link.url, link.text);
				link = null;
			} else if (child.type === 'image') {
				this.#gathered.note('picture');
				// The words that stand for it are copy all the same.
				if (child.content) say(child.content);
			} else if (child.type === 'softbreak') say(' ');
			else if (child.type === 'hardbreak') say(LINE_END);
			else say(child.content);
		}
		return words;
	}
}

const LINE_END = '\n';

function linesOf(words: readonly ImportedText[]): ImportedText[][] {
	const lines: ImportedText[][] = [[]];
	for (const word of words) {
		if (word.text === LINE_END) lines.push([]);
		else lines.at(-1)?.push(word);
	}
	return lines;
}
