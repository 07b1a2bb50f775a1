/**
 * Cuts “Steelyard Signs” from Noto Sans Math, and answers for the address that `fonts/signs.css` names. Both the app's
 * build and the frame's use it. The cut font is kept beside the packages, so that no build changes the sources.
 */
import { createHash } from 'node:crypto';
import { existsSync } from 'node:fs';
import { mkdir, readFile, rename, writeFile } from 'node:fs/promises';
import { createRequire } from 'node:module';
import { join } from 'node:path';
import process from 'node:process';
import subsetFont from 'subset-font';
import type { Plugin } from 'vite';
import { SIGNS } from '../src/lib/renderer/fonts/signs.ts';

const ADDRESS = '/@signs/signs.woff2';
const SOURCE = '@fontsource/noto-sans-math/files/noto-sans-math-latin-400-normal.woff2';

export function signs(): Plugin {
	return {
		name: 'steelyard:signs',
		async config(config) {
			const root = config.root ?? process.cwd();
			return {
				resolve: {
					alias: { [ADDRESS]: await cutSigns(join(root, 'node_modules/.cache/steelyard')) }
				}
			};
		}
	};
}

/** The cut font's file, made unless a cut of the same face with the same signs is there already. */
export async function cutSigns(folder: string): Promise<string> {
	const require = createRequire(import.meta.url);
	const face = await readFile(require.resolve(SOURCE));
	const name = createHash('sha256').update(face).update(SIGNS).digest('hex').slice(0, 16);
	const file = join(folder, `signs-${name}.woff2`);
	if (existsSync(file)) return file;
	await mkdir(folder, { recursive: true });
	// Two builds may cut at once: each writes its own file, and the last to finish takes the name.
	const draft = `${file}.${process.pid}`;
	await writeFile(draft, await subsetFont(face, SIGNS, { targetFormat: 'woff2' }));
	await rename(draft, file);
	return file;
}
