/**
 * Traps that are phrases. Each is looked for only where one of its first words stands, so that a long text is read
 * once, word by word, and not once a rule.
 */
import { PRINTED } from '../copy.ts';
import type { Finding, LintCode } from '../note.ts';

export interface Trap {
	code: LintCode;
	/** The words it may start with, in small letters. */
	starts: readonly string[];
	pattern: RegExp;
	says: string;
	mend?: string;
	replacement?: (found: RegExpExecArray) => string;
	/** Only where the part holds a weighed or printed number. */
	wantsReading?: true;
}

type Further = Pick<Trap, 'mend' | 'replacement' | 'wantsReading'>;

const SPACE = '[\\s\u2060]+';
/** A number in figures, or one that the widget prints. */
const FIGURE = `(?:${PRINTED}|\\d(?:[\\d.,\u202f\u00a0]*\\d)?)`;

/**
 * A maker of traps for one language. In the phrase a space stands for any white space, `#` for a number in figures or
 * words, and `~` for at most 40 characters of the same sentence.
 */
export function trapsFor(numberWords: string) {
	const number = `(?:${FIGURE}(?:${SPACE}(?:${numberWords}))?|(?:${numberWords}))`;
	return (code: LintCode, starts: string, phrase: string, says: string, further: Further = {}) => {
		const source = phrase
			.replaceAll(' ', SPACE)
			.replaceAll('#', number)
			.replaceAll('~', '[^!?;\\n]{0,40}?');
		return {
			code,
			starts: starts.split(' '),
			pattern: new RegExp(`(?:${source})(?![\\p{L}\\p{N}])`, 'iuy'),
			says,
			...further
		} satisfies Trap;
	};
}

export type TrapIndex = ReadonlyMap<string, readonly Trap[]>;

export function indexTraps(traps: readonly Trap[]): TrapIndex {
	const index = new Map<string, Trap[]>();
	for (const trap of traps) {
		for (const start of trap.starts) {
			const known = index.get(start);
			if (known) known.push(trap);
			else index.set(start, [trap]);
		}
	}
	return index;
}

/** The trap that begins at this word, or null. */
export function trapAt(text: string, at: number, trap: Trap): Finding | null {
	trap.pattern.lastIndex = at;
	const found = trap.pattern.exec(text);
	if (!found) return null;
	const { code, says, mend, replacement } = trap;
	return {
		code,
		from: at,
		to: at + found[0].length,
		says,
		...(mend ? { mend } : {}),
		...(replacement ? { replacement: replacement(found) } : {})
	};
}
