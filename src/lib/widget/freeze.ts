/** A document frozen whole: what a proof, and later a release, is. The digest is over all a reader can meet. */
import { sha256 } from '@noble/hashes/sha2.js';
import { bytesToHex, utf8ToBytes } from '@noble/hashes/utils.js';
import type { CalculatorSet } from '../physics/calculator.ts';
import type { WidgetDocument } from './document.ts';
import { evaluate, type Evaluation } from './evaluate.ts';

export interface Frozen {
	document: WidgetDocument;
	/** The revisions the readings were worked with, by id. */
	calculators: { id: string; revision: string }[];
	/** The constants edition. */
	constants: string;
	/** Readings at the first settings. */
	evaluation: Evaluation;
	/** SHA-256 of the canonical JSON of everything above, in hex. */
	digest: string;
}

export function freeze(document: WidgetDocument, calculators: CalculatorSet): Frozen {
	const used = [...new Set(document.steps.map(({ calculator }) => calculator))].sort();
	const body = {
		document,
		calculators: used.map((id) => ({ id, revision: calculators.get(id)?.revision ?? '' })),
		constants: document.constants,
		evaluation: evaluate(document, {}, calculators)
	};
	return { ...body, digest: digestOf(body) };
}

/** SHA-256 of a value's canonical JSON, in hex. */
export function digestOf(value: unknown): string {
	return bytesToHex(sha256(utf8ToBytes(canonicalJson(value))));
}

/**
 * JSON with keys in code-unit order and no white space, numbers as ECMAScript prints them: the form of RFC 8785.
 * Throws a TypeError on a number that isn't finite, since JSON would turn it into null.
 */
export function canonicalJson(value: unknown): string {
	if (typeof value === 'number' && !Number.isFinite(value)) {
		throw new TypeError('A number in a frozen document must be finite.');
	}
	if (Array.isArray(value))
		return `[${value.map((item) => canonicalJson(item ?? null)).join(',')}]`;
	if (typeof value === 'object' && value !== null) {
		const members = Object.entries(value)
			.filter(([, member]) => member !== undefined)
			.sort(([a], [b]) => (a < b ? -1 : a > b ? 1 : 0))
			.map(([key, member]) => `${JSON.stringify(key)}:${canonicalJson(member)}`);
		return `{${members.join(',')}}`;
	}
	return JSON.stringify(value ?? null);
}
