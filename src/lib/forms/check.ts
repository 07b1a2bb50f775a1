/** What the check room and the release room send: each schema is named after the verb it feeds. */
import { z } from 'zod';

const rowId = z.string().min(1).max(40);
const claim = z.string().min(1).max(40);
const words = (missing: string) =>
	z.string().trim().min(1, missing).max(2000, 'Keep it under 2000 characters.');

export const SignClaim = z.object({ proofId: rowId, claim });
export type SignClaim = z.infer<typeof SignClaim>;

export const TakeBackSignature = z.object({ signatureId: rowId });
export type TakeBackSignature = z.infer<typeof TakeBackSignature>;

export const RaiseQuery = z.object({
	proofId: rowId,
	claim,
	question: words('Say what you want to know.')
});
export type RaiseQuery = z.infer<typeof RaiseQuery>;

export const AnswerQuery = z.object({ queryId: rowId, answer: words('Write the answer.') });
export type AnswerQuery = z.infer<typeof AnswerQuery>;

export const CloseQuery = z.object({ queryId: rowId });
export type CloseQuery = z.infer<typeof CloseQuery>;

export const PassProof = z.object({ proofId: rowId });
export type PassProof = z.infer<typeof PassProof>;

export const ReleaseProof = z.object({ proofId: rowId });
export type ReleaseProof = z.infer<typeof ReleaseProof>;
