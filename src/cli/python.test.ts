import { expect, test } from 'vitest';
import { findPython, HOW_TO_INSTALL } from './python.ts';

test('without a Python that has both packages there is none, and the way to get them is told', () => {
	expect(findPython(['/nowhere/python3', 'false'])).toBeNull();
	expect(HOW_TO_INSTALL).toContain('python3-astropy python3-scipy');
});

test('the first that can import both is taken', () => {
	expect(findPython(['false', 'true'])).toBe('true');
});
