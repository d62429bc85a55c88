import { costOf, limits } from '../../shared/limits';

/** A pH grid as the contract takes it. */
export interface CurveGrid {
  readonly from: string;
  readonly to: string;
  readonly step: string;
}

/** Digits of a curve: more than a screen can show, few enough to be quick. */
export const curveDigits = 6;

const steps = ['0.02', '0.05', '0.1'] as const;
const pointsAtMost = 701;

/** What the contract takes. */
export const widestRange = [Number(limits.pH.from), Number(limits.pH.to)] as const;
const [lowest, highest] = widestRange;

/**
 * The pH range a system is drawn over: 0 to 14 at least, widened to the whole number that leaves
 * one unit beside an outlying constant, within the contract's −20…40.
 */
export function rangeOf(pKa: readonly string[]): readonly [number, number] {
  const values = pKa.map(Number);
  return [
    Math.max(lowest, Math.min(0, Math.floor(Math.min(...values) - 1))),
    Math.min(highest, Math.max(14, Math.ceil(Math.max(...values) + 1))),
  ];
}

/** The grid of a curve: the finest step that keeps within about 700 points and the public cost. */
export function gridOf(pKa: readonly string[]): CurveGrid {
  const [from, to] = rangeOf(pKa);
  const points = (step: string) => Math.round((to - from) / Number(step)) + 1;
  const step =
    steps.find(
      (size) =>
        points(size) <= pointsAtMost &&
        costOf(points(size), pKa.length + 1, curveDigits) <= limits.publicCost,
    ) ?? '0.1';
  return { from: String(from), to: String(to), step };
}
