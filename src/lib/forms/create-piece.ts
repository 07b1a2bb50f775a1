import { z } from 'zod';
import { checkDue, slipFields } from './slip.ts';

/** What a piece starts from: an empty sheet, one of the outlines, or another piece’s words and wiring. */
const Start = z
	.string()
	.max(120)
	.regex(/^(sheet|outline:[a-z0-9-]+|piece:[a-z0-9-]+)$/, 'Choose what to start from.')
	.default('sheet');

export const CreatePiece = z
	.object({
		title: z
			.string()
			.trim()
			.min(1, 'Give the piece a title; it can change later.')
			.max(120, 'A title has at most 120 characters.'),
		/** Made from the title when it is ''. */
		slug: z
			.string()
			.trim()
			.max(80, 'A slug has at most 80 characters.')
			.regex(/^([a-z0-9]+(?:-[a-z0-9]+)*)?$/, 'A slug is small letters, digits and single dashes.')
			.default(''),
		/** The one thing a reader takes away; it stands under the title. */
		point: z
			.string()
			.trim()
			.max(240, 'A point is one sentence of at most 240 characters.')
			.default(''),
		start: Start,
		...slipFields
	})
	.superRefine(checkDue);
export type CreatePiece = z.infer<typeof CreatePiece>;
