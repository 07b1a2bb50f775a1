/**
 * Reads HTML as a list of events, without a document: nothing is fetched, nothing runs, and the same code reads a
 * browser’s clipboard and a server’s file. Tolerant: what isn’t a tag is text. Linear in the length of its input.
 */
export type HtmlEvent =
	| { kind: 'open'; name: string; attributes: ReadonlyMap<string, string> }
	| { kind: 'close'; name: string }
	| { kind: 'text'; text: string };

/** Elements that never have content. */
export const VOID = new Set(
	'area base br col embed hr img input link meta param source track wbr'.split(' ')
);
/** Elements whose content is no copy, and is passed over as it stands. */
const OPAQUE = new Set('script style xml iframe noscript template textarea title'.split(' '));

export function htmlEvents(html: string): HtmlEvent[] {
	const events: HtmlEvent[] = [];
	let at = 0;
	let text = '';
	const flush = () => {
		if (text !== '') events.push({ kind: 'text', text: decodeEntities(text) });
		text = '';
	};
	while (at < html.length) {
		const next = html.indexOf('<', at);
		if (next === -1) {
			text += html.slice(at);
			break;
		}
		text += html.slice(at, next);
		const tag = tagAt(html, next);
		if (!tag) {
			text += '<';
			at = next + 1;
			continue;
		}
		flush();
		at = tag.end;
		if (!tag.name) continue;
		if (tag.closes) events.push({ kind: 'close', name: tag.name });
		else if (OPAQUE.has(tag.name)) at = tag.selfCloses ? at : endOfElement(html, at, tag.name);
		else {
			events.push({ kind: 'open', name: tag.name, attributes: tag.attributes });
			if (tag.selfCloses && !VOID.has(tag.name)) events.push({ kind: 'close', name: tag.name });
		}
	}
	flush();
	return events;
}

interface Tag {
	/** '' for a comment or a declaration. */
	name: string;
	closes: boolean;
	selfCloses: boolean;
	attributes: ReadonlyMap<string, string>;
	/** After its last character. */
	end: number;
}

const NO_ATTRIBUTES: ReadonlyMap<string, string> = new Map();
const TAG_NAME = /[a-z][a-z0-9:-]*/iy;
const ATTRIBUTE = /[\s/]*([^\s"'<>/=]+)(?:\s*=\s*(?:"([^"]*)"|'([^']*)'|([^\s"'>]+)))?/y;
/** Pasted clipboards have a few; a flood of them is no copy. */
const MOST_ATTRIBUTES = 64;

function tagAt(html: string, start: number): Tag | null {
	const nothing = { name: '', closes: false, selfCloses: false, attributes: NO_ATTRIBUTES };
	if (html.startsWith('<!--', start)) {
		const end = html.indexOf('-->', start + 4);
		return { ...nothing, end: end === -1 ? html.length : end + 3 };
	}
	if (html[start + 1] === '!' || html[start + 1] === '?') {
		const end = html.indexOf('>', start);
		return { ...nothing, end: end === -1 ? html.length : end + 1 };
	}
	const closes = html[start + 1] === '/';
	TAG_NAME.lastIndex = start + (closes ? 2 : 1);
	const name = TAG_NAME.exec(html)?.[0].toLowerCase();
	if (!name) return null;
	const attributes = new Map<string, string>();
	let at = TAG_NAME.lastIndex;
	for (let count = 0; count < MOST_ATTRIBUTES; count++) {
		ATTRIBUTE.lastIndex = at;
		const found = ATTRIBUTE.exec(html);
		if (!found?.[1]) break;
		attributes.set(found[1].toLowerCase(), decodeEntities(found[2] ?? found[3] ?? found[4] ?? ''));
		at = ATTRIBUTE.lastIndex;
	}
	const end = html.indexOf('>', at);
	if (end === -1) return { name, closes, selfCloses: false, attributes, end: html.length };
	return { name, closes, selfCloses: html[end - 1] === '/', attributes, end: end + 1 };
}

function endOfElement(html: string, from: number, name: string): number {
	const close = new RegExp(`</${name}[\\s>/]`, 'giu');
	close.lastIndex = from;
	const found = close.exec(html);
	if (!found) return html.length;
	const end = html.indexOf('>', found.index);
	return end === -1 ? html.length : end + 1;
}

/** The names that word processors write; every other character comes as itself or by number. */
const NAMED: Readonly<Record<string, string>> = {
	amp: '&',
	lt: '<',
	gt: '>',
	quot: '"',
	apos: "'",
	nbsp: '\u00a0',
	ensp: '\u2002',
	emsp: '\u2003',
	thinsp: '\u2009',
	shy: '\u00ad',
	ndash: '–',
	mdash: '—',
	lsquo: '‘',
	rsquo: '’',
	sbquo: '‚',
	ldquo: '“',
	rdquo: '”',
	bdquo: '„',
	laquo: '«',
	raquo: '»',
	hellip: '…',
	bull: '•',
	middot: '·',
	times: '×',
	divide: '÷',
	minus: '−',
	plusmn: '±',
	deg: '°',
	micro: 'µ',
	sup1: '¹',
	sup2: '²',
	sup3: '³',
	frac12: '½',
	frac14: '¼',
	frac34: '¾',
	asymp: '≈',
	le: '≤',
	ge: '≥',
	ne: '≠',
	infin: '∞',
	prime: '′',
	Prime: '″',
	euro: '€',
	pound: '£',
	sect: '§',
	copy: '©',
	reg: '®',
	trade: '™',
	auml: 'ä',
	ouml: 'ö',
	uuml: 'ü',
	Auml: 'Ä',
	Ouml: 'Ö',
	Uuml: 'Ü',
	szlig: 'ß',
	aacute: 'á',
	eacute: 'é',
	iacute: 'í',
	oacute: 'ó',
	uacute: 'ú',
	ntilde: 'ñ',
	Ntilde: 'Ñ',
	iexcl: '¡',
	iquest: '¿',
	alpha: 'α',
	beta: 'β',
	gamma: 'γ',
	delta: 'δ',
	lambda: 'λ',
	mu: 'μ',
	nu: 'ν',
	pi: 'π',
	rho: 'ρ',
	sigma: 'σ',
	tau: 'τ',
	omega: 'ω',
	Delta: 'Δ',
	Omega: 'Ω',
	zwnj: '',
	zwj: '',
	lrm: '',
	rlm: ''
};

function decodeEntities(text: string): string {
	if (!text.includes('&')) return text;
	return text.replace(
		/&(?:#(\d{1,7})|#x([0-9a-f]{1,6})|([a-z]{2,8}[0-9]{0,2}));?/giu,
		(whole, decimal?: string, hex?: string, name?: string) => {
			if (name !== undefined) return Object.hasOwn(NAMED, name) ? (NAMED[name] ?? whole) : whole;
			return character(decimal === undefined ? parseInt(hex ?? '', 16) : Number(decimal));
		}
	);
}

/** Windows’ own characters are meant by 128–159; what no text holds is left out. */
const WINDOWS = '€\u0081‚ƒ„…†‡ˆ‰Š‹Œ\u008dŽ\u008f\u0090‘’“”•–—˜™š›œ\u009džŸ';

function character(code: number): string {
	if (code >= 128 && code <= 159) return WINDOWS[code - 128] ?? '';
	const isText =
		(code >= 32 || code === 9 || code === 10) &&
		code !== 127 &&
		code <= 0x10ffff &&
		!(code >= 0xd800 && code <= 0xdfff);
	return isText ? String.fromCodePoint(code) : '';
}
