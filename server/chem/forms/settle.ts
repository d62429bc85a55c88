import type Decimal from 'decimal.js';
import type { Composition } from './composition';
import { Exact } from '../decimals/contexts';
import { roundsOneWay, tieNear, unitExponent } from '../decimals/rounding';

/** A number of the answer: where it is found and how it is rounded. */
export interface Quantity {
  readonly of: (composition: Composition) => Decimal;
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
  /** As in `Plan`. */
  readonly loss: number;
}

/**
 * A quantity rounded half-even, every digit right. Level 0 nearly always decides. Where the error
 * interval holds a tie, the exact value is compared with that tie; only if it differs is precision
 * raised.
 *
 * This ends: a value that is no tie lies at a positive distance from every tie, and the interval
 * shrinks below any distance.
 */
export function settle({ pH, at, loss }: Refinable, { of, kept, write, is }: Quantity): string {
  for (let level = 0; ; level++) {
    const composition = at(level);
    const value = of(composition);
    const places = kept(value);
    if (roundsOneWay(value, places)) return write(value);

    const tie = tieNear(value, places);
    const error = new Exact(`1e${loss - composition.precision + unitExponent(value, places)}`);
    if (tie.minus(value).abs().greaterThan(error)) return write(value);
    if (is(tie, pH)) return write(tie);
  }
}
