/** Widget document ⇄ manuscript. Loss-free both ways for every claim that still stands in the copy. */
import type { Fragment, Mark, Node } from 'prosemirror-model';
import {
	DOCUMENT_VERSION,
	isTextBlock,
	type Block,
	type Claim,
	type Control,
	type Inline,
	type Step,
	type WidgetDocument
} from '../widget/document.ts';
import { newId } from './ids.ts';
import {
	claimOf,
	isTextBlockKind,
	schema,
	wiringOf,
	type FieldBlock,
	type FieldBlockKind,
	type FieldsOf
} from './schema.ts';

export function toManuscript(document: WidgetDocument): Node {
	const { language, constants, formulas, steps, controls, claims } = document;
	const blocks = document.blocks.map(blockNode);
	return schema.node('doc', { language, constants, formulas, steps, controls, claims }, [
		schema.node('title', null, words(document.title)),
		schema.node('point', null, words(document.point)),
		...(blocks.length > 0 ? blocks : [schema.node('paragraph', { id: newId('block') })])
	]);
}

/** A stored document that can stand in the editor, whether or not it hangs together; null where it hasn't the shape. */
export function readableDocument(stored: unknown): WidgetDocument | null {
	if (!hasShape(stored)) return null;
	try {
		toManuscript(stored).check();
		return stored;
	} catch {
		// A block that the schema doesn't know: its words are for taking along, not for the sheet.
		return null;
	}
}

/** What the bench and the editor can't do without; all the rest is the server's to judge. */
function hasShape(stored: unknown): stored is WidgetDocument {
	if (!isRecord(stored)) return false;
	const { constants, title, point } = stored;
	if ([constants, title, point].some((words) => typeof words !== 'string')) return false;
	return (
		areIdentified(stored.blocks) &&
		areIdentified(stored.controls) &&
		areIdentified(stored.formulas) &&
		areIdentified(stored.claims, (claim) => typeof claim.form === 'string') &&
		areIdentified(
			stored.steps,
			({ calculator, settings }) =>
				typeof calculator === 'string' &&
				isRecord(settings) &&
				Object.values(settings).every(isRecord)
		)
	);
}

function isRecord(value: unknown): value is Record<string, unknown> {
	return typeof value === 'object' && value !== null;
}

function areIdentified(
	list: unknown,
	isWhole: (member: Record<string, unknown>) => boolean = () => true
): boolean {
	return (
		Array.isArray(list) &&
		list.every((member) => isRecord(member) && typeof member.id === 'string' && isWhole(member))
	);
}

function words(text: string): Node[] {
	return text ? [schema.text(text)] : [];
}

function blockNode(block: Block): Node {
	if (isTextBlock(block)) {
		return schema.node(block.kind, { id: block.id }, block.content.map(inlineNode));
	}
	if (block.kind === 'control') {
		return schema.node('control', { id: block.id, control: block.control });
	}
	const { id, kind, ...fields } = block;
	return schema.node(kind, { id, fields });
}

function inlineNode(inline: Inline): Node {
	switch (inline.kind) {
		case 'text':
			return schema.text(
				inline.text,
				inline.marks?.map((name) => schema.mark(name))
			);
		case 'claim':
			return schema.text(inline.text, [schema.mark('claim', { id: inline.claim })]);
		case 'live':
			return schema.node('live', { claim: inline.claim });
		case 'setting':
			return schema.node('setting', { control: inline.control });
	}
}

/** Claims whose words have been deleted stay in the editor for undo and for pasting back, but not in the document. */
export function toDocument(doc: Node): WidgetDocument {
	const { language, constants, formulas, steps, controls, claims } = wiringOf(doc);
	const standing = claimsInCopy(doc);
	return {
		version: DOCUMENT_VERSION,
		language,
		constants,
		title: doc.child(0).textContent,
		point: doc.child(1).textContent,
		formulas: [...formulas],
		steps: [...steps] as Step[],
		controls: [...controls] as Control[],
		blocks: blockNodes(doc).map(blockOf),
		claims: claims.filter(({ id }) => standing.has(id)) as Claim[]
	};
}

export function blockNodes(doc: Node): Node[] {
	return doc.children.slice(2);
}

/** Ids of claims that the copy shows, stated or live. */
export function claimsInCopy(doc: Node): Set<string> {
	const found = new Set<string>();
	doc.descendants((node) => {
		const id = node.type === schema.nodes.live ? (node.attrs.claim as string) : claimOf(node);
		if (id) found.add(id);
	});
	return found;
}

const blockCache = new WeakMap<Node, Block>();

/** Nodes never change, so an untouched block is converted once. */
export function blockOf(node: Node): Block {
	const known = blockCache.get(node);
	if (known) return known;
	const block = convertBlock(node);
	blockCache.set(node, block);
	return block;
}

function convertBlock(node: Node): Block {
	const id = node.attrs.id as string;
	const kind = node.type.name;
	if (isTextBlockKind(kind)) return { id, kind, content: inlinesOf(node.content) };
	if (kind === 'control') return { id, kind, control: node.attrs.control as string };
	return { id, kind, ...(node.attrs.fields as FieldsOf<FieldBlockKind>) } as FieldBlock;
}

function inlinesOf(content: Fragment): Inline[] {
	const inlines: Inline[] = [];
	content.forEach((node) => inlines.push(inlineOf(node)));
	return inlines;
}

function inlineOf(node: Node): Inline {
	if (node.type === schema.nodes.live) return { kind: 'live', claim: node.attrs.claim as string };
	if (node.type === schema.nodes.setting) {
		return { kind: 'setting', control: node.attrs.control as string };
	}
	const claim = claimOf(node);
	const text = node.text ?? '';
	if (claim !== null) return { kind: 'claim', claim, text };
	const marks = node.marks.map((mark: Mark) => mark.type.name as 'em' | 'strong');
	return marks.length > 0 ? { kind: 'text', text, marks } : { kind: 'text', text };
}
