/** Declaring a number: tied to a reading, printed live, or named as no claim. Each is one undoable change. */
import type { Transaction } from 'prosemirror-state';
import type { DetectedQuantity } from '../factcheck/detect.ts';
import { commensurable, unitOf, units } from '../physics/units/units.ts';
import type { LiveFormat } from '../widget/stated.ts';
import type { Claim, ReadingRef } from '../widget/document.ts';
import { newId } from './ids.ts';
import type { NumberInCopy } from './quantities.ts';
import { schema, wiringOf } from './schema.ts';

type Entry = Claim extends infer C ? (C extends Claim ? Omit<C, 'id'> : never) : never;

/** Puts the claim's entry beside the text and its mark on the number's words. */
function declare(transaction: Transaction, number: NumberInCopy, entry: Entry): Transaction {
	const id = number.claim?.id ?? newId('claim');
	const others = wiringOf(transaction.doc).claims.filter((claim) => claim.id !== id);
	return transaction
		.addMark(number.from, number.to, schema.mark('claim', { id }))
		.removeStoredMark(schema.marks.claim)
		.setDocAttribute('claims', [...others, { ...entry, id } as Claim]);
}

/** Words tied to a control would go false as soon as it moves, so the control's own value is printed in their place. */
export function tie(
	transaction: Transaction,
	number: NumberInCopy,
	reading: ReadingRef
): Transaction {
	if ('control' in reading) return printSetting(transaction, number, reading.control);
	if (number.claim?.form === 'live') {
		return replaceClaim(transaction, { ...number.claim, reading });
	}
	return declare(transaction, number, { form: 'stated', reading });
}

export function exempt(
	transaction: Transaction,
	number: NumberInCopy,
	reason: string
): Transaction {
	return declare(transaction, number, { form: 'exempt', reason });
}

export function untie(transaction: Transaction, number: NumberInCopy, words: string): Transaction {
	const { claim } = number;
	if (!claim) return transaction;
	if (claim.form === 'live') transaction.replaceWith(number.from, number.to, schema.text(words));
	else transaction.removeMark(number.from, number.to, schema.marks.claim);
	const claims = wiringOf(transaction.doc).claims.filter(({ id }) => id !== claim.id);
	return transaction.setDocAttribute('claims', claims);
}

/** Puts a number that the widget prints in place of the words. A control's value is a setting, not a claim. */
export function printLive(
	transaction: Transaction,
	number: NumberInCopy,
	reading: ReadingRef,
	format: LiveFormat
): Transaction {
	if ('control' in reading) return printSetting(transaction, number, reading.control);
	const id = newId('claim');
	return transaction
		.replaceWith(number.from, number.to, schema.node('live', { claim: id }))
		.setDocAttribute('claims', [
			...wiringOf(transaction.doc).claims,
			{ id, form: 'live', reading, ...format } satisfies Claim
		]);
}

/** A control's value in place of the words. It is a setting, and no claim: an entry that stood for the words goes. */
function printSetting(
	transaction: Transaction,
	number: NumberInCopy,
	control: string
): Transaction {
	return transaction
		.replaceWith(number.from, number.to, schema.node('setting', { control }))
		.setDocAttribute(
			'claims',
			wiringOf(transaction.doc).claims.filter(({ id }) => id !== number.claim?.id)
		);
}

export function replaceClaim(transaction: Transaction, claim: Claim): Transaction {
	const claims = wiringOf(transaction.doc).claims.map((other) =>
		other.id === claim.id ? claim : other
	);
	return transaction.setDocAttribute('claims', claims);
}

/** The format the writer's own words ask for: their unit and scale, as many figures, the same hedge. */
export function liveFormat(quantity: DetectedQuantity | null, readingUnit: string): LiveFormat {
	const stated = quantity?.stated;
	if (!stated) return { unit: readingUnit, figures: 3, hedge: 'none' };
	return {
		unit: scaledUnit(stated.unit, stated.scale) ?? readingUnit,
		figures: significantFigures(stated.numeral),
		hedge: stated.hedge === 'around' ? 'about' : 'none'
	};
}

/** The unit that is `scale` of another: “million years” is Myr. Null when the table has none. */
export function scaledUnit(symbol: string, scale: number): string | null {
	const base = unitOf(symbol);
	if (!base) return null;
	if (scale === 1) return symbol;
	const wanted = base.toSI * scale;
	const found = units.find(
		(unit) =>
			unit.offset === 0 &&
			commensurable(unit.symbol, symbol) &&
			Math.abs(unit.toSI / wanted - 1) < 1e-12
	);
	return found?.symbol ?? null;
}

/** Digits that count, from 1 to 6: trailing noughts of a whole number don't. */
export function significantFigures(numeral: string): number {
	const digits = numeral.replace(/^-/, '').replace(/^0*\.?0*/, '');
	const counted = numeral.includes('.') ? digits.replace('.', '') : digits.replace(/0+$/, '');
	return Math.min(6, Math.max(1, counted.length));
}

/** Puts other words in the place of a claim's own; the tie stays. */
export function replaceWords(
	transaction: Transaction,
	number: NumberInCopy,
	words: string
): Transaction {
	if (!number.claim || number.words === '') return transaction;
	const mark = schema.mark('claim', { id: number.claim.id });
	return transaction.replaceWith(number.from, number.to, schema.text(words, [mark]));
}
