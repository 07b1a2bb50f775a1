/** Blocks and controls whose components come with the pieces that have them, and what each component takes. */
import type { Component } from 'svelte';
import type { Block, Control } from '../../widget/document.ts';

type RareBlock = Extract<
	Block,
	{ kind: 'table' | 'equation' | 'picture' | 'guess' | 'presets' | 'sources' }
>;
type RareControl = Extract<Control, { kind: 'stepper' | 'number' | 'choice' | 'toggle' }>;

export type BlockViews = {
	[K in RareBlock['kind']]: Component<{
		block: Extract<RareBlock, { kind: K }>;
		headingLevel: number;
	}>;
};

export type ControlViews = {
	[K in RareControl['kind']]: Component<{
		control: Extract<RareControl, { kind: K }>;
		value: number;
		onchange: (value: number) => void;
	}>;
};
