/** An open ask in words: what it is about, why it is asked, and the two versions side by side. */
import type { CalculatorSet } from '../physics/calculator.ts';
import { Names } from '../widget/compare-names.ts';
import { settingChanges, type SettingChange } from '../widget/compare-settings.ts';
import { wordChanges, type WordPart } from '../widget/compare-words.ts';
import { isTextBlock, type Block, type WidgetDocument } from '../widget/document.ts';
import type { Choice, Side } from '../widget/merge-ask.ts';
import { blockText, type Words } from '../widget/places.ts';
import type { OpenAsk } from './keep-asks.ts';
import { BLOCK_WORDS } from './schema.ts';

export interface AskWords {
	/** “This paragraph”, “The title”, “Slider “How far the weight falls””. */
	what: string;
	/** What the two versions say, word by word; null where they have no words, or one of them is gone. */
	words: WordPart[] | null;
	/** What else differs: `before` is one's own. */
	settings: SettingChange[];
}

export interface InSheet {
	document: WidgetDocument;
	words: Words;
	calculators: CalculatorSet;
}

export function askWords(ask: OpenAsk, { document, words, calculators }: InSheet): AskWords {
	const names = new Names(document, calculators, words);
	const { mine, theirs } = ask;
	const texts = [mine, theirs].map((side) => textOf(ask, side, words));
	const [own, other] = texts;
	const isWords = texts.some((text) => text !== null);
	return {
		what: whatOf(ask, names),
		words: isWords ? wordChanges(own ?? '', other ?? '') : null,
		settings:
			isWords || !mine || !theirs
				? []
				: settingChanges(thingOf(mine), thingOf(theirs), { before: names, after: names })
	};
}

function whatOf({ list, member, mine, theirs }: OpenAsk, names: Names): string {
	if (list === null) return `The ${member === 'constants' ? 'constants edition' : member}`;
	if (list === 'blocks') return `This ${BLOCK_WORDS[((mine ?? theirs)?.value as Block).kind]}`;
	return names.of(list as 'formulas' | 'steps' | 'controls' | 'claims', member);
}

function textOf({ list }: OpenAsk, side: Side | null, words: Words): string | null {
	const value = side?.value;
	if (list === null && typeof value === 'string') return value;
	if (list !== 'blocks' || !value) return null;
	const block = value as Block;
	return isTextBlock(block) ? blockText(block, words) : null;
}

function thingOf({ value }: Side): Record<string, unknown> {
	return typeof value === 'object' && value !== null ? { ...value } : { value };
}

/** Why it is asked, as a sentence; `who` is “Kofi Adjarra-Lund”, or “you, in another window”. */
export function askReason({ reason, mine, stands }: OpenAsk, what: string, who: string): string {
	switch (reason) {
		case 'both-changed':
			return `${what} was changed here, and by ${who}.`;
		case 'taken-out':
			return mine === null
				? `${what} was taken out here, and changed by ${who}. It stands until you decide.`
				: `${what} was changed here, and taken out by ${who}. It stands until you decide.`;
		case 'still-in-use':
			return stands === 'theirs'
				? `${what} was taken away here, and ${who} hung something on it. It stands until you decide.`
				: `${what} was taken away by ${who}, and something here hangs on it. It stands until you decide.`;
		case 'no-fit':
			return `${what} was changed by ${who} in a way that doesn’t fit what stands here. Yours stands until you decide.`;
	}
}

/** What the plate of a choice says. */
export function choiceWords(choice: Choice, { mine, theirs }: OpenAsk): string {
	if (choice === 'both') return 'Keep both';
	const side = choice === 'mine' ? mine : theirs;
	if (!side) return 'Leave it out';
	return choice === 'mine' ? 'Keep mine' : 'Keep theirs';
}
