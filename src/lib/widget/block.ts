/** The blocks of a widget, in the order a reader meets them. */
import { z } from 'zod';
import { ChartBlock } from './chart.ts';
import { finite, Id, Key, ReadingRef, UnitSymbol } from './references.ts';

/** Running text: plain, a claim's own words, a number the widget prints, or the value of a control. */
export const Inline = z.discriminatedUnion('kind', [
	z.strictObject({
		kind: z.literal('text'),
		text: z.string().min(1).max(20_000),
		marks: z
			.array(z.enum(['em', 'strong']))
			.max(2)
			.optional()
	}),
	z.strictObject({ kind: z.literal('claim'), claim: Id, text: z.string().min(1).max(400) }),
	z.strictObject({ kind: z.literal('live'), claim: Id }),
	z.strictObject({ kind: z.literal('setting'), control: Id })
]);
export type Inline = z.infer<typeof Inline>;

const content = z.array(Inline).max(400);

export const TEXT_KINDS = ['paragraph', 'heading', 'aside', 'result', 'limits', 'caution'] as const;

/** `result` is the sentence that moves with the controls; `limits` is “What this can't tell you”. */
export const TextBlock = z.strictObject({ id: Id, kind: z.enum(TEXT_KINDS), content });
export type TextBlock = z.infer<typeof TextBlock>;

const ControlBlock = z.strictObject({ id: Id, kind: z.literal('control'), control: Id });
export type ControlBlock = z.infer<typeof ControlBlock>;

const figures = z.number().int().min(1).max(6);

/** Readings in rows: at the present settings, or across chosen settings of one control. */
export const TableBlock = z.strictObject({
	id: Id,
	kind: z.literal('table'),
	title: z.string().max(160),
	rows: z
		.array(
			z.strictObject({
				id: Id,
				label: z.string().max(120),
				reading: ReadingRef,
				unit: UnitSymbol,
				figures
			})
		)
		.min(1)
		.max(12),
	across: z.strictObject({ control: Id, values: z.array(finite).min(2).max(8) }).nullable(),
	source: z.string().max(240)
});
export type TableBlock = z.infer<typeof TableBlock>;

/** A calculator's equation as typeset on its card, with the values of some of its settings and outputs under it. */
export const EquationBlock = z.strictObject({
	id: Id,
	kind: z.literal('equation'),
	step: Id,
	/** Which of the calculator's equations. */
	equation: z.number().int().min(0).max(19),
	values: z
		.array(
			z.strictObject({
				id: Id,
				reading: z.union([
					z.strictObject({ step: Id, output: Key }),
					z.strictObject({ step: Id, setting: Key })
				]),
				unit: UnitSymbol,
				figures
			})
		)
		.max(12),
	caption: z.string().max(240)
});
export type EquationBlock = z.infer<typeof EquationBlock>;

const Sha256 = z.string().regex(/^[0-9a-f]{64}$/);

/** A picture with its record as it stood when it was placed, so that a frozen document is whole. */
export const PictureBlock = z.strictObject({
	id: Id,
	kind: z.literal('picture'),
	/** Id at the picture desk. */
	picture: z.string().max(60),
	files: z
		.array(
			z.strictObject({
				digest: Sha256,
				width: z.number().int().positive().max(12_000),
				height: z.number().int().positive().max(12_000),
				type: z.enum(['image/webp', 'image/jpeg', 'image/png'])
			})
		)
		.min(1)
		.max(12),
	alt: z.string().max(600),
	/** Why it needs no words, where it says nothing that the copy doesn't; '' when `alt` is given. */
	decorative: z.string().max(200),
	caption: z.string().max(300),
	credit: z.string().max(200),
	licence: z.string().max(120),
	/** “Artist's impression”, “false colour” and the like. */
	labels: z.array(z.string().max(60)).max(6)
});
export type PictureBlock = z.infer<typeof PictureBlock>;

/** The reader commits to a guess, then sees the reading. It can be passed over, and no guess is kept. */
export const GuessBlock = z.strictObject({
	id: Id,
	kind: z.literal('guess'),
	question: z.string().max(240),
	reading: ReadingRef,
	unit: UnitSymbol,
	figures,
	/** The range a guess may lie in, in the unit; equal steps are equal factors on a `log` scale. */
	min: finite,
	max: finite,
	scale: z.enum(['linear', 'log'])
});
export type GuessBlock = z.infer<typeof GuessBlock>;

/** Settings worth a look, each set at one touch. “As in the story”, which sets all back, is always the first. */
export const PresetsBlock = z.strictObject({
	id: Id,
	kind: z.literal('presets'),
	label: z.string().max(120),
	presets: z
		.array(
			z.strictObject({
				id: Id,
				label: z.string().max(80),
				values: z.record(Id, finite)
			})
		)
		.min(1)
		.max(6)
});
export type PresetsBlock = z.infer<typeof PresetsBlock>;

export const SourcesBlock = z.strictObject({
	id: Id,
	kind: z.literal('sources'),
	items: z
		.array(
			z.strictObject({
				id: Id,
				text: z.string().max(400),
				/** An https address, or ''. */
				url: z
					.string()
					.max(400)
					.regex(/^(https:\/\/\S+)?$/, 'A source’s address starts with https://.')
			})
		)
		.min(1)
		.max(20)
});
export type SourcesBlock = z.infer<typeof SourcesBlock>;

export const Block = z.discriminatedUnion('kind', [
	TextBlock,
	ControlBlock,
	ChartBlock,
	TableBlock,
	EquationBlock,
	PictureBlock,
	GuessBlock,
	PresetsBlock,
	SourcesBlock
]);
export type Block = z.infer<typeof Block>;
export type BlockKind = Block['kind'];

export function isTextBlock(block: Block): block is TextBlock {
	return (TEXT_KINDS as readonly string[]).includes(block.kind);
}
