/** Anything a schema takes, by chance: a new kind or field is tried from the day it is in the schema. */
import fc from 'fast-check';
import type { z } from 'zod';

interface Bounds {
	minimum?: number;
	maximum?: number;
	/** The minimum itself is none of them. */
	isOpen?: boolean;
	isWhole?: boolean;
	pattern?: RegExp;
}

interface CheckDef {
	check: string;
	format?: string;
	pattern?: RegExp;
	value?: number;
	inclusive?: boolean;
	minimum?: number;
	maximum?: number;
}

function boundsOf(schema: z.core.$ZodType): Bounds {
	const { checks = [], ...own } = schema._zod.def as unknown as CheckDef & {
		checks?: { _zod: { def: CheckDef } }[];
	};
	const bounds: Bounds = {};
	for (const def of [own, ...checks.map(({ _zod }) => _zod.def)]) {
		if (def.pattern) bounds.pattern = def.pattern;
		if (def.format === 'safeint') bounds.isWhole = true;
		if (def.check === 'min_length') bounds.minimum = def.minimum;
		if (def.check === 'max_length') bounds.maximum = def.maximum;
		if (def.check === 'greater_than') {
			bounds.minimum = def.value;
			bounds.isOpen = def.inclusive === false;
		}
		if (def.check === 'less_than') bounds.maximum = def.value;
	}
	return bounds;
}

type Def =
	| { type: 'object'; shape: Record<string, z.core.$ZodType> }
	| { type: 'array'; element: z.core.$ZodType }
	| { type: 'tuple'; items: readonly z.core.$ZodType[] }
	| { type: 'union'; options: readonly z.core.$ZodType[] }
	| { type: 'record'; keyType: z.core.$ZodType; valueType: z.core.$ZodType }
	| { type: 'literal'; values: readonly unknown[] }
	| { type: 'enum'; entries: Record<string, unknown> }
	| { type: 'nullable' | 'optional'; innerType: z.core.$ZodType }
	| { type: 'string' | 'number' | 'custom' };

/** Lists and words stay short, so that a failing case can be read. */
const LONGEST_LIST = 3;
const LONGEST_TEXT = 30;

/** Rules across fields aren't read: mend or filter what comes. Throws on a kind of schema it doesn't know. */
export function anyOf<T>(schema: z.core.$ZodType<T>): fc.Arbitrary<T> {
	return build(schema) as fc.Arbitrary<T>;
}

function build(schema: z.core.$ZodType): fc.Arbitrary<unknown> {
	const def = schema._zod.def as unknown as Def;
	const bounds = boundsOf(schema);
	switch (def.type) {
		case 'object':
			return anyObject(def.shape);
		case 'array': {
			const minLength = bounds.minimum ?? 0;
			const maxLength = Math.max(minLength, Math.min(bounds.maximum ?? LONGEST_LIST, LONGEST_LIST));
			return fc.array(build(def.element), { minLength, maxLength });
		}
		case 'tuple':
			return fc.tuple(...def.items.map(build));
		case 'union':
			return fc.oneof(...def.options.map(build));
		case 'record':
			return fc.dictionary(build(def.keyType) as fc.Arbitrary<string>, build(def.valueType), {
				maxKeys: LONGEST_LIST,
				noNullPrototype: true
			});
		case 'literal':
			return fc.constantFrom(...def.values);
		case 'enum':
			return fc.constantFrom(...Object.values(def.entries));
		case 'nullable':
			return fc.option(build(def.innerType), { nil: null });
		case 'optional':
			return fc.option(build(def.innerType), { nil: undefined });
		case 'string':
			return anyText(bounds);
		case 'number':
			return anyNumber(bounds);
		default:
			throw new Error(`from-schema doesn’t know ${JSON.stringify(def)}.`);
	}
}

function anyObject(shape: Record<string, z.core.$ZodType>): fc.Arbitrary<unknown> {
	const optional = Object.entries(shape)
		.filter(([, field]) => field._zod.def.type === 'optional')
		.map(([key]) => key);
	return fc
		.record(Object.fromEntries(Object.entries(shape).map(([key, field]) => [key, build(field)])))
		.map((made) =>
			Object.fromEntries(
				Object.entries(made).filter(
					([key, value]) => value !== undefined || !optional.includes(key)
				)
			)
		);
}

function anyText({ minimum = 0, maximum, pattern }: Bounds): fc.Arbitrary<string> {
	const fits = ({ length }: string) => maximum === undefined || length <= maximum;
	if (pattern) return fc.stringMatching(pattern).filter(fits);
	const maxLength = Math.min(maximum ?? LONGEST_TEXT, LONGEST_TEXT);
	return fc.string({ minLength: minimum, maxLength, unit: 'grapheme' }).filter(fits);
}

function anyNumber({ minimum, maximum, isOpen = false, isWhole }: Bounds): fc.Arbitrary<number> {
	if (isWhole) {
		const min = (minimum ?? -100) + (isOpen ? 1 : 0);
		return fc.integer({ min, max: maximum ?? 100 });
	}
	return fc.double({
		noNaN: true,
		noDefaultInfinity: true,
		...(minimum === undefined ? {} : { min: minimum, minExcluded: isOpen }),
		...(maximum === undefined ? {} : { max: maximum })
	});
}
