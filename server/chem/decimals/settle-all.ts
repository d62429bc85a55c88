import type Decimal from 'decimal.js';
import {
  clearance,
  keptForPlaces,
  roundsOneWay,
  tieNear,
  writePlaces,
  writeSignificant,
} from './rounding';

/** How a number of an answer is rounded and written. */
interface Form {
  /** Digits of the coefficient that are written. */
  readonly kept: (value: Decimal) => number;
  readonly write: (value: Decimal) => string;
}

/** `digits` significant digits. */
export const significant = (digits: number): Form => ({
  kept: () => digits,
  write: (value) => writeSignificant(value, digits),
});

/** `places` after the point. */
export const afterPoint = (places: number): Form => ({
  kept: (value) => keptForPlaces(value, places),
  write: (value) => writePlaces(value, places),
});

/** A number and how it is written. */
export interface Found {
  readonly value: Decimal;
  readonly form: Form;
  /** As it was given, without error: it may well be a tie, and needs no more digits then. */
  readonly exact?: boolean;
}

interface Finding {
  /** Digits that the answer keeps. */
  readonly digits: number;
  /** Computed with p digits, every number is within 10^(loss − p) of a unit in its first digit. */
  readonly loss: number;
  /** All numbers, computed with at least this precision. */
  readonly at: (precision: number) => readonly Found[];
}

/** Times that precision is doubled before a value next to a tie is taken for the tie. */
const mostDoublings = 3;

/** Digits behind the last one kept that a tie is told by. */
const tieDigits = 40;

/** Whether everything within 10^−`sure` of a unit in the first digit rounds to the same. */
function decided({ value, form, exact }: Found, sure: number): boolean {
  const kept = form.kept(value);
  if (exact || value.isZero() || roundsOneWay(value, kept)) return true;
  return tieNear(value, kept)
    .minus(value)
    .abs()
    .greaterThan(`1e${value.e - sure}`);
}

/**
 * Numbers rounded half-even, every digit right. Where an error interval holds a tie, precision is
 * doubled; a value that after that still agrees with the tie in `tieDigits` further digits is one:
 * symmetry makes such values (pure water: pH = pKw/2), chance does not.
 */
export function settleAll({ digits, loss, at }: Finding): string[] {
  const planned = digits + loss + clearance;
  let found = at(planned);
  const written: (string | undefined)[] = found.map((one) =>
    decided(one, planned - loss) ? one.form.write(one.value) : undefined,
  );
  for (let doubling = 1; written.includes(undefined); doubling++) {
    const precision = planned * 2 ** doubling;
    found = at(precision);
    found.forEach((one, i) => {
      if (written[i] !== undefined) return;
      if (decided(one, precision - loss)) written[i] = one.form.write(one.value);
      else if (doubling === mostDoublings) {
        const tie = one.value.toSignificantDigits(
          Math.max(1, one.form.kept(one.value)) + tieDigits,
        );
        written[i] = one.form.write(tie);
      }
    });
  }
  return written.map((one) => one ?? '');
}
