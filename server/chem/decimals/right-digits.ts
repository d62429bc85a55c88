import type Decimal from 'decimal.js';
import { type Context, contextOf, Exact } from './contexts';
import {
  clearance,
  keptForPlaces,
  roundsOneWay,
  tieNear,
  unitExponent,
  writePlaces,
} from './rounding';

/** A number that a formula fixes for its arguments, which are exact. */
export interface Relation {
  /** The formula evaluated with the p digits of a context. */
  readonly in: (context: Context) => Decimal;
  /** `in` is within 10^(loss − p) of the exact value; from counting its roundings, u = 5·10^−p. */
  readonly loss: number;
  /** Whether the exact value is this decimal; left out where a logarithm rules that out. */
  readonly is?: (tie: Decimal) => boolean;
}

/** Digits that are nearly always enough beside the loss, before the size of the value is known. */
const firstGuess = 20;

/**
 * A value that rounds as the exact one does. Guard digits: precision is raised until the error is
 * below 10^−clearance of a unit in the last place kept, and doubled where a tie lies within the
 * error. A value that is no tie lies at a positive distance from every tie, so this ends.
 *
 * decimal.js knows π and ln 10 to 1,025 digits and throws beyond; about 500 can be had.
 */
function settled(relation: Relation, keptOf: (value: Decimal) => number | undefined): Decimal {
  const { loss, is } = relation;
  for (let precision = loss + firstGuess; ;) {
    const value = relation.in(contextOf(precision));
    if (!value.isFinite()) throw new RangeError('The relation has no value here.');
    const kept = keptOf(value);
    if (kept === undefined && is?.(value)) return value;
    const below = kept === undefined ? 0 : unitExponent(value, kept) - (loss - precision);
    if (kept === undefined || below < clearance) {
      precision += clearance - below;
      continue;
    }
    if (roundsOneWay(value, kept)) return value;

    const tie = tieNear(value, kept);
    if (
      tie
        .minus(value)
        .abs()
        .greaterThan(new Exact(`1e${loss - precision}`))
    )
      return value;
    if (is?.(tie)) return tie;
    precision *= 2;
  }
}

/** The exact value rounded half-even to so many significant digits. */
export function toDigits(relation: Relation, digits: number): Decimal {
  // Of a zero not even the first digit is known: what cancelled may leave something smaller.
  const value = settled(relation, (found) => (found.isZero() ? undefined : digits));
  return value.toSignificantDigits(digits, Exact.rounding);
}

/** The exact value rounded half-even to so many places after the point, all written. */
export const toPlaces = (relation: Relation, places: number): string =>
  writePlaces(
    settled(relation, (value) => keptForPlaces(value, places)),
    places,
  );
