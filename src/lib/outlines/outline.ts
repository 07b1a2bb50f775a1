/** An outline: a short widget that hangs together, for a writer to make their own. All of it can be changed. */
import { catalogue } from '../physics/calculators/index.ts';
import type { Field } from '../physics/fields.ts';
import type {
	Block,
	ChartBlock,
	Claim,
	Control,
	Inline,
	ReadingRef,
	SettingSource,
	Step,
	WidgetDocument
} from '../widget/document.ts';
import { emptyDocument } from '../widget/empty-document.ts';

export interface Outline {
	id: string;
	/** Where it stands on the list. */
	field: Field;
	/** What it works, in one line. */
	says: string;
	document: WidgetDocument;
}

type Written = Pick<Outline, 'id' | 'field' | 'says'> &
	Pick<WidgetDocument, 'title' | 'point' | 'steps' | 'controls' | 'blocks' | 'claims'>;

export function outline({ id, field, says, title, ...written }: Written): Outline {
	return { id, field, says, document: { ...emptyDocument(title), ...written } };
}

/** A calculator on the bench, in the revision that this software runs; the outlines’ tests are with it. */
export function step(id: string, calculator: string, settings: Step['settings']): Step {
	const known = catalogue.get(calculator);
	if (!known) throw new Error(`An outline names a calculator that there isn’t: ${calculator}.`);
	return { id, calculator, revision: known.revision, settings };
}

export const fixed = (value: number | string | Record<string, unknown>): SettingSource => ({
	from: 'fixed',
	value
});
export const follows = (control: string): SettingSource => ({ from: 'control', control });
export const takes = (id: string, output: string): SettingSource => ({
	from: 'reading',
	step: id,
	output
});

export const slider = (
	id: string,
	label: string,
	unit: string,
	[min, max, step, initial]: [min: number, max: number, step: number, initial: number]
): Control => ({ id, kind: 'slider', label, unit, min, max, step, initial });

export const words = (text: string): Inline => ({ kind: 'text', text });
export const strong = (text: string): Inline => ({ kind: 'text', text, marks: ['strong'] });
export const number = (claim: string, text: string): Inline => ({ kind: 'claim', claim, text });
export const live = (claim: string): Inline => ({ kind: 'live', claim });
export const setting = (control: string): Inline => ({ kind: 'setting', control });

export const stated = (id: string, reading: ReadingRef): Claim => ({ id, form: 'stated', reading });
export const printed = (
	id: string,
	reading: ReadingRef,
	unit: string,
	figures: number,
	hedge: 'none' | 'about' = 'about'
): Claim => ({ id, form: 'live', reading, unit, figures, hedge });

type TextKind = 'paragraph' | 'heading' | 'result' | 'limits' | 'caution';

export const text = (id: string, kind: TextKind, ...content: Inline[]): Block => ({
	id,
	kind,
	content
});
export const shows = (control: string): Block => ({
	id: `at-${control}`,
	kind: 'control',
	control
});

/** One line over a slider’s range. */
export function chart(
	id: string,
	{
		title,
		x,
		y,
		source,
		description
	}: Pick<ChartBlock, 'title' | 'source' | 'description'> & {
		x: { control: string; label: string };
		y: { reading: ReadingRef; unit: string; label: string };
	}
): Block {
	const { reading, ...axis } = y;
	return {
		id,
		kind: 'chart',
		form: 'line',
		title,
		source,
		description,
		x: { ...x, scale: 'linear' },
		y: { ...axis, scale: 'linear', from: 'zero' },
		series: [{ id: 'line', reading, label: '' }],
		bands: []
	};
}
