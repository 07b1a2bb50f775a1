/** Who may end a query: as the service has it, so that a button isn't shown to those it would refuse. */
import { can, type Actor, type Resource } from '$lib/workflow/permissions.ts';
import type { ProofView, QueryView } from '$lib/workflow/piece.ts';

export function peopleOf({ writers, checkers }: ProofView): Resource {
	return {
		proof: {
			writers: writers.map(({ personId }) => personId),
			checkers: checkers.map(({ personId }) => personId)
		}
	};
}

export const mayClose = (person: Actor, resource: Resource) => (query: QueryView) =>
	query.askedBy.personId === person.personId ||
	can(person, 'sign-claim', resource) ||
	can(person, 'pass-proof', resource);
