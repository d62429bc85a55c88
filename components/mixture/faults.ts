import { ProblemError } from '../../shared/client';
import { conditionFaults, type ConditionFaults } from '../conditions/condition-faults';
import type { MixtureAsked } from './mixture-request';

/** What the service said, by the place on the screen that it is about. */
export interface PlacedFaults {
  readonly parts: ReadonlyMap<number, string>;
  readonly electrolytes: ReadonlyMap<number, string>;
  readonly strongAcid: string | undefined;
  readonly strongBase: string | undefined;
  readonly air: string | undefined;
  readonly conditions: ConditionFaults;
}

/** The refusal with the faults alone that are of the conditions: others stand beside their rows. */
function ofConditions(error: Error | null): Error | null {
  if (!(error instanceof ProblemError)) return null;
  const errors = error.problem.errors?.filter(({ pointer }) => pointer.startsWith('/conditions'));
  return new ProblemError({ ...error.problem, errors: errors ?? [] });
}

/** Puts each fault of a refused call beside what it is about. */
export function placeFaults(error: Error | null, asked: MixtureAsked | undefined): PlacedFaults {
  const parts = new Map<number, string>();
  const electrolytes = new Map<number, string>();
  const flask = new Map<string, string>();
  const faults = (error instanceof ProblemError && error.problem.errors) || [];
  for (const { pointer, detail } of faults) {
    const [, list = '', index = ''] = pointer.split('/');
    const component = list === 'components' ? asked?.components[Number(index)] : undefined;
    const ion = list === 'ions' ? asked?.ions[Number(index)] : undefined;
    if (component === 'air') flask.set('air', detail);
    else if (component !== undefined) parts.set(component, detail);
    else if (ion !== undefined) electrolytes.set(ion, detail);
    else flask.set(list, detail);
  }
  return {
    parts,
    electrolytes,
    strongAcid: flask.get('strongAcid'),
    strongBase: flask.get('strongBase'),
    air: flask.get('air'),
    conditions: {
      ...conditionFaults(ofConditions(error)),
      passable: conditionFaults(error).passable,
    },
  };
}
