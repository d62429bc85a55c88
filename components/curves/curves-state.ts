import type { Choice, StoredChoice } from '../constants/choice';

/** What can be drawn on the one pH axis. */
export const layers = ['fractions', 'predominance', 'charge'] as const;
export type Layer = (typeof layers)[number];

/** Which of two views a phone shows. */
export const views = ['fractions', 'charge'] as const;
export type View = (typeof views)[number];

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

/** Constants that are known before the service has answered: a stored system's are not. */
export const givenConstants = (choice: Choice): readonly string[] =>
  choice.kind === 'typed' ? choice.system.pKa : [];
