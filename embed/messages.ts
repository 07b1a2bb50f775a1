/** What a frame tells the page around it: its height, nothing else. Its origin is opaque, so pages trust `event.source`. */
export interface HeightMessage {
	v: 1;
	type: 'height';
	/** CSS pixels, whole. */
	height: number;
}

export function heightMessage(height: number): HeightMessage {
	return { v: 1, type: 'height', height: Math.ceil(height) };
}
