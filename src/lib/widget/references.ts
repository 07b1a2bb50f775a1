/** Names and ties: how one part of a widget document points at another. */
import { z } from 'zod';

/** Names every JavaScript object answers to: as a key they would find what nobody wrote. */
const isOwnName = (name: string) => !(name in Object.prototype);
const TAKEN = 'This name is taken by the language itself. Choose another.';

/** The key of a setting or an output; `cosmology.H0` reaches into a parameter set. */
export const Key = z
	.string()
	.max(60)
	.refine((key) => key.split('.').every(isOwnName), TAKEN);

/** Ids are made by the builder, stay with their thing through every edit, and are never shown to readers. */
export const Id = z
	.string()
	.regex(
		/^[a-z][a-z0-9-]{0,39}$/,
		'An id is small letters, digits and dashes, and starts with a letter.'
	);

export const finite = z.number().refine(Number.isFinite, 'A number must be finite.');

/** A symbol of the unit table; '' for a plain number. */
export const UnitSymbol = z.string().max(20);

/**
 * Where a setting of a calculator on the bench gets its value. Fixed values are in the setting's own unit; a line of
 * the catalogue is pinned with the value it had when it was wired, so that a reader's frame needs no catalogue.
 */
export const SettingSource = z.discriminatedUnion('from', [
	z.strictObject({
		from: z.literal('fixed'),
		value: z.union([finite, z.string().max(80), z.record(z.string(), z.unknown())])
	}),
	z.strictObject({ from: z.literal('control'), control: Id }),
	z.strictObject({ from: z.literal('reading'), step: Id, output: Key }),
	z.strictObject({ from: z.literal('line'), line: z.string().max(60), value: finite })
]);
export type SettingSource = z.infer<typeof SettingSource>;

/** What a number in the copy is weighed against: an output, a fixed setting, or where a control starts. */
export const ReadingRef = z.union([
	z.strictObject({ step: Id, output: Key }),
	z.strictObject({ step: Id, setting: Key }),
	z.strictObject({ control: Id })
]);
export type ReadingRef = z.infer<typeof ReadingRef>;
