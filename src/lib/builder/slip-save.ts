/** Sends a change of the slip, and says what came of it. */
import type { SaveSlip } from '../forms/slip.ts';
import type { Slip } from '../workflow/slip.ts';

export interface SlipKept {
	ok: boolean;
	/** The slip as the server has it now, where it said so. */
	slip: Slip | null;
	says: string;
}

interface Refused {
	error?: { message?: string; help?: string; details?: { slip?: Slip } };
}

export async function saveSlip(
	address: string,
	change: SaveSlip,
	send: typeof fetch = fetch
): Promise<SlipKept> {
	try {
		const response = await send(address, {
			method: 'PUT',
			headers: { 'content-type': 'application/json' },
			body: JSON.stringify(change)
		});
		if (response.ok) return { ok: true, slip: (await response.json()) as Slip, says: 'Kept.' };
		const { error } = (await response.json()) as Refused;
		const says = [error?.message, error?.help].filter(Boolean).join(' ');
		return { ok: false, slip: error?.details?.slip ?? null, says: says || 'This wasn’t kept.' };
	} catch {
		// No answer, or none of the house’s own: what was typed stands in its fields.
		return {
			ok: false,
			slip: null,
			says: 'The server doesn’t answer. Nothing typed is lost; try again.'
		};
	}
}
