/** Taking a calculator or a slider away: what would come loose, in words, and the one change that does it. */
import type { Node } from 'prosemirror-model';
import type { Transaction } from 'prosemirror-state';
import { resolveUnit, type CalculatorSet } from '../physics/calculator.ts';
import { convert } from '../physics/units/units.ts';
import type { Claim, ReadingRef, SettingSource, Step } from '../widget/document.ts';
import { fixedSettings } from '../widget/tie-units.ts';
import { claimsInCopy } from './convert.ts';
import { claimOf, schema, wiringOf, type ChartFields } from './schema.ts';
import { firstSource, settingLabel } from './wiring.ts';

export type Removed = { step: string } | { control: string };

/** The words a claim or a slider's value stands as now; live numbers turn into them when they come loose. */
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
		if (node.type === schema.nodes.chart && chartHangsOn(node, removed)) {
			ends.push(`The chart “${(node.attrs.fields as ChartFields).title}” would be taken out.`);
		}
		if (!('control' in removed) || node.attrs.control !== removed.control) return;
		if (node.type === schema.nodes.control) ends.push('The slider would be taken out of the copy.');
		if (node.type === schema.nodes.setting) {
			ends.push(`“${printed.setting(removed.control)}” would stay as words and no longer move.`);
		}
	});
	return ends;
}

function chartHangsOn(node: Node, removed: Removed): boolean {
	const { x, y } = node.attrs.fields as ChartFields;
	return hangsOn(y.reading, removed) || hangsOn({ control: x.control }, removed);
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

	const atoms: { pos: number; size: number; words: string | null }[] = [];
	doc.descendants((node, pos) => {
		const claim = claimOf(node);
		if (claim !== null && loose.has(claim)) {
			transaction.removeMark(pos, pos + node.nodeSize, schema.marks.claim);
		}
		if (node.type === schema.nodes.live && loose.has(node.attrs.claim as string)) {
			atoms.push({ pos, size: 1, words: printed.live(node.attrs.claim as string) });
		}
		if (node.type === schema.nodes.chart && chartHangsOn(node, removed)) {
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

/** A peg that loses its slider keeps the value the slider started at; one that loses a reading goes to its first value. */
function loosenStep(step: Step, removed: Removed, calculators: CalculatorSet, doc: Node): Step {
	const inputs = calculators.get(step.calculator)?.inputs ?? {};
	const settings = Object.fromEntries(
		Object.entries(step.settings).map(([key, source]): [string, SettingSource] => {
			const spec = inputs[key];
			if (!feeds(source, removed) || !spec) return [key, source];
			if (source.from !== 'control' || spec.kind !== 'number') return [key, firstSource(spec)];
			const control = wiringOf(doc).controls.find(({ id }) => id === source.control);
			if (!control) return [key, firstSource(spec)];
			const unit = resolveUnit(spec.unit, fixedSettings(step));
			return [key, { from: 'fixed', value: convert(control.initial, control.unit, unit) }];
		})
	);
	return { ...step, settings };
}
