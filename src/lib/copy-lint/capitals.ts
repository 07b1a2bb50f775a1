/** Words in capitals: raised voices, and abbreviations that nobody has explained. Common practice. */
import type { Field, Finding } from './note.ts';

/** Known to any reader, or part of a unit, a scale or a time. */
const KNOWN = new Set(
	'AC ADN AM AD BC BCE CE CO DC DIN DNA DNS EE EU FM GMT GPS HI ID ISO LED OK ONU OVNI PDF SI TNT TV UE UK UKW UN US USA UTC UU UV WC'.split(
		' '
	)
);
const ROMAN = /^[IVXLCDM]+$/u;
/** Too short to be told from an abbreviation by length. */
const RAISED = new Set(
	'ALL ALWAYS ARE BIG EVER EVERY HUGE MUST NEVER NO NOT ONLY SO THE VERY YES IMMER NIE NICHT SEHR ALLE NUR NUNCA SIEMPRE MUY TODO NO'.split(
		' '
	)
);
const LONG_FOR_AN_ABBREVIATION = 7;

export function isAllCapitals(word: string): boolean {
	return word.length >= 2 && /^\p{Lu}+$/u.test(word);
}

/** From the first word in capitals to the last one beside it. */
export function capitalsFinding(text: string, from: number, word: string): Finding | null {
	const run =
		/^(?:\p{Lu}{2,}(?:[\s,]+(?=\p{Lu}{2,}(?!\p{L})))?)+/u.exec(text.slice(from))?.[0] ?? word;
	const words = run.trim().split(/[\s,]+/u);
	const raised =
		word.length >= LONG_FOR_AN_ABBREVIATION ||
		RAISED.has(word) ||
		(words.length > 1 && words.some((each) => each.length > 3));
	if (!raised) return null;
	return {
		code: 'all-caps',
		from,
		to: from + run.trimEnd().length,
		says: 'Capitals are hard to read, and some screen readers spell them out.',
		mend: 'Write it in small letters; for stress use emphasis.'
	};
}

/** At its first use, unless brackets beside it spell it out. */
export function abbreviationFinding(
	text: string,
	from: number,
	word: string,
	met: Set<unknown>,
	field: Field
): Finding | null {
	if (KNOWN.has(word) || ROMAN.test(word) || met.has(word) || field === 'title') return null;
	// After a figure it is a unit.
	if (/\d[\s\u00a0\u202f]?$/u.test(text.slice(0, from))) return null;
	met.add(word);
	const to = from + word.length;
	if (/\($/u.test(text.slice(0, from)) || /^[”’»]?\s\(/u.test(text.slice(to))) return null;
	return {
		code: 'acronym',
		from,
		to,
		says: `“${word}” isn’t spelt out where it first stands.`,
		mend: 'Give the full name once, with the short one in brackets.'
	};
}
