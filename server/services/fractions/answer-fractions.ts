import { computeUnitsOf } from '../../../shared/limits';
import type {
  DryRunAnswer,
  FractionsAnswer,
  FractionsRequest,
  ManyFractionsAnswer,
  SystemFractions,
} from '../../../shared/fractions';
import type { SystemInFull } from '../../../shared/system';
import { effectivePKa, fractionPoints, predominanceRanges, speciesOf } from '../../chem';
import { fractionsCost, systemsOf } from './cost';
import { modelOf, warningsOf } from './model';
import { pointsOf } from './points';

type Answer = FractionsAnswer | ManyFractionsAnswer | DryRunAnswer;

const named = (system: SystemInFull) => (system.name === undefined ? {} : { name: system.name });

function ofOneSystem(system: SystemInFull, request: FractionsRequest): SystemFractions {
  const { digits } = request;
  return {
    ...named(system),
    species: speciesOf(system),
    effectivePKa: effectivePKa(system, digits),
    points: fractionPoints(system, pointsOf(request.pH), digits),
    predominance: predominanceRanges(system, digits),
  };
}

/** Species fractions of one system or several, or what they would cost. */
export function answerFractions(request: FractionsRequest): Answer {
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
