import { type Balance, ionsOf } from './balance';
import { type BalanceNumbers, numbersOf, stateNumbers } from './numbers';
import { Diverged, rootsOf, type Unsolved } from './solve';

/** Another ionic strength that fits the composition. */
export interface OtherState {
  readonly pH: string;
  readonly ionicStrength: string;
}

/** A mixture at equilibrium, found in doubles; its digits are made when they are asked for. */
export interface Equilibrium {
  readonly ok: true;
  /** In doubles, to be compared with the range of a model before digits are made. */
  readonly ionicStrength: number;
  readonly pH: number;
  /** In doubles, in the order of `ionsOf`. */
  readonly molalities: readonly number[];
  readonly inDigits: (digits: number) => EquilibriumDigits;
}

export type EquilibriumDigits =
  | {
      readonly ok: true;
      readonly numbers: BalanceNumbers;
      /** Other ionic strengths that fit, in rising order; the answer has the smallest. */
      readonly others: readonly OtherState[];
    }
  | { readonly ok: false; readonly reason: Unsolved };

/**
 * The pH of a mixture and everything in it:
 *
 *     Σ_k c_k z̄_k(pH) + [H⁺] − [OH⁻] + Q = 0,  [H⁺] = 10^−pH/γ_H,  [OH⁻] = 10^(pH − pKw)/γ_OH
 *
 * At fixed activity coefficients the left side falls strictly with pH, so one root is bracketed.
 * Where they follow from the composition the ionic strength need not be unique: the answer is the
 * smallest, continued from I = 0; others found are told beside it.
 */
export function equilibrium(
  balance: Balance,
): Equilibrium | { readonly ok: false; readonly reason: Unsolved } {
  const found = rootsOf(balance);
  if (!found.ok) return found;
  const [root, ...others] = found.roots;
  const charges = ionsOf(balance).map(({ charge }) => charge);
  return {
    ok: true,
    ionicStrength:
      root.near.molalities.reduce((sum, one, i) => sum + one * (charges[i] ?? 0) ** 2, 0) / 2,
    pH: root.near.lnU / Math.LN10,
    molalities: root.near.molalities,
    inDigits: (digits) => {
      try {
        return {
          ok: true,
          numbers: numbersOf(balance, root, digits),
          others: others.map((other) => stateNumbers(other, digits)),
        };
      } catch (error) {
        if (error instanceof Diverged) return { ok: false, reason: 'no-convergence' };
        throw error;
      }
    },
  };
}
