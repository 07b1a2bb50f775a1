import { expect, test } from 'vitest';
import { denial, type Actor } from './permissions.ts';
import {
	checksAgree,
	compareRevisions,
	mayAnswerDifferently,
	mayBecome,
	mayCompose,
	mayPublish,
	mayRetest,
	raised,
	requireStep,
	vettingOf,
	VETTING_STATES,
	type VettingState
} from './vetting.ts';

test('every step that is allowed, and no other', () => {
	const states = ['new', ...VETTING_STATES] as const;
	const allowed = states.flatMap((from) =>
		VETTING_STATES.filter((to) => mayBecome(from, to)).map((to) => `${from} → ${to}`)
	);
	expect(allowed).toEqual([
		'new → proposed',
		'proposed → tested',
		'proposed → withdrawn',
		'tested → vetted',
		'tested → superseded',
		'tested → withdrawn',
		'vetted → superseded',
		'vetted → withdrawn',
		'superseded → withdrawn'
	]);
});

test('a step out of order is refused with where it stands', () => {
	expect(() => requireStep('tested', 'vetted')).not.toThrow();
	expect(() => requireStep('proposed', 'vetted')).toThrow(
		expect.objectContaining({
			code: 'vetting-out-of-order',
			details: { from: 'proposed', to: 'vetted' }
		})
	);
});

test.each<[VettingState, boolean, boolean]>([
	['proposed', false, false],
	['tested', true, false],
	['vetted', true, true],
	['superseded', false, false],
	['withdrawn', false, false]
])('%s: on a bench %s, published %s', (state, bench, published) => {
	expect(mayCompose(state)).toBe(bench);
	expect(mayPublish(state)).toBe(published);
});

test('what came with the software is vetted with it until this house says otherwise', () => {
	const builtIn = { calculator: 'cosmo.at_z', revision: '1.0.0', house: false, proposedBy: null };
	const bare = vettingOf(builtIn, []);
	expect(bare).toMatchObject({ state: 'vetted', withSoftware: true });
	expect(bare.steps[0]?.note).toContain('Vetted with the software');
	const by = { personId: 'ama', name: 'Dr Ama Tindleforth' };
	const signed = vettingOf(builtIn, [
		{ state: 'vetted', by, at: '2026-12-08T10:00:00.000Z', note: '' }
	]);
	expect(signed).toMatchObject({ state: 'vetted', withSoftware: false, steps: [{ by }] });
	expect(vettingOf({ ...builtIn, house: true }, []).state).toBe('proposed');
});

test('the second scientist is another person than the first', () => {
	const scientist: Actor = { personId: 'a', name: 'A', roles: ['scientist', 'editor'] };
	const about = { proof: null, proposer: 'a' };
	expect(denial(scientist, 'vet-calculator', about)).toBe('own-proposal');
	expect(denial({ ...scientist, personId: 'b' }, 'vet-calculator', about)).toBeNull();
	expect(denial({ ...scientist, roles: ['editor'] }, 'vet-calculator', about)).toBe(
		'not-permitted'
	);
	expect(denial(scientist, 'withdraw-calculator', about)).toBeNull();
});

test('revisions rise by what changed, and compare as numbers', () => {
	expect(raised('1.2.3', 'patch')).toBe('1.2.4');
	expect(raised('1.2.3', 'minor')).toBe('1.3.0');
	expect(raised('1.2.3', 'major')).toBe('2.0.0');
	expect(['1.10.0', '1.9.9', '2.0.0', '1.9.10'].sort(compareRevisions)).toEqual([
		'1.9.9',
		'1.9.10',
		'1.10.0',
		'2.0.0'
	]);
});

test('the record says of the check values what is true', () => {
	const computed = { computed: true as const };
	expect(checksAgree([{}])).toBe('1 check value agrees.');
	expect(checksAgree([{}, {}])).toBe('2 check values agree.');
	expect(checksAgree([{}, computed])).toBe(
		'2 check values agree, 1 of them worked with an independent method.'
	);
	expect(checksAgree([computed, computed])).toBe(
		'2 check values agree, worked with an independent method.'
	);
	expect(checksAgree([])).toMatch(/^It has no check value of its own/);
});

test('only a withdrawn calculator of the software is tested again', () => {
	const may = VETTING_STATES.flatMap((state) =>
		[true, false].filter((house) => mayRetest({ state, house })).map((house) => [state, house])
	);
	expect(may).toEqual([['withdrawn', false]]);
});

test('a major step may change answers', () => {
	expect(mayAnswerDifferently('1.4.2', '2.0.0')).toBe(true);
	expect(mayAnswerDifferently('1.4.2', '1.5.0')).toBe(false);
});
