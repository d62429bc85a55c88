import { nth } from '../decimals/nth';
import { settleAll, significant } from '../decimals/settle-all';
import { labelsOf, type PHPoints, valuesOf } from '../forms/ph-points';
import { capacityAtPH, capacityLoss } from './capacity-at';
import type { BufferSolution } from './solution';

/** Buffer capacity at one pH, mol/L per pH. */
export interface BufferCapacityPoint {
  /** As asked. */
  pH: string;
  total: string;
  water: string;
  components: string[];
}

/**
 * Buffer capacity β = dQ/dpH of a solution and its parts at each pH, in the order asked, to `digits`
 * (1–60) significant digits, each rounded half-even; see `capacityAt`.
 */
export function bufferCapacityPoints(
  solution: BufferSolution,
  points: PHPoints,
  digits: number,
): BufferCapacityPoint[] {
  const capacity = capacityAtPH(solution);
  const loss = capacityLoss(solution);
  const form = significant(digits);
  const labels = labelsOf(points);
  return valuesOf(points).map((pH, i) => {
    const [total = '', water = '', ...components] = settleAll({
      digits,
      loss,
      at: (precision) => {
        const found = capacity(pH, precision);
        return [found.total, found.water, ...found.components].map((value) => ({ value, form }));
      },
    });
    return { pH: nth(labels, i), total, water, components };
  });
}
