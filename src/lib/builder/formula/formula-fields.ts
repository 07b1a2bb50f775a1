/** What stands in the form of a formula, and how it starts. */
import type { FormulaDraft } from '../../forms/formula-draft.ts';
import { CHECKS_NEEDED } from '../../physics/house/definition.ts';
import type { FormulaStep } from '../../widget/document.ts';
import { newId } from '../ids.ts';

export interface InputFields extends NonNullable<FormulaDraft['inputs'][number]> {
	/** Its name in the formula that is changed; null for a new one. What hangs on it follows a new name. */
	was: string | null;
}
export type CheckFields = FormulaDraft['checks'][number];
export type FormulaFields = Omit<FormulaDraft, 'inputs'> & { inputs: InputFields[] };

export function freshInput(): InputFields {
	const range = { min: 0, max: 1, initial: 0.5 };
	return { name: '', label: '', quantity: 'number', unit: '', ...range, was: null };
}

export function freshCheck(): CheckFields {
	return { id: newId('check'), inputs: {}, published: null, tolerance: null, source: '' };
}

/** One input, and the check values that it takes. */
export function emptyFields(): FormulaFields {
	return {
		id: newId('formula'),
		title: '',
		purpose: '',
		inputs: [freshInput()],
		output: { label: '', quantity: 'number', unit: '' },
		formula: '',
		checks: Array.from({ length: CHECKS_NEEDED }, freshCheck)
	};
}

export function fieldsOf({ tree: _, inputs, ...formula }: FormulaStep): FormulaFields {
	const written = structuredClone(formula);
	return { ...written, inputs: inputs.map((input) => ({ ...input, was: input.name })) };
}

/** Inputs that have another name now, by the one they had. */
export function renamedIn({ inputs }: FormulaFields): Map<string, string> {
	return new Map(
		inputs.flatMap(({ was, name }) => (was !== null && was !== name ? [[was, name]] : []))
	);
}
