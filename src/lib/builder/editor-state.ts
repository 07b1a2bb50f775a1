/** The editor's first state: the text, its keys, and what it mends and draws by itself. */
import { history } from 'prosemirror-history';
import type { Node } from 'prosemirror-model';
import { EditorState, TextSelection } from 'prosemirror-state';
import { manuscriptKeys, type KeyTargets } from './keys.ts';
import { mend, upkeep } from './upkeep.ts';
import { weighingPlugin, type MarkTargets } from './weighing.ts';

export function createState(doc: Node, targets: KeyTargets & MarkTargets): EditorState {
	const state = EditorState.create({
		doc,
		plugins: [
			...manuscriptKeys(targets),
			history({ depth: 1000 }),
			upkeep(),
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
