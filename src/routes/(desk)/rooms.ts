import type { KeyGroup } from '$lib/ui/KeysPanel.svelte';
import { routes } from '$lib/routes.ts';

/** The rooms of the house in the order of the work; Calculators and the picture desk at the far end of the rule. */
export interface Room {
	key: 'desk' | 'manuscript' | 'check' | 'galley' | 'release' | 'calculators' | 'pictures';
	label: string;
	/** Where the rule is narrow. */
	short?: string;
	/** Where it is; null while no piece is open and the room needs one. */
	href: string | null;
	/** The letter that goes there after `g`. */
	letter: string;
	/** How much of the narrow rule it takes, as a CSS length: each has room in proportion to its word. */
	share: string;
	/** Where the rider hangs, on the wide rule and on the narrow one. */
	wide: string;
	narrow: string;
}

/** The distance of the first room's middle from the left, and from one room's middle to the next: long ticks of the rule. */
const FIRST = 72;
const APART = 96;
/** The rooms at the far end, by the distance of their middle from the right. */
const FAR: Partial<Record<Room['key'], number>> = { calculators: 156, pictures: 60 };

export function roomsOf(slug: string | null): Room[] {
	const piece = (address: (slug: string) => string) => (slug === null ? null : address(slug));
	const row: Omit<Room, 'share' | 'wide' | 'narrow'>[] = [
		{ key: 'desk', label: 'Desk', href: routes.desk(), letter: 'd' },
		{ key: 'manuscript', label: 'Manuscript', href: piece(routes.manuscript), letter: 'm' },
		{ key: 'check', label: 'Check', href: piece(routes.check), letter: 'c' },
		{ key: 'galley', label: 'Galley', href: piece(routes.galley), letter: 'y' },
		{ key: 'release', label: 'Release', href: piece(routes.release), letter: 'r' },
		{ key: 'calculators', label: 'Calculators', href: routes.calculators(), letter: 'k' },
		{
			key: 'pictures',
			label: 'Picture desk',
			short: 'Pictures',
			href: routes.pictures(),
			letter: 'p'
		}
	];
	// In letters, with two for the gap to the next.
	const sizes = row.map(({ label, short }) => (short ?? label).length + 2);
	const total = sizes.reduce((sum, size) => sum + size, 0);
	const percent = (letters: number) => `${((letters / total) * 100).toFixed(2)}%`;
	return row.map((room, index) => {
		const size = sizes[index] ?? 0;
		const before = sizes.slice(0, index).reduce((sum, other) => sum + other, 0);
		return {
			...room,
			share: percent(size),
			wide: room.key in FAR ? `calc(100% - ${FAR[room.key]}px)` : `${FIRST + APART * index}px`,
			narrow: percent(before + size / 2)
		};
	});
}

/** The room a route belongs to. */
export function roomOf(routeId: string | null): Room['key'] | null {
	const path = routeId ?? '';
	if (path.startsWith('/(desk)/desk')) return 'desk';
	if (path.startsWith('/(desk)/calculators')) return 'calculators';
	if (path.startsWith('/(desk)/pictures')) return 'pictures';
	// Earlier drafts are of the manuscript.
	if (path.startsWith('/(desk)/pieces/[slug]/history')) return 'manuscript';
	const room = /^\/\(desk\)\/pieces\/\[slug\]\/(manuscript|check|galley|release)/.exec(path)?.[1];
	return (room as Room['key'] | undefined) ?? null;
}

/** What the keys panel lists: the room's own keys first, then those that act everywhere. */
export function keysOf(room: Room['key'] | null, rooms: Room[]): KeyGroup[] {
	const own: Partial<Record<Room['key'], KeyGroup>> = {
		desk: { title: 'Desk', keys: [{ press: ['N'], does: 'new slip' }] },
		manuscript: {
			title: 'Manuscript',
			keys: [
				{ press: ['='], does: 'tie the number at the cursor, or the words selected' },
				{ press: ['Ctrl .'], does: 'next number that isn’t weighed' },
				{ press: ['Ctrl B'], does: 'the bench' },
				{ press: ['/'], does: 'in an empty line: put something in' },
				{ press: ['Enter'], does: 'on a selected block: its form' },
				{ press: ['Alt ↑', 'Alt ↓'], does: 'move the block' },
				{ press: ['Delete'], does: 'on a selected block: take it out' },
				{ press: ['Alt Enter'], does: 'take the words that the nearest note offers' },
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
		galley: {
			title: 'Galley',
			keys: [
				{ press: ['['], does: 'strip before' },
				{ press: [']'], does: 'next strip' },
				{ press: ['F'], does: 'next fault' }
			]
		},
		calculators: { title: 'Calculators', keys: [{ press: ['/'], does: 'to the filter' }] },
		pictures: {
			title: 'Picture desk',
			keys: [
				{ press: ['/'], does: 'to the search' },
				{ press: ['Ctrl V'], does: 'add the picture that was copied' }
			]
		}
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
				{ press: ['?', 'Ctrl ?'], does: 'this list; in a field with Ctrl' }
			]
		}
	];
}
