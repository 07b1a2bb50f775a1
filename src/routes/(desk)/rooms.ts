import type { KeyGroup } from '$lib/ui/KeysPanel.svelte';
import { routes } from '$lib/routes.ts';

/** The rooms of the house in the order of the work, and Calculators at the far end of the rule. */
export interface Room {
	key: 'desk' | 'manuscript' | 'check' | 'release' | 'calculators';
	label: string;
	/** Where it is; null while no piece is open and the room needs one. */
	href: string | null;
	/** The letter that goes there after `g`. */
	letter: string;
	/** Where the rider hangs: on the wide rule, and as a share of the narrow one. */
	wide: string;
	narrow: string;
}

/** The distance of the first room's middle from the left, and from one room's middle to the next: long ticks of the rule. */
const FIRST = 72;
const APART = 96;

export function roomsOf(slug: string | null): Room[] {
	const piece = (address: (slug: string) => string) => (slug === null ? null : address(slug));
	const row: Pick<Room, 'key' | 'label' | 'href' | 'letter'>[] = [
		{ key: 'desk', label: 'Desk', href: routes.desk(), letter: 'd' },
		{ key: 'manuscript', label: 'Manuscript', href: piece(routes.manuscript), letter: 'm' },
		{ key: 'check', label: 'Check', href: piece(routes.check), letter: 'c' },
		{ key: 'release', label: 'Release', href: piece(routes.release), letter: 'r' },
		{ key: 'calculators', label: 'Calculators', href: routes.calculators(), letter: 'k' }
	];
	return row.map((room, index) => ({
		...room,
		wide: room.key === 'calculators' ? 'calc(100% - 60px)' : `${FIRST + APART * index}px`,
		narrow: `${((index + 0.5) * 100) / row.length}%`
	}));
}

/** The room a route belongs to. */
export function roomOf(routeId: string | null): Room['key'] | null {
	const path = routeId ?? '';
	if (path.startsWith('/(desk)/desk')) return 'desk';
	if (path.startsWith('/(desk)/calculators')) return 'calculators';
	const room = /^\/\(desk\)\/pieces\/\[slug\]\/(manuscript|check|release)/.exec(path)?.[1];
	return (room as Room['key'] | undefined) ?? null;
}

/** What the keys panel lists: the room's own keys first, then those that act everywhere. */
export function keysOf(room: Room['key'] | null, rooms: Room[]): KeyGroup[] {
	const own: Partial<Record<Room['key'], KeyGroup>> = {
		desk: { title: 'Desk', keys: [{ press: ['N'], does: 'new slip' }] },
		manuscript: {
			title: 'Manuscript',
			keys: [
				{ press: ['='], does: 'tie the number at the cursor' },
				{ press: ['Ctrl .'], does: 'next number that isn’t weighed' },
				{ press: ['Ctrl B'], does: 'the bench' },
				{ press: ['/'], does: 'in an empty line: put something in' },
				{ press: ['Ctrl I'], does: 'emphasis' },
				{ press: ['Ctrl Shift B'], does: 'strong' },
				{ press: ['Ctrl Z'], does: 'undo' },
				{ press: ['Ctrl Y'], does: 'redo' }
			]
		},
		check: {
			title: 'Check',
			keys: [
				{ press: ['1'], does: 'sign this claim' },
				{ press: ['2'], does: 'query it' },
				{ press: ['J', '→'], does: 'next claim' },
				{ press: ['K', '←'], does: 'claim before' },
				{ press: ['E'], does: 'calculator with these settings' }
			]
		},
		calculators: { title: 'Calculators', keys: [{ press: ['/'], does: 'to the filter' }] }
	};
	const group = room && own[room];
	return [
		...(group ? [group] : []),
		{
			title: 'Everywhere',
			keys: [
				...rooms.flatMap(({ href, letter, label }) =>
					href === null ? [] : [{ press: ['G', letter.toUpperCase()], does: `go to ${label}` }]
				),
				{ press: ['?'], does: 'this list' }
			]
		}
	];
}
