import { embedSnippet, reservedHeight } from '$lib/embed-snippet.ts';
import { catalogue } from '$lib/physics/calculators/index.ts';
import { pageFailure } from '$lib/server/http/failures.ts';
import { recordsOf } from '$lib/server/press/records.ts';
import { readColophon } from '$lib/server/services/colophon.ts';
import type { PageServerLoad } from './$types';
import { calculatorsOf, reading, readings } from './reading-copy.ts';

/** Everything is worked out here: a reader's page carries no calculator. */
export const load: PageServerLoad = async ({ locals: { context }, params }) => {
	const colophon = await readColophon(context, params.slug).catch(pageFailure);
	const { document, slug } = colophon;
	const { origin, name } = context.house;
	const reads = readings(document, catalogue);
	const sources = new Set(
		Object.values(recordsOf(document, catalogue, [])).flatMap(({ restsOn }) => restsOn)
	);
	return {
		house: name,
		slug,
		title: document.title,
		point: document.point,
		copy: reading(document, catalogue),
		numbers: colophon.numbers.map(({ id, label, words, verdict, checkedBy }) => ({
			id,
			label,
			words,
			verdict: verdict.verdict,
			departurePercent: verdict.departurePercent,
			reads: reads.get(id) ?? '',
			checkedBy
		})),
		writers: colophon.writers,
		editor: colophon.editor,
		releases: colophon.releases,
		constants: document.constants,
		calculators: calculatorsOf(document, catalogue),
		sources: [...sources].map((title) => ({ title })),
		height: reservedHeight(document),
		snippet: embedSnippet({ origin, slug, document })
	};
};
