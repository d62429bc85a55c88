import { systemInFull, systemReference } from '../../shared/system';
import type { Choice, StoredChoice } from '../constants/choice';
import type { Pair } from '../fragment/pairs';
import {
  conditionKeys,
  conditionPairs,
  readConditions,
  type CurveConditions,
} from './curve-conditions';

/** One curve that is asked for: of which system, under which conditions. */
export interface CurveAsked {
  readonly choice: Choice;
  readonly conditions: CurveConditions;
}

export const firstChoice: StoredChoice = { kind: 'stored', id: 'phosphoric-acid' };

/** Constants that are known before the service has answered: a stored system's are not. */
export const givenConstants = (choice: Choice): readonly string[] =>
  choice.kind === 'typed' ? choice.system.pKa : [];

/** Keys of the fragment that carry one curve. */
export const askedKeys = ['system', 'name', 'charge', 'pKa', ...conditionKeys] as const;

const choicePairs = (choice: Choice): Pair[] =>
  choice.kind === 'stored'
    ? [['system', choice.id]]
    : [
        ['name', choice.system.name],
        ['charge', String(choice.system.fullyProtonatedCharge)],
        ['pKa', choice.system.pKa.join(',')],
      ];

export const askedPairs = ({ choice, conditions }: CurveAsked): Pair[] => [
  ...choicePairs(choice),
  ...conditionPairs(conditions),
];

function readChoice(values: ReadonlyMap<string, string>): Choice | 'unusable' {
  const id = values.get('system');
  const charge = values.get('charge');
  const pKa = values.get('pKa');
  const typed = charge !== undefined || pKa !== undefined || values.has('name');
  if (id !== undefined) {
    const isReference = systemReference.safeParse(id).success;
    return typed || !isReference ? 'unusable' : { kind: 'stored', id };
  }
  if (!typed) return firstChoice;
  const system = systemInFull.safeParse({
    name: values.get('name'),
    fullyProtonatedCharge: /^-?\d+$/.test(charge ?? '') ? Number(charge) : undefined,
    pKa: pKa?.split(','),
  });
  return system.success ? { kind: 'typed', system: system.data } : 'unusable';
}

/** Reads one curve; what cannot be used is as on a first visit. */
export function readAsked(values: ReadonlyMap<string, string>) {
  const choice = readChoice(values);
  const { conditions, faulty } = readConditions(values);
  const asked: CurveAsked = {
    choice: choice === 'unusable' ? firstChoice : choice,
    conditions,
  };
  return { asked, faulty: faulty || choice === 'unusable' };
}
