import { limits } from '../../shared/limits';
import { capacityOf, capacityOfWater } from './capacity-of';
import type { Answered } from './mixture-queries';
import { shownSystems } from './shown-mixture';

/** One system's part of the capacity. */
export interface CapacityPart {
  readonly title: string;
  /** Tells its series: the whole is drawn in ink, the parts in the colours after the first. */
  readonly series: number;
  /** mmol/L per pH. */
  readonly values: readonly number[];
}

/** A capacity curve as it is drawn: mmol/L per pH. */
export interface DrawnCapacity {
  readonly pH: readonly number[];
  readonly range: readonly [number, number];
  readonly whole: readonly number[];
  readonly parts: readonly CapacityPart[];
  /** Where the axis ends. */
  readonly top: number;
  /** The answer’s own pH and capacity. */
  readonly at: { readonly pH: number; readonly value: number; readonly text: string };
}

const perMole = 1000;
const step = 0.05;
/** What is drawn over at least; beyond it water hides everything else. */
const usual = [1, 13] as const;
const lowest = Number(limits.pH.from);
const highest = Number(limits.pH.to);

/** 1 to 13, widened to the whole number that leaves one unit beside an outlying pH. */
const rangeAround = (pH: number): readonly [number, number] => [
  Math.max(lowest, Math.min(usual[0], Math.floor(pH - 1))),
  Math.min(highest, Math.max(usual[1], Math.ceil(pH + 1))),
];

/** Least end of the axis, mmol/L per pH: below it there is nothing that buffers. */
const leastTop = 0.1;
const tops = [1, 1.5, 2, 3, 4, 5, 6, 8, 10];
/** Room over the highest part of what is not water, as a factor. */
const headroom = 1.35;

/**
 * Where the axis ends: above what the systems do within ordinary water, and above the answer's own
 * capacity. Towards either end the part of water grows without bound, and is clipped.
 */
function topOf(most: number): number {
  const wanted = Math.max(leastTop, most * headroom);
  const power = 10 ** Math.floor(Math.log10(wanted));
  return Number(((tops.find((top) => top * power >= wanted) ?? 10) * power).toPrecision(3));
}

/** Three digits, without an exponent: a drawing has no raised figures. */
const inFigure = (value: number) =>
  value >= 0.001 ? value.toPrecision(3) : String(Number(value.toFixed(6)));

/** The capacity of the mixture around its pH, from the answer alone. */
export function drawnCapacity(answered: Answered): DrawnCapacity {
  const { answer } = answered;
  const at = Number(answer.pH);
  const range = rangeAround(at);
  const count = Math.round((range[1] - range[0]) / step) + 1;
  const pH = Array.from({ length: count }, (_, i) => Number((range[0] + i * step).toFixed(2)));
  const parts = shownSystems(answered).map(({ title, members }, index) => ({
    title,
    series: index + 1,
    values: pH.map(
      (value) => perMole * members.reduce((sum, member) => sum + capacityOf(member, value - at), 0),
    ),
    held: members.some(({ heldBy }) => heldBy !== null),
  }));
  const dry = pH.map((_, i) => parts.reduce((sum, { values }) => sum + (values[i] ?? 0), 0));
  // What the air gives grows without bound too, and says nothing of how high the axis should be.
  const bounded = parts.filter(({ held }) => !held);
  const own = Number(answer.bufferCapacity) * perMole;
  return {
    pH,
    range,
    whole: pH.map((value, i) => (dry[i] ?? 0) + perMole * capacityOfWater(answer, value - at)),
    parts,
    top: topOf(
      Math.max(
        own,
        ...pH.map((_, i) => bounded.reduce((sum, { values }) => sum + (values[i] ?? 0), 0)),
      ),
    ),
    at: { pH: at, value: own, text: inFigure(own) },
  };
}
