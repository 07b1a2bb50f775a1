/** Lays our answers beside the reference’s and keeps the worst difference of each output. */
import type { Answers, Column, Family, Row } from './family.ts';

export interface Worst {
	key: string;
	/** Rows that both sides answered. */
	compared: number;
	/** Rows that the reference can’t answer. */
	leftOut: number;
	/** Largest relative difference, excused rows apart. */
	relative: number;
	/** What the column allows. */
	allowed: number;
	/** Rows past that, where the reference can’t do better by its own word. */
	excused: number;
	/** Largest relative difference of those. */
	excusedRelative: number;
	/** Rows past what is allowed there, or answered by one side only. */
	faults: number;
	/** The first such row. */
	row: Row | null;
	limit: string | null;
}

/** |ours − theirs| over |theirs|; 0 when both are 0. */
export function relativeError(ours: number, theirs: number): number {
	if (ours === theirs) return 0;
	return theirs === 0 ? Infinity : Math.abs(ours - theirs) / Math.abs(theirs);
}

/** The worst of every column of a family. */
export function compareFamily(
	{ columns, ours }: Family,
	rows: readonly Row[],
	reference: readonly Answers[]
): Worst[] {
	const answered = rows.map((row, index) => ({
		row,
		theirs: reference[index]!,
		own: ours(row, reference[index]!)
	}));
	return columns.map((column) => {
		const worst: Worst = {
			key: column.key,
			compared: 0,
			leftOut: 0,
			relative: 0,
			allowed: column.allowed,
			excused: 0,
			excusedRelative: 0,
			faults: 0,
			row: null,
			limit: column.limit?.says ?? null
		};
		for (const { row, theirs, own } of answered) {
			if (!(column.key in theirs)) continue;
			take(worst, column, row, theirs, own[column.key]);
		}
		return worst;
	});
}

function take(
	worst: Worst,
	column: Column,
	row: Row,
	theirs: Answers,
	own: number | undefined
): void {
	const value = theirs[column.key];
	if (value === null && column.limit?.leavesOut) {
		worst.leftOut += 1;
		return;
	}
	if (value === null || value === undefined || own === undefined) {
		fault(worst, row, Infinity);
		return;
	}
	worst.compared += 1;
	const relative = relativeError(own, value);
	if (relative <= column.allowed) {
		if (relative > worst.relative) worst.relative = relative;
	} else if (relative <= (column.limit?.allowed?.(row, theirs) ?? 0)) {
		worst.excused += 1;
		worst.excusedRelative = Math.max(worst.excusedRelative, relative);
	} else fault(worst, row, relative);
}

function fault(worst: Worst, row: Row, relative: number): void {
	worst.faults += 1;
	// A difference from no number at all is no small one.
	worst.relative = Math.max(worst.relative, Number.isNaN(relative) ? Infinity : relative);
	worst.row ??= row;
}
