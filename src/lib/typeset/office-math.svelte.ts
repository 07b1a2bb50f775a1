/**
 * Equations for the office's own view of a widget. The typesetter is large and few pieces show an equation, so it comes
 * with the first one that is asked for; until then there are only the words.
 */
import { SvelteMap } from 'svelte/reactivity';
import type { CalculatorSet } from '../physics/calculator.ts';
import { mathKeyParts, type SetMath } from '../renderer/math-node.ts';

export class OfficeMath {
	readonly #calculators: () => CalculatorSet;
	#set = new SvelteMap<string, SetMath>();
	#asked = new Set<string>();

	constructor(calculators: () => CalculatorSet) {
		this.#calculators = calculators;
	}

	/** The equation, once it is set. Asking for it sets it. */
	get(key: string): SetMath | undefined {
		if (!this.#asked.has(key) && typeof document !== 'undefined') {
			this.#asked.add(key);
			void this.#typeset(key);
		}
		return this.#set.get(key);
	}

	async #typeset(key: string): Promise<void> {
		const { calculator, equation } = mathKeyParts(key);
		const found = this.#calculators().get(calculator)?.equations[equation];
		if (!found) return;
		const { mathTree } = await import('./math-tree.ts');
		const tree = mathTree(found.tex);
		if (tree) this.#set.set(key, { tree, says: found.says });
	}
}
