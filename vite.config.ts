import { sveltekit } from '@sveltejs/kit/vite';
import tailwindcss from '@tailwindcss/vite';
import { defineConfig } from 'vitest/config';
import { signs } from './embed/signs.ts';

export default defineConfig({
	plugins: [signs(), tailwindcss(), sveltekit()],
	build: {
		// A font as a data: address would be refused by `font-src 'self'`.
		assetsInlineLimit: (file) => (/\.(woff2?|ttf)$/.test(file) ? false : undefined)
	},
	test: {
		projects: [
			{
				extends: true,
				test: {
					name: 'unit',
					environment: 'node',
					include: ['{src,embed,tests/support}/**/*.test.ts', 'tests/*.test.ts'],
					exclude: ['**/*.db.test.ts'],
					// Pictures and type checks take their time on a small machine.
					testTimeout: 20_000,
					maxWorkers: 2,
					sequence: { groupOrder: 1 }
				}
			},
			{
				extends: true,
				test: {
					name: 'database',
					environment: 'node',
					include: ['{src,tests}/**/*.db.test.ts'],
					// An embedded PostgreSQL takes about 700 MB while it is made.
					maxWorkers: 2,
					testTimeout: 30_000,
					hookTimeout: 60_000,
					sequence: { groupOrder: 2 }
				}
			},
			{
				extends: true,
				test: {
					name: 'browser',
					environment: 'node',
					include: ['tests/e2e/**/*.test.ts'],
					// Each file starts the built server and a Chromium: one at a time.
					maxWorkers: 1,
					fileParallelism: false,
					testTimeout: 120_000,
					hookTimeout: 180_000,
					sequence: { groupOrder: 3 }
				}
			}
		]
	}
});
