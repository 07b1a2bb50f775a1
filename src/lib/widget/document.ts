/**
 * The widget document: what an author wrote and how its numbers are wired. Only the newest shape has a schema;
 * older documents climb to it step by step in `upgrades.ts`, so nothing else knows that old shapes exist.
 */
import { z } from 'zod';

export const DOCUMENT_VERSION = 1;

/** Names every JavaScript object answers to: as a key they would find what nobody wrote. */
const isOwnName = (name: string) => !(name in Object.prototype);
const TAKEN = 'This name is taken by the language itself. Choose another.';

/** The key of a setting or an output; `cosmology.H0` reaches into a parameter set. */
const Key = z
	.string()
	.max(60)
	.refine((key) => key.split('.').every(isOwnName), TAKEN);

/** Ids are made by the builder, stay with their thing through every edit, and are never shown to readers. */
export const Id = z
	.string()
	.regex(
		/^[a-z][a-z0-9-]{0,39}$/,
		'An id is small letters, digits and dashes, and starts with a letter.'
	);

const finite = z.number().refine(Number.isFinite, 'A number must be finite.');

/**
 * Where a setting of a calculator on the bench gets its value. Fixed values are in the setting's own unit; a line of
 * the catalogue is pinned with the value it had when it was wired, so that a reader's frame needs no catalogue.
 */
export const SettingSource = z.discriminatedUnion('from', [
	z.strictObject({
		from: z.literal('fixed'),
		value: z.union([finite, z.string().max(80), z.record(z.string(), z.unknown())])
	}),
	z.strictObject({ from: z.literal('control'), control: Id }),
	z.strictObject({ from: z.literal('reading'), step: Id, output: Key }),
	z.strictObject({ from: z.literal('line'), line: z.string().max(60), value: finite })
]);
export type SettingSource = z.infer<typeof SettingSource>;

/** One calculator hung on the bench, pinned to the revision it was wired with. */
export const Step = z.strictObject({
	id: Id,
	calculator: z.string().max(60),
	revision: z.string().max(20),
	/** By the calculator's input keys. */
	settings: z.record(Key, SettingSource)
});
export type Step = z.infer<typeof Step>;

/** What a reader can move. Values are in `unit`, and never leave [min, max]. */
export const Control = z
	.strictObject({
		id: Id,
		kind: z.literal('slider'),
		label: z.string().max(120),
		unit: z.string().max(20),
		min: finite,
		max: finite,
		step: finite.positive(),
		initial: finite
	})
	.refine((control) => control.min < control.max, {
		message: 'The lowest setting must be below the highest.',
		path: ['min']
	})
	.refine((control) => control.initial >= control.min && control.initial <= control.max, {
		message: 'The first setting must lie between the lowest and the highest.',
		path: ['initial']
	});
export type Control = z.infer<typeof Control>;

/** What a number in the copy is weighed against: an output, a fixed setting, or where a control starts. */
export const ReadingRef = z.union([
	z.strictObject({ step: Id, output: Key }),
	z.strictObject({ step: Id, setting: Key }),
	z.strictObject({ control: Id })
]);
export type ReadingRef = z.infer<typeof ReadingRef>;

/**
 * A claim. `stated`: the words stand in the copy and are weighed as written. `live`: the widget prints the number
 * itself, at every setting, by the format given here. `exempt`: not a claim, with the writer's reason.
 */
export const Claim = z.discriminatedUnion('form', [
	z.strictObject({ id: Id, form: z.literal('stated'), reading: ReadingRef }),
	z.strictObject({
		id: Id,
		form: z.literal('live'),
		reading: ReadingRef,
		unit: z.string().max(20),
		figures: z.number().int().min(1).max(6),
		hedge: z.enum(['none', 'about'])
	}),
	z.strictObject({ id: Id, form: z.literal('exempt'), reason: z.string().min(1).max(200) })
]);
export type Claim = z.infer<typeof Claim>;

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

/** `result` is the sentence that moves with the controls; `limits` is “What this can't tell you”. */
const TextBlock = z.strictObject({
	id: Id,
	kind: z.enum(['paragraph', 'heading', 'result', 'limits', 'caution']),
	content
});
export type TextBlock = z.infer<typeof TextBlock>;

const ControlBlock = z.strictObject({ id: Id, kind: z.literal('control'), control: Id });

/** A line: one output against one control over that control's range. Words are required before a proof, not before a save. */
export const ChartBlock = z.strictObject({
	id: Id,
	kind: z.literal('chart'),
	title: z.string().max(160),
	x: z.strictObject({ control: Id, label: z.string().max(120) }),
	y: z.strictObject({ reading: ReadingRef, unit: z.string().max(20), label: z.string().max(120) }),
	/** Named stretches of the upright axis, in its unit. */
	bands: z.array(z.strictObject({ from: finite, to: finite, label: z.string().max(80) })).max(4),
	source: z.string().max(240),
	description: z.string().max(600)
});
export type ChartBlock = z.infer<typeof ChartBlock>;

export const Block = z.discriminatedUnion('kind', [TextBlock, ControlBlock, ChartBlock]);
export type Block = z.infer<typeof Block>;

export const WidgetDocument = z.strictObject({
	version: z.literal(DOCUMENT_VERSION),
	language: z.literal('en'),
	/** The constants edition the piece was written and checked with. */
	constants: z.string().max(20),
	title: z.string().max(120),
	/** The one thing a reader takes away. */
	point: z.string().max(240),
	steps: z.array(Step).max(24),
	controls: z.array(Control).max(12),
	blocks: z.array(Block).max(200),
	claims: z.array(Claim).max(300)
});
export type WidgetDocument = z.infer<typeof WidgetDocument>;

/** What a reader or the builder has set; a control that is missing stands at its initial value. */
export type ControlValues = Readonly<Record<string, number>>;

/** The document as stored before it has a schema's blessing. */
export type Stored = Record<string, unknown>;

/** Each step lifts a stored document by one version. Add steps; a released one stays as it is. */
export const upgrades: Record<number, (stored: Stored) => Stored> = {};

export function isTextBlock(block: Block): block is TextBlock {
	return block.kind !== 'control' && block.kind !== 'chart';
}
