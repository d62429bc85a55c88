import Decimal from 'decimal.js';
import { Exact } from './contexts';

const { ROUND_HALF_EVEN: halfEven, ROUND_DOWN: down } = Decimal;

/** Digits in one word of decimal.js; as many are looked at behind the rounding place. */
const tailDigits = 7;
const word = 10 ** tailDigits;

/**
 * The seven digits that follow the first `kept` digits of a coefficient, as an integer 0…9,999,999;
 * 0 when the number ends or begins after them. Read from the words that decimal.js documents: `d`,
 * base 10⁷, the first without leading zeros.
 */
export function tailAfter({ d, e }: Decimal, kept: number): number {
  if (kept < 0) return 0;
  const leading = tailDigits - 1 - (((e % tailDigits) + tailDigits) % tailDigits);
  const at = kept + leading;
  const offset = at % tailDigits;
  const index = (at - offset) / tailDigits;
  const scale = 10 ** offset;
  const head = ((d[index] ?? 0) % (word / scale)) * scale;
  return head + Math.floor(((d[index + 1] ?? 0) * scale) / word);
}

/** A planned value is within 10^−`clearance` of a unit in the last place kept. */
export const clearance = 5;

/** The same in units of the tail, and one for the digits behind it. */
const slack = 10 ** (tailDigits - clearance) + 1;

/**
 * Whether everything within 10^−`clearance` of a unit in the last place of x rounds to the same
 * `kept` digits. About one value in 50,000 does not, and a second look costs less than more digits
 * would for all.
 */
export const roundsOneWay = (x: Decimal, kept: number) =>
  Math.abs(tailAfter(x, kept) - word / 2) > slack;

/** The exponent of a unit in the last of `kept` digits of x. */
export const unitExponent = (x: Decimal, kept: number) => x.e + 1 - kept;

/** The tie that an x which does not round one way is next to: halfway between neighbours, exact. */
export function tieNear(x: Decimal, kept: number): Decimal {
  const half = new Exact(`5e${unitExponent(x, kept) - 1}`);
  const below = kept === 0 ? new Exact(0) : new Exact(x.abs()).toSignificantDigits(kept, down);
  const tie = below.plus(half);
  return x.isNegative() ? tie.negated() : tie;
}

/** Digits of the coefficient of x down to `places` after the point; 0 or less for a small x. */
export const keptForPlaces = (x: Decimal, places: number) => x.e + 1 + places;

/** Rounding a small negative number leaves a zero, and zero has no sign. */
const withoutSignOfZero = (written: string) =>
  written.startsWith('-') && !/[1-9]/.test(written) ? written.slice(1) : written;

/**
 * x to `digits` significant digits, half-even, all written; exponent form below 10⁻⁶ and from
 * 10^digits on.
 */
export const writeSignificant = (x: Decimal, digits: number) =>
  withoutSignOfZero(x.toPrecision(digits, halfEven));

/** x to `places` after the point, half-even, always plain. */
export const writePlaces = (x: Decimal, places: number) =>
  withoutSignOfZero(x.toFixed(places, halfEven));
