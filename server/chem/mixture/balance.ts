import type { ActivityChoice, SizedIon } from '../activity/coefficients';
import type { ConstantKind } from '../constants/constant-kind';
import { Exact } from '../decimals/contexts';
import { nth } from '../decimals/nth';
import type Decimal from 'decimal.js';

/** An acid–base system in a solution. Decimals as strings, taken as exact and validated. */
export interface Acid {
  /** Stepwise constants at the temperature, in the order in which protons leave. */
  readonly pKa: readonly string[];
  /** Kind of each constant. */
  readonly kinds: readonly ConstantKind[];
  /** The n + 1 species. */
  readonly species: readonly SizedIon[];
  /** Index of the species weighed in, or of the neutral one that a gas holds. */
  readonly reference: number;
  /** Total of a weighed-in system, or concentration of the species that a gas holds. */
  readonly amount: string;
  readonly held: boolean;
}

/** An ion that takes no part in proton transfer. */
export interface InertIon {
  readonly ion: SizedIon;
  readonly concentration: string;
}

/** A charge balance: what is in the solution, and how its activities are found. */
export interface Balance {
  readonly acids: readonly Acid[];
  readonly inert: readonly InertIon[];
  /** pKw; without it H⁺ and OH⁻ carry no charge, and the root is an isoelectric point. */
  readonly pKw: string | undefined;
  readonly activity: ActivityChoice;
}

/** All ions in the order in which molalities are listed: H⁺, OH⁻, species, inert ions. */
export const ionsOf = ({ acids, inert }: Balance): SizedIon[] => [
  { name: 'H^+', charge: 1 },
  { name: 'OH^-', charge: -1 },
  ...acids.flatMap(({ species }) => species),
  ...inert.map(({ ion }) => ion),
];

/**
 * Charge that would be left over if every system were the species weighed in: of inert ions and of
 * the references. Exact, because it is most often exactly 0.
 */
export function leftoverCharge({ acids, inert }: Balance): Decimal {
  const weighed = acids.filter(({ held }) => !held);
  const parts = [
    ...weighed.map((acid) =>
      new Exact(acid.amount).times(nth(acid.species, acid.reference).charge),
    ),
    ...inert.map(({ ion, concentration }) => new Exact(concentration).times(ion.charge)),
  ];
  return parts.reduce((sum, part) => sum.plus(part), new Exact(0));
}
