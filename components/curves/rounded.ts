import { Exact } from '../../shared/decimal';

const decimals = 3;
const smallest = new Exact(10).pow(-decimals);
const rareDigits = 2;

/**
 * A fraction as it is read on a screen: three decimals, below 10⁻³ two digits with an exponent
 * (`0.614`, `2.2e-6`).
 */
export function shownFraction(fraction: string): string {
  const value = new Exact(fraction);
  return value.isZero() || value.greaterThanOrEqualTo(smallest)
    ? value.toFixed(decimals)
    : value.toExponential(rareDigits - 1);
}

/** A charge to two decimals, without a negative zero. */
export function shownCharge(charge: string): string {
  const text = new Exact(charge).toFixed(2);
  return Number(text) === 0 ? text.replace('-', '') : text;
}

/** A computed pH to two decimals, with a true minus. */
export const shownPH = (pH: string): string => trueMinus(new Exact(pH).toFixed(2));

/** A capacity, mmol/L per pH, to three digits; plain from 0.001 to 10⁵. */
export function shownCapacity(value: number): string {
  const text = new Exact(value).toSignificantDigits(3);
  return text.lessThan(smallest) || text.greaterThanOrEqualTo(1e5)
    ? text.toExponential(2)
    : text.toFixed(Math.max(0, 2 - Math.floor(Math.log10(value))));
}

/** The same beside a dot in a drawing, where there is no room for a power of ten. */
export const dotCapacity = (value: number): string =>
  value < 0.01 ? '< 0.01' : value >= 1e5 ? value.toPrecision(3) : shownCapacity(value);

/** A ratio to three digits, with an exponent from 10³ on and below 10⁻³. */
export function shownRatio(ratio: string): string {
  const value = new Exact(ratio).toSignificantDigits(3);
  return value.isZero() || value.greaterThanOrEqualTo(smallest)
    ? value.toPrecision(3)
    : value.toExponential(2);
}

/** A constant as given where it has up to three decimals, else to three. */
export function shownConstant(pKa: string): string {
  const value = new Exact(pKa);
  return value.decimalPlaces() <= decimals && !/e/i.test(pKa) && pKa.length <= 8
    ? pKa
    : value.toFixed(decimals);
}

/** A number with a true minus, for words and drawings. */
export const trueMinus = (text: string) => text.replace(/-(?=\d)/g, '\u2212');

/** A change of a fraction, with its sign. */
export const signedChange = (change: number): string =>
  trueMinus(`${change > 0 ? '+' : ''}${change.toFixed(3)}`);
