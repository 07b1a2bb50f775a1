import { routes } from '../../../routes.ts';
import type { LetterParts } from './letter.ts';

export function signInLink(origin: string, { token }: { token: string }): LetterParts {
	return {
		subject: 'Your sign-in link',
		paragraphs: [
			'Someone asked for a link to sign in with this address. If that was you, open it in the same browser and press the button there.',
			'It works once, for ten minutes.'
		],
		link: {
			words: 'Sign in',
			href: `${origin}${routes.signInLink()}?token=${encodeURIComponent(token)}`
		},
		foot: 'If it wasn’t you, leave it: nothing happens without the button, and only in that browser.'
	};
}
