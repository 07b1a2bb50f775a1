/** How the states of vetting are told. */
import type { VettingState } from '../workflow/vetting.ts';

export const VETTING_WORDS: Record<VettingState, string> = {
	proposed: 'proposed',
	tested: 'tested, not vetted yet',
	vetted: 'vetted',
	superseded: 'superseded',
	withdrawn: 'withdrawn'
};

/** What the state means for whoever wants to use the calculator. */
export const VETTING_MEANS: Record<VettingState, string> = {
	proposed: 'Written down. It can’t be hung on a bench before its check values agree.',
	tested:
		'Its check values agree. It can be hung on a bench; nothing can be published with it before a second scientist signs.',
	vetted: 'A second scientist stands behind it. Pieces that use it can be published.',
	superseded: 'A newer revision has been vetted. What was published with this one stays as it is.',
	withdrawn: 'Out of use. What was published with it stays as it is.'
};
