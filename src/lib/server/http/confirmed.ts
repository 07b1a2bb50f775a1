import type { Context } from '../context.ts';
import { confirmPassphrase } from '../services/sign-in.ts';

/** The context after a passphrase typed in place was found right; as it was when none was typed. */
export async function confirmed(context: Context, passphrase: string): Promise<Context> {
	if (passphrase === '') return context;
	await confirmPassphrase(context, passphrase);
	return { ...context, session: context.session && { ...context.session, freshAt: context.now } };
}
