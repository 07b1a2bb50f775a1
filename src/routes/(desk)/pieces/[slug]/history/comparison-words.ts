import type { Comparison } from '$lib/widget/compare.ts';

/** “2 blocks changed, 1 added; 3 changes on the bench.” */
export function comparisonSentence({
	title,
	point,
	blocks,
	wiring,
	settings,
	isSame
}: Comparison): string {
	if (isSame) return 'The two are the same, word for word.';
	const isChanged = (words: Comparison['title']) => words.some(({ kind }) => kind !== 'same');
	const count = (what: string) => blocks.filter((block) => block.what === what).length;
	const moved = blocks.filter(({ isMoved, what }) => isMoved && what === 'same').length;
	const heads = [isChanged(title) ? 'title' : '', isChanged(point) ? 'point' : ''].filter(Boolean);
	const ofBlocks = [
		counted(count('changed'), 'changed'),
		counted(count('added'), 'added'),
		counted(count('taken-out'), 'taken out'),
		counted(moved, 'moved')
	].filter(Boolean);
	const parts = [
		heads.length > 0 ? `the ${heads.join(' and the ')} changed` : '',
		ofBlocks.length > 0 ? `blocks: ${ofBlocks.join(', ')}` : '',
		wiring.length > 0
			? `on the bench: ${wiring.length} ${wiring.length === 1 ? 'change' : 'changes'}`
			: '',
		settings.length > 0 ? 'the piece as a whole changed' : ''
	].filter(Boolean);
	const sentence = parts.join('; ') || 'nothing that a reader meets';
	return `${sentence.charAt(0).toUpperCase()}${sentence.slice(1)}.`;
}

function counted(number: number, what: string): string {
	return number === 0 ? '' : `${number} ${what}`;
}
