import type { DryRunAnswer } from '../../../shared/dry-run';
import type {
  IsoelectricPointAnswer,
  IsoelectricPointRequest,
} from '../../../shared/isoelectric-point';
import { computeUnitsOf, costOf, pointsWorth } from '../../../shared/limits';
import { effectiveSystem, isoelectricPoint } from '../../chem';
import { conditionsUsed, idealDefaults } from '../chemistry/conditions-used';
import { modelOf } from '../chemistry/model';
import { rangeWarnings, withoutComposition } from '../chemistry/ranges';
import { noAnswer } from '../chemistry/refuse';
import { resolvedSystem } from '../chemistry/resolved-system';
import { systemUsed } from '../chemistry/system-used';
import type { Question } from '../compute/question';
import { isoionicPoint } from './isoionic-point';
import type { ResolvedIsoelectric } from './resolved';

/** Whoever asks without a key has no dry run. */
type Asked = Omit<IsoelectricPointRequest, 'dryRun'> & { readonly dryRun?: boolean };

const cost = ({ system, concentration, digits }: ResolvedIsoelectric): number => {
  const points = pointsWorth.root + (concentration === undefined ? 0 : pointsWorth.mixture);
  return costOf(points, system.pKa.length + 1, digits);
};

const signs = {
  'charge-stays-positive': 'No isoelectric point: the charge stays positive at every pH.',
  'charge-stays-negative': 'No isoelectric point: the charge stays negative at every pH.',
} as const;

function answer(request: ResolvedIsoelectric): IsoelectricPointAnswer | DryRunAnswer {
  const { digits, system } = request;
  const conditions = conditionsUsed(request.conditions, idealDefaults);
  withoutComposition(conditions);
  const range = rangeWarnings(conditions, Number(conditions.ionicStrength));
  const used = systemUsed(system, conditions, '/system');
  const warnings = [...range, ...used.warnings];
  if (request.dryRun) {
    const all = cost(request);
    return { dryRun: true, cost: all, computeUnits: computeUnitsOf(all), warnings };
  }
  const found = isoelectricPoint(effectiveSystem(used.inMedium, conditions.activity), digits);
  if (!found.ok) throw noAnswer(found.reason, '/system', signs[found.reason]);
  const isoionic = isoionicPoint(request);
  const told = new Set(warnings.map(({ message }) => message));
  const more = isoionic?.warnings.filter(({ message }) => !told.has(message)) ?? [];
  return {
    isoelectricPoint: found.pH,
    slope: found.slope,
    species: found.fractions.map((fraction, index) => ({
      index,
      charge: system.fullyProtonatedCharge - index,
      ...(system.formulas ? { formula: system.formulas[index] ?? null } : {}),
      fraction,
    })),
    isoionicPoint: isoionic?.pH ?? null,
    isoionicConditions: isoionic?.conditions ?? null,
    model: modelOf({
      digits,
      conditions,
      systems: [used],
      withWater: isoionic !== undefined,
      warnings: [...warnings, ...more],
    }),
  };
}

/** Where a system carries no net charge, and the pH of the pure ampholyte in water. */
export const isoelectricPointQuestion: Question<Asked, ResolvedIsoelectric> = {
  systemsOf: ({ system }) => [system],
  resolved: (request, found) => ({
    ...request,
    system: resolvedSystem(request.system, '/system', found),
  }),
  cost,
  answer,
};
