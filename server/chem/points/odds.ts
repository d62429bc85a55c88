import type Decimal from 'decimal.js';
import { nth } from '../decimals/nth';
import { type Factors, allTermsOf } from '../forms/composition';
import { doubleSystem, lnTerms } from '../forms/doubles';
import type { AcidBaseSystem } from '../forms/system';

/**
 * A species i against all others: odds t_i/Σ_{j≠i} t_j = α_i/(1 − α_i), which lose no digits where
 * α_i is near 0 or 1. d ln odds/d ln u = i − m, where m is the mean of the others’ protons lost, and
 * dm/d ln u is their variance: odds rise while m < i and fall once m > i.
 */
export interface Odds<N> {
  readonly odds: N;
  /** i − m. */
  readonly slope: N;
  /** Variance of the others. */
  readonly variance: number;
}

/** Mean and variance of the others, from weights relative to the largest of them. */
function othersOf(weights: readonly number[], species: number) {
  let [total, first, second] = [0, 0, 0];
  weights.forEach((weight, j) => {
    if (j === species) return;
    total += weight;
    first += (j - species) * weight;
    second += (j - species) ** 2 * weight;
  });
  const mean = first / total;
  return { total, slope: -mean, variance: second / total - mean * mean };
}

/** ln of the odds in doubles, at ln u. */
export function doubleOdds(system: AcidBaseSystem, species: number) {
  const doubles = doubleSystem(system.pKa.map(Number));
  return (lnU: number): Odds<number> => {
    const terms = lnTerms(doubles, lnU);
    const most = Math.max(...terms.filter((_, j) => j !== species));
    const { total, slope, variance } = othersOf(
      terms.map((term) => Math.exp(Math.min(700, term - most))),
      species,
    );
    return { odds: nth(terms, species) - most - Math.log(total), slope, variance };
  };
}

/** The odds in decimals, at u = 1/a(H⁺). */
export function oddsAt(factors: Factors, species: number, u: Decimal): Odds<Decimal> {
  const terms = allTermsOf(factors, u);
  const zero = u.times(0);
  const others = terms.map((term, j) => (j === species ? zero : term));
  const total = others.reduce((sum, term) => sum.plus(term));
  const off = others.reduce((sum, term, j) => sum.plus(term.times(species - j)), zero);
  const { variance } = othersOf(
    others.map((term) => Number(term.dividedBy(total))),
    species,
  );
  return { odds: nth(terms, species).dividedBy(total), slope: off.dividedBy(total), variance };
}
