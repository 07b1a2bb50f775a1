/**
 * Signs and spaces: what a typesetter would mend. Units as in A. Thompson and B. N. Taylor, NIST Special Publication 811,
 * 2008, chapters 6 and 7: symbols have no plural and one spelling, and stand apart from their number. Quotes, dashes and
 * the no-break space: common practice. One expression finds all of them in one pass.
 */
import type { Language } from '../widget/language.ts';
import type { Finding } from './note.ts';

const SYMBOLS =
	'[kMGT]?Hz|[kcmµμn]?m|k?g|[mµμn]?s|h|min|K|[kMGT]?W(?:h)?|[kMGT]?J|k?N|[kM]?V|[kMG]?eV|[kMG]?Pa|[kMG]?pc|Myr|Gyr|au|°C|°F|mK|µK|km/s|m/s|m/s²|rad|mol|dB';

const RIGHT_SYMBOL: Readonly<Record<string, string>> = {
	kms: 'km',
	KM: 'km',
	Km: 'km',
	cms: 'cm',
	mms: 'mm',
	mtr: 'm',
	mtrs: 'm',
	kgs: 'kg',
	Kg: 'kg',
	KG: 'kg',
	gm: 'g',
	gms: 'g',
	sec: 's',
	secs: 's',
	hr: 'h',
	hrs: 'h',
	kph: 'km/h',
	kmh: 'km/h',
	mps: 'm/s',
	Mhz: 'MHz',
	MHZ: 'MHz',
	mhz: 'MHz',
	Khz: 'kHz',
	KHz: 'kHz',
	khz: 'kHz',
	Ghz: 'GHz',
	GHZ: 'GHz',
	Kw: 'kW',
	KW: 'kW',
	Kwh: 'kWh',
	KWh: 'kWh',
	kwh: 'kWh',
	Kj: 'kJ',
	KJ: 'kJ',
	ºC: '°C',
	Ly: 'ly'
};
const WRONG = Object.keys(RIGHT_SYMBOL).join('|');

const SIGNS = new RegExp(
	[
		`(?<spaces>(?<=\\S)  +(?=\\S))`,
		`(?<range>(?<![\\d\\p{L}-])\\d[\\d.,]*-\\d[\\d.,]*\\d*(?![\\d\\p{L}-]))`,
		`(?<minus>(?<![^\\s(\\[=≈<>±×])-(?=\\d))`,
		`(?<digits>(?<![\\d\\p{L}./-])\\d[\\d.,\u202f\u00a0]{4,}\\d(?![\\d\\p{L}/-]))`,
		`(?<wrong>(?<=\\d[ \u00a0\u202f]?)(?:${WRONG})(?![\\p{L}\\p{N}]))`,
		`(?<kelvin>[°º] ?K(?![\\p{L}\\p{N}]))`,
		`(?<space>(?<=\\d) (?=(?:${SYMBOLS})(?![\\p{L}\\p{N}’'])))`,
		`(?<percent>(?<=\\d) ?%)`,
		`(?<quote>["'])`
	].join('|'),
	'gu'
);

/** Six figures are more than any reading of the house is good for; “exactly” says that they are meant. */
const MANY_FIGURES = 6;
const EXACT = /(?:exactly|precisely|exakt|genau|exactamente|precisamente)\s$/iu;
const DATE = /^\d{1,4}[.,]\d{1,2}[.,]\d{1,4}$/u;
const OF_MONEY_OR_YEAR = /^(?:1[5-9]|20)\d\d$/u;

export function signsIn(text: string, language: Language): Finding[] {
	const found: Finding[] = [];
	for (const match of text.matchAll(SIGNS)) {
		const finding = findingOf(match, text, language);
		if (finding) found.push({ from: match.index, to: match.index + match[0].length, ...finding });
	}
	return found;
}

type Says = Omit<Finding, 'from' | 'to'>;

function findingOf(match: RegExpExecArray, text: string, language: Language): Says | null {
	const { groups = {} } = match;
	const sign = match[0];
	if (groups.quote) return quoteFinding(match.index, text, language);
	if (groups.space) {
		return {
			code: 'no-break-space',
			says: 'A line may break between this number and its unit.',
			mend: 'Put a no-break space there.',
			replacement: '\u00a0'
		};
	}
	if (groups.digits) return digitsFinding(sign, text.slice(0, match.index));
	if (groups.minus) {
		return {
			code: 'hyphen-minus',
			says: 'This is a hyphen, and is read as one.',
			replacement: '−'
		};
	}
	if (groups.range) {
		return {
			code: 'hyphen-range',
			says: 'A range wants an en dash, or “to”.',
			replacement: sign.replace('-', '–')
		};
	}
	if (groups.wrong) {
		const right = RIGHT_SYMBOL[sign] ?? sign;
		return { code: 'unit-symbol', says: `The symbol is “${right}”.`, replacement: right };
	}
	if (groups.kelvin) {
		return {
			code: 'degrees-kelvin',
			says: 'The kelvin has had no degrees since 1967.',
			replacement: 'K'
		};
	}
	if (groups.percent) return percentFinding(sign, language);
	return { code: 'double-space', says: 'Two spaces stand here.', replacement: ' ' };
}

/** German (DIN 5008) and Spanish (Ortografía de la lengua española, 2010) set the sign apart; English doesn't. */
function percentFinding(sign: string, language: Language): Says | null {
	if (language === 'en') return null;
	return {
		code: 'no-break-space',
		says: 'The per cent sign stands apart from its number, and a line may not break there.',
		replacement: sign.startsWith(' ') ? '\u00a0%' : '\u00a0%'
	};
}

function digitsFinding(numeral: string, before: string): Says | null {
	if (DATE.test(numeral) || OF_MONEY_OR_YEAR.test(numeral) || EXACT.test(before)) return null;
	const whole = !/[.,]\d{1,2}$|[.,]\d{4,}$|[.,]\d{3}.*[.,]/u.test(numeral);
	const figures = numeral.replace(/\D/gu, '').replace(/^0+/u, '');
	const counted = whole ? figures.replace(/0+$/u, '') : figures;
	if (counted.length < MANY_FIGURES) return null;
	return {
		code: 'false-precision',
		says: `${counted.length} figures look exact, and few readers keep more than three.`,
		mend: 'Round it, or say “exactly” where it is so by definition.'
	};
}

const QUOTES: Record<Language, { '"': [string, string]; "'": [string, string] }> = {
	en: { '"': ['“', '”'], "'": ['‘', '’'] },
	de: { '"': ['„', '“'], "'": ['‚', '‘'] },
	es: { '"': ['«', '»'], "'": ['‘', '’'] }
};

function quoteFinding(at: number, text: string, language: Language): Says {
	const sign = text[at] === '"' ? '"' : "'";
	const before = text[at - 1] ?? ' ';
	const after = text[at + 1] ?? ' ';
	if (/\d/u.test(before) && !openBefore(text, at, sign)) {
		const prime = sign === '"' ? '″' : '′';
		return {
			code: 'straight-quotes',
			says: 'A straight sign stands for feet or minutes here.',
			mend: 'Write the unit in words or in SI.',
			replacement: prime
		};
	}
	const apostrophe = sign === "'" && /\p{L}/u.test(before) && /\p{L}/u.test(after);
	const [open, close] = QUOTES[language][sign];
	const opens = !/[\p{L}\p{N}.,!?…)”’\ufffc]/u.test(before);
	return {
		code: 'straight-quotes',
		says: 'A typewriter’s sign stands here.',
		replacement: apostrophe ? '’' : opens ? open : close
	};
}

/** Whether a quote of this kind is still open before `at`. */
function openBefore(text: string, at: number, sign: string): boolean {
	let count = 0;
	for (let index = text.lastIndexOf('\n', at) + 1; index < at; index++) {
		if (text[index] === sign) count++;
	}
	return count % 2 === 1;
}
