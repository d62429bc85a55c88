import type { Conditions } from '../../../shared/conditions';
import { costOf, pointsWorth } from '../../../shared/limits';
import type { ResolvedSystem } from '../chemistry/resolved-system';
import type { ResolvedMixture } from './contents';

/** What one solution of a charge balance is worth by. */
interface Solution {
  readonly systems: readonly ResolvedSystem[];
  /** Ions beside the species of the systems. */
  readonly ions: number;
  readonly activityModel: Conditions['activityModel'];
  readonly digits: number;
}

const { mixture } = pointsWorth;

/** Ions by which a model’s work doubles: each pair of them takes part in every coefficient. */
function pairing(activityModel: Solution['activityModel']): number {
  if (activityModel === 'pitzer') return mixture.pitzerIons;
  return activityModel === 'specific-ion-interaction' ? mixture.interactionIons : Infinity;
}

/**
 * Work of one solution. It is looked for in doubles over ionic strengths, more closely the more
 * protons a system has, whatever digits are asked for.
 */
export function solutionCost({ systems, ions, activityModel, digits }: Solution): number {
  const species = systems.reduce((sum, { pKa }) => sum + pKa.length + 1, ions);
  const protons = Math.max(0, ...systems.map(({ pKa }) => pKa.length));
  const points = mixture.points + mixture.pointsPerProton * protons;
  const once = costOf(points, species + mixture.water, Math.max(digits, mixture.leastDigits));
  return Math.ceil(once * (1 + species / pairing(activityModel)));
}

/** Whether every constant is one that moves with temperature, so that dpH/dT is asked for too. */
const movesWithTemperature = ({ components, ionPairs, conditions }: ResolvedMixture): boolean =>
  ionPairs.length === 0 &&
  conditions?.pKw === undefined &&
  conditions?.activityConstants === undefined &&
  components.every(({ system }) => system.steps.every(({ thermo }) => thermo !== null));

/** Work of a mixture: its solution, and four beside its temperature for dpH/dT. */
export function mixtureCost(request: ResolvedMixture): number {
  const { components, ions, ionPairs, conditions, digits } = request;
  const counterIons = components.filter((one) => 'form' in one).length;
  const solution = {
    systems: components.map(({ system }) => system),
    ions: ions.length + counterIons + 2 * ionPairs.length,
    activityModel: conditions?.activityModel,
  };
  const beside = movesWithTemperature(request) ? 4 : 0;
  return (
    solutionCost({ ...solution, digits }) +
    beside * solutionCost({ ...solution, digits: mixture.leastDigits })
  );
}
