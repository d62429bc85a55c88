import { curveLinear, line } from 'd3-shape';
import type { Point } from './geometry';

export interface CurvePoint extends Point {
  /** False where the pen is lifted. */
  readonly drawn: boolean;
}

const path = line<CurvePoint>()
  .x((point) => point.x)
  .y((point) => point.y)
  .defined((point) => point.drawn)
  .curve(curveLinear)
  .digits(2);

/** SVG path of a curve; empty where the pen is never down. */
export const linePath = (points: readonly CurvePoint[]): string => path([...points]) ?? '';
