/** Acts that want a fresh proof of who it is: the passphrase travels beside them, '' when it wasn't asked for. */
import { z } from 'zod';
import { PassProof, ReleaseProof, SignClaim } from './check.ts';
import { VetFormula } from './vet-formula.ts';
import { RetestCalculator, VetCalculator, WithdrawCalculator } from './house-calculator.ts';

const passphrase = z.string().max(200, 'A passphrase has at most 200 characters.').default('');

export const ConfirmedSignature = SignClaim.extend({ passphrase });
export const ConfirmedPass = PassProof.extend({ passphrase });
export const ConfirmedRelease = ReleaseProof.extend({ passphrase });
export const ConfirmedFormula = VetFormula.extend({ passphrase });
export const ConfirmedVetting = VetCalculator.extend({ passphrase });
export const ConfirmedWithdrawal = WithdrawCalculator.extend({ passphrase });
export const ConfirmedRetest = RetestCalculator.extend({ passphrase });
