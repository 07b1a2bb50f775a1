import { expect, test } from 'vitest';
import { EMPTY_SLIP } from '../workflow/slip.ts';
import { saveSlip } from './slip-save.ts';

const change = {
	was: EMPTY_SLIP,
	fields: { reader: 'Children', partner: '', embargo: '', words: '', due: '', zone: 'UTC' }
};
const theirs = { ...EMPTY_SLIP, reader: 'Grown-ups' };

test.each<[string, () => Promise<Response>, object]>([
	['kept', async () => Response.json(theirs), { ok: true, slip: theirs, says: 'Kept.' }],
	[
		'changed by someone else meanwhile',
		async () =>
			Response.json(
				{ error: { message: 'Someone else.', help: 'Look.', details: { slip: theirs } } },
				{ status: 409 }
			),
		{ ok: false, slip: theirs, says: 'Someone else. Look.' }
	],
	[
		'no server',
		() => Promise.reject(new TypeError('fetch failed')),
		{ ok: false, slip: null, says: expect.stringContaining('try again') }
	],
	[
		'an answer that isn’t the house’s own',
		async () => new Response('<html>', { status: 502 }),
		{ ok: false, slip: null, says: expect.stringContaining('try again') }
	]
])('%s', async (_, answer, expected) => {
	const sent: unknown[] = [];
	const kept = await saveSlip('/api/pieces/x/slip', change, (_address, init) => {
		sent.push(JSON.parse(init?.body as string));
		return answer();
	});
	expect(kept).toEqual(expected);
	expect(sent).toEqual([change]);
});
