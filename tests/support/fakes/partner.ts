/**
 * Pages of an invented newspaper, The Carrowby Lantern, which shows Steelyard's frames on a host of its own. It takes no
 * script from us: the snippet is an iframe and a plain link, as a content system that strips scripts would leave them.
 */
import { createServer } from 'node:http';
import type { ServerResponse } from 'node:http';
import { embedSnippet } from '../../../src/lib/embed-snippet.ts';
import { firstLight } from '../../../src/lib/server/demo/first-light.ts';
import { sameDrop } from '../../../src/lib/server/demo/same-drop.ts';
import type { WidgetDocument } from '../../../src/lib/widget/document.ts';
import { escapeHtml, page } from './html.ts';
import { listenOn } from './listen.ts';
import type { Listening } from './listen.ts';

export interface PartnerOptions {
	port: number;
	host?: string;
	/** Where the frames come from, such as http://localhost:4620. */
	steelyard: string;
}

interface Article {
	headline: string;
	byline: string;
	before: string[];
	after: string[];
	/** What is in the frame; its snippet is made from it, as on the release screen. */
	piece: WidgetDocument;
}

const ARTICLES: Record<string, Article> = {
	'first-light-on-the-dial': {
		headline: 'The oldest note you could tune to',
		byline: 'By our reader in the hills, who keeps a garden and a wireless',
		before: [
			'There is a note that hydrogen has sounded since before there were stars. It set out high, and all the growing of space since then has lowered it. Where on the dial would you find it tonight? Try it for yourself:'
		],
		after: [
			'The wireless on Lantern Hill gets the shipping news and, on clear nights, a man in Ottersund who plays the saw. It has not yet got the note. The club is patient.'
		],
		piece: firstLight
	},
	'same-drop-same-blow': {
		headline: 'High or low, the wall takes the same knock',
		byline: 'By our reader at the quarry gate',
		before: [
			'The old argument at the quarry is whether a stone thrown flat hits harder than one thrown high. Neither, says the drop of the weight that threw it. See where the work goes:'
		],
		after: [
			'The argument has moved on to who owns the wall.',
			'We print no plans for such machines, and nobody at the quarry is building one.'
		],
		piece: sameDrop
	}
};

/** For a piece the newspaper has not written about: its name is guessed from the slug, its height from the longest. */
const plain = (slug: string): Article => {
	const title = slug.replaceAll('-', ' ').replace(/^./, (first) => first.toUpperCase());
	return {
		headline: title,
		byline: 'From our neighbours at the Institute',
		before: ['The Public Desk at Varrowmere has sent us something to try. Here it is:'],
		after: ['Letters about it, as ever, to the editor.'],
		piece: { ...sameDrop, title }
	};
};

const STYLE = `
:root { color-scheme: light; background: #fbfaf6; color: #171817; }
body { margin: 0 auto; max-width: 1280px; padding: 0 24px 64px; font: 18px/1.5 'Times New Roman', 'Liberation Serif', Tinos, Georgia, serif; }
header { text-align: center; border-bottom: 4px double #171817; padding: 20px 0 16px; }
.name { font-size: clamp(28px, 5vw, 46px); line-height: 1.15; font-weight: 700; font-variant: small-caps; letter-spacing: 0.04em; margin: 0; }
.name a { color: inherit; text-decoration: none; }
.day { font-style: italic; font-size: 16px; margin: 4px 0 0; }
.sheet { display: grid; grid-template-columns: minmax(0, 1fr); gap: 28px; padding-top: 24px; }
.byline { font-style: italic; font-size: 16px; margin: 0; }
main { display: contents; }
.story { max-width: 620px; width: 100%; }
h1 { font-size: clamp(28px, 4vw, 38px); line-height: 1.15; margin: 0 0 16px; }
h2 { font-size: 15px; letter-spacing: 0.06em; text-transform: uppercase; border-bottom: 1px solid #171817; padding-bottom: 6px; margin: 0 0 10px; }
p { margin: 0 0 18px; }
a { color: #17365d; } a:hover { text-decoration-thickness: 2px; } :focus-visible { outline: 2px solid #17365d; outline-offset: 2px; }
.frame { margin: 24px 0; }
.frame p { font-size: 16px; margin: 6px 0 0; }
aside ul { list-style: none; margin: 0; padding: 0; } aside li { padding: 4px 0; }
@media (min-width: 1000px) {
	.sheet { grid-template-columns: minmax(0, 200px) 710px minmax(0, 200px); justify-content: space-between; }
	.story { border-left: 1px solid #c9c6bb; border-right: 1px solid #c9c6bb; padding: 0 44px; max-width: none; box-sizing: border-box; width: auto; }
}
`;

const masthead = (on: 'front' | 'inside') => {
	const name = '<a href="/">The Carrowby Lantern</a>';
	return `<header>${on === 'front' ? `<h1 class="name">${name}</h1>` : `<p class="name">${name}</p>`}
<p class="day">Tuesday 8 December 2026 · Morning, with frost · Number 14 208</p></header>`;
};

const also = `<aside aria-label="Also today"><h2>Also today</h2><ul>
<li>Frost takes the last of the Brezal pears</li>
<li>Bridge at Ottersund to close for a week</li>
<li>Letters: the owl was a cat</li>
</ul></aside>`;

const STYLESHEET = '<link rel="stylesheet" href="/lantern.css">';

const paragraphs = (texts: string[]) =>
	texts.map((text) => `<p>${escapeHtml(text)}</p>`).join('\n');

function frontPage(): string {
	const leads = Object.entries(ARTICLES).map(
		([slug, article]) =>
			`<h2><a href="/${slug}">${escapeHtml(article.headline)}</a></h2>\n${paragraphs(article.before)}`
	);
	return page({
		title: 'The Carrowby Lantern',
		head: STYLESHEET,
		body: `${masthead('front')}<div class="sheet"><main><p class="byline">The paper that waits for the bread van.</p>
<div class="story">${leads.join('\n')}</div></main>${also}</div>`
	});
}

function articlePage(steelyard: string, slug: string): string {
	const article = ARTICLES[slug] ?? plain(slug);
	return page({
		title: `${article.headline} · The Carrowby Lantern`,
		head: STYLESHEET,
		body: `${masthead('inside')}<div class="sheet"><main><p class="byline">${escapeHtml(article.byline)}</p>
<div class="story"><h1>${escapeHtml(article.headline)}</h1>
${paragraphs(article.before)}
<div class="frame">${embedSnippet({ origin: steelyard, slug, document: article.piece })}</div>
${paragraphs(article.after)}</div></main>${also}</div>`
	});
}

/** Starts the newspaper. */
export async function startPartner(options: PartnerOptions): Promise<Listening> {
	// The newspaper's own strict policy: no script at all; frames from us alone; the snippet's style attribute is let through.
	const policy = [
		"default-src 'none'",
		"style-src 'self'",
		"style-src-attr 'unsafe-inline'",
		'img-src data:',
		`frame-src ${options.steelyard}`,
		"base-uri 'none'",
		"form-action 'none'",
		"frame-ancestors 'none'"
	].join('; ');
	const send = (response: ServerResponse, status: number, type: string, body: string) => {
		response.writeHead(status, {
			'content-type': `${type}; charset=utf-8`,
			'content-security-policy': policy,
			'x-content-type-options': 'nosniff',
			'cache-control': 'no-store'
		});
		response.end(body);
	};
	return listenOn(
		createServer((request, response) => {
			const path = new URL(request.url ?? '/', 'http://lantern.invalid').pathname;
			const slug = /^\/([a-z0-9][a-z0-9-]{0,79})$/.exec(path)?.[1];
			if (path === '/') send(response, 200, 'text/html', frontPage());
			else if (path === '/lantern.css') send(response, 200, 'text/css', STYLE);
			else if (slug) send(response, 200, 'text/html', articlePage(options.steelyard, slug));
			else send(response, 404, 'text/plain', 'The Lantern has no such page.\n');
		}),
		options
	);
}
