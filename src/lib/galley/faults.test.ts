import { expect, test } from 'vitest';
import { faultsOf } from './faults.ts';
import { queryFor } from './looks.ts';
import { settingsText } from './messages.ts';
import type { StripFault } from './report.ts';
import { pagesOf, STRIPS } from './strips.ts';

const strip = (id: string) => {
	const kind = STRIPS.find((candidate) => candidate.id === id);
	if (!kind) throw new Error(`There is no strip ${id}.`);
	return kind;
};
const wide: StripFault = {
	measure: 'overflow',
	block: 'b1',
	subject: 'Spektrumsdurchstimmung',
	byPx: 12,
	setting: '',
	says: '',
	spot: { x: 16, y: 40 }
};
const report = (faults: StripFault[], tallestPx = 800) => ({
	heightPx: 800,
	tallestPx,
	tallestAt: '',
	faults
});
const nothing = { measured: [], spoken: [], findings: [], keptPx: () => 1000 };

test('one cause in several strips is one fault, told with its worst measure and pinned in each', () => {
	const [fault, ...others] = faultsOf({
		...nothing,
		measured: [
			{ kind: strip('320'), report: report([wide]) },
			{ kind: strip('dark'), report: report([{ ...wide, byPx: 13 }]) }
		]
	});
	expect(others).toEqual([]);
	expect(fault?.says).toContain('At 320 and 320, dark “Spektrumsdurchstimmung” is 13 px wider');
	expect(fault?.pins.map((pin) => pin.strip)).toEqual(['320', 'dark']);
});

test('what the findings say already isn’t said twice', () => {
	const faults = faultsOf({
		...nothing,
		measured: [{ kind: strip('320'), report: report([{ ...wide, measure: 'no-description' }]) }],
		findings: [{ code: 'no-description', says: 'Describe the chart.', at: { block: 'b1' } }]
	});
	expect(faults.map(({ says }) => says)).toEqual(['Describe the chart.']);
});

test('a frame higher than the room kept for it is told with both heights', () => {
	const [fault] = faultsOf({
		...nothing,
		measured: [{ kind: strip('320'), report: report([], 870) }],
		keptPx: () => 857
	});
	expect(fault?.says).toContain('870 px high, 13 more than the snippet keeps free');
});

test('symbols that a voice spells are found, words and wordlike symbols aren’t', () => {
	const faults = faultsOf({
		...nothing,
		spoken: [
			{ text: 'It comes in at 68 MHz today.', block: 'b1' },
			{ text: 'A wave of 68 megahertz, 2 a year.', block: 'b2' }
		]
	});
	expect(faults.map(({ says }) => says)).toEqual([
		'Spoken, “MHz” is read as letters. Say “megahertz”.'
	]);
});

test('must comes before should', () => {
	const faults = faultsOf({
		...nothing,
		measured: [
			{
				kind: strip('320'),
				report: report([{ ...wide, measure: 'jump', subject: 'result' }, wide])
			}
		]
	});
	expect(faults.map(({ weight }) => weight)).toEqual(['must', 'should']);
});

test('media queries are pointed at what a strip is for', () => {
	expect(queryFor('(forced-colors: active)', 'forced')).toBe('(min-width: 0px)');
	expect(queryFor('(forced-colors: active)', 'light')).toBe('(max-width: 0px)');
	expect(queryFor('print', 'print')).toBe('all');
	expect(queryFor('screen and (min-width: 400px)', 'print')).toBe('speech and (min-width: 400px)');
	expect(queryFor('print', 'light')).toBe('print');
	expect(queryFor('(min-width: 400px)', 'dark')).toBe('(min-width: 400px)');
});

test('settings are the same in whatever order they were made', () => {
	expect(settingsText({ b: 2, a: 1 })).toBe(settingsText({ a: 1, b: 2 }));
});

test('pages of A4', () => {
	expect([1, 1009, 1010, 1011, 2018].map(pagesOf)).toEqual([1, 1, 1, 2, 2]);
});
