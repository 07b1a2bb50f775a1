/** Writes which file the frame is, which its style and fonts are, and which holds each calculator. */
import { readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { pathToFileURL } from 'node:url';
import type { Plugin, Rolldown } from 'vite';
import { MANIFEST, type PressManifest } from '../src/lib/server/press/manifest.ts';

/** True for the files that hold a calculator; the others beside them are what calculators share. */
export function definesCalculator(file: string): boolean {
	return readFileSync(file, 'utf8').includes('= defineCalculator(');
}

export function pressManifest(frameEntry: string): Plugin {
	return {
		name: 'steelyard:press-manifest',
		async writeBundle({ dir = '' }, bundle) {
			const chunks = Object.values(bundle).filter((file) => file.type === 'chunk');
			const names = Object.keys(bundle);
			const frame = chunks.find((chunk) => chunk.facadeModuleId === frameEntry);
			const style = names.find((name) => name.endsWith('.css'));
			const fonts = names.filter((name) => name.endsWith('.woff2')).sort();
			const copyFace = fonts.find((name) => name.startsWith('literata-'));
			if (!frame || !style || !copyFace)
				throw new Error('The build lacks the frame, its style or its copy face.');

			const byName = new Map(chunks.map((chunk) => [chunk.fileName, chunk]));
			const shared = new Set([frame.fileName, ...importsOf(frame, byName)]);
			const later = frame.dynamicImports.concat(
				[...shared].flatMap((name) => byName.get(name)?.dynamicImports ?? [])
			);
			const manifest: PressManifest = {
				frame: { file: frame.fileName, imports: importsOf(frame, byName) },
				later: [...new Set(later.flatMap((name) => [name, ...importsOf(byName.get(name), byName)]))]
					.filter((name) => !shared.has(name))
					.sort(),
				style,
				fonts,
				copyFace,
				calculators: {}
			};
			for (const chunk of chunks.filter(
				({ isEntry, fileName }) => isEntry && fileName !== frame.fileName
			)) {
				const script = {
					file: chunk.fileName,
					imports: importsOf(chunk, byName).filter((name) => !shared.has(name))
				};
				for (const id of await calculatorIds(join(dir, chunk.fileName)))
					manifest.calculators[id] = script;
			}
			writeFileSync(join(dir, MANIFEST), JSON.stringify(manifest, null, '\t'));
		}
	};
}

function importsOf(
	chunk: Rolldown.OutputChunk | undefined,
	byName: Map<string, Rolldown.OutputChunk>
): string[] {
	const found = new Set<string>();
	const visit = ({ imports }: Rolldown.OutputChunk) => {
		for (const name of imports) {
			const next = byName.get(name);
			if (next && !found.has(name)) {
				found.add(name);
				visit(next);
			}
		}
	};
	if (chunk) visit(chunk);
	return [...found].sort();
}

/** The built file is asked, so that the manifest can't disagree with what readers load. */
async function calculatorIds(file: string): Promise<string[]> {
	const module: Record<string, { id?: unknown }> = await import(pathToFileURL(file).href);
	return Object.values(module).flatMap(({ id }) => (typeof id === 'string' ? [id] : []));
}
