/** Faults of a galley from what its strips measured: one for each cause, each a sentence with its mend. */
import { units } from '$lib/physics/units/units.ts';
import type { Finding } from '$lib/widget/findings.ts';
import type { Measure, SpokenLine, Spot, StripFault, StripReport } from './report.ts';
import type { StripKind } from './strips.ts';

export interface Fault {
	/** The same for the same fault in another measuring. */
	key: string;
	/** What is wrong and how to mend it. */
	says: string;
	/** The rule behind it, with its source. */
	rule: string;
	/** `must` keeps readers out or breaks the page around; `should` is for the writer to weigh. */
	weight: 'must' | 'should';
	block: string | null;
	/** The claim, step or formula to go to, where it isn't a block. */
	claim?: string;
	/** Where it is pinned, by strip; none for what no strip shows. */
	pins: { strip: string; spot: Spot }[];
}

export interface Measured {
	kind: StripKind;
	report: StripReport;
}

const RULES: Record<Measure | 'finding' | 'kept' | 'letters', [Fault['weight'], string]> = {
	overflow: ['must', 'WCAG 2.2, 1.4.10 Reflow'],
	spill: ['must', 'WCAG 2.2, 1.4.10 Reflow'],
	'broken-word': ['should', 'house rule: words stay whole'],
	cut: ['must', 'WCAG 2.2, 1.4.12 Text spacing'],
	'small-target': ['must', 'WCAG 2.2, 2.5.8 Target size (minimum): 24 px'],
	'small-control': ['must', 'house rule: controls 44 px, as WCAG 2.2, 2.5.5'],
	'first-view': ['should', 'house rule: 480 px at 320 px width'],
	jump: ['should', 'house rule: the frame keeps its height'],
	'heading-order': ['must', 'WCAG 2.2, 1.3.1 Info and relationships'],
	'no-alt': ['must', 'WCAG 2.2, 1.1.1 Non-text content'],
	'no-description': ['must', 'WCAG 2.2, 1.1.1 Non-text content'],
	'no-table': ['must', 'house rule: a chart has its numbers in a table'],
	axe: ['must', 'WCAG 2.2, A and AA, found by axe'],
	finding: ['must', 'asked for before a proof'],
	kept: ['should', 'house rule: the snippet keeps room for the frame'],
	letters: ['should', 'house rule: units are spoken in words']
};

/** In the order of the list: what must be mended, then what should be, each in reading order of discovery. */
export function faultsOf(galley: {
	measured: readonly Measured[];
	spoken: readonly SpokenLine[];
	findings: readonly Finding[];
	/** What a partner's page keeps free for the frame at a width, in CSS pixels. */
	keptPx: (widthPx: number) => number;
}): Fault[] {
	const faults = [
		...measuredFaults(galley.measured, new Set(galley.findings.map(({ code }) => code))),
		...keptFaults(galley.measured, galley.keptPx),
		...letterFaults(galley.spoken),
		...galley.findings.map(findingFault)
	];
	return [
		...faults.filter(({ weight }) => weight === 'must'),
		...faults.filter(({ weight }) => weight === 'should')
	];
}

interface Seen {
	kind: StripKind;
	fault: StripFault;
}

function measuredFaults(measured: readonly Measured[], known: ReadonlySet<string>): Fault[] {
	const groups = new Map<string, Seen[]>();
	for (const { kind, report } of measured) {
		for (const fault of report.faults) {
			// The piece's own findings say these with the mend.
			if (known.has(fault.measure)) continue;
			const key = [fault.measure, fault.block, fault.subject, fault.says].join(' · ');
			groups.set(key, [...(groups.get(key) ?? []), { kind, fault }]);
		}
	}
	return [...groups].flatMap(([key, seen]) => {
		const worst = seen.reduce((a, b) => (Math.abs(b.fault.byPx) > Math.abs(a.fault.byPx) ? b : a));
		const [weight, rule] = RULES[worst.fault.measure];
		const { block } = worst.fault;
		const pins = seen.map(({ kind, fault }) => ({ strip: kind.id, spot: fault.spot }));
		return [{ key, says: sentence(worst, namesOf(seen)), rule, weight, block, pins }];
	});
}

/** “At 320, 390 and 320, dark”: each strip once, in their order. */
function namesOf(seen: readonly Seen[]): string {
	const names = [
		...new Set(seen.map(({ kind }) => kind.name.replace(/, (phone|article|wide)$/, '')))
	];
	const last = names.at(-1) ?? '';
	if (names.length > 4) return `In ${names.length} strips`;
	const list = names.length > 1 ? `${names.slice(0, -1).join('; ')} and ${last}` : last;
	return /^\d/.test(list) ? `At ${list}` : `In ${list}`;
}

function sentence({ fault }: Seen, where: string): string {
	const { subject, byPx, setting } = fault;
	const at = setting ? `${where}, with “${setting}”,` : where;
	switch (fault.measure) {
		case 'overflow':
			return `${at} “${subject}” is ${byPx} px wider than the strip. Use a shorter word, or one that may be divided.`;
		case 'spill':
			return `${at} “${subject}” runs ${byPx} px out of its column. Shorten it.`;
		case 'broken-word':
			return `${at} the word “${subject}” doesn’t fit a line and is broken. Use a shorter word, or put a soft hyphen into it.`;
		case 'cut':
			return `${at} ${byPx} px of “${subject}” can’t be seen. Shorten it.`;
		case 'small-target':
		case 'small-control':
			return `${at} “${subject}” is ${byPx} px too small to be hit. Give it a longer label.`;
		case 'first-view':
			return `${where} ${subject} ends ${byPx} px below the first view of a phone. Shorten what stands before it, or move it up.`;
		case 'jump':
			return jumpSentence(at, subject, byPx);
		case 'heading-order':
			return `The heading “${subject}” skips a level or is empty. Give it words, or take it out.`;
		case 'no-alt':
			return 'A picture has no words for those who can’t see it. Describe it.';
		case 'no-description':
			return `The chart “${subject}” has no description. Say its trend, its ends and its crossings.`;
		case 'no-table':
			return `The chart “${subject}” has no table. Draw something that has a reading.`;
		case 'axe':
			return `${where} “${subject}”: ${fault.says} This is the frame’s own drawing: tell the house’s admin.`;
	}
}

function jumpSentence(at: string, subject: string, byPx: number): string {
	const so = 'so the frame changes its height';
	if (subject === 'result')
		return `${at} the result sentence takes ${lines(byPx)}, ${so}. Shorten it, so that it needs the same lines at every setting.`;
	const size = `${Math.abs(byPx)} px ${byPx > 0 ? 'higher' : 'lower'} than at first`;
	return subject === 'chart'
		? `${at} the chart is ${size}, since a note stands under it at some settings, ${so}. Ask partners to keep the taller height.`
		: `${at} this part is ${size}, ${so}. Shorten its longest words.`;
}

/** At 28 px a line, the least a result sentence has. */
function lines(byPx: number): string {
	const count = Math.max(1, Math.round(Math.abs(byPx) / 29));
	return `${count === 1 ? 'one line' : `${count} lines`} ${byPx > 0 ? 'more' : 'less'} than at first`;
}

function keptFaults(measured: readonly Measured[], keptPx: (widthPx: number) => number): Fault[] {
	const over = measured.filter(
		({ kind, report }) => kind.look === 'light' && report.tallestPx > keptPx(kind.widthPx)
	);
	const [first] = over;
	if (!first) return [];
	const { kind, report } = first;
	const [weight, rule] = RULES.kept;
	const at = report.tallestAt ? `, with “${report.tallestAt}”,` : '';
	return [
		{
			key: 'kept',
			says: `At ${kind.widthPx}${at} the frame is ${report.tallestPx} px high, ${report.tallestPx - keptPx(kind.widthPx)} more than the snippet keeps free, so it scrolls inside its page. Shorten the piece, or ask partners to keep ${report.tallestPx} px.`,
			rule,
			weight,
			block: null,
			pins: over.map(({ kind: { id }, report: { heightPx } }) => ({
				strip: id,
				spot: { x: 0, y: heightPx }
			}))
		}
	];
}

/** Symbols that a voice reads as letters. One that is also a word, as “a” and “d”, isn't looked for. */
const WORDLIKE = ['', 'a', 'u', 'd', 'same', 'times', 'foe'];
const spokenAs = new Map(
	units
		.filter(({ symbol }) => !WORDLIKE.includes(symbol) && /^\p{L}[\p{L}/⁻¹²³·]*$/u.test(symbol))
		.map(({ symbol, words }) => [symbol, words.many])
);

function letterFaults(spoken: readonly SpokenLine[]): Fault[] {
	const [weight, rule] = RULES.letters;
	const found = new Map<string, Fault>();
	for (const { text, block } of spoken) {
		for (const [, symbol = ''] of text.matchAll(
			/(?:\d[\s\u00a0\u202f]*|\/ )(\p{L}[\p{L}/⁻¹²³·]*)(?![\p{L}\d])/gu
		)) {
			const word = spokenAs.get(symbol);
			if (!word || word === symbol) continue;
			found.set(`${symbol} ${block}`, {
				key: `letters ${symbol} ${block}`,
				says: `Spoken, “${symbol}” is read as letters. Say “${word}”.`,
				rule,
				weight,
				block,
				pins: [{ strip: 'spoken', spot: { x: 0, y: 0 } }]
			});
		}
	}
	return [...found.values()];
}

function findingFault({ code, says, at }: Finding): Fault {
	const [weight, rule] = RULES.finding;
	return {
		key: [code, at.block, at.claim, at.step, at.formula, says].join(' · '),
		says,
		rule,
		weight,
		block: at.block ?? null,
		...(at.claim === undefined ? {} : { claim: at.claim }),
		pins: []
	};
}
