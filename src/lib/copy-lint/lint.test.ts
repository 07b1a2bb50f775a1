import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { catalogue } from '../physics/calculators/index.ts';
import type { Language } from '../widget/language.ts';
import { parseDocument } from '../widget/parse.ts';
import type { CopyPart } from './copy.ts';
import { lintCopy, lintParts } from './lint.ts';
import { LINT_RULES, type LintCode } from './note.ts';

function paragraph(text: string, index = 0): CopyPart {
	return { block: `p${index}`, field: 'copy', kind: 'paragraph', text, reads: true };
}

/** Each line is a paragraph with its trap; a code that stands twice is meant twice. */
const PLANTED: Record<Language, readonly [LintCode, string, string][]> = {
	en: [
		['causal-verb', 'proves that', 'The dip in the curve proves that the gas was cold.'],
		['causal-verb', 'causes', 'Dust causes the dimming of this light.'],
		['weighs-mass', 'weighs about 70 kilograms', 'A grown person weighs about 70 kilograms.'],
		['degrees-kelvin', 'degrees Kelvin', 'Space itself is three degrees Kelvin warm.'],
		['degrees-kelvin', '°K', 'The gas was at 9 °K then.'],
		['rate-of-power', 'kilowatts per hour', 'A kettle draws two kilowatts per hour.'],
		['knots-per-hour', 'knots per hour', 'The ship made twelve knots per hour.'],
		['light-year-time', 'light years ago', 'The star went out four light years ago.'],
		['light-year-time', 'takes four light years', 'Its light takes four light years to reach us.'],
		['times-faster', 'times faster than', 'Sound in water runs four times faster than in air.'],
		['times-less', 'times smaller', 'Mercury is three times smaller.'],
		['centrifugal', 'centrifugal force', 'The drum holds the wash by centrifugal force.'],
		['only-a-theory', 'only a theory', 'For many this is only a theory.'],
		['exponentially', 'exponentially', 'Costs went up exponentially.'],
		['quantum-leap', 'quantum leap', 'The telescope was a quantum leap.'],
		['warm-temperature', 'hotter temperatures', 'Blue stars have hotter temperatures.'],
		['zero-gravity', 'zero gravity', 'The crew floats in zero gravity.'],
		['dark-side', 'dark side of the Moon', 'They landed on the dark side of the Moon.'],
		['sucked-in', 'sucks in', 'A black hole sucks in whatever comes near.'],
		['up-to-or-more', 'up to 40 metres or more', 'Waves reach up to 40 metres or more.'],
		['one-in-more', '1 in 10 times more', 'The risk is 1 in 10 times more.'],
		['passive-known', 'It is known that', 'It is known that light bends.'],
		['passive-known', 'Scientists believe', 'Scientists believe in dark matter.'],
		['goes-stale', 'last year', 'The mirror was polished last year.'],
		['goes-stale', 'Recently', 'Recently a second station joined in.'],
		['superlative', 'the largest telescope ever', 'It became the largest telescope ever.'],
		['click-here', 'click here', 'For the table click here.'],
		['see-left', 'chart on the right', 'The chart on the right tells more.'],
		['colour-only', 'red line', 'Watch the red line fall.'],
		['undefined-term', 'redshift', 'The galaxy has a redshift that grows.'],
		['undefined-term', 'brightness temperature', 'Its brightness temperature drops at dawn.'],
		['house-form', 'gravity waves', 'Two stars that meet send out gravity waves.'],
		['acronym', 'VLBI', 'The dishes work by VLBI at night.'],
		['all-caps', 'NEVER', 'Light NEVER stands still.'],
		['false-precision', '13.787412', 'The age is 13.787412 billion years.'],
		['no-break-space', ' ', 'The line lies at 1420 MHz in the laboratory.'],
		['hyphen-minus', '-', 'Nights there reach -90 degrees.'],
		['hyphen-range', '5-10', 'The storm lasts 5-10 days.'],
		['unit-symbol', 'kms', 'The crater is 20\u00a0kms wide.'],
		['straight-quotes', '"', 'We call the cold gas "dark.'],
		['double-space', '  ', 'Two stars  circle each other.'],
		['doubled-word', 'the the', 'Here is the the answer.'],
		['starts-with-number', '12', '12 dishes stand in a row.'],
		['dangling-this', 'This means', 'This means a longer day.'],
		[
			'long-sentence',
			'',
			'When the first stars had lit up and their light had begun to reach the gas between them, which was cold and thin and dark by then, the gas took on the warmth of the stars bit by bit until it shone.'
		]
	],
	de: [
		['causal-verb', 'beweist', 'Die Senke beweist das kalte Gas.'],
		['weighs-mass', 'wiegt rund 70 Kilogramm', 'Ein Mensch wiegt rund 70 Kilogramm.'],
		['degrees-kelvin', 'Grad Kelvin', 'Der Raum ist drei Grad Kelvin warm.'],
		['rate-of-power', 'Kilowatt pro Stunde', 'Der Kocher zieht zwei Kilowatt pro Stunde.'],
		['knots-per-hour', 'Knoten pro Stunde', 'Das Schiff lief zwölf Knoten pro Stunde.'],
		['light-year-time', 'vor vier Lichtjahren', 'Der Stern erlosch vor vier Lichtjahren.'],
		['times-faster', 'schneller', 'Schall läuft im Wasser viermal schneller als in Luft.'],
		['times-less', 'kleiner', 'Merkur ist dreimal kleiner.'],
		['centrifugal', 'Fliehkraft', 'Die Trommel hält die Wäsche durch Fliehkraft.'],
		['only-a-theory', 'nur eine Theorie', 'Für viele bleibt es nur eine Theorie.'],
		['exponentially', 'exponentiell', 'Die Kosten stiegen exponentiell.'],
		['quantum-leap', 'Quantensprung', 'Das Fernrohr war ein Quantensprung.'],
		['warm-temperature', 'heiße Temperaturen', 'Blaue Sterne haben heiße Temperaturen.'],
		['zero-gravity', 'keine Schwerkraft', 'Dort oben gibt es keine Schwerkraft.'],
		['dark-side', 'dunklen Seite des Mondes', 'Sie landeten auf der dunklen Seite des Mondes.'],
		['up-to-or-more', 'bis zu 40 Meter oder mehr', 'Wellen erreichen bis zu 40 Meter oder mehr.'],
		['passive-known', 'Es ist bekannt', 'Es ist bekannt, dass Licht sich krümmt.'],
		['goes-stale', 'kürzlich', 'Die zweite Station kam kürzlich hinzu.'],
		['superlative', 'das größte Fernrohr der Welt', 'Es wurde das größte Fernrohr der Welt.'],
		['false-friend', 'Billionen', 'Das sind drei Billionen Sterne.'],
		['click-here', 'Klicken Sie hier', 'Klicken Sie hier.'],
		['see-left', 'siehe links', 'Zur Kurve siehe links.'],
		['colour-only', 'rote Linie', 'Man folge der Kurve: Die rote Linie fällt.'],
		['undefined-term', 'Rotverschiebung', 'Die Galaxie hat eine große Rotverschiebung.'],
		['no-break-space', '%', 'Der Anteil liegt bei 5%.'],
		['doubled-word', 'und und', 'Sonne und und Mond.'],
		['straight-quotes', '"', 'Wir nennen es "dunkel.'],
		['dangling-this', 'Das bedeutet', 'Das bedeutet einen längeren Tag.']
	],
	es: [
		['causal-verb', 'demuestra que', 'La caída demuestra que el gas estaba frío.'],
		['weighs-mass', 'pesa unos 70 kilogramos', 'Una persona pesa unos 70 kilogramos.'],
		['degrees-kelvin', 'grados Kelvin', 'El espacio está a tres grados Kelvin.'],
		['rate-of-power', 'kilovatios por hora', 'El hervidor toma dos kilovatios por hora.'],
		['knots-per-hour', 'nudos por hora', 'El barco hizo doce nudos por hora.'],
		['light-year-time', 'hace cuatro años luz', 'La estrella se apagó hace cuatro años luz.'],
		['times-faster', 'veces más', 'En el agua el sonido va cuatro veces más rápido.'],
		['times-less', 'veces menor', 'Mercurio es tres veces menor.'],
		['centrifugal', 'fuerza centrífuga', 'El tambor retiene la ropa por fuerza centrífuga.'],
		['only-a-theory', 'solo una teoría', 'Para muchos es solo una teoría.'],
		['exponentially', 'exponencialmente', 'Los costes subieron exponencialmente.'],
		['quantum-leap', 'salto cuántico', 'El telescopio fue un salto cuántico.'],
		[
			'warm-temperature',
			'temperaturas calientes',
			'Las estrellas azules tienen temperaturas calientes.'
		],
		['zero-gravity', 'gravedad cero', 'La tripulación flota en gravedad cero.'],
		['dark-side', 'cara oscura de la Luna', 'Aterrizaron en la cara oscura de la Luna.'],
		['up-to-or-more', 'hasta 40 metros o más', 'Las olas llegan hasta 40 metros o más.'],
		['passive-known', 'Se sabe que', 'Se sabe que la luz se curva.'],
		['goes-stale', 'recientemente', 'La segunda estación llegó recientemente.'],
		[
			'superlative',
			'el telescopio más grande del mundo',
			'Fue el telescopio más grande del mundo.'
		],
		['false-friend', 'billones', 'Son tres billones de estrellas.'],
		['click-here', 'haga clic aquí', 'Para ver la tabla haga clic aquí.'],
		['see-left', 'gráfico de la derecha', 'El gráfico de la derecha dice más.'],
		['colour-only', 'línea roja', 'Siga la línea roja.'],
		['undefined-term', 'corrimiento al rojo', 'La galaxia tiene un gran corrimiento al rojo.'],
		['doubled-word', 'la la', 'Aquí está la la respuesta.'],
		['hyphen-minus', '-', 'De noche baja a -90 grados.'],
		['dangling-this', 'Esto significa', 'Esto significa un día más largo.']
	]
};

const CLEAN: Record<Language, string[]> = {
	en: [
		'A raindrop leaves its cloud a thousand metres up. Without air it would reach the ground at about 140\u00a0m/s, faster than any train.',
		'Air pushes back, and the push grows with speed. After a second or so the push is as strong as the drop’s weight, and the drop falls on at a steady pace of some 7\u00a0m/s.',
		'Astronomers call this stretch redshift. It tells how much longer a wave is on arrival than it was at the start: with a redshift of 17 it is 18 times as long.',
		'The first stars lit up in the dark. Their light took 13 billion years to reach us, and the dish that caught it stands in a dry valley.',
		'In orbit you fall around the Earth all the time, so nothing presses you to the floor. Gravity there is nine tenths of what it is here.',
		'The heating draws 2\u00a0kilowatts. In three hours it has used 6\u00a0kilowatt-hours, and it’s “off” again at noon.'
	],
	de: [
		'Ein Regentropfen verlässt seine Wolke tausend Meter über dem Boden. Ohne Luft käme er mit etwa 140\u00a0m/s unten an.',
		'Die Luft bremst, und sie bremst umso stärker, je schneller er fällt. Bald fällt er gleichmäßig mit rund 7\u00a0m/s.',
		'Diese Dehnung nennt man Rotverschiebung. Sie sagt, um wie viel länger eine Welle ankommt, als sie losging.',
		'Die Heizung zieht 2\u00a0Kilowatt. In drei Stunden hat sie 6\u00a0Kilowattstunden verbraucht.'
	],
	es: [
		'Una gota de lluvia deja su nube a mil metros de altura. Sin aire llegaría al suelo a unos 140\u00a0m/s.',
		'El aire la frena, y la frena con más fuerza cuanto más deprisa cae. Pronto cae a un ritmo constante de unos 7\u00a0m/s.',
		'Este estiramiento se llama corrimiento al rojo. Dice cuánto más larga llega una onda de lo que salió.',
		'La calefacción toma 2\u00a0kilovatios. En tres horas ha gastado 6\u00a0kilovatios hora.'
	]
};

describe.each(['en', 'de', 'es'] as const)('%s', (language) => {
	test.each(PLANTED[language])('%s: %s', (code, words, text) => {
		const notes = lintParts([paragraph(text)], { language });
		const found = notes.find((note) => note.code === code);
		expect(notes.map((note) => note.code)).toEqual([code]);
		if (found && words) expect(text.slice(found.from, found.to)).toBe(words);
	});

	test('the seeded text as one piece: every trap once, and nothing else', () => {
		const parts = PLANTED[language].map(([, , text], index) => paragraph(text, index));
		const notes = lintParts(parts, { language });
		expect(notes.map(({ block, code }) => [block, code])).toEqual(
			PLANTED[language].map(([code], index) => [`p${index}`, code])
		);
	});

	test('clean copy has no notes', () => {
		expect(lintParts(CLEAN[language].map(paragraph), { language })).toEqual([]);
	});
});

test('at least 25 distinct traps in English, 12 in German and in Spanish', () => {
	const distinct = (language: Language) => new Set(PLANTED[language].map(([code]) => code)).size;
	expect(distinct('en')).toBeGreaterThanOrEqual(35);
	expect(distinct('de')).toBeGreaterThanOrEqual(25);
	expect(distinct('es')).toBeGreaterThanOrEqual(25);
});

describe('what is offered instead', () => {
	test.each([
		['Say "dark" now', ['“', '”']],
		["It’s the star's light", ['’']],
		['at -19 degrees', ['−']],
		['between 5-10 days', ['5–10']],
		['at 5 MHz', ['\u00a0']],
		['about 20\u00a0kms', ['km']],
		['the the answer', ['the']]
	])('%s', (text, replacements) => {
		const notes = lintParts([paragraph(text)], { language: 'en' });
		expect(notes.map(({ replacement }) => replacement)).toEqual(replacements);
	});
});

describe('digits', () => {
	test.each([
		'on 14.03.2026 at noon',
		'exactly 299,792,458 metres a second',
		'about 300,000 kilometres a second',
		'in the year 2026'
	])('let alone: %s', (text) => {
		expect(lintParts([paragraph(text)], { language: 'en' })).toEqual([]);
	});
});

describe('terms and abbreviations', () => {
	const codes = (...texts: string[]) =>
		lintParts(texts.map(paragraph), { language: 'en' }).map(
			({ block, code }) => `${block} ${code}`
		);

	test('only the first use counts, and an explanation beside it will do', () => {
		expect(codes('Its redshift grows.', 'The redshift fell.')).toEqual(['p0 undefined-term']);
		expect(codes('Its redshift, the stretch of its light, grows.', 'A redshift fell.')).toEqual([]);
		expect(codes('The very long baseline array (VLBA) looks up.', 'The VLBA sees.')).toEqual([]);
	});

	test('a house may have a list of its own', () => {
		const terms = { terms: [{ starts: 'quoin', forms: 'quoins?' }], forms: [] };
		const notes = lintParts([paragraph('The quoin holds; a redshift is no term here.')], {
			language: 'en',
			terms
		});
		expect(notes.map(({ code, from, to }) => [code, from, to])).toEqual([['undefined-term', 4, 9]]);
	});
});

describe('what stands beside a picture or a chart, and headings', () => {
	const part = (more: Partial<CopyPart>): CopyPart => ({ ...paragraph('Some words.'), ...more });
	const codes = (...parts: CopyPart[]) =>
		lintParts(parts, { language: 'en' }).map(({ code }) => code);

	test('words of a picture', () => {
		const alt = (text: string, beside = '') =>
			codes(part({ field: 'alt', kind: 'picture', text, beside }));
		expect(alt('A picture of a dish at dusk')).toEqual(['alt-picture-of']);
		expect(alt('A dish at dusk.', 'A dish at dusk')).toEqual(['alt-repeats']);
		expect(alt('A dish at dusk, its rim lit', 'The station in May')).toEqual([]);
	});

	test('a chart’s description gives the trend', () => {
		const described = (text: string) => codes(part({ field: 'description', kind: 'chart', text }));
		expect(described('A line over time.')).toEqual(['description-thin']);
		expect(described('It falls from left to right.')).toEqual([]);
		expect(described('It falls from 142\u00a0MHz at redshift 9 to 70\u00a0MHz at 19.')).toEqual([]);
	});

	test('headings', () => {
		const heading = (text: string, level?: number) =>
			part({ block: text, kind: 'heading', text, ...(level ? { level } : {}) });
		expect(codes(heading(''), part({}))).toEqual(['heading-empty']);
		expect(codes(heading('Rain'), heading('Snow'), part({}))).toEqual(['heading-empty']);
		expect(codes(heading('Rain.'), part({}))).toEqual(['heading-stop']);
		expect(codes(heading('Rain', 2), part({}), heading('Drops', 4), part({}))).toEqual([
			'heading-order'
		]);
		expect(codes(heading('Rain', 2), heading('Drops', 3), part({}))).toEqual([]);
	});
});

test('every rule has a name, and every note’s stretch lies in its text', () => {
	for (const language of ['en', 'de', 'es'] as const) {
		const parts = PLANTED[language].map(([, , text], index) => paragraph(text, index));
		for (const { block, code, from, to, says } of lintParts(parts, { language })) {
			const text = parts.find((part) => part.block === block)?.text ?? '';
			expect(LINT_RULES[code]).toBeTruthy();
			expect(from >= 0 && to <= text.length && from <= to).toBe(true);
			expect(says).toMatch(/[.?]$/);
		}
	}
});

/** Written before there was a lint; what it says of them has been read and is right. */
const GOLDEN: [string, string[]][] = [
	['v1-first-light', ['opening copy long-sentence 62 209']],
	['v1-same-drop', ['opening copy weighs-mass 2 26']]
];
test.each(GOLDEN)('the notes on %s', (name, expected) => {
	const address = new URL(`../../../tests/documents/${name}.json`, import.meta.url);
	const parsed = parseDocument(JSON.parse(readFileSync(address, 'utf8')), catalogue);
	if (!parsed.ok) throw new Error('The golden document can’t be read.');
	const notes = lintCopy(parsed.document);
	expect(
		notes.map(({ block, field, code, from, to }) => `${block} ${field} ${code} ${from} ${to}`)
	).toEqual(expected);
});

test('a thousand words in two milliseconds', () => {
	const words = PLANTED.en.map(([, , text]) => text).concat(CLEAN.en);
	const parts: CopyPart[] = [];
	let count = 0;
	for (let index = 0; count < 1000; index++) {
		const text = words[index % words.length] ?? '';
		parts.push(paragraph(text, index));
		count += text.split(/\s+/u).length;
	}
	const times = Array.from({ length: 60 }, () => {
		const start = performance.now();
		lintParts(parts, { language: 'en' });
		return performance.now() - start;
	}).sort((one, other) => one - other);
	// A quarter of the runs: the rest may have waited for other tests.
	expect(times[15]).toBeLessThan(2);
});
