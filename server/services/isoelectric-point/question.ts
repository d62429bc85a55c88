import type { DryRunAnswer } from '../../../shared/dry-run';
import type {
  IsoelectricPointAnswer,
  IsoelectricPointRequest,
} from '../../../shared/isoelectric-point';
import type { Warning } from '../../../shared/model';
import { costOf, pointsWorth } from '../../../shared/limits';
import { effectiveSystem, isoelectricPoint } from '../../chem';
import { dryRunOf } from '../compute/dry-run';
import { conditionsUsed, idealDefaults } from '../chemistry/conditions-used';
import { modelOf } from '../chemistry/model';
import { strengthWarnings, withoutComposition } from '../chemistry/ranges';
import { noAnswer } from '../chemistry/refuse';
import { resolvedSystem } from '../chemistry/resolved-system';
import { systemUsed } from '../chemistry/system-used';
import { solutionCost } from '../mixtures/cost';
import type { Question } from '../compute/question';
import { isoionicPoint, isoionicSolution } from './isoionic-point';
import type { ResolvedIsoelectric } from './resolved';

/** Whoever asks without a key has no dry run. */
type Asked = Omit<IsoelectricPointRequest, 'dryRun'> & { readonly dryRun?: boolean };

const cost = ({ system, concentration, digits }: ResolvedIsoelectric): number => {
  const isoelectric = costOf(pointsWorth.root, system.pKa.length + 1, digits);
  if (concentration === undefined) return isoelectric;
  const isoionic = { systems: [system], ions: 0, activityModel: undefined, digits };
  return isoelectric + solutionCost(isoionic);
};

const signs = {
  'charge-stays-positive': 'No isoelectric point: the charge stays positive at every pH.',
  'charge-stays-negative': 'No isoelectric point: the charge stays negative at every pH.',
} as const;

/** Warnings told before, and others that are not told yet. */
const withOthers = (told: readonly Warning[], others: readonly Warning[] = []): Warning[] => {
  const messages = new Set(told.map(({ message }) => message));
  return [...told, ...others.filter(({ message }) => !messages.has(message))];
};

function answer(request: ResolvedIsoelectric): IsoelectricPointAnswer | DryRunAnswer {
  const { digits, system } = request;
  const conditions = conditionsUsed(request.conditions, idealDefaults);
  withoutComposition(conditions);
  const range = strengthWarnings(conditions);
  const used = systemUsed(system, conditions, '/system');
  const { fullyProtonatedCharge: highest, pKa } = system;
  const hasNeutralForm = highest > 0 && highest < pKa.length;
  const solution = hasNeutralForm ? isoionicSolution(request) : undefined;
  const warnings = withOthers([...range, ...used.warnings], solution?.warnings);
  if (request.dryRun) return dryRunOf(cost(request), warnings);
  const found = isoelectricPoint(effectiveSystem(used.inMedium, conditions.activity), digits);
  if (!found.ok) throw noAnswer(found.reason, '/system', signs[found.reason]);
  const isoionic = solution && isoionicPoint(solution, digits);
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
      warnings: withOthers(warnings, isoionic?.warnings),
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
