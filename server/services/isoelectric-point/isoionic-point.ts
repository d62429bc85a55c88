import type { IsoelectricPointAnswer } from '../../../shared/isoelectric-point';
import type { Warning } from '../../../shared/model';
import { rangeWarnings } from '../chemistry/ranges';
import { equilibriumOf, settledMixture, withoutAnswer } from '../mixtures/settled';
import type { ResolvedIsoelectric } from './resolved';

interface Isoionic {
  readonly pH: string;
  readonly conditions: NonNullable<IsoelectricPointAnswer['isoionicConditions']>;
  readonly warnings: readonly Warning[];
}

/**
 * The isoionic point: pH of the pure ampholyte in water at a concentration, by Davies and at the
 * solution’s own ionic strength unless the caller says otherwise. Undefined without a concentration.
 */
export function isoionicPoint({
  system,
  concentration,
  conditions,
  digits,
}: ResolvedIsoelectric): Isoionic | undefined {
  if (concentration === undefined) return undefined;
  const mixture = settledMixture({
    components: [
      { system, concentration, form: system.fullyProtonatedCharge, counterIon: undefined },
    ],
    ions: [],
    ionPairs: [],
    conditions,
    digits,
  });
  const found = equilibriumOf(mixture.balance);
  const made = found.inDigits(digits);
  if (!made.ok) throw withoutAnswer(made.reason);
  const given = mixture.balance.activity.ionicStrength;
  const used = given === 'self-consistent' ? found.ionicStrength : Number(given);
  return {
    pH: made.numbers.pH,
    conditions: {
      ionicStrength: made.numbers.ionicStrengthUsed,
      activityModel: mixture.conditions.activityModel,
    },
    warnings: [...mixture.warnings, ...rangeWarnings(mixture.conditions, used)],
  };
}
