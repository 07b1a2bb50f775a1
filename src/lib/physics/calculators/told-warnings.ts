/** From codes of warnings to what a reader is told, in the order in which a calculator declares them. */
import type { Calculator, CheckedInputs, Validity, Warning, WarningSpec } from '../calculator.ts';
import type { Plan } from './plan.ts';

export interface Told {
	warnings: Warning[];
	validity: Validity;
}

const NONE: readonly string[] = [];

/** Codes of the warnings past the good zones of inputs. */
export function codesPastZones({ zones }: Plan, inputs: CheckedInputs): readonly string[] {
	if (zones.length === 0) return NONE;
	const codes: string[] = [];
	for (const { key, min, max, warning } of zones) {
		const value: unknown = inputs[key];
		if (typeof value === 'number' && (value < min || value > max)) codes.push(warning);
	}
	return codes;
}

/** @throws for a code that the calculator doesn't declare, which is a bug in it. */
export function toldWarnings(calculator: Calculator, codes: readonly string[]): Told {
	if (codes.length === 0) return { warnings: [], validity: 'ok' };
	const held = calculator.warnings.filter(({ code }) => codes.includes(code));
	for (const code of codes) {
		if (!held.some((warning) => warning.code === code))
			throw new Error(`${calculator.id} gave the undeclared warning “${code}”`);
	}
	return {
		warnings: held.map(({ code, message }) => ({ code, message })),
		validity: worstOf(held)
	};
}

function worstOf(held: readonly WarningSpec[]): Validity {
	if (held.some(({ validity }) => validity === 'outside')) return 'outside';
	return held.some(({ validity }) => validity === 'approximate') ? 'approximate' : 'ok';
}
