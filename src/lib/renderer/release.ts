/** What a frame is made from: one release, whole. It travels inside the frame's document. */
import type { HouseDefinition } from '../physics/house/definition.ts';
import type { WidgetDocument } from '../widget/document.ts';
import type { MathBook } from './math-node.ts';
import type { ClaimRecords } from './records.ts';

/** Worked out once, when the piece is released. */
export interface Released {
	/** The equations that the piece shows, as set on the server. */
	math: MathBook;
	records: ClaimRecords;
	/**
	 * The lines of charts at the first settings, by block id and in the order of its series: readings in the chart's unit
	 * at even steps along its level axis, null where refused. With them a frame wakes without working each line again.
	 */
	curves: Readonly<Record<string, readonly (readonly (number | null)[])[]>>;
}

export interface FrameRelease extends Released {
	slug: string;
	number: number;
	/** ISO 8601. */
	releasedAt: string;
	house: string;
	/** Where the piece's public page is; '' for the frame's own host. */
	origin: string;
	document: WidgetDocument;
	/** The house's own calculators that it uses, and its own formulas, as plain trees; built where they run. */
	houseCalculators: readonly HouseDefinition[];
	/** SHA-256 of the frozen proof, in hex. */
	digest: string;
}
