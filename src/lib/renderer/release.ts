/** What a frame is made from: one release, whole. It travels inside the frame's document. */
import type { WidgetDocument } from '../widget/document.ts';
import type { ClaimRecords } from './records.ts';

export interface FrameRelease {
	slug: string;
	number: number;
	/** ISO 8601. */
	releasedAt: string;
	house: string;
	/** Where the piece's public page is; '' for the frame's own host. */
	origin: string;
	document: WidgetDocument;
	/** SHA-256 of the frozen proof, in hex. */
	digest: string;
	records: ClaimRecords;
}
