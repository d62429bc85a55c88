import type { Capacity } from './capacity';
import type { DrawnCurve } from './drawn-curve';

/** A curve that the first one is compared with, drawn over the same grid. */
export interface BesideCurve {
  readonly drawn: DrawnCurve;
  readonly capacity: Capacity | undefined;
  /** What sets it apart: `I 0.15 · 37 °C`. */
  readonly name: string;
}

/** What layers show beside the fractions: each undefined until its answer is there. */
export interface FigureExtras {
  readonly capacity: Capacity | undefined;
  /** pH at which the mean charge is zero. */
  readonly isoelectricPoint: string | undefined;
  readonly beside: readonly BesideCurve[];
}

export const noExtras: FigureExtras = {
  capacity: undefined,
  isoelectricPoint: undefined,
  beside: [],
};
