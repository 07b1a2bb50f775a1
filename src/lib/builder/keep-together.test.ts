import { beforeEach, describe, expect, test } from 'vitest';
import { catalogue } from '../physics/calculators/index.ts';
import { firstLight } from '../server/demo/first-light.ts';
import { isTextBlock, type WidgetDocument } from '../widget/document.ts';
import type { TheirVersion } from './autosave.svelte.ts';
import type { Journal } from './journal.ts';
import { askReason, askWords } from './keep-ask-words.ts';
import type { OpenAsk } from './keep-asks.ts';
import { bringBackLeft } from './keep-left.ts';
import { Together } from './keep-together.svelte.ts';
import { PatientJournal } from './patient-journal.svelte.ts';

const KOFI = { personId: 'kofi', name: 'Kofi Adjarra-Lund' };
const ME = { personId: 'tamsin', name: 'Tamsin Orrelby' };

class AskJournal implements Pick<Journal, 'keepAsk' | 'listAsks' | 'dropAsk'> {
	asks: OpenAsk[] = [];
	keepAsk = async (ask: OpenAsk) => {
		this.asks = [...this.asks.filter(({ id }) => id !== ask.id), ask];
	};
	listAsks = async () => this.asks;
	dropAsk = async (id: string) => {
		this.asks = this.asks.filter((ask) => ask.id !== id);
	};
}

const write = (document: WidgetDocument, id: string, words: string) => {
	const copy = structuredClone(document);
	const block = copy.blocks.find((one) => one.id === id);
	const last = block && isTextBlock(block) ? block.content.at(-1) : undefined;
	if (last?.kind === 'text') last.text += words;
	return copy;
};
const wordsIn = (document: WidgetDocument) => JSON.stringify(document.blocks);

let journal: AskJournal;
let draft: WidgetDocument;
let together: Together;

const sheet = {
	draft: () => draft,
	takeIn: (document: WidgetDocument) => (draft = document),
	rewrite: (document: WidgetDocument) => (draft = document)
};
const open = () =>
	new Together({
		sheet,
		calculators: catalogue,
		journal: new PatientJournal(journal as unknown as Journal),
		personId: ME.personId
	});
const theirs = (document: unknown, savedBy = KOFI, at = '09:02'): TheirVersion => ({
	version: 4,
	savedAt: `2026-12-08T${at}:00.000Z`,
	savedBy,
	document
});

beforeEach(() => {
	journal = new AskJournal();
	draft = firstLight;
	together = open();
});

describe('someone else’s version', () => {
	test('comes in beside one’s own words, and says whose it was', () => {
		draft = write(firstLight, 'opening', ' Mine.');
		expect(together.takeIn(firstLight, theirs(write(firstLight, 'limits', ' Theirs.')))).toBe(
			'taken'
		);
		expect(wordsIn(draft)).toContain(' Mine.');
		expect(wordsIn(draft)).toContain(' Theirs.');
		expect(together.asks).toEqual([]);
		expect(together.taken).toMatchObject({ name: KOFI.name, isSelf: false });
	});

	test('from another window of one’s own is known as such', () => {
		draft = write(firstLight, 'opening', ' Here.');
		together.takeIn(firstLight, theirs(write(firstLight, 'opening', ' There.'), ME));
		expect(together.taken).toMatchObject({ isSelf: true });
		expect(together.isSelf(together.asks[0]!)).toBe(true);
	});

	test('in the same block is asked about, and the question outlives the window', async () => {
		draft = write(firstLight, 'opening', ' Mine.');
		together.takeIn(firstLight, theirs(write(firstLight, 'opening', ' Theirs.')));
		expect(together.asks).toHaveLength(1);
		expect(wordsIn(draft)).toContain(' Mine.');
		together = open();
		await together.recall();
		expect(together.asks).toMatchObject([{ place: 'blocks/opening', by: KOFI }]);
		expect(together.decide(together.asks[0]!, 'theirs')).toBeNull();
		expect(wordsIn(draft)).toContain(' Theirs.');
		expect(wordsIn(draft)).not.toContain(' Mine.');
		expect(journal.asks).toEqual([]);
	});

	test('with nothing known of what both grew from, takes nothing for deleted', () => {
		draft = write(firstLight, 'opening', ' Mine.');
		const other = structuredClone(firstLight);
		other.blocks = other.blocks.filter(({ id }) => id !== 'limits');
		expect(together.takeIn(null, theirs(other))).toBe('taken');
		expect(draft.blocks.map(({ id }) => id)).toContain('limits');
		expect(together.asks.map(({ place }) => place)).toEqual(['blocks/opening']);
	});

	test('that this window can’t read, and own words that don’t hang together, are said so', () => {
		expect(together.takeIn(firstLight, theirs({ version: 99 }))).toBe('unreadable');
		draft = { ...firstLight, title: 'x'.repeat(130) };
		expect(together.takeIn(firstLight, theirs(write(firstLight, 'limits', ' T.')))).toBe(
			'unfinished'
		);
		expect(draft.title).toHaveLength(130);
	});
});

describe('an open question', () => {
	const [t1, t2] = [' Theirs.', ' Theirs, later.'];
	beforeEach(() => {
		draft = write(firstLight, 'opening', ' Mine.');
		together.takeIn(firstLight, theirs(write(firstLight, 'opening', t1)));
	});

	test('goes on with their newest words when they write on', () => {
		const base = write(firstLight, 'opening', t1);
		draft = write(draft, 'opening', ' More.');
		together.takeIn(base, theirs(write(firstLight, 'opening', t2), KOFI, '09:05'));
		expect(together.asks).toHaveLength(1);
		expect(JSON.stringify(together.asks[0]?.theirs)).toContain(t2);
		expect(JSON.stringify(together.asks[0]?.mine)).toContain(' Mine. More.');
	});

	test('keeps one’s own words though the sheet has taken theirs', () => {
		const kept = draft;
		together.takeIn(kept, theirs(write(firstLight, 'opening', t2), KOFI, '09:05'));
		expect(wordsIn(draft)).toContain(t2);
		expect(together.asks[0]).toMatchObject({ stands: 'theirs' });
		expect(together.decide(together.asks[0]!, 'mine')).toBeNull();
		expect(wordsIn(draft)).toContain(' Mine.');
	});

	test('of two people are two questions', () => {
		draft = write(draft, 'opening', ' More.');
		const perpetua = { personId: 'perpetua', name: 'Perpetua Lindqvane' };
		together.takeIn(
			write(firstLight, 'opening', t1),
			theirs(write(firstLight, 'opening', ' Hers.'), perpetua, '09:06')
		);
		expect(together.asks.map(({ by }) => by.personId)).toEqual(['kofi', 'perpetua']);
	});

	test('is gone when both say the same', () => {
		draft = write(firstLight, 'opening', t2);
		together.takeIn(
			write(firstLight, 'opening', t1),
			theirs(write(firstLight, 'opening', t2), KOFI, '09:05')
		);
		expect(together.asks).toEqual([]);
	});

	test('is said in words, with what differs', () => {
		const ask = together.asks[0]!;
		const { what, words } = askWords(ask, {
			document: draft,
			words: (inline) => ('text' in inline ? inline.text : '…'),
			calculators: catalogue
		});
		expect(what).toBe('This paragraph');
		expect(words?.filter(({ kind }) => kind !== 'same').map(({ text }) => text.trim())).toEqual([
			'Mine',
			'Theirs'
		]);
		expect(askReason(ask, what, KOFI.name)).toBe(
			'This paragraph was changed here, and by Kofi Adjarra-Lund.'
		);
	});
});

describe('what windows left behind', () => {
	const entry = (document: unknown, key: string, base: unknown = firstLight) => ({
		key,
		baseVersion: 1,
		base,
		document,
		at: `2026-12-08T09:0${key}:00.000Z`
	});
	const bringBack = async (left: ReturnType<typeof entry>[], kept: unknown = firstLight) => {
		const gone: string[] = [];
		const aside: unknown[] = [];
		const store = Object.assign(journal, {
			read: async () => left,
			letGo: async ({ key }: { key: string }) => void gone.push(key),
			setAside: async (set: unknown) => void aside.push(set)
		});
		const patient = new PatientJournal(store as unknown as Journal);
		const started: number[] = [];
		const isBack = await bringBackLeft({
			keeper: {
				goOnFrom: ({ baseVersion }) => started.push(baseVersion),
				flushJournal: async () => undefined
			},
			together,
			journal: patient,
			sheet,
			calculators: catalogue,
			kept,
			person: ME
		});
		return { isBack, gone, aside, started };
	};

	test('comes back, and grows from what it grew from', async () => {
		const result = await bringBack([entry(write(firstLight, 'opening', ' Left.'), '1')]);
		expect(result).toMatchObject({ isBack: true, gone: ['1'], aside: [], started: [1] });
		expect(wordsIn(draft)).toContain(' Left.');
	});

	test('of two windows, both come back', async () => {
		const result = await bringBack([
			entry(write(firstLight, 'opening', ' One.'), '1'),
			entry(write(firstLight, 'limits', ' Two.'), '2')
		]);
		expect(result).toMatchObject({ gone: ['1', '2'], started: [1] });
		expect(wordsIn(draft)).toContain(' One.');
		expect(wordsIn(draft)).toContain(' Two.');
	});

	test('that the server has by now is let go; what no sheet can take is set aside', async () => {
		expect(await bringBack([entry(firstLight, '1')])).toMatchObject({ isBack: false, gone: ['1'] });
		const result = await bringBack([entry({ title: null }, '2')]);
		expect(result).toMatchObject({
			isBack: false,
			gone: ['2'],
			aside: [{ document: { title: null } }]
		});
		expect(draft).toEqual(firstLight);
	});
});
