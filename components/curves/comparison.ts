import { Exact } from '../../shared/decimal';
import { systemTitle } from '../handbook/system-title';
import { modelInShort } from '../conditions/activity-models';
import type { DrawnCurve } from './drawn-curve';
import { trueMinus } from './rounded';

/** How far a curve beside has moved from the first one; both are drawn over one grid. */
export interface Shift {
  /** pK′ beside less pK′ of the first, constant by constant. */
  readonly constants: readonly string[];
  /** The form whose fraction differs most, by how much, and where. */
  readonly largest: { readonly index: number; readonly change: number; readonly pH: number };
}

/** Two curves of the same forms, whatever they are called: only then do shifts mean something. */
export const haveSameForms = (first: DrawnCurve, beside: DrawnCurve): boolean =>
  first.formulas.length === beside.formulas.length &&
  first.formulas.every((formula, i) => formula === beside.formulas[i]);

/** Three decimals with a sign; zero has none. */
const signed = (difference: InstanceType<typeof Exact>) => {
  const text = difference.toFixed(3);
  return Number(text) === 0 ? '0.000' : trueMinus(Number(text) > 0 ? `+${text}` : text);
};

/** How far the curves of the same forms have moved. */
export function shiftOf(first: DrawnCurve, beside: DrawnCurve): Shift {
  let largest: Shift['largest'] = { index: 0, change: 0, pH: first.curve.pH[0] ?? 0 };
  for (const [index, alphas] of beside.curve.fractions.entries()) {
    for (const [i, alpha] of alphas.entries()) {
      const change = alpha - (first.curve.fractions[index]?.[i] ?? 0);
      if (Math.abs(change) > Math.abs(largest.change)) {
        largest = { index, change, pH: first.curve.pH[i] ?? 0 };
      }
    }
  }
  return {
    constants: beside.answer.effectivePKa.map((effective, i) =>
      signed(new Exact(effective).minus(first.answer.effectivePKa[i] ?? effective)),
    ),
    largest,
  };
}

const titleOf = ({ system }: DrawnCurve) => systemTitle(system.name ?? 'Your constants');

/**
 * What sets a curve beside apart from the first, in short: `I 0.15 · 37 °C`. The model is
 * said where both hold at an ionic strength: elsewhere every model is the ideal one.
 */
export function differenceName(first: DrawnCurve, beside: DrawnCurve): string {
  const [a, b] = [first.asked.conditions, beside.asked.conditions];
  // At I = 0 every model is the ideal one.
  const noSalt = [a, b].some(({ ionicStrength }) => Number(ionicStrength) === 0);
  const parts = [
    haveSameForms(first, beside) ? undefined : titleOf(beside),
    Number(a.ionicStrength) === Number(b.ionicStrength) ? undefined : `I ${b.ionicStrength}`,
    Number(a.temperature) === Number(b.temperature) ? undefined : `${b.temperature} °C`,
    a.activityModel === b.activityModel || noSalt ? undefined : modelInShort(b.activityModel),
  ].filter((part) => part !== undefined);
  return parts.length === 0 ? `${titleOf(beside)}, the same` : parts.join(' · ');
}
