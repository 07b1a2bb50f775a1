import { accountOf } from '$lib/server/press/account.ts';
import { recordsOf } from '$lib/server/press/records.ts';
import { calculatorsOf } from '$lib/server/services/stock.ts';
import type { FrameRelease } from '$lib/renderer/release.ts';
import type { PageServerLoad } from './$types';

/** The frame as it would go out now, of the newest draft or of the newest proof (`?of=proof`). */
export const load: PageServerLoad = async ({ locals: { context }, parent, url }) => {
	const { piece } = await parent();
	const proof = url.searchParams.get('of') === 'proof' ? piece.proof : null;
	const document = proof?.document ?? piece.document;
	const calculators = await calculatorsOf(context);
	const signings = (piece.proof?.claims ?? []).flatMap(({ signatures }) =>
		signatures
			.filter(({ inForce }) => inForce)
			.map(({ claim, by, signedAt }) => ({ claim, name: by.name, signedAt: new Date(signedAt) }))
	);
	const records = recordsOf(document, calculators, signings);
	const nobody = { writers: [], checkers: [], editor: '' };
	const release: FrameRelease = {
		slug: piece.slug,
		number: (piece.releases[0]?.number ?? 0) + 1,
		releasedAt: context.now.toISOString(),
		house: context.house.name,
		origin: context.house.origin,
		document,
		digest: '',
		records,
		curves: {},
		math: {},
		houseCalculators: []
	};
	return {
		release,
		proofShown: proof?.number ?? null,
		parts: accountOf(document, calculators, records, nobody).copy
	};
};
