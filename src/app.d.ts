import type { Actor } from '$lib/workflow/permissions.ts';
import type { Context } from '$lib/server/context.ts';

declare global {
	namespace App {
		interface Locals {
			/** Who asks, with the roles of this moment; null for strangers. */
			actor: Actor | null;
			/** What services take: the house's fixtures, the actor, the time of this request. */
			context: Context;
			/** Named in logs, and on the page when something breaks. */
			requestId: string;
		}
		interface Error {
			message: string;
			/** What to do next. */
			help?: string;
			code?: string;
			/** Reference number of a fault of ours. */
			reference?: string;
		}
	}
}

export {};
