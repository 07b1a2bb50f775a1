/**
 * The component of each kind of block and control that few pieces have. A reader's frame loads only those that its piece
 * shows: its build takes `block-views-later.ts` in place of this file (`embed/vite.config.ts`), which has the same exports.
 */
import Choice from '../controls/Choice.svelte';
import NumberField from '../controls/NumberField.svelte';
import Stepper from '../controls/Stepper.svelte';
import Toggle from '../controls/Toggle.svelte';
import type { WidgetDocument } from '../../widget/document.ts';
import EquationBlock from './EquationBlock.svelte';
import GuessBlock from './GuessBlock.svelte';
import PictureBlock from './PictureBlock.svelte';
import PresetsBlock from './PresetsBlock.svelte';
import SourcesBlock from './SourcesBlock.svelte';
import TableBlock from './TableBlock.svelte';
import type { BlockViews, ControlViews } from './view-kinds.ts';

const BLOCKS: BlockViews = {
	table: TableBlock,
	equation: EquationBlock,
	picture: PictureBlock,
	guess: GuessBlock,
	presets: PresetsBlock,
	sources: SourcesBlock
};
const CONTROLS: ControlViews = {
	stepper: Stepper,
	number: NumberField,
	choice: Choice,
	toggle: Toggle
};

export function blockView<K extends keyof BlockViews>(kind: K): BlockViews[K] {
	return BLOCKS[kind];
}

export function controlView<K extends keyof ControlViews>(kind: K): ControlViews[K] {
	return CONTROLS[kind];
}

/** Afterwards every block of the document can be drawn. Here they all can be from the start. */
export async function loadBlockViews(
	_document: Pick<WidgetDocument, 'blocks' | 'controls'>
): Promise<void> {}
