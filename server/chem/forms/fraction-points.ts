import { alongPoints } from './along-points';
import { planFor } from './plan';
import { nth } from '../decimals/nth';
import { labelsOf, type PHPoints } from './ph-points';
import { boundariesOf, predominantAt } from './predominance';
import { fractionQuantities, meanChargeQuantity, ratioQuantities } from './quantities';
import { settle } from './settle';
import type { AcidBaseSystem } from './system';

/** The species of a system at one pH. */
export interface FractionPoint {
  /** As asked. */
  pH: string;
  /** Fraction α_j of each species, j = 0…n protons lost. */
  fractions: string[];
  /** Amount of species i + 1 over species i. */
  neighbourRatios: string[];
  /** Mean charge number z̄. */
  meanCharge: string;
  /** Index of the species with the largest fraction; a tie goes to the lower. */
  predominant: number;
}

/**
 * Fractions, neighbour ratios, mean charge and predominant species at each pH, in the order asked:
 *
 *     α_j = 10^(j·pH − S_j) / Σ_k 10^(k·pH − S_k),  S_j = Σ_{i≤j} pKa_i
 *     r_i = α_{i+1}/α_i = 10^(pH − pKa_{i+1}),      z̄ = Σ_j (z₀ − j) α_j
 *
 * Every digit is that of the exact value for the decimals as given, rounded half-even: fractions
 * and ratios to `digits` (1–60) significant digits however rare the species, the charge to `digits`
 * places after the point. Exponent form below 10⁻⁶ and from 10^digits on; the charge always plain.
 * Inputs are taken as validated (see `AcidBaseSystem`, `PHPoints`). Points of one pH share arrays.
 */
export function fractionPoints(
  system: AcidBaseSystem,
  points: PHPoints,
  digits: number,
): FractionPoint[] {
  const fractions = fractionQuantities(system, digits);
  const ratios = ratioQuantities(system, digits);
  const charge = meanChargeQuantity(system, digits);
  const boundaries = boundariesOf(system);

  const answers = alongPoints(system, points, planFor(system, points, digits), (point) => ({
    fractions: fractions.map((fraction) => settle(point, fraction)),
    neighbourRatios: ratios.map((ratio) => settle(point, ratio)),
    meanCharge: settle(point, charge),
    predominant: predominantAt(boundaries, point.pH),
  }));
  return labelsOf(points).map((pH, i) => ({ pH, ...nth(answers, i) }));
}

/** The fractions alone, one row a pH, as `fractionPoints` gives them. */
export function fractionRows(system: AcidBaseSystem, points: PHPoints, digits: number): string[][] {
  const fractions = fractionQuantities(system, digits);
  return alongPoints(system, points, planFor(system, points, digits), (point) =>
    fractions.map((fraction) => settle(point, fraction)),
  );
}
