/** Passphrases are kept as argon2id: 19 MiB, two passes, one lane (OWASP Password Storage Cheat Sheet). */
import { hash, verify } from '@node-rs/argon2';

const COST = { memoryCost: 19_456, timeCost: 2, parallelism: 1 };

export function hashPassphrase(passphrase: string): Promise<string> {
	return hash(passphrase, COST);
}

let decoy: Promise<string> | undefined;

/**
 * Whether the passphrase is right. With no hash (no such account, or one without a passphrase) it works just as long
 * on a decoy, so that the time taken tells nobody which addresses are known.
 */
export async function passphraseFits(
	passphraseHash: string | null,
	passphrase: string
): Promise<boolean> {
	decoy ??= hashPassphrase('a passphrase that nobody has');
	const fits = await verify(passphraseHash ?? (await decoy), passphrase);
	return fits && passphraseHash !== null;
}
