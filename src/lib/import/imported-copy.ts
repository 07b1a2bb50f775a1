/** What an import gives: blocks of plain text data, and in words what was left out. Nothing in it can run. */
export interface ImportedText {
	kind: 'text';
	text: string;
	marks?: ('em' | 'strong')[];
}

/** A text block of the document that has no id yet. */
export interface ImportedBlock {
	kind: 'paragraph' | 'heading' | 'aside';
	content: ImportedText[];
}

export interface ImportedCopy {
	/** Of a whole file: its first heading, or its title. */
	title?: string;
	blocks: ImportedBlock[];
	/** Addresses the copy linked to, with the linked words, which stay: they may be sources. */
	links: { text: string; url: string }[];
	/** What was left out or changed, each a sentence. */
	notes: string[];
}

/** What the document holds at most: blocks, and inlines of a block. */
const MOST_BLOCKS = 200;
const MOST_INLINES = 400;
const LONGEST_TEXT = 20_000;
const LONGEST_TITLE = 120;

/** Collects blocks in order, joins neighbouring text of one look, and keeps to the document’s limits. */
export class CopyGatherer {
	readonly #blocks: ImportedBlock[] = [];
	readonly #links = new Map<string, string>();
	readonly #notes = new Map<string, number>();
	#left = 0;

	/** `say` gets how often it happened. */
	note(kind: LeftOut): void {
		this.#notes.set(kind, (this.#notes.get(kind) ?? 0) + 1);
	}

	link(url: string, text: string): void {
		if (/^https?:\/\/\S+$/iu.test(url) && !this.#links.has(url)) this.#links.set(url, text.trim());
	}

	add(kind: ImportedBlock['kind'], content: readonly ImportedText[]): void {
		const joined = trimmed(join(content));
		if (joined.length === 0) return;
		if (this.#blocks.length >= MOST_BLOCKS || joined.length > MOST_INLINES) {
			this.#left += 1;
			return;
		}
		this.#blocks.push({ kind, content: joined });
	}

	/** With `whole`, a heading that opens the copy is its title. */
	finish({ title, whole }: { title?: string; whole: boolean }): ImportedCopy {
		const blocks = [...this.#blocks];
		let named = title?.trim() ?? '';
		const [first] = blocks;
		if (whole && !named && first?.kind === 'heading') {
			const words = first.content.map(({ text }) => text).join('');
			if (words.length <= LONGEST_TITLE) {
				named = words;
				blocks.shift();
			}
		} else if (named.length > LONGEST_TITLE) {
			blocks.unshift({ kind: 'heading', content: [{ kind: 'text', text: named }] });
			named = '';
		}
		const notes = [...this.#notes].map(([kind, count]) => LEFT_OUT[kind as LeftOut](count));
		if (this.#left > 0) {
			notes.push(
				`A piece takes ${MOST_BLOCKS} blocks: the last ${counted(this.#left, 'paragraph')} of this text were left out.`
			);
		}
		return {
			...(named ? { title: named } : {}),
			blocks,
			links: [...this.#links].map(([url, text]) => ({ url, text })),
			notes
		};
	}
}

const counted = (count: number, thing: string) =>
	`${count === 1 ? 'one' : count} ${thing}${count === 1 ? '' : 's'}`;
const sentence = (words: string) => words.charAt(0).toUpperCase() + words.slice(1);
const were = (count: number) => (count === 1 ? 'was' : 'were');

const LEFT_OUT = {
	picture: (count: number) =>
		sentence(
			`${counted(count, 'picture')} ${were(count)} left out. Pictures come in at the picture desk, with their credit.`
		),
	equation: (count: number) =>
		sentence(
			`${counted(count, 'equation')} ${were(count)} left out. Equations come from calculators.`
		),
	comment: (count: number) => sentence(`${counted(count, 'comment')} ${were(count)} left out.`),
	deletion: (count: number) =>
		sentence(
			`${counted(count, 'tracked deletion')} ${were(count)} taken as made, and insertions as kept.`
		),
	table: (count: number) =>
		sentence(`${counted(count, 'table')} came in as lines, their cells apart by tabs.`),
	footnote: (count: number) =>
		sentence(
			`${counted(count, 'footnote')} ${count === 1 ? 'stands' : 'stand'} at the end as asides.`
		),
	hidden: () => 'Hidden text was left out.',
	embedded: (count: number) =>
		sentence(`${counted(count, 'embedded object')} ${were(count)} left out.`),
	macro: () => 'Macros were left out; nothing of them was run.'
} as const;
export type LeftOut = keyof typeof LEFT_OUT;

function join(content: readonly ImportedText[]): ImportedText[] {
	const joined: ImportedText[] = [];
	for (const { text, marks = [] } of content) {
		if (text === '') continue;
		const last = joined.at(-1);
		const look = [...marks].sort();
		if (last && (last.marks ?? []).join() === look.join()) last.text += text;
		else joined.push({ kind: 'text', text, ...(look.length > 0 ? { marks: look } : {}) });
	}
	return joined.flatMap((inline) =>
		inline.text.length <= LONGEST_TEXT
			? [inline]
			: (inline.text.match(/[^]{1,20000}/gu) ?? []).map((text) => ({ ...inline, text }))
	);
}

/** White space runs together; a tab parts cells and a no-break space is meant, so both stay. */
function trimmed(content: ImportedText[]): ImportedText[] {
	let before = ' ';
	const spaced = content.map((inline) => {
		const text = inline.text.replace(/[ \n\r\f]+/gu, ' ').replace(/ ?\t ?/gu, '\t');
		const kept = /[ \t]$/u.test(before) && text.startsWith(' ') ? text.slice(1) : text;
		if (kept !== '') before = kept;
		return { ...inline, text: kept };
	});
	const first = spaced.findIndex(({ text }) => /[^\s]/u.test(text));
	if (first === -1) return [];
	const last = spaced.findLastIndex(({ text }) => /[^\s]/u.test(text));
	return spaced
		.slice(first, last + 1)
		.map((inline, index, all) => ({
			...inline,
			text: cut(inline.text, index === 0, index === all.length - 1)
		}))
		.filter(({ text }) => text !== '');
}

function cut(text: string, atStart: boolean, atEnd: boolean): string {
	const started = atStart ? text.replace(/^\s+/u, '') : text;
	return atEnd ? started.replace(/\s+$/u, '') : started;
}
