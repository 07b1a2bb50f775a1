/** How the bench stands: how high, and what is open on it. */
import { MediaQuery } from 'svelte/reactivity';

export type BenchHeight = 'closed' | 'half' | 'full';

/** A control that is about to be made of a setting, and where in the copy it will stand. */
export interface ControlToMake {
	step: string;
	key: string;
	pos: number;
}

export class BenchDrawer {
	bench = $state<BenchHeight>('closed');
	/** The search for a calculator is open on the bench. */
	searching = $state(false);
	/** The formula whose form is open on the bench; with `id: null` a new one. */
	formulating = $state.raw<{ id: string | null } | null>(null);
	/** A setting a control is to be made of, asked for in the copy. */
	making = $state.raw<ControlToMake | null>(null);

	/** On a phone the copy can be edited; the bench is for looking at. */
	readonly #phone = new MediaQuery('width < 640px', false);
	#heightBefore: BenchHeight = 'half';

	get isPhone(): boolean {
		return this.#phone.current;
	}

	openSearch(): void {
		this.#open();
		this.searching = true;
	}

	/** Opens the form of a control on the setting it will move. */
	makeControl(wanted: ControlToMake): void {
		this.#open();
		this.making = wanted;
	}

	#open(): void {
		if (this.bench === 'closed') this.bench = 'half';
		this.formulating = null;
		this.searching = false;
		this.making = null;
	}

	/** Its form takes the whole bench, which goes back to the height it had. */
	openFormula(id: string | null): void {
		if (!this.formulating) this.#heightBefore = this.bench;
		this.bench = 'full';
		this.searching = false;
		this.formulating = { id };
	}

	closeFormula(): void {
		this.formulating = null;
		this.bench = this.#heightBefore === 'full' ? 'full' : 'half';
	}

	cycleBench(): void {
		this.bench = this.bench === 'closed' ? 'half' : 'closed';
	}
}
