/**
 * Passphrases are kept as argon2id: 19 MiB, two passes, one lane (OWASP Password Storage Cheat Sheet). Two are worked out
 * at a time and twenty may wait: a flood of tries takes neither all memory nor all of the processor.
 */
import { hash, verify } from '@node-rs/argon2';
import { SteelyardError } from '../../errors.ts';
import { gate } from './gate.ts';

const COST = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

const FEW_SECONDS = 5;
const inTurn = gate(
	{ atOnce: 2, queue: 20 },
	() => new SteelyardError('sign-in-slowed', { retryAfterSeconds: FEW_SECONDS })
);

export function hashPassphrase(passphrase: string): Promise<string> {
	return hash(passphrase, COST);
}

let decoy: Promise<string> | undefined;

/**
 * Whether the passphrase is right. With no hash (no such account, or one without a passphrase) it works just as long
 * on a decoy, so that the time taken tells nobody which addresses are known. Throws `sign-in-slowed` when too many
 * wait already.
 */
export async function passphraseFits(
	passphraseHash: string | null,
	passphrase: string
): Promise<boolean> {
	decoy ??= hashPassphrase('a passphrase that nobody has');
	const kept = passphraseHash ?? (await decoy);
	const fits = await inTurn(() => verify(kept, passphrase));
	return fits && passphraseHash !== null;
}
