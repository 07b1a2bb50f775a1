/**
 * Comma-separated values after RFC 4180. Spreadsheets run a cell that begins like a formula, so such text gets an
 * apostrophe before it; numbers are written by us and stay as they are, negative ones too.
 */
export type Cell = string | number | null;

/** The signs a formula can begin with, also in their full-width forms, and the spaces that hide them. */
const FORMULA = /^[=+\-@\t\r\n\uFF1D\uFF0B\uFF0D\uFF20\u2212]/;

export function csvOf(rows: readonly (readonly Cell[])[]): string {
	return rows.map((row) => row.map(cellOf).join(',') + '\r\n').join('');
}

/** Numbers have all their digits, and a full stop whatever the language; what isn't a finite number is left empty. */
function cellOf(cell: Cell): string {
	if (cell === null) return '';
	if (typeof cell === 'number') return Number.isFinite(cell) ? String(cell) : '';
	const safe = FORMULA.test(cell) ? `'${cell}` : cell;
	return /[",\r\n]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
}
