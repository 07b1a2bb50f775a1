import { routes } from '../../../routes.ts';
import type { LetterParts } from './letter.ts';

export interface FlagMail {
	calculator: string;
	title: string;
	revision: string;
	state: 'withdrawn' | 'superseded';
	/** Who withdrew it, or vetted the newer revision. */
	by: string;
	/** Slugs, with commas between them. */
	pieces: string;
}

export function calculatorFlagged(
	origin: string,
	{ calculator, title, revision, state, by, pieces }: FlagMail
): LetterParts {
	const name = `${title}, ${revision}`;
	return {
		subject: `${state === 'withdrawn' ? 'Withdrawn' : 'Superseded'}: ${name}`,
		paragraphs: [
			state === 'withdrawn'
				? `${by} has taken the calculator ${name} out of use.`
				: `${by} has vetted a newer revision of the calculator ${name}.`,
			`These pieces rest on it: ${pieces}.`,
			'What readers have stays as it is until someone releases anew. The desk says of each piece what to do.'
		],
		link: {
			words: state === 'withdrawn' ? 'Read why, on its card' : 'See its card',
			href: `${origin}${routes.calculator(calculator)}`
		},
		foot: 'You get this because you wrote, checked or edit these pieces.'
	};
}
