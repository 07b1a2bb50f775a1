/** The four sides of the forme, each with its conditions. A side is locked when every one of them is met. */
import type { Condition } from '$lib/workflow/piece.ts';

export interface Side {
	key: Condition['side'];
	title: string;
	conditions: Condition[];
	locked: boolean;
}

const TITLES: Record<Condition['side'], string> = {
	claims: 'Claims',
	people: 'People',
	galley: 'Galley',
	time: 'Time'
};

export function sidesOf(conditions: readonly Condition[]): Record<Condition['side'], Side> {
	const side = (key: Condition['side']): Side => {
		const own = conditions.filter((condition) => condition.side === key);
		return { key, title: TITLES[key], conditions: own, locked: own.every(({ met }) => met) };
	};
	return {
		claims: side('claims'),
		people: side('people'),
		galley: side('galley'),
		time: side('time')
	};
}

const NUMBERS = ['None', 'One', 'Two', 'Three', 'All four'];

/** “One is open: claims.” */
export function openWords(sides: Record<Condition['side'], Side>): string {
	const open = Object.values(sides).filter(({ locked }) => !locked);
	const names = open.map(({ title }) => title.toLowerCase()).join(', ');
	return `${NUMBERS[open.length]} ${open.length === 1 ? 'is' : 'are'} open: ${names}.`;
}
