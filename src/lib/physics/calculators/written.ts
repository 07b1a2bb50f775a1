/** Inputs that are written out: decimals whose digits matter, and lists of numbers. */
import { refuse, type DecimalInput, type ListInput, type Refusal } from '../calculator.ts';
import { printNumber, rangeWords } from './wording.ts';

type Checked<T> = { ok: true; value: T } | { ok: false; refusal: Refusal };

const DECIMAL = /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d{1,3})?$/i;
const LONGEST_DECIMAL = 60;
const LONGEST_TEXT = 4000;

/** A decimal as plain text, with a hyphen for the minus. A number stands for its shortest decimal form. */
export function checkDecimal(key: string, spec: DecimalInput, given: unknown): Checked<string> {
	const text =
		typeof given === 'number' && Number.isFinite(given)
			? String(given)
			: typeof given === 'string'
				? given.trim().replace('−', '-')
				: '';
	if (text.length > LONGEST_DECIMAL || !DECIMAL.test(text)) {
		return refuse(
			'not-a-decimal',
			`${spec.label} must be a number as written, such as 2.345 or 1.5e9, with at most ${LONGEST_DECIMAL} signs.`,
			key
		);
	}
	return { ok: true, value: text };
}

/** A list as `number[]`, or `number[][]` where the input is made of rows. */
export function checkList(
	key: string,
	spec: ListInput,
	given: unknown
): Checked<number[] | number[][]> {
	const rows = rowsOf(spec, given);
	if (!rows) {
		const form = spec.shape === 'rows' ? ', with semicolons between rows' : '';
		return refuse(
			'not-a-list',
			`${spec.label} must be a list of numbers: [1, 2], or text with commas between numbers${form}.`,
			key
		);
	}
	if (rows.length > spec.longest || rows.some((row) => row.length > spec.longest)) {
		return refuse('list-too-long', `${spec.label}: at most ${spec.longest} are taken here.`, key);
	}
	const { columns } = spec;
	if (columns && rows.some((row) => row.length !== columns.length)) {
		return refuse(
			'row-broken',
			`${spec.label}: each row needs ${columns.length} numbers (${columns.join(', ')}).`,
			key
		);
	}
	const out = rows
		.flat()
		.find(
			(value) => value > spec.max || value < spec.min || (spec.minExclusive && value <= spec.min)
		);
	if (out !== undefined) {
		return refuse(
			'out-of-range',
			`${spec.label}: each number must be ${rangeWords(spec)}; ${printNumber(out)} was given.`,
			key
		);
	}
	return { ok: true, value: spec.shape === 'rows' ? rows : (rows[0] ?? []) };
}

/** The numbers row by row; undefined for anything that isn't a list with at least one number in each row. */
function rowsOf(spec: ListInput, given: unknown): number[][] | undefined {
	const isRows = spec.shape === 'rows';
	const raw: unknown[] =
		typeof given === 'string'
			? splitRows(given, isRows)
			: !Array.isArray(given)
				? []
				: isRows
					? (given as unknown[])
					: [given];
	const sound = raw.every(
		(row) =>
			Array.isArray(row) &&
			row.length > 0 &&
			row.every((value) => typeof value === 'number' && Number.isFinite(value))
	);
	return raw.length > 0 && sound ? (raw as number[][]) : undefined;
}

function splitRows(text: string, isRows: boolean): number[][] {
	if (text.length > LONGEST_TEXT) return [];
	const rows = isRows ? text.split(';') : [text];
	return rows.map((row) => row.split(',').map((part) => numberIn(part.trim().replace('−', '-'))));
}

function numberIn(text: string): number {
	return DECIMAL.test(text) ? Number(text) : NaN;
}
