/** German number words, which are written as one word however long: “dreihundertvierundzwanzigtausendfünfhundert”. */

const ONES: Readonly<Record<string, number>> = {
	ein: 1,
	eine: 1,
	eins: 1,
	zwei: 2,
	zwo: 2,
	drei: 3,
	vier: 4,
	fünf: 5,
	sechs: 6,
	sieben: 7,
	acht: 8,
	neun: 9
};

const TEENS: Readonly<Record<string, number>> = {
	zehn: 10,
	elf: 11,
	zwölf: 12,
	dreizehn: 13,
	vierzehn: 14,
	fünfzehn: 15,
	sechzehn: 16,
	siebzehn: 17,
	achtzehn: 18,
	neunzehn: 19
};

const TENS: Readonly<Record<string, number>> = {
	zwanzig: 20,
	dreißig: 30,
	dreissig: 30,
	vierzig: 40,
	fünfzig: 50,
	sechzig: 60,
	siebzig: 70,
	achtzig: 80,
	neunzig: 90
};

/** Words that need no taking apart. “ein” and its forms are articles, and read as such. */
export const CARDINALS: Readonly<Record<string, number>> = {
	null: 0,
	eins: 1,
	...Object.fromEntries(Object.entries(ONES).filter(([, value]) => value > 1)),
	...TEENS,
	...TENS,
	zweier: 2,
	dreier: 3,
	anderthalb: 1.5,
	eineinhalb: 1.5
};

/** Every compound begins with one of these; a test that spares most words the rest. */
const BEGINNING =
	/^(?:anderthalb|ein|zw|drei|vier|fünf|sech|sieb|acht|neun|zehn|elf|dreiss|hundert|tausend)/;
const PAIR = new RegExp(`^(${Object.keys(ONES).join('|')})und(${Object.keys(TENS).join('|')})$`);

function belowHundred(word: string): number | null {
	if (word.endsWith('einhalb') && word !== 'einhalb') {
		const many = belowHundred(word.slice(0, -'einhalb'.length));
		return many === null ? null : many + 0.5;
	}
	if (word === 'anderthalb') return 1.5;
	const whole = ONES[word] ?? TEENS[word] ?? TENS[word];
	if (whole !== undefined) return whole;
	const [, ones = '', tens = ''] = PAIR.exec(word) ?? [];
	return ones ? (ONES[ones] ?? 0) + (TENS[tens] ?? 0) : null;
}

function belowThousand(word: string): number | null {
	return byPower(word, 'hundert', 100, belowHundred) ?? belowHundred(word);
}

/** “dreihundertvier”: so many hundreds, and a rest. Nothing before the power is one. */
function byPower(
	word: string,
	power: string,
	value: number,
	part: (word: string) => number | null
): number | null {
	const at = word.indexOf(power);
	if (at < 0) return null;
	const before = word.slice(0, at);
	const after = word.slice(at + power.length).replace(/^und/, '');
	const [many, rest] = [before ? part(before) : 1, after ? part(after) : 0];
	return many === null || rest === null ? null : many * value + rest;
}

/** The value of a number word, from “dreizehn” to “neunhunderttausend”; halves as in “zweieinhalb”. Null for other words. */
export function compoundNumber(word: string): number | null {
	if (!BEGINNING.test(word) || (Object.hasOwn(ONES, word) && ONES[word] === 1)) return null;
	return byPower(word, 'tausend', 1000, belowThousand) ?? belowThousand(word);
}

/** “zwanzigtausendstel”, “vierhundertstel”: the denominator of a part, in any case; null for other words. */
export function compoundPart(word: string): number | null {
	const stem = /^(.+?)s?tel[ns]?$/.exec(word)?.[1];
	const value = stem === undefined ? null : compoundNumber(stem);
	return value !== null && value > 2 && Number.isInteger(value) ? value : null;
}
