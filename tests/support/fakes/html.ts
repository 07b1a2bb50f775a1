export const escapeHtml = (text: string) =>
	text.replace(/[<>&"']/g, (character) => `&#${character.charCodeAt(0)};`);

/** A whole page around a body that is already HTML; `head` too is HTML, title and style are plain text. */
export function page(parts: {
	title: string;
	body: string;
	style?: string;
	head?: string;
}): string {
	return `<!doctype html>
<html lang="en">
<head>
<meta charset="utf-8">
<meta name="viewport" content="width=device-width, initial-scale=1">
<title>${escapeHtml(parts.title)}</title>
<link rel="icon" href="data:,">
${parts.style ? `<style>${parts.style}</style>` : ''}${parts.head ?? ''}
</head>
<body>
${parts.body}
</body>
</html>
`;
}
