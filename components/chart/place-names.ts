import type { Point, Rect } from './geometry';
import { centre, contains, distance, inflate, overlaps, right } from './geometry';
import type { Candidate } from './name-candidates';
import { candidatesAt } from './name-candidates';
import type { SampledCurve } from './sampled-curve';
import { crosses, distanceFrom, sampleCurve } from './sampled-curve';

/** A curve that wants its name written: its points in px, left to right, and the name's size. */
export interface NamedCurve {
  readonly key: number;
  readonly width: number;
  readonly height: number;
  readonly points: readonly Point[];
}

/** Where a name stands, and the point of its curve that it belongs to. */
export interface PlacedName {
  readonly key: number;
  readonly anchor: Point;
  readonly box: Rect;
  readonly leader?: readonly [Point, Point];
}

interface Panel {
  /** Where names may stand. */
  readonly bounds: Rect;
  /** y of the value 0, from which heights are counted, px. */
  readonly zero: number;
  /** x of the cursor, px. */
  readonly cursor?: number | undefined;
  /** What is already written in the panel. */
  readonly taken?: readonly Rect[];
  /** Lines that need no name here, but that a name should rather not cross. */
  readonly lines?: readonly (readonly Point[])[];
}

interface SampledPanel extends Omit<Panel, 'lines'> {
  readonly lines: readonly SampledCurve[];
}

interface Wanted extends NamedCurve {
  readonly curve: SampledCurve;
}

const costs = {
  crossesCurve: 110,
  crossesLine: 60,
  crossesOwn: 40,
  crossesCursor: 60,
  leadsBeyondCursor: 140,
  anchorNearCurve: 120,
  anotherNearer: 80,
  overlap: 1500,
  outside: 1500,
} as const;
/** From here on a name misleads more than it helps: the read-out names the curve instead. */
const unnamed = 220;
const anchorRoom = 14;
const anchorStep = 4;
/** A marker nearer to the edge or to what is written would be cut or cover it, px. */
const edgeRoom = 8;

/**
 * Writes names at their curves: edges first, then inwards, each where it costs least. A name may
 * stand beside its curve or at the end of a short leader; one that would mislead is left out.
 *
 * Run it when the curves change and not while the cursor moves: names that jump are worse than a
 * name that is crossed.
 */
export function placeNames(curves: readonly NamedCurve[], panel: Panel): PlacedName[] {
  const wanted = curves
    .filter(({ points }) => points.length > 0)
    .map((curve) => ({ ...curve, curve: sampleCurve(curve.points, panel.bounds) }));
  const lines = (panel.lines ?? []).map((points) => sampleCurve(points, panel.bounds));
  const placed: PlacedName[] = [];
  for (const name of edgesFirst(wanted)) {
    // Neighbours are most in the way: looked at first, they end a hopeless count early.
    const nearestFirst = [...wanted].sort((a, b) => away(a, name) - away(b, name));
    const best = cheapest(name, nearestFirst, placed, { ...panel, lines });
    if (best) placed.push(best);
  }
  return placed;
}

const away = (a: Wanted, b: Wanted) => Math.abs(a.curve.peak.x - b.curve.peak.x);

/** First, last, second, last but one, … */
const edgesFirst = <T>(items: readonly T[]): T[] =>
  items
    .map((item, i) => ({ item, inwards: Math.min(i, items.length - 1 - i) }))
    .sort((a, b) => a.inwards - b.inwards)
    .map(({ item }) => item);

function cheapest(
  name: Wanted,
  all: readonly Wanted[],
  placed: readonly PlacedName[],
  panel: SampledPanel,
): PlacedName | undefined {
  const { peak, columns, left } = name.curve;
  const half = (panel.zero - peak.y) / 2;
  const clear = ({ x, y }: Point) =>
    x >= left + edgeRoom &&
    x <= right(panel.bounds) - edgeRoom &&
    !panel.taken?.some((box) => overlaps(inflate(box, edgeRoom), { x, y, width: 0, height: 0 }));
  const anchors = columns
    .map((y, i) => ({ x: left + i, y }))
    .filter(({ y }, i) => i % anchorStep === 0 && panel.zero - y >= half);
  let best: Candidate | undefined;
  let least: number = unnamed;
  for (const anchor of [peak, ...anchors].filter(clear)) {
    const far = distance(anchor, peak);
    if (far >= least) continue;
    for (const candidate of candidatesAt(anchor, name)) {
      const sure = far + candidate.cost;
      if (sure >= least) continue;
      const cost = sure + against(candidate, name, all, placed, panel, least - sure);
      if (cost < least) {
        least = cost;
        best = candidate;
      }
    }
  }
  return best && { key: name.key, ...best };
}

/** What stands against a candidate. Stops counting once the sum has passed `budget`. */
function against(
  { anchor, box, leader }: Candidate,
  name: Wanted,
  all: readonly Wanted[],
  placed: readonly PlacedName[],
  { bounds, cursor, lines, taken = [] }: SampledPanel,
  budget: number,
): number {
  if (!contains(bounds, box)) return costs.outside;
  const written = [...taken, ...placed.map((other) => other.box)];
  if (written.some((other) => overlaps(inflate(other, 3), box))) return costs.overlap;
  const middle = centre(box);
  let cost = 0;
  if (cursor !== undefined) {
    if (cursor > box.x - 4 && cursor < right(box) + 4) cost += costs.crossesCursor;
    if (leader && anchor.x < cursor !== middle.x < cursor) cost += costs.leadsBeyondCursor;
  }
  cost += costs.crossesLine * lines.filter((line) => crosses(line, box)).length;
  const reach = leader ? 0 : distanceFrom(name.curve, middle, 60);
  for (const { curve } of all) {
    if (cost >= budget) break;
    const crossed = crosses(curve, box);
    if (curve === name.curve) {
      if (crossed) cost += costs.crossesOwn;
      continue;
    }
    if (crossed) cost += costs.crossesCurve;
    if (distanceFrom(curve, anchor, anchorRoom) < anchorRoom) cost += costs.anchorNearCurve;
    if (!leader && distanceFrom(curve, middle, reach) < reach) cost += costs.anotherNearer;
  }
  return cost;
}
