import { costOf, limits } from '../../shared/limits';
import { capacityDigits } from './mixture-request';

/** What a capacity curve is drawn over at least; beyond it water hides everything else. */
const usual = [1, 13] as const;
const steps = ['0.05', '0.1', '0.2'] as const;
const lowest = Number(limits.pH.from);
const highest = Number(limits.pH.to);

/** 1 to 13, widened to the whole number that leaves one unit beside an outlying pH. */
export const rangeAround = (pH: string): readonly [number, number] => [
  Math.max(lowest, Math.min(usual[0], Math.floor(Number(pH) - 1))),
  Math.min(highest, Math.max(usual[1], Math.ceil(Number(pH) + 1))),
];

/** The grid of a curve over so many species: the finest step within the public cost. */
export function capacityGrid([from, to]: readonly [number, number], species: number) {
  const points = (step: string) => Math.round((to - from) / Number(step)) + 1;
  const step =
    steps.find((size) => costOf(points(size), species, capacityDigits) <= limits.publicCost) ??
    '0.5';
  return { from: String(from), to: String(to), step };
}
