import type { Conditions, OutOfRange } from '../../shared/conditions';
import { ionicStrengthAsked, temperatureAsked } from '../conditions/asked-quantities';
import { typedQuantity, type AskedQuantity } from '../conditions/typed-quantity';
import type { Pair } from '../fragment/pairs';

/** Activity models that one system can be drawn with: the others need every ion in the solution. */
export const curveModels = [
  'ideal',
  'debye-huckel',
  'extended-debye-huckel',
  'guntelberg',
  'davies',
] as const;
export type CurveModel = (typeof curveModels)[number];

/** What a curve is asked for. */
export interface CurveConditions {
  /** °C. */
  readonly temperature: string;
  /** mol/L. */
  readonly ionicStrength: string;
  readonly activityModel: CurveModel;
  /** Whether a curve beyond what its model or its constants allow is refused or drawn. */
  readonly outOfRange: OutOfRange;
}

/** What the service answers for where nothing is said. */
export const firstConditions: CurveConditions = {
  temperature: '25',
  ionicStrength: '0',
  activityModel: 'ideal',
  outOfRange: 'refuse',
};

/** A stated ionic strength without a model is one by Davies: here as in the API. */
export const modelAt = (ionicStrength: string): CurveModel =>
  Number(ionicStrength) === 0 ? 'ideal' : 'davies';

/** A part of them changed. A first ionic strength brings a model under which it counts. */
export function changedConditions(
  before: CurveConditions,
  part: Partial<CurveConditions>,
): CurveConditions {
  const after = { ...before, ...part };
  const wasLeftOpen = before.activityModel === modelAt(before.ionicStrength);
  return part.ionicStrength !== undefined && wasLeftOpen
    ? { ...after, activityModel: modelAt(after.ionicStrength) }
    : after;
}

/** The part of a call that says them; nothing where all of it is so by itself. */
export function conditionsAsked(asked: CurveConditions): { readonly conditions?: Conditions } {
  const { temperature, ionicStrength, activityModel, outOfRange } = asked;
  const first = firstConditions;
  const conditions: Conditions = {
    ...(temperature === first.temperature ? {} : { temperature }),
    ...(ionicStrength === first.ionicStrength && activityModel === first.activityModel
      ? {}
      : { ionicStrength, activityModel }),
    ...(outOfRange === first.outOfRange ? {} : { outOfRange }),
  };
  return Object.keys(conditions).length === 0 ? {} : { conditions };
}

/** Keys of the fragment that carry them. */
export const conditionKeys = ['T', 'I', 'model', 'beyond'] as const;

export function conditionPairs(asked: CurveConditions): Pair[] {
  const { temperature, ionicStrength, activityModel, outOfRange } = asked;
  const first = firstConditions;
  return [
    ['T', temperature === first.temperature ? undefined : temperature],
    ['I', ionicStrength === first.ionicStrength ? undefined : ionicStrength],
    ['model', activityModel === modelAt(ionicStrength) ? undefined : activityModel],
    ['beyond', outOfRange === first.outOfRange ? undefined : outOfRange],
  ];
}

function readQuantity(text: string | undefined, first: string, asked: AskedQuantity) {
  const typed = typedQuantity(text ?? first, asked);
  return typed.ok ? { value: typed.value, faulty: false } : { value: first, faulty: true };
}

/** Reads them; what cannot be used is as on a first visit. */
export function readConditions(values: ReadonlyMap<string, string>) {
  const first = firstConditions;
  const temperature = readQuantity(values.get('T'), first.temperature, temperatureAsked);
  const ionicStrength = readQuantity(values.get('I'), first.ionicStrength, ionicStrengthAsked);
  const model = values.get('model') ?? modelAt(ionicStrength.value);
  const activityModel = curveModels.find((known) => known === model);
  const beyond = values.get('beyond') ?? first.outOfRange;
  const outOfRange = (['refuse', 'compute'] as const).find((known) => known === beyond);
  const conditions: CurveConditions = {
    temperature: temperature.value,
    ionicStrength: ionicStrength.value,
    activityModel: activityModel ?? modelAt(ionicStrength.value),
    outOfRange: outOfRange ?? first.outOfRange,
  };
  const faulty = temperature.faulty || ionicStrength.faulty || !activityModel || !outOfRange;
  return { conditions, faulty };
}
