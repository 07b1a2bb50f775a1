import adapter from '@sveltejs/adapter-node';

/**
 * Shared by the app and by the builds in `embed/`. The class that scopes a component's styles is made from those
 * styles alone, so that a page rendered on the server and the reader's frame name it alike wherever they are built.
 *
 * @type {import('svelte/compiler').CompileOptions}
 */
export const compilerOptions = {
	cssHash: ({ hash, css }) => `s-${hash(css)}`
};

/** Runes in all of our own components; packages decide for themselves. */
export const dynamicCompileOptions = (/** @type {{ filename: string }} */ { filename }) =>
	filename.includes('node_modules') ? undefined : { runes: true };

/** @type {import('@sveltejs/kit').Config} */
export default {
	compilerOptions,
	vitePlugin: { dynamicCompileOptions },
	kit: {
		adapter: adapter({ out: 'build/app' }),
		// Frames never pass through here: `embed/serve.ts` answers them with a policy of their own.
		csp: {
			mode: 'auto',
			directives: {
				'default-src': ['none'],
				'script-src': ['self'],
				'style-src': ['self'],
				// Equations and drawn widths carry style attributes; there are no inline style elements.
				'style-src-attr': ['unsafe-inline'],
				'img-src': ['self', 'data:'],
				'font-src': ['self'],
				'connect-src': ['self'],
				'manifest-src': ['self'],
				'frame-src': ['self'],
				'object-src': ['none'],
				'base-uri': ['none'],
				'form-action': ['self'],
				'frame-ancestors': ['none']
			}
		},
		typescript: {
			config: (config) => {
				config.include.push('../embed/**/*.ts', '../*.config.ts');
				return config;
			}
		}
	}
};
