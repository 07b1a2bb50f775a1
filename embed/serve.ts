/** The server's entry, built to build/serve.js: settings from the environment, pages from build/app. */
import process from 'node:process';
import { LARGEST_BYTES } from '../src/lib/pictures/view.ts';
import { readEnv, takeUploads } from '../src/lib/server/env.ts';
import { startServer, stopOnSignals } from './server.ts';

try {
	const env = readEnv();
	takeUploads(LARGEST_BYTES);
	const server = await startServer({
		host: env.HOST,
		port: env.PORT,
		origin: env.ORIGIN,
		dataFolder: env.STEELYARD_DATA_DIR,
		loadPages: async () => (await import(new URL('./app/handler.js', import.meta.url).href)).handler
	});
	stopOnSignals(server);
	process.stdout.write(`ready ${env.ORIGIN}\n`);
} catch (error) {
	// A bug shows where it is; what a person can mend is a sentence already.
	const isBug =
		error instanceof TypeError || error instanceof ReferenceError || !(error instanceof Error);
	process.stderr.write(`${isBug ? ((error as Error).stack ?? String(error)) : error.message}\n`);
	process.exit(1);
}
