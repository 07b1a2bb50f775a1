/** The words of a stored document as plain text, so that they can be read and taken along in any state. */
export function plainWords(stored: unknown): string {
	const { title, point, blocks } = (stored ?? {}) as Record<string, unknown>;
	const lines = [title, point, ...(Array.isArray(blocks) ? blocks.map(blockWords) : [])];
	const words = lines.filter((line) => typeof line === 'string' && line !== '').join('\n\n');
	return words || JSON.stringify(stored, null, 2);
}

function blockWords(block: unknown): string {
	const { content, title } = (block ?? {}) as Record<string, unknown>;
	if (!Array.isArray(content)) return typeof title === 'string' ? title : '';
	return content.map(inlineWords).join('');
}

/** Numbers that the widget prints have no words of their own. */
function inlineWords(inline: unknown): string {
	const { text } = (inline ?? {}) as Record<string, unknown>;
	return typeof text === 'string' ? text : '…';
}
