import type { DryRunAnswer } from '../../../shared/dry-run';
import { computeUnitsOf } from '../../../shared/limits';
import type { Warning } from '../../../shared/model';

/** What a call would cost and warn of, in place of its answer. */
export const dryRunOf = (cost: number, warnings: readonly Warning[]): DryRunAnswer => ({
  dryRun: true,
  cost,
  computeUnits: computeUnitsOf(cost),
  warnings: [...warnings],
});
