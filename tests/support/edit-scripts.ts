/**
 * People at work on a document, by chance: each edit is one that the manuscript allows, and leaves a document that
 * hangs together. Every word typed is new and names who typed it, so that it can be looked for afterwards.
 */
import { catalogue } from '../../src/lib/physics/calculators/index.ts';
import { sameDrop } from '../../src/lib/server/demo/same-drop.ts';
import { firstLight } from '../../src/lib/server/demo/first-light.ts';
import {
	isTextBlock,
	type Claim,
	type Control,
	type Inline,
	type ReadingRef,
	type Step,
	type TextBlock,
	type WidgetDocument
} from '../../src/lib/widget/document.ts';
import { parseDocument } from '../../src/lib/widget/parse.ts';

/** Numbers that decide everything: which edit, on what, how. */
export class Chance {
	#at = 0;
	constructor(private readonly numbers: readonly number[]) {}
	below(limit: number): number {
		const number = this.numbers[this.#at % Math.max(1, this.numbers.length)] ?? 0;
		this.#at += 1;
		// A script that is read round again must not repeat itself.
		return limit < 1
			? 0
			: (number + 31 * Math.floor(this.#at / (this.numbers.length || 1))) % limit;
	}
	pick<T>(list: readonly T[]): T | undefined {
		return list.length === 0 ? undefined : list[this.below(list.length)];
	}
}

/** One person: what they type, and what they name things, is theirs alone. */
export class Author {
	#typed = 0;
	#named = 0;
	constructor(readonly name: string) {}
	word(): string {
		this.#typed += 1;
		return `${this.name}word${this.#typed}`;
	}
	id(kind: string): string {
		this.#named += 1;
		return `${kind}-${this.name}-${this.#named}`;
	}
}

type Edit = (document: WidgetDocument, chance: Chance, author: Author) => void;

const textBlocks = (document: WidgetDocument) => document.blocks.filter(isTextBlock);

function readings(document: WidgetDocument): ReadingRef[] {
	return [
		...document.controls.map(({ id }) => ({ control: id })),
		...document.steps.flatMap((step) =>
			Object.keys(catalogue.get(step.calculator)?.outputs ?? {}).map((output) => ({
				step: step.id,
				output
			}))
		)
	];
}

/** Claims whose words have gone go too, as the manuscript does it. */
function dropLooseClaims(document: WidgetDocument): void {
	const standing = new Set(
		textBlocks(document).flatMap(({ content }) =>
			content.flatMap((inline) => ('claim' in inline ? [inline.claim] : []))
		)
	);
	document.claims = document.claims.filter(({ id }) => standing.has(id));
}

function loosen(document: WidgetDocument, isGone: (ref: ReadingRef) => boolean): void {
	const loose = new Set(
		document.claims.flatMap((claim) =>
			claim.form !== 'exempt' && isGone(claim.reading) ? [claim.id] : []
		)
	);
	for (const block of textBlocks(document)) {
		block.content = block.content.map((inline): Inline => {
			if (inline.kind === 'setting')
				return isGone({ control: inline.control }) ? { kind: 'text', text: 'some' } : inline;
			if (!('claim' in inline) || !loose.has(inline.claim)) return inline;
			return { kind: 'text', text: inline.kind === 'claim' ? inline.text : 'some' };
		});
	}
	document.blocks = document.blocks.filter((block) => {
		if (block.kind === 'control') return !isGone({ control: block.control });
		if (block.kind === 'table') return block.rows.every(({ reading }) => !isGone(reading));
		if (block.kind === 'presets')
			return block.presets.every(({ values }) =>
				Object.keys(values).every((control) => !isGone({ control }))
			);
		if (block.kind !== 'chart' || block.form !== 'line') return true;
		return (
			!isGone({ control: block.x.control }) && !block.series.some((one) => isGone(one.reading))
		);
	});
	for (const step of document.steps) {
		for (const [key, source] of Object.entries(step.settings)) {
			const gone =
				(source.from === 'control' && isGone({ control: source.control })) ||
				(source.from === 'reading' && isGone({ step: source.step, output: source.output }));
			if (gone) delete step.settings[key];
		}
	}
	dropLooseClaims(document);
}

function place(document: WidgetDocument, chance: Chance, inline: Inline, claim?: Claim): void {
	const block = chance.pick(textBlocks(document));
	if (!block) return;
	block.content.splice(chance.below(block.content.length + 1), 0, inline);
	if (claim) document.claims.push(claim);
}

const EDITS: Record<string, Edit> = {
	'writes a paragraph': (document, chance, author) => {
		const block: TextBlock = {
			id: author.id('block'),
			kind: chance.pick(['paragraph', 'heading', 'aside', 'limits'] as const) ?? 'paragraph',
			content: [{ kind: 'text', text: `${author.word()} ${author.word()}` }]
		};
		document.blocks.splice(chance.below(document.blocks.length + 1), 0, block);
	},
	'adds words': (document, chance, author) => {
		const block = chance.pick(textBlocks(document));
		const inline = chance.pick(block?.content ?? []);
		if (inline?.kind === 'text') inline.text += ` ${author.word()}`;
		else block?.content.push({ kind: 'text', text: ` ${author.word()}` });
	},
	'puts words in the place of others': (document, chance, author) => {
		const inline = chance.pick(chance.pick(textBlocks(document))?.content ?? []);
		if (inline?.kind === 'text') inline.text = author.word();
	},
	'takes a block out': (document, chance) => {
		document.blocks.splice(chance.below(document.blocks.length), 1);
		dropLooseClaims(document);
	},
	'moves a block': (document, chance) => {
		const [block] = document.blocks.splice(chance.below(document.blocks.length), 1);
		if (block) document.blocks.splice(chance.below(document.blocks.length + 1), 0, block);
	},
	'turns one block into two': (document, chance, author) => {
		const block = chance.pick(textBlocks(document));
		if (!block || block.content.length < 2) return;
		const content = block.content.splice(1 + chance.below(block.content.length - 1));
		const at = document.blocks.indexOf(block);
		document.blocks.splice(at + 1, 0, { id: author.id('block'), kind: 'paragraph', content });
	},
	'ties a number': (document, chance, author) => {
		const reading = chance.pick(readings(document));
		if (!reading) return;
		const id = author.id('claim');
		place(
			document,
			chance,
			{ kind: 'claim', claim: id, text: `7 ${author.word()}` },
			{
				id,
				form: 'stated',
				reading
			}
		);
	},
	'says why a number is no claim': (document, chance, author) => {
		const id = author.id('claim');
		place(
			document,
			chance,
			{ kind: 'claim', claim: id, text: author.word() },
			{
				id,
				form: 'exempt',
				reason: author.word()
			}
		);
	},
	'changes a reason': (document, chance, author) => {
		const claim = chance.pick(document.claims.filter(({ form }) => form === 'exempt'));
		if (claim?.form === 'exempt') claim.reason = `${claim.reason} ${author.word()}`.slice(-200);
	},
	'ties a number to something else': (document, chance) => {
		const claim = chance.pick(document.claims.filter(({ form }) => form === 'stated'));
		const reading = chance.pick(readings(document));
		if (claim?.form === 'stated' && reading) claim.reading = reading;
	},
	'cuts a tie': (document, chance) => {
		const block = chance.pick(textBlocks(document));
		if (!block) return;
		block.content = block.content.map((inline) =>
			inline.kind === 'claim' ? { kind: 'text', text: inline.text } : inline
		);
		dropLooseClaims(document);
	},
	'carries a number elsewhere': (document, chance) => {
		const from = chance.pick(textBlocks(document));
		const at = from?.content.findIndex((inline) => 'claim' in inline) ?? -1;
		const [inline] = at >= 0 ? (from?.content.splice(at, 1) ?? []) : [];
		if (inline) place(document, chance, inline);
	},
	'hangs a calculator': (document, chance, author) => {
		const like = chance.pick(document.steps);
		const step: Step = like
			? { ...structuredClone(like), id: author.id('step') }
			: { id: author.id('step'), calculator: 'energy.drop', revision: '1.0.0', settings: {} };
		document.steps.push(step);
	},
	'takes a calculator away': (document, chance) => {
		const step = chance.pick(document.steps);
		if (!step) return;
		document.steps = document.steps.filter(({ id }) => id !== step.id);
		loosen(document, (ref) => 'step' in ref && ref.step === step.id);
	},
	'turns a peg': (document, chance) => {
		const step = chance.pick(document.steps);
		const setting = chance.pick(Object.values(step?.settings ?? {}));
		if (setting?.from === 'fixed' && typeof setting.value === 'number')
			setting.value += 1 + chance.below(9);
	},
	'feeds one calculator from another': (document, chance) => {
		const step = chance.pick(document.steps);
		const from = chance.pick(document.steps);
		const key = chance.pick(Object.keys(step?.settings ?? {}));
		const output = chance.pick(Object.keys(catalogue.get(from?.calculator ?? '')?.outputs ?? {}));
		if (step && from && key && output)
			step.settings[key] = { from: 'reading', step: from.id, output };
	},
	'changes a slider': (document, chance, author) => {
		const control = chance.pick(document.controls);
		if (!control) return;
		if (chance.below(2) === 0) control.label = `${control.label} ${author.word()}`.slice(-120);
		else if (control.kind === 'slider') control.max += control.step * (1 + chance.below(5));
	},
	'adds a slider': (document, chance, author) => {
		const id = author.id('control');
		const control: Control = {
			id,
			kind: 'slider',
			label: author.word(),
			unit: 'm',
			min: 0,
			max: 10,
			step: 1,
			initial: chance.below(10)
		};
		document.controls.push(control);
		document.blocks.push({ id: author.id('block'), kind: 'control', control: id });
		if (chance.below(2) === 0) place(document, chance, { kind: 'setting', control: id });
	},
	'offers settings to try': (document, chance, author) => {
		const control = chance.pick(document.controls);
		if (!control) return;
		const values = { [control.id]: control.initial };
		const presets = [{ id: author.id('preset'), label: author.word(), values }];
		document.blocks.push({
			id: author.id('block'),
			kind: 'presets',
			label: author.word(),
			presets
		});
	},
	'sets readings in a table': (document, chance, author) => {
		const step = chance.pick(document.steps);
		const [output, spec] = Object.entries(
			catalogue.get(step?.calculator ?? '')?.outputs ?? {}
		)[0] ?? ['', undefined];
		if (!step || typeof spec?.unit !== 'string') return;
		const row = {
			id: author.id('row'),
			label: author.word(),
			reading: { step: step.id, output },
			unit: spec.unit,
			figures: 2
		};
		const table = { kind: 'table' as const, title: author.word(), across: null, source: '' };
		document.blocks.push({ id: author.id('block'), ...table, rows: [row] });
	},
	'takes a slider away': (document, chance) => {
		const control = chance.pick(document.controls);
		if (!control) return;
		document.controls = document.controls.filter(({ id }) => id !== control.id);
		loosen(document, (ref) => 'control' in ref && ref.control === control.id);
	},
	'describes a chart': (document, chance, author) => {
		const chart = chance.pick(document.blocks.filter((block) => block.kind === 'chart'));
		if (chart?.kind === 'chart') chart.description = author.word();
	},
	'renames the piece': (document, _chance, author) => {
		document.title = `${author.word()} ${document.title}`.slice(0, 120);
	},
	'sharpens the point': (document, chance, author) => {
		document.point = chance.below(2)
			? author.word()
			: `${document.point.slice(0, 200)} ${author.word()}`;
	}
};

/** Two of these, one on each side, close a ring: often, so that merges meet it. */
const throwWithTheSpeedOfAnother: Edit = (document, chance) => {
	const throws = document.steps.filter(({ calculator }) => calculator === 'projectile.vacuum');
	const step = chance.pick(throws);
	const from = chance.pick(throws);
	if (step && from) step.settings.v0_ms = { from: 'reading', step: from.id, output: 'impactSpeed' };
};

const ALL_EDITS = [...Object.values(EDITS), ...Array<Edit>(5).fill(throwWithTheSpeedOfAnother)];

/** The document after some edits; one that would leave it broken isn't made. */
export function edited(
	document: WidgetDocument,
	edits: number,
	chance: Chance,
	author: Author
): WidgetDocument {
	let newest = document;
	for (let made = 0; made < edits; made += 1) {
		const next = structuredClone(newest);
		chance.pick(ALL_EDITS)?.(next, chance, author);
		const parsed = parseDocument(next, catalogue);
		if (parsed.ok) newest = parsed.document;
	}
	return newest;
}

/** A document that a few edits have made out of one of the demo's. */
export function anyDocument(chance: Chance): WidgetDocument {
	const start = chance.pick([firstLight, sameDrop]) ?? firstLight;
	return edited(structuredClone(start), 6 + chance.below(10), chance, new Author('base'));
}

/** Every word that this person typed and that still stands, anywhere in a value. */
export function wordsBy(author: Author, value: unknown): Set<string> {
	return new Set(JSON.stringify(value).match(new RegExp(`${author.name}word\\d+`, 'g')) ?? []);
}
