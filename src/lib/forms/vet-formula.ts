/** What the Check screen sends about a piece's own formulas. */
import { z } from 'zod';

const digest = z.string().regex(/^[0-9a-f]{64}$/);

export const VetFormula = z.object({
	proofId: z.string().min(1).max(40),
	/** Of the formula as it was in sight. */
	digest,
	note: z.string().trim().max(240, 'Keep it under 240 characters.').default('')
});
export type VetFormula = z.infer<typeof VetFormula>;

export const TakeBackFormula = z.object({ digest });
export type TakeBackFormula = z.infer<typeof TakeBackFormula>;
