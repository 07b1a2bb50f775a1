/**
 * The widget document: what an author wrote and how its numbers are wired. Only the newest shape has a schema;
 * older documents climb to it step by step in `upgrades.ts`, so nothing else knows that old shapes exist.
 */
import { z } from 'zod';
import { Block } from './block.ts';
import { Control } from './control.ts';
import { FormulaStep } from './formula-step.ts';
import { LANGUAGES } from './language.ts';
import { Id, Key, ReadingRef, SettingSource, UnitSymbol } from './references.ts';

export * from './block.ts';
export type {
	AxisScale,
	ChartBlock,
	ChartItem,
	ItemChart,
	LedgerChart,
	LineChart
} from './chart.ts';
export { chartReadings } from './chart.ts';
export type { Control, ControlKind, ControlValues } from './control.ts';
export type { FormulaStep } from './formula-step.ts';
export type { ReadingRef, SettingSource } from './references.ts';

export const DOCUMENT_VERSION = 2;

/** One calculator hung on the bench, pinned to the revision it was wired with. */
export const Step = z.strictObject({
	id: Id,
	calculator: z.string().max(60),
	revision: z.string().max(20),
	/** By the calculator's input keys. */
	settings: z.record(Key, SettingSource)
});
export type Step = z.infer<typeof Step>;

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
		unit: UnitSymbol,
		figures: z.number().int().min(1).max(6),
		/** `fitting`: chosen by rule at each setting, so that hedge and numeral always fit the reading. */
		hedge: z.enum(['none', 'about', 'fitting'])
	}),
	z.strictObject({ id: Id, form: z.literal('exempt'), reason: z.string().min(1).max(200) })
]);
export type Claim = z.infer<typeof Claim>;

export const WidgetDocument = z.strictObject({
	version: z.literal(DOCUMENT_VERSION),
	language: z.enum(LANGUAGES),
	/** The constants edition the piece was written and checked with. */
	constants: z.string().max(20),
	title: z.string().max(120),
	/** The one thing a reader takes away. */
	point: z.string().max(240),
	/** The piece's own formulas, which its steps name as `formula.<id>`. */
	formulas: z.array(FormulaStep).max(12),
	steps: z.array(Step).max(24),
	controls: z.array(Control).max(12),
	blocks: z.array(Block).max(200),
	claims: z.array(Claim).max(300)
});
export type WidgetDocument = z.infer<typeof WidgetDocument>;
