import { expect, test } from 'vitest';
import type { Control } from '../widget/document.ts';
import { settingsInLink } from './settings-link.ts';

const age: Control = {
	id: 'wave-age',
	kind: 'slider',
	label: 'The wave left at this age',
	unit: 'Myr',
	min: 100,
	max: 500,
	step: 10,
	initial: 180
};

test('a link sets a control', () => {
	expect(settingsInLink('#wave-age=270', { controls: [age], language: 'en' })).toEqual({
		values: { 'wave-age': 270 },
		notice: ''
	});
});

test('a link between steps takes the nearest', () => {
	expect(settingsInLink('#wave-age=273.9', { controls: [age], language: 'en' }).values).toEqual({
		'wave-age': 270
	});
});

test('a link past the end stands at the end, and says so', () => {
	const { values, notice } = settingsInLink('#wave-age=9000', { controls: [age], language: 'en' });
	expect(values).toEqual({ 'wave-age': 500 });
	expect(notice).toBe(
		'The link you followed asks for 9000\u00a0million years. The slider goes from 100 to 500\u00a0million years, so it stands at 500.'
	);
});

test.each([
	'',
	'#',
	'#wave-age=',
	'#wave-age=NaN',
	'#wave-age=Infinity',
	'#wave-age=<b>',
	'#__proto__=1',
	'#other=3',
	'#%'
])('%s sets nothing', (fragment) => {
	expect(settingsInLink(fragment, { controls: [age], language: 'en' })).toEqual({
		values: {},
		notice: ''
	});
});
