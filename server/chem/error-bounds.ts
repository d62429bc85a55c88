import { decimalsOf, type PHPoints } from './ph-points';
import { powerOfTenError } from './powers-of-ten';
import { type AcidBaseSystem, constantsOf } from './system';

/** Points of a grid that terms are carried along by products before they are made afresh. */
export const anchorEvery = 32;

/** Bounds on errors, in rounding units u = 5·10^−p of a computation with p digits. */
export interface ErrorBounds {
  /** Relative, of a neighbour ratio. */
  readonly ratio: number;
  /** Relative, of a fraction. */
  readonly fraction: number;
  /** Absolute, of the mean charge. */
  readonly meanCharge: number;
}

/**
 * Counts the roundings in `compose` (composition.ts). A product or quotient adds the errors of its
 * parts and one unit; a sum of positive numbers has the error of its worst part and one unit a sum;
 * the charge, whose parts cancel, is bounded absolutely.
 */
export function errorBoundsOf(system: AcidBaseSystem, points: PHPoints): ErrorBounds {
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
  return { ratio, fraction, meanCharge };
}
