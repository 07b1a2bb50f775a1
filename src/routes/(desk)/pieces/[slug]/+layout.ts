import { loadLexicon } from '$lib/factcheck/lexicon/load.ts';
import type { LayoutLoad } from './$types';

/** Numbers are found, weighed and printed in the language of the piece, which has to be at hand before the page is. */
export const load: LayoutLoad = async ({ data }) => {
	await loadLexicon(data.piece.document.language);
	return data;
};
