import { expect, test } from 'vitest';
import { keepTogether, splitLastWord } from './phrase.ts';

test('a numeral keeps its unit, and the rest may break', () => {
	expect(keepTogether('about 21 times as long')).toBe('about 21\u00a0times as long');
	expect(splitLastWord('about 68\u00a0megahertz')).toEqual({
		head: 'about ',
		tail: '68\u00a0megahertz'
	});
	expect(splitLastWord('nothing')).toEqual({ head: '', tail: 'nothing' });
});
