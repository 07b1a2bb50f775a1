/** Two sentences laid side by side: which words went, which came, which stayed. */
export interface DiffPart {
	kind: 'same' | 'gone' | 'new';
	text: string;
}

/** Longest common run of words (Wagner and Fischer 1974); sentences are short, so the square table is too. */
export function sentenceDiff(then: string, now: string): DiffPart[] {
	const a = then.split(/(?<=\s)/);
	const b = now.split(/(?<=\s)/);
	const common = commonLengths(a, b);
	const parts: DiffPart[] = [];
	const add = (kind: DiffPart['kind'], text: string) => {
		const last = parts.at(-1);
		if (last?.kind === kind) last.text += text;
		else parts.push({ kind, text });
	};
	let i = 0;
	let j = 0;
	while (i < a.length || j < b.length) {
		const [gone = '', come = ''] = [a[i], b[j]];
		if (i < a.length && j < b.length && gone.trim() === come.trim()) {
			add('same', come);
			i += 1;
			j += 1;
		} else if (i < a.length && at(common, i + 1, j) >= at(common, i, j + 1)) {
			add('gone', gone);
			i += 1;
		} else if (j < b.length) {
			add('new', come);
			j += 1;
		} else {
			add('gone', gone);
			i += 1;
		}
	}
	return parts;
}

/** `table[i][j]`: how many words the rests from i and from j have in common, in order. */
function commonLengths(a: readonly string[], b: readonly string[]): number[][] {
	const table = Array.from({ length: a.length + 1 }, () => new Array<number>(b.length + 1).fill(0));
	for (let i = a.length - 1; i >= 0; i -= 1) {
		for (let j = b.length - 1; j >= 0; j -= 1) {
			const row = table[i];
			if (!row) continue;
			row[j] =
				a[i]?.trim() === b[j]?.trim()
					? at(table, i + 1, j + 1) + 1
					: Math.max(at(table, i + 1, j), at(table, i, j + 1));
		}
	}
	return table;
}

const at = (table: number[][], i: number, j: number) => table[i]?.[j] ?? 0;
