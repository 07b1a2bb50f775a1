import { defineConfig } from 'drizzle-kit';

// Generates SQL only. The server brings its own database up to date, under the data folder's lock.
export default defineConfig({
	dialect: 'postgresql',
	schema: './src/lib/server/db/schema/index.ts',
	out: './drizzle',
	casing: 'snake_case'
});
