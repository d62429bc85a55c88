import type Decimal from 'decimal.js';
import { Exact } from '../decimals/contexts';
import { writePlaces } from '../decimals/rounding';

/**
 * Where to answer: pH values as written (any order, repeats allowed), or an even grid. Each pH lies
 * in −20…40 and has at most 60 decimals. Taken as validated.
 */
export type PHPoints =
  | { readonly kind: 'list'; readonly values: readonly string[] }
  | {
      readonly kind: 'grid';
      readonly from: string;
      readonly step: string;
      readonly count: number;
    };

/** The points' exact values, in order. */
export function valuesOf(points: PHPoints): Decimal[] {
  if (points.kind === 'list') return points.values.map((value) => new Exact(value));
  const values = [new Exact(points.from)];
  const step = new Exact(points.step);
  while (values.length < points.count) values.push(step.plus(values.at(-1) ?? 0));
  return values;
}

/** The longest decimal among the points, in places after the point. */
export const decimalsOf = (points: PHPoints): number =>
  (points.kind === 'list' ? points.values : [points.from, points.step]).reduce(
    (most, value) => Math.max(most, new Exact(value).decimalPlaces()),
    0,
  );

/** Places after the point of a decimal as written: 2 for "7.10", 3 for "1e-3". */
function writtenPlaces(decimal: string): number {
  const [mantissa = '', exponent = '0'] = decimal.toLowerCase().split('e');
  const decimals = mantissa.split('.')[1]?.length ?? 0;
  return Math.max(0, decimals - Number(exponent));
}

/** More places than these can only be zeros. */
const mostPlaces = 60;

/**
 * How the answer writes the points: those of a list exactly as asked, those of a grid as plain
 * decimals with the places of the finer of `from` and `step`.
 */
export function labelsOf(points: PHPoints): string[] {
  if (points.kind === 'list') return [...points.values];
  const places = Math.max(writtenPlaces(points.from), writtenPlaces(points.step));
  return valuesOf(points).map((value) => writePlaces(value, Math.min(places, mostPlaces)));
}
