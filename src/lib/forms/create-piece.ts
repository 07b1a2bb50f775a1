import { z } from 'zod';

export const Slug = z
	.string()
	.trim()
	.max(80, 'A slug has at most 80 characters.')
	.regex(/^[a-z0-9]+(?:-[a-z0-9]+)*$/, 'A slug is small letters, digits and single dashes.');

export const CreatePiece = z.object({
	title: z
		.string()
		.trim()
		.min(1, 'Give the piece a title; it can change later.')
		.max(120, 'A title has at most 120 characters.'),
	/** Made from the title when not given. */
	slug: Slug.optional()
});
export type CreatePiece = z.infer<typeof CreatePiece>;
