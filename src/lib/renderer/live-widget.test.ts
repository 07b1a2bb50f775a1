import { expect, test } from 'vitest';
import { catalogue } from '../physics/calculators/index.ts';
import { firstLight } from '../server/demo/first-light.ts';
import { LiveWidget } from './live-widget.svelte.ts';

const open = () =>
	new LiveWidget(
		() => firstLight,
		() => catalogue
	);
const frequency = firstLight.claims.find(({ id }) => id === 'frequency');

function printed(widget: LiveWidget): string {
	if (frequency?.form !== 'live') throw new Error('The sample has no live claim “frequency”.');
	const outcome = widget.printClaim(frequency);
	return outcome.ok ? outcome.words : outcome.refusal.message;
}

test('it starts at the first settings', () => {
	const widget = open();
	expect(widget.printSetting('wave-age')).toBe('180\u00a0million years');
	expect(printed(widget)).toBe('about 68\u00a0megahertz');
	expect(widget.atStart).toBe(true);
});

test('a setting moves every number that hangs on it, and back', () => {
	const widget = open();
	widget.setValue('wave-age', 270);
	expect(printed(widget)).toBe('about 89\u00a0megahertz');
	expect(widget.atStart).toBe(false);
	widget.reset();
	expect(printed(widget)).toBe('about 68\u00a0megahertz');
});

test.each([
	{ asked: 9000, set: 500 },
	{ asked: -1, set: 100 },
	{ asked: 184.9, set: 180 },
	{ asked: NaN, set: 180 },
	{ asked: Infinity, set: 180 }
])('asked for $asked it stands at $set', ({ asked, set }) => {
	const widget = open();
	widget.setValue('wave-age', asked);
	expect(widget.evaluation.values['wave-age']).toBe(set);
});

test('a control that isn’t there changes nothing', () => {
	const widget = open();
	widget.setValue('__proto__', 3);
	widget.setValue('elsewhere', 3);
	expect(widget.values).toEqual({});
});
