/** The decision procedure: from same thing and same unit to the hedge's own rule. Suggestions are added by `weigh`. */
import { QUANTITY_KINDS, type QuantityRow } from '../physics/units/quantities.ts';
import { unitOf } from '../physics/units/units.ts';
import type { Stated } from '../widget/stated.ts';
import { bands } from './bands.ts';
import { signOf } from './decimal.ts';
import { isReadTwoWays } from './hedges.ts';
import { rules } from './rules.ts';
import type { Severity, Verdict } from './verdict.ts';
import {
	departurePercent,
	hasIdleDigits,
	inUnit,
	prepare,
	sameDimension,
	type Weighing,
	type WeighedReading
} from './weighing.ts';

export type Decision = Omit<Verdict, 'suggestions'>;

/** Weighs a stated number against a reading. Never throws; what can't be compared is unweighed, or tips. */
export function decide(stated: Stated, reading: WeighedReading): Decision {
	if (!Number.isFinite(reading.value)) return unweighed('No reading.');
	if (!isNumeral(stated)) return unweighed('No number in these words.');
	const rule = stated.fraction ? 'N23' : rules[stated.hedge].id;
	const mismatch = unitMismatch(stated, reading);
	if (mismatch) return apart(rule, mismatch);
	if (!Number.isFinite(inUnit(reading, stated.unit))) return unweighed('No reading.');

	const weighing = prepare(stated, reading);
	const outcome = kindMismatch(stated, reading) ?? outcomeOf(weighing);
	const percent = departurePercent(weighing);
	return {
		verdict: outcome.verdict,
		severity: severityOf(weighing),
		rule,
		reason: outcome.reason,
		departurePercent: percent !== null && Number.isFinite(percent) ? percent : null
	};
}

export function unweighed(reason: string): Decision {
	return { verdict: 'unweighed', severity: 'none', rule: '', reason, departurePercent: null };
}

function apart(rule: string, reason: string): Decision {
	return { verdict: 'tips', severity: 'none', rule, reason, departurePercent: null };
}

function isNumeral({ numeral, scale }: Stated): boolean {
	return /^-?\d{1,60}(?:\.\d{1,60})?$/.test(numeral) && Number.isFinite(scale) && scale > 0;
}

function unitMismatch(stated: Stated, reading: WeighedReading): string | null {
	if (sameDimension(reading.unit, stated.unit)) return null;
	return `The reading is ${unitSaid(reading.unit)}; the copy gives ${unitSaid(stated.unit)}.`;
}

function unitSaid(symbol: string): string {
	return symbol === '' ? 'a plain number' : `a number of ${unitOf(symbol)?.words.many ?? symbol}`;
}

/** Two kinds are known to differ only where the table of quantity kinds says that one is mistaken for the other. */
function kindMismatch(stated: Stated, reading: WeighedReading) {
	const [said, read] = [kindOf(stated.quantity), kindOf(reading.quantity)];
	if (!said || !read || stated.quantity === reading.quantity) return null;
	const confused =
		said.mistakenFor?.includes(reading.quantity ?? '') ||
		read.mistakenFor?.includes(stated.quantity ?? '');
	if (!confused) return null;
	return {
		verdict: 'tips' as const,
		reason: `The reading’s quantity is “${read.label}”; the copy’s words say “${said.label}”.`
	};
}

function kindOf(kind: string | undefined): QuantityRow | undefined {
	return kind === undefined ? undefined : (QUANTITY_KINDS as Record<string, QuantityRow>)[kind];
}

function outcomeOf(weighing: Weighing) {
	if (hasIdleDigits(weighing)) {
		return { verdict: 'tips' as const, reason: 'More digits than the reading supports.' };
	}
	return rules[weighing.stated.hedge].weigh(weighing);
}

/** Readers split on the side that “nearly −20” names, lay copy seldom needs a fourth figure: both are asked about. */
function severityOf({ stated, reading, v, figures }: Weighing): Severity {
	const sideOfNegative = rules[stated.hedge].oneSided && signOf(v) < 0;
	const manyFigures =
		figures > bands.figures && (reading.uncertainty !== 'exact' || stated.hedge === 'around');
	return sideOfNegative || manyFigures || isReadTwoWays(stated.hedgeWord) ? 'ask' : 'none';
}
