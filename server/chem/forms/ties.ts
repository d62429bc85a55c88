import type Decimal from 'decimal.js';
import { Exact } from '../decimals/contexts';

/**
 * Whether Σ c_j·10^(e_j) = 0, decided exactly for decimal c_j and e_j.
 *
 * Exponents fall into classes by their part after the point. Powers 10^r with r rational and
 * distinct in [0, 1) are linearly independent over the rationals: with q a common denominator they
 * are distinct powers below the q-th of 10^(1/q), whose minimal polynomial x^q − 10 is irreducible
 * (Eisenstein at 2). So the sum vanishes only if it vanishes in every class, and within a class it
 * is 10^r times a decimal.
 */
export function vanishes(coefficients: readonly Decimal[], exponents: readonly Decimal[]): boolean {
  const sums = new Map<string, Decimal>();
  exponents.forEach((exponent, j) => {
    const whole = exponent.floor();
    const rest = exponent.minus(whole).toFixed();
    const term = new Exact(`1e${whole.toFixed()}`).times(coefficients[j] ?? 0);
    sums.set(rest, term.plus(sums.get(rest) ?? 0));
  });
  return [...sums.values()].every((sum) => sum.isZero());
}

/** The exponents e_j = j·pH − S_j of all species at one pH, exact. */
export const exponentsAt = (cumulative: readonly Decimal[], pH: Decimal): Decimal[] =>
  cumulative.map((sum, lost) => pH.times(lost).minus(sum));

/** Whether fraction α_i is the decimal `tie`: α_i Σ 10^(e_j) = 10^(e_i). */
export const fractionIs = (tie: Decimal, i: number, exponents: readonly Decimal[]) =>
  vanishes(
    exponents.map((_, j) => (j === i ? tie.minus(1) : tie)),
    exponents,
  );

/** Whether the mean charge is the decimal `tie`: Σ (z_j − z̄)·10^(e_j) = 0 with z_j = z₀ − j. */
export const meanChargeIs = (tie: Decimal, charge: number, exponents: readonly Decimal[]) =>
  vanishes(
    exponents.map((_, lost) => new Exact(charge - lost).minus(tie)),
    exponents,
  );
