import Decimal from 'decimal.js';

/** A decimal.js constructor with a precision of its own; nothing here ever alters one. */
export type Context = typeof Decimal;

const halfEven = Decimal.ROUND_HALF_EVEN;
const made = new Map<number, Context>();

/** Steps of four digits up to 96, then doubling: few contexts, so that their tables are reused. */
const bucketOf = (precision: number) =>
  precision <= 96 ? 4 * Math.ceil(precision / 4) : 128 * 2 ** Math.ceil(Math.log2(precision / 128));

/**
 * The shared context of at least `precision` significant digits (1 or more). Every operation in it
 * is correctly rounded, half-even: relative error at most one rounding unit, u = 5·10^−precision.
 * Exponents reach ±9·10¹⁵, so no quotient of fractions over- or underflows.
 */
export function contextOf(precision: number): Context {
  const bucket = bucketOf(precision);
  let context = made.get(bucket);
  if (context === undefined) {
    context = Decimal.clone({ defaults: true, precision: bucket, rounding: halfEven });
    made.set(bucket, context);
  }
  return context;
}

/** A context of exactly `precision` digits for whoever keeps it. */
export const contextApart = (precision: number): Context =>
  Decimal.clone({ defaults: true, precision, rounding: halfEven });

/**
 * For sums, differences and products that are to be exact; never for quotients. The longest number
 * is a term of a tie test (ties.ts): a 61-digit midpoint, down to 10^−11,600, times a power of ten
 * within ±5,760, added to others like it: fewer than 24,000 digits.
 */
export const Exact: Context = contextApart(24_000);
