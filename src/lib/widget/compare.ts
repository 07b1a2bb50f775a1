/**
 * Two versions of a document laid side by side, as plain data: the words of each block, and beside them what changed in
 * wiring, controls, axes and captions, each as a name with what it was and what it is.
 */
import type { CalculatorSet } from '../physics/calculator.ts';
import { Names } from './compare-names.ts';
import { settingChanges, type SettingChange } from './compare-settings.ts';
import { wordChanges, type WordPart } from './compare-words.ts';
import { isTextBlock, type Block, type WidgetDocument } from './document.ts';
import { evaluate } from './evaluate.ts';
import { moved } from './merge-order.ts';
import { same } from './merge-parts.ts';
import { blockText, wordsAt, type Words } from './places.ts';

export interface BlockChange {
	id: string;
	kind: Block['kind'];
	/** `moved` is said beside `changed` too, by `isMoved`. */
	what: 'same' | 'changed' | 'added' | 'taken-out';
	isMoved: boolean;
	/** The copy, word by word; null for blocks that have none. */
	words: WordPart[] | null;
	/** Everything about the block that isn’t its copy. */
	settings: SettingChange[];
}

/** A part of the wiring: a calculator on the bench, a control, a formula, a number of the copy. */
export interface WiringChange {
	list: 'formulas' | 'steps' | 'controls' | 'claims';
	id: string;
	/** What it is, as a person knows it: “Slider “How far the weight falls””. */
	name: string;
	what: 'changed' | 'added' | 'taken-out';
	settings: SettingChange[];
}

export interface Comparison {
	title: WordPart[];
	point: WordPart[];
	/** In the order of the newer version; what was taken out stands where it stood. */
	blocks: BlockChange[];
	wiring: WiringChange[];
	/** Language, constants edition and whatever else the document itself says. */
	settings: SettingChange[];
	isSame: boolean;
}

const LISTS = ['formulas', 'steps', 'controls', 'claims'] as const;

export function compareDocuments(
	before: WidgetDocument,
	after: WidgetDocument,
	calculators: CalculatorSet
): Comparison {
	const sides = { before: sideOf(before, calculators), after: sideOf(after, calculators) };
	const names = { before: sides.before.names, after: sides.after.names };
	return {
		title: wordChanges(before.title, after.title),
		point: wordChanges(before.point, after.point),
		blocks: blockChanges(sides.before, sides.after),
		wiring: LISTS.flatMap((list) => wiringChanges(list, sides.before, sides.after)),
		settings: settingChanges(ownFields(before), ownFields(after), names),
		isSame: same(before, after)
	};
}

/** One version, with what its things are called and how its numbers read. */
interface Version {
	document: WidgetDocument;
	names: Names;
	words: Words;
}

/** Live numbers are printed as a reader first meets them, so that a change of wiring shows in the words it moves. */
function sideOf(document: WidgetDocument, calculators: CalculatorSet): Version {
	const words = wordsAt(document, evaluate(document, {}, calculators), calculators);
	return { document, words, names: new Names(document, calculators, words) };
}

/** What the document says of itself, apart from its words and its lists. */
function ownFields(document: WidgetDocument): Record<string, unknown> {
	const told = new Set<string>(['version', 'title', 'point', 'blocks', ...LISTS]);
	return Object.fromEntries(Object.entries(document).filter(([key]) => !told.has(key)));
}

function blockChanges(before: Version, after: Version): BlockChange[] {
	const were = new Map(before.document.blocks.map((block) => [block.id, block]));
	const are = new Map(after.document.blocks.map((block) => [block.id, block]));
	const movedIds = moved([...were.keys()], [...are.keys()]);
	const names = { before: before.names, after: after.names };
	return withTakenOut([...were.keys()], [...are.keys()]).flatMap((id): BlockChange[] => {
		const [was, is] = [were.get(id), are.get(id)];
		const block = is ?? was;
		if (!block) return [];
		const words = wordsOf(was, is, before.words, after.words);
		// What the block names may be called otherwise by now; that is told where it was changed.
		const isWritten = !was || !is || !same(was, is);
		const settings = isWritten
			? settingChanges(withoutWords(was, is), withoutWords(is, was), names)
			: [];
		const isChanged = settings.length > 0 || words?.some(({ kind }) => kind !== 'same');
		return [
			{
				id,
				kind: block.kind,
				what: !was ? 'added' : !is ? 'taken-out' : isChanged ? 'changed' : 'same',
				isMoved: was !== undefined && is !== undefined && movedIds.has(id),
				words,
				settings
			}
		];
	});
}

function wordsOf(
	was: Block | undefined,
	is: Block | undefined,
	before: Words,
	after: Words
): WordPart[] | null {
	const text = (block: Block | undefined, words: Words) =>
		block && isTextBlock(block) ? blockText(block, words) : null;
	const [then, now] = [text(was, before), text(is, after)];
	return then === null && now === null ? null : wordChanges(then ?? '', now ?? '');
}

/** The newer order, with what is gone put in after what it followed. */
function withTakenOut(were: readonly string[], are: readonly string[]): string[] {
	const order = [...are];
	const present = new Set(are);
	let last: string | null = null;
	for (const id of were) {
		if (!present.has(id)) order.splice(last === null ? 0 : order.indexOf(last) + 1, 0, id);
		last = id;
	}
	return order;
}

/** A block apart from its words: of running text, which are emphasised. Its kind is told where it became another. */
function withoutWords(block: Block | undefined, other: Block | undefined): Record<string, unknown> {
	if (!block) return {};
	const { kind, ...rest } = { ...block, kind: other ? block.kind : undefined };
	if (!isTextBlock(block)) return { ...rest, kind };
	const marked = (mark: 'em' | 'strong') =>
		block.content
			.flatMap((inline) =>
				inline.kind === 'text' && inline.marks?.includes(mark) ? [inline.text.trim()] : []
			)
			.join(' … ');
	return { kind, emphasis: marked('em'), strong: marked('strong') };
}

function wiringChanges(
	list: (typeof LISTS)[number],
	before: Version,
	after: Version
): WiringChange[] {
	const were = new Map(before.document[list].map((member) => [member.id, member]));
	const are = new Map(after.document[list].map((member) => [member.id, member]));
	const names = { before: before.names, after: after.names };
	return [...new Set([...are.keys(), ...were.keys()])].flatMap((id): WiringChange[] => {
		const [was, is] = [were.get(id), are.get(id)];
		if (was && is && same(was, is)) return [];
		return [
			{
				list,
				id,
				name: (is ? after : before).names.of(list, id),
				what: !was ? 'added' : !is ? 'taken-out' : 'changed',
				settings: settingChanges({ ...was }, { ...is }, names)
			}
		];
	});
}
