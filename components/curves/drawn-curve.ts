import type { StairRange } from '../chart/stair';
import type { FractionsAnswer } from '../../shared/fractions';
import type { Choice } from './curves-state';
import { systemOf } from './curves-state';
import type { Curve } from './follow-curve';
import { curveOf } from './follow-curve';
import type { PHRange } from './ph-steps';
import { rangeOf } from './curve-grid';
import { formulasOf } from './species-formulas';

/**
 * A fetched curve with what it is a curve of. They stay together, so that an old curve keeps its
 * own formulas and range until the new one is there.
 */
export interface DrawnCurve {
  readonly choice: Choice;
  readonly answer: FractionsAnswer;
  readonly curve: Curve;
  readonly formulas: readonly string[];
  readonly range: PHRange;
  readonly stair: readonly StairRange[];
  /** Indices of the forms worth a line. */
  readonly shown: readonly number[];
}

/** With more forms than series colours, only those that reach this fraction are drawn. */
const worthDrawing = 0.05;
const seriesCount = 8;

export function drawnCurve(choice: Choice, answer: FractionsAnswer): DrawnCurve {
  const curve = curveOf(answer);
  const bound = (end: string | null) => (end === null ? null : Number(end));
  return {
    choice,
    answer,
    curve,
    formulas: formulasOf(choice),
    range: rangeOf(systemOf(choice).pKa),
    stair: answer.predominance.map(({ species, from, to }) => ({
      index: species,
      charge: curve.charges[species] ?? 0,
      from: bound(from),
      to: bound(to),
    })),
    shown: curve.fractions.flatMap((alpha, index) =>
      curve.fractions.length <= seriesCount || Math.max(...alpha) >= worthDrawing ? [index] : [],
    ),
  };
}

/** Charges of the fully protonated and of the fully deprotonated form. */
export const endCharges = ({ curve: { charges } }: DrawnCurve): readonly [number, number] => [
  charges[0] ?? 0,
  charges[charges.length - 1] ?? 0,
];
