import { describe, expect, test } from 'vitest';
import { ownPath } from '../auth/own-path.ts';
import { guardOf } from './guard.ts';
import { withSecurityHeaders } from './headers.ts';
import { originRefusal } from './origin-check.ts';

const OWN = 'http://localhost:4700';

describe('where to go after signing in', () => {
	test.each(['/desk', '/pieces/first-light/check', '/calculators/cosmo.at_z?x=1&y=%C3%BC'])(
		'%s is ours',
		(path) => {
			expect(ownPath(path, OWN, '/desk')).toBe(path);
		}
	);
	test.each([
		null,
		'',
		'desk',
		'//elsewhere.example',
		'/\\elsewhere.example',
		'\\\\elsewhere.example',
		'https:elsewhere.example',
		'https://elsewhere.example/desk',
		'javascript:alert(1)',
		'/%2f%2felsewhere.example',
		'/%5celsewhere.example',
		'/\t/elsewhere.example',
		'/desk\r\nSet-Cookie: x=1',
		' /desk',
		'/.//elsewhere.example',
		'/x/..//elsewhere.example'
	])('%j is not', (path) => {
		expect(ownPath(path, OWN, '/desk')).toBe('/desk');
	});
});

describe('a request that changes something', () => {
	const types = [
		null,
		'text/plain',
		'application/json',
		'multipart/form-data',
		'application/x-www-form-urlencoded'
	];
	const origins = {
		own: OWN,
		foreign: 'http://127.0.0.1:4701',
		null: 'null',
		'same host, other port': 'http://localhost:4701'
	};
	const cases = ['POST', 'PUT', 'PATCH', 'DELETE'].flatMap((method) =>
		types.flatMap((type) =>
			[...Object.entries(origins), ['absent', null] as const].map(([name, origin]) => ({
				method,
				type,
				name,
				origin
			}))
		)
	);
	test.each(cases)('$method of $type from $name origin', ({ method, type, name, origin }) => {
		const headers = new Headers();
		if (type) headers.set('content-type', type);
		if (origin) headers.set('origin', origin);
		const refusal = originRefusal(new Request(`${OWN}/x`, { method, headers }), OWN);
		expect(refusal === null).toBe(name === 'own');
	});

	test('is refused when the browser says it comes from elsewhere', () => {
		const headers = { origin: OWN, 'sec-fetch-site': 'same-site' };
		expect(originRefusal(new Request(OWN, { method: 'POST', headers }), OWN)).not.toBeNull();
	});

	test('reading needs no origin', () => {
		for (const method of ['GET', 'HEAD', 'OPTIONS'])
			expect(originRefusal(new Request(OWN, { method }), OWN)).toBeNull();
	});
});

test.each([
	['/(desk)/desk', 'page'],
	['/(desk)/pieces/[slug]/check', 'page'],
	['/(strip)/pieces/[slug]/galley/strip', 'page'],
	['/api/pieces/[slug]/draft', 'api'],
	['/api/anything-new', 'api'],
	['/api/v1/calculators/[id]', 'public-api'],
	['/(account)/sign-in', 'open'],
	['/w/[slug]', 'open'],
	[null, 'open']
] as const)('%s asks as %s', (route, guard) => {
	expect(guardOf(route)).toBe(guard);
});

describe('headers', () => {
	const answer = { secure: true, personal: true, requestId: 'r' };
	const of = (response: Response, over = {}) =>
		withSecurityHeaders(response, { ...answer, ...over }).headers;

	test('are on a redirect whose headers can’t be changed', () => {
		const headers = of(Response.redirect(`${OWN}/sign-in`, 303));
		expect(headers.get('location')).toBe(`${OWN}/sign-in`);
		expect(headers.get('x-content-type-options')).toBe('nosniff');
		expect(headers.get('x-frame-options')).toBe('DENY');
		expect(headers.get('strict-transport-security')).toContain('max-age=63072000');
	});

	test('keep a page’s own policy, and give JSON one that loads nothing', () => {
		const page = new Response('', {
			headers: { 'content-type': 'text/html', 'content-security-policy': "script-src 'nonce-x'" }
		});
		expect(of(page).get('content-security-policy')).toBe("script-src 'nonce-x'");
		expect(of(page).get('content-type')).toBe('text/html; charset=utf-8');
		expect(of(page).get('cross-origin-opener-policy')).toBe('same-origin');
		const json = of(Response.json({}));
		expect(json.get('content-security-policy')).toContain(
			"default-src 'none'; frame-ancestors 'none'"
		);
		expect(json.get('content-type')).toBe('application/json; charset=utf-8');
		expect(json.get('cache-control')).toBe('no-store');
	});

	test('leave a stranger’s page to be cached, and plain http without HSTS', () => {
		const headers = of(new Response('', { headers: { 'content-type': 'text/html' } }), {
			personal: false,
			secure: false
		});
		expect(headers.get('cache-control')).toBeNull();
		expect(headers.get('strict-transport-security')).toBeNull();
	});
});
