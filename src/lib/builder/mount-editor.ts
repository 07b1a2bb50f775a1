/** Puts the editor into its place on the sheet, with what the widget draws in it. */
import type { Node } from 'prosemirror-model';
import type { EditorState, Transaction } from 'prosemirror-state';
import { EditorView } from 'prosemirror-view';
import type { Language } from '../widget/language.ts';
import { bringingIn, type BringTargets } from './bring-in/take-in.ts';
import { BlockView, InlineView, type ViewHome } from './node-views.svelte.ts';
import { FIELD_BLOCKS } from './schema.ts';

export interface EditorHome extends ViewHome, BringTargets {
	state: EditorState;
	readonly readOnly: boolean;
}

export interface EditorLook {
	label: string;
	/** A sheet nobody has written on, which gets the focus. */
	isFresh: boolean;
}

export function mountEditor(
	target: HTMLElement,
	home: EditorHome,
	{ label, isFresh }: EditorLook,
	dispatchTransaction: (transaction: Transaction) => void
): EditorView {
	return new EditorView(
		{ mount: target },
		{
			state: home.state,
			editable: () => !home.readOnly,
			...bringingIn(home),
			// The bench lies over the sheet's foot: a line one goes to must stand above it.
			get scrollMargin() {
				const bench = document.querySelector('.bench-and-foot');
				return { top: 24, right: 0, bottom: (bench?.clientHeight ?? 0) + 32, left: 0 };
			},
			get scrollThreshold() {
				return this.scrollMargin;
			},
			attributes: ({ doc }) => ({
				role: 'textbox',
				lang: doc.attrs.language as Language,
				'aria-multiline': 'true',
				'aria-label': label,
				'aria-readonly': String(home.readOnly),
				// The router gives the focus of a new page to what asks for it.
				...(isFresh ? { autofocus: '' } : {}),
				spellcheck: 'true'
			}),
			nodeViews: {
				...Object.fromEntries(
					['control', ...FIELD_BLOCKS].map((kind) => [
						kind,
						(node: Node) => new BlockView(node, home)
					])
				),
				live: (node) => new InlineView(node, home),
				setting: (node) => new InlineView(node, home)
			},
			dispatchTransaction
		}
	);
}
