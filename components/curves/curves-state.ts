import type { StoredChoice } from '../constants/choice';
import { firstChoice, type CurveAsked } from './curve-asked';
import { changedConditions, firstConditions, type CurveConditions } from './curve-conditions';

/** What can be drawn on the one pH axis, from above. */
export const layers = [
  'fractions',
  'predominance',
  'charge',
  'capacity',
  'lg-c',
  'isoelectric-point',
] as const;
export type Layer = (typeof layers)[number];

/** Which view a phone shows. */
export const views = ['fractions', 'charge', 'capacity', 'lg-c'] as const;
export type View = (typeof views)[number];

/** What each view draws, from above. */
export const layersOfView: Readonly<Record<View, readonly Layer[]>> = {
  fractions: ['fractions', 'predominance'],
  charge: ['charge', 'predominance', 'isoelectric-point'],
  capacity: ['capacity', 'predominance'],
  'lg-c': ['lg-c'],
};

/** How many curves may be drawn beside the first. */
export const besideAtMost = 2;

/** Everything that makes the Curves screen what it is; the address carries it. */
export interface CurvesState extends CurveAsked {
  readonly pH: string;
  readonly layers: readonly Layer[];
  readonly view: View;
  /** Total concentration that capacity and lg c are drawn for, mol/L. */
  readonly total: string;
  /** Curves to compare with. */
  readonly beside: readonly CurveAsked[];
}

/** What a first visit shows: something worth reading, at once. */
export const firstState: CurvesState & { readonly choice: StoredChoice } = {
  choice: firstChoice,
  conditions: firstConditions,
  pH: '7.40',
  layers: ['fractions', 'predominance', 'charge', 'capacity'],
  view: 'fractions',
  total: '0.05',
  beside: [],
};

/**
 * What is worth comparing with first: the same system in a salt solution such as a physiological
 * one, or without salt where there is some; then at body temperature.
 */
export function nextBeside({ choice, conditions, beside }: CurvesState): CurveAsked {
  const change = (part: Partial<CurveConditions>) => changedConditions(conditions, part);
  if (beside.length > 0) return { choice, conditions: change({ temperature: '37' }) };
  const ionicStrength = Number(conditions.ionicStrength) > 0 ? '0' : '0.15';
  return { choice, conditions: change({ ionicStrength }) };
}
