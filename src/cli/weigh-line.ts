/** One line of `weigh`: the request as sent, checked, weighed and answered. */
import { z } from 'zod';
import { detectQuantities, type DetectedQuantity } from '../lib/factcheck/detect.ts';
import '../lib/factcheck/lexicon/all.ts';
import { hedgeFamily } from '../lib/factcheck/hedges.ts';
import { LANGUAGES, type Language } from '../lib/widget/language.ts';
import type { Verdict } from '../lib/factcheck/verdict.ts';
import { weigh, type WeighedReading } from '../lib/factcheck/weigh.ts';
import { commensurable, suggestUnit, unitNamed, unitOf } from '../lib/physics/units/units.ts';
import { plainDecimal, type Stated } from '../lib/widget/stated.ts';
import { lineError, type LineError } from './json-lines.ts';

export type WeighAnswer = Verdict | LineError;

/** JSON has no NaN and no infinities; a line may still name them in quotes. */
const Value = z
	.union([
		z.number(),
		z.null(),
		z.string().regex(/^(?:-?(?:\d+\.?\d*(?:e[+-]?\d+)?|Infinity)|NaN)$/i)
	])
	.transform((value) => (value === null ? NaN : Number(value)));

const ReadingFields = {
	u: z.number().nonnegative().nullish(),
	exact: z.boolean().nullish()
};

const BareForm = z.object({
	lang: z.string().nullish(),
	hedge: z.string().max(60).nullish(),
	numeral: z.union([z.string().max(60), z.number()]),
	scale: z.number().positive().max(1e300).nullish(),
	value: Value,
	...ReadingFields
});

const SentenceForm = z.object({
	lang: z.string(),
	text: z.string().max(20_000),
	claim: z.object({ start: z.int().nonnegative(), end: z.int().nonnegative() }).nullish(),
	value: Value.optional(),
	values: z.tuple([Value, Value]).nullish(),
	unit: z.string().max(60).nullish(),
	kind: z.string().max(60).nullish(),
	...ReadingFields
});

const DetectForm = z.object({ lang: z.string(), text: z.string().max(200_000) });

export function weighLine(line: string): WeighAnswer {
	const request = parseLine(line);
	if (!request.ok) return request.answer;
	const { sent } = request;
	return 'text' in sent && !('numeral' in sent) ? weighSentence(sent) : weighBare(sent);
}

export function detectLine(line: string): object {
	const request = parseLine(line);
	if (!request.ok) return request.answer;
	const form = DetectForm.safeParse(request.sent);
	if (!form.success) return shapeError(form.error);
	const language = languageOf(form.data.lang);
	if (!language) return unknownLanguage(form.data.lang);
	return {
		quantities: detectQuantities(form.data.text, language).map(
			({ start, end, surface, kind, value, ends, unit, hedge }) => ({
				start,
				end,
				surface,
				kind,
				value: ends ?? value,
				unit,
				hedge
			})
		)
	};
}

type Request = { ok: true; sent: Record<string, unknown> } | { ok: false; answer: LineError };

function parseLine(line: string): Request {
	const sent = parseJson(line) ?? parseJson(withoutBareNaN(line));
	if (sent === undefined) {
		return {
			ok: false,
			answer: lineError('not-json', 'This line is not JSON. Send one whole object on each line.')
		};
	}
	if (typeof sent !== 'object' || sent === null || Array.isArray(sent)) {
		return {
			ok: false,
			answer: lineError(
				'not-an-object',
				'This line is no JSON object. Send one object on each line.'
			)
		};
	}
	return { ok: true, sent: sent as Record<string, unknown> };
}

/** Undefined for what isn't JSON. */
function parseJson(line: string): unknown {
	try {
		return JSON.parse(line, finiteOrNull) as unknown;
	} catch {
		return undefined;
	}
}

/** Some writers of JSON put a bare NaN or Infinity, which says that there is no number. */
function withoutBareNaN(line: string): string {
	return line.replace(/(:\s*)(?:NaN|-?Infinity)(?=\s*[,}])/g, '$1null');
}

/** “1e999” is JSON, and no number. */
function finiteOrNull(_key: string, value: unknown): unknown {
	return typeof value === 'number' && !Number.isFinite(value) ? null : value;
}

function shapeError(error: z.ZodError): LineError {
	const [issue] = error.issues;
	const field = issue?.path.join('.') || 'request';
	return lineError(
		'input-broken',
		`“${field}” is missing or isn’t what is expected: ${issue?.message ?? 'unknown'}.`
	);
}

function languageOf(lang: string): Language | undefined {
	const base = lang.toLowerCase().split(/[-_]/)[0];
	return LANGUAGES.find((language) => language === base);
}

function unknownLanguage(lang: string): LineError {
	return lineError(
		'unknown-language',
		`No lexicon for “${lang}” yet. Send one of: ${LANGUAGES.join(', ')}.`
	);
}

function weighBare(sent: Record<string, unknown>): WeighAnswer {
	const form = BareForm.safeParse(sent);
	if (!form.success) return shapeError(form.error);
	const { hedge, scale, value, lang } = form.data;
	const language = languageOf(lang ?? 'en');
	if (!language) return unknownLanguage(lang ?? '');
	const family = hedgeFamily(hedge ?? '', language);
	if (!family)
		return lineError(
			'unknown-hedge',
			`“${hedge}” is no hedge of the house. Send '' or 'bare' for none.`
		);
	const numeral = plainNumeral(form.data.numeral, language);
	if (numeral === null) {
		return lineError(
			'not-a-numeral',
			`“${form.data.numeral}” is no numeral. Write it with digits, as in “13.8”.`
		);
	}
	const stated: Stated = {
		hedge: family,
		hedgeWord: family === 'bare' ? '' : (hedge ?? ''),
		numeral,
		scale: scale ?? 1,
		unit: ''
	};
	// In this form the reading of “up to” is the highest of its range.
	return weigh(
		stated,
		{ value, unit: '', uncertainty: uncertaintyOf(form.data), maximum: family === 'up-to' },
		language
	);
}

function plainNumeral(written: string | number, language: Language): string | null {
	const text = typeof written === 'number' ? plainDecimal(written) : pointed(written, language);
	const plain = text
		.replace(/^[−-]/, '-')
		.replace(/(?<=\d)[,\s\u00a0\u202f\u2009](?=\d{3}(?!\d))/g, '');
	const digits = plain.replace(/^(-?)\./, '$10.');
	return /^-?\d+(?:\.\d+)?$/.test(digits) ? digits : null;
}

/** With a point for the decimal mark, whatever the language writes. */
function pointed(written: string, language: Language): string {
	const text = written.trim();
	if (language === 'en') return text;
	return text.replace(/(?<=\d)\.(?=\d{3}(?!\d))/g, '').replace(',', '.');
}

/** An uncertainty of 0 says exact, unless the line says that it isn’t. No number at all says that none is known. */
function uncertaintyOf({
	u,
	exact
}: {
	u?: number | null;
	exact?: boolean | null;
}): WeighedReading['uncertainty'] {
	if (u === null || u === undefined) return exact ? 'exact' : 'not-available';
	return u === 0 && exact !== false ? 'exact' : u;
}

function weighSentence(sent: Record<string, unknown>): WeighAnswer {
	const form = SentenceForm.safeParse(sent);
	if (!form.success) return shapeError(form.error);
	const { lang, text, claim, unit: unitSent, kind, values } = form.data;
	const language = languageOf(lang);
	if (!language) return unknownLanguage(lang);
	const unit = unitOf(unitSent ?? '') ?? unitNamed(unitSent ?? '');
	if (!unit) return unknownUnit(unitSent ?? '');

	const found = detectQuantities(text, language).filter(
		({ start, end }) => !claim || (start < claim.end && end > claim.start)
	);
	const quantity = found.find((each) => commensurable(each.unit, unit.symbol)) ?? found[0];
	if (!quantity) return unweighed('No number in these words.');
	if (!quantity.stated) return unweighed(`A ${quantity.kind.replace('-', ' ')} isn’t weighed yet.`);
	const value = values ? highestFor(quantity, values) : form.data.value;
	if (value === undefined) {
		return values
			? unweighed('A reading that is a range isn’t weighed yet, but for “up to”.')
			: lineError(
					'input-broken',
					'“value” is missing. Send the calculator’s reading, or null where there is none.'
				);
	}
	const verdict = weigh(
		quantity.stated,
		{
			value,
			unit: unit.symbol,
			uncertainty: uncertaintyOf(form.data),
			maximum: Boolean(values) || kind === 'maximum',
			...(kind ? { quantity: kind } : {})
		},
		language
	);
	if (!quantity.doubleHedge) return verdict;
	return { ...verdict, severity: 'block', reason: 'Two hedges on one number: keep one.' };
}

/** “Up to” weighs the high end of a range. */
function highestFor(
	quantity: DetectedQuantity,
	values: readonly [number, number]
): number | undefined {
	return quantity.stated?.hedge === 'up-to' ? Math.max(...values) : undefined;
}

function unknownUnit(unit: string): LineError {
	const near = suggestUnit(unit);
	return lineError(
		'unknown-unit',
		`There is no unit “${unit}” in the table.${near ? ` “${near.symbol}” may be meant.` : ''}`
	);
}

function unweighed(reason: string): Verdict {
	return {
		verdict: 'unweighed',
		severity: 'none',
		rule: '',
		reason,
		departurePercent: null,
		suggestions: []
	};
}
