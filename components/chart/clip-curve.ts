import type { CurvePoint } from './line-path';
import type { Point } from './geometry';

/**
 * The parts of a curve between two values: where it leaves them it ends on the bound itself, and
 * the pen is lifted until it comes back.
 *
 * @param points left to right, their y being values and not yet px.
 */
export function clipCurve(
  points: readonly Point[],
  [least, most]: readonly [number, number],
): CurvePoint[] {
  const inside = ({ y }: Point) => y >= least && y <= most;
  /** Where the way from a to b meets the bound that parts them. */
  const meeting = (a: Point, b: Point): CurvePoint => {
    const outer = inside(a) ? b.y : a.y;
    const y = outer > most ? most : least;
    return { x: a.x + ((y - a.y) / (b.y - a.y)) * (b.x - a.x), y, drawn: true };
  };
  const clipped: CurvePoint[] = [];
  for (const [i, point] of points.entries()) {
    const before = points[i - 1];
    const isIn = inside(point);
    if (
      before &&
      inside(before) !== isIn &&
      Number.isFinite(before.y) &&
      Number.isFinite(point.y)
    ) {
      clipped.push(meeting(before, point));
    }
    clipped.push(isIn ? { ...point, drawn: true } : { x: point.x, y: least, drawn: false });
  }
  return clipped;
}
