/** Words as a search compares them: without case, accents and common endings, with what a plain word asks for. */

/** Words that say nothing about what is asked. “How” and “what” still count in a run of words. */
export const IDLE = new Set(
	`a an and are as at be by can could did do does for from get give had has have how i if in into is it its
	know known much my of on one or our out so than take takes taking that the then there these they thing this those to up us was we were
	what when where which who why will with would you`.split(/\s+/)
);

/** Words and numbers, without case and accents. */
export function wordsOf(text: string): string[] {
	const plain = text
		.normalize('NFKD')
		.replace(/\p{M}/gu, '')
		.replace(/['’]s?\b/g, '')
		.toLowerCase();
	return plain.split(/[^\p{L}\p{N}]+/u).filter(Boolean);
}

const ENDINGS: readonly (readonly [RegExp, string])[] = [
	[/(.{2,})ies$/, '$1y'],
	[/(.{2,}(?:s|x|z|ch|sh))es$/, '$1'],
	[/(.{2,}[^su])s$/, '$1'],
	[/(.{2,}[^aeiou])(?:led|ling)$/, '$1l'],
	[/(.{3,})(?:ing|ed)$/, '$1'],
	[/(.{3,})ly$/, '$1']
];
/** Forms that no ending tells. */
const IRREGULAR: Record<string, string> = {
	fell: 'fall',
	fallen: 'fall',
	threw: 'throw',
	thrown: 'throw',
	flew: 'fly',
	flown: 'fly',
	flies: 'fly',
	went: 'go',
	left: 'leave',
	leaves: 'leave',
	older: 'old',
	deeper: 'deep',
	deepest: 'deep',
	farther: 'far',
	further: 'far',
	hotter: 'hot',
	colder: 'cold',
	faster: 'fast',
	fastest: 'fast',
	heavier: 'heavy',
	brighter: 'bright',
	brightly: 'bright',
	larger: 'large',
	bigger: 'big',
	longer: 'long',
	ages: 'age',
	metre: 'meter',
	metres: 'meter',
	color: 'colour',
	masses: 'mass'
};

/** A word without its commonest endings: light enough that two meanings rarely fall together. */
export function stemOf(word: string): string {
	const known = Object.hasOwn(IRREGULAR, word) ? IRREGULAR[word] : undefined;
	if (known) return known;
	if (word.length < 4) return word;
	for (const [ending, rest] of ENDINGS) {
		if (!ending.test(word)) continue;
		const stem = word.replace(ending, rest);
		// “travelling” and “travel”, “stopped” and “stop”, “moved” and “move”.
		return stem.replace(/([bdgmnprt])\1$/, '$1').replace(/(.{3})e$/, '$1');
	}
	return word.replace(/(.{3})e$/, '$1');
}

function kin(table: Record<string, string>): Record<string, string[]> {
	return Object.fromEntries(
		Object.entries(table).map(([word, meant]) => [stemOf(word), meant.split(' ').map(stemOf)])
	);
}

/** What a plain word asks for, by the names of the quantities. All are stemmed. */
export const ASKS_FOR: Record<string, string[]> = kin({
	far: 'distance range',
	near: 'distance close',
	away: 'distance',
	wide: 'width diameter',
	big: 'size radius large',
	large: 'size radius big',
	small: 'size',
	tall: 'height high',
	high: 'height',
	deep: 'depth',
	old: 'age',
	age: 'old',
	long: 'time duration',
	late: 'time age',
	hot: 'temperature warm',
	cold: 'temperature cool',
	warm: 'temperature',
	fast: 'speed',
	quick: 'speed fast',
	slow: 'speed',
	velocity: 'speed',
	speed: 'fast',
	heavy: 'mass weight',
	mass: 'heavy',
	weight: 'mass',
	bright: 'brightness flux magnitude',
	loud: 'brightness temperature',
	strong: 'strength gravity field',
	often: 'rate frequency',
	colour: 'wavelength',
	pitch: 'frequency',
	tone: 'frequency',
	drop: 'fall',
	fall: 'drop',
	cosmos: 'universe',
	cosmic: 'universe',
	universe: 'cosmos',
	error: 'uncertainty',
	sigma: 'uncertainty',
	digit: 'figure',
	throw: 'projectile range flight',
	trebuchet: 'throw machine counterweight',
	catapult: 'throw machine counterweight',
	kinetic: 'energy motion',
	year: 'orbit time',
	swing: 'pendulum',
	asteroid: 'rock impact',
	meteor: 'rock impact',
	satellite: 'orbit',
	float: 'buoyancy sink',
	hydrogen: '21',
	parsec: 'distance',
	lightyear: 'distance'
});
