/** What the units are called in running text. */
import { units } from '../physics/units/units.ts';
import { printWordsOf } from '../widget/languages/print-words.ts';
import type { Lexicon } from './lexicon/lexicon.ts';

/** Without their scale: “million years” is a number of years. */
const SCALED = /^[kMG](?:yr|ly)$/;

/** Every name a unit has in a language, with “per” said in the language's other ways, and the unit's symbol. */
export function* unitNames(lexicon: Lexicon): Iterable<readonly [name: string, symbol: string]> {
	const { units: printed } = printWordsOf(lexicon.language);
	const [per = '', ...others] = lexicon.per;
	for (const { symbol, names } of units) {
		if (symbol === '') continue;
		const own = lexicon.language === 'en' ? names : (printed(symbol) ?? []);
		const given = [...(SCALED.test(symbol) ? [] : own), ...(lexicon.unitNames[symbol] ?? [])];
		for (const name of given) {
			if (!/^\p{L}/u.test(name) || lexicon.notUnits.includes(name)) continue;
			yield [name, symbol];
			for (const other of others) {
				if (!name.includes(` ${per} `) || /^\p{L}+ per (?:cent|million)/u.test(name)) continue;
				yield [name.replaceAll(` ${per} `, ` ${other} `), symbol];
			}
		}
	}
}

export function unitSymbols({ notUnits }: Lexicon): string[] {
	return units
		.flatMap(({ symbol, symbols }) => [symbol, ...symbols])
		.filter((symbol) => symbol && !notUnits.includes(symbol) && !/^(?:×|times)$/.test(symbol));
}
