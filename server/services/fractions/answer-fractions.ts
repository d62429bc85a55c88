import { computeUnitsOf } from '../../../shared/limits';
import type { DryRunAnswer } from '../../../shared/dry-run';
import type {
  FractionsAnswer,
  ManyFractionsAnswer,
  SystemFractions,
} from '../../../shared/fractions';
import type { Species } from '../../../shared/species';
import { effectivePKa, fractionPoints, predominanceRanges, speciesOf } from '../../chem';
import { fractionsCost, systemsOf } from './cost';
import { modelOf } from './model';
import { pointsOf } from './points';
import type { ResolvedRequest, ResolvedSystem } from './resolve';
import { warningsOf } from './warnings';

type Answer = FractionsAnswer | ManyFractionsAnswer | DryRunAnswer;

const named = ({ name }: ResolvedSystem) => (name === undefined ? {} : { name });

/** The forms, with their formulas where the system is a stored one. */
const formsOf = (system: ResolvedSystem): Species[] =>
  speciesOf(system).map((form) =>
    system.stored ? { ...form, formula: system.stored.formulas[form.index] ?? null } : form,
  );

function ofOneSystem(system: ResolvedSystem, request: ResolvedRequest): SystemFractions {
  const { digits } = request;
  return {
    ...named(system),
    species: formsOf(system),
    effectivePKa: effectivePKa(system, digits),
    points: fractionPoints(system, pointsOf(request.pH), digits),
    predominance: predominanceRanges(system, digits),
  };
}

/** Species fractions of one system or several, or what they would cost. */
export function answerFractions(request: ResolvedRequest): Answer {
  if (request.dryRun) {
    const cost = fractionsCost(request);
    return {
      dryRun: true,
      cost,
      computeUnits: computeUnitsOf(cost),
      warnings: warningsOf(request),
    };
  }
  const model = modelOf(request);
  if (request.system !== undefined) return { ...ofOneSystem(request.system, request), model };
  return { items: systemsOf(request).map((system) => ofOneSystem(system, request)), model };
}
