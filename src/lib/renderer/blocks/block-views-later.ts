/** What `block-views.ts` gives, for a reader's frame: each kind comes as a script of its own, before the frame wakes. */
import type { WidgetDocument } from '../../widget/document.ts';
import type { BlockViews, ControlViews } from './view-kinds.ts';

type Loaders<Views> = { [K in keyof Views]: () => Promise<{ default: Views[K] }> };

const BLOCKS: Loaders<BlockViews> = {
	table: () => import('./TableBlock.svelte'),
	equation: () => import('./EquationBlock.svelte'),
	picture: () => import('./PictureBlock.svelte'),
	guess: () => import('./GuessBlock.svelte'),
	presets: () => import('./PresetsBlock.svelte'),
	sources: () => import('./SourcesBlock.svelte')
};
const CONTROLS: Loaders<ControlViews> = {
	stepper: () => import('../controls/Stepper.svelte'),
	number: () => import('../controls/NumberField.svelte'),
	choice: () => import('../controls/Choice.svelte'),
	toggle: () => import('../controls/Toggle.svelte')
};

const blocks: Partial<BlockViews> = {};
const controls: Partial<ControlViews> = {};

export function blockView<K extends keyof BlockViews>(kind: K): BlockViews[K] {
	return loaded<BlockViews[K]>(blocks[kind]);
}

export function controlView<K extends keyof ControlViews>(kind: K): ControlViews[K] {
	return loaded<ControlViews[K]>(controls[kind]);
}

function loaded<T>(view: T | undefined): T {
	if (!view) throw new Error('A block is drawn before loadBlockViews has loaded its kind.');
	return view;
}

/** Afterwards every block of the document can be drawn. */
export async function loadBlockViews(
	document: Pick<WidgetDocument, 'blocks' | 'controls'>
): Promise<void> {
	await Promise.all([
		...kindsIn(document.blocks, BLOCKS).map((kind) => load(blocks, BLOCKS, kind)),
		...kindsIn(document.controls, CONTROLS).map((kind) => load(controls, CONTROLS, kind))
	]);
}

function kindsIn<Views>(things: readonly { kind: string }[], loaders: Loaders<Views>) {
	const kinds = Object.keys(loaders) as (keyof Views)[];
	return kinds.filter((wanted) => things.some(({ kind }) => kind === wanted));
}

async function load<Views, K extends keyof Views>(
	views: Partial<Views>,
	loaders: Loaders<Views>,
	kind: K
): Promise<void> {
	views[kind] = (await loaders[kind]()).default;
}
