/** What a frame is made from: one release, whole. It travels inside the frame's document. */
import type { HouseDefinition } from '../physics/house/definition.ts';
import type { WidgetDocument } from '../widget/document.ts';
import type { ClaimRecords } from './records.ts';

/** Worked out once, when the piece is released. */
export interface Released {
	records: ClaimRecords;
	/**
	 * The lines of charts at the first settings, by block id: readings in the chart's unit at even steps over the range of
	 * its control, null where refused. With them a frame wakes without working each line again.
	 */
	curves: Readonly<Record<string, readonly (number | null)[]>>;
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
	/** The house's own calculators that it uses, as plain trees; built where they run. */
	houseCalculators: readonly HouseDefinition[];
	/** SHA-256 of the frozen proof, in hex. */
	digest: string;
}
