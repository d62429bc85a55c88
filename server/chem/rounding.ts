import type Decimal from 'decimal.js';
import { Exact } from './contexts';

/** Digits looked at behind the rounding place; they fill one word of decimal.js. */
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

/**
 * How far, in 10⁻⁷ of a unit in the last place kept, a value may be off: `error` rounding units of
 * `precision` digits, against a unit of 10^−digits of its leading power (or of 1, for places after
 * the point). One more for the digits behind the tail, one for the products of errors.
 */
export const slackOf = (error: number, digits: number, precision: number) =>
  Math.ceil(5 * error * 10 ** (digits + tailDigits - precision)) + 2;

/**
 * The precision at which an error of so many rounding units is at most 10⁻⁶ of a unit in the last
 * place kept: about one value in 10⁵ then needs a second look, which costs less than more digits.
 */
export const precisionFor = (error: number, digits: number) =>
  digits + tailDigits - 1 + Math.ceil(Math.log10(5 * error));

/** Whether everything within `slack` of x rounds to the same `kept` digits. */
export const roundsOneWay = (x: Decimal, kept: number, slack: number) =>
  Math.abs(tailAfter(x, kept) - word / 2) > slack;

/** The tie next to an x that does not round one way: halfway between two neighbours, exact. */
export function tieNear(x: Decimal, kept: number): Decimal {
  const half = new Exact(`5e${x.e - kept}`);
  const below = kept === 0 ? new Exact(0) : new Exact(x.abs()).toSignificantDigits(kept, 1);
  const tie = below.plus(half);
  return x.isNegative() ? tie.negated() : tie;
}

/** Digits of the coefficient of x down to `places` after the point; 0 or less for a small x. */
export const keptForPlaces = (x: Decimal, places: number) => x.e + 1 + places;

const unsignedZero = (x: Decimal) => (x.isZero() ? x.abs() : x);

/**
 * x to `digits` significant digits, half-even, all written; exponent form below 10⁻⁶ and from
 * 10^digits on. Zero has no sign.
 */
export const writeSignificant = (x: Decimal, digits: number) =>
  unsignedZero(x).toPrecision(digits, 6);

/** x to `places` after the point, half-even, always plain. Zero has no sign. */
export const writePlaces = (x: Decimal, places: number) =>
  unsignedZero(x.toDecimalPlaces(places, 6)).toFixed(places);
