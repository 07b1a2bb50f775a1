/** A picture as it is pinned into a document: a copy of its record, so that a frozen document is whole. Pure. */
import type { PictureBlock } from '../widget/block.ts';
import { LICENCES } from './licences.ts';
import { isLicence, PICTURE_LABELS, pictureReady, type PictureRecord } from './record.ts';
import type { PictureFile } from './view.ts';

/** The fields of a picture block but its id; the caption is the writer’s. */
export type PlacedPicture = Omit<PictureBlock, 'id' | 'kind'>;

/** What placing needs to know of a picture. */
export interface Placeable {
	id: string;
	files: readonly PictureFile[];
	record: PictureRecord;
}

/** Throws when the record isn’t ready: ask `pictureReady` before. */
export function placePicture({ id, files, record }: Placeable, caption = ''): PlacedPicture {
	const { ready, findings } = pictureReady(record);
	if (!ready) throw new Error(findings.map(({ says }) => says).join(' '));
	const labels = record.labels.map((label) => PICTURE_LABELS[label]);
	return {
		picture: id,
		files: files.map(({ digest, width, height, type }) => ({ digest, width, height, type })),
		alt: record.alt && labelled(record.alt, labels),
		decorative: record.decorative,
		caption,
		credit: record.credit,
		licence: isLicence(record.licence) ? LICENCES[record.licence].name : '',
		labels
	};
}

/** Who can’t see the picture hears what it is before what it shows; not twice, when the words say so already. */
function labelled(alt: string, labels: string[]): string {
	const plain = (text: string) => text.toLowerCase().replaceAll('’', "'");
	const unsaid = labels.filter((label) => !plain(alt).includes(plain(label)));
	if (unsaid.length === 0) return alt;
	const [first = '', ...rest] = unsaid;
	return `${[first, ...rest.map((label) => label.toLowerCase())].join(', ')}: ${alt}`;
}
