import { expect, test } from 'vitest';
import { SteelyardError } from '../../errors.ts';
import { brake } from './brake.ts';
import { publicRefusal } from './public-api.ts';

const at = (second: number) => new Date(Date.UTC(2026, 11, 8, 10, 0, second));
const refusal = (work: () => void) => {
	try {
		work();
		return null;
	} catch (error) {
		return error as SteelyardError;
	}
};

test('so many a minute for one address; then it waits for the rest of its minute, others don’t', () => {
	const strangers = brake(3);
	for (const second of [0, 10, 20]) strangers.count('192.0.2.7', at(second));
	expect(refusal(() => strangers.count('192.0.2.7', at(30)))).toMatchObject({
		code: 'calculations-slowed',
		details: { retryAfterSeconds: 30 }
	});
	expect(refusal(() => strangers.count('192.0.2.8', at(30)))).toBeNull();
	expect(refusal(() => strangers.count('192.0.2.7', at(60)))).toBeNull();
});

test('the answer is a 429 with the time to wait, in a sentence, for any origin', async () => {
	const response = publicRefusal(
		new SteelyardError('calculations-slowed', { retryAfterSeconds: 30 })
	);
	expect(response.status).toBe(429);
	expect(response.headers.get('retry-after')).toBe('30');
	expect(response.headers.get('access-control-allow-origin')).toBe('*');
	expect(await response.json()).toEqual({
		refused: { code: 'calculations-slowed', message: expect.stringMatching(/Wait a minute\./) }
	});
});
