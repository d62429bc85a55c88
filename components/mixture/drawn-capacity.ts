import type { CapacityCurve } from './mixture-queries';
import { bufferingIn } from './mixture-request';
import { componentTitle } from './shown-mixture';

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
/** Least end of the axis, mmol/L per pH: below it there is nothing that buffers. */
const leastTop = 0.1;
const tops = [1, 1.5, 2, 3, 4, 5, 6, 8, 10];

/** Room over the highest part of what is not water, as a factor. */
const headroom = 1.35;

/**
 * Where the axis ends: above what the components do, and above the answer's own capacity where it
 * is not one of strong acid or base. Towards either end the part of water grows without bound, and
 * is clipped.
 */
function topOf(highest: number): number {
  const wanted = Math.max(leastTop, highest * headroom);
  const power = 10 ** Math.floor(Math.log10(wanted));
  // A quotient of decimals may lie a hair over the number it should be.
  return Number(((tops.find((top) => top * power >= wanted) ?? 10) * power).toPrecision(3));
}

/** Three digits, without an exponent: a drawing has no raised figures. */
const inFigure = (value: number) =>
  value >= 0.001 ? value.toPrecision(3) : String(Number(value.toFixed(6)));

export function drawnCapacity({ of, capacity }: CapacityCurve): DrawnCapacity {
  const { points } = capacity;
  const { asked, answer } = of;
  const pH = points.map((point) => Number(point.pH));
  const parts = bufferingIn(asked.body).map(({ components: [first = 0] }, index) => {
    const component = answer.components[first];
    return {
      title: component ? componentTitle(component) : '',
      series: index + 1,
      values: points.map(({ components }) => Number(components[index]) * perMole),
    };
  });
  const own = Number(answer.bufferCapacity) * perMole;
  const dry = points.map(({ total, water }) => (Number(total) - Number(water)) * perMole);
  return {
    pH,
    range: [pH[0] ?? 1, pH.at(-1) ?? 13],
    whole: points.map(({ total }) => Number(total) * perMole),
    parts,
    top: topOf(Math.max(own, ...dry)),
    at: { pH: Number(answer.pH), value: own, text: inFigure(own) },
  };
}
