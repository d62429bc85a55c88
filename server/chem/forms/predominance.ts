import type Decimal from 'decimal.js';
import { contextOf } from '../decimals/contexts';
import { nth } from '../decimals/nth';
import { writeSignificant } from '../decimals/rounding';
import { type AcidBaseSystem, cumulativeConstants } from './system';

/** The range of pH in which one species has the largest fraction; null where it has no end. */
export interface PredominanceRange {
  species: number;
  from: string | null;
  to: string | null;
}

/** Two neighbours of the sequence of predominant species: they are equal at pH = sum/width. */
interface Boundary {
  readonly lower: number;
  readonly upper: number;
  /** Sum of the constants between the two, S_upper − S_lower. */
  readonly sum: Decimal;
  readonly width: number;
}

/**
 * Where one predominant species follows another, from low to high pH: the corners of the upper
 * envelope of the lines j·pH − S_j. A species whose range would be empty or a single point is
 * skipped; the boundary around it is the mean of the constants it skips.
 */
export function boundariesOf(system: AcidBaseSystem): Boundary[] {
  const sums = cumulativeConstants(system);
  const boundaries: Boundary[] = [];
  for (let upper = 1; upper < sums.length; upper++) {
    for (;;) {
      const last = boundaries.at(-1);
      const lower = last?.upper ?? 0;
      const sum = nth(sums, upper).minus(nth(sums, lower));
      const width = upper - lower;
      if (last === undefined || last.sum.times(width).lessThan(sum.times(last.width))) {
        boundaries.push({ lower, upper, sum, width });
        break;
      }
      boundaries.pop();
    }
  }
  return boundaries;
}

/** The species with the largest fraction at a pH, compared exactly; a tie goes to the lower. */
export function predominantAt(boundaries: readonly Boundary[], pH: Decimal): number {
  let low = 0;
  let high = boundaries.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    const { sum, width } = nth(boundaries, middle);
    if ((width === 1 ? pH : pH.times(width)).greaterThan(sum)) low = middle + 1;
    else high = middle;
  }
  return boundaries[low]?.lower ?? boundaries.at(-1)?.upper ?? 0;
}

/**
 * A boundary is a quotient of a decimal (150 places at most) by at most 64. Unless it is a tie
 * itself, it lies at least 1/128 of 10⁻¹⁵⁰, or of a unit in the place rounded to, from one:
 * quotients of 200 digits round as the exact ones do.
 */
const quotientDigits = 200;

/**
 * Predominance ranges in order of pH, their ends to `digits` (1–60) significant digits, half-even.
 * Species that predominate nowhere, or at one point only, have none.
 */
export function predominanceRanges(system: AcidBaseSystem, digits: number): PredominanceRange[] {
  const context = contextOf(quotientDigits);
  const boundaries = boundariesOf(system);
  const ends = boundaries.map(({ sum, width }) =>
    writeSignificant(new context(sum).dividedBy(width), digits),
  );
  return [0, ...boundaries.map(({ upper }) => upper)].map((species, i) => ({
    species,
    from: ends[i - 1] ?? null,
    to: ends[i] ?? null,
  }));
}
