/** One pattern for everything with digits that is no quantity in any language: dates, times, versions, list numbers. */
import type { Lexicon } from './lexicon/lexicon.ts';
import { GAP, oneOf, SPACE, WORD_END, WORD_START } from './text-patterns.ts';

/** In a lexicon's own patterns a space is any gap, _ a gap or none, and # a month. */
function written(skip: string, months: string): string {
	return skip.replace(/ /g, GAP).replace(/_/g, `${SPACE}*`).replace(/#/g, `(?:${months})`);
}

export function skipPattern(lexicon: Lexicon): RegExp {
	const months = oneOf(lexicon.months);
	const ordinals = oneOf(lexicon.ordinalEndings);
	const eras = oneOf(lexicon.eras);
	const clock = oneOf(lexicon.clock);
	return new RegExp(
		[
			`(?<!\\d)(?:${[
				'\\d{4}-\\d{2}-\\d{2}',
				'\\d{1,2}[\\/]\\d{1,2}[\\/]\\d{2,4}',
				'\\d{1,9}:\\d+(?::\\d+)?',
				'\\d{1,2}\\.\\d{1,2}\\.\\d{2,4}(?![\\d.])',
				'\\d{1,2}(?:\\.\\d{1,2}){2,}',
				...(lexicon.dayThenMonth
					? [`\\d{1,2}(?:${ordinals}|\\.)?${GAP}(?:${months})${WORD_END}(?:,?${GAP}\\d{4})?`]
					: []),
				`\\d{1,9}${GAP}(?:${eras})(?!\\p{L})`,
				`\\d{1,2}(?:[.:]\\d{2})?${SPACE}?(?:${clock})${WORD_END}`
			].join('|')})`,
			...lexicon.skips.map((skip) => `${WORD_START}(?:${written(skip, months)})`),
			`${WORD_START}(?:${months})${GAP}(?:\\d{1,2}(?:${ordinals})?(?!\\d)(?:,?${GAP}\\d{4})?|\\d{4}(?!\\d))`,
			`${WORD_START}(?:${eras})${GAP}\\d+`,
			`^\\d{1,2}[.)](?=${GAP}\\p{L})`,
			'\\[\\d+(?:[,–-]\\s?\\d+)*\\]'
		].join('|'),
		'gmu'
	);
}
