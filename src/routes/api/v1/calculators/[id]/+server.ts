import { z } from 'zod';
import { calculate, describeCalculators, type CalculationAnswer } from '$lib/api/calculation.ts';
import { brake } from '$lib/server/http/brake.ts';
import { readJson, shaped } from '$lib/server/http/json-body.ts';
import { preflight, publicJson, publicRefusal } from '$lib/server/http/public-api.ts';
import type { RequestHandler } from './$types';

const Body = z.record(z.string(), z.unknown(), { error: 'Send an object: {"inputs": {…}}.' });

/** A calculator may take a while; strangers get one a second. */
const strangers = brake(60);

/** One calculator, as it describes itself. */
export const GET: RequestHandler = ({ params }) => {
	const found = describeCalculators().find(({ id }) => id === params.id);
	return found ? publicJson(found) : answer(calculate({ calculator: params.id, inputs: {} }));
};

/** `{"inputs": {…}}` in; what `npm run calc` writes for a line out. */
export const POST: RequestHandler = async ({ locals: { context }, params, request }) => {
	try {
		if (!context.actor) strangers.count(context.client.address, context.now);
		const body = shaped(Body, await readJson(request));
		return answer(calculate({ ...body, calculator: params.id }));
	} catch (error) {
		return publicRefusal(error);
	}
};

export const OPTIONS: RequestHandler = () => preflight('GET, POST');

function answer(outcome: CalculationAnswer): Response {
	if (!('refused' in outcome)) return publicJson(outcome);
	return publicJson(outcome, { status: outcome.refused.code === 'unknown-calculator' ? 404 : 422 });
}
