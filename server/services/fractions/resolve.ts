import type { FractionsRequest } from '../../../shared/fractions';
import type { SystemInput } from '../../../shared/system';
import {
  type FoundSystems,
  type ResolvedSystem,
  resolvedSystem,
} from '../chemistry/resolved-system';

/** A request in which every system is there in full. */
export type ResolvedRequest = Omit<FractionsRequest, 'system' | 'systems'> & {
  readonly system?: ResolvedSystem | undefined;
  readonly systems?: readonly ResolvedSystem[] | undefined;
};

/** The systems of a request, one or many. */
export const systemsAsked = ({ system, systems = [] }: FractionsRequest): SystemInput[] =>
  system === undefined ? systems : [system];

/** Puts the systems found in the place of their names. */
export function resolved(request: FractionsRequest, found: FoundSystems): ResolvedRequest {
  const { system, systems, ...rest } = request;
  return {
    ...rest,
    ...(system && { system: resolvedSystem(system, '/system', found) }),
    ...(systems && {
      systems: systems.map((one, i) => resolvedSystem(one, `/systems/${i}`, found)),
    }),
  };
}
