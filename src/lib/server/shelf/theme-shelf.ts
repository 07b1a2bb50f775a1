/**
 * Frames in a partner's theme: `?theme=<id>` gives the same document with one style more, and a policy that allows just
 * that style. Made at first asking and kept; an id that nobody knows gives the frame in the house's own look.
 */
import { readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { brotliCompressSync, constants, gzipSync } from 'node:zlib';
import { frameStyle } from '../../themes/frame-style.ts';
import type { Theme } from '../../themes/theme.ts';
import { policyHash, sha256 } from '../auth/hashes.ts';
import { isMissing, write } from './atomic-file.ts';
import type { ShelfPage } from './shelf.ts';

const ASKED = /[?&]theme=([\w-]{1,40})(?:&|$)/;
/** The face a frame loads ahead; in vain where the theme has another. */
const PRELOADED_FACE = /<link rel="preload" as="font"[^>]*>/;

/** Some milliseconds, once a theme and release. */
const QUICK = { params: { [constants.BROTLI_PARAM_QUALITY]: 5 } };

interface Style {
	css: string;
	keepsFace: boolean;
}

export class ThemeShelf {
	readonly #file: string;
	#styles = new Map<string, Style>();
	#pages = new WeakMap<ShelfPage, Map<Style, ShelfPage>>();

	constructor(folder: string) {
		this.#file = join(folder, 'themes.json');
	}

	/** Brings the copy on disk into memory, so that frames are themed before the database is open. */
	async load(): Promise<void> {
		try {
			const kept = JSON.parse(await readFile(this.#file, 'utf8')) as [string, Theme][];
			this.#stand(new Map(kept));
		} catch (error) {
			// A copy that is gone or damaged is written anew when the database opens; till then the house's look stands in.
			if (error instanceof Error && 'code' in error && !isMissing(error)) throw error;
		}
	}

	/** Puts these themes, and no others, before readers. */
	async keep(themes: ReadonlyMap<string, Theme>): Promise<void> {
		this.#stand(themes);
		await write(this.#file, Buffer.from(JSON.stringify([...themes])));
	}

	/** The page in the theme that the address asks for. */
	dress(page: ShelfPage, url: string): ShelfPage {
		const id = ASKED.exec(url)?.[1];
		const style = id === undefined ? undefined : this.#styles.get(id);
		if (!style) return page;
		const dressed = this.#pages.get(page) ?? new Map<Style, ShelfPage>();
		this.#pages.set(page, dressed);
		const known = dressed.get(style) ?? dressedPage(page, style);
		dressed.set(style, known);
		return known;
	}

	#stand(themes: ReadonlyMap<string, Theme>): void {
		this.#styles = new Map(
			[...themes].map(([id, theme]) => [
				id,
				{ css: frameStyle(theme), keepsFace: theme.face === 'literata' }
			])
		);
		this.#pages = new WeakMap();
	}
}

function dressedPage(page: ShelfPage, { css, keepsFace }: Style): ShelfPage {
	const html = page.plain.toString('utf8');
	const headEnd = html.indexOf('</head>');
	const head = html.slice(0, headEnd);
	const styled = `${keepsFace ? head : head.replace(PRELOADED_FACE, '')}<style>${css}</style>`;
	const plain = Buffer.from(styled + html.slice(headEnd), 'utf8');
	return {
		...page,
		plain,
		sha256: sha256(plain),
		packed: { br: brotliCompressSync(plain, QUICK), gzip: gzipSync(plain) },
		styles: [...page.styles, policyHash(css)]
	};
}
