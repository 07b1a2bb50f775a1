/** Who may do what. Services enforce it with `requirePermission`; pages ask the same `can` to leave a button out. */
import { SteelyardError } from '../errors.ts';

export const ROLES = ['writer', 'scientist', 'editor', 'admin'] as const;
export type Role = (typeof ROLES)[number];

export interface Actor {
	personId: string;
	name: string;
	roles: readonly Role[];
}

/** The people of one proof. `writers`: everyone who changed reader-visible text or wiring since the last release. */
export interface ProofPeople {
	writers: readonly string[];
	checkers: readonly string[];
}

/** What the actions are about; a piece without a proof has `proof: null`. */
export interface Resource {
	proof: ProofPeople | null;
	/** Who proposed the revision of a calculator. */
	proposer?: string;
}

export const ACTIONS = [
	'read-desk',
	'create-piece',
	'edit-draft',
	'spike-piece',
	'recover-piece',
	'pull-proof',
	'read-proof',
	'sign-claim',
	'query-claim',
	'answer-query',
	'pass-proof',
	'release-proof',
	'read-calculators',
	'propose-calculator',
	'vet-calculator',
	'withdraw-calculator',
	'vet-formula',
	'read-pictures',
	'add-picture',
	'record-picture',
	'replace-picture',
	'delete-picture',
	'read-themes',
	'edit-themes'
] as const;
export type Action = (typeof ACTIONS)[number];

interface Rule {
	roles: readonly Role[];
	apart?: (actor: Actor, proof: ProofPeople) => boolean;
	/** Not for whoever proposed what it is about. */
	second?: true;
}

const notWriter = (actor: Actor, proof: ProofPeople) => !proof.writers.includes(actor.personId);
const neitherWriterNorChecker = (actor: Actor, proof: ProofPeople) =>
	notWriter(actor, proof) && !proof.checkers.includes(actor.personId);

/** One row an action: which roles may, and how the person must stand apart from the proof. */
const RULES: Record<Action, Rule> = {
	'read-desk': { roles: ['writer', 'scientist', 'editor', 'admin'] },
	'create-piece': { roles: ['writer', 'editor'] },
	'edit-draft': { roles: ['writer', 'editor'] },
	'spike-piece': { roles: ['writer', 'editor'] },
	'recover-piece': { roles: ['writer', 'editor'] },
	'pull-proof': { roles: ['writer', 'editor'] },
	'read-proof': { roles: ['writer', 'scientist', 'editor'] },
	'sign-claim': { roles: ['scientist'], apart: notWriter },
	'query-claim': { roles: ['writer', 'scientist', 'editor'] },
	'answer-query': { roles: ['writer', 'scientist', 'editor'] },
	'pass-proof': { roles: ['editor'], apart: neitherWriterNorChecker },
	'release-proof': { roles: ['editor'], apart: neitherWriterNorChecker },
	'read-calculators': { roles: ['writer', 'scientist', 'editor', 'admin'] },
	'propose-calculator': { roles: ['scientist'] },
	'vet-calculator': { roles: ['scientist'], second: true },
	'withdraw-calculator': { roles: ['scientist'] },
	'vet-formula': { roles: ['scientist'], apart: notWriter },
	'read-pictures': { roles: ['writer', 'scientist', 'editor', 'admin'] },
	'add-picture': { roles: ['writer', 'editor'] },
	'record-picture': { roles: ['writer', 'editor'] },
	'replace-picture': { roles: ['writer', 'editor'] },
	'delete-picture': { roles: ['writer', 'editor'] },
	'read-themes': { roles: ['writer', 'scientist', 'editor', 'admin'] },
	'edit-themes': { roles: ['editor', 'admin'] }
};

export type Denial = 'not-permitted' | 'same-person-twice' | 'own-proposal';

/** Null when the actor may; otherwise why not. */
export function denial(
	actor: Actor,
	action: Action,
	resource: Resource = { proof: null }
): Denial | null {
	const rule = RULES[action];
	if (!actor.roles.some((role) => rule.roles.includes(role))) return 'not-permitted';
	if (rule.apart && resource.proof && !rule.apart(actor, resource.proof))
		return 'same-person-twice';
	if (rule.second && resource.proposer === actor.personId) return 'own-proposal';
	return null;
}

export function can(actor: Actor, action: Action, resource?: Resource): boolean {
	return denial(actor, action, resource) === null;
}

/** Throws the denial as an error that says what to do. */
export function requirePermission(
	actor: Actor | null,
	action: Action,
	resource?: Resource
): asserts actor is Actor {
	if (!actor) throw new SteelyardError('not-signed-in');
	const reason = denial(actor, action, resource);
	if (reason) throw new SteelyardError(reason, { action });
}
