/** The editor's first state: the text, its keys, and what it mends and draws by itself. */
import { history } from 'prosemirror-history';
import type { Node } from 'prosemirror-model';
import { EditorState, TextSelection } from 'prosemirror-state';
import { headLimits, type HeadLine } from './head-limits.ts';
import { manuscriptKeys, type KeyTargets } from './keys.ts';
import { keepTheirs } from './keep-theirs.ts';
import { mend, upkeep } from './upkeep.ts';
import { weighingPlugin, type MarkTargets } from './weighing.ts';

/** Told of a title or a point that would have grown too long. */
export interface HeadTargets {
	heldBack: HeadLine | null;
}

export function createState(
	doc: Node,
	targets: KeyTargets & MarkTargets & HeadTargets
): EditorState {
	const state = EditorState.create({
		doc,
		plugins: [
			...manuscriptKeys(targets),
			history({ depth: 1000 }),
			// Before the upkeep, which takes claims out of the copy that the wiring doesn't know.
			keepTheirs(),
			upkeep(),
			headLimits((line) => (targets.heldBack = line)),
			weighingPlugin(targets)
		]
	});
	const mended = state.apply(mend(state));
	return EditorState.create({
		doc: mended.doc,
		selection: TextSelection.atStart(mended.doc),
		plugins: state.plugins
	});
}
