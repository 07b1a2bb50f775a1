/** The arithmetic of “guess first”: the arm that a guess is set on, and how far it lies from the reading. */
import type { LogSlider, Slider } from '../../widget/control.ts';
import type { GuessBlock } from '../../widget/document.ts';
import type { Language } from '../../widget/language.ts';
import { printNumeral, roundToFigures } from '../../widget/stated.ts';

/** Steps of a guess: coarse enough to feel like one. */
const STEPS = 40;
const PER_DECADE = 20;
/** Within a tenth a guess is close. */
const CLOSE = 0.1;

export function guessControl(block: GuessBlock, label: string): Slider | LogSlider {
	const { min, max, unit, id } = block;
	const middle = block.scale === 'log' ? Math.sqrt(min * max) : (min + max) / 2;
	const shared = { id, label, unit, min, max, initial: middle };
	return block.scale === 'log' && min > 0
		? { ...shared, kind: 'log-slider', perDecade: PER_DECADE }
		: { ...shared, kind: 'slider', step: Number(((max - min) / STEPS).toPrecision(3)) };
}

export interface Apart {
	close: boolean;
	/** “about” how many times, as a reader hears it: two figures. */
	times: string;
	/** The guess is the greater of the two. */
	isMore: boolean;
}

/** Null where a factor says nothing: on both sides of nought. */
export function farApart(guess: number, value: number, language: Language): Apart | null {
	if (!(guess * value > 0)) return null;
	const ratio = guess / value;
	const factor = Math.max(ratio, 1 / ratio);
	return {
		close: factor - 1 <= CLOSE,
		times: printNumeral(roundToFigures(factor, 2), language),
		isMore: ratio > 1
	};
}
