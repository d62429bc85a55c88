import { modelInShort } from '../conditions/activity-models';
import type { DrawnCurve } from './drawn-curve';

/** What a curve holds for, each part as it is written. */
export interface CurveHoldsFor {
  /** °C. */
  readonly temperature: string;
  /** mol/L; undefined where no constant's medium is stated. */
  readonly ionicStrength: string | undefined;
  /** The activity model, or `as given`. */
  readonly model: string;
}

const distinct = (values: readonly string[]) => [...new Set(values)].join(', ');

/**
 * The conditions of the answer; but where its constants were used as given, measured in a medium or
 * at another temperature, the curve holds there, and nothing else is said of it.
 */
export function conditionsOf({ constants, answer }: DrawnCurve): CurveHoldsFor {
  const { temperature, ionicStrength, activityModel } = answer.model.conditions;
  const codes = new Set(answer.model.warnings.map(({ code }) => code));
  const elsewhere = constants.some(
    (constant) => Number(constant.temperature) !== Number(temperature),
  );
  const isDefault =
    activityModel === 'ideal' && Number(ionicStrength) === 0 && temperature === '25';
  const asGiven =
    codes.has('constants-at-their-medium') ||
    (isDefault && elsewhere && codes.has('pka-not-temperature-corrected'));
  if (!asGiven) return { temperature, ionicStrength, model: modelInShort(activityModel) };
  const media = constants.flatMap((constant) => constant.ionicStrength ?? []);
  return {
    temperature: distinct(constants.map((constant) => constant.temperature)),
    ionicStrength: media.length === 0 ? undefined : distinct(media),
    model: 'as given',
  };
}

/** The conditions as plain text, for files. */
export function conditionsText(drawn: DrawnCurve): string {
  const { temperature, ionicStrength, model } = conditionsOf(drawn);
  return `${temperature} °C · I ${afterI(ionicStrength)} · ${model}`;
}

/** What follows the sign of ionic strength. */
export const afterI = (ionicStrength: string | undefined) =>
  ionicStrength === undefined ? 'not stated' : `= ${ionicStrength}`;
