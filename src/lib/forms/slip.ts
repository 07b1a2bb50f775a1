/** The slip as it is filled in: its length and its date as typed. */
import { z } from 'zod';
import type { Slip } from '../workflow/slip.ts';
import { instantOf, isZone, wallTime } from './zoned-time.ts';

const line = (most: number) =>
	z.string().trim().max(most, `At most ${most} characters.`).default('');

const WALL_TIME = /^\d{4}-\d\d-\d\dT\d\d:\d\d$/;

/** The fields of a slip, for a form that has others too; `checkDue` belongs to them. */
export const slipFields = {
	reader: line(160),
	partner: line(120),
	embargo: line(160),
	words: z
		.string()
		.trim()
		.regex(/^([1-9]\d{0,3})?$/, 'Give the length as a number of words, such as 400.')
		.default(''),
	/** What the clocks in `zone` show: `2026-12-17T15:00`; or ''. */
	due: z
		.string()
		.trim()
		.refine((due) => due === '' || WALL_TIME.test(due), 'Give a day and a time.')
		.default(''),
	zone: z.string().max(60).default('UTC')
};

export function checkDue(
	{ due, zone }: { due: string; zone: string },
	context: z.RefinementCtx
): void {
	const say = (path: string, message: string) =>
		context.addIssue({ code: 'custom', path: [path], message });
	if (!WALL_TIME.test(due)) return;
	if (!isZone(zone)) say('zone', 'Choose a time zone from the list.');
	else if (!instantOf(due, zone))
		say(
			'due',
			'There is no such time in this zone: the clocks skip it, or the calendar has no such day.'
		);
}

export const SlipFields = z.object(slipFields).superRefine(checkDue);
export type SlipFields = z.infer<typeof SlipFields>;

/** A change of the slip: `was` is the one it was made on. */
export const SaveSlip = z.strictObject({
	was: z.custom<Slip>((value) => typeof value === 'object' && value !== null),
	fields: SlipFields
});
export type SaveSlip = z.infer<typeof SaveSlip>;

/** The slip that checked fields stand for. */
export function slipOf({ reader, partner, embargo, words, due, zone }: SlipFields): Slip {
	const at = due ? instantOf(due, zone) : null;
	return {
		reader,
		partner,
		embargo,
		words: words ? Number(words) : null,
		due: at ? { at: at.toISOString(), zone } : null
	};
}

/** The fields that a slip fills; a date that nobody has given is asked for in `zone`. */
export function fieldsOf({ reader, partner, embargo, words, due }: Slip, zone: string): SlipFields {
	return {
		reader,
		partner,
		embargo,
		words: words === null ? '' : String(words),
		due: due ? wallTime(new Date(due.at), due.zone) : '',
		zone: due?.zone ?? zone
	};
}
