/** Blocks and numbers that the widget itself draws, standing in the manuscript. */
import type { Node } from 'prosemirror-model';
import type { NodeView, ViewMutationRecord } from 'prosemirror-view';
import { mount, unmount } from 'svelte';
import type { LiveWidget } from '../renderer/live-widget.svelte.ts';
import type { Control } from '../widget/document.ts';
import type { Words } from '../widget/places.ts';
import { atomName } from './atom-name.ts';
import BlockHost from './BlockHost.svelte';
import { schema } from './schema.ts';

/** What the views need of the manuscript they stand in. */
export interface ViewHome {
	widget: LiveWidget;
	words: Words;
	wiring: { controls: readonly Control[] };
}

/** A node as a component sees it: replaced when the text changes. */
export class ShownNode {
	current: Node;
	constructor(node: Node) {
		this.current = $state.raw(node);
	}
}

/** A control or a chart at its true width, working. */
export class BlockView implements NodeView {
	readonly dom: HTMLElement;
	#shown: ShownNode;
	#component: Record<string, unknown>;
	#home: ViewHome;

	constructor(node: Node, home: ViewHome) {
		this.#home = home;
		this.#shown = new ShownNode(node);
		this.dom = document.createElement('div');
		this.dom.dataset.kind = node.type.name;
		this.dom.contentEditable = 'false';
		this.dom.setAttribute('role', 'group');
		this.#name(node);
		this.#component = mount(BlockHost, {
			target: this.dom,
			props: { shown: this.#shown, widget: home.widget }
		});
	}

	update(node: Node): boolean {
		if (node.type !== this.#shown.current.type) return false;
		this.#shown.current = node;
		this.#name(node);
		return true;
	}

	#name(node: Node): void {
		this.dom.setAttribute('aria-label', atomName(node, this.#home.wiring.controls));
	}

	selectNode(): void {
		this.dom.classList.add('selected');
	}

	deselectNode(): void {
		this.dom.classList.remove('selected');
	}

	/** The reader's own controls keep their keys and clicks; the editor takes the rest. */
	stopEvent(event: Event): boolean {
		return (
			event.target instanceof Element &&
			event.target.closest('input, button, select, a, summary') !== null
		);
	}

	ignoreMutation(): boolean {
		return true;
	}

	destroy(): void {
		void unmount(this.#component);
	}
}

/** A number that the widget prints; it follows the controls. */
export class InlineView implements NodeView {
	readonly dom: HTMLElement;
	#shown: ShownNode;
	#stop: () => void;

	constructor(node: Node, home: ViewHome) {
		this.#shown = new ShownNode(node);
		this.dom = document.createElement('span');
		this.dom.className = 'printed';
		this.dom.contentEditable = 'false';
		this.#stop = $effect.root(() => {
			$effect.pre(() => {
				const { type, attrs } = this.#shown.current;
				this.dom.textContent = home.words(
					type === schema.nodes.live
						? { kind: 'live', claim: attrs.claim as string }
						: { kind: 'setting', control: attrs.control as string }
				);
			});
		});
	}

	update(node: Node): boolean {
		if (node.type !== this.#shown.current.type) return false;
		this.#shown.current = node;
		return true;
	}

	ignoreMutation(_mutation: ViewMutationRecord): boolean {
		return true;
	}

	destroy(): void {
		this.#stop();
	}
}
