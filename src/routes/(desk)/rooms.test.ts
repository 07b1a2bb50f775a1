import { expect, test } from 'vitest';
import { keysOf, roomsOf } from './rooms.ts';

test('the list of keys names every key of the manuscript, and the rooms', () => {
	const keys = keysOf('manuscript', roomsOf('first-light')).flatMap((group) =>
		group.keys.map(({ press }) => press.join(' '))
	);
	expect(keys).toEqual(
		expect.arrayContaining([
			'=',
			'/',
			'Ctrl .',
			'Ctrl B',
			'Ctrl I',
			'Ctrl Shift B',
			'Ctrl Z',
			'Ctrl Y',
			'G M',
			'? Ctrl ?'
		])
	);
});
