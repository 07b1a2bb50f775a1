/** Plain text as Markdown (CommonMark 0.31): every sign that means something there is written so that it means itself. */
import type { Inline } from '../widget/document.ts';

/** Signs that mean something anywhere in a line. */
const MEANT = /[\\`*_[\]<>|~&^$#]/gu;
/** What would make a line a heading, a list, a quote, a rule or a table when it stands first. */
const AT_START = /^([+\-=:])|^(\d{1,9})([.)])/u;

/** One line: line ends become spaces. */
export function plainLine(text: string): string {
	return startLine(inLine(text));
}

/** What is to stand first in a line. */
export function startLine(written: string): string {
	return written
		.trim()
		.replace(AT_START, (_, sign?: string, digits?: string, stop?: string) =>
			sign ? `\\${sign}` : `${digits}\\${stop}`
		);
}

/** For the middle of a line. */
export function inLine(text: string): string {
	return text.replace(/[\n\r]+/gu, ' ').replace(MEANT, '\\$&');
}

/** A cell of a table. */
export function cell(text: string): string {
	return inLine(text).replace(/\t/gu, ' ').trim() || ' ';
}

export function table(head: readonly string[], rows: readonly (readonly string[])[]): string {
	const row = (cells: readonly string[]) => `| ${cells.map(cell).join(' | ')} |`;
	return [row(head), row(head.map(() => '---')), ...rows.map(row)].join('\n');
}

/** Running text with its emphasis; `words` says what each inline reads, `after` what stands behind it. */
export function runningText(
	content: readonly Inline[],
	words: (inline: Inline) => string,
	after: (inline: Inline) => string
): string {
	let marked = false;
	const line = content
		.map((inline) => {
			const stars = inline.kind === 'text' ? starsOf(inline.marks ?? []) : '';
			// Stars beside stars would be read as one run of them.
			const look = marked ? '' : stars;
			marked = look !== '';
			return emphasised(words(inline), look) + after(inline);
		})
		.join('');
	return startLine(line);
}

function starsOf(marks: readonly string[]): string {
	return (marks.includes('em') ? '*' : '') + (marks.includes('strong') ? '**' : '');
}

/** Stars hold only where they touch a letter or a digit, so spaces and punctuation at the edges stand outside them. */
export function emphasised(text: string, stars: string): string {
	if (!stars) return inLine(text);
	const parts = /^([^\p{L}\p{N}]*)([^]*?)([^\p{L}\p{N}]*)$/u.exec(text);
	const [, before = '', inner = '', behind = ''] = parts ?? [];
	return inner ? inLine(before) + stars + inLine(inner) + stars + inLine(behind) : inLine(text);
}
