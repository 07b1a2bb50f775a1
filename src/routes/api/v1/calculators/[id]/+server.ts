import { z } from 'zod';
import { calculate, describeCalculator, type CalculationAnswer } from '$lib/api/calculation.ts';
import { brake } from '$lib/server/http/brake.ts';
import { readJson, shaped } from '$lib/server/http/json-body.ts';
import { preflight, publicJson, publicRefusal } from '$lib/server/http/public-api.ts';
import { offeredCalculators } from '$lib/server/services/public-calculators.ts';
import type { RequestHandler } from './$types';

const Body = z.record(z.string(), z.unknown(), { error: 'Send an object: {"inputs": {…}}.' });

/** A calculator may take a while; strangers get one a second. */
const strangers = brake(60);

/** One calculator, as it describes itself. */
export const GET: RequestHandler = async ({ locals: { context }, params }) => {
	const offered = await offeredCalculators(context);
	const found = offered.calculators.get(params.id);
	return found
		? publicJson(describeCalculator(found))
		: answer(calculate({ calculator: params.id, inputs: {} }, offered));
};

/** `{"inputs": {…}}` in; what `npm run calc` writes for a line out. */
export const POST: RequestHandler = async ({ locals: { context }, params, request }) => {
	try {
		if (!context.actor) strangers.count(context.client.address, context.now);
		const body = shaped(Body, await readJson(request));
		return answer(calculate({ ...body, calculator: params.id }, await offeredCalculators(context)));
	} catch (error) {
		return publicRefusal(error);
	}
};

export const OPTIONS: RequestHandler = () => preflight('GET, POST');

/** Where it isn't what was sent that is wrong, but what was asked for. */
const STATUSES: Record<string, number> = {
	'unknown-calculator': 404,
	'calculator-not-vetted': 409,
	'calculator-superseded': 409,
	'calculator-withdrawn': 410
};

function answer(outcome: CalculationAnswer): Response {
	if (!('refused' in outcome)) return publicJson(outcome);
	return publicJson(outcome, { status: STATUSES[outcome.refused.code] ?? 422 });
}
