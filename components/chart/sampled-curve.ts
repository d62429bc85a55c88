import type { Point, Rect } from './geometry';
import { bottom, clamp, distance, right } from './geometry';

/** A curve known at each whole px of the panel, so that questions about it are cheap. */
export interface SampledCurve {
  readonly left: number;
  /** y at left, left + 1, …, px. */
  readonly columns: readonly number[];
  readonly peak: Point;
}

/** Samples points that run left to right; there must be at least one. */
export function sampleCurve(points: readonly Point[], bounds: Rect): SampledCurve {
  const left = Math.ceil(bounds.x);
  const columns: number[] = [];
  let k = 0;
  for (let x = left; x <= right(bounds); x++) {
    while (k < points.length - 2 && (points[k + 1]?.x ?? Infinity) < x) k++;
    const a = points[k];
    const b = points[k + 1] ?? a;
    if (!a || !b) break;
    const t = b.x === a.x ? 0 : clamp((x - a.x) / (b.x - a.x), 0, 1);
    columns.push(a.y + t * (b.y - a.y));
  }
  const peak = points.reduce((best, point) => (point.y < best.y ? point : best));
  return { left, columns, peak };
}

/** Points of the curve within `reach` px to either side of x. */
function near({ left, columns }: SampledCurve, x: number, reach: number): Point[] {
  const first = Math.max(0, Math.floor(x - reach) - left);
  return columns
    .slice(first, Math.max(first, Math.ceil(x + reach) - left + 1))
    .map((y, i) => ({ x: left + first + i, y }));
}

/** Least distance of the curve from a point, looked for within `reach`; Infinity beyond it. */
export const distanceFrom = (curve: SampledCurve, point: Point, reach: number) =>
  near(curve, point.x, reach).reduce((least, at) => Math.min(least, distance(at, point)), Infinity);

/** Does the curve pass through the box? */
export function crosses(curve: SampledCurve, box: Rect): boolean {
  const within = near(curve, box.x + box.width / 2, box.width / 2);
  return within.some(({ y }, i) => {
    const next = within[i + 1]?.y ?? y;
    return Math.max(y, next) > box.y - 1 && Math.min(y, next) < bottom(box) + 1;
  });
}
