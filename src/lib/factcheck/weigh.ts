/** Weighing, whole: the verdict on a stated number, with wordings that would be level. */
import type { Language } from '../widget/language.ts';
import type { Stated } from '../widget/stated.ts';
import { decide, type Decision } from './decide.ts';
import { suggestWordings } from './suggestions.ts';
import type { Verdict } from './verdict.ts';
import type { WeighedReading } from './weighing.ts';

export type { WeighedReading } from './weighing.ts';

/**
 * Weighs what the copy says against what the calculator reads. A reading that is no finite number is unweighed; units of
 * different dimension tip; otherwise the rule of the hedge's family decides. `language` is the copy's: suggestions come
 * in it.
 * @throws {RangeError} only when nothing has loaded the language.
 */
export function weigh(stated: Stated, reading: WeighedReading, language: Language = 'en'): Verdict {
	const decision = decide(stated, reading);
	return {
		...decision,
		reason: longScaleReason(stated, reading, decision, language) ?? decision.reason,
		suggestions: suggestWordings(stated, reading, language)
	};
}

/** Words for 10¹² that read like an English billion. */
const LONG_SCALE: Partial<Record<Language, string>> = {
	de: 'A thousand times too large: “Billion” is 10¹² in German, and 10⁹ is “Milliarde”.',
	es: 'A thousand times too large: “billón” is 10¹² in Spanish, and 10⁹ is “mil millones”.'
};

function longScaleReason(
	stated: Stated,
	reading: WeighedReading,
	{ verdict }: Decision,
	language: Language
): string | undefined {
	const said = LONG_SCALE[language];
	if (!said || verdict !== 'tips' || stated.scale !== 1e12) return undefined;
	return decide({ ...stated, scale: 1e9 }, reading).verdict === 'tips' ? undefined : said;
}
