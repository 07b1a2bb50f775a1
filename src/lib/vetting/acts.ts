/** What travels with an act on a revision. A form's data is indexed by name, which an interface can't be. */
export type SentAct = {
	calculator: string;
	revision: string;
	note: string;
	passphrase: string;
};
