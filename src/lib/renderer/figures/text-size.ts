/**
 * How much room words take, guessed from their letters: a drawing made on the server can't measure. The guess is on
 * the wide side of Fira Sans and of the system faces that stand in for it.
 */

const NARROW = new Set([..."iljtfrI.,:;!|'’‘()[]/ \u00a0\u202f·⁰¹²³⁴⁵⁶⁷⁸⁹⁻"]);
const WIDE = new Set([...'mwMWGOQ%@—…⊕☉']);

/** Width in pixels. */
export function textWidth(text: string, size: number): number {
	let ems = 0;
	for (const letter of text) {
		const code = letter.codePointAt(0) ?? 0;
		if (NARROW.has(letter)) ems += 0.37;
		else if (WIDE.has(letter)) ems += 0.9;
		else if (code > 0x2e80) ems += 1.05;
		else if (letter >= 'A' && letter <= 'Z') ems += 0.68;
		else ems += 0.6;
	}
	return ems * size;
}

/** Lines no wider than `width` pixels, broken between words where that is possible. */
export function wrapText(text: string, width: number, size: number): string[] {
	const lines: string[] = [];
	let line = '';
	const words = text
		.trim()
		.split(/ +/)
		.flatMap((word) => pieces(word, width, size));
	for (const word of words) {
		const longer = line ? `${line} ${word}` : word;
		if (line && textWidth(longer, size) > width) {
			lines.push(line);
			line = word;
		} else line = longer;
	}
	return line ? [...lines, line] : lines;
}

function pieces(word: string, width: number, size: number): string[] {
	const found: string[] = [];
	let piece = '';
	for (const letter of word) {
		if (piece && textWidth(piece + letter, size) > width) {
			found.push(piece);
			piece = letter;
		} else piece += letter;
	}
	return [...found, piece];
}
