/** The manuscript's keys. Whatever they open stands beside the line, and Esc closes it. */
import {
	baseKeymap,
	chainCommands,
	createParagraphNear,
	liftEmptyBlock,
	newlineInCode,
	splitBlock,
	toggleMark
} from 'prosemirror-commands';
import { closeHistory, redo, undo } from 'prosemirror-history';
import { keymap } from 'prosemirror-keymap';
import {
	NodeSelection,
	Plugin,
	Selection,
	TextSelection,
	type Command,
	type EditorState
} from 'prosemirror-state';
import { moveBlock } from './insert.ts';
import type { NumberInCopy } from './quantities.ts';
import { schema } from './schema.ts';
import { focusedNumber } from './weighing.ts';

/** What the keys act on beside the text. */
export interface KeyTargets {
	forms: { change(pos: number): boolean };
	openTie(number: NumberInCopy): void;
	/** Marks the selected words by hand. */
	tieSelection(): boolean;
	lint: { takeHere(): boolean };
	goToNextUnweighed(): boolean;
	cycleBench(): void;
	inserting: number | null;
}

/** From the title to the point to the copy: Enter goes on, since neither holds two lines. */
const nextLine: Command = (state, dispatch) => {
	const { $from } = state.selection;
	if ($from.parent.type !== schema.nodes.title && $from.parent.type !== schema.nodes.point)
		return false;
	const after = $from.after(1);
	dispatch?.(
		state.tr.setSelection(TextSelection.near(state.doc.resolve(after + 1))).scrollIntoView()
	);
	return true;
};

/** The browser's own key stops at the first line that has text. */
const toStart: Command = (state, dispatch) => {
	dispatch?.(state.tr.setSelection(Selection.atStart(state.doc)).scrollIntoView());
	return true;
};

function emptyBlockAt(state: EditorState): number | null {
	const { $from, empty } = state.selection;
	const block = $from.parent;
	if (!empty || !block.isTextblock || block.content.size > 0) return null;
	if (block.type === schema.nodes.title || block.type === schema.nodes.point) return null;
	return $from.before();
}

/** Enter on a block that has fields opens them. */
function opening(targets: KeyTargets): Command {
	return ({ selection }) =>
		selection instanceof NodeSelection && targets.forms.change(selection.from);
}

function moving(direction: 'up' | 'down'): Command {
	return (state, dispatch) => {
		const { $from, from } = state.selection;
		const moved = moveBlock(state.tr, $from.depth > 0 ? $from.before(1) : from, direction);
		if (moved) dispatch?.(closeHistory(moved));
		return true;
	};
}

export function manuscriptKeys(targets: KeyTargets): Plugin[] {
	return [
		new Plugin({
			props: {
				handleKeyDown(view, event) {
					if (event.ctrlKey || event.metaKey || event.altKey || event.isComposing) return false;
					// Typing on a selected control or chart goes on after it, and doesn't replace it.
					const { selection } = view.state;
					if (
						selection instanceof NodeSelection &&
						selection.node.isBlock &&
						event.key.length === 1
					) {
						createParagraphNear(view.state, view.dispatch);
					}
					if (event.key === '=') {
						if (!view.editable) return false;
						const number = focusedNumber(view.state);
						if (!number && !view.state.selection.empty) {
							// The sign must not take tied words away with what else is selected.
							const { doc, selection } = view.state;
							const hasTied = doc.rangeHasMark(selection.from, selection.to, schema.marks.claim);
							return targets.tieSelection() || hasTied;
						}
						if (!number || number.control !== null) return false;
						targets.openTie(number);
						return true;
					}
					if (event.key === '/') {
						const block = emptyBlockAt(view.state);
						if (block === null || !view.editable) return false;
						targets.inserting = block;
						return true;
					}
					return false;
				}
			}
		}),
		keymap({
			'Mod-Home': toStart,
			'Alt-ArrowUp': moving('up'),
			'Alt-ArrowDown': moving('down'),
			'Alt-Enter': () => targets.lint.takeHere(),
			'Mod-z': undo,
			'Mod-y': redo,
			'Shift-Mod-z': redo,
			'Mod-i': toggleMark(schema.marks.em),
			'Shift-Mod-b': toggleMark(schema.marks.strong),
			'Mod-b': () => {
				targets.cycleBench();
				return true;
			},
			'Mod-.': () => {
				targets.goToNextUnweighed();
				return true;
			},
			Enter: chainCommands(
				opening(targets),
				nextLine,
				newlineInCode,
				createParagraphNear,
				liftEmptyBlock,
				splitBlock
			)
		}),
		keymap(baseKeymap)
	];
}
