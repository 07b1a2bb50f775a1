/** What makes an output uncertain although its inputs are exact, and why that may not be known. */
import type { Calculator, RawInputs, Reading } from '../calculator.ts';
import { resolveCosmology } from '../calculators/cosmology/parameters.ts';
import { constants, type CosmologySetName } from '../constants/index.ts';
import type { Spread } from './spread.ts';

export type OwnUncertainty =
	| { kind: 'exact' }
	/** Constants that were measured, inside the calculator. */
	| { kind: 'constants'; u: number }
	/** The fit of a parameter set; `published` where the set's authors state this very reading's uncertainty. */
	| { kind: 'set'; set: CosmologySetName; published: number | null }
	/** A universe whose parameters were given one by one. */
	| { kind: 'by-hand' }
	| { kind: 'unknown'; reason: string };

/** `reading` is what the calculator gave for these very inputs, taken as exact. */
export function ownUncertaintyOf(
	calculator: Calculator,
	inputs: RawInputs,
	key: string,
	{ uncertainty }: Pick<Reading, 'uncertainty'>
): OwnUncertainty {
	if (uncertainty === 'exact') return { kind: 'exact' };
	if (!calculator.restsOnCosmology?.includes(key)) {
		return typeof uncertainty === 'number'
			? { kind: 'constants', u: uncertainty }
			: { kind: 'unknown', reason: 'How well the model itself holds isn’t known.' };
	}
	const set = cosmologySetOf(calculator, inputs);
	if (set === null) return { kind: 'by-hand' };
	return { kind: 'set', set, published: typeof uncertainty === 'number' ? uncertainty : null };
}

export const BY_HAND = 'The parameters of this universe were set by hand, with no uncertainty.';

/** The key of a calculator's cosmology, where it takes one. */
export function cosmologyKeyOf(calculator: Calculator): string | undefined {
	return Object.keys(calculator.inputs).find((key) => calculator.inputs[key]?.kind === 'cosmology');
}

/** The published set that these inputs use untouched. */
export function cosmologySetOf(calculator: Calculator, inputs: RawInputs): CosmologySetName | null {
	const key = cosmologyKeyOf(calculator);
	const resolved = key === undefined ? null : resolveCosmology(inputs[key], key);
	return resolved?.ok ? resolved.value.set : null;
}

/** Parameters of a set as uncertain quantities, named by their keys, tied to each other as in the fit. */
export function spreadOfSet(
	name: CosmologySetName
): { ok: true; spread: Spread } | { ok: false; reason: string } {
	const set = constants.cosmologies[name];
	if (!set.published) {
		return { ok: false, reason: `“${set.label}” is a convention, not a measurement.` };
	}
	const { uncertainties, correlation } = set.published;
	if (!correlation) {
		return {
			ok: false,
			reason: `How H₀ and Ωₘ of ${set.label} move together isn’t held here, and without that a spread would be wrong.`
		};
	}
	return {
		ok: true,
		spread: {
			quantities: Object.entries(uncertainties).map(([key, u]) => ({
				name: key,
				value: set[key as keyof typeof uncertainties],
				u
			})),
			correlations: [['H0', 'Om0', correlation.H0WithOm0]]
		}
	};
}

export function publishedNote(name: CosmologySetName): string {
	return `As published with ${constants.cosmologies[name].label}.`;
}

export function carriedNote(name: CosmologySetName): string {
	const { label, published } = constants.cosmologies[name];
	const tied = published?.correlation ? ` (correlation ${published.correlation.source})` : '';
	return `Carried from the parameters of ${label}, which move together as in the fit${tied}.`;
}

/** Universes are costly to open, so a calculator that opens one is drawn fewer times. */
const DRAWS = 10_000;
const DRAWS_OF_UNIVERSES = 1000;

export function drawsFor(calculators: readonly Calculator[]): number {
	return calculators.some((one) => cosmologyKeyOf(one) !== undefined) ? DRAWS_OF_UNIVERSES : DRAWS;
}
