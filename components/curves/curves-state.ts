import { examples } from './examples';
import type { SystemText } from './system-text';

/** What can be drawn on the one pH axis. */
export const layers = ['fractions', 'predominance', 'charge'] as const;
export type Layer = (typeof layers)[number];

/** Which of two views a phone shows. */
export const views = ['fractions', 'charge'] as const;
export type View = (typeof views)[number];

/** An example by its id, or a system that was typed. */
export type Choice =
  | { readonly kind: 'example'; readonly id: string }
  | { readonly kind: 'typed'; readonly system: SystemText };

/** Everything that makes the Curves screen what it is; the address carries it. */
export interface CurvesState {
  readonly choice: Choice;
  readonly pH: string;
  readonly layers: readonly Layer[];
  readonly view: View;
}

/** What a first visit shows: something worth reading, at once. */
export const firstState: CurvesState = {
  choice: { kind: 'example', id: 'phosphoric-acid' },
  pH: '7.40',
  layers,
  view: 'fractions',
};

export const exampleOf = (choice: Choice) =>
  choice.kind === 'example' ? examples.find(({ id }) => id === choice.id) : undefined;

/** The system that is drawn; an unknown example cannot be chosen, so the first stands for it. */
export function systemOf(choice: Choice): SystemText {
  if (choice.kind === 'typed') return choice.system;
  const example = exampleOf(choice) ?? examples[0];
  if (!example) throw new Error('There are no examples.');
  return example.system;
}
