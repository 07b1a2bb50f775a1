import { z } from 'zod';
import { isHex, type Hex } from '../themes/colour.ts';
import { FACES, LARGEST_RADIUS, type Face } from '../themes/theme.ts';

const colour = z
	.string()
	.trim()
	.toLowerCase()
	.refine((text): text is Hex => isHex(text), 'Give a colour as # and six hex digits: #5a2a82.')
	.transform((text) => text as Hex);

export const SaveTheme = z.object({
	/** '' for a new one. */
	id: z.string().max(40).default(''),
	name: z
		.string()
		.trim()
		.min(1, 'Give the theme a name, such as the partner’s.')
		.max(60, 'A name has at most 60 characters.'),
	ground: colour,
	accent: colour,
	face: z.enum(Object.keys(FACES) as [Face, ...Face[]], { error: 'Choose one of the four.' }),
	radiusPx: z
		.number({ error: 'Give a whole number of pixels.' })
		.int('Give a whole number of pixels.')
		.min(0, `A corner is 0 to ${LARGEST_RADIUS} pixels.`)
		.max(LARGEST_RADIUS, `A corner is 0 to ${LARGEST_RADIUS} pixels.`)
});
export type SaveTheme = z.infer<typeof SaveTheme>;
