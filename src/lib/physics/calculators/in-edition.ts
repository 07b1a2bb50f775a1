/** A calculator with the constants of another edition: the one that a piece pins. */
import type { Calculator, Source } from '../calculator.ts';
import { constants, type ConstantsEdition } from '../constants/index.ts';

const made = new WeakMap<Calculator, Map<string, Calculator>>();

/**
 * The same calculator, computing with the constants of an edition, and naming it among its sources. Id, revision and
 * everything declared stay. The calculator itself where the edition is the one in use, or changes nothing for it; the same
 * object each time it is asked for.
 */
export function inEdition(calculator: Calculator, edition: ConstantsEdition): Calculator {
	if (!calculator.followsEdition || edition.name === constants.name) return calculator;
	let own = made.get(calculator);
	if (!own) made.set(calculator, (own = new Map<string, Calculator>()));
	let following = own.get(edition.name);
	if (!following) {
		following = Object.freeze({
			...calculator,
			sources: calculator.sources?.map((source) => sourceIn(edition, source)),
			compute: (inputs: Parameters<Calculator['compute']>[0]) => calculator.compute(inputs, edition)
		});
		own.set(edition.name, following);
	}
	return following;
}

function sourceIn({ adjustment }: ConstantsEdition, source: Source): Source {
	return source.doi === constants.adjustment.doi ? { ...source, ...adjustment } : source;
}
