/** Where a stored width is found. Its name is its hash, so an address never shows other bytes. Pure. */
import type { PictureFile, StoredType } from './view.ts';

type Named = Pick<PictureFile, 'digest' | 'type'>;

const ENDINGS: Record<StoredType, string> = {
	'image/webp': 'webp',
	'image/jpeg': 'jpg',
	'image/png': 'png'
};

export function fileNameOf({ digest, type }: Named): string {
	return `${digest}.${ENDINGS[type]}`;
}

/** In the store, at the picture desk. */
export function storeKey(file: Named): string {
	return `pictures/${fileNameOf(file)}`;
}

/** In the store and on the shelf, as part of a release. */
export function pressKey(file: Named): string {
	return `press/${fileNameOf(file)}`;
}

/** For readers: the release’s own copy. */
export function pressAddress(file: Named): string {
	return `/${pressKey(file)}`;
}

/** The file a name stands for; null when it is no such name. */
export function fileNamed(name: string): { digest: string; type: StoredType } | null {
	const [, digest, ending] = /^([0-9a-f]{64})\.(webp|jpg|png)$/.exec(name) ?? [];
	const type = (Object.keys(ENDINGS) as StoredType[]).find((each) => ENDINGS[each] === ending);
	return digest && type ? { digest, type } : null;
}

/** For a page: the small ones first, as `srcset` wants them, and the one that every browser can show. */
export function sourcesOf<File extends Named & { width: number }>(
	files: readonly File[],
	addressOf: (file: Named) => string
): { srcset: string; fallback: string } {
	const webp = files.filter(({ type }) => type === 'image/webp').sort((a, b) => a.width - b.width);
	const plain = files.find(({ type }) => type !== 'image/webp') ?? webp.at(-1);
	return {
		srcset: webp.map((file) => `${addressOf(file)} ${file.width}w`).join(', '),
		fallback: plain ? addressOf(plain) : ''
	};
}
