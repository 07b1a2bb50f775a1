/** The desk’s short words about a picture. Pure. */
import { pictureReady, RIGHTS_NOTICE_DAYS, rightsDaysLeft, type PictureRecord } from './record.ts';
import type { PictureUse } from './view.ts';

/** “10 MB”, “320 kB”. */
export function sizeWords(bytes: number): string {
	return bytes >= 1e6
		? `${(bytes / 1e6).toFixed(1)} MB`
		: `${Math.max(1, Math.round(bytes / 1000))} kB`;
}

/** How far its record is. */
export function readyWords(
	record: PictureRecord,
	today: string
): { ready: boolean; words: string } {
	const { ready, findings } = pictureReady(record, today);
	if (ready) return { ready, words: 'ready to use' };
	const [first] = findings;
	if (findings.length === 1 && first?.field === 'rightsEnd')
		return { ready, words: 'rights ended' };
	return {
		ready,
		words: findings.length === 1 ? 'one thing missing' : `${findings.length} things missing`
	};
}

/** When the rights end, from two months before; null earlier, and when they don’t. */
export function rightsWords(record: PictureRecord, today: string): string | null {
	const days = rightsDaysLeft(record, today);
	if (days === null || days > RIGHTS_NOTICE_DAYS) return null;
	if (days < 0) return `The rights ended on ${record.rightsEnd}.`;
	if (days === 0) return 'The rights end today.';
	return days === 1
		? 'The rights end tomorrow.'
		: `The rights end in ${days} days, on ${record.rightsEnd}.`;
}

/** Where one piece has it: “draft, proof 2, release 1 (live)”. */
export function useWords({ draft, proofs, releases, live }: PictureUse): string {
	const many = (one: string, several: string, numbers: number[]) =>
		numbers.length === 0 ? [] : [`${numbers.length === 1 ? one : several} ${numbers.join(', ')}`];
	return [
		...(draft ? ['draft'] : []),
		...many('proof', 'proofs', proofs),
		...many('release', 'releases', releases).map((words) => (live ? `${words}, live` : words))
	].join('; ');
}

/** “used in two pieces”. */
export function usedWords(uses: readonly PictureUse[]): string {
	if (uses.length === 0) return 'not used';
	const live = uses.filter((use) => use.live).length;
	const pieces = uses.length === 1 ? 'one piece' : `${uses.length} pieces`;
	return `in ${pieces}${live > 0 ? ', live' : ''}`;
}
