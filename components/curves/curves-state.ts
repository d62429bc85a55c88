import type { z } from 'zod';
import type { systemInput } from '../../shared/system';
import type { SystemText } from './system-text';

/** What can be drawn on the one pH axis. */
export const layers = ['fractions', 'predominance', 'charge'] as const;
export type Layer = (typeof layers)[number];

/** Which of two views a phone shows. */
export const views = ['fractions', 'charge'] as const;
export type View = (typeof views)[number];

interface StoredChoice {
  readonly kind: 'stored';
  readonly id: string;
}

/** A stored system by its id, or one that was typed. */
export type Choice = StoredChoice | { readonly kind: 'typed'; readonly system: SystemText };

/** Everything that makes the Curves screen what it is; the address carries it. */
export interface CurvesState {
  readonly choice: Choice;
  readonly pH: string;
  readonly layers: readonly Layer[];
  readonly view: View;
}

/** What a first visit shows: something worth reading, at once. */
export const firstState: CurvesState & { readonly choice: StoredChoice } = {
  choice: { kind: 'stored', id: 'phosphoric-acid' },
  pH: '7.40',
  layers,
  view: 'fractions',
};

/** The system as a call asks for it. */
export function systemAsked(choice: Choice): z.input<typeof systemInput> {
  if (choice.kind === 'stored') return { id: choice.id };
  const { name, ...system } = choice.system;
  return name === undefined ? system : { name, ...system };
}

/** Constants that are known before the service has answered: a stored system's are not. */
export const givenConstants = (choice: Choice): readonly string[] =>
  choice.kind === 'typed' ? choice.system.pKa : [];

/** What typing begins with where no system is drawn yet. */
export const plainSystem: SystemText = { fullyProtonatedCharge: 0, pKa: ['7'] };
