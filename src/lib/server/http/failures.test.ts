import { expect, test } from 'vitest';
import { SteelyardError } from '../../errors.ts';
import { apiFailure, formFailure } from './failures.ts';

const inner = { secret: 'a row of ours', issues: [{ path: 'title', message: 'Too long.' }] };

test('a form gets the sentence and its mend, and nothing of what a service knew', () => {
	const { data } = formFailure({ id: 'pass' }, new SteelyardError('conditions-open', inner));
	expect(data.failure).toEqual({
		code: 'conditions-open',
		message: expect.any(String),
		help: expect.any(String)
	});
});

test('the API adds only what its client needs', async () => {
	const body = async (error: SteelyardError) => (await apiFailure(error).json()).error.details;
	expect(await body(new SteelyardError('document-broken', inner))).toEqual({
		issues: inner.issues
	});
	expect(await body(new SteelyardError('not-permitted', inner))).toEqual({});
	expect(await body(new SteelyardError('version-conflict', { version: 2, ...inner }))).toEqual({
		version: 2
	});
});
