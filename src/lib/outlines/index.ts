/** The outlines a piece can be started from, in the order of the calculators’ shelf. */
import { glow, planetsShadow, roundTheSun, slowClock } from './bodies.ts';
import { dipInTheNoise, lightFromFar, speedingAway, stretchedLine } from './light.ts';
import type { Outline } from './outline.ts';
import {
	energyLedger,
	longThread,
	throwAndRange,
	twoMeasurements,
	whatIsLeft
} from './workshop.ts';

export type { Outline } from './outline.ts';

export const outlines: readonly Outline[] = [
	stretchedLine,
	speedingAway,
	lightFromFar,
	dipInTheNoise,
	glow,
	planetsShadow,
	roundTheSun,
	slowClock,
	throwAndRange,
	energyLedger,
	longThread,
	whatIsLeft,
	twoMeasurements
];
