import type Decimal from 'decimal.js';
import { nth } from '../decimals/nth';

/**
 * Variance Σ α_j j² − (Σ α_j j)² of the protons lost, counted from the most abundant species r: what
 * cancels is at most a factor of n + 1, because the variance is at least α_r times the square of
 * the mean so counted. About a species that a gas holds, Σ α_j (j − held)² instead. Times ln 10 and
 * the total it is a system’s part of the buffer capacity.
 */
export function spreadOf(fractions: readonly Decimal[], held?: number): Decimal {
  const about =
    held ??
    fractions.reduce((most, one, j) => (one.greaterThan(nth(fractions, most)) ? j : most), 0);
  let first = nth(fractions, 0).times(0);
  let second = first;
  fractions.forEach((fraction, j) => {
    const off = j - about;
    if (off === 0) return;
    first = first.plus(fraction.times(off));
    second = second.plus(fraction.times(off * off));
  });
  return held === undefined ? second.minus(first.times(first)) : second;
}
