import type Decimal from 'decimal.js';
import { nth } from '../decimals/nth';
import { refineRoot } from '../decimals/refine-root';
import type { Balance } from './balance';
import { fittingStrengths } from './continuation';
import { type AtState, DecimalBalance } from './decimal-balance';
import { DoubleBalance, type DoubleSolution } from './double-balance';
import { fittingComposition, trifle } from './fitting-composition';
import { jacobianOfRest, type Matrix, solveLinear } from './jacobian';

/** Why a balance has no answer. */
export type Unsolved = 'no-ionic-strength' | 'no-convergence';

/** A balance solved with at least so many digits. */
export interface SolvedBalance {
  readonly balance: DecimalBalance;
  /** 1/a(H⁺). */
  readonly u: Decimal;
  readonly at: AtState;
  readonly state: readonly Decimal[];
  readonly iterations: number;
}

/** One root of a balance, known in doubles and to be had with any number of digits. */
export interface Root {
  readonly near: DoubleSolution;
  /** Solved with p digits, every number is within 10^(loss − p) of its value, relatively. */
  readonly loss: number;
  /** Throws `Diverged` where the doubles misled. */
  readonly solvedTo: (precision: number) => SolvedBalance;
}

export type Roots =
  | { readonly ok: true; readonly roots: readonly [Root, ...Root[]] }
  | { readonly ok: false; readonly reason: Unsolved };

/** Decimals did not find what doubles promised. */
export class Diverged extends Error {}

/** Outer steps: each gains about seven digits. */
const mostSteps = 80;

/** Roundings of one number of a balance, in units of its last digit: a bound, as a power of ten. */
const roundings = 7;

/** States of the activity coefficients that lead back to themselves, in doubles. */
function fittingStates(balance: Balance, doubles: DoubleBalance) {
  switch (doubles.coefficients.dependsOn) {
    case 'nothing':
      return { ok: true, states: [[]] } as const;
    case 'ionic-strength': {
      const found = fittingStrengths(balance, doubles);
      return found.ok ? ({ ok: true, states: found.values.map((I) => [I]) } as const) : found;
    }
    case 'composition': {
      const found = fittingComposition(balance, doubles);
      return found.ok ? ({ ok: true, states: [found.state] } as const) : found;
    }
  }
}

/** Derivatives of what a state lacks of leading back to itself, both relative to the state. */
function relativeJacobian(
  doubles: DoubleBalance,
  state: readonly number[],
  start: number,
): { matrix: Matrix; scale: number[] } {
  const scale = state.map((x) => Math.abs(x) + trifle);
  const map = (y: readonly number[]) =>
    doubles
      .next(
        y.map((value, i) => nth(state, i) + value * nth(scale, i)),
        start,
      )
      .state.map((x, i) => (x - nth(state, i)) / nth(scale, i));
  return {
    matrix: jacobianOfRest(
      map,
      state.map(() => 0),
      1,
    ),
    scale,
  };
}

/** How much an error of the composition is magnified in the state, as a power of ten. */
function magnification(matrix: Matrix): number {
  const solved = [
    solveLinear(
      matrix,
      matrix.map(() => 1),
    ),
    solveLinear(
      matrix,
      matrix.map((_, i) => (i % 2 === 0 ? 1 : -1)),
    ),
  ].flatMap((x) => x ?? []);
  return Math.ceil(Math.log10(Math.max(1, ...solved.map(Math.abs))));
}

/** Vector of decimals as one power of ten and doubles. */
function scaled(vector: readonly Decimal[]): { exponent: number; mantissas: number[] } {
  const exponent = Math.max(...vector.map((x) => (x.isZero() ? -Infinity : x.e)));
  if (exponent === -Infinity) return { exponent: 0, mantissas: vector.map(() => 0) };
  return { exponent, mantissas: vector.map((x) => Number(x.times(`1e${-exponent}`))) };
}

/** All roots of a charge balance, the one with the smallest ionic strength first. */
export function rootsOf(problem: Balance): Roots {
  const doubles = new DoubleBalance(problem);
  const fitting = fittingStates(problem, doubles);
  if (!fitting.ok) return fitting;
  const [first, ...others] = fitting.states
    .map((state) => rootAt(problem, doubles, state))
    // Where the charge does not change with pH at all, no double says where it vanishes.
    .filter(({ loss }) => Number.isFinite(loss));
  return first ? { ok: true, roots: [first, ...others] } : { ok: false, reason: 'no-convergence' };
}

function rootAt(problem: Balance, doubles: DoubleBalance, state: readonly number[]): Root {
  const near = doubles.solve(state);
  const { matrix, scale } = relativeJacobian(doubles, state, near.lnU);
  const cancelling = Math.max(0, Math.log10(near.scale / -near.slope));
  const protons = Math.max(1, ...problem.acids.map(({ pKa }) => pKa.length));
  const loss = Math.ceil(roundings + cancelling + Math.log10(protons)) + magnification(matrix);

  const solvedTo = (precision: number): SolvedBalance => {
    const balance = new DecimalBalance(problem, doubles.coefficients, precision);
    const { context } = balance;
    const accuracy = -context.precision;
    let at: AtState;
    let u = new context(near.lnU).exp();
    let iterations = 0;
    const settle = () => {
      const refined = refineRoot({
        context,
        start: u,
        residual: (value) => balance.over(value, at),
        slope: () => near.slope,
        accuracy: accuracy + Math.ceil(cancelling),
      });
      if (!refined.ok) throw new Diverged(refined.reason);
      u = refined.value;
      iterations += refined.iterations;
    };
    let now = state.map((x) => new context(x));
    at = balance.at(now);
    settle();
    for (let step = 0; matrix.length > 0; step++) {
      if (step === mostSteps) throw new Diverged('no-convergence');
      const next = balance.stateOf(u, at);
      const rest = next.map((x, i) => x.minus(nth(now, i)).dividedBy(nth(scale, i)));
      const { exponent, mantissas } = scaled(rest);
      const by = solveLinear(matrix, mantissas);
      if (!by) throw new Diverged('no-convergence');
      now = now.map((x, i) =>
        x.plus(new context(nth(by, i) * nth(scale, i)).times(`1e${exponent}`)),
      );
      at = balance.at(now);
      settle();
      const largest = Math.max(...by.map(Math.abs));
      // The derivatives are good to about six digits.
      if (largest === 0 || exponent + Math.log10(largest) - 5 < accuracy + loss / 2) break;
    }
    return { balance, u, at, state: now, iterations };
  };
  return { near, loss, solvedTo };
}
