import { clamp } from './geometry';
import type { Scale } from './scale';

/** Where one form is the most abundant; null is unbounded. */
export interface StairRange {
  readonly index: number;
  readonly charge: number;
  readonly from: number | null;
  readonly to: number | null;
}

export interface Tread {
  readonly index: number;
  readonly left: number;
  readonly right: number;
  readonly y: number;
}

/** The stone stair of a panel: treads from the fully protonated form down, left to right. */
export interface Stair {
  readonly treads: readonly Tread[];
  /** Height of the stair at a charge, px. */
  readonly level: (charge: number) => number;
  /** Height of one step, px. */
  readonly drop: number;
  readonly left: number;
  readonly right: number;
  readonly base: number;
}

interface StairPanel {
  readonly x: Scale;
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly base: number;
  /** Charge of the fully protonated and of the fully deprotonated form. */
  readonly charges: readonly [number, number];
}

/** Space above the first tread, under the last one (for its name), and for the constants, px. */
const above = 20;
const nameRoom = 20;
export const foot = 18;

/**
 * Geometry of the stair: tread j lies over its predominance range at the height of its charge, so
 * that a level drawn at the mean charge is a true reading.
 */
export function stairOf(ranges: readonly StairRange[], panel: StairPanel): Stair {
  const { x, left, right, top, base } = panel;
  const [first, last] = panel.charges;
  const drop = (base - foot - nameRoom - top - above) / Math.max(1, first - last);
  const level = (charge: number) => top + above + (first - charge) * drop;
  const place = (pH: number | null, open: number) =>
    pH === null ? open : clamp(x(pH), left, right);
  const treads = ranges
    .map(({ index, charge, from, to }) => ({
      index,
      left: place(from, left),
      right: place(to, right),
      y: level(charge),
    }))
    .filter((tread) => tread.right > tread.left);
  return { treads, level, drop, left, right, base };
}

/** Outline of the stone, closed at the base. */
export const stonePath = ({ treads, left, right, base }: Stair) =>
  `M${left} ${base}${treads.map((t) => `L${t.left} ${t.y}H${t.right}`).join('')}L${right} ${base}Z`;

/** Least height of the water's surface above a tread, px. */
const least = 2.5;

/**
 * The water that stands in the stair at a mean charge: its surface and where it begins. It lies
 * behind the stone and never nearer than 2.5 px above the tread it covers.
 */
export function waterOf({ treads, level }: Stair, meanCharge: number) {
  const surface = level(meanCharge);
  const covered = treads.find((tread) => tread.y >= surface) ?? treads[treads.length - 1];
  return covered && { left: covered.left, y: Math.min(surface, covered.y - least) };
}
