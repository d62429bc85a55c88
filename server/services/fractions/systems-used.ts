import type { Model } from '../../../shared/model';
import { type AcidBaseSystem, effectiveSystem } from '../../chem';
import { type ConditionsUsed, conditionsUsed, idealDefaults } from '../chemistry/conditions-used';
import { modelOf } from '../chemistry/model';
import { strengthWarnings, withoutComposition } from '../chemistry/ranges';
import { type SystemUsed, systemUsed } from '../chemistry/system-used';
import { systemsOf } from './cost';
import type { ResolvedRequest } from './resolve';

/** A question about fractions, everything in it settled. */
interface Settled {
  readonly conditions: ConditionsUsed;
  readonly systems: readonly (SystemUsed & { readonly effective: AcidBaseSystem })[];
  readonly model: Model;
}

/** Conditions and systems of a request. Refused with `no-answer` where they have none. */
export function settled(request: ResolvedRequest): Settled {
  const conditions = conditionsUsed(request.conditions, idealDefaults);
  withoutComposition(conditions);
  const range = strengthWarnings(conditions);
  const systems = systemsOf(request).map((system, i) => {
    const place = request.system === undefined ? `/systems/${i}` : '/system';
    const used = systemUsed(system, conditions, place);
    return { ...used, effective: effectiveSystem(used.inMedium, conditions.activity) };
  });
  const warnings = [...range, ...systems.flatMap((used) => used.warnings)];
  const { digits } = request;
  return {
    conditions,
    systems,
    model: modelOf({ digits, conditions, systems, withWater: false, warnings }),
  };
}
