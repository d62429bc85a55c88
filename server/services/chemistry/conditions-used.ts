import type { Conditions } from '../../../shared/conditions';
import type { Model } from '../../../shared/model';
import { type ActivityChoice, waterAt, type WaterProperties } from '../../chem';

/** Conditions with every default filled in, and what follows from them. */
export interface ConditionsUsed {
  readonly temperature: string;
  readonly ionicStrength: string;
  readonly activityModel: ActivityChoice['model'];
  readonly basis: Model['basis'];
  readonly outOfRange: 'refuse' | 'compute';
  readonly pKw: string;
  readonly activity: ActivityChoice;
  /** Whether the caller said at which ionic strength or by which model. */
  readonly isAsked: boolean;
  readonly constants: NonNullable<Model['activityConstants']>;
  /** What the caller gave in place of the values of the temperature. */
  readonly given: Pick<Conditions, 'pKw' | 'activityConstants'>;
}

/** What a question takes where nothing is said. */
export interface Defaults {
  readonly activityModel: ActivityChoice['model'];
  readonly ionicStrength: string;
}

/** Fractions, capacity, the isoelectric point. */
export const idealDefaults: Defaults = { activityModel: 'ideal', ionicStrength: '0' };
/** Mixtures, the isoionic point. */
export const mixtureDefaults: Defaults = {
  activityModel: 'davies',
  ionicStrength: 'self-consistent',
};

const ordinaryTemperature = '25';
/** C. W. Davies, Ion Association (1962). */
const daviesLinear = '0.3';

const known = new Map<string, WaterProperties>();
const knownAtMost = 500;

/** Water at a temperature, remembered: the relations behind it cost milliseconds. */
function water(temperature: string): WaterProperties {
  const found = known.get(temperature);
  if (found) return found;
  const made = waterAt(temperature);
  if (known.size >= knownAtMost) known.clear();
  known.set(temperature, made);
  return made;
}

/** The conditions of a question; a stated ionic strength without a model is one by Davies. */
export function conditionsUsed(asked: Conditions = {}, defaults: Defaults): ConditionsUsed {
  const temperature = asked.temperature ?? ordinaryTemperature;
  const states = asked.ionicStrength !== undefined && Number(asked.ionicStrength) !== 0;
  const activityModel = asked.activityModel ?? (states ? 'davies' : defaults.activityModel);
  const ionicStrength = asked.ionicStrength ?? defaults.ionicStrength;
  const { pKw, A, B } = water(temperature);
  const given = asked.activityConstants;
  const activity = {
    model: activityModel,
    A: given?.A ?? A,
    B: given?.B ?? B,
    linear: given?.linear ?? daviesLinear,
    ionicStrength,
  };
  return {
    temperature,
    ionicStrength,
    activityModel,
    basis: asked.basis ?? 'mol/L',
    outOfRange: asked.outOfRange ?? 'refuse',
    pKw: asked.pKw ?? pKw,
    activity,
    isAsked: asked.ionicStrength !== undefined || activityModel !== 'ideal',
    constants: {
      A: activity.A,
      B: activityModel === 'extended-debye-huckel' ? activity.B : null,
      linear: activityModel === 'davies' ? activity.linear : null,
      source: given
        ? 'As given; what was not given: permittivity IAPWS R8-97, density Kell 1975, 0.1 MPa.'
        : 'Permittivity IAPWS R8-97, density Kell 1975, 0.1 MPa; molal.',
    },
    given: { pKw: asked.pKw, activityConstants: given },
  };
}
