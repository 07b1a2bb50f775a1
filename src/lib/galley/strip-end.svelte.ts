/** The strip's end of the line to the galley: takes orders, draws, measures, and tells what its reader moved. */
import { withHouse } from '$lib/physics/house/with-house.ts';
import type { CalculatorSet } from '$lib/physics/calculator.ts';
import type { LiveWidget, OfficeParts } from '$lib/renderer/live-widget.svelte.ts';
import type { FrameRelease } from '$lib/renderer/release.ts';
import { officeParts } from '$lib/typeset/office-parts.svelte.ts';
import { benchSet } from '$lib/widget/bench-set.ts';
import type { ControlValues } from '$lib/widget/document.ts';
import { applyLook } from './looks.ts';
import { frameHeight, measureStrip } from './measure/strip.ts';
import { Parts } from './measure/parts.ts';
import { spokenLines } from './measure/spoken-lines.ts';
import { orderIn, settingsText, tellGalley, type Order } from './messages.ts';
import type { StripKind } from './strips.ts';

export interface Shown {
	release: FrameRelease;
	calculators: CalculatorSet;
	office: OfficeParts;
	kind: StripKind;
}

/** How long the settings must rest before the transcript is told anew, in milliseconds. */
const REST = 250;
/** How long fonts and equations are waited for, in milliseconds. */
const PATIENCE = 4000;

export class StripEnd {
	shown = $state.raw<Shown | null>(null);
	#widget: LiveWidget | null = null;
	#first: ControlValues = {};
	/** What both ends know the settings to be. */
	#known = '[]';
	#measuring = false;
	/** Settings that came while it measured. */
	#waiting: ControlValues | null = null;
	#speaking: ReturnType<typeof setTimeout> | undefined;

	/** Listens until the returned function is called. */
	listen(): () => void {
		const take = (event: MessageEvent) => {
			const order = orderIn(event);
			if (order) this.#obey(order);
		};
		window.addEventListener('message', take);
		tellGalley({ galley: 'open' });
		return () => {
			window.removeEventListener('message', take);
			clearTimeout(this.#speaking);
		};
	}

	/** The frame is drawn. */
	woken(widget: LiveWidget): void {
		this.#widget = widget;
		widget.setAll(this.#first);
		// Eight frames of one name on one page couldn't be told apart.
		const { kind, release } = this.#drawn().shown;
		this.#drawn().root.setAttribute('aria-label', `${release.document.title}, ${kind.name}`);
		this.#known = settingsText(widget.values);
		void this.#settle().then(() => {
			tellGalley({ galley: 'shown', heightPx: frameHeight(document) });
			this.#speak();
		}, this.#fail);
	}

	/** Tells the galley what the strip's own reader moved. */
	noteValues(values: ControlValues): void {
		if (this.#measuring || !this.#widget) return;
		const text = settingsText(values);
		if (text === this.#known) return;
		this.#known = text;
		tellGalley({ galley: 'moved', values });
		this.#speakSoon();
	}

	noteHeight(): void {
		if (!this.#measuring && this.#widget)
			tellGalley({ galley: 'height', heightPx: frameHeight(document) });
	}

	#obey(order: Order): void {
		if (order.galley === 'show') this.#show(order);
		else if (order.galley === 'set') this.#set(order.values);
		else void this.#measure().catch(this.#fail);
	}

	#show({ release, house, kind, values }: Extract<Order, { galley: 'show' }>): void {
		const calculators = benchSet(release.document, withHouse(house));
		applyLook(document, kind.look);
		document.documentElement.lang = release.document.language;
		this.#first = values;
		this.shown = { release, calculators, office: officeParts(() => calculators), kind };
	}

	#set(values: ControlValues): void {
		this.#known = settingsText(values);
		if (this.#measuring) this.#waiting = values;
		else {
			this.#widget?.setAll(values);
			this.#speakSoon();
		}
	}

	async #measure(): Promise<void> {
		const { root, widget, shown } = this.#drawn();
		const before = $state.snapshot(widget.values);
		this.#measuring = true;
		try {
			const report = await measureStrip(root, widget, shown.kind);
			tellGalley({ galley: 'measured', report });
		} finally {
			widget.setAll(this.#waiting ?? before);
			this.#waiting = null;
			this.#measuring = false;
		}
	}

	#drawn(): { root: HTMLElement; widget: LiveWidget; shown: Shown } {
		const root = document.querySelector<HTMLElement>('.sy-frame');
		const { shown } = this;
		const widget = this.#widget;
		if (!root || !widget || !shown) throw new Error('Nothing is drawn in this strip.');
		return { root, widget, shown };
	}

	/** Faces and equations come late, and both change heights. */
	async #settle(): Promise<void> {
		const until = performance.now() + PATIENCE;
		await document.fonts.ready;
		const unset = () => document.querySelector('.sy-equation:not(:has(.sy-equation-line))');
		while (unset() && performance.now() < until) await pause(50);
		await pause(0);
	}

	#speakSoon(): void {
		clearTimeout(this.#speaking);
		this.#speaking = setTimeout(() => this.#speak(), REST);
	}

	#speak(): void {
		if (this.#measuring) return this.#speakSoon();
		const { root, widget } = this.#drawn();
		const lines = spokenLines(root, new Parts(root, widget.document));
		tellGalley({ galley: 'spoken', lines });
	}

	#fail = (error: unknown): void => {
		tellGalley({ galley: 'failed', says: error instanceof Error ? error.message : String(error) });
	};
}

function pause(ms: number): Promise<void> {
	return new Promise((resolve) => setTimeout(resolve, ms));
}
