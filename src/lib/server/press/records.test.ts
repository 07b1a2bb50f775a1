import { expect, test } from 'vitest';
import { catalogue } from '../../physics/calculators/index.ts';
import { firstLight } from '../demo/first-light.ts';
import { recordsOf } from './records.ts';

const signings = [
	{ claim: 'frequency', name: 'Dr Ama Tindleforth', signedAt: new Date('2026-12-01T10:00:00Z') },
	{ claim: 'frequency', name: 'Dr Mateus Quevarro', signedAt: new Date('2026-12-03T10:00:00Z') }
];
const records = recordsOf(firstLight, catalogue, signings);

test('every claim of the copy has a record', () => {
	expect(Object.keys(records).sort()).toEqual(['crest', 'frequency', 'rest-frequency', 'stretch']);
});

test('a record names its checkers, newest first', () => {
	expect(records.frequency?.checkedBy.map(({ name }) => name)).toEqual([
		'Dr Mateus Quevarro',
		'Dr Ama Tindleforth'
	]);
	expect(records.crest?.checkedBy).toEqual([]);
});

test('it says the weighing in a reader’s words, with its picture', () => {
	const { says, beam } = records.frequency ?? {};
	expect(says).toMatch(
		/^The copy says about 68\u00a0megahertz\. The calculator reads 68\.1\d*\u00a0megahertz/
	);
	expect(says).toMatch(/It fits\.$/);
	expect(beam?.picture.zones.some(({ verdict }) => verdict === 'level')).toBe(true);
});

test('it rests on the sources of its values and methods, and a setting on where it came from', () => {
	expect(records.frequency?.restsOn.join('\n')).toMatch(/Planck Collaboration 2020/);
	expect(records.frequency?.restsOn.join('\n')).toMatch(/Hogg 1999/);
	expect(records['rest-frequency']?.restsOn.join('\n')).toMatch(/Hellwig/);
	expect(records.frequency?.working.length).toBeGreaterThan(0);
});

test('what the writer exempted has no record', () => {
	const exempted = {
		...firstLight,
		claims: firstLight.claims.map((claim) =>
			claim.id === 'stretch'
				? { id: 'stretch', form: 'exempt' as const, reason: 'a figure of speech' }
				: claim
		)
	};
	expect(Object.keys(recordsOf(exempted, catalogue, []))).not.toContain('stretch');
});
