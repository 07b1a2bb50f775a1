import { describe, expect, test } from 'vitest';
import { catalogue } from '../physics/calculators/index.ts';
import type { Block, WidgetDocument } from '../widget/document.ts';
import type { ClaimView, ProofView } from '../workflow/piece.ts';
import { lapses, lapseSentence } from './lapses.ts';

const paragraph = (words: string, claim: string): Block => ({
	id: `block-${claim}`,
	kind: 'paragraph',
	content: [
		{ kind: 'text', text: 'It takes ' },
		{ kind: 'claim', claim, text: words },
		{ kind: 'text', text: '.' }
	]
});

const signedDocument: WidgetDocument = {
	version: 2,
	language: 'en',
	constants: '2026.1',
	title: 'First light',
	point: '',
	formulas: [],
	steps: [
		{
			id: 'line',
			calculator: 'g21.frequency_from_z',
			revision: '1.0.0',
			settings: { z: { from: 'fixed', value: 19.8 } }
		}
	],
	controls: [],
	blocks: [paragraph('about 68 megahertz', 'a'), paragraph('4.4 metres', 'b')],
	claims: [
		{ id: 'a', form: 'stated', reading: { step: 'line', output: 'frequency' } },
		{ id: 'b', form: 'stated', reading: { step: 'line', output: 'wavelength' } }
	]
};

const claim = (id: string, label: string, signers: string[], inForce = true) =>
	({
		id,
		label,
		signatures: signers.map((name) => ({ inForce, by: { personId: name, name } }))
	}) as unknown as ClaimView;

const proof = (claims: ClaimView[]): Pick<ProofView, 'document' | 'claims'> => ({
	document: signedDocument,
	claims
});

describe('what keeping the draft would lapse', () => {
	const signed = proof([claim('a', '1a', ['Ama']), claim('b', '2a', ['Ama', 'Mateus'])]);

	test('nothing while what was signed stands, though other words change', () => {
		const draft = { ...signedDocument, title: 'Another title', point: 'A point.' };
		expect(lapses(draft, signed, catalogue)).toEqual([]);
		expect(lapseSentence([])).toBe('If kept, nothing signed would lapse.');
	});

	test('one character of a signed sentence lapses that claim alone', () => {
		const blocks = [paragraph('about 69 megahertz', 'a'), paragraph('4.4 metres', 'b')];
		const found = lapses({ ...signedDocument, blocks }, signed, catalogue);
		expect(found).toEqual([{ claim: 'a', label: '1a', signedBy: ['Ama'] }]);
		expect(lapseSentence(found)).toBe('If kept, this would lapse: 1a (signed by Ama).');
	});

	test('the wiring lapses all that hangs on it', () => {
		const steps = signedDocument.steps.map((step) => ({
			...step,
			settings: { z: { from: 'fixed' as const, value: 20 } }
		}));
		const found = lapses({ ...signedDocument, steps }, signed, catalogue);
		expect(found.map(({ label }) => label)).toEqual(['1a', '2a']);
		expect(lapseSentence(found)).toContain('2a (signed by Ama, Mateus)');
	});

	test('a claim that is gone lapses; one that nobody signed, or whose signature is spent, doesn’t', () => {
		const draft = {
			...signedDocument,
			blocks: [paragraph('4.4 metres', 'b')],
			claims: signedDocument.claims.slice(1)
		};
		expect(lapses(draft, signed, catalogue).map(({ claim: id }) => id)).toEqual(['a']);
		expect(lapses(draft, proof([claim('a', '1a', [])]), catalogue)).toEqual([]);
		expect(lapses(draft, proof([claim('a', '1a', ['Ama'], false)]), catalogue)).toEqual([]);
		expect(lapses(draft, null, catalogue)).toEqual([]);
	});
});
