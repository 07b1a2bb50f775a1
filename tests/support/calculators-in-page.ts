/** All calculators as one script for a page: what the reader’s browser computes with, from the same source as Node. */
import { createServer } from 'node:http';
import { fileURLToPath } from 'node:url';
import type { Page } from 'playwright-core';
import { build } from 'vite';
import type { RawInputs, Result } from '../../src/lib/physics/calculator.ts';
import { listenOn, type Listening } from './fakes/listen.ts';

export interface Question {
	calculator: string;
	inputs: RawInputs;
}

/** What `answers-in-page.ts` leaves on the page. */
export interface AnsweringPage {
	answerAll(questions: Question[]): Result[];
}

const PAGE =
	'<!doctype html><title>Calculators</title><script type="module" src="/answers.js"></script>';

/** Bundles the calculators and serves a page with them; close it when done. */
export async function serveCalculators(): Promise<Listening> {
	const script = await bundle();
	const server = createServer((request, response) => {
		const isScript = request.url === '/answers.js';
		response.setHeader('content-type', isScript ? 'text/javascript' : 'text/html; charset=utf-8');
		response.end(isScript ? script : PAGE);
	});
	return listenOn(server, { port: 0 });
}

/** Answers of the page’s own JavaScript engine. */
export async function answersOf(page: Page, questions: Question[]): Promise<Result[]> {
	await page.waitForFunction(() => 'answerAll' in globalThis);
	return page.evaluate(
		(asked) => (globalThis as unknown as AnsweringPage).answerAll(asked),
		questions
	);
}

/** Minified as the reader’s frame is, so that what is tested is what is shipped. */
async function bundle(): Promise<string> {
	const built = await build({
		configFile: false,
		logLevel: 'error',
		build: {
			write: false,
			minify: true,
			lib: {
				entry: fileURLToPath(new URL('answers-in-page.ts', import.meta.url)),
				formats: ['es']
			}
		}
	});
	const outputs = [built].flat().flatMap((one) => ('output' in one ? one.output : []));
	const chunk = outputs.find((one) => one.type === 'chunk');
	if (!chunk) throw new Error('The calculators gave no script.');
	return chunk.code;
}
