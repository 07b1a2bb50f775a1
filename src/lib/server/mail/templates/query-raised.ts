import { routes } from '../../../routes.ts';
import type { LetterParts } from './letter.ts';

export interface QueryMail {
	slug: string;
	title: string;
	by: string;
	claim: string;
}

export function queryRaised(origin: string, { slug, title, by, claim }: QueryMail): LetterParts {
	return {
		subject: `Query on ${claim}: ${title}`,
		paragraphs: [`${by} has a question about claim ${claim} of “${title}”.`],
		link: { words: 'Read and answer it', href: `${origin}${routes.check(slug)}` },
		foot: 'You get this because you wrote some of this proof.'
	};
}
