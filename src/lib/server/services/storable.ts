/** Text the database can hold: PostgreSQL takes neither the NUL character nor half of a surrogate pair. */
import { SteelyardError } from '../../errors.ts';

export interface TextIssue {
	path: string;
	message: string;
}

const MESSAGE =
	'This text holds a character that can’t be kept. Type it again instead of pasting it.';

/** Every string (and key) in a JSON value that can't be stored, by path; depth is the caller's to limit. */
export function unstorableText(value: unknown, path = ''): TextIssue[] {
	if (typeof value === 'string') return isStorable(value) ? [] : [{ path, message: MESSAGE }];
	if (typeof value !== 'object' || value === null) return [];
	return Object.entries(value).flatMap(([key, member]) => [
		...unstorableText(key, path),
		...unstorableText(member, path ? `${path}.${key}` : key)
	]);
}

function isStorable(text: string): boolean {
	return !text.includes('\0') && !/\p{Surrogate}/u.test(text);
}

/** Throws `input-broken`, naming the fields, when a form's text can't be stored. */
export function refuseUnstorable(input: Record<string, unknown>): void {
	const issues = unstorableText(input);
	if (issues.length > 0) throw new SteelyardError('input-broken', { issues });
}
