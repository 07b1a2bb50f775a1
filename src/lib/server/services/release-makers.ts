/** The people of a release by name: who wrote it, who checked which claim, who passed it. */
import type { PersonName } from '../../workflow/piece.ts';
import type { Makers } from '../press/account.ts';
import type { Signing } from '../press/records.ts';
import type { SignatureRow } from './dossier.ts';
import type { Standing } from './standing.ts';

type Names = (personId: string) => PersonName;

export function inForce({ claims }: Standing): SignatureRow[] {
	return claims.flatMap(({ signatures }) => signatures.filter((signature) => signature.inForce));
}

/** Ids of everyone whom a release names, for the name book. */
export function namedBy({ people }: Standing, editor: string): string[] {
	return [...people.writers, ...people.checkers, editor];
}

export function signingsOf(standing: Standing, names: Names): Signing[] {
	return inForce(standing).map(({ claim, personId, signedAt }) => ({
		claim,
		name: names(personId).name,
		signedAt
	}));
}

export function makersOf({ people }: Standing, editor: string, names: Names): Makers {
	const nameOf = (personId: string) => names(personId).name;
	return {
		writers: people.writers.map(nameOf),
		checkers: people.checkers.map(nameOf),
		editor: nameOf(editor)
	};
}
