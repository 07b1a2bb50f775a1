/** Taking a calculator or a control away: what would come loose, in words, and the one change that does it. */
import type { Node } from 'prosemirror-model';
import type { Transaction } from 'prosemirror-state';
import { resolveUnit, type CalculatorSet } from '../physics/calculator.ts';
import { convert } from '../physics/units/units.ts';
import { controlsNamed, shownReadings } from '../widget/block-readings.ts';
import { settingFrom } from '../widget/control-grid.ts';
import type { Claim, ReadingRef, SettingSource, Step } from '../widget/document.ts';
import { formulaCalculatorId } from '../widget/formula-id.ts';
import { fixedSettings } from '../widget/tie-units.ts';
import { blockOf, claimsInCopy } from './convert.ts';
import {
	BLOCK_WORDS,
	claimOf,
	isFieldBlockKind,
	schema,
	wiringOf,
	type FieldsOf
} from './schema.ts';
import { firstSource, settingLabel } from './wiring.ts';

export type Removed = { step: string } | { control: string };

/** The words a claim or a control's value stands as now; live numbers turn into them when they come loose. */
export interface PrintedWords {
	live(claimId: string): string;
	setting(controlId: string): string;
}

function hangsOn(ref: ReadingRef, removed: Removed): boolean {
	if ('control' in ref) return 'control' in removed && ref.control === removed.control;
	return 'step' in removed && ref.step === removed.step;
}

function feeds(source: SettingSource, removed: Removed): boolean {
	if (source.from === 'control') return 'control' in removed && source.control === removed.control;
	return source.from === 'reading' && 'step' in removed && source.step === removed.step;
}

function looseClaims(doc: Node, removed: Removed): Claim[] {
	const standing = claimsInCopy(doc);
	return wiringOf(doc).claims.filter(
		(claim) => standing.has(claim.id) && claim.form !== 'exempt' && hangsOn(claim.reading, removed)
	);
}

/** One sentence for each thing that would come loose; empty when nothing would. */
export function looseEnds(
	doc: Node,
	removed: Removed,
	calculators: CalculatorSet,
	printed: PrintedWords
): string[] {
	const ends: string[] = [];
	const stated = new Map<string, string>();
	doc.descendants((node) => {
		const id = claimOf(node);
		if (id !== null) stated.set(id, (stated.get(id) ?? '') + (node.text ?? ''));
	});
	for (const claim of looseClaims(doc, removed)) {
		ends.push(
			claim.form === 'live'
				? `“${printed.live(claim.id)}” would stop following its reading and stay as words, not weighed.`
				: `“${stated.get(claim.id) ?? ''}” would no longer be weighed.`
		);
	}
	for (const step of wiringOf(doc).steps) {
		const calculator = calculators.get(step.calculator);
		for (const [key, source] of Object.entries(step.settings)) {
			if (!feeds(source, removed)) continue;
			ends.push(
				`“${calculator ? settingLabel(calculator, step, key) : key}” of ${calculator?.title ?? step.calculator} would go back to a fixed value.`
			);
		}
	}
	doc.descendants((node) => {
		if (fieldsHangOn(node, removed)) {
			ends.push(`The ${BLOCK_WORDS[blockOf(node).kind]}${titleOf(node)} would be taken out.`);
		}
		if (!('control' in removed) || node.attrs.control !== removed.control) return;
		if (node.type === schema.nodes.control)
			ends.push('The control would be taken out of the copy.');
		if (node.type === schema.nodes.setting) {
			ends.push(`“${printed.setting(removed.control)}” would stay as words and no longer move.`);
		}
	});
	return ends;
}

/** A block drawn from fields can't stand without what it draws; presets only forget the control. */
function fieldsHangOn(node: Node, removed: Removed): boolean {
	if (!isFieldBlockKind(node.type.name) || node.type === schema.nodes.presets) return false;
	const block = blockOf(node);
	return (
		shownReadings(block).some(({ reading }) => hangsOn(reading, removed)) ||
		controlsNamed(block).some((control) => hangsOn({ control }, removed))
	);
}

function titleOf(node: Node): string {
	const { title = '' } = node.attrs.fields as { title?: string };
	return title ? ` “${title}”` : '';
}

/** Takes it away and loosens all that hung on it, in one undoable change. */
export function remove(
	transaction: Transaction,
	removed: Removed,
	calculators: CalculatorSet,
	printed: PrintedWords
): Transaction {
	const { doc } = transaction;
	const wiring = wiringOf(doc);
	const loose = new Set(looseClaims(doc, removed).map(({ id }) => id));

	doc.descendants((node, pos) => {
		if (node.type !== schema.nodes.presets || !('control' in removed)) return;
		const fields = node.attrs.fields as FieldsOf<'presets'>;
		transaction.setNodeAttribute(pos, 'fields', {
			...fields,
			presets: without(fields, removed.control)
		});
	});

	const atoms: { pos: number; size: number; words: string | null }[] = [];
	doc.descendants((node, pos) => {
		const claim = claimOf(node);
		if (claim !== null && loose.has(claim)) {
			transaction.removeMark(pos, pos + node.nodeSize, schema.marks.claim);
		}
		if (node.type === schema.nodes.live && loose.has(node.attrs.claim as string)) {
			atoms.push({ pos, size: 1, words: printed.live(node.attrs.claim as string) });
		}
		if (fieldsHangOn(node, removed)) {
			atoms.push({ pos, size: node.nodeSize, words: null });
		}
		if (!('control' in removed) || node.attrs.control !== removed.control) return;
		if (node.type === schema.nodes.setting) {
			atoms.push({ pos, size: 1, words: printed.setting(removed.control) });
		}
		if (node.type === schema.nodes.control) atoms.push({ pos, size: node.nodeSize, words: null });
	});
	for (const { pos, size, words } of atoms.reverse()) {
		if (words) transaction.replaceWith(pos, pos + size, schema.text(words));
		else transaction.deleteRange(pos, pos + size);
	}

	const steps = wiring.steps
		.filter((step) => !('step' in removed && step.id === removed.step))
		.map((step) => loosenStep(step, removed, calculators, doc));
	transaction.setDocAttribute('steps', steps);
	// A formula goes with the last step that works it.
	const worked = (list: readonly Step[]) => new Set(list.map(({ calculator }) => calculator));
	const [before, after] = [worked(wiring.steps), worked(steps)];
	transaction.setDocAttribute(
		'formulas',
		wiring.formulas.filter(({ id }) => {
			const calculator = formulaCalculatorId(id);
			return after.has(calculator) || !before.has(calculator);
		})
	);
	transaction.setDocAttribute(
		'claims',
		wiring.claims.filter(({ id }) => !loose.has(id))
	);
	if ('control' in removed) {
		transaction.setDocAttribute(
			'controls',
			wiring.controls.filter(({ id }) => id !== removed.control)
		);
	}
	return transaction;
}

function without(
	{ presets }: FieldsOf<'presets'>,
	control: string
): FieldsOf<'presets'>['presets'] {
	return presets.map(({ values, ...preset }) => ({
		...preset,
		values: Object.fromEntries(Object.entries(values).filter(([id]) => id !== control))
	}));
}

/** A peg that loses its control keeps the setting the control started at; one that loses a reading goes to its first value. */
function loosenStep(step: Step, removed: Removed, calculators: CalculatorSet, doc: Node): Step {
	const inputs = calculators.get(step.calculator)?.inputs ?? {};
	const settings = Object.fromEntries(
		Object.entries(step.settings).flatMap(([key, source]): [string, SettingSource][] => {
			const spec = inputs[key];
			if (!feeds(source, removed)) return [[key, source]];
			// A part of a parameter set goes; the set itself stands beside it.
			if (!spec) return [];
			if (source.from !== 'control') return [[key, firstSource(spec)]];
			const control = wiringOf(doc).controls.find(({ id }) => id === source.control);
			const value = control && settingFrom(control, control.initial);
			if (spec.kind === 'choice' && typeof value === 'string')
				return [[key, { from: 'fixed', value }]];
			if (!control || spec.kind !== 'number' || typeof value !== 'number')
				return [[key, firstSource(spec)]];
			const unit = resolveUnit(spec.unit, fixedSettings(step));
			return [[key, { from: 'fixed', value: convert(value, control.unit, unit) }]];
		})
	);
	return { ...step, settings };
}
