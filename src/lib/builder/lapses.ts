/** Which signatures would lapse if the draft became a proof as it stands. */
import type { CalculatorSet } from '../physics/calculator.ts';
import { claimCovers, coverHash } from '../widget/cover.ts';
import type { WidgetDocument } from '../widget/document.ts';
import type { ProofView } from '../workflow/piece.ts';

export interface Lapse {
	claim: string;
	/** As on the proof: “2a”. */
	label: string;
	signedBy: string[];
}

export function lapses(
	draft: WidgetDocument,
	proof: Pick<ProofView, 'document' | 'claims'> | null,
	calculators: CalculatorSet
): Lapse[] {
	const signed =
		proof?.claims.filter(({ signatures }) => signatures.some(({ inForce }) => inForce)) ?? [];
	if (!proof || signed.length === 0) return [];
	const before = claimCovers(proof.document, calculators);
	const after = claimCovers(draft, calculators);
	return signed.flatMap(({ id, label, signatures }): Lapse[] => {
		const [was, is] = [before.get(id), after.get(id)];
		if (was && is && coverHash(was) === coverHash(is)) return [];
		const signedBy = signatures.filter(({ inForce }) => inForce).map(({ by }) => by.name);
		return [{ claim: id, label, signedBy }];
	});
}

/** “If kept, this would lapse: 2a (signed by …).” */
export function lapseSentence(found: readonly Lapse[]): string {
	if (found.length === 0) return 'If kept, nothing signed would lapse.';
	const said = found.map(({ label, signedBy }) => `${label} (signed by ${signedBy.join(', ')})`);
	return `If kept, this would lapse: ${said.join('; ')}.`;
}
