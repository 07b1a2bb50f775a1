import { z } from 'zod';

/** Which piece is put on the spike, or taken off it. */
export const SpikedSlug = z.object({ slug: z.string().min(1).max(80) });
export type SpikedSlug = z.infer<typeof SpikedSlug>;
