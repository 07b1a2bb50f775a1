/** Where an input is good, where it warns and where it refuses, as shares of a drawn bar. */
import type { NumberInput } from '$lib/physics/calculator.ts';
import { printDigits } from '$lib/widget/print-reading.ts';

export interface DomainBar {
	good: { from: number; to: number };
	/** Where the first value stands. */
	at: number;
	labels: { at: number; text: string }[];
	/** How the bar is measured. */
	scale: 'even' | 'log';
}

/** Spans wider than this many times are drawn by their logarithm, where all is positive. */
const WIDE = 1000;
/** Labels nearer than this share of the bar would run into each other. */
const APART = 0.14;

export function domainBar(spec: NumberInput): DomainBar {
	const { place: scale, kind } = scaleOf(spec);
	const good = spec.good ?? spec;
	const ends = {
		from: scale(Math.max(spec.min, good.min)),
		to: scale(Math.min(spec.max, good.max))
	};
	const labels = [
		{ at: 0, text: label(spec.min) },
		{ at: 1, text: label(spec.max) }
	];
	for (const [at, value] of [
		[ends.from, good.min],
		[ends.to, good.max]
	] as const) {
		if (labels.every((other) => Math.abs(other.at - at) >= APART))
			labels.push({ at, text: label(value) });
	}
	return { good: ends, at: scale(spec.initial), labels, scale: kind };
}

function scaleOf({ min, max, log }: NumberInput): {
	place: (value: number) => number;
	kind: DomainBar['scale'];
} {
	const clamp = (share: number) => Math.min(1, Math.max(0, share));
	if (min > 0 && (log || max / min > WIDE)) {
		const [low, high] = [Math.log(min), Math.log(max)];
		return {
			place: (value) => clamp((Math.log(Math.max(value, min)) - low) / (high - low)),
			kind: 'log'
		};
	}
	if (min > -10 && max > WIDE) {
		// From around nought over many decades: even near nought, then by the logarithm.
		const bend = (value: number) => Math.log1p(Math.max(0, value - min));
		return { place: (value) => clamp(bend(value) / bend(max)), kind: 'log' };
	}
	return { place: (value) => clamp((value - min) / (max - min)), kind: 'even' };
}

const label = (value: number) => printDigits(value, 4, true);
