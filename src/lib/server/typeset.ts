/** Equations of our own calculators, set to HTML and MathML with limits, so that a slip in one can't stall a page. */
import katex from 'katex';

const LONGEST_SOURCE = 2000;
const LONGEST_OUTPUT = 150_000;

export interface SetEquation {
	/** KaTeX's own output; null when the source is past the limits, and the words alone are shown. */
	html: string | null;
	says: string;
}

export function typeset({ tex, says }: { tex: string; says: string }): SetEquation {
	if (tex.length > LONGEST_SOURCE) return { html: null, says };
	const html = set(tex);
	return { html: html === null || html.length > LONGEST_OUTPUT ? null : html, says };
}

/** Null when setting it takes more steps than any equation worth showing. */
function set(tex: string): string | null {
	try {
		return katex.renderToString(tex, {
			displayMode: true,
			output: 'htmlAndMathml',
			throwOnError: true,
			strict: 'error',
			trust: false,
			maxExpand: 100,
			maxSize: 20
		});
	} catch (error) {
		if (error instanceof katex.ParseError && error.message.includes('Too many expansions'))
			return null;
		throw error;
	}
}
