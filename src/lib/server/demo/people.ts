import type { Role } from '../../workflow/permissions.ts';

/** The same for everyone in the demo, and printed by it. Never used outside it. */
export const DEMO_PASSPHRASE = 'a rider on the arm';

export interface DemoPerson {
	email: string;
	name: string;
	roles: readonly Role[];
}

/** The invented people of the Varrowmere Institute’s Public Desk. */
export const DEMO_PEOPLE = {
	tamsin: { email: 'tamsin@varrowmere.example', name: 'Tamsin Orrelby', roles: ['writer'] },
	mateus: { email: 'mateus@varrowmere.example', name: 'Dr Mateus Quevarro', roles: ['scientist'] },
	ama: { email: 'ama@varrowmere.example', name: 'Dr Ama Tindleforth', roles: ['scientist'] },
	perpetua: { email: 'perpetua@varrowmere.example', name: 'Perpetua Lindqvane', roles: ['editor'] },
	/** The deputy holds two roles, and may use only one of them on any one proof. */
	anselm: {
		email: 'anselm@varrowmere.example',
		name: 'Anselm Torviq',
		roles: ['scientist', 'editor']
	},
	juno: { email: 'juno@varrowmere.example', name: 'Juno Castellmere', roles: ['admin'] }
} as const satisfies Record<string, DemoPerson>;
