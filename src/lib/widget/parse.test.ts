import { describe, expect, test } from 'vitest';
import { catalogue } from '../physics/calculators/index.ts';
import { firstLight } from '../server/demo/first-light.ts';
import { sameDrop } from '../server/demo/same-drop.ts';
import type { WidgetDocument } from './document.ts';
import { findings } from './findings.ts';
import { parseDocument } from './parse.ts';

/** The messages for a change to a sound document. */
function issuesOf(change: (document: WidgetDocument) => unknown): string[] {
	const parsed = parseDocument(change(structuredClone(firstLight)), catalogue);
	return parsed.ok ? [] : parsed.issues.map(({ message }) => message);
}

test.each([firstLight, sameDrop])('$title hangs together and lacks nothing', (document) => {
	expect(parseDocument(document, catalogue)).toEqual({ ok: true, document });
	expect(findings(document, catalogue)).toEqual([]);
});

describe('what is broken is named', () => {
	test('a ring on the bench', () => {
		const [message] = issuesOf((document) => {
			document.steps[0]!.settings.value = {
				from: 'reading',
				step: 'line',
				output: 'observedFrequency'
			};
			return document;
		}).slice(-1);
		expect(message).toMatch(/feed each other in a ring: .+ → .+ → /);
	});

	test('a step that isn’t there', () => {
		const messages = issuesOf((document) => {
			document.steps[1]!.settings.z = { from: 'reading', step: 'gone', output: 'z' };
			return document;
		});
		expect(messages.join(' ')).toContain('“gone”');
	});

	test('a length tied to an age', () => {
		const messages = issuesOf((document) => {
			document.controls[0]!.unit = 'm';
			return document;
		});
		expect(messages.join(' ')).toMatch(/can’t take a value in m/);
	});

	test.each<[string, (document: WidgetDocument) => unknown, RegExp]>([
		[
			'a constants edition the house doesn’t have',
			(d) => ({ ...d, constants: '2030.9' }),
			/no constants edition “2030.9”. It has 2026.1/
		],
		[
			'an unknown unit',
			(d) => ({ ...d, controls: [{ ...d.controls[0], unit: 'furlong-ish' }] }),
			/no unit of the house/
		],
		[
			'an unknown calculator',
			(d) => ({ ...d, steps: [{ ...d.steps[0], calculator: 'no.such' }, d.steps[1]] }),
			/no calculator “no.such”/
		],
		[
			'a claim entry without words',
			(d) => ({ ...d, claims: [...d.claims, { id: 'loose', form: 'exempt', reason: 'x' }] }),
			/“loose” stands nowhere/
		],
		[
			'a first setting out of range',
			(d) => ({ ...d, controls: [{ ...d.controls[0], initial: 900 }] }),
			/between the lowest and the highest/
		],
		[
			'a live number in a unit of another kind',
			(d) => ({
				...d,
				claims: d.claims.map((c) => (c.form === 'live' ? { ...c, unit: 'kg' } : c))
			}),
			/can’t be printed in kg/
		],
		[
			'a chart in a unit of another kind',
			(d) => ({
				...d,
				blocks: d.blocks.map((b) =>
					b.kind === 'chart' && b.form === 'line' ? { ...b, y: { ...b.y, unit: 'm' } } : b
				)
			}),
			/can’t be printed in m/
		],
		[
			'an output named after the language’s own',
			(d) => ({
				...d,
				claims: d.claims.map((c) =>
					c.form === 'live' ? { ...c, reading: { step: 'line', output: 'constructor' } } : c
				)
			}),
			/./
		],
		[
			'a setting named after the language’s own',
			(d) => ({
				...d,
				claims: d.claims.map((c) =>
					c.form === 'stated' ? { ...c, reading: { step: 'line', setting: 'toString' } } : c
				)
			}),
			/./
		],
		['NaN', (d) => ({ ...d, controls: [{ ...d.controls[0], step: Number.NaN }] }), /./],
		['a newer version', (d) => ({ ...d, version: 99 }), /version 99/],
		['an unknown key', (d) => ({ ...d, colour: 'red' }), /colour/],
		['no document', () => 'words', /JSON object/]
	])('%s', (_, change, expected) => {
		expect(issuesOf(change).join(' ')).toMatch(expected);
	});
});

test('an empty sheet parses, and says what it lacks', () => {
	const sheet = {
		...firstLight,
		title: '',
		point: '',
		steps: [],
		controls: [],
		blocks: [],
		claims: []
	};
	expect(parseDocument(sheet, catalogue).ok).toBe(true);
	expect(findings(sheet, catalogue).map(({ code }) => code)).toEqual([
		'no-title',
		'no-point',
		'no-copy'
	]);
});

test.each([
	['hi-21cm', 1e9, /another value in the catalogue/],
	['no-such', 1420405751.768, /no line “no-such”/]
])('a made-up number under the name of line %s holds a proof back', (line, value, says) => {
	const named = structuredClone(firstLight);
	named.steps[1]!.settings.restFrequency_Hz = { from: 'line', line, value };
	expect(parseDocument(named, catalogue).ok).toBe(true);
	expect(findings(named, catalogue)).toEqual([
		expect.objectContaining({ code: 'line-moved', says: expect.stringMatching(says) })
	]);
});
