import type Decimal from 'decimal.js';
import type { Composition } from './composition';
import { roundsOneWay, slackOf, tieNear } from './rounding';

/** A number of the answer: where it is found, how good it is, how it is rounded. */
export interface Quantity {
  readonly of: (composition: Composition) => Decimal;
  /** Bound on its error, in rounding units. */
  readonly error: number;
  readonly digits: number;
  /** How many digits of the coefficient are written. */
  readonly kept: (value: Decimal) => number;
  readonly write: (value: Decimal) => string;
  /** Whether the exact value at this pH is this decimal. */
  readonly is: (tie: Decimal, pH: Decimal) => boolean;
}

/** The composition at one pH: level 0 as planned, each further level at twice the precision. */
export interface Refinable {
  readonly pH: Decimal;
  readonly at: (level: number) => Composition;
}

/**
 * A quantity rounded half-even, every digit right. Level 0 nearly always decides. Where the error
 * interval holds a tie, the exact value is compared with that tie; only if it differs is precision
 * raised.
 *
 * This ends: a value that is no tie lies at a positive distance from every tie, and the interval
 * shrinks below any distance.
 */
export function settle({ pH, at }: Refinable, quantity: Quantity): string {
  const { of, error, digits, kept, write, is } = quantity;
  for (let level = 0; ; level++) {
    const composition = at(level);
    const value = of(composition);
    const places = kept(value);
    const slack = slackOf(error, digits, composition.precision);
    if (roundsOneWay(value, places, slack)) return write(value);
    const tie = tieNear(value, places);
    if (is(tie, pH)) return write(tie);
  }
}
