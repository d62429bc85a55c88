import type Decimal from 'decimal.js';
import type { Context } from './contexts';

/** A root to be refined: R(u) = 0 for one u > 0 near the start. */
interface Root {
  readonly context: Context;
  readonly start: Decimal;
  /** R(u), a pure number. */
  readonly residual: (u: Decimal) => Decimal;
  /** dR/d ln u there, not 0; a few right digits are enough. */
  readonly slope: (u: Decimal) => number;
  /** Relative error of u that is good enough, as a power of ten. */
  readonly accuracy: number;
}

export type Refined =
  | { readonly ok: true; readonly value: Decimal; readonly iterations: number }
  | { readonly ok: false; readonly reason: 'no-convergence' };

/** A start that is good to n digits needs about log2(p/n) steps; this many means it was not. */
const mostIterations = 80;

/** A decimal as mantissa and exponent, so that numbers beyond a double's range survive division. */
export const ratioOf = (a: Decimal, b: number): { mantissa: number; exponent: number } => {
  if (a.isZero()) return { mantissa: 0, exponent: 0 };
  return { mantissa: Number(a.toSignificantDigits(17).times(`1e${-a.e}`)) / b, exponent: a.e };
};

/**
 * Newton's iteration in ln u, the step in double precision: each multiplies the error by about
 * 10⁻¹⁴ or squares it, whichever is worse. Steps are held to a factor of e² in u.
 */
export function refineRoot({ context, start, residual, slope, accuracy }: Root): Refined {
  let u = new context(start);
  for (let iterations = 1; iterations <= mostIterations; iterations++) {
    const { mantissa, exponent } = ratioOf(residual(u), slope(u));
    if (!Number.isFinite(mantissa)) return { ok: false, reason: 'no-convergence' };
    const step = new context(-mantissa).times(`1e${exponent}`);
    if (step.isZero()) return { ok: true, value: u, iterations };
    const held = step.abs().greaterThan(2) ? new context(step.isNegative() ? -2 : 2) : step;
    u = held.abs().lessThan('1e-9')
      ? u.times(held.times(held).dividedBy(2).plus(held).plus(1))
      : u.times(held.exp());
    // What is left after this step is about its square, or 10⁻¹² of it; some digits to spare.
    if (Math.max(2 * step.e + 4, step.e - 10) < accuracy) return { ok: true, value: u, iterations };
  }
  return { ok: false, reason: 'no-convergence' };
}
