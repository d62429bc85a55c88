import type { Warning } from '../../../shared/model';
import { type Balance, equilibrium, type Equilibrium } from '../../chem';
import { type ConditionsUsed, conditionsUsed, mixtureDefaults } from '../chemistry/conditions-used';
import { rangeWarnings } from '../chemistry/ranges';
import { noAnswer } from '../chemistry/refuse';
import { type SystemUsed, systemUsed } from '../chemistry/system-used';
import { type AtTemperature, balanceOf, henryConstantAt } from './balance-of';
import { type Contents, contentsOf, type ResolvedMixture } from './contents';
import { ionWarnings } from './ion-warnings';

/** A mixture ready to be computed, and where its constants come from. */
export interface SettledMixture {
  readonly contents: Contents;
  readonly conditions: ConditionsUsed;
  readonly systems: readonly SystemUsed[];
  readonly at: AtTemperature;
  readonly balance: Balance;
  /** Warnings that do not wait for the composition. */
  readonly warnings: readonly Warning[];
}

/** Carbon dioxide’s solubility is known from 0 to 90 °C. */
const gasesTo = 90;

/**
 * Everything about a mixture but its equilibrium; `placeOf` a component is where the request has it.
 * Refused where its parts do not fit.
 */
export function settledMixture(
  request: ResolvedMixture,
  placeOf?: (index: number) => string,
): SettledMixture {
  const conditions = conditionsUsed(request.conditions, mixtureDefaults);
  const { activityModel, ionicStrength, temperature } = conditions;
  const byInteractions = activityModel === 'specific-ion-interaction' || activityModel === 'pitzer';
  if (byInteractions && ionicStrength !== 'self-consistent') {
    const detail =
      'This model finds its activity coefficients from the ions present: leave the ionic strength out.';
    throw noAnswer('model-needs-composition', '/conditions/ionicStrength', detail);
  }
  const contents = contentsOf(request, placeOf);
  const systems = contents.components.map(({ system, place }) =>
    systemUsed(system, conditions, `${place}/system`),
  );
  const at: AtTemperature = {
    pKw: conditions.pKw,
    activity: conditions.activity,
    systems: systems.map(({ inMedium }) => inMedium),
    henry: ({ henryConstant, place }) => {
      if (henryConstant === undefined && Number(temperature) > gasesTo) {
        const detail = `The solubility of carbon dioxide is known to ${gasesTo} °C: give it for more.`;
        throw noAnswer('henry-constant-needed', `${place}/heldBy/henryConstant`, detail);
      }
      return henryConstant ?? henryConstantAt(temperature);
    },
  };
  const warnings: Warning[] = systems.flatMap((used) => used.warnings);
  warnings.push(...ionWarnings(contents, conditions));
  if (ionicStrength !== 'self-consistent') {
    warnings.push(...rangeWarnings(conditions, Number(ionicStrength)));
  }
  if (byInteractions && Number(temperature) !== 25) {
    const message = `Ion-specific parameters are those of 25 °C; only A is that of ${temperature} °C.`;
    const pointer = '/conditions/temperature';
    warnings.push({ code: 'parameters-of-another-temperature', message, pointer });
  }
  return { contents, conditions, systems, at, balance: balanceOf(contents, at), warnings };
}

/** Why a balance has no answer, in the trade’s words. */
export const withoutAnswer = (reason: 'no-ionic-strength' | 'no-convergence') =>
  noAnswer(
    reason,
    '/conditions/activityModel',
    reason === 'no-ionic-strength'
      ? 'No ionic strength fits this composition by this model: it is far outside the model’s range.'
      : 'The activity coefficients of this composition do not settle by this model: it is far outside the model’s range.',
  );

/** What to say of the ionic strength that a mixture turned out to have; a given one is settled. */
export const strengthFound = (
  { conditions }: SettledMixture,
  { ionicStrength }: Equilibrium,
): Warning[] =>
  conditions.ionicStrength === 'self-consistent' ? rangeWarnings(conditions, ionicStrength) : [];

/** The equilibrium of a balance. Refused with its reason where there is none. */
export function equilibriumOf(balance: Balance): Equilibrium {
  const found = equilibrium(balance);
  if (!found.ok) throw withoutAnswer(found.reason);
  return found;
}
