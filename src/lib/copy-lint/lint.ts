/**
 * Reads a piece's copy for small shames: what a good copy desk would pencil into the margin. Notes only; nothing here
 * stops a proof and nothing changes the copy. About a millisecond for a thousand words.
 */
import type { WidgetDocument } from '../widget/document.ts';
import type { Language } from '../widget/language.ts';
import { abbreviationFinding, capitalsFinding, isAllCapitals } from './capitals.ts';
import { partsOf, type CopyPart } from './copy.ts';
import type { Field, Finding, LintNote } from './note.ts';
import { besideFindings, headingFindings } from './parts-beside.ts';
import { sentenceFindings } from './sentences.ts';
import { HOUSE_TERMS, isExplained, termTraps, type TermList } from './terms.ts';
import { GERMAN } from './traps/de.ts';
import { ENGLISH } from './traps/en.ts';
import { SPANISH } from './traps/es.ts';
import { indexTraps, trapAt, type Trap, type TrapIndex } from './traps/trap.ts';
import { signsIn } from './typography.ts';

export interface LintOptions {
	/** By the document's language when it isn't given. */
	language?: Language;
	/** The house's own term list in place of ours. */
	terms?: TermList;
}

/** Notes in reading order. */
export function lintCopy(document: WidgetDocument, options: LintOptions = {}): LintNote[] {
	return lintParts(partsOf(document), {
		...options,
		language: options.language ?? document.language
	});
}

/** The same for copy that is no document yet, such as an import. */
export function lintParts(
	parts: readonly CopyPart[],
	{ language, terms }: { language: Language; terms?: TermList }
): LintNote[] {
	const reading: Reading = {
		language,
		index: terms ? indexOf(language, terms) : houseIndex(language),
		met: new Set()
	};
	const headings = new Map<CopyPart, Finding[]>();
	for (const { part, finding } of headingFindings(parts)) {
		headings.set(part, [...(headings.get(part) ?? []), finding]);
	}
	return parts.flatMap((part) =>
		[...partFindings(part, reading), ...(headings.get(part) ?? [])]
			.sort((one, other) => one.from - other.from || other.to - one.to)
			.filter(isApart)
			.map((finding) => ({ block: part.block, field: part.field, ...finding }))
	);
}

/** One rule speaks once of the same words. */
function isApart(finding: Finding, index: number, all: readonly Finding[]): boolean {
	return !all.slice(0, index).some(({ code, to }) => code === finding.code && to > finding.from);
}

/** What travels from part to part while a piece is read once through. */
interface Reading {
	language: Language;
	index: TrapIndex;
	/** Terms and abbreviations that a reader has met by now. */
	met: Set<unknown>;
}

const TRAPS: Record<Language, readonly Trap[]> = { en: ENGLISH, de: GERMAN, es: SPANISH };
const houseIndices = new Map<Language, TrapIndex>();

function indexOf(language: Language, terms: TermList): TrapIndex {
	return indexTraps([...TRAPS[language], ...termTraps(terms)]);
}

function houseIndex(language: Language): TrapIndex {
	const known = houseIndices.get(language);
	if (known) return known;
	const index = indexOf(language, HOUSE_TERMS[language]);
	houseIndices.set(language, index);
	return index;
}

/** Fields that are running text; the others are lines, in which only signs and phrases are looked at. */
const RUNNING: readonly Field[] = ['copy', 'point', 'description', 'caption', 'question'];

function partFindings(part: CopyPart, reading: Reading): Finding[] {
	if (part.text.trim() === '') return [];
	const { text } = part;
	const { language } = reading;
	const { findings, starts } = wordFindings(part, reading);
	return [
		...findings,
		...signsIn(text, language),
		...(RUNNING.includes(part.field) && part.kind !== 'heading'
			? sentenceFindings(text, starts, language)
			: []),
		...besideFindings(part, language)
	];
}

const WORD = /[\p{L}\p{N}\ufffc][\p{L}\p{N}'’]*/gu;

/** Pairs that a sentence may rightly hold. */
const PAIRS = new Set(['that', 'had', 'der', 'die', 'das', 'sie', 'nos', 'bye', 'ha']);

function wordFindings(part: CopyPart, reading: Reading): { findings: Finding[]; starts: number[] } {
	const { text } = part;
	const findings: Finding[] = [];
	const starts: number[] = [];
	let before = '';
	let endBefore = 0;
	let reach = 0;
	for (const match of text.matchAll(WORD)) {
		const from = match.index;
		const word = match[0];
		const small = word.toLowerCase();
		starts.push(from);
		if (small === before && isDoubled(text, small, endBefore, from)) {
			findings.push(doubled(endBefore - before.length, from + word.length, word));
		}
		if (isAllCapitals(word)) {
			const found =
				capitalsFinding(text, from, word) ??
				abbreviationFinding(text, from, word, reading.met, part.field);
			if (found && found.from >= reach) {
				findings.push(found);
				reach = found.to;
			}
		}
		for (const trap of reading.index.get(small) ?? []) {
			const found = trapAt(text, from, trap);
			if (found && counts(found, trap, part, reading)) findings.push(found);
		}
		before = small;
		endBefore = from + word.length;
	}
	return { findings, starts };
}

function isDoubled(text: string, word: string, end: number, from: number): boolean {
	return !PAIRS.has(word) && /^\p{L}/u.test(word) && text.slice(end, from).trim() === '';
}

function doubled(from: number, to: number, word: string): Finding {
	return { code: 'doubled-word', from, to, says: `“${word}” stands twice.`, replacement: word };
}

/** A term counts where it first stands in the copy and isn't explained; a cause only beside a reading. */
function counts({ from, to }: Finding, trap: Trap, part: CopyPart, { met }: Reading): boolean {
	if (trap.wantsReading && !part.reads) return false;
	if (trap.code !== 'undefined-term') return true;
	if (part.field !== 'copy' || met.has(trap)) return false;
	met.add(trap);
	return !isExplained(part.text, from, to);
}
