/** Bringing copy in: what was asked for, what came, and what was left out. The readers come with their first use. */
import type { Transaction } from 'prosemirror-state';
import { bringInCopy, pasteCopy } from './copy-nodes.ts';

export interface Summary {
	/** “From draft.docx: a title and 14 paragraphs.” */
	says: string;
	/** What was left out or changed, each a sentence. */
	notes: readonly string[];
	/** Addresses that the copy linked to; they may be sources. */
	links: readonly { text: string; url: string }[];
	isFailure: boolean;
}

interface Home {
	readonly readOnly: boolean;
	change(make: (transaction: Transaction) => Transaction): void;
}

export class Bringing {
	/** Of what came in last; null once it is put away. */
	summary = $state.raw<Summary | null>(null);
	isReading = $state(false);

	readonly #home: Home;

	constructor(home: Home) {
		this.#home = home;
	}

	async paste(html: string): Promise<void> {
		const { copyFromHtml } = await import('../../import/html-copy.ts');
		const copy = copyFromHtml(html);
		if (copy.blocks.length > 0) this.#home.change((transaction) => pasteCopy(transaction, copy));
		this.summary =
			copy.notes.length > 0
				? { says: 'Pasted.', notes: copy.notes, links: [], isFailure: false }
				: null;
	}

	async file(file: File): Promise<void> {
		if (this.#home.readOnly || this.isReading) return;
		this.isReading = true;
		this.summary = null;
		try {
			const { readFile } = await import('./read-file.ts');
			const read = await readFile(file);
			if (!read.ok) {
				this.summary = { says: read.says, notes: [], links: [], isFailure: true };
				return;
			}
			const { copy } = read;
			let left = 0;
			this.#home.change((transaction) => {
				const brought = bringInCopy(transaction, copy);
				left = brought.left;
				return brought.transaction;
			});
			const count = copy.blocks.length;
			const what = [copy.title ? 'a title' : '', count === 1 ? 'one block' : `${count} blocks`];
			const room = left > 0 ? [`A piece takes 200 blocks: ${left} of these found no room.`] : [];
			this.summary = {
				says: `From ${file.name}: ${what.filter(Boolean).join(' and ')}. Ctrl Z takes it all back.`,
				notes: [...copy.notes, ...room],
				links: copy.links,
				isFailure: false
			};
		} finally {
			this.isReading = false;
		}
	}
}
