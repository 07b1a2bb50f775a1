/** Builds what a reader's frame loads, into build/press: one script, one chunk a calculator, one style, the fonts. */
import { svelte } from '@sveltejs/vite-plugin-svelte';
import { readdirSync } from 'node:fs';
import { join, relative, sep } from 'node:path';
import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vite';
import { compilerOptions, dynamicCompileOptions } from '../svelte.config.js';
import { definesCalculator, pressManifest } from './press-manifest.ts';
import { leaveOut } from './leave-out.ts';
import { signs } from './signs.ts';

const ROOT = fileURLToPath(new URL('..', import.meta.url));
const FRAME = join(ROOT, 'embed/frame.ts');
const CALCULATORS = join(ROOT, 'src/lib/physics/calculators');

const calculators = readdirSync(CALCULATORS, { recursive: true, encoding: 'utf8' })
	.filter((file) => file.endsWith('.ts') && !file.endsWith('.test.ts'))
	.map((file) => join(CALCULATORS, file))
	.filter(definesCalculator);

export default defineConfig({
	root: ROOT,
	base: '/press/',
	publicDir: false,
	resolve: {
		// What few pieces have, and the widget's words in other languages, are scripts of their own that only some frames load.
		alias: [
			{
				find: /^(.*)\/(chart-views|block-views|reader-words)\.ts$/,
				replacement: '$1/$2-later.ts'
			}
		]
	},
	plugins: [
		signs(),
		leaveOut(),
		svelte({ configFile: false, compilerOptions, dynamicCompileOptions }),
		pressManifest(FRAME)
	],
	build: {
		outDir: join(ROOT, 'build/press'),
		emptyOutDir: true,
		assetsDir: '',
		assetsInlineLimit: 0,
		cssCodeSplit: false,
		// The document lists what to load ahead; the script needs no list of its own.
		modulePreload: false,
		reportCompressedSize: false,
		rolldownOptions: {
			input: Object.fromEntries([
				['frame', FRAME],
				// By field and name: two fields may hold a `drag`.
				...calculators.map((file) => [
					relative(CALCULATORS, file).replace(/\.ts$/, '').replaceAll(sep, '-'),
					file
				])
			]),
			preserveEntrySignatures: 'strict',
			treeshake: {
				// The pure folders do nothing when they are loaded, so a schema nobody asks for stays out of the frame.
				moduleSideEffects: [{ test: /src\/lib\/(physics|widget)\//, sideEffects: false }]
			},
			output: {
				entryFileNames: '[name]-[hash].js',
				chunkFileNames: '[name]-[hash].js',
				assetFileNames: '[name]-[hash][extname]',
				// All that every frame needs packs better, and comes sooner, as one file.
				codeSplitting: {
					groups: [
						{ name: 'core', test: /\/renderer\/Frame\.svelte$/ },
						// What all forms of chart share, so that a chart takes two requests and not six.
						{
							name: 'chart',
							test: /\/figures\/(?:ChartFigure|LevelTicks|axis|place-labels|item-table)\b/
						}
					]
				}
			}
		}
	}
});
