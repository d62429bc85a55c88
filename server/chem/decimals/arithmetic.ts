import type Decimal from 'decimal.js';
import { type Context, contextOf } from './contexts';
import { powerOfTen } from './powers-of-ten';

/**
 * Calculating with numbers of one kind, so that a relation is written once and serves both for
 * doubles, which find the neighbourhood of an answer, and for decimals, which give its digits.
 */
export interface Arithmetic<N> {
  /** A decimal as written, or an integer. */
  readonly of: (value: string | number) => N;
  readonly plus: (a: N, b: N) => N;
  readonly minus: (a: N, b: N) => N;
  readonly times: (a: N, b: N) => N;
  readonly over: (a: N, b: N) => N;
  readonly sqrt: (a: N) => N;
  readonly ln: (a: N) => N;
  readonly exp: (a: N) => N;
  readonly powerOfTen: (a: N) => N;
  readonly isZero: (a: N) => boolean;
}

export const doubles: Arithmetic<number> = {
  of: Number,
  plus: (a, b) => a + b,
  minus: (a, b) => a - b,
  times: (a, b) => a * b,
  over: (a, b) => a / b,
  sqrt: Math.sqrt,
  ln: Math.log,
  exp: Math.exp,
  powerOfTen: (a) => 10 ** a,
  isZero: (a) => a === 0,
};

/** Σ of the terms, one after the other; 0 of none. */
export const sum = <N>({ of, plus }: Arithmetic<N>, terms: readonly N[]): N =>
  terms.reduce((all, term) => plus(all, term), of(0));

const made = new Map<Context, Arithmetic<Decimal>>();

/** Decimals of at least `precision` significant digits; each operation rounds once, half-even. */
export function decimals(precision: number): Arithmetic<Decimal> {
  const context = contextOf(precision);
  let arithmetic = made.get(context);
  if (arithmetic === undefined) {
    // An exponent with more places than the context has digits says nothing that could be kept.
    const places = context.precision + 3;
    arithmetic = {
      of: (value) => new context(value),
      plus: (a, b) => a.plus(b),
      minus: (a, b) => a.minus(b),
      times: (a, b) => a.times(b),
      over: (a, b) => a.dividedBy(b),
      sqrt: (a) => a.sqrt(),
      ln: (a) => a.ln(),
      exp: (a) => a.exp(),
      powerOfTen: (a) => powerOfTen(context, a.toDecimalPlaces(places)),
      isZero: (a) => a.isZero(),
    };
    made.set(context, arithmetic);
  }
  return arithmetic;
}
