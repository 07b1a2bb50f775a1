/**
 * Stored JSON in, a document that hangs together out: climbed to the newest version, the right shape, every id
 * there, no ring on the bench, every setting one its calculator has and every tie between commensurable units.
 * Drafts may be incomplete (see findings.ts); they may not be broken.
 */
import { resolveUnit, type Calculator, type CalculatorSet } from '../physics/calculator.ts';
import { edition, editions } from '../physics/constants/index.ts';
import { commensurable, unitOf } from '../physics/units/units.ts';
import { benchSet } from './bench-set.ts';
import { controlsNamed, shownReadings } from './block-readings.ts';
import { hasOptions } from './control.ts';
import {
	DOCUMENT_VERSION,
	isTextBlock,
	WidgetDocument,
	type Control,
	type ReadingRef,
	type SettingSource,
	type Step
} from './document.ts';
import { formulaIssues } from './formula-issues.ts';
import { orderSteps } from './graph.ts';
import { upgrades, type Stored } from './upgrades.ts';
import { fixedSettings, unitOfRef } from './tie-units.ts';

export interface Issue {
	/** Where in the document: `steps.0.settings.z`. */
	path: string;
	message: string;
}

export type Parsed = { ok: true; document: WidgetDocument } | { ok: false; issues: Issue[] };

export function parseDocument(stored: unknown, calculators: CalculatorSet): Parsed {
	const lifted = lift(stored);
	if (!lifted.ok) return lifted;
	const shaped = WidgetDocument.safeParse(lifted.stored);
	if (!shaped.success) {
		return {
			ok: false,
			issues: shaped.error.issues.map(({ path, message }) => ({ path: path.join('.'), message }))
		};
	}
	const formulas = ownFormulaIssues(shaped.data);
	const issues = [
		...editionIssues(shaped.data),
		...idIssues(shaped.data),
		// What hangs on a broken formula can't be judged before it is mended.
		...(formulas.length > 0
			? formulas
			: wiringIssues(shaped.data, benchSet(shaped.data, calculators)))
	];
	return issues.length > 0 ? { ok: false, issues } : { ok: true, document: shaped.data };
}

type Lifted = { ok: true; stored: Stored } | { ok: false; issues: Issue[] };

function lift(stored: unknown): Lifted {
	if (typeof stored !== 'object' || stored === null || Array.isArray(stored)) {
		return broken('', 'A widget document is a JSON object.');
	}
	let climbing = stored as Stored;
	while (climbing.version !== DOCUMENT_VERSION) {
		const upgrade = upgrades[Number(climbing.version)];
		if (!upgrade) {
			return broken(
				'version',
				`This document is of version ${String(climbing.version)}; this house reads up to ${DOCUMENT_VERSION}.`
			);
		}
		climbing = upgrade(climbing);
	}
	return { ok: true, stored: climbing };
}

function broken(path: string, message: string): { ok: false; issues: Issue[] } {
	return { ok: false, issues: [{ path, message }] };
}

/** A piece pins an edition that this house has; there is nothing to work it with otherwise. */
function editionIssues({ constants }: WidgetDocument): Issue[] {
	return edition(constants)
		? []
		: [
				{
					path: 'constants',
					message: `This house has no constants edition “${constants}”. It has ${Object.keys(editions).join(', ')}.`
				}
			];
}

/** Ids are unique in their kind, and every claim entry stands exactly once in the copy. */
function idIssues(document: WidgetDocument): Issue[] {
	const issues: Issue[] = [];
	for (const kind of ['formulas', 'steps', 'controls', 'blocks', 'claims'] as const) {
		const seen = new Set<string>();
		document[kind].forEach(({ id }, index) => {
			if (seen.has(id))
				issues.push({ path: `${kind}.${index}.id`, message: `The id “${id}” is used twice.` });
			seen.add(id);
		});
	}

	const claims = new Map(document.claims.map((claim) => [claim.id, claim]));
	const controls = new Set(document.controls.map(({ id }) => id));
	const placed = new Set<string>();
	document.blocks.forEach((block, index) => {
		const path = `blocks.${index}`;
		for (const control of controlsNamed(block)) {
			if (!controls.has(control))
				issues.push({ path, message: `There is no control “${control}”.` });
		}
		if (!isTextBlock(block)) return;
		block.content.forEach((inline, place) => {
			const at = `${path}.content.${place}`;
			if (inline.kind === 'setting' && !controls.has(inline.control)) {
				issues.push({ path: at, message: `There is no control “${inline.control}”.` });
			}
			if (inline.kind !== 'claim' && inline.kind !== 'live') return;
			const claim = claims.get(inline.claim);
			if (!claim) issues.push({ path: at, message: `There is no claim “${inline.claim}”.` });
			else if ((claim.form === 'live') !== (inline.kind === 'live')) {
				issues.push({
					path: at,
					message: `The claim “${claim.id}” is ${claim.form} and stands here as ${inline.kind}.`
				});
			}
			if (placed.has(inline.claim)) {
				issues.push({ path: at, message: `The claim “${inline.claim}” stands in two places.` });
			}
			placed.add(inline.claim);
		});
	});
	document.claims.forEach((claim, index) => {
		if (!placed.has(claim.id)) {
			issues.push({
				path: `claims.${index}`,
				message: `The claim “${claim.id}” stands nowhere in the copy.`
			});
		}
	});
	return issues;
}

function ownFormulaIssues({ formulas }: WidgetDocument): Issue[] {
	return formulas.flatMap((formula, index) =>
		formulaIssues(formula).map(({ path, says, mend }) => ({
			path: `formulas.${index}.${path}`,
			message: `${says} ${mend}`.trim()
		}))
	);
}

function wiringIssues(document: WidgetDocument, calculators: CalculatorSet): Issue[] {
	const issues = [
		...controlIssues(document.controls),
		...document.steps.flatMap((step, index) => stepIssues(step, index, document, calculators)),
		...refIssues(document, calculators)
	];
	const order = orderSteps(document.steps);
	if (!order.ok) {
		const title = (id: string) => stepTitle(document, id, calculators);
		issues.push({
			path: 'steps',
			message:
				order.reason === 'cycle'
					? `These calculators feed each other in a ring: ${order.path.map(title).join(' → ')}. Cut one tie.`
					: `${title(order.step)} is tied to a calculator that isn’t on the bench (“${order.missing}”).`
		});
	}
	return issues;
}

function stepTitle(document: WidgetDocument, id: string, calculators: CalculatorSet): string {
	const step = document.steps.find((candidate) => candidate.id === id);
	return (step && calculators.get(step.calculator)?.title) ?? id;
}

function controlIssues(controls: readonly Control[]): Issue[] {
	return controls.flatMap(({ unit }, index) =>
		unitOf(unit)
			? []
			: [{ path: `controls.${index}.unit`, message: `“${unit}” is no unit of the house’s table.` }]
	);
}

function stepIssues(
	step: Step,
	index: number,
	document: WidgetDocument,
	calculators: CalculatorSet
): Issue[] {
	const path = `steps.${index}`;
	const calculator = calculators.get(step.calculator);
	if (!calculator) return [{ path, message: `There is no calculator “${step.calculator}”.` }];
	return Object.entries(step.settings).flatMap(([key, source]) => {
		const message = settingIssue(key, source, step, calculator, document, calculators);
		return message ? [{ path: `${path}.settings.${key}`, message }] : [];
	});
}

function settingIssue(
	key: string,
	source: SettingSource,
	step: Step,
	calculator: Calculator,
	document: WidgetDocument,
	calculators: CalculatorSet
): string | null {
	const [head = key, part] = key.split('.');
	const spec = calculator.inputs[head];
	if (!spec || (part !== undefined && spec.kind !== 'cosmology')) {
		return `${calculator.title} has no setting “${key}”.`;
	}
	const unit = sourceUnit(source, document, calculators);
	if (unit === 'missing-control') return `The control of “${spec.label}” isn’t in the piece.`;
	if (unit === 'missing-output') return `The reading tied to “${spec.label}” doesn’t exist.`;
	if (unit === null || spec.kind !== 'number') return null;
	const wanted = resolveUnit(spec.unit, fixedSettings(step));
	return commensurable(unit.unit, wanted)
		? null
		: `“${spec.label}” is in ${wanted || 'plain numbers'} and can’t take a value in ${unit.unit || 'plain numbers'}.`;
}

function sourceUnit(
	source: SettingSource,
	document: WidgetDocument,
	calculators: CalculatorSet
): { unit: string } | 'missing-control' | 'missing-output' | null {
	if (source.from === 'control') {
		const control = document.controls.find(({ id }) => id === source.control);
		if (!control) return 'missing-control';
		const words = hasOptions(control) && typeof control.options[0]?.value === 'string';
		return words ? null : { unit: control.unit };
	}
	if (source.from !== 'reading') return null;
	const upstream = document.steps.find(({ id }) => id === source.step);
	if (!upstream) return null; // named by the order of the steps
	const output = calculators.get(upstream.calculator)?.outputs[source.output];
	if (!output) return 'missing-output';
	return output.text ? null : { unit: resolveUnit(output.unit, fixedSettings(upstream)) };
}

/** Claims and charts hang on readings that exist, and print them in a unit of the same kind. */
function refIssues(document: WidgetDocument, calculators: CalculatorSet): Issue[] {
	const controls = new Set(document.controls.map(({ id }) => id));
	const refs: { path: string; ref: ReadingRef; unit?: string }[] = [
		...document.claims.flatMap((claim, index) =>
			claim.form === 'exempt'
				? []
				: [
						{
							path: `claims.${index}.reading`,
							ref: claim.reading,
							...(claim.form === 'live' ? { unit: claim.unit } : {})
						}
					]
		),
		...document.blocks.flatMap((block, index) =>
			shownReadings(block).map(({ path, reading, unit }) => ({
				path: `blocks.${index}.${path}`,
				ref: reading,
				unit
			}))
		)
	];
	return refs.flatMap(({ path, ref, unit }) => {
		const printed = unit === undefined ? null : printIssue(document, ref, unit, calculators);
		if (printed) return [{ path, message: printed }];
		if ('control' in ref) {
			return controls.has(ref.control)
				? []
				: [{ path, message: `There is no control “${ref.control}”.` }];
		}
		const step = document.steps.find(({ id }) => id === ref.step);
		const calculator = step && calculators.get(step.calculator);
		if (!step || !calculator)
			return [{ path, message: `There is no step “${ref.step}” on the bench.` }];
		const there = 'output' in ref ? ref.output in calculator.outputs : ref.setting in step.settings;
		return there
			? []
			: [
					{
						path,
						message: `${calculator.title} has no “${'output' in ref ? ref.output : ref.setting}” here.`
					}
				];
	});
}

/** Why a reading can't be printed in a unit; null when it can, or when the reading itself isn't there. */
function printIssue(
	document: WidgetDocument,
	ref: ReadingRef,
	unit: string,
	calculators: CalculatorSet
): string | null {
	if (!unitOf(unit)) return `“${unit}” is no unit of the house’s table.`;
	const own = unitOfRef(document, ref, calculators);
	return own === null || commensurable(own, unit)
		? null
		: `This reading is in ${own || 'plain numbers'} and can’t be printed in ${unit || 'plain numbers'}.`;
}
