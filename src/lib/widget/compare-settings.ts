/** Changes that aren’t words: every part of a thing, whatever its kind, as a name with what it was and what it is. */
import { isIdentifiedList } from './merge-parts.ts';
import type { Names } from './compare-names.ts';

export interface SettingChange {
	/** “upright axis from”, “Redshift”, “lowest”. */
	name: string;
	/** As printed; null where it wasn’t there, or isn’t any more. */
	before: string | null;
	after: string | null;
}

type Thing = Record<string, unknown>;

/** What the parts of things are called, by path or by key; what isn’t listed is called by its own key. */
const NAMES: Record<string, string> = {
	min: 'lowest',
	max: 'highest',
	perDecade: 'steps to a tenfold',
	initial: 'first setting',
	'x.label': 'level axis',
	'x.scale': 'level axis scale',
	'x.control': 'level axis follows',
	'y.label': 'upright axis',
	'y.unit': 'upright axis unit',
	'y.scale': 'upright axis scale',
	'y.from': 'upright axis from',
	'axis.label': 'axis',
	'axis.unit': 'axis unit',
	'axis.scale': 'axis scale',
	alt: 'description',
	decorative: 'why it needs no words',
	figures: 'figures printed',
	constants: 'constants edition',
	shows: 'in proportion to the quantity'
};

const VALUES: Record<string, Record<string, string>> = {
	'y.from': { zero: '0', data: 'the lowest point' },
	form: { stated: 'stated in words', live: 'printed by the widget', exempt: 'not a claim' }
};

/** Parts that are told of elsewhere, or to nobody. */
const UNTOLD = new Set(['id', 'tree']);

/** Every part that differs. Parts with ids are compared by id, wherever in their list they stand. */
export function settingChanges(
	before: Thing,
	after: Thing,
	names: { before: Names; after: Names }
): SettingChange[] {
	const were = new Map(partsOf(before, names.before));
	const are = new Map(partsOf(after, names.after));
	return [...new Set([...were.keys(), ...are.keys()])].flatMap((name) => {
		const [was, is] = [were.get(name) ?? null, are.get(name) ?? null];
		return was === is ? [] : [{ name, before: was, after: is }];
	});
}

function partsOf(thing: Thing, names: Names): [string, string][] {
	const own = names.settingsOf(thing);
	const rest = own.length > 0 ? { ...thing, settings: undefined } : thing;
	return [...own, ...plainParts(rest, names, '', '')];
}

function plainParts(thing: Thing, names: Names, path: string, of: string): [string, string][] {
	return Object.entries(thing).flatMap(([key, value]): [string, string][] => {
		if (UNTOLD.has(key) || value === undefined || value === null || value === '') return [];
		const here = path ? `${path}.${key}` : key;
		const name = of + (NAMES[here] ?? NAMES[key] ?? names.controlLabel(key) ?? spaced(here));
		const named = names.print(key, value);
		if (named !== null) return [[name, named]];
		if (isIdentifiedList(value)) {
			return value.flatMap((member) => plainParts(member, names, '', `${of}“${labelOf(member)}” `));
		}
		if (Array.isArray(value)) return [[name, value.map(listed).join('; ')]].filter(hasValue);
		if (isThing(value)) return plainParts(value, names, here, of);
		const unit = typeof value === 'number' && typeof thing.unit === 'string' ? thing.unit : '';
		return [[name, VALUES[here]?.[String(value)] ?? names.quantity(value, unit)]];
	});
}

function hasValue(part: string[]): part is [string, string] {
	return part[1] !== '';
}

function labelOf(member: Thing): string {
	const { label, name, text, id } = member;
	return [label, name, text, id].find((one) => typeof one === 'string' && one !== '') as string;
}

/** One entry of a plain list: “FM radio: from 87.5, to 108”. */
function listed(entry: unknown): string {
	if (!isThing(entry)) return String(entry);
	const { label, ...rest } = entry;
	const told = Object.entries(rest).map(([key, value]) => `${spaced(key)} ${String(value)}`);
	return [typeof label === 'string' && label ? `${label}:` : '', told.join(', ')]
		.filter(Boolean)
		.join(' ');
}

/** `y.someKey` → “y some key”. */
function spaced(path: string): string {
	return path
		.replaceAll('.', ' ')
		.replace(/([a-z])([A-Z])/g, (_, small: string, big: string) => `${small} ${big.toLowerCase()}`);
}

function isThing(value: unknown): value is Thing {
	return typeof value === 'object' && value !== null && !Array.isArray(value);
}
