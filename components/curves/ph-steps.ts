import { decimalPattern, Exact } from '../../shared/decimal';
import { pHValue } from '../../shared/ph';
import { plainDecimal } from '../ui/plain-decimal';

export type PHRange = readonly [from: number, to: number];

/** Decimals a pH is written with at least. */
const decimals = 2;

/** A pH as it is written here: plain, two decimals or as many as it has, no negative zero. */
const written = (value: InstanceType<typeof Exact>) =>
  value.plus(0).toFixed(Math.max(decimals, value.decimalPlaces()));

/** The same pH where the range holds it, else the range's nearer end. */
export const pHWithin = (pH: string, range: PHRange) =>
  written(Exact.min(range[1], Exact.max(range[0], pH)));

/** A pH from the pointer, to two decimals and within the range that is drawn. */
export const pHAt = (value: number, range: PHRange) => pHWithin(value.toFixed(decimals), range);

/** The pH a step away; keeps decimals that were typed and stops at the ends of the range. */
export const pHStep = (pH: string, step: string, sign: 1 | -1, range: PHRange) =>
  pHWithin(new Exact(pH).plus(new Exact(step).times(sign)).toFixed(), range);

export const pHEnd = (to: 'start' | 'end', range: PHRange) =>
  written(new Exact(range[to === 'start' ? 0 : 1]));

type TypedPH =
  { readonly ok: true; readonly pH: string } | { readonly ok: false; readonly error: string };

/** A pH as somebody typed it, or what to type instead. */
export function typedPH(text: string, range: PHRange): TypedPH {
  const plain = plainDecimal(text);
  if (!decimalPattern.test(plain)) return { ok: false, error: 'Write a pH such as 7.40.' };
  const valid = pHValue.safeParse(plain).success;
  if (!valid || new Exact(plain).lessThan(range[0]) || new Exact(plain).greaterThan(range[1])) {
    const ends = range.map((end) => String(end).replace('-', '\u2212'));
    return { ok: false, error: `Write a pH from ${ends.join(' to ')}.` };
  }
  return { ok: true, pH: written(new Exact(plain)) };
}
