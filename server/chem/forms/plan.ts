import { decimalsOf, type PHPoints } from './ph-points';
import { powerOfTenError } from '../decimals/powers-of-ten';
import { clearance } from '../decimals/rounding';
import { type AcidBaseSystem, constantsOf } from './system';

/** Points of a grid that terms are carried along by products before they are made afresh. */
export const anchorEvery = 32;

/** How many digits to compute with for how many right ones. */
export interface Plan {
  /**
   * Computed with p digits, every number of a composition is within 10^(loss − p) of a unit in the
   * last place kept: relative for fractions and ratios, absolute for the mean charge.
   */
  readonly loss: number;
  readonly precision: number;
}

/**
 * Counts the roundings in `Composition`, in units u = 5·10^−p. A product or quotient adds the errors
 * of its parts and one unit; a sum of positive numbers has the error of its worst part and one unit
 * a sum; the charge, whose parts cancel, is bounded absolutely.
 */
function roundingUnits(system: AcidBaseSystem, points: PHPoints): number {
  const protons = system.pKa.length;
  const decimals = constantsOf(system).map((constant) => constant.decimalPlaces());
  const power = powerOfTenError(Math.max(decimalsOf(points), ...decimals));
  const ratioAfresh = 2 * power + 1;
  const termAfter = (j: number) => j * (ratioAfresh + 1) + anchorEvery * j * (power + 1);
  const ratio = termAfter(1) + power + 1;
  const term = termAfter(protons);
  const total = term + protons;
  const fraction = term + total + 2;
  const protonsLost = total + protons + total + 2;
  const meanCharge = protons * protonsLost + Math.abs(system.fullyProtonatedCharge) + protons;
  return Math.max(ratio, fraction, meanCharge);
}

/** The plan for `digits` right digits; 6 instead of 5 allows for the products of errors. */
export function planFor(system: AcidBaseSystem, points: PHPoints, digits: number): Plan {
  const loss = digits + Math.ceil(Math.log10(6 * roundingUnits(system, points)));
  return { loss, precision: loss + clearance };
}
