import type { Point, Rect } from './geometry';

/** One way to write a name: where its box lies, and the leader if it does not touch its curve. */
export interface Candidate {
  readonly anchor: Point;
  readonly box: Rect;
  readonly leader?: readonly [Point, Point];
  /** What this way costs before anything else is looked at. */
  readonly cost: number;
}

interface Size {
  readonly width: number;
  readonly height: number;
}

/** Free space between the curve's marker and a name that stands beside it, px. */
const gap = 7;
const cornerGap = 4;

/** Directions a name may lie in, y downwards: above, right, left, corners, below. */
const beside: readonly (readonly [number, number])[] = [
  [0, -1],
  [1, 0],
  [-1, 0],
  [1, -1],
  [-1, -1],
  [1, 1],
  [-1, 1],
  [0, 1],
];

/** Leaders go anywhere but straight down, where they would be taken for a riser. */
const leaderDirections = beside.slice(0, 7);
const leaders = [
  { length: 34, cost: 16 },
  { length: 48, cost: 24 },
  { length: 64, cost: 34 },
];

/** The box of a name whose near edge or corner lies at `tip`, in direction (dx, dy) of the curve. */
const boxAt = (tip: Point, dx: number, dy: number, { width, height }: Size): Rect => ({
  x: tip.x + ((dx - 1) / 2) * width,
  y: tip.y + ((dy - 1) / 2) * height,
  width,
  height,
});

/** Every way to write a name of this size at a point of its curve. */
export function candidatesAt(anchor: Point, size: Size): Candidate[] {
  const near = beside.map(([dx, dy], order) => {
    const sideways = dy === 0 ? gap : cornerGap;
    const tip = { x: anchor.x + dx * sideways, y: anchor.y + dy * gap };
    return { anchor, box: boxAt(tip, dx, dy, size), cost: order };
  });
  const far = leaders.flatMap(({ length, cost }) =>
    leaderDirections.map(([dx, dy], order) => {
      const norm = Math.hypot(dx, dy);
      const at = (reach: number) => ({
        x: anchor.x + (dx / norm) * reach,
        y: anchor.y + (dy / norm) * reach,
      });
      const leader = [at(5), at(length - 3)] as const;
      return { anchor, box: boxAt(at(length), dx, dy, size), leader, cost: cost + order };
    }),
  );
  return [...near, ...far];
}
