declare module 'subset-font' {
	/** Cuts a font down to the letters of a text. */
	export default function subsetFont(
		font: Buffer,
		text: string,
		options?: { targetFormat?: 'sfnt' | 'woff' | 'woff2' }
	): Promise<Buffer>;
}
