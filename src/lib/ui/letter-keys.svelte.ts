/**
 * Keys that are one letter or digit. They act only outside fields, and a person can switch them off (WCAG 2.2,
 * success criterion 2.1.4), which this browser then remembers.
 */
import { createContext } from 'svelte';

const STORED_AS = 'steelyard-letter-keys';

export class LetterKeys {
	on = $state(true);

	/** Reads what this browser remembers; call it once the page is in a browser. */
	recall(): void {
		this.on = localStorage.getItem(STORED_AS) !== 'off';
	}

	switch(on: boolean): void {
		this.on = on;
		localStorage.setItem(STORED_AS, on ? 'on' : 'off');
	}

	/** The key a person meant as a letter key; null inside fields, with Ctrl, Alt or Meta, or when switched off. */
	meant(event: KeyboardEvent): string | null {
		if (!this.on || event.ctrlKey || event.altKey || event.metaKey || event.defaultPrevented)
			return null;
		const target = event.target;
		if (target instanceof HTMLElement) {
			if (target.isContentEditable || target.closest('input, textarea, select')) return null;
		}
		return event.key.length === 1 ? event.key.toLowerCase() : event.key;
	}
}

export const [getLetterKeys, setLetterKeys] = createContext<LetterKeys>();
