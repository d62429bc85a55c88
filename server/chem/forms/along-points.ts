import type Decimal from 'decimal.js';
import { Composition, type Factors, factorsOf, termsAt } from './composition';
import { Exact } from '../decimals/contexts';
import { anchorEvery, type Plan } from './plan';
import { type PHPoints, valuesOf } from './ph-points';
import { powerOfTen } from '../decimals/powers-of-ten';
import type { Refinable } from './settle';
import { type AcidBaseSystem, constantsOf } from './system';

/** 10^(j·step) for j = 1…n. */
function strides({ context, constants }: Factors, step: string): Decimal[] {
  const stride = powerOfTen(context, new Exact(step));
  const powers = [stride];
  while (powers.length < constants.length) powers.push(stride.times(powers.at(-1) ?? 1));
  return powers;
}

/**
 * Terms at one point after the other. Along a grid t_j is the last times 10^(j·step), made afresh
 * every `anchorEvery` points so that errors do not grow with the grid.
 */
function termsAlong(factors: Factors, points: PHPoints): (pH: Decimal, i: number) => Decimal[] {
  if (points.kind === 'list') return (pH) => termsAt(factors, pH);
  let steps: Decimal[] | undefined;
  let last: Decimal[] = [];
  return (pH, i) => {
    if (i % anchorEvery === 0) {
      last = termsAt(factors, pH);
    } else {
      const by = (steps ??= strides(factors, points.step));
      last = last.map((term, j) => term.times(by[j] ?? 1));
    }
    return last;
  };
}

/**
 * What `answer` makes of a system's composition at each point, in order. Level 0 of a composition has
 * the planned precision, each further level that `answer` asks for twice as many digits. A pH that a
 * list repeats is answered once, because raising precision can be dear.
 */
export function alongPoints<T>(
  system: AcidBaseSystem,
  points: PHPoints,
  { precision, loss }: Plan,
  answer: (point: Refinable) => T,
): T[] {
  const constants = constantsOf(system);
  const levels: Factors[] = [];
  const factorsAt = (level: number) =>
    (levels[level] ??= factorsOf(constants, precision * 2 ** level));

  const planned = factorsAt(0);
  const termsOf = termsAlong(planned, points);
  const answerAt = (pH: Decimal, i: number) => {
    const made = [new Composition(planned, termsOf(pH, i))];
    const at = (level: number) =>
      (made[level] ??= new Composition(factorsAt(level), termsAt(factorsAt(level), pH)));
    return answer({ pH, at, loss });
  };

  if (points.kind === 'grid') return valuesOf(points).map(answerAt);
  const known = new Map<string, T>();
  return valuesOf(points).map((pH, i) => {
    const key = pH.toString();
    const value = known.get(key) ?? answerAt(pH, i);
    known.set(key, value);
    return value;
  });
}
