/** Blocks as they are laid out: a result stands beside its controls, a chart and the note on its limits fold together. */
import type { Block, TextBlock } from '../../widget/document.ts';

type ControlBlock = Extract<Block, { kind: 'control' }>;

export type BlockGroup =
	| { kind: 'pair'; key: string; results: TextBlock[]; controls: ControlBlock[] }
	| { kind: 'aside' | 'flow'; key: string; blocks: Block[] };

type GroupKind = BlockGroup['kind'];

const KIND: Record<Block['kind'], GroupKind> = {
	result: 'pair',
	control: 'pair',
	chart: 'aside',
	limits: 'aside',
	paragraph: 'flow',
	heading: 'flow',
	caution: 'flow',
	aside: 'aside',
	table: 'flow',
	equation: 'flow',
	picture: 'flow',
	guess: 'flow',
	presets: 'pair',
	sources: 'flow'
};

/** Keeps the order of the copy; neighbours of one kind share a group. */
export function groupBlocks(blocks: readonly Block[]): BlockGroup[] {
	const runs: { kind: GroupKind; blocks: Block[] }[] = [];
	for (const block of blocks) {
		const kind = KIND[block.kind];
		const last = runs.at(-1);
		if (last?.kind === kind) last.blocks.push(block);
		else runs.push({ kind, blocks: [block] });
	}
	return runs.map(({ kind, blocks: run }): BlockGroup => {
		const key = run[0]?.id ?? '';
		if (kind !== 'pair') return { kind, key, blocks: run };
		const results = run.filter((block): block is TextBlock => block.kind === 'result');
		const controls = run.filter((block) => block.kind === 'control');
		const isPair = results.length > 0 && controls.length > 0;
		return isPair ? { kind, key, results, controls } : { kind: 'flow', key, blocks: run };
	});
}
