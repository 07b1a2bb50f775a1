import { routes } from '../../../routes.ts';
import type { LetterParts } from './letter.ts';
import type { QueryMail } from './query-raised.ts';

export function queryAnswered(origin: string, { slug, title, by, claim }: QueryMail): LetterParts {
	return {
		subject: `Answer on ${claim}: ${title}`,
		paragraphs: [`${by} has answered your question about claim ${claim} of “${title}”.`],
		link: {
			words: 'Read it, and close the query or ask again',
			href: `${origin}${routes.check(slug)}`
		},
		foot: 'You get this because you asked.'
	};
}
