/** What the lint says: plain data for the margin. It never changes the copy and never stands in the way. */

/** Where the words stand: a text block's own copy, or one of the named lines of another part. */
export type Field =
	'copy' | 'title' | 'point' | 'label' | 'description' | 'alt' | 'caption' | 'question';

/** A trap in the copy, as found. */
export interface Finding {
	code: LintCode;
	/** In UTF-16 units of the part's text, where everything that the widget prints counts as one. */
	from: number;
	to: number;
	/** What is the matter. */
	says: string;
	/** How to mend it. */
	mend?: string;
	/** Words that could stand there instead; only ever offered. */
	replacement?: string;
}

export interface LintNote extends Finding {
	/** The block's id; `title` and `point` for the two lines above the blocks. */
	block: string;
	field: Field;
}

/** Every rule by code, with the name a muted rule is listed under. */
export const LINT_RULES = {
	'long-sentence': 'long sentences',
	'starts-with-number': 'sentences that start with a figure',
	'dangling-this': '“this” with nothing before it',
	'doubled-word': 'doubled words',
	'passive-known': 'knowledge without a knower',
	'undefined-term': 'terms without an explanation',
	'house-form': 'the house’s spelling of terms',
	acronym: 'unexplained abbreviations',
	'causal-verb': 'causal verbs',
	'weighs-mass': 'weight and mass',
	'degrees-kelvin': 'degrees Kelvin',
	'rate-of-power': 'power per hour',
	'knots-per-hour': 'knots per hour',
	'light-year-time': 'light years as time',
	'times-faster': '“times faster”',
	'times-less': '“times less”',
	centrifugal: 'centrifugal force',
	'only-a-theory': 'theory for guess',
	exponentially: '“exponentially” for fast',
	'quantum-leap': '“quantum leap” for large',
	'warm-temperature': 'hot temperatures',
	'zero-gravity': 'zero gravity',
	'dark-side': 'the dark side of the Moon',
	'sucked-in': 'what sucks',
	'false-precision': 'too many digits',
	'false-friend': 'billion and its false friends',
	'up-to-or-more': '“up to … or more”',
	'one-in-more': '“one in … more”',
	'goes-stale': 'words that go stale',
	superlative: 'superlatives without a source',
	'no-break-space': 'a space that may break',
	'hyphen-minus': 'a hyphen for a minus',
	'hyphen-range': 'a hyphen in a range',
	'unit-symbol': 'misspelt unit symbols',
	'straight-quotes': 'straight quotes',
	'double-space': 'double spaces',
	'all-caps': 'capitals for emphasis',
	'click-here': 'links that don’t say where',
	'see-left': 'left and right',
	'colour-only': 'colour alone',
	'heading-empty': 'headings without words or copy',
	'heading-order': 'skipped heading levels',
	'heading-stop': 'headings with a full stop',
	'alt-picture-of': '“picture of” in a picture’s words',
	'alt-repeats': 'picture’s words that repeat the caption',
	'description-thin': 'charts described without ends or trend'
} as const;
export type LintCode = keyof typeof LINT_RULES;
