import type { DrawnCurve } from './drawn-curve';

/** What a curve holds for, each part as it is written. */
export interface Conditions {
  /** °C. */
  readonly temperature: string;
  /** mol/L; undefined where no constant's medium is stated. */
  readonly ionicStrength: string | undefined;
  readonly model: 'ideal' | 'as given';
}

const distinct = (values: readonly string[]) => [...new Set(values)].join(', ');

/**
 * The model is ideal, at 25 °C. Constants that were measured in a medium or at another temperature
 * are drawn as given, and the curve holds there.
 */
export function conditionsOf({ constants, answer }: DrawnCurve): Conditions {
  const { temperature, ionicStrength } = answer.model.conditions;
  const isOfModel = constants.every(
    (constant) =>
      constant.kind === 'thermodynamic' && Number(constant.temperature) === Number(temperature),
  );
  if (isOfModel) return { temperature, ionicStrength, model: 'ideal' };
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
