/** Builds the server's entry, with all it needs, into build/serve.js. */
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vite';

const ROOT = fileURLToPath(new URL('..', import.meta.url));

export default defineConfig({
	root: ROOT,
	publicDir: false,
	ssr: { noExternal: true },
	build: {
		ssr: join(ROOT, 'embed/serve.ts'),
		outDir: join(ROOT, 'build'),
		// The app and the frame lie there already.
		emptyOutDir: false,
		target: 'node20',
		rolldownOptions: { output: { entryFileNames: 'serve.js' } }
	}
});
