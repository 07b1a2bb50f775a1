import { z } from 'zod';

/** One plain mailbox: no list, no display name, no line end can hide in it. */
export const Email = z
	.string()
	.trim()
	.toLowerCase()
	.max(254, 'An e-mail address has at most 254 characters.')
	.pipe(z.email('That doesn’t look like an e-mail address.'));

/** As typed, spaces and all. */
const passphrase = z
	.string()
	.min(1, 'Give your passphrase.')
	.max(200, 'A passphrase has at most 200 characters.');

export const SignInByPassphrase = z.object({ email: Email, passphrase });
export type SignInByPassphrase = z.infer<typeof SignInByPassphrase>;

export const SendSignInLink = z.object({ email: Email });
export type SendSignInLink = z.infer<typeof SendSignInLink>;

export const SignInByLink = z.object({ token: z.string().min(20).max(100) });
export type SignInByLink = z.infer<typeof SignInByLink>;
