import { Exact } from '../../shared/decimal';
import { shownRatio } from '../curves/rounded';

/** Decimals of a pH: what constants and activity models are worth. */
const decimals = 2;

/** Without the minus of a zero. */
const plainZero = (text: string) => (Number(text) === 0 ? text.replace('-', '') : text);

export const shownPH = (pH: string) => plainZero(new Exact(pH).toFixed(decimals));

/** A concentration, fraction or coefficient to three digits, with an exponent below 10⁻³. */
export const shownAmount = (value: string) => shownRatio(value);

/** A capacity in mmol/L per pH. */
export const shownCapacity = (capacity: string) =>
  shownRatio(new Exact(capacity).times(1000).toString());

/** pH per °C. */
export const shownPerDegree = (coefficient: string) => plainZero(new Exact(coefficient).toFixed(4));

/** How far a pH moves: two decimals, or one digit where it hardly moves. */
export function shownShift(to: string, from: string): string {
  const shift = new Exact(to).minus(from);
  const text = shift.toFixed(decimals);
  return Number(text) === 0 && !shift.isZero() ? shift.toExponential(0) : plainZero(text);
}
