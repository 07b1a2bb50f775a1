/** What a block without words of its own is called, for those who hear it. */
import type { Node } from 'prosemirror-model';
import type { Control } from '../widget/document.ts';
import { BLOCK_WORDS, type BlockKind } from './schema.ts';

export function atomName(node: Node, controls: readonly Control[]): string {
	const word = BLOCK_WORDS[node.type.name as BlockKind] ?? node.type.name;
	const fields = (node.attrs.fields ?? {}) as {
		title?: string;
		question?: string;
		label?: string;
		caption?: string;
		alt?: string;
	};
	const control = controls.find(({ id }) => id === node.attrs.control);
	const name =
		control?.label ||
		fields.title ||
		fields.question ||
		fields.label ||
		fields.caption ||
		fields.alt ||
		'';
	return name ? `${word}: ${name}` : word;
}
