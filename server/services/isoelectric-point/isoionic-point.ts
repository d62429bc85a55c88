import type { IsoelectricPointAnswer } from '../../../shared/isoelectric-point';
import type { Warning } from '../../../shared/model';
import {
  equilibriumOf,
  settledMixture,
  type SettledMixture,
  strengthFound,
  withoutAnswer,
} from '../mixtures/settled';
import type { ResolvedIsoelectric } from './resolved';

interface Isoionic {
  readonly pH: string;
  readonly conditions: NonNullable<IsoelectricPointAnswer['isoionicConditions']>;
  readonly warnings: readonly Warning[];
}

/** The pure ampholyte in water at its concentration; undefined where none is given. */
export function isoionicSolution({
  system,
  concentration,
  conditions,
  digits,
}: ResolvedIsoelectric): SettledMixture | undefined {
  if (concentration === undefined) return undefined;
  const mixture = {
    components: [
      { system, concentration, form: system.fullyProtonatedCharge, counterIon: undefined },
    ],
    ions: [],
    ionPairs: [],
    conditions,
    digits,
  };
  // The component is the request’s own system: what is said of it points there.
  return settledMixture(mixture, () => '');
}

/**
 * The isoionic point: pH of the pure ampholyte in water at a concentration, by Davies and at the
 * solution’s own ionic strength unless the caller says otherwise.
 */
export function isoionicPoint(solution: SettledMixture, digits: number): Isoionic {
  const found = equilibriumOf(solution.balance);
  const made = found.inDigits(digits);
  if (!made.ok) throw withoutAnswer(made.reason);
  return {
    pH: made.numbers.pH,
    conditions: {
      ionicStrength: made.numbers.ionicStrengthUsed,
      activityModel: solution.conditions.activityModel,
    },
    warnings: strengthFound(solution, found),
  };
}
