/** The tables of check values in `tests/references`, and how one answer stands against them. */
import { readFileSync } from 'node:fs';
import type { RawInputs, Result } from '../../src/lib/physics/calculator.ts';

export interface ReferenceCase {
	id: string;
	calculator: string;
	inputs: RawInputs;
	output: string;
	value: number | string | null;
	unit: string;
	relTol: number | null;
	absTol?: number;
	expect?: 'domain_error' | 'domain_warning';
	source: string;
	howComputed?: string;
}

export const REFERENCE_TABLES = ['reference.json', 'cosmology-quadrature.json'] as const;

/** The tolerance asked of the expanding universe is far tighter than the tables’. */
const COSMOLOGY_TOLERANCE = 1e-11;

/** One table of `tests/references`. */
export function readReferences<T = ReferenceCase>(name: string): T[] {
	return JSON.parse(readFileSync(new URL(`../references/${name}`, import.meta.url), 'utf8')) as T[];
}

/** What is wrong with an answer, as a sentence; null when it is within the stated tolerance. */
export function faultOf(one: ReferenceCase, result: Result): string | null {
	if (one.expect === 'domain_error') return result.ok ? 'A refusal was due.' : null;
	if (!result.ok) return `Refused: ${result.refusal.message}`;
	const reading = result.outputs[one.output];
	if (!reading) return `There is no output “${one.output}”.`;
	if (reading.unit !== one.unit) return `The unit is “${reading.unit}”, not “${one.unit}”.`;
	if (one.expect === 'domain_warning' && (result.validity === 'ok' || !result.warnings.length)) {
		return 'A warning was due.';
	}
	if (typeof one.value !== 'number' || typeof reading.value !== 'number') {
		return reading.value === one.value ? null : `It says “${reading.value}”, not “${one.value}”.`;
	}
	const off = Math.abs(reading.value - one.value);
	const allowed = Math.max(toleranceOf(one) * Math.abs(one.value), one.absTol ?? 0);
	return off <= allowed
		? null
		: `${reading.value} is ${off} from ${one.value}; ${allowed} is allowed.`;
}

function toleranceOf({ calculator, relTol }: ReferenceCase): number {
	const stated = relTol ?? 0;
	return calculator.startsWith('cosmo.') ? Math.min(COSMOLOGY_TOLERANCE, stated) : stated;
}
