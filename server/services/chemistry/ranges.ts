import type { Warning } from '../../../shared/model';
import { largestCharge, type SizedIon, usableTo } from '../../chem';
import type { ConditionsUsed } from './conditions-used';
import { noAnswer } from './refuse';

/** The models in a chemist’s words. */
const names: Readonly<Record<ConditionsUsed['activityModel'], string>> = {
  ideal: 'The ideal model',
  'debye-huckel': 'The Debye–Hückel limiting law',
  'extended-debye-huckel': 'The extended Debye–Hückel equation',
  guntelberg: 'Güntelberg’s equation',
  davies: 'Davies’s equation',
  'specific-ion-interaction': 'The specific ion interaction model',
  pitzer: 'Pitzer’s model',
};

const pointer = '/conditions/activityModel';

/** As good as at the end of a range: the last ion of a 0.1 mol/L buffer is no reason to warn. */
const hair = 1.001;

/**
 * What to say of an ionic strength by a model. Refused with `outside-model-range` beyond twice the
 * range, unless the caller says compute.
 */
export function rangeWarnings(
  { activityModel, outOfRange, basis, ionicStrength: asked }: ConditionsUsed,
  ionicStrength: number,
): Warning[] {
  const end = usableTo(activityModel);
  if (end === undefined || ionicStrength <= Number(end) * hair) return [];
  const shown = asked === 'self-consistent' ? Number(ionicStrength.toPrecision(3)) : asked;
  const message = `${names[activityModel]} is good to I = ${end} ${basis}; here I = ${shown} ${basis}.`;
  if (ionicStrength > 2 * Number(end) && outOfRange === 'refuse') {
    const help = 'Choose a model that reaches further, or "outOfRange": "compute".';
    throw noAnswer('outside-model-range', pointer, `${message} ${help}`);
  }
  return [{ code: 'outside-model-range', message, pointer }];
}

/**
 * The same of charges: |z| ≤ 6 in any model but the ideal one. Pitzer’s model is not asked beyond at
 * all: its mixing terms grow with z⁴, and with them the work.
 */
export function chargeWarnings(
  { activityModel, outOfRange }: ConditionsUsed,
  species: readonly SizedIon[],
  place: string,
): Warning[] {
  const highest = Math.max(...species.map(({ charge }) => Math.abs(charge)));
  if (activityModel === 'ideal' || highest <= largestCharge) return [];
  const message = `A charge of ${highest} is beyond any activity model here: they are trusted to ${largestCharge}.`;
  const isPitzer = activityModel === 'pitzer';
  if (outOfRange === 'refuse' || isPitzer) {
    const help = `Ask for "activityModel": "ideal"${isPitzer ? '' : ', or "outOfRange": "compute"'}.`;
    throw noAnswer('charge-beyond-model', place, `${message} ${help}`);
  }
  return [{ code: 'charge-beyond-model', message, pointer: place }];
}

/** Models whose coefficients follow from the composition cannot answer without one. */
export function withoutComposition({ activityModel, ionicStrength }: ConditionsUsed): void {
  if (activityModel === 'specific-ion-interaction' || activityModel === 'pitzer') {
    const detail = `${names[activityModel]} needs every ion in the solution: ask /v1/mixtures.`;
    throw noAnswer('model-needs-composition', pointer, detail);
  }
  if (ionicStrength === 'self-consistent') {
    const detail =
      'A self-consistent ionic strength needs a composition: give a value here, or ask /v1/mixtures.';
    throw noAnswer('model-needs-composition', '/conditions/ionicStrength', detail);
  }
}

/** What to say of a given ionic strength: beyond a range, or none at all, which is the ideal solution. */
export function strengthWarnings(conditions: ConditionsUsed): Warning[] {
  const { activityModel, ionicStrength } = conditions;
  if (activityModel === 'ideal' || Number(ionicStrength) !== 0) {
    return rangeWarnings(conditions, Number(ionicStrength));
  }
  const message = `${names[activityModel]} at I = 0 is the ideal solution: give the ionic strength that you mean.`;
  return [{ code: 'no-ionic-strength-given', message, pointer: '/conditions/ionicStrength' }];
}
