import type Decimal from 'decimal.js';
import { Exact } from '../decimals/contexts';
import { writeSignificant } from '../decimals/rounding';

/**
 * A polyprotic acid–base system: n = 1…64 stepwise constants in the order in which protons leave,
 * each −50…70 with at most 60 decimals, and the charge number of the fully protonated species.
 * Taken as validated.
 */
export interface AcidBaseSystem {
  readonly fullyProtonatedCharge: number;
  readonly pKa: readonly string[];
}

/** One protonation form. */
export interface Species {
  index: number;
  charge: number;
  protonsLost: number;
}

/** The n + 1 species, j = 0…n protons lost, of charge z₀ − j. */
export const speciesOf = ({ fullyProtonatedCharge, pKa }: AcidBaseSystem): Species[] =>
  Array.from({ length: pKa.length + 1 }, (_, lost) => ({
    index: lost,
    charge: fullyProtonatedCharge - lost,
    protonsLost: lost,
  }));

/** The stepwise constants as exact decimals. */
export const constantsOf = (system: AcidBaseSystem): Decimal[] =>
  system.pKa.map((constant) => new Exact(constant));

/** S_j = Σ_{i≤j} pKa_i for j = 0…n, exact: species j outweighs species 0 by 10^(j·pH − S_j). */
export function cumulativeConstants(system: AcidBaseSystem): Decimal[] {
  const sums = [new Exact(0)];
  let sum = new Exact(0);
  for (const constant of constantsOf(system)) {
    sum = sum.plus(constant);
    sums.push(sum);
  }
  return sums;
}

/** Indices i with pKa_i > pKa_{i+1}, counted from 0: the form between them never predominates. */
export function invertedNeighbours(system: AcidBaseSystem): number[] {
  const constants = constantsOf(system);
  return constants.flatMap((constant, i) => {
    const next = constants[i + 1];
    return next !== undefined && constant.greaterThan(next) ? [i] : [];
  });
}

/**
 * The constants pK′ that the fractions use on the pH scale, to `digits` (1–60) significant digits,
 * half-even. Ideal: the constants themselves.
 */
export const effectivePKa = (system: AcidBaseSystem, digits: number): string[] =>
  constantsOf(system).map((constant) => writeSignificant(constant, digits));
