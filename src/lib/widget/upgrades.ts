/** Older documents climb one version at a time. Add steps; a released one stays as it is. */

/** A document as stored, before it has a schema's blessing. */
export type Stored = Record<string, unknown>;

export const upgrades: Record<number, (stored: Stored) => Stored> = { 1: fromVersion1 };

/** Version 2 brought formulas, more kinds of chart, and lines that share a chart. */
function fromVersion1(stored: Stored): Stored {
	return { ...stored, version: 2, formulas: [], blocks: listOf(stored.blocks).map(chartFrom1) };
}

function chartFrom1(block: unknown): unknown {
	if (!isRecord(block) || block.kind !== 'chart') return block;
	const { x, y, ...rest } = block;
	if (!isRecord(x) || !isRecord(y)) return block;
	const { reading, ...axis } = y;
	return {
		...rest,
		form: 'line',
		x: { ...x, scale: 'linear' },
		y: { ...axis, scale: 'linear', from: 'data' },
		series: [{ id: 'line', reading, label: '' }]
	};
}

function listOf(value: unknown): unknown[] {
	return Array.isArray(value) ? (value as unknown[]) : [];
}

function isRecord(value: unknown): value is Record<string, unknown> {
	return typeof value === 'object' && value !== null && !Array.isArray(value);
}
