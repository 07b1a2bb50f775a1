/** What stands in a frame when there is nothing to show: a card in the house's look, and no blame. */
import { policyHash } from '../auth/hashes.ts';

const STYLE = [
	':root{color-scheme:light dark}',
	'body{margin:0;background:#fff;color:#1e2623;font:17px/27px Georgia,serif}',
	'main{max-width:34rem;margin:auto;padding:40px 24px;text-align:center}',
	'h1{margin:0;font-size:22px;line-height:30px;font-weight:600}',
	'p{margin:8px 0 0;color:#4a5752;font:14px/20px system-ui,sans-serif}',
	'@media(prefers-color-scheme:dark){body{background:#1c2421;color:#eaf0ec}p{color:#aebbb4}}'
].join('');

function card(title: string, says: string): Buffer {
	return Buffer.from(
		'<!doctype html>\n<html lang="en"><head><meta charset="utf-8">' +
			'<meta name="viewport" content="width=device-width, initial-scale=1">' +
			`<title>${title}</title><style>${STYLE}</style></head>` +
			`<body><main><h1>${title}</h1><p>${says}</p></main></body></html>\n`
	);
}

export const MISSING_CARD = card(
	'Nothing is published here',
	'The address may be mistyped, or the piece isn’t out yet. The page around this one is all right.'
);

export const METHOD_CARD = card('This can only be read', 'Ask for it with GET or HEAD.');

export const CARD_STYLES = [policyHash(STYLE)];
