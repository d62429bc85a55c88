import { ProblemError } from '../../shared/client';
import type { Fault } from '../../shared/problem';
import { conditionFaults, saidHere, type ConditionFaults } from '../conditions/condition-faults';
import type { MixtureAsked } from './mixture-request';

/** What the service said, by the place on the screen that it is about. */
export interface PlacedFaults {
  readonly parts: ReadonlyMap<number, string>;
  readonly electrolytes: ReadonlyMap<number, string>;
  readonly strongAcid: string | undefined;
  readonly strongBase: string | undefined;
  readonly air: string | undefined;
  readonly conditions: ConditionFaults;
  /** Every fault stands beside what it is about. */
  readonly allPlaced: boolean;
}

/** What is said of a component whose system nobody has. */
export const unknownSystem = 'No system has this id. Take it out, and find yours by name.';

const said = ({ code, detail }: Fault) =>
  code === 'unknown-system' ? unknownSystem : saidHere(detail);

/** Puts each fault of a refused call beside what it is about. */
export function placeFaults(error: Error | null, asked: MixtureAsked | undefined): PlacedFaults {
  const parts = new Map<number, string>();
  const electrolytes = new Map<number, string>();
  const flask = new Map<string, string>();
  const faults = (error instanceof ProblemError && error.problem.errors) || [];
  const unplaced = faults.filter((fault) => {
    const [, list = '', index = ''] = fault.pointer.split('/');
    const component = list === 'components' ? asked?.components[Number(index)] : undefined;
    const ion = list === 'ions' ? asked?.ions[Number(index)] : undefined;
    if (component === 'air') flask.set('air', said(fault));
    else if (component !== undefined) parts.set(component, said(fault));
    else if (ion !== undefined) electrolytes.set(ion, said(fault));
    else flask.set(list, said(fault));
    return component === undefined && ion === undefined && !ownFields.has(list);
  });
  const conditions = conditionFaults(withOnly(error, unplaced));
  return {
    parts,
    electrolytes,
    strongAcid: flask.get('strongAcid'),
    strongBase: flask.get('strongBase'),
    air: flask.get('air'),
    conditions: { ...conditions, passable: conditionFaults(error).passable },
    allPlaced: faults.length > 0 && conditions.elsewhere.length === 0,
  };
}

const ownFields = new Set(['strongAcid', 'strongBase']);

const withOnly = (error: Error | null, errors: Fault[]) =>
  error instanceof ProblemError ? new ProblemError({ ...error.problem, errors }) : null;
