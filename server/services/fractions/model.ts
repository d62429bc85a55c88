import type { FractionsRequest } from '../../../shared/fractions';
import type { Model, Warning } from '../../../shared/model';
import { engineVersion, invertedNeighbours } from '../../chem';
import { systemsOf } from './cost';

/** Inverted constants of each system, in words and with the place in the request. */
export const warningsOf = (request: FractionsRequest): Warning[] =>
  systemsOf(request).flatMap((system, index) =>
    invertedNeighbours(system).map((i) => ({
      code: 'inverted-constants' as const,
      message:
        `pKa ${i + 1} (${system.pKa[i]}) is greater than pKa ${i + 2} (${system.pKa[i + 1]}): ` +
        `species ${i + 1} never predominates.`,
      pointer: `${request.system === undefined ? `/systems/${index}` : '/system'}/pKa/${i}`,
    })),
  );

/** Where a fractions answer comes from, every default filled in. */
export const modelOf = (request: FractionsRequest): Model => ({
  engineVersion,
  digits: request.digits,
  conditions: {
    temperature: '25',
    ionicStrength: '0',
    activityModel: 'ideal',
    outOfRange: 'refuse',
  },
  constantsUsed: systemsOf(request).map(({ name, fullyProtonatedCharge, pKa }) => ({
    ...(name === undefined ? {} : { name }),
    kind: 'thermodynamic',
    fullyProtonatedCharge,
    pKa: [...pKa],
  })),
  pKw: null,
  activityConstants: null,
  basis: 'mol/L',
  warnings: warningsOf(request),
});
