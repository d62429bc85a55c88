import type { Point, Rect } from './geometry';
import { bottom, clamp, right } from './geometry';

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

/** Indices of the columns within `reach` px to either side of x: [first, last]. */
const near = ({ left, columns }: SampledCurve, x: number, reach: number) =>
  [
    Math.max(0, Math.floor(x - reach) - left),
    Math.min(columns.length - 1, Math.ceil(x + reach) - left),
  ] as const;

// These two are asked some hundred thousand times for one crowded figure, hence plain loops.

/** Least distance of the curve from a point, looked for within `reach`; Infinity beyond it. */
export function distanceFrom(curve: SampledCurve, point: Point, reach: number): number {
  const [first, last] = near(curve, point.x, reach);
  let least = Infinity;
  for (let i = first; i <= last; i++) {
    const dx = curve.left + i - point.x;
    const dy = (curve.columns[i] ?? Infinity) - point.y;
    least = Math.min(least, dx * dx + dy * dy);
  }
  return Math.sqrt(least);
}

/** Does the curve pass through the box? */
export function crosses(curve: SampledCurve, box: Rect): boolean {
  const [first, last] = near(curve, box.x + box.width / 2, box.width / 2);
  let before = curve.columns[first] ?? Infinity;
  for (let i = first; i <= last; i++) {
    const y = curve.columns[i] ?? Infinity;
    if (Math.max(before, y) > box.y - 1 && Math.min(before, y) < bottom(box) + 1) return true;
    before = y;
  }
  return false;
}
