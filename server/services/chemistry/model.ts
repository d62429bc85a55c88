import type { Model, Warning } from '../../../shared/model';
import { engineVersion } from '../../chem';
import type { ConditionsUsed } from './conditions-used';
import type { SystemUsed } from './system-used';

type ConstantsUsed = Model['constantsUsed'][number];

function givenInFull({ system: { steps } }: SystemUsed): Partial<ConstantsUsed> {
  const [first] = steps;
  if (!first) return {};
  const { kind, ionicStrength, temperature } = first;
  const isOrdinary = kind === 'thermodynamic' && Number(temperature) === 25;
  const givenFor = {
    ionicStrength: kind === 'thermodynamic' ? null : ionicStrength,
    temperature,
  };
  return isOrdinary ? { kind } : { kind, givenFor };
}

function constantsUsed(used: SystemUsed): ConstantsUsed {
  const { system, inMedium, isMoved } = used;
  const { name, fullyProtonatedCharge, pKa, stored, steps } = system;
  return {
    ...(name === undefined ? {} : { name }),
    ...(stored
      ? { system: { id: stored.id, revision: stored.revision }, note: stored.note }
      : givenInFull(used)),
    fullyProtonatedCharge,
    pKa: [...pKa],
    ...(isMoved && {
      pKaAtTemperature: [...inMedium.pKa],
      thermo: steps.map(({ thermo }) => thermo),
    }),
    ...(stored && { constants: [...stored.constants] }),
  };
}

interface Parts {
  readonly digits: number;
  readonly conditions: ConditionsUsed;
  readonly systems: readonly SystemUsed[];
  /** Whether the water takes part. */
  readonly withWater: boolean;
  readonly warnings: readonly Warning[];
  readonly interactions?: Model['interactions'];
}

/** Where an answer comes from, every default filled in. */
export const modelOf = ({
  digits,
  conditions,
  systems,
  withWater,
  warnings,
  interactions,
}: Parts): Model => ({
  engineVersion,
  digits,
  conditions: {
    temperature: conditions.temperature,
    ionicStrength: conditions.ionicStrength,
    activityModel: conditions.activityModel,
    outOfRange: conditions.outOfRange,
  },
  constantsUsed: systems.map(constantsUsed),
  pKw: withWater ? conditions.pKw : null,
  activityConstants: conditions.activityModel === 'ideal' ? null : conditions.constants,
  ...(interactions && { interactions }),
  basis: conditions.basis,
  warnings: [...warnings],
});
