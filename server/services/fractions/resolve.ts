import type { Constant } from '../../../shared/constant';
import type { FractionsRequest } from '../../../shared/fractions';
import type { StoredSystem } from '../../../shared/stored-system';
import type { SystemInput } from '../../../shared/system';
import type { AcidBaseSystem } from '../../chem';
import { Refusal } from '../../refusal';
import { preferredConstants } from '../systems/stored-system';

/** Where the constants of a stored system come from, and how its forms are written. */
interface Stored {
  readonly id: string;
  readonly revision: number;
  readonly constants: readonly Constant[];
  readonly formulas: readonly (string | null)[];
  /** What to know before using the constants. */
  readonly note: string | null;
}

/** A system to compute with; `stored` where it was named by its id. */
export interface ResolvedSystem extends AcidBaseSystem {
  readonly name?: string | undefined;
  readonly stored?: Stored;
}

/** A request in which every system is there in full. */
export type ResolvedRequest = Omit<FractionsRequest, 'system' | 'systems'> & {
  readonly system?: ResolvedSystem | undefined;
  readonly systems?: readonly ResolvedSystem[] | undefined;
};

/** The stored systems that a request names, as it writes them. */
export const referencesIn = ({ system, systems = [] }: FractionsRequest): string[] =>
  [system, ...systems].flatMap((one) => (one && 'id' in one ? [one.id] : []));

const resolvedSystem = (system: StoredSystem): ResolvedSystem => ({
  name: system.name,
  fullyProtonatedCharge: system.fullyProtonatedCharge,
  pKa: system.pKa,
  stored: {
    id: system.id,
    revision: system.revision,
    constants: preferredConstants(system),
    formulas: system.species.map(({ formula }) => formula ?? null),
    note: system.note,
  },
});

const unknownSystem = (id: string, pointer: string) => {
  const detail = `There is no system ${id}: GET /v1/systems finds those there are.`;
  return new Refusal('invalid-request', detail, [{ pointer, code: 'unknown-system', detail }]);
};

/**
 * Puts the systems found in the place of their names. Refused with the fault `unknown-system` where
 * one was not found.
 */
export function resolved(
  request: FractionsRequest,
  found: ReadonlyMap<string, StoredSystem>,
): ResolvedRequest {
  const inFull = (system: SystemInput, pointer: string): ResolvedSystem => {
    if (!('id' in system)) return system;
    const stored = found.get(system.id);
    if (!stored) throw unknownSystem(system.id, `${pointer}/id`);
    return resolvedSystem(stored);
  };
  const { system, systems, ...rest } = request;
  return {
    ...rest,
    ...(system && { system: inFull(system, '/system') }),
    ...(systems && { systems: systems.map((one, i) => inFull(one, `/systems/${i}`)) }),
  };
}
