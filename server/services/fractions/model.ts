import type { Model } from '../../../shared/model';
import { engineVersion } from '../../chem';
import { systemsOf } from './cost';
import type { ResolvedRequest, ResolvedSystem } from './resolve';
import { temperatureUsed, warningsOf } from './warnings';

type ConstantsUsed = Model['constantsUsed'][number];

const constantsUsed = ({
  name,
  fullyProtonatedCharge,
  pKa,
  stored,
}: ResolvedSystem): ConstantsUsed => ({
  ...(name === undefined ? {} : { name }),
  ...(stored
    ? { system: { id: stored.id, revision: stored.revision }, note: stored.note }
    : { kind: 'thermodynamic' }),
  fullyProtonatedCharge,
  pKa: [...pKa],
  ...(stored && { constants: [...stored.constants] }),
});

/** Where a fractions answer comes from, every default filled in. */
export const modelOf = (request: ResolvedRequest): Model => ({
  engineVersion,
  digits: request.digits,
  conditions: {
    temperature: temperatureUsed,
    ionicStrength: '0',
    activityModel: 'ideal',
    outOfRange: 'refuse',
  },
  constantsUsed: systemsOf(request).map(constantsUsed),
  pKw: null,
  activityConstants: null,
  basis: 'mol/L',
  warnings: warningsOf(request),
});
