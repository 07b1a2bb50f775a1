/** What the picture desk’s screens send. */
import { z } from 'zod';
import { PictureRecord } from './record.ts';

export const SavePicture = z.strictObject({
	/** The version the record was read at. */
	baseVersion: z.int().positive(),
	record: PictureRecord
});
export type SavePicture = z.infer<typeof SavePicture>;

export const ReplacePicture = z.strictObject({ by: z.string().min(1).max(40) });
export type ReplacePicture = z.infer<typeof ReplacePicture>;
