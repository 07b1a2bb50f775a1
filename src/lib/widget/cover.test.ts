import { describe, expect, test } from 'vitest';
import { catalogue } from '../physics/calculators/index.ts';
import { firstLight } from '../server/demo/first-light.ts';
import { claimCovers, coverHash } from './cover.ts';
import { isTextBlock, type WidgetDocument } from './document.ts';
import { canonicalJson, freeze } from './freeze.ts';

/** Ids of the claims whose signature would lapse if `after` replaced `before`. */
function lapsed(before: WidgetDocument, after: WidgetDocument): string[] {
	const [old, fresh] = [before, after].map((document) => claimCovers(document, catalogue));
	return [...old!].flatMap(([id, cover]) => {
		const now = fresh!.get(id);
		return now && coverHash(now) === coverHash(cover) ? [] : [id];
	});
}

/** The document with one exact string replaced in its text. */
function reworded(document: WidgetDocument, from: string, to: string): WidgetDocument {
	let done = 0;
	const blocks = document.blocks.map((block) =>
		isTextBlock(block)
			? {
					...block,
					content: block.content.map((inline) => {
						if (!('text' in inline) || !inline.text.includes(from)) return inline;
						done += 1;
						return { ...inline, text: inline.text.replace(from, to) };
					})
				}
			: block
	);
	if (done !== 1) throw new Error(`“${from}” stands ${done} times`);
	return { ...document, blocks };
}

describe('a signature lapses', () => {
	test('when one character of its sentence changes, and no other does', () => {
		expect(lapsed(firstLight, reworded(firstLight, 'faint radio', 'faint, radio'))).toEqual([
			'rest-frequency'
		]);
		expect(
			lapsed(
				firstLight,
				reworded(firstLight, 'as long as it set out', 'as long as when it set out')
			)
		).toEqual(['stretch']);
	});

	test('when its own words change', () => {
		expect(lapsed(firstLight, reworded(firstLight, 'about 21', 'nearly 21'))).toEqual(['stretch']);
	});

	test('when its paragraph becomes the sentence that moves', () => {
		const moved = structuredClone(firstLight);
		moved.blocks[0] = { ...moved.blocks[0]!, kind: 'result' } as (typeof moved.blocks)[0];
		expect(lapsed(firstLight, moved)).toEqual(['rest-frequency', 'stretch']);
	});

	test('when the wiring behind it changes', () => {
		const rewired = structuredClone(firstLight);
		rewired.steps[0]!.settings.cosmology = { from: 'fixed', value: { set: 'Planck15' } };
		expect(lapsed(firstLight, rewired)).toEqual(['stretch', 'frequency', 'crest']);
	});

	test('when the range of a control behind it changes', () => {
		const wider = structuredClone(firstLight);
		wider.controls[0] = { ...wider.controls[0], max: 600 } as (typeof wider.controls)[0];
		expect(lapsed(firstLight, wider)).toEqual(['stretch', 'frequency', 'crest']);
	});

	test('when the calculator behind it runs at another revision', () => {
		const age = catalogue.get('cosmo.inverse')!;
		const revised = new Map(catalogue).set('cosmo.inverse', { ...age, revision: '2.0.0' });
		const before = claimCovers(firstLight, catalogue);
		const after = claimCovers(firstLight, revised);
		const moved = [...before.keys()].filter(
			(id) => coverHash(before.get(id)!) !== coverHash(after.get(id)!)
		);
		expect(moved).toEqual(['stretch', 'frequency', 'crest']);
	});
});

test('nothing outside a claim’s sentence and wiring lapses it', () => {
	const retitled = {
		...reworded(firstLight, 'how bright', 'how very bright'),
		title: 'Another title'
	};
	expect(lapsed(firstLight, retitled)).toEqual([]);
});

describe('freezing', () => {
	test('the digest is the same for the same piece, whatever the order of keys', () => {
		const shuffled = Object.fromEntries(
			Object.entries(structuredClone(firstLight)).reverse()
		) as WidgetDocument;
		expect(freeze(shuffled, catalogue).digest).toBe(freeze(firstLight, catalogue).digest);
	});

	test('one character in the title changes it', () => {
		expect(freeze({ ...firstLight, title: 'First Light' }, catalogue).digest).not.toBe(
			freeze(firstLight, catalogue).digest
		);
	});

	// Key order and number forms as in RFC 8785, section 3.2.
	test('canonical JSON', () => {
		expect(canonicalJson({ b: [1e30, -0, 0.1], a: 'é\n', c: { z: null, y: undefined } })).toBe(
			'{"a":"é\\n","b":[1e+30,0,0.1],"c":{"z":null}}'
		);
		expect(() => canonicalJson({ x: Number.NaN })).toThrow(TypeError);
	});
});
