/**
 * The galley's end of the line to its strips. They are loaded one after the other, so that the page stays usable, and
 * each is measured once it hangs. What is moved in one is moved in all.
 */
import type { LiveWidget } from '$lib/renderer/live-widget.svelte.ts';
import type { ControlValues } from '$lib/widget/document.ts';
import { newsIn, settingsText, type News, type Order } from './messages.ts';
import type { SpokenLine, StripReport } from './report.ts';
import { STRIPS, type StripKind } from './strips.ts';

export type Phase = 'waiting' | 'loading' | 'measuring' | 'measured' | 'failed';

/** How long a strip may take until it is passed over, in milliseconds. */
const PATIENCE = 30_000;

export class Strip {
	phase = $state<Phase>('waiting');
	/** Of the frame as it stands, in CSS pixels. */
	heightPx = $state(0);
	report = $state.raw<StripReport | null>(null);
	/** Why it failed. */
	says = $state('');
	/** How often it was loaded. */
	attempt = $state(0);
	window: Window | null = null;
	known = '';
	timer: ReturnType<typeof setTimeout> | undefined;

	constructor(readonly kind: StripKind) {}
}

type Showing = Omit<Extract<Order, { galley: 'show' }>, 'galley' | 'kind' | 'values'>;

export class Galley {
	readonly strips = STRIPS.map((kind) => new Strip(kind));
	spoken = $state.raw<readonly SpokenLine[]>([]);
	#showing: () => Showing;
	#widget: LiveWidget;

	/** `widget` holds the settings that all strips share. */
	constructor(widget: LiveWidget, showing: () => Showing) {
		this.#widget = widget;
		this.#showing = showing;
	}

	/** Every strip was measured, or passed over. */
	get done(): boolean {
		return this.strips.every(({ phase }) => phase === 'measured' || phase === 'failed');
	}

	get measured(): { kind: StripKind; report: StripReport }[] {
		return this.strips.flatMap(({ kind, report }) => (report ? [{ kind, report }] : []));
	}

	listen(): () => void {
		const take = (event: MessageEvent) => {
			for (const strip of this.strips) {
				const news = newsIn(event, strip.window);
				if (news) this.#hear(strip, news);
			}
		};
		window.addEventListener('message', take);
		this.#loadNext();
		return () => {
			window.removeEventListener('message', take);
			for (const { timer } of this.strips) clearTimeout(timer);
		};
	}

	/** Loads a strip that failed once more. */
	again(strip: Strip): void {
		strip.says = '';
		this.#load(strip);
	}

	/** Brings every strip to these settings. */
	set(values: ControlValues): void {
		const text = settingsText(values);
		for (const strip of this.strips) {
			if (strip.known === text || strip.phase === 'waiting' || strip.known === '') continue;
			strip.known = text;
			tell(strip, { galley: 'set', values });
		}
	}

	#hear(strip: Strip, news: News): void {
		switch (news.galley) {
			case 'open': {
				const values = $state.snapshot(this.#widget.values);
				strip.known = settingsText(values);
				tell(strip, { galley: 'show', ...this.#showing(), kind: strip.kind, values });
				return;
			}
			case 'shown':
				strip.heightPx = news.heightPx;
				strip.phase = 'measuring';
				tell(strip, { galley: 'measure' });
				return;
			case 'height':
				strip.heightPx = news.heightPx;
				return;
			case 'moved':
				strip.known = settingsText(news.values);
				this.#widget.setAll(news.values);
				return;
			case 'spoken':
				// All strips say the same; the first one's words are kept.
				if (strip === this.strips[0]) this.spoken = news.lines;
				return;
			case 'measured':
				strip.report = news.report;
				this.#leave(strip, 'measured');
				return;
			case 'failed':
				strip.says = news.says;
				this.#leave(strip, 'failed');
		}
	}

	#load(strip: Strip): void {
		strip.phase = 'loading';
		strip.attempt += 1;
		strip.timer = setTimeout(() => {
			strip.says = 'It gave no answer.';
			this.#leave(strip, 'failed');
		}, PATIENCE);
	}

	#leave(strip: Strip, phase: Phase): void {
		clearTimeout(strip.timer);
		strip.phase = phase;
		this.#loadNext();
	}

	#loadNext(): void {
		if (this.strips.some(({ phase }) => phase === 'loading' || phase === 'measuring')) return;
		const next = this.strips.find(({ phase }) => phase === 'waiting');
		if (next) this.#load(next);
	}
}

function tell(strip: Strip, order: Order): void {
	strip.window?.postMessage(order, window.location.origin);
}
