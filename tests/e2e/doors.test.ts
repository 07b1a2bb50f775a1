/** The doors of the built server, tried over plain HTTP: sign-in, sessions, origins, bodies, headers, and a kill. */
import { afterAll, beforeAll, describe, expect, test } from 'vitest';
import { firstLight } from '../../src/lib/server/demo/first-light.ts';
import { DEMO_PASSPHRASE, DEMO_PEOPLE } from '../../src/lib/server/demo/people.ts';
import { startHouse, type House } from '../support/server.ts';

let house: House;
beforeAll(async () => {
	house = await startHouse({ seed: 'people' });
});
afterAll(() => house.close());

/** A browser without a window: keeps cookies, follows nothing. */
class Visitor {
	readonly cookies = new Map<string, string>();

	async ask(
		path: string,
		init: RequestInit & { headers?: Record<string, string> } = {}
	): Promise<Response> {
		const cookie = [...this.cookies].map(([name, value]) => `${name}=${value}`).join('; ');
		const response = await fetch(house.origin + path, {
			redirect: 'manual',
			...init,
			headers: { accept: 'text/html', ...(cookie && { cookie }), ...init.headers }
		});
		for (const line of response.headers.getSetCookie()) {
			const [, name = '', value = ''] = /^([^=]+)=([^;]*)/.exec(line) ?? [];
			if (/max-age=0/i.test(line)) this.cookies.delete(name);
			else this.cookies.set(name, value);
		}
		return response;
	}

	send(path: string, fields: Record<string, string>): Promise<Response> {
		return this.ask(path, {
			method: 'POST',
			body: new URLSearchParams(fields),
			headers: { origin: house.origin }
		});
	}

	put(path: string, body: string, headers: Record<string, string> = {}): Promise<Response> {
		return this.ask(path, {
			method: 'PUT',
			body,
			headers: { origin: house.origin, 'content-type': 'application/json', ...headers }
		});
	}

	async signIn(who: keyof typeof DEMO_PEOPLE): Promise<void> {
		const { email } = DEMO_PEOPLE[who];
		const response = await this.send('/sign-in?/passphrase', {
			email,
			passphrase: DEMO_PASSPHRASE
		});
		expect(response.status).toBe(303);
	}
}

describe('signing in', () => {
	test('a wrong passphrase is a sentence on the page, and nobody is in', async () => {
		const visitor = new Visitor();
		const response = await visitor.send('/sign-in?/passphrase', {
			email: DEMO_PEOPLE.tamsin.email,
			passphrase: 'wrong'
		});
		expect(response.status).toBe(400);
		expect(await response.text()).toContain('don’t go together');
		expect(visitor.cookies.size).toBe(0);
	});

	test.each(['//elsewhere.example', 'https://elsewhere.example', '/\\elsewhere.example'])(
		'leads to no other house: %s',
		async (next) => {
			const { email } = DEMO_PEOPLE.tamsin;
			const response = await new Visitor().send(
				`/sign-in?/passphrase&next=${encodeURIComponent(next)}`,
				{ email, passphrase: DEMO_PASSPHRASE }
			);
			expect(response.headers.get('location')).toBe('/desk');
		}
	);

	test('a cookie copied before signing out opens nothing afterwards', async () => {
		const visitor = new Visitor();
		await visitor.signIn('tamsin');
		expect((await visitor.ask('/desk')).status).toBe(200);
		const copy = new Visitor();
		for (const [name, value] of visitor.cookies) copy.cookies.set(name, value);
		await visitor.send('/sign-out', {});
		expect((await copy.ask('/desk')).headers.get('location')).toBe('/sign-in?next=%2Fdesk');
	});

	test('a link from the mail works by its button, once, in the browser that asked', async () => {
		const visitor = new Visitor();
		await visitor.send('/sign-in?/link', { email: DEMO_PEOPLE.ama.email });
		const letter = await house.mail.letterTo(DEMO_PEOPLE.ama.email);
		const address = new URL(/http\S+token=\S+/.exec(letter.text)![0]);
		expect(address.origin).toBe(house.origin);
		const token = address.searchParams.get('token')!;

		// Opening it, as a mail scanner does, spends nothing.
		expect((await new Visitor().ask(address.pathname + address.search)).status).toBe(200);
		expect((await new Visitor().send('/sign-in/link', { token })).status).toBe(400);
		expect((await visitor.send('/sign-in/link', { token })).headers.get('location')).toBe('/desk');
		expect((await visitor.ask('/desk')).status).toBe(200);
		expect((await visitor.send('/sign-in/link', { token })).status).toBe(400);
	});

	test.each(['x', 'eyJhbGciOiJub25lIn0.eyJzaWQiOiJ4In0.', ''])(
		'the cookie %j is nobody',
		async (value) => {
			const visitor = new Visitor();
			visitor.cookies.set('steelyard.session', value);
			expect((await visitor.ask('/desk')).status).toBe(303);
		}
	);
});

describe('strangers', () => {
	test.each(['/sign-in', '/', '/sign-in/link', '/w/nothing', '/nowhere'])(
		'get no cookie at %s',
		async (path) => {
			expect((await new Visitor().ask(path)).headers.getSetCookie()).toEqual([]);
		}
	);

	test.each(['/desk', '/pieces/x/manuscript', '/pieces/x/check', '/pieces/x/release'])(
		'are led from %s to sign-in, and back',
		async (path) => {
			const response = await new Visitor().ask(path);
			expect(response.status).toBe(303);
			expect(response.headers.get('location')).toBe(`/sign-in?next=${encodeURIComponent(path)}`);
		}
	);

	test('get no data from a room’s data address', async () => {
		const response = await new Visitor().ask('/desk/__data.json');
		expect(await response.text()).toBe('{"type":"redirect","location":"/sign-in?next=%2Fdesk"}');
	});

	test('can’t save', async () => {
		const response = await new Visitor().put(
			'/api/pieces/x/draft',
			'{"baseVersion":1,"document":{}}'
		);
		expect(response.status).toBe(401);
		expect(await response.json()).toMatchObject({ error: { code: 'not-signed-in' } });
	});
});

describe('requests from elsewhere', () => {
	test.each([
		['none', undefined],
		['another host', 'http://127.0.0.1:4699'],
		['null', 'null']
	])('origin: %s', async (_, origin) => {
		const visitor = new Visitor();
		await visitor.signIn('tamsin');
		for (const method of ['POST', 'PUT', 'PATCH', 'DELETE']) {
			const response = await visitor.ask('/sign-out', {
				method,
				headers: origin ? { origin } : {}
			});
			expect(response.status).toBe(403);
		}
		expect((await visitor.ask('/desk')).status).toBe(200);
	});

	test('the public calculators answer any origin, without credentials', async () => {
		const headers = { origin: 'http://elsewhere.example', 'content-type': 'application/json' };
		const preflight = await new Visitor().ask('/api/v1/calculators/line.band', {
			method: 'OPTIONS',
			headers
		});
		expect(preflight.headers.get('access-control-allow-origin')).toBe('*');
		const response = await new Visitor().ask('/api/v1/calculators/line.band', {
			method: 'POST',
			headers,
			body: '{"inputs":{"wavelength_nm":550}}'
		});
		expect(response.headers.get('access-control-allow-origin')).toBe('*');
		expect(response.headers.get('access-control-allow-credentials')).toBeNull();
		expect(await response.json()).toMatchObject({ outputs: { band: { value: 'visible' } } });
	});
});

test.each(['/sign-in', '/desk', '/nowhere', '/api/v1/calculators'])(
	'%s carries the house’s headers',
	async (path) => {
		const { headers } = await new Visitor().ask(path);
		expect(headers.get('x-content-type-options')).toBe('nosniff');
		expect(headers.get('x-frame-options')).toBe('DENY');
		expect(headers.get('content-security-policy')).toContain("frame-ancestors 'none'");
		expect(headers.get('content-security-policy')).not.toMatch(/script-src[^;]*unsafe/);
	}
);

describe('saving', () => {
	const SLUG = 'a-piece-for-the-doors';
	const ADDRESS = `/api/pieces/${SLUG}/draft`;
	const writer = new Visitor();
	beforeAll(async () => {
		await writer.signIn('tamsin');
		const made = await writer.send('/desk?/create', { title: 'A piece for the doors' });
		expect(made.headers.get('location')).toBe(`/pieces/${SLUG}/manuscript`);
	});
	const errorOf = async (response: Response) =>
		(await response.json()) as {
			error: { code: string; details: { issues?: { message: string }[] } };
		};

	test.each([
		['no JSON', '{"baseVersion":1', 422],
		['NaN', '{"baseVersion":NaN,"document":{}}', 422],
		['another shape', '[]', 422],
		['no document', '{"baseVersion":1}', 422],
		['a broken document', '{"baseVersion":1,"document":{"version":1}}', 422],
		['a role in the body', '{"baseVersion":1,"document":{},"role":"admin"}', 422],
		['a prototype', '{"baseVersion":1,"document":{"__proto__":{"x":1}}}', 422],
		[
			'deep brackets',
			`{"baseVersion":1,"document":${'['.repeat(100_000)}${']'.repeat(100_000)}}`,
			422
		],
		['600 kB', JSON.stringify({ baseVersion: 1, document: 'x'.repeat(600_000) }), 413]
	])('%s is a sentence, never a fault', async (_, body, status) => {
		const response = await writer.put(ADDRESS, body);
		expect(response.status).toBe(status);
		const { error } = await errorOf(response);
		if (status === 422)
			expect(error.details.issues!.every(({ message }) => message.length > 10)).toBe(true);
	});

	test('a piece that isn’t there is 404; a form isn’t JSON', async () => {
		expect(
			(
				await writer.put(
					'/api/pieces/nowhere/draft',
					JSON.stringify({ baseVersion: 1, document: firstLight })
				)
			).status
		).toBe(404);
		expect((await writer.put('/api/pieces/%00/draft', '{}')).status).toBe(404);
		expect((await writer.put(ADDRESS, '{}', { 'content-type': 'text/plain' })).status).toBe(422);
	});

	test('every save that was acknowledged is there after the server is killed', async () => {
		let version = 1;
		let title = '';
		const writing = (async () => {
			for (let change = 1; ; change += 1) {
				const body = JSON.stringify({
					baseVersion: version,
					document: { ...firstLight, title: `Change ${change}` }
				});
				const response = await writer.put(ADDRESS, body).catch(() => null);
				if (!response) return;
				expect(response.status).toBe(200);
				({ version } = (await response.json()) as { version: number });
				title = `Change ${change}`;
				if (change === 25) void house.end('SIGKILL');
			}
		})();
		await writing;
		expect(version).toBeGreaterThan(20);
		await house.startAgain();

		// A save on an old version is answered with what the server has.
		const response = await writer.put(
			ADDRESS,
			JSON.stringify({ baseVersion: 1, document: firstLight })
		);
		expect(response.status).toBe(409);
		const { error } = (await response.json()) as {
			error: { details: { version: number; document: { title: string } } };
		};
		expect(error.details.version).toBeGreaterThanOrEqual(version);
		if (error.details.version === version) expect(error.details.document.title).toBe(title);
	});
});
