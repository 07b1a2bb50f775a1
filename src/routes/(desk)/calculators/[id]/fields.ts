/** What stands in the fields of the try-out: text as typed, turned into inputs when the calculator runs. */
import type { Calculator, InputSpec, RawInputs } from '$lib/physics/calculator.ts';

/** Text by field; a part of a parameter set has a field of its own, `cosmology.H0`. */
export type Fields = Record<string, string>;

export interface ReadFields {
	inputs: RawInputs;
	/** What isn't a number, by field. */
	problems: Record<string, string>;
}

/** First values, or those in the address. Of a group of which one is given, the others stay empty. */
export function firstFields(calculator: Calculator, query: URLSearchParams): Fields {
	const fields: Fields = {};
	const idle = new Set(
		(calculator.oneOf ?? []).flatMap((group) => {
			const given = group.find((key) => query.has(key)) ?? group[0];
			return group.filter((key) => key !== given);
		})
	);
	for (const [key, spec] of Object.entries(calculator.inputs)) {
		if (spec.kind === 'cosmology') {
			const parts = [...query].filter(([name]) => name.startsWith(`${key}.`));
			const overrides = parts.filter(([name]) => name !== `${key}.set`);
			fields[key] = query.get(`${key}.set`) ?? query.get(key) ?? spec.initial.set;
			for (const [name, value] of overrides) fields[name] = value;
		} else if (idle.has(key)) fields[key] = '';
		else
			fields[key] =
				query.get(key) ?? (spec.optional && !groupOf(calculator, key) ? '' : String(spec.initial));
	}
	return fields;
}

export function readFields(calculator: Calculator, fields: Fields): ReadFields {
	const inputs: RawInputs = {};
	const problems: Record<string, string> = {};
	for (const [key, text] of Object.entries(fields)) {
		const [head = key, part] = key.split('.');
		const spec = calculator.inputs[head];
		const typed = text.trim();
		if (!spec || typed === '') continue;
		if (isWords(spec)) inputs[key] = typed;
		else if (spec.kind === 'cosmology' && part === undefined) {
			inputs[head] = { ...(inputs[head] as object | undefined), set: typed };
		} else {
			const value = readNumber(typed);
			if (value === null) problems[key] = 'This isn’t a number. Write it like 180, −0.5 or 1.5e9.';
			else if (part === undefined) inputs[key] = value;
			else inputs[head] = { ...(inputs[head] as object | undefined), [part]: value };
		}
	}
	return { inputs, problems };
}

/** Choices, decimals and lists are taken as they are typed: the calculator reads them. */
function isWords({ kind }: InputSpec): boolean {
	return kind === 'choice' || kind === 'decimal' || kind === 'list';
}

/** A number as people type it: a real minus or a hyphen, spaces between groups. Null for anything else. */
export function readNumber(typed: string): number | null {
	const plain = typed.replace(/−/g, '-').replace(/[\s\u00a0\u202f]/g, '');
	if (!/^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i.test(plain)) return null;
	const value = Number(plain);
	return Number.isFinite(value) ? value : null;
}

/** The group of inputs a field belongs to of which exactly one is given. */
export function groupOf(calculator: Calculator, key: string): string[] | null {
	return (calculator.oneOf ?? []).find((group) => group.includes(key)) ?? null;
}

export function inputEntries(calculator: Calculator): [string, InputSpec][] {
	return Object.entries(calculator.inputs);
}
