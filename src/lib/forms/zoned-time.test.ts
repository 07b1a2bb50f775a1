import { describe, expect, test } from 'vitest';
import { instantOf, isZone, wallTime } from './zoned-time.ts';

// Changes of clocks as in the IANA time zone database: Berlin on 29 March and 25 October 2026, New York on 8 March
// and 1 November 2026; Apia skipped 30 December 2011.
describe('the instant of a time on the wall', () => {
	test.each([
		['2026-12-17T15:00', 'Europe/Berlin', '2026-12-17T14:00:00.000Z'],
		['2026-07-01T15:00', 'Europe/Berlin', '2026-07-01T13:00:00.000Z'],
		['2026-12-17T15:00', 'UTC', '2026-12-17T15:00:00.000Z'],
		['2026-12-17T15:00', 'Pacific/Kiritimati', '2026-12-17T01:00:00.000Z'],
		['2026-12-17T15:00', 'Pacific/Pago_Pago', '2026-12-18T02:00:00.000Z'],
		['2026-12-17T15:00', 'Asia/Kathmandu', '2026-12-17T09:15:00.000Z'],
		['2026-12-31T23:59', 'America/New_York', '2027-01-01T04:59:00.000Z']
	])('%s in %s is %s', (wall, zone, at) => {
		expect(instantOf(wall, zone)?.toISOString()).toBe(at);
		expect(wallTime(new Date(at), zone)).toBe(wall);
	});

	test.each([
		['2026-10-25T02:30', 'Europe/Berlin', '2026-10-25T00:30:00.000Z'],
		['2026-11-01T01:30', 'America/New_York', '2026-11-01T05:30:00.000Z']
	])('%s in %s comes twice; the first counts', (wall, zone, at) => {
		expect(instantOf(wall, zone)?.toISOString()).toBe(at);
	});

	test.each([
		['2026-03-29T02:30', 'Europe/Berlin'],
		['2026-03-08T02:30', 'America/New_York'],
		['2011-12-30T12:00', 'Pacific/Apia'],
		['2026-02-30T12:00', 'UTC'],
		['2026-02-03T25:00', 'UTC'],
		['soon', 'UTC']
	])('%s in %s never comes', (wall, zone) => {
		expect(instantOf(wall, zone)).toBeNull();
	});
});

test.each([
	['Europe/Berlin', true],
	['UTC', true],
	['Middle/Earth', false],
	['', false]
])('%s is a zone: %s', (zone, known) => {
	expect(isZone(zone)).toBe(known);
});
