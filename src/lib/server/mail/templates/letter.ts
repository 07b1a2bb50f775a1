/** One letter, from one input, as text and as HTML. Only fixed words and escaped values get in. */
export interface Letter {
	subject: string;
	text: string;
	html: string;
}

export interface LetterParts {
	subject: string;
	paragraphs: string[];
	/** The one thing to do. `href` is an address of this house. */
	link: { words: string; href: string };
	/** Small print under the line. */
	foot: string;
}

export function writeLetter(
	houseName: string,
	{ subject, paragraphs, link, foot }: LetterParts
): Letter {
	const text = [...paragraphs, `${link.words}:\n${link.href}`, `-- \n${foot}\n${houseName}`].join(
		'\n\n'
	);
	const html = [
		'<!doctype html><html lang="en"><head><meta charset="utf-8">',
		`<title>${escapeHtml(subject)}</title></head>`,
		'<body style="font-family:Georgia,serif;font-size:16px;line-height:1.5;color:#1d1b22;max-width:36em;margin:2em auto">',
		...paragraphs.map((paragraph) => `<p>${escapeHtml(paragraph)}</p>`),
		`<p><a href="${escapeHtml(link.href)}">${escapeHtml(link.words)}</a></p>`,
		`<hr><p style="font-size:13px">${escapeHtml(foot)}<br>${escapeHtml(houseName)}</p>`,
		'</body></html>\n'
	].join('\n');
	return { subject: oneLine(subject), text: `${text}\n`, html };
}

/** A header is one line, whatever a title holds. */
function oneLine(text: string): string {
	// eslint-disable-next-line no-control-regex
	return text.replace(/[\u0000-\u001f\u007f]+/g, ' ').trim();
}

const ENTITIES: Record<string, string> = {
	'&': '&amp;',
	'<': '&lt;',
	'>': '&gt;',
	'"': '&quot;',
	"'": '&#39;'
};

function escapeHtml(text: string): string {
	return text.replace(/[&<>"']/g, (character) => ENTITIES[character] ?? '');
}
