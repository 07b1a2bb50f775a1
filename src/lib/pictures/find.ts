/** Which pictures a few words ask for. Pure. */
import { PICTURE_LABELS } from './record.ts';
import type { PictureView } from './view.ts';

/** Every word must stand somewhere in what is known of the picture; no words ask for all. */
export function findPictures(pictures: readonly PictureView[], wanted: string): PictureView[] {
	const words = plain(wanted).split(/\s+/).filter(Boolean);
	return pictures.filter((picture) => {
		const known = plain(textOf(picture));
		return words.every((word) => known.includes(word));
	});
}

function textOf({ fileName, record, uses, addedBy }: PictureView): string {
	const labels = record.labels.map((label) => PICTURE_LABELS[label]);
	const { alt, decorative, creator, credit, source } = record;
	const pieces = uses.flatMap(({ slug, title }) => [slug, title]);
	return [fileName, alt, decorative, creator, credit, source, addedBy, ...labels, ...pieces].join(
		' '
	);
}

function plain(text: string): string {
	return text.normalize('NFKD').replace(/\p{M}/gu, '').replaceAll('’', "'").toLowerCase();
}
