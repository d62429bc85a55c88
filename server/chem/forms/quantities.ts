import { keptForPlaces, writePlaces, writeSignificant } from '../decimals/rounding';
import type { Quantity } from './settle';
import { type AcidBaseSystem, cumulativeConstants } from './system';
import { exponentsAt, fractionIs, meanChargeIs } from './ties';

/** Fractions α_j of the n + 1 species, to `digits` significant digits. */
export function fractionQuantities(system: AcidBaseSystem, digits: number): Quantity[] {
  const sums = cumulativeConstants(system);
  return sums.map((_, i) => ({
    of: (composition) => composition.fraction(i),
    kept: () => digits,
    write: (value) => writeSignificant(value, digits),
    is: (tie, pH) => fractionIs(tie, i, exponentsAt(sums, pH)),
  }));
}

/**
 * Neighbour ratios r_i = 10^(pH − pKa_i), to `digits` significant digits. Never a tie: a power of
 * ten with an integer exponent has one digit, any other is irrational.
 */
export const ratioQuantities = (system: AcidBaseSystem, digits: number): Quantity[] =>
  system.pKa.map((_, i) => ({
    of: (composition) => composition.ratio(i),
    kept: () => digits,
    write: (value) => writeSignificant(value, digits),
    is: () => false,
  }));

/** Mean charge z̄ = z₀ − Σ j α_j, to `digits` places after the point. */
export function meanChargeQuantity(system: AcidBaseSystem, digits: number): Quantity {
  const sums = cumulativeConstants(system);
  const charge = system.fullyProtonatedCharge;
  return {
    of: (composition) => composition.protonsLost().negated().plus(charge),
    kept: (value) => keptForPlaces(value, digits),
    write: (value) => writePlaces(value, digits),
    is: (tie, pH) => meanChargeIs(tie, charge, exponentsAt(sums, pH)),
  };
}
