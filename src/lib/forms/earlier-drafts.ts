/** What the list of earlier drafts sends: each schema is named after the verb it feeds. */
import { z } from 'zod';

const version = z.coerce.number().int().min(1);

/** '' takes the name away. */
export const NameDraft = z.object({
	version,
	name: z.string().trim().max(80, 'A name has at most 80 characters.')
});
export type NameDraft = z.infer<typeof NameDraft>;

export const RestoreDraft = z.object({
	/** Which draft to bring back. */
	version,
	/** The newest draft that was looked at when this was decided. */
	baseVersion: version
});
export type RestoreDraft = z.infer<typeof RestoreDraft>;
