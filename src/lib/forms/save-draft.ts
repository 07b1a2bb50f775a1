import { z } from 'zod';

/** What autosave sends. The document is parsed by `parseDocument`, which names what is broken. */
export const SaveDraft = z.strictObject({
	baseVersion: z.int('Send the version the change was made on, as a whole number.').min(1),
	document: z.custom<unknown>((value) => value !== undefined, 'Send the whole document.')
});
export type SaveDraft = z.infer<typeof SaveDraft>;
