import type { Conditions, OutOfRange } from '../../shared/conditions';
import { ionicStrengthAsked, temperatureAsked } from '../conditions/asked-quantities';
import { typedQuantity, type AskedQuantity } from '../conditions/typed-quantity';
import type { Pair } from '../fragment/pairs';

/** Activity models that one system can be drawn with: its counter-ions are not known here. */
export const curveModels = [
  'ideal',
  'debye-huckel',
  'extended-debye-huckel',
  'guntelberg',
  'davies',
  'specific-ion-interaction',
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

const names = ['temperature', 'ionicStrength', 'activityModel', 'outOfRange'] as const;

/** The part of a call that says them; nothing of what is so by itself. */
export function conditionsAsked(asked: CurveConditions): { readonly conditions?: Conditions } {
  const differing = names.filter((name) => asked[name] !== firstConditions[name]);
  if (differing.length === 0) return {};
  return { conditions: Object.fromEntries(differing.map((name) => [name, asked[name]])) };
}

/** Keys of the fragment that carry them. */
export const conditionKeys = ['T', 'I', 'model', 'beyond'] as const;

export function conditionPairs(asked: CurveConditions): Pair[] {
  return names.map((name, i) => [
    conditionKeys[i] ?? name,
    asked[name] === firstConditions[name] ? undefined : asked[name],
  ]);
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
  const model = values.get('model') ?? first.activityModel;
  const activityModel = curveModels.find((known) => known === model);
  const beyond = values.get('beyond') ?? first.outOfRange;
  const outOfRange = (['refuse', 'compute'] as const).find((known) => known === beyond);
  const conditions: CurveConditions = {
    temperature: temperature.value,
    ionicStrength: ionicStrength.value,
    activityModel: activityModel ?? first.activityModel,
    outOfRange: outOfRange ?? first.outOfRange,
  };
  const faulty = temperature.faulty || ionicStrength.faulty || !activityModel || !outOfRange;
  return { conditions, faulty };
}
