import { Exact } from '../../../shared/decimal';
import type { DryRunAnswer } from '../../../shared/dry-run';
import { costOf, pointsWorth } from '../../../shared/limits';
import type { PHForFractionAnswer, PHForFractionRequest } from '../../../shared/ph-for-fraction';
import { effectiveSystem, pHForFraction } from '../../chem';
import { dryRunOf } from '../compute/dry-run';
import { conditionsUsed, idealDefaults } from '../chemistry/conditions-used';
import { modelOf } from '../chemistry/model';
import { strengthWarnings, withoutComposition } from '../chemistry/ranges';
import { misfit, noAnswer } from '../chemistry/refuse';
import { type ResolvedSystem, resolvedSystem } from '../chemistry/resolved-system';
import { systemUsed } from '../chemistry/system-used';
import type { Question } from '../compute/question';

type Resolved = Omit<PHForFractionRequest, 'system'> & { readonly system: ResolvedSystem };

const cost = ({ system, digits }: Resolved): number =>
  costOf(pointsWorth.root, system.pKa.length + 1, digits);

function answer(request: Resolved): PHForFractionAnswer | DryRunAnswer {
  const { species, fraction, digits } = request;
  const conditions = conditionsUsed(request.conditions, idealDefaults);
  withoutComposition(conditions);
  const range = strengthWarnings(conditions);
  const used = systemUsed(request.system, conditions, '/system');
  const warnings = [...range, ...used.warnings];
  if (request.dryRun) return dryRunOf(cost(request), warnings);
  const asked = new Exact(fraction);
  if (!asked.greaterThan(0) || !asked.lessThan(1)) {
    const detail = 'A fraction is reached at a pH only between 0 and 1, both excluded.';
    throw noAnswer('fraction-not-reached', '/fraction', detail);
  }
  const system = effectiveSystem(used.inMedium, conditions.activity);
  const found = pHForFraction({ system, species, fraction, digits });
  if (!found.ok) {
    const most = asked.greaterThan(found.most) ? found.most : 'just less than that';
    const detail = `Species ${species} never reaches a fraction of ${fraction}: the most is ${most}, at pH ${found.pH}.`;
    throw noAnswer('fraction-not-reached', '/fraction', detail);
  }
  return {
    solutions: [...found.solutions],
    model: modelOf({ digits, conditions, systems: [used], withWater: false, warnings }),
  };
}

/** The pH at which a species has a fraction. */
export const pHForFractionQuestion: Question<PHForFractionRequest, Resolved> = {
  systemsOf: ({ system }) => [system],
  resolved: (request, found) => {
    const system = resolvedSystem(request.system, '/system', found);
    if (request.species > system.pKa.length) {
      const detail = `The system has the species 0 to ${system.pKa.length}.`;
      throw misfit('no-such-species', '/species', detail);
    }
    return { ...request, system };
  },
  cost,
  answer,
};
