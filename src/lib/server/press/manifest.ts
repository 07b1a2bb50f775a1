/** What the frame's build made, as its manifest says: addresses are names under /press/. */
import { readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { z } from 'zod';

const Name = z.string().regex(/^[\w.-]+\.(js|css|woff2)$/);

const Script = z.strictObject({
	file: Name,
	/** Everything it imports, directly or not; of a calculator, what the frame hasn't loaded anyway. */
	imports: z.array(Name)
});

export const PressManifest = z.strictObject({
	frame: Script,
	/** Scripts that a frame may ask for once it is awake. */
	later: z.array(Name),
	style: Name,
	fonts: z.array(Name),
	/** The one of them that every frame sets its copy in, loaded before the first letter is drawn. */
	copyFace: Name,
	/** By calculator id. */
	calculators: z.record(z.string(), Script)
});
export type PressManifest = z.infer<typeof PressManifest>;

export const MANIFEST = 'manifest.json';

/** Throws when the folder holds no build of the frame, with how to make one. */
export async function readManifest(pressFolder: string): Promise<PressManifest> {
	try {
		return PressManifest.parse(JSON.parse(await readFile(join(pressFolder, MANIFEST), 'utf8')));
	} catch (cause) {
		throw new Error(
			`${pressFolder} holds no build of the reader’s frame. Make one: npm run build`,
			{ cause }
		);
	}
}
