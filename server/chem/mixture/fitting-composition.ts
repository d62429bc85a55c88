import { nth } from '../decimals/nth';
import type { Balance } from './balance';
import { fittingStrengths } from './continuation';
import { DoubleBalance } from './double-balance';
import { jacobianOfRest, solveLinear } from './jacobian';

export type FittingComposition =
  | { readonly ok: true; readonly state: readonly number[] }
  | { readonly ok: false; readonly reason: 'no-convergence' | 'no-ionic-strength' };

const mostSweeps = 60;
const mostNewtonSteps = 12;
/** Concentration below which a change of it says nothing, mol/L. */
export const trifle = 1e-30;

const apart = (one: readonly number[], other: readonly number[]) =>
  one.reduce(
    (most, value, i) =>
      Math.max(most, Math.abs(value - nth(other, i)) / (Math.abs(value) + trifle)),
    0,
  );

/**
 * The composition whose activity coefficients, by ion-specific parameters, lead back to itself, in
 * doubles: from the composition by Güntelberg’s model at its smallest ionic strength, by repetition,
 * then by Newton’s method.
 */
export function fittingComposition(balance: Balance, doubles: DoubleBalance): FittingComposition {
  const activity = {
    ...balance.activity,
    model: 'guntelberg',
    ionicStrength: 'self-consistent',
  } as const;
  const plain = { ...balance, activity };
  const plainDoubles = new DoubleBalance(plain);
  const strengths = fittingStrengths(plain, plainDoubles);
  if (!strengths.ok) return strengths;
  let { molalities: state, lnU } = plainDoubles.solve([nth(strengths.values, 0)]);

  const map = (x: readonly number[]): readonly number[] => {
    const { state: next, solution } = doubles.next(x, lnU);
    lnU = solution.lnU;
    return next;
  };
  let distance = Infinity;
  for (let sweep = 0; sweep < mostSweeps && distance > 1e-8; sweep++) {
    const next = map(state);
    if (!next.every(Number.isFinite)) return { ok: false, reason: 'no-convergence' };
    const change = apart(next, state);
    // Where plain repetition swings or runs away, half a step is taken.
    state = change > distance / 2 ? next.map((x, i) => (x + nth(state, i)) / 2) : next;
    distance = change;
  }
  for (let step = 0; step < mostNewtonSteps; step++) {
    const next = map(state);
    if (!next.every(Number.isFinite)) return { ok: false, reason: 'no-convergence' };
    if (apart(next, state) < 1e-13) return { ok: true, state: next };
    const rest = next.map((x, i) => x - nth(state, i));
    const by = solveLinear(jacobianOfRest(map, state, trifle), rest);
    if (!by) return { ok: false, reason: 'no-convergence' };
    // A concentration stays positive: at most nine tenths of it are taken away.
    state = state.map((x, i) => Math.max(x + nth(by, i), x / 10));
  }
  const last = map(state);
  return apart(last, state) < 1e-9
    ? { ok: true, state: last }
    : { ok: false, reason: 'no-convergence' };
}
